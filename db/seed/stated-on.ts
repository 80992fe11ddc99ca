import { readLimit } from '@/lib/readings/limit-words';

/** Requirements that the paper answers by what it is: its order number, its signature. */
const ANSWERED_BY_THE_PAPER = /^(order|signature)/i;

/**
 * What a processor prints about one requirement: a figure inside its limit, or that it was done.
 *
 * @param otherwise figures of a paper that is not as it ought to be, by characteristic.
 */
export function statedOn(
  { characteristic, limit, unit }: { characteristic: string; limit: string; unit: string },
  otherwise: Readonly<Record<string, string>>,
): string | null {
  if (ANSWERED_BY_THE_PAPER.test(characteristic)) return null;
  const given = otherwise[characteristic];
  if (given !== undefined) return `${characteristic}: ${given}`;
  const figures = limit
    .split(', ')
    .flatMap((part) => figureWithin(part, unit) ?? [])
    .join(', ');
  return `${characteristic}: ${figures || limit || 'found good'}`;
}

/** In the middle of two ends, or as far inside one as a careful shop works. */
function figureWithin(words: string, givenUnit: string): string | null {
  const limit = readLimit(words, givenUnit);
  if (!limit) return null;
  const { scale, min, max, unit } = limit;
  const value = min !== null && max !== null ? (min + max) / 2 : min !== null ? min * 1.06 : (max ?? 0) * 0.7;
  const digits = value !== 0 && Math.abs(value) < 1 ? 4 : Number.isInteger(value) ? 0 : 1;
  return [scale, value.toFixed(digits), unit].filter(Boolean).join(' ');
}
