import type { Table } from '../table';
import type { Verdict } from '../verdict';

import { codeLetter, type CodeLetterRow, type InspectionLevel } from './code-letter';
import { singleSamplingPlan, type SingleSamplingPlan, type SingleSamplingRow } from './single-sampling-plan';

export interface SampledLot {
  /** Pieces, a whole number from 2. */
  readonly lotSize: number;
  readonly level: InspectionLevel;
  /** Percent nonconforming, one of the table's levels. */
  readonly aqlPct: number;
}

export interface LotSample extends SingleSamplingPlan {
  /** Pieces to look at: the plan's, or the whole lot where the plan asks for as many or more. */
  readonly inspect: number;
  readonly wholeLot: boolean;
}

/**
 * How many pieces of a lot to look at, and with how many nonconforming ones it passes or fails.
 *
 * @param tables the code letters, and the plans for normal, tightened or reduced inspection.
 * @returns the sample; refused for a lot or an AQL outside the tables.
 * @example 60 pieces, level II, AQL 1.0, normal: letter E, 13 pieces, accept 0, reject 1. At AQL 0.65 the arrow leads
 * to 20 pieces. A lot of 8 at AQL 0.65 is looked at whole.
 */
export function sampleForLot(
  tables: { letters: Table<CodeLetterRow>; plans: Table<SingleSamplingRow> },
  { lotSize, level, aqlPct }: SampledLot,
): Verdict<
  LotSample,
  | 'lot_not_whole'
  | 'lot_smaller_than_table'
  | 'lot_larger_than_table'
  | 'aql_not_in_table'
  | 'letter_not_in_table'
> {
  const coded = codeLetter(tables.letters, lotSize, level);
  if (!coded.ok) return coded;
  const plan = singleSamplingPlan(tables.plans, coded.letter, aqlPct);
  if (!plan.ok) return plan;
  const wholeLot = plan.sampleSize >= lotSize;
  return { ...plan, inspect: wholeLot ? lotSize : plan.sampleSize, wholeLot };
}

/**
 * What a sample decides. Between the accept and the reject number, which only reduced inspection has, the lot passes
 * and normal inspection comes back.
 */
export function sampleDecision(
  { accept, reject }: Pick<SingleSamplingPlan, 'accept' | 'reject'>,
  nonconforming: number,
): 'accepted' | 'rejected' | 'accepted_back_to_normal' {
  if (nonconforming <= accept) return 'accepted';
  return nonconforming >= reject ? 'rejected' : 'accepted_back_to_normal';
}
