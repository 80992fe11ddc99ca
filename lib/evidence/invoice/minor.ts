/** Whole hundredths of a currency: sums of these are exact. */
export const minorOf = (amount: number): number => Math.round(amount * 100);

/** Ten-thousandths: prices of a piece are printed with up to four decimals. */
const FINE = 10_000;

/** Pieces at a price, in hundredths, rounded once at the end as an invoice does. */
export const productMinor = (qty: number, unitPrice: number): number =>
  Math.round((qty * Math.round(unitPrice * FINE)) / (FINE / 100));

export const sumMinor = (amounts: readonly (number | null)[]): number =>
  amounts.reduce<number>((sum, amount) => sum + (amount === null ? 0 : minorOf(amount)), 0);

/** `346.20` */
export const sayMinor = (minor: number): string => {
  const whole = Math.trunc(Math.abs(minor) / 100);
  return `${minor < 0 ? '-' : ''}${whole}.${String(Math.abs(minor) % 100).padStart(2, '0')}`;
};
