import type { ProvedRequirement } from '@/lib/certificates/contract';

const MOST_NAMED = 4;

/** The same thing asked of other lines that nobody decided yet: one statement on the page speaks for all of them. */
export function undecidedAlike(
  requirement: ProvedRequirement,
  all: readonly ProvedRequirement[],
): ProvedRequirement[] {
  if (requirement.lineId === null) return [];
  return all.filter(
    (one) =>
      one.id !== requirement.id &&
      one.lineId !== null &&
      one.lineId !== requirement.lineId &&
      one.decision === null &&
      one.characteristic === requirement.characteristic &&
      one.limit === requirement.limit &&
      one.unit === requirement.unit,
  );
}

/** `lines 1, 2 and 3`; many are counted: `all 14 lines`. */
export function linesOf(requirements: readonly Pick<ProvedRequirement, 'lineNo'>[]): string {
  const numbers = requirements.map((one) => one.lineNo ?? 0).sort((a, b) => a - b);
  if (numbers.length > MOST_NAMED) return `all ${numbers.length} lines`;
  return `lines ${numbers.slice(0, -1).join(', ')} and ${numbers.at(-1) ?? ''}`;
}
