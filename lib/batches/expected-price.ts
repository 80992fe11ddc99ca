/** What an order asks money for. */
export interface PricedOrder {
  lotMinimumMinor: number;
  certificationFeeMinor: number;
  lines: readonly { pieces: number; unitPriceMinor: number }[];
}

export interface ExpectedPrice {
  /** What the pieces cost by their prices. */
  workMinor: number;
  /** What is added because the pieces cost less than the lot minimum. */
  toMinimumMinor: number;
  certificationFeeMinor: number;
  totalMinor: number;
}

/**
 * What the invoice of an order should say: the pieces at their prices, brought up to the lot minimum, and the fee for
 * the papers, which the minimum does not swallow.
 *
 * @example minimum 180.00, fee 25.00, 10 pieces at 4.00: 40.00 + 140.00 + 25.00 = 205.00
 */
export function expectedPrice({ lotMinimumMinor, certificationFeeMinor, lines }: PricedOrder): ExpectedPrice {
  const workMinor = lines.reduce((sum, line) => sum + line.pieces * line.unitPriceMinor, 0);
  const toMinimumMinor = lines.length === 0 ? 0 : Math.max(0, lotMinimumMinor - workMinor);
  return {
    workMinor,
    toMinimumMinor,
    certificationFeeMinor,
    totalMinor: workMinor + toMinimumMinor + certificationFeeMinor,
  };
}
