import type { Source } from '../source';
import type { Table } from '../table';

export type OldNameRow =
  | {
      readonly kind: 'name';
      readonly old: string;
      /** More than one: the old name says too little, and somebody has to find out which. */
      readonly present: readonly string[];
      readonly note?:
        'commercially_pure' | 'not_exactly_the_same' | 'rivet_alloy' | 'trade_name' | 'time_is_stated';
    }
  | { readonly kind: 'series'; readonly from: number; readonly to: number; readonly element: string }
  | {
      readonly kind: 'prefix';
      readonly letters: string;
      readonly means: 'development' | 'experimental' | 'modified';
    }
  | { readonly kind: 'mark'; readonly written: string; readonly means: 'clad' };

const FORMER = 'Former alloy and temper designations, ANM-112N-06-04 (25 September 2006)';
const TM_1500 = 'TM 1-1500-204-23-6 Table 4-6';
const read = (document: string, address: string): Source => ({
  document,
  confidence: 'read',
  certainty: 'high',
  address,
});
const DESIGNATIONS = read(
  FORMER,
  'https://dokumen.tips/documents/former-alloy-and-temper-designations-aluminum-alloy-and-temper-designations.html',
);
const PURE: Source = {
  ...DESIGNATIONS,
  document: `${FORMER}; the number 1100 from memory`,
  confidence: 'read+memory',
};
const TABLE_4_6 = read(
  TM_1500,
  'https://aviationmiscmanuals.tpub.com/TM-1-1500-204-23-6/css/TM-1-1500-204-23-6_124.htm',
);
const RESTORERS: Source = {
  ...read(
    'Restorers on the alloys of one aircraft',
    'https://keypublishing.wordpress-developer.us/topic/spit-aluminum',
  ),
  certainty: 'medium',
};
const HANDBOOK = read(
  'FAA-H-8083-30 ch. heat treatment of nonferrous metals',
  'http://avstop.com/ac/apgeneral/heattreatmentofnonferrousmetals.html',
);
const INK_MARK = read(
  'Aircraft production standards of 1943, marking of Alclad',
  'https://aluminummarkings.wordpress.com/2014/11/20/1943-alclad-marking-documentation-aircraft-production-standards/',
);
const MEMORY: Source = { document: 'Former designations', confidence: 'memory', certainty: 'medium' };
const ROLLED: Source = {
  document: 'Former designations; the 6 % cold work of T361 as in AMS-QQ-A-250/5',
  confidence: 'read+memory',
  certainty: 'medium',
};

const name = (old: string, present: string, source: Source) => ({
  kind: 'name' as const,
  old,
  present: [present],
  source,
});

/** Names of aluminium alloys and tempers before 1954, and what they are today. */
export const OLD_NAMES: Table<OldNameRow> = {
  id: 'old-names',
  title: 'Former names of aluminium alloys and tempers',
  edition: FORMER,
  rows: [
    { ...name('1S', '1100', PURE), note: 'commercially_pure' },
    { ...name('2S', '1100', PURE), note: 'commercially_pure' },
    name('3S', '3003', TABLE_4_6),
    name('4S', '3004', MEMORY),
    name('14S', '2014', MEMORY),
    name('17S', '2017', MEMORY),
    { ...name('A17S', '2117', MEMORY), note: 'rivet_alloy' },
    { ...name('24S', '2024', RESTORERS), note: 'not_exactly_the_same' },
    name('25S', '2025', MEMORY),
    name('52S', '5052', TABLE_4_6),
    name('53S', '6053', TABLE_4_6),
    name('61S', '6061', TABLE_4_6),
    name('75S', '7075', MEMORY),
    { ...name('R301', 'Alclad 2014', MEMORY), note: 'trade_name' },
    name('24S-O', '2024-O', MEMORY),
    { ...name('24S-W', '2024-W', MEMORY), note: 'time_is_stated' },
    { kind: 'name', old: '24S-T', present: ['2024-T3', '2024-T42'], source: MEMORY },
    name('24S-RT', '2024-T361', ROLLED),
    name('24S-T81', '2024-T81', MEMORY),
    name('24S-T86', '2024-T861', MEMORY),
    name('17S-T', '2017-T4', MEMORY),
    name('75S-T', '7075-T6', MEMORY),
    { ...name('75S-W', '7075-W', HANDBOOK), note: 'time_is_stated' },
    name('3S-1/4H', '3003-H12', TABLE_4_6),
    name('3S-1/2H', '3003-H14', TABLE_4_6),
    name('3S-3/4H', '3003-H16', TABLE_4_6),
    name('3S-H', '3003-H18', TABLE_4_6),
    name('52S-1/4H', '5052-H32', TABLE_4_6),
    name('52S-1/2H', '5052-H34', TABLE_4_6),
    name('52S-3/4H', '5052-H36', TABLE_4_6),
    name('52S-H', '5052-H38', TABLE_4_6),
    { kind: 'series', from: 3, to: 9, element: 'manganese', source: DESIGNATIONS },
    { kind: 'series', from: 10, to: 29, element: 'copper', source: DESIGNATIONS },
    { kind: 'series', from: 30, to: 49, element: 'silicon', source: DESIGNATIONS },
    { kind: 'series', from: 50, to: 69, element: 'magnesium', source: DESIGNATIONS },
    { kind: 'series', from: 70, to: 79, element: 'zinc', source: DESIGNATIONS },
    { kind: 'series', from: 80, to: 84, element: 'other element', source: DESIGNATIONS },
    { kind: 'prefix', letters: 'M', means: 'development', source: DESIGNATIONS },
    { kind: 'prefix', letters: 'X', means: 'experimental', source: DESIGNATIONS },
    { kind: 'prefix', letters: 'AB', means: 'modified', source: DESIGNATIONS },
    { kind: 'mark', written: 'ALC', means: 'clad', source: INK_MARK },
  ],
};
