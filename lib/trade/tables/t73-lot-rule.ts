import type { Table } from '../table';

/** Lots of 7075-T73 between the limits are accepted by their yield strength. */
export interface T73LotRow {
  readonly acceptFromIacs: number;
  readonly conditionalFromIacs: number;
  /** Yield strength may be above its minimum by this much at most. */
  readonly yieldOverMinimumKsi: number;
}

export const T73_LOT_RULE: Table<T73LotRow> = {
  id: 't73-lot-rule',
  title: 'Conductivity and yield strength of a lot of 7075-T73',
  edition: 'MIL-H-6088G / AMS QQ-A-250',
  rows: [
    {
      acceptFromIacs: 40,
      conditionalFromIacs: 38,
      yieldOverMinimumKsi: 12,
      source: {
        document: 'MIL-H-6088G / AMS QQ-A-250, T73 lot rule',
        confidence: 'memory',
        certainty: 'medium',
      },
    },
  ],
};
