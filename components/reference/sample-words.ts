import type { zeroAcceptanceInstead } from '@/lib/trade/sampling/zero-acceptance-sample';
import type { sampleDecision, sampleForLot } from '@/lib/trade/sampling/sample-for-lot';

type Reason<Found> =
  Extract<Found, { ok: false }> extends { reason: infer Code extends string } ? Code : never;
type SampleReason =
  Reason<ReturnType<typeof sampleForLot>> | Reason<ReturnType<typeof zeroAcceptanceInstead>>;

const REFUSALS: Record<SampleReason, string> = {
  lot_not_whole: 'A lot is a whole number of pieces.',
  lot_smaller_than_table: 'One piece is inspected, not sampled.',
  lot_larger_than_table: 'The lot is larger than the table goes.',
  aql_not_in_table: 'The tables have no plan at this level. Choose one from the list.',
  letter_not_in_table: 'The tables at hand have no plan for this lot at this level. Read it in your copy.',
  nonconforming_not_in_lot: 'The lot can not hold so many nonconforming pieces.',
  risk_not_a_percentage: 'The risk lies between 0 and 100 %.',
  not_a_plan: 'With these numbers every lot passes; that is no plan.',
  not_a_probability: 'A chance lies between 0 and 1.',
};

export const sampleRefusal = (reason: SampleReason): string => REFUSALS[reason];

export const DECISIONS: Record<ReturnType<typeof sampleDecision>, string> = {
  accepted: 'The lot is accepted',
  rejected: 'The lot is rejected',
  accepted_back_to_normal: 'The lot is accepted, and normal inspection comes back',
};

/** `0.26 %`, with as many places as say something. */
export const percentWords = (pct: number): string => `${pct < 1 ? pct.toFixed(2) : pct.toFixed(1)} %`;
