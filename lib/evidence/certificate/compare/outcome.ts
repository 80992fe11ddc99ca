import type { Discrepancy, RequirementVerdict } from '../certificate';

/** What an inspector looks for: first what the contract of the commands names, then ours in the same style. */
export const DISCREPANCY_CODES = [
  'wrong_po',
  'part_number_missing',
  'part_number_unknown',
  'part_number_transposed',
  'revision_mismatch',
  'quantity_mismatch',
  'quantity_arithmetic',
  'old_spec_revision',
  'wrong_specification',
  'superseded_specification',
  'wrong_class_type',
  'wrong_temper',
  'impossible_temper',
  'wrong_alloy',
  'lot_mismatch',
  'soak_too_short',
  'soak_too_long',
  'temperature_out_of_range',
  'quench_delay_exceeded',
  'age_missing',
  'age_too_short',
  'hardness_out_of_range',
  'conductivity_out_of_range',
  'thickness_out_of_range',
  'bake_missing',
  'bake_started_late',
  'bake_too_short',
  'ndt_type_mismatch',
  'signature_missing',
  'statement_missing',
  'dated_before_dispatch',
  'dated_in_future',
  'certificate_reused',
  'approval_not_valid',
  'hidden_text',
  'wrong_batch',
  'wrong_process',
  'serial_mismatch',
  'spec_revision_mismatch',
  'time_arithmetic',
  'age_too_long',
  'age_kind_mismatch',
  'quench_medium_mismatch',
  'quench_medium_too_warm',
  'tensile_out_of_range',
  'readings_impossible_together',
  'personnel_level_too_low',
  'dated_before_work',
] as const;
export type DiscrepancyCode = (typeof DISCREPANCY_CODES)[number];

/** One thing that was looked at. `requirement` is null where nothing was asked for and still something is wrong. */
export interface Outcome {
  readonly requirement: string | null;
  /** Of the order; null where it concerns the whole certificate. */
  readonly line: number | null;
  readonly ordered: string | null;
  readonly stated: string | null;
  readonly verdict: RequirementVerdict['verdict'];
  /** Whole sentences with the numbers in them. */
  readonly why: string;
  readonly wrong?: { readonly code: DiscrepancyCode; readonly severity: Discrepancy['severity'] };
  /** Worth telling although nothing is wrong. */
  readonly isObservation?: true;
}

type Asked = Pick<Outcome, 'requirement'> & Partial<Pick<Outcome, 'line' | 'ordered' | 'stated'>>;

const outcome = (
  { requirement, line = null, ordered = null, stated = null }: Asked,
  verdict: Outcome['verdict'],
  why: string,
): Outcome => ({ requirement, line, ordered, stated, verdict, why });

export const meets = (asked: Asked, why: string): Outcome => outcome(asked, 'meets', why);
export const notStated = (asked: Asked, why = 'The certificate does not say.'): Outcome =>
  outcome(asked, 'not_stated', why);
export const cannotTell = (asked: Asked, why: string): Outcome => outcome(asked, 'cannot_tell', why);
export const observed = (why: string): Outcome => ({
  ...outcome({ requirement: null }, 'meets', why),
  isObservation: true,
});
/** A discrepancy. `blocks` where the parts are not proved with it, `check` where a person has to look. */
export const wrong = (
  code: DiscrepancyCode,
  asked: Asked,
  why: string,
  severity: Discrepancy['severity'] = 'blocks',
): Outcome => ({ ...outcome(asked, 'fails', why), wrong: { code, severity } });
/** A discrepancy that proves nothing by itself. */
export const doubtful = (code: DiscrepancyCode, asked: Asked, why: string): Outcome => ({
  ...outcome(asked, 'cannot_tell', why),
  wrong: { code, severity: 'check' },
});
