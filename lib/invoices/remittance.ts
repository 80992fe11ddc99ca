import type { Difference, InvoiceLine } from './differences';

/** What of an invoice was paid by one payment, line by line, so that the lines add up to what came. */
export interface Remittance {
  lines: { says: string; pieces: number | null; amountMinor: number }[];
  withheld: { says: string; amountMinor: number }[];
}

interface Given {
  lines: readonly InvoiceLine[];
  differences: readonly (Difference & { clearance: { choice: string } | null })[];
  /** Credits and earlier payments of the same invoice, as they lowered what was owed. */
  entries: readonly { kind: string; amountMinor: number }[];
  paidMinor: number;
}

/**
 * Each line at what is paid for it, then what was taken off the whole. What still differs from the sum that moved
 * (a total that is not its lines' sum, accepted; a part paid before) stands as a line of its own, so that nobody has to
 * guess.
 */
export function remittanceOf({ lines, differences, entries, paidMinor }: Given): Remittance {
  const withheld = differences.filter((one) => one.clearance?.choice === 'withhold' && one.overMinor > 0);
  const paidFor = lines
    .map((line) => ({
      says: line.description,
      pieces: line.pieces,
      amountMinor:
        line.amountMinor - sumOf(withheld.filter((one) => one.seq === line.seq).map((one) => one.overMinor)),
    }))
    .filter((line) => line.amountMinor !== 0);
  const credited = sumOf(
    entries.filter((entry) => entry.kind === 'credited').map((entry) => entry.amountMinor),
  );
  if (credited !== 0) paidFor.push({ says: 'Your credits', pieces: null, amountMinor: credited });
  const before =
    sumOf(
      entries
        .filter((entry) => entry.kind === 'paid' || entry.kind === 'refunded')
        .map((entry) => entry.amountMinor),
    ) + paidMinor;
  if (before !== 0)
    paidFor.push({ says: before < 0 ? 'Paid before' : 'Returned before', pieces: null, amountMinor: before });
  const rest = paidMinor - sumOf(paidFor.map((line) => line.amountMinor));
  if (rest !== 0)
    paidFor.push({ says: 'Difference between the total and its lines', pieces: null, amountMinor: rest });
  return {
    lines: paidFor,
    withheld: withheld.map((one) => ({ says: one.sentence.replace(/\.$/, ''), amountMinor: one.overMinor })),
  };
}

const sumOf = (amounts: readonly number[]): number => amounts.reduce((sum, one) => sum + one, 0);
