/** What happened to a document. `alternative` names what is used instead and gives no authority to substitute. */
export type LineageEventKind =
  | 'issued'
  | 'amended'
  | 'reaffirmed'
  | 'adopted'
  | 'listed_active'
  | 'current'
  | 'noncurrent'
  | 'stabilized'
  | 'revived'
  | 'renamed'
  | 'superseded'
  | 'withdrawn'
  | 'cancelled'
  | 'alternative'
  | 'successor_not_found';

/** Who says so. Two may disagree for years, so each has a standing of its own. */
export type Authority = 'publisher' | 'government_index';

/** What a successor is for, where one number became several. */
export type Coverage = 'parts' | 'raw_material' | 'castings' | 'general_work' | 'industrial_work';

export interface Successor {
  readonly number: string;
  /** The issue that took over, where it is named; a prefix may change while the letter stays. */
  readonly revision?: string;
  /** Left out where it takes over the whole. */
  readonly covers?: Coverage;
  /** Conditions of the material that it is for, as written. */
  readonly conditions?: string;
}

export interface LineageEvent {
  /** As `recogniseSpecification` writes it. */
  readonly number: string;
  /** The issue it happened to; `original` is the first one, which has no letter. Left out for the document as a whole. */
  readonly revision?: string;
  readonly event: LineageEventKind;
  /** `YYYY`, `YYYY-MM` or `YYYY-MM-DD`, as exactly as it is known; left out where no date was found. */
  readonly on?: string;
  /** Left out: the document's own publisher. */
  readonly by?: Authority;
  readonly successors?: readonly Successor[];
}

/** Whether a date that may be known only to the year lies on or before a day: for certain, perhaps, or not. */
export function cameBy(on: string | undefined, day: string): 'yes' | 'perhaps' | 'no' {
  if (on === undefined) return 'perhaps';
  if (on > day) return 'no';
  // 2006 is a beginning of 2006-05-01: some day of that year, before or after.
  return day.startsWith(on) && on.length < day.length ? 'perhaps' : 'yes';
}
