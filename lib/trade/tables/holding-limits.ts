import type { Alloy } from '../alloys/alloy';
import type { Source } from '../source';
import type { Table } from '../table';

export interface HoldingRow {
  readonly alloys: readonly Alloy[];
  /** Longest time at room temperature before it goes into the cold, all times outside together. */
  readonly roomMin: number;
  /** Longest time in the cold at or below a temperature, coldest last. */
  readonly cold: readonly { readonly atF: number; readonly days: number }[];
}

const DOCUMENT = 'MIL-H-6088G table of typical refrigerated time limits';
const source: Source = { document: DOCUMENT, confidence: 'memory', certainty: 'medium' };

/** How long quenched metal keeps soft. */
export const HOLDING_LIMITS: Table<HoldingRow> = {
  id: 'holding-limits',
  title: 'Holding of as-quenched aluminium',
  edition: DOCUMENT,
  rows: [
    {
      alloys: ['2014', '2024', '2219'],
      roomMin: 15,
      cold: [
        { atF: 10, days: 1 },
        { atF: 0, days: 30 },
        { atF: -10, days: 90 },
      ],
      source,
    },
    {
      alloys: ['6061', '7075'],
      roomMin: 30,
      cold: [
        { atF: 10, days: 7 },
        { atF: 0, days: 30 },
        { atF: -10, days: 90 },
      ],
      source,
    },
  ],
};

export interface ReworkWindowRow {
  readonly alloys: readonly Alloy[] | 'any';
  readonly work: 'form' | 'straighten';
  /** After the quench; where a source gives a spread, both ends. */
  readonly withinMin: readonly [number, number];
}

const PRACTICE: Source = { document: 'Trade practice', confidence: 'memory', certainty: 'medium' };
const FORUM: Source = {
  document: 'Trade forum, an opinion; AMS 2770 practice',
  confidence: 'read+memory',
  certainty: 'medium',
  address: 'https://www.physicsforums.com/threads/straightening-2024-t42-aluminum.895226',
};

/** How long quenched metal is soft enough to be worked at room temperature. */
export const REWORK_WINDOWS: Table<ReworkWindowRow> = {
  id: 'rework-windows',
  title: 'Forming and straightening after quench',
  edition: 'Trade practice',
  rows: [
    { alloys: ['2024'], work: 'form', withinMin: [30, 30], source: PRACTICE },
    { alloys: ['7075'], work: 'form', withinMin: [120, 120], source: PRACTICE },
    { alloys: 'any', work: 'straighten', withinMin: [60, 120], source: FORUM },
  ],
};

export interface RivetRow {
  readonly alloy: Alloy;
  /** From quench into the cold; nothing where the rivet needs none. */
  readonly intoColdWithinMin?: number;
  /** From the cold to driven; the shorter figure is the safe one. */
  readonly driveWithinMin?: readonly [number, number];
  /** Kept below freezing so long; colder keeps longer. */
  readonly keepsDays?: number;
}

const HANDBOOK: Source = {
  document: 'FAA-H-8083-31 rivets; the way into the cold by a structural repair manual, chapter 51-25',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'https://www.scribd.com/document/443697789/A320-Structural-Repair-Manual-51-25-00-801',
};
const AS_RECEIVED: Source = {
  document: 'AMS 2770 / MIL-H-6088G practice and ANSI H35.1 rules',
  confidence: 'memory',
  certainty: 'high',
};

/** Rivets that are driven soft out of the ice box, and the one that is driven as it comes. */
export const RIVET_HOLDING: Table<RivetRow> = {
  id: 'rivet-holding',
  title: 'Holding of heat-treated rivets',
  edition: 'FAA-H-8083-31',
  rows: [
    { alloy: '2024', intoColdWithinMin: 5, driveWithinMin: [10, 20], keepsDays: 14, source: HANDBOOK },
    { alloy: '2017', intoColdWithinMin: 30, driveWithinMin: [60, 60], keepsDays: 14, source: HANDBOOK },
    { alloy: '2117', source: AS_RECEIVED },
  ],
};
