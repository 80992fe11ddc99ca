import { cellsOf, isFault, isNumber, type Decimal, type Delimiter } from './cells';
import { clockColumnsOf, type ClockColumns } from './clock-columns';
import { columnsOf, isCounting, isOfNumbers, type Column } from './columns';
import type { ChartCorrections } from './corrections';
import { dialectOf } from './dialect';
import { headingsOf, type Heading } from './heading';
import type { SampleLines } from './sample-lines';
import { timeShapeOf } from './time-shape';

export interface ValueColumn {
  readonly column: number;
  readonly name: string;
  /** Heading with unit. */
  readonly words: string;
}

/** Everything one must know to scan the rows of an export. */
export interface Layout {
  readonly delimiter: Delimiter;
  readonly decimal: Decimal;
  readonly clock: ClockColumns;
  readonly clockHeading: Heading | undefined;
  readonly values: readonly ValueColumn[];
  /** What stands before the table. */
  readonly preamble: readonly string[];
}

/** So many rows tell what a column is; those from further on tell what it becomes. */
const ROWS_SEEN = 400;

/**
 * Finds the table in an export: its dialect, headings, clock and columns of numbers.
 *
 * @returns null where there is no table of times and numbers.
 */
export function layoutOf(sample: SampleLines, corrections: ChartCorrections): Layout | null {
  const dialect = dialectOf(sample, corrections);
  if (!dialect) return null;
  const { delimiter, decimal, width } = dialect;
  const isRow = (line: string) => isRowOf(cellsOf(line, delimiter), width, decimal);
  const first = sample.head.findIndex(isRow);
  if (first < 0) return null;
  const above = withoutBreaksInQuotes(sample.head.slice(0, first));
  const { headings, lines } = headingsOf(above, dialect);
  const rows = [...sample.head.slice(first, first + ROWS_SEEN), ...sample.further]
    .filter(isRow)
    .map((line) => cellsOf(line, delimiter));
  const columns = columnsOf(rows, width, decimal);
  const clock = clockColumnsOf(columns, headings, corrections);
  if (!clock) return null;
  const values = columns
    .filter((column) => isChannel(column, clock, headings[column.at]))
    .map(({ at }, index) => {
      const heading = headings[at];
      return { column: at, name: heading?.name || `Channel ${index + 1}`, words: heading?.words ?? '' };
    });
  if (values.length === 0) return null;
  const preamble = above.slice(0, Math.max(0, above.length - lines));
  return { delimiter, decimal, clock, clockHeading: headings[clockColumn(clock)], values, preamble };
}

/** A quoted heading may go on in the next line. */
function withoutBreaksInQuotes(lines: readonly string[]): readonly string[] {
  const whole: string[] = [];
  let open = false;
  for (const line of lines) {
    if (open) whole[whole.length - 1] = `${whole[whole.length - 1] ?? ''} ${line}`;
    else whole.push(line);
    if ((line.split('"').length - 1) % 2 === 1) open = !open;
  }
  // A quote that is never closed was none.
  return open ? lines : whole;
}

const clockColumn = (clock: ClockColumns): number =>
  clock.kind === 'written' ? clock.time.column : clock.column;

/** A row has about as many cells as the others, a time or a number in it, and hardly any words. */
function isRowOf(cells: readonly string[], width: number, decimal: Decimal): boolean {
  if (cells.length < Math.max(2, width - 1) || cells.length > width + 1) return false;
  const filled = cells.filter((cell) => cell !== '');
  const numbers = cells.filter((cell) => isNumber(cell, decimal));
  const times = filled.filter((cell) => timeShapeOf(cell) !== null);
  const faults = filled.filter(isFault);
  if (numbers.length + times.length === 0 || numbers.length + faults.length === 0) return false;
  const [start] = filled;
  // A heading of bare numbers, `Time,1,2,3`, begins with a word.
  if (start !== undefined && !isNumber(start, decimal) && timeShapeOf(start) === null && times.length === 0) {
    return false;
  }
  return numbers.length + times.length + faults.length >= filled.length * 0.4;
}

/** Thermocouples that were dead all along print no number, so their name decides. */
const THERMOCOUPLE = /\b(?:t[ce]|t|ch(?:annel)?|thermo\w*|couple|load|part|temp\w*)[\s_#.-]*\d+/i;
const ROW_NUMBER =
  /^(?:no|nr|n°|#|nº|index|idx|row|rec(?:ord)?|sample|scan|seq\w*|point|lfd\W*nr|zeile|id|num(?:ber)?)\.?\s*(?:#|no\.?|nr\.?|number)?$/i;

function isChannel(column: Column, clock: ClockColumns, heading: Heading | undefined): boolean {
  const ofClock =
    clock.kind === 'written' ? [clock.time.column, clock.date?.column, clock.halfDay] : [clock.column];
  if (ofClock.includes(column.at)) return false;
  const name = heading?.name ?? '';
  if (ROW_NUMBER.test(name)) return false;
  if (isOfNumbers(column)) return !isCounting(column) && !/elapsed|epoch|unix|\btime\b|zeit\b/i.test(name);
  return column.faults >= column.filled && THERMOCOUPLE.test(name);
}
