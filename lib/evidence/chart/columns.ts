import { isFault, isNumber, numberIn, type Decimal } from './cells';
import { timeShapeOf, type TimeShape } from './time-shape';

/** What the cells of one column are, over the rows that were looked at. */
export interface Column {
  readonly at: number;
  readonly filled: number;
  readonly numbers: number;
  readonly faults: number;
  /** The most common way of writing times, and in how many cells. */
  readonly shape: TimeShape | null;
  readonly shaped: number;
  readonly halfDays: number;
  /** Of the numbers, in the order of the rows. */
  readonly values: readonly number[];
}

/** Looks at each column of a table. */
export const columnsOf = (
  rows: readonly (readonly string[])[],
  width: number,
  decimal: Decimal,
): readonly Column[] =>
  Array.from({ length: width }, (_, at) =>
    columnOf(
      at,
      rows.map((row) => row[at] ?? ''),
      decimal,
    ),
  );

function columnOf(at: number, cells: readonly string[], decimal: Decimal): Column {
  const filled = cells.filter((cell) => cell !== '');
  const shapes = new Map<string, { shape: TimeShape; length: number; count: number }>();
  for (const cell of filled) {
    const shape = timeShapeOf(cell);
    if (!shape) continue;
    const key = shape.slots.join(' ');
    const before = shapes.get(key);
    // The shortest way of writing shows which groups have no leading zero.
    const shorter = before && before.length <= cell.length;
    shapes.set(key, {
      shape: shorter ? before.shape : shape,
      length: Math.min(before?.length ?? cell.length, cell.length),
      count: (before?.count ?? 0) + 1,
    });
  }
  const common = [...shapes.values()].toSorted((one, other) => other.count - one.count)[0];
  const numbers = filled.filter((cell) => isNumber(cell, decimal));
  return {
    at,
    filled: filled.length,
    numbers: numbers.length,
    faults: filled.filter(isFault).length,
    shape: common?.shape ?? null,
    shaped: [...shapes.values()].reduce((sum, { count }) => sum + count, 0),
    halfDays: filled.filter((cell) => /^[ap]\.?m\.?$/i.test(cell)).length,
    values: numbers.map((cell) => numberIn(cell, decimal)),
  };
}

/** A column whose filled cells are mostly times. */
export const isOfTimes = (column: Column): boolean =>
  column.filled > 0 && column.shaped >= column.filled * 0.8 && column.shape !== null;

/** A column whose filled cells are mostly numbers, or what stands for a number that could not be measured. */
export const isOfNumbers = (column: Column): boolean =>
  column.filled > 0 && column.numbers > 0 && column.numbers + column.faults >= column.filled * 0.6;

/** Whether the numbers grow, but for a few where a clock was set or a page begins anew. */
export function isGrowing({ values }: Column): boolean {
  const falls = values.filter((value, at) => at > 0 && value < (values[at - 1] ?? value)).length;
  return (
    values.length >= 2 && falls <= values.length * 0.02 && (values[values.length - 1] ?? 0) > (values[0] ?? 0)
  );
}

/** Whole numbers one after the other, from the beginning or in the first column: the number of the row. */
export const isCounting = ({ at, values }: Column): boolean =>
  values.length >= 3 &&
  (at === 0 || values[0] === 0 || values[0] === 1) &&
  values.filter((value, row) => row > 0 && value - (values[row - 1] ?? value) === 1).length >=
    (values.length - 1) * 0.9;
