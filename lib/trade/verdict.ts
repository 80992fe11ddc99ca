import type { Source } from './source';
import type { TableReference } from './table';

/** What an answer rests on: where the value comes from and, when it was read from a table, which edition of it. */
export interface Grounds {
  readonly source: Source;
  readonly readFrom?: TableReference;
}

/**
 * The one shape of an answer. A refusal carries a reason code and never a sentence: words belong to the screen.
 * Outside a table there is no answer; nothing is extrapolated.
 */
export type Verdict<Value, Reason extends string> =
  | ({ readonly ok: true } & Value & Grounds)
  | { readonly ok: false; readonly reason: Reason; readonly source?: Source };
