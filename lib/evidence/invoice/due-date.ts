const NET =
  /\bnet\s*:?\s*(\d{1,3})(?:\s*days?)?\b|\b(\d{1,3})\s*(?:days?|tage?|jours)\s*(?:net(?:to)?|from|after|of|ab|date|fin)?|\bn\/(\d{1,3})\b|\b(?:innerhalb|binnen|within)\s+(?:von\s+)?(\d{1,3})\s*(?:tagen|days)|\b(\d{1,3})\s*net\b/i;
const AT_ONCE =
  /\b(?:due\s+(?:up)?on\s+receipt|upon\s+receipt|payable\s+immediately|c\.?o\.?d\.?|sofort|à\s+réception)\b/i;
/** From the end of the month: which month it is cannot be told for certain. */
const END_OF_MONTH = /\b(?:eom|end\s+of\s+month|fin\s+de\s+mois|monatsende|prox)\b/i;

const MS_PER_DAY = 86_400_000;

/** Days until an invoice is due by its words; a discount for paying earlier is passed over. */
export function daysToPay(terms: string): number | null {
  if (END_OF_MONTH.test(terms)) return null;
  if (AT_ONCE.test(terms)) return 0;
  // "2% 10, net 30" and "2/10 n/30": the discount's days come first.
  const withoutDiscount = terms
    .replace(/\d+(?:[.,]\d+)?\s*%\s*(?:\/|in|for|within|bei)?\s*\d{1,3}(?:\s*(?:days?|tagen?|jours))?/gi, ' ')
    .replace(/\b\d\s*\/\s*\d{1,2}\b/g, ' ');
  const found = NET.exec(withoutDiscount)
    ?.slice(1)
    .find((group) => group !== undefined);
  return found === undefined ? null : Number(found);
}

/**
 * The day on which an invoice is due.
 *
 * @param day `YYYY-MM-DD`
 * @example net 30 from 2026-03-14 is 2026-04-13
 */
export const dayAfter = (day: string, days: number): string =>
  new Date(Date.parse(`${day}T00:00:00Z`) + days * MS_PER_DAY).toISOString().slice(0, 10);
