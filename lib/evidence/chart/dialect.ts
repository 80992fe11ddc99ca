import { cellsOf, isFault, isNumber, type Decimal, type Delimiter } from './cells';
import type { ChartCorrections } from './corrections';
import type { SampleLines } from './sample-lines';
import { timeShapeOf } from './time-shape';

export interface Dialect {
  readonly delimiter: Delimiter;
  readonly decimal: Decimal;
  /** How many cells most rows have. */
  readonly width: number;
}

const DELIMITERS = ['\t', ';', ',', '|', ' '] as const;
const DECIMALS = ['.', ','] as const;
/** A preamble is not longer than this, and the dialect does not change behind it. */
const HEAD_LINES = 250;
/** Spaces may part the cells of any table: they are believed only where nothing else makes rows of nearly as many lines. */
const SPACES_MUST_EXPLAIN = 2;

/**
 * Delimiter and decimal sign, told by which of them makes the most lines into rows of numbers and times.
 *
 * @returns null where none makes a table.
 */
export function dialectOf(sample: SampleLines, corrections: ChartCorrections): Dialect | null {
  const lines = [...sample.head.slice(0, HEAD_LINES), ...sample.further]
    .filter((line) => line.trim() !== '')
    .slice(0, 2 * HEAD_LINES);
  let best: (Dialect & { score: number; rows: number }) | null = null;
  for (const delimiter of corrections.delimiter ? [corrections.delimiter] : DELIMITERS) {
    for (const decimal of corrections.decimal ? [corrections.decimal] : DECIMALS) {
      const found = tried(lines, delimiter, decimal);
      if (!found) continue;
      const better =
        best === null ||
        (delimiter === ' ' && best.delimiter !== ' '
          ? found.rows > best.rows * SPACES_MUST_EXPLAIN
          : found.score > best.score);
      if (better) best = { delimiter, decimal, ...found };
    }
  }
  return best;
}

/** How many lines are rows of the most common width, and how many of their cells can be read. */
function tried(lines: readonly string[], delimiter: Delimiter, decimal: Decimal) {
  const byWidth = new Map<number, { rows: number; score: number }>();
  for (const line of lines) {
    const cells = cellsOf(line, delimiter);
    const readable = cells.filter((cell) => isReadable(cell, decimal)).length;
    const filled = cells.filter((cell) => cell !== '').length;
    if (cells.length < 2 || readable < 2 || readable < filled * 0.4) continue;
    const found = byWidth.get(cells.length) ?? { rows: 0, score: 0 };
    byWidth.set(cells.length, { rows: found.rows + 1, score: found.score + readable });
  }
  const [widest] = [...byWidth].toSorted(([, one], [, other]) => other.score - one.score);
  return widest && { width: widest[0], ...widest[1] };
}

const isReadable = (cell: string, decimal: Decimal): boolean =>
  isNumber(cell, decimal) || isFault(cell) || timeShapeOf(cell) !== null;
