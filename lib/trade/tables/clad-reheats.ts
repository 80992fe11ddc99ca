import type { Source } from '../source';
import type { Table } from '../table';

export interface CladReheatRow {
  /** Row for sheet up to this thickness, or below it; the last row has no limit. */
  readonly limitIn: number | null;
  readonly includesLimit: boolean;
  readonly max: number;
  /** What the document counts: treatments after the first, or all of them, the mill's included. */
  readonly counts: 'reheats' | 'solution_treatments';
  /** So many with engineering approval. */
  readonly maxWithApproval?: number;
}

const TO: Source = {
  document: 'T.O. 1-1A-9 Table 3-12 (title and note were read, the two numbers are from memory)',
  confidence: 'memory',
  certainty: 'medium',
  address: 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_169.htm',
};
const mil = (certainty: Source['certainty']): Source => ({
  document: 'MIL-H-6088G / AMS-H-6088 reheat table',
  confidence: 'memory',
  certainty,
});
const AMS: Source = { document: 'AMS 2770', confidence: 'memory', certainty: 'low' };

/** The Air Force's limits. */
export const CLAD_REHEATS_TO: Table<CladReheatRow> = {
  id: 'clad-reheats-to',
  title: 'Re-heat-treatment of Alclad, T.O. 1-1A-9',
  edition: 'T.O. 1-1A-9 Table 3-12',
  rows: [
    { limitIn: 0.125, includesLimit: true, max: 2, counts: 'reheats', source: TO },
    { limitIn: null, includesLimit: true, max: 3, counts: 'reheats', source: TO },
  ],
};

/** The strictest limits, and so the ones to work by where the order names no document. */
export const CLAD_REHEATS_MIL: Table<CladReheatRow> = {
  id: 'clad-reheats-mil',
  title: 'Re-heat-treatment of Alclad, MIL-H-6088G',
  edition: 'MIL-H-6088G / AMS-H-6088',
  rows: [
    {
      limitIn: 0.02,
      includesLimit: false,
      max: 0,
      counts: 'reheats',
      maxWithApproval: 1,
      source: mil('low'),
    },
    { limitIn: 0.125, includesLimit: true, max: 1, counts: 'reheats', source: mil('medium') },
    { limitIn: null, includesLimit: true, max: 2, counts: 'reheats', source: mil('medium') },
  ],
};

/** Counts all solution treatments: the mill's own is one of them. */
export const CLAD_TREATMENTS_AMS: Table<CladReheatRow> = {
  id: 'clad-treatments-ams',
  title: 'Solution treatments of Alclad, AMS 2770',
  edition: 'AMS 2770',
  rows: [
    { limitIn: 0.02, includesLimit: false, max: 1, counts: 'solution_treatments', source: AMS },
    { limitIn: 0.125, includesLimit: true, max: 2, counts: 'solution_treatments', source: AMS },
    { limitIn: null, includesLimit: true, max: 3, counts: 'solution_treatments', source: AMS },
  ],
};
