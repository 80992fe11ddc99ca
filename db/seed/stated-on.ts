import { readLimit, type Limit } from '@/lib/readings/limit-words';

/** Requirements that the paper answers by what it is: its order number, its signature. */
const ANSWERED_BY_THE_PAPER = /^(order|signature)/i;

/**
 * What a processor prints about one requirement: a figure inside its limit, or that it was done.
 *
 * @param otherwise figures of a paper that is not as it ought to be, by characteristic.
 * @param day of the work, `YYYY-MM-DD`.
 */
export function statedOn(
  { characteristic, limit, unit }: { characteristic: string; limit: string; unit: string },
  { otherwise, day }: { otherwise: Readonly<Record<string, string>>; day: string },
): string | null {
  if (ANSWERED_BY_THE_PAPER.test(characteristic)) return null;
  const given = otherwise[characteristic];
  if (/^bake start/i.test(characteristic)) return bakeTimes(day, Number(given ?? USUAL_HOURS_TO_BAKE));
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
  const { scale, unit } = limit;
  const value = insideOf(limit);
  return [scale, value.toFixed(digitsOf(value)), unit].filter(Boolean).join(' ');
}

function insideOf({ min, max }: Limit): number {
  if (min !== null && max !== null) return (min + max) / 2;
  return min === null ? (max ?? 0) * 0.7 : min * 1.06;
}

function digitsOf(value: number): number {
  if (Number.isInteger(value)) return 0;
  return Math.abs(value) < 1 ? 4 : 1;
}

const PLATED_AT = 7;
const USUAL_HOURS_TO_BAKE = 2.5;

/** Both moments, so that whoever reads it can reckon the hours between. */
function bakeTimes(day: string, hours: number): string {
  const clock = (at: number) =>
    `${String(Math.floor(at)).padStart(2, '0')}:${String(Math.round((at % 1) * 60)).padStart(2, '0')}`;
  return `Plating completed: ${day} ${clock(PLATED_AT)}\nBake start: ${day} ${clock(PLATED_AT + hours)}`;
}
