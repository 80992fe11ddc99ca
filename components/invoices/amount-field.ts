import { z } from 'zod';

import { parseAmount } from '@/lib/money';

interface AmountWords {
  /** The field in words, as it begins a sentence: "Total". */
  name: string;
  /** A discount is a line below nothing. */
  mayBeNegative?: boolean;
}

/** A sum as it is typed, `1,282.40`, read to minor units. */
export function amountField(words: AmountWords) {
  return z.string().transform((typed, issues) => {
    const read = readAmount(typed, words);
    if (typeof read === 'number') return read;
    issues.addIssue({ code: 'custom', message: read });
    return z.NEVER;
  });
}

/** The same, empty for nothing said. */
export function optionalAmountField(words: AmountWords) {
  return z.string().transform((typed, issues) => {
    if (typed.trim() === '') return null;
    const read = readAmount(typed, words);
    if (typeof read === 'number') return read;
    issues.addIssue({ code: 'custom', message: read });
    return z.NEVER;
  });
}

function readAmount(typed: string, { name, mayBeNegative = false }: AmountWords): number | string {
  const text = typed.trim().replace('−', '-');
  if (text === '') return `${name} is missing. Enter it like 282.40.`;
  const isNegative = text.startsWith('-');
  if (isNegative && !mayBeNegative) return `${name} cannot be below 0.`;
  const minor = parseAmount(isNegative ? text.slice(1) : text);
  if (minor === null) return `${name} is not an amount. Write it like 282.40.`;
  return isNegative ? -minor : minor;
}

/** As one would type it: `1282.40`. */
export const typedAmount = (minor: number | null): string => (minor === null ? '' : (minor / 100).toFixed(2));
