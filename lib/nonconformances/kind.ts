/** Why pieces are held, or missed. */
export const NONCONFORMANCE_KINDS = ['damaged', 'short', 'over', 'requirement', 'papers'] as const;
export type NonconformanceKind = (typeof NONCONFORMANCE_KINDS)[number];

export const KIND_WORDS: Record<NonconformanceKind, string> = {
  damaged: 'damaged',
  short: 'short',
  over: 'over',
  requirement: 'does not meet',
  papers: 'papers do not prove it',
};

/** Kinds a person raises on pieces in quarantine; `short` and `over` come from a count. */
export const RAISED_KINDS = ['requirement', 'papers', 'damaged'] as const;
export type RaisedKind = (typeof RAISED_KINDS)[number];
