/** Where a rule of money begins and ends, and how its ticks are set; in minor units. */
export interface MoneyScale {
  from: number;
  to: number;
  tick: number;
  number: number;
}

/** Round figures around what is marked, with some room on both sides; a sum alone gets a rule from nothing. */
export function moneyScale(sums: readonly number[]): MoneyScale {
  const [low, high] = [Math.min(...sums), Math.max(...sums)];
  const span = high - low > 0 ? high - low : Math.max(high, 100);
  const number = roundStep(span / 6);
  const from = high - low > 0 ? Math.max(0, Math.floor((low - span * 0.15) / number) * number) : 0;
  const to = Math.max(from + number, Math.ceil((high + span * 0.15) / number) * number);
  return { from, to, tick: number / 5, number };
}

/** 1, 2 or 5 times a power of ten, and never finer than one whole unit of money. */
function roundStep(about: number): number {
  const power = 10 ** Math.floor(Math.log10(Math.max(about, 100)));
  const factor = [1, 2, 5, 10].find((one) => one * power >= about) ?? 10;
  return Math.max(100, factor * power);
}

export interface RuleLabel {
  at: number;
  says: string;
  tone: 'ink' | 'held' | 'proved';
}

export interface PlacedLabel extends RuleLabel {
  x: number;
  left: number;
  row: number;
}

/** Marks at one sum share a label; labels that would touch stand in rows above each other. */
export function placeLabels(
  labels: readonly RuleLabel[],
  placeOf: (at: number) => number,
  width: number,
): PlacedLabel[] {
  const ends: number[] = [];
  return [...labels]
    .sort((a, b) => a.at - b.at)
    .map((label) => {
      const x = placeOf(label.at);
      const wide = label.says.length * 7.4;
      const left = Math.max(0, Math.min(x - 4, width - wide));
      const free = ends.findIndex((end) => end + 10 <= left);
      const row = free === -1 ? ends.length : free;
      ends[row] = left + wide;
      return { ...label, x, left, row };
    });
}
