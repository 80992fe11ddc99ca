import type { Layout } from './layout';
import type { PlainBytes } from './plain-bytes';
import { FAULTY, RowScanner } from './row-scanner';
import { dateIn, secondsIn } from './written-time';

/** The rows of an export as columns; nothing is decided about days yet. */
export interface ScannedRows {
  readonly rows: number;
  /** Seconds of the day where the clock is written, what the column counts where it is numbers. */
  readonly seconds: Float64Array;
  /** The three groups of the date as 10,000, 100 and 1; null where no row has a date. */
  readonly dates: Int32Array | null;
  /** By channel. NaN is no reading, `FAULTY` one that the recorder could not make. */
  readonly values: readonly Float64Array[];
  /** Digits behind the decimal sign, the most of each channel. */
  readonly scales: readonly number[];
  /** Lines among and behind the rows that are none: events, repeated headings, the foot. */
  readonly oddLines: readonly string[];
}

const ODD_LINES_KEPT = 300;

const SKIP = -1;
const TIME = -2;
const DATE = -3;
const HALF_DAY = -4;
const CLOCK_NUMBER = -5;

/** Reads all rows in one pass over the bytes. */
export function scanRows(plain: PlainBytes, layout: Layout): ScannedRows {
  const scanner = new RowScanner(plain, layout.delimiter, layout.decimal);
  const plan = planOf(layout);
  const table = new GrowingTable(estimatedRows(plain), layout.values.length, hasDates(layout));
  const oddLines: string[] = [];
  while (scanner.toNextLine()) {
    const from = scanner.at;
    if (!readRow(scanner, plan, layout, table)) {
      scanner.at = from;
      scanner.skipLine();
      if (table.rows > 0 && oddLines.length < ODD_LINES_KEPT) oddLines.push(plain.textOf(from, scanner.at));
    }
  }
  return { ...table.taken(), oddLines };
}

/** What to do with each column, by its place: a channel's index, or one of the codes. */
function planOf({ clock, values }: Layout): Int8Array {
  const last = Math.max(
    ...values.map(({ column }) => column),
    ...(clock.kind === 'written'
      ? [clock.time.column, clock.date?.column ?? 0, clock.halfDay ?? 0]
      : [clock.column]),
  );
  const plan = new Int8Array(last + 1).fill(SKIP);
  values.forEach(({ column }, index) => (plan[column] = index));
  if (clock.kind === 'numbers') plan[clock.column] = CLOCK_NUMBER;
  else {
    plan[clock.time.column] = TIME;
    if (clock.date) plan[clock.date.column] = DATE;
    if (clock.halfDay !== null) plan[clock.halfDay] = HALF_DAY;
  }
  return plan;
}

const hasDates = ({ clock }: Layout): boolean =>
  clock.kind === 'written' && (clock.time.shape.date !== null || clock.date !== null);

const DATE_SHAPE_NONE = { slots: [] as readonly number[], date: null };

/** One line into the table; false where it is no row, and then nothing was added. */
function readRow(scanner: RowScanner, plan: Int8Array, { clock }: Layout, table: GrowingTable): boolean {
  const timeShape = clock.kind === 'written' ? clock.time.shape : DATE_SHAPE_NONE;
  const dateShape = clock.kind === 'written' && clock.date ? clock.date.shape : DATE_SHAPE_NONE;
  scanner.afternoon = -1;
  let count = Number.NaN;
  let timed = false;
  let readings = 0;
  table.prepare();
  for (let column = 0; column < plan.length; column++) {
    scanner.toCell();
    if (scanner.atLineEnd) break;
    const what = plan[column] ?? SKIP;
    if (what >= 0) {
      const value = scanner.number();
      // Only an empty cell is not a number.
      if (value === value) {
        readings++;
        table.put(what, value, value === FAULTY ? 0 : scanner.scale);
      }
    } else if (what === SKIP) scanner.skipCell();
    else if (what === TIME) timed = scanner.time(timeShape.slots, timeShape.date === 'named');
    else if (what === DATE) {
      if (!scanner.time(dateShape.slots, dateShape.date === 'named')) return false;
    } else if (what === HALF_DAY) scanner.time([], false);
    else {
      count = scanner.number();
      timed = Number.isFinite(count);
    }
  }
  if (!timed || readings === 0) return false;
  const { groups, afternoon } = scanner;
  const seconds = clock.kind === 'numbers' ? count : secondsIn(groups, afternoon);
  if (!(seconds >= 0 || clock.kind === 'numbers')) return false;
  scanner.skipLine();
  table.commit(seconds, dateIn(groups));
  return true;
}

/** From the length of the lines at the beginning, with a little to spare. */
function estimatedRows({ bytes }: PlainBytes): number {
  const upTo = Math.min(bytes.length, 64_000);
  let [feeds, returns] = [1, 1];
  for (let at = 0; at < upTo; at++) {
    if (bytes[at] === 10) feeds++;
    else if (bytes[at] === 13) returns++;
  }
  return Math.ceil((bytes.length / upTo) * Math.max(feeds, returns) * 1.05) + 64;
}

/** Columns that grow as rows come; a row that turns out to be none is written over by the next. */
class GrowingTable {
  rows = 0;
  private seconds: Float64Array;
  private dates: Int32Array | null;
  private values: Float64Array[];
  private readonly scales: number[];

  constructor(
    private room: number,
    channels: number,
    hasDates: boolean,
  ) {
    this.seconds = new Float64Array(room);
    this.dates = hasDates ? new Int32Array(room) : null;
    this.values = Array.from({ length: channels }, () => new Float64Array(room));
    this.scales = Array.from({ length: channels }, () => 0);
  }

  prepare(): void {
    if (this.rows === this.room) this.grow();
    const { rows, values } = this;
    for (const column of values) column[rows] = Number.NaN;
  }

  put(channel: number, value: number, scale: number): void {
    const column = this.values[channel];
    if (column) column[this.rows] = value;
    if (scale > (this.scales[channel] ?? 0)) this.scales[channel] = scale;
  }

  commit(seconds: number, date: number): void {
    this.seconds[this.rows] = seconds;
    if (this.dates) this.dates[this.rows] = date;
    this.rows++;
  }

  taken() {
    const { rows, seconds, dates, values, scales } = this;
    return {
      rows,
      seconds: seconds.subarray(0, rows),
      dates: dates?.subarray(0, rows) ?? null,
      values: values.map((column) => column.subarray(0, rows)),
      scales,
    };
  }

  private grow(): void {
    this.room = Math.ceil(this.room * 1.5);
    const larger = new Float64Array(this.room);
    larger.set(this.seconds);
    this.seconds = larger;
    if (this.dates) {
      const moreDates = new Int32Array(this.room);
      moreDates.set(this.dates);
      this.dates = moreDates;
    }
    this.values = this.values.map((column) => {
      const longer = new Float64Array(this.room);
      longer.set(column);
      return longer;
    });
  }
}
