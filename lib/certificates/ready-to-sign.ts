import type { Verdict } from './verdict';

/** A requirement and what was decided about it on this certificate, if anything. */
export interface JudgedRequirement {
  requirementId: string;
  /** Null: of the whole batch. */
  lineId: string | null;
  characteristic: string;
  decision: { verdict: Verdict; overrideReason: string | null } | null;
}

export interface Readiness {
  /** Requirements that bear on the lines being covered. */
  bearing: string[];
  undecided: string[];
  /** Decided against, and not overridden. */
  against: string[];
  pieces: number;
  ready: boolean;
  /** Why it cannot be signed yet, in one sentence. */
  why: string | null;
}

/** Accepted: it meets, or a person accepted it against its verdict and said why. */
export const isAccepted = (decision: { verdict: Verdict; overrideReason: string | null }): boolean =>
  decision.verdict === 'meets' || decision.overrideReason !== null;

/**
 * Whether a certificate can be signed for these lines. What concerns only a line that is not covered now may wait:
 * another certificate, or a later signature, speaks for it.
 */
export function readinessOf(
  requirements: readonly JudgedRequirement[],
  coverage: readonly { lineId: string; pieces: number }[],
): Readiness {
  const covered = new Set(coverage.filter((line) => line.pieces > 0).map((line) => line.lineId));
  const pieces = coverage.reduce((sum, line) => sum + line.pieces, 0);
  const bearing = requirements.filter((one) => one.lineId === null || covered.has(one.lineId));
  const undecided = bearing.filter((one) => one.decision === null);
  const against = bearing.filter((one) => one.decision !== null && !isAccepted(one.decision));
  const why = whyNot({ pieces, undecided, against });
  const ids = (some: readonly JudgedRequirement[]) => some.map((one) => one.requirementId);
  return {
    bearing: ids(bearing),
    undecided: ids(undecided),
    against: ids(against),
    pieces,
    ready: why === null,
    why,
  };
}

function whyNot({
  pieces,
  undecided,
  against,
}: {
  pieces: number;
  undecided: readonly JudgedRequirement[];
  against: readonly JudgedRequirement[];
}): string | null {
  if (undecided.length > 0) return `${undecided.length} to decide before you sign: ${named(undecided)}.`;
  if (against.length > 0)
    return `${named(against)} ${against.length === 1 ? 'is' : 'are'} not met. Override with a reason, hold the pieces, or ask for a corrected certificate.`;
  if (pieces === 0) return 'No pieces are covered yet. Enter how many on each line.';
  return null;
}

const MOST_NAMED = 3;

function named(some: readonly JudgedRequirement[]): string {
  const names = some.slice(0, MOST_NAMED).map((one) => one.characteristic);
  const rest = some.length - names.length;
  return rest > 0 ? `${names.join(', ')} and ${rest} more` : names.join(', ');
}
