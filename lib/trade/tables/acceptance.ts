import type { HardnessScale } from '../hardness/hardness-table';
import type { Certainty, Source } from '../source';
import type { Table } from '../table';

const recalled = (certainty: Certainty): Source => ({
  document: 'AMS 2658 Tables 1-2 / MIL-STD-1537 practice (bare)',
  confidence: 'memory',
  certainty,
});
const CITED: Source = {
  document: 'AMS 2658 as cited by a secondary page',
  confidence: 'read',
  certainty: 'high',
  address: 'https://reference.org/admin/ArticleEdit/EoRFhan2',
};
const WORKED_EXAMPLE: Source = {
  document: 'MIL-STD-1537C para 4.4.3, examples 1 and 2, Figure 1',
  confidence: 'read',
  certainty: 'high',
  address: 'https://nondestructivetestinginspection.emilspec.com/MIL-STD-1537/page13.html',
};

export interface HardnessBand {
  readonly scale: HardnessScale;
  readonly min?: number;
  readonly max?: number;
  /** Printed with "about". */
  readonly isAbout?: true;
}

/** What a bare aluminium alloy shows in a condition. Both together are looked at; either alone can mislead. */
export interface AcceptanceRow {
  readonly alloy: string;
  readonly conditions: readonly string[];
  readonly iacs?: readonly [number, number];
  /** More than one scale: any of them, by thickness. */
  readonly hardness?: readonly HardnessBand[];
  /** A worked example shows how a standard is used; it is no limit for parts. */
  readonly kind: 'acceptance' | 'worked_example';
}

export const ACCEPTANCE: Table<AcceptanceRow> = {
  id: 'acceptance',
  title: 'Hardness and conductivity of bare aluminium alloys by condition',
  edition: 'AMS 2658 and MIL-STD-1537C',
  rows: [
    {
      alloy: '2014',
      conditions: ['O'],
      iacs: [43.5, 51.5],
      hardness: [{ scale: 'HRB', max: 22 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '2014',
      conditions: ['T3'],
      iacs: [31.5, 35],
      hardness: [{ scale: 'HRB', min: 65, max: 95 }],
      kind: 'acceptance',
      source: recalled('low'),
    },
    {
      alloy: '2014',
      conditions: ['T4', 'T42'],
      iacs: [31.5, 35],
      hardness: [{ scale: 'HRB', min: 65, max: 95 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '2014',
      conditions: ['T6', 'T62'],
      iacs: [35.5, 41.5],
      hardness: [{ scale: 'HRB', min: 78, max: 90 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '2024',
      conditions: ['O'],
      iacs: [46, 51],
      hardness: [
        { scale: 'HRB', max: 22 },
        { scale: 'HRE', max: 70 },
      ],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '2024',
      conditions: ['T3'],
      iacs: [28.5, 32.5],
      hardness: [{ scale: 'HRB', min: 69, max: 83 }],
      kind: 'acceptance',
      source: recalled('high'),
    },
    {
      alloy: '2024',
      conditions: ['T4', 'T42'],
      iacs: [28.5, 34],
      hardness: [{ scale: 'HRB', min: 63, max: 83 }],
      kind: 'acceptance',
      source: recalled('high'),
    },
    {
      alloy: '2024',
      conditions: ['T6', 'T62'],
      iacs: [36.5, 40.5],
      hardness: [{ scale: 'HRB', min: 72, max: 84 }],
      kind: 'acceptance',
      source: recalled('high'),
    },
    {
      alloy: '2024',
      conditions: ['T8', 'T81'],
      iacs: [35, 42.5],
      hardness: [{ scale: 'HRB', min: 74, max: 83 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '2219',
      conditions: ['O'],
      iacs: [44, 49],
      hardness: [{ scale: 'HRB', max: 22 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '2219',
      conditions: ['T3', 'T31', 'T37'],
      iacs: [26, 31],
      hardness: [{ scale: 'HRB', min: 60, max: 83 }],
      kind: 'acceptance',
      source: recalled('low'),
    },
    {
      alloy: '2219',
      conditions: ['T4'],
      iacs: [28, 32],
      hardness: [{ scale: 'HRB', min: 58, max: 69 }],
      kind: 'acceptance',
      source: recalled('low'),
    },
    {
      alloy: '2219',
      conditions: ['T6', 'T62'],
      iacs: [32, 35],
      hardness: [{ scale: 'HRB', min: 62, max: 75 }],
      kind: 'acceptance',
      source: recalled('low'),
    },
    {
      alloy: '2219',
      conditions: ['T8', 'T81', 'T87'],
      iacs: [31, 35],
      hardness: [{ scale: 'HRB', min: 71, max: 83 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '6061',
      conditions: ['O'],
      iacs: [47, 51],
      hardness: [{ scale: 'HRE', max: 75 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '6061',
      conditions: ['T4', 'T42'],
      iacs: [35.5, 43],
      hardness: [{ scale: 'HRE', min: 60, max: 75 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '6061',
      conditions: ['T6', 'T62'],
      iacs: [40, 47],
      hardness: [{ scale: 'HRE', min: 85, max: 97 }],
      kind: 'acceptance',
      source: recalled('high'),
    },
    {
      alloy: '6013',
      conditions: ['T4'],
      iacs: [37, 42],
      hardness: [{ scale: 'HRE', min: 75, max: 90, isAbout: true }],
      kind: 'acceptance',
      source: recalled('low'),
    },
    {
      alloy: '6013',
      conditions: ['T6'],
      iacs: [40, 46],
      hardness: [
        { scale: 'HRE', min: 95, isAbout: true },
        { scale: 'HRB', min: 66, isAbout: true },
      ],
      kind: 'acceptance',
      source: recalled('low'),
    },
    {
      alloy: '7050',
      conditions: ['O'],
      iacs: [44, 50],
      hardness: [{ scale: 'HRB', max: 22 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '7050',
      conditions: ['T73'],
      iacs: [41, 44],
      hardness: [{ scale: 'HRB', min: 78 }],
      kind: 'acceptance',
      source: recalled('low'),
    },
    {
      alloy: '7050',
      conditions: ['T74'],
      iacs: [40, 44],
      hardness: [{ scale: 'HRB', min: 80, max: 90 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '7050',
      conditions: ['T76'],
      iacs: [39, 44],
      hardness: [{ scale: 'HRB', min: 84 }],
      kind: 'acceptance',
      source: recalled('low'),
    },
    {
      alloy: '7075',
      conditions: ['O'],
      iacs: [44, 48],
      hardness: [
        { scale: 'HRB', max: 22 },
        { scale: 'HRE', max: 70 },
      ],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '7075',
      conditions: ['T6', 'T62'],
      iacs: [30.5, 36],
      hardness: [{ scale: 'HRB', min: 84, max: 94 }],
      kind: 'acceptance',
      source: recalled('high'),
    },
    {
      alloy: '7075',
      conditions: ['T73'],
      iacs: [38, 43],
      hardness: [{ scale: 'HRB', min: 78, max: 90 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '7075',
      conditions: ['T76'],
      iacs: [38, 42],
      hardness: [{ scale: 'HRB', min: 82, max: 90 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '7178',
      conditions: ['O'],
      iacs: [43, 47],
      hardness: [{ scale: 'HRB', max: 22 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '7178',
      conditions: ['T6'],
      iacs: [29, 34],
      hardness: [{ scale: 'HRB', min: 86, max: 95 }],
      kind: 'acceptance',
      source: recalled('medium'),
    },
    {
      alloy: '7178',
      conditions: ['T76'],
      iacs: [35, 39],
      hardness: [{ scale: 'HRB', min: 84, max: 92 }],
      kind: 'acceptance',
      source: recalled('low'),
    },
    { alloy: '7075', conditions: ['T73'], iacs: [38, 43], kind: 'acceptance', source: CITED },
    { alloy: '7075', conditions: ['T6'], iacs: [30, 34.5], kind: 'worked_example', source: WORKED_EXAMPLE },
  ],
};
