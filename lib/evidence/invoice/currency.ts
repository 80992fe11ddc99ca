const CODES = ['USD', 'EUR', 'GBP', 'CAD', 'AUD', 'CHF', 'NZD', 'SEK', 'NOK', 'DKK'] as const;
const SIGNS: readonly (readonly [RegExp, string])[] = [
  [/\b(?:CA|C|CDN)\s?\$/, 'CAD'],
  [/\b(?:AU|A)\s?\$/, 'AUD'],
  [/\bNZ\s?\$/, 'NZD'],
  [/\bUS\s?\$/, 'USD'],
  [/€|\bEuro?\b/, 'EUR'],
  [/£/, 'GBP'],
  [/\$/, 'USD'],
];

/** A code counts beside a sum, in brackets or behind a word of money: CAD may be cadmium. */
const namedIn = (text: string, code: string): number =>
  text.match(
    new RegExp(
      String.raw`[.,]\d{2}\s?${code}(?![A-Za-z])|(?<![A-Za-z])${code}\s?[-(]?\d+[.,]\d|[([]\s?${code}\s?[)\]]|(?:currency|total|amount|due|betrag|summe|prices?|pay(?:able)?|montant|in)\s*:?\s*(?:are\s+)?(?:in\s+)?${code}(?![A-Za-z])`,
      'gi',
    ),
  )?.length ?? 0;

/**
 * The currency of an invoice: the code that is named most often, else that of the sign before its sums. A plain dollar
 * sign is taken for US dollars.
 *
 * @returns ISO 4217; null where neither is there.
 */
export function currencyOf(text: string): string | null {
  const named = CODES.map((code) => ({
    code,
    times: namedIn(text, code),
  }))
    .filter(({ times }) => times > 0)
    .toSorted((a, b) => b.times - a.times);
  return named[0]?.code ?? SIGNS.find(([sign]) => sign.test(text))?.[1] ?? null;
}
