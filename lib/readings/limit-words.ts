/** A limit as it is written on an order: `30 to 35`, `15 or less`, `HRB 63 or more`. */
export interface Limit {
  /** The scale of a hardness, where it names one. */
  scale: string | null;
  min: number | null;
  max: number | null;
  unit: string;
}

const NUMBER = '(-?\\d+(?:\\.\\d+)?)';
const SCALE = '(?:(H(?:R(?:\\d+[NT]|[A-Z]W?)|BW?|V|K))\\s+)?';
const UNIT = '\\s*([^\\d\\s,][^,]*?)?';
const FORMS: readonly [RegExp, (found: readonly number[]) => Pick<Limit, 'min' | 'max'>][] = [
  [
    new RegExp(`^${SCALE}${NUMBER}${UNIT}\\s*(?:to|–|-)\\s*${NUMBER}${UNIT}$`, 'i'),
    ([min, max]) => ({ min: min ?? null, max: max ?? null }),
  ],
  [
    new RegExp(`^${SCALE}${NUMBER}${UNIT}\\s*±\\s*${NUMBER}${UNIT}$`, 'i'),
    ([middle = 0, half = 0]) => ({ min: middle - half, max: middle + half }),
  ],
  [
    new RegExp(`^${SCALE}${NUMBER}${UNIT}\\s*or (?:more|over)()()$`, 'i'),
    ([min]) => ({ min: min ?? null, max: null }),
  ],
  [
    new RegExp(`^${SCALE}${NUMBER}${UNIT}\\s*or (?:less|under)(?: after \\w+)?()()$`, 'i'),
    ([max]) => ({ min: null, max: max ?? null }),
  ],
  [new RegExp(`^${SCALE}${NUMBER}${UNIT}()()$`, 'i'), ([both]) => ({ min: both ?? null, max: both ?? null })],
];

/**
 * Reads a limit in the words of an order.
 *
 * @param words as written; a part after a comma is another limit and not read.
 * @param unit stands where the words name none.
 * @returns null where it is no figure: `as ordered`, `on the chart`.
 */
export function readLimit(words: string, unit: string): Limit | null {
  const text = words.trim();
  for (const [form, limitsOf] of FORMS) {
    const found = form.exec(text);
    if (!found) continue;
    const numbers = [found[2], found[4]].filter((one) => one !== undefined && one !== '').map(Number);
    return {
      scale: found[1]?.toUpperCase() ?? null,
      unit: (found[5] || found[3] || unit).trim(),
      ...limitsOf(numbers),
    };
  }
  return null;
}
