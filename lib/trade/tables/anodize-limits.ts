import type { Source } from '../source';
import type { Table } from '../table';

const FITS: Source = {
  document: 'MIL-A-8625F 6.10.4-6.10.5, on a secondary page',
  confidence: 'read',
  certainty: 'high',
};

/** What an anodize type is not for, and how near it is held. */
export interface AnodizeLimitRow {
  readonly types: readonly string[];
  /** The type is not used on an alloy with more than any of these, in percent. */
  readonly mostPercent?: { readonly copper: number; readonly silicon: number; readonly alloying: number };
  /** The film is brittle: nothing is pressed together on it. */
  readonly notForceFitted?: true;
  /** The thickness can be held to about this, either way. */
  readonly controlIn?: number;
}

export const ANODIZE_LIMITS: Table<AnodizeLimitRow> = {
  id: 'anodize-limits',
  title: 'Alloys, fits and thickness control of anodize by type',
  edition: 'MIL-A-8625F',
  rows: [
    {
      types: ['I'],
      mostPercent: { copper: 5, silicon: 7, alloying: 7.5 },
      source: { document: 'MIL-A-8625F 3.3', confidence: 'memory', certainty: 'medium' },
    },
    { types: ['I', 'IB', 'IC', 'IIB', 'II'], notForceFitted: true, source: FITS },
    { types: ['III'], controlIn: 0.0001, source: FITS },
  ],
};
