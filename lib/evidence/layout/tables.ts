import type { Box } from '../page';
import { boxAround, centreOf, heightOf, sharedAcross } from './box';
import { cellsOf } from './cells';
import type { Line, Segment } from './lines';
import { joined, type Passage } from './passage';

/** Cells of the rows under a heading, by the place of their column in it. */
export interface Table<Heading> {
  readonly page: number;
  readonly columns: readonly Column<Heading>[];
  readonly rows: readonly Row[];
  /** The first line of the heading and the first line that no longer belongs to the table, among the page's lines. */
  readonly from: number;
  readonly to: number;
}

export interface Column<Heading> {
  readonly text: string;
  readonly box: Box;
  /** What the heading asks for; null for words that say nothing to us. */
  readonly heading: Heading | null;
}

export interface Row {
  readonly cells: readonly (Passage | null)[];
  readonly box: Box;
}

export interface HeadingReader<Heading> {
  /** What the words of a whole cell ask for, null where they are no heading. */
  readonly read: (text: string) => Heading | null;
  /** Whether such a line is a heading at all: a label beside its value is none. */
  readonly holds?: (headings: readonly (Heading | null)[]) => boolean;
  /** Whether a line of the page can be no row of a table: it begins with a label and its colon. */
  readonly endsTable: (segment: Segment) => boolean;
  /** Whether a line can be a row under these headings; all are where it is not asked. */
  readonly isRow?: (cells: readonly (Passage | null)[], headings: readonly (Heading | null)[]) => boolean;
  /** Whether a cell of that column begins a row; without it all do. */
  readonly begins?: (cell: string, heading: Heading) => boolean;
  /** The column whose cells begin a row; a line without it continues the row above. */
  readonly anchors: (heading: Heading) => boolean;
}

/**
 * The tables of a page: rows under a line, or up to three lines one above the other, most of whose cells are headings.
 */
export function tablesOf<Heading>(lines: readonly Line[], reader: HeadingReader<Heading>): Table<Heading>[] {
  const tables: Table<Heading>[] = [];
  let at = 0;
  while (at < lines.length) {
    const found = headingAt(lines, at, reader);
    const heading = found && {
      ...found,
      columns: withRowHeads(lines.slice(at + found.height, at + found.height + 8), found.columns),
    };
    const table = heading && tableUnder(lines, at, heading, reader);
    if (table) tables.push(table);
    at = table ? Math.max(at + 1, table.to) : at + 1;
  }
  return tables;
}

interface FoundHeading<Heading> {
  readonly columns: readonly Column<Heading>[];
  readonly height: number;
}

function headingAt<Heading>(
  lines: readonly Line[],
  at: number,
  reader: HeadingReader<Heading>,
): FoundHeading<Heading> | null {
  let best: (FoundHeading<Heading> & { known: number }) | null = null;
  for (let height = 1; height <= 3 && at + height <= lines.length; height += 1) {
    const used = lines.slice(at, at + height);
    const [last, before] = [used[height - 1], used[height - 2]];
    if (!last || (before && last.box[1] - before.box[3] > 0.9 * last.height)) break;
    if (
      last.segments.some(
        ({ text }) => /\d.*\d/.test(text.replace(/\([^)]*\)|^\d{1,2}[.)]/g, '')) || text.length > 60,
      )
    )
      break;
    const columns = columnsOf(used).map(({ text, box, parts }) => ({
      text,
      box,
      heading: reader.read(text) ?? (parts.length > 1 ? (readAny(parts, reader) ?? null) : null),
    }));
    const known = columns.filter(({ heading }) => heading !== null).length;
    if (
      known < 2 ||
      known < 0.6 * columns.length ||
      reader.holds?.(columns.map(({ heading }) => heading)) === false
    )
      continue;
    // A second line that is a part of headings leaves them headings; a row of values would not.
    const isPart =
      last.segments.length < columns.length &&
      last.segments.every((segment) => isUnderHeading(segment, columns));
    if (!best || known > best.known || (known === best.known && isPart)) best = { columns, height, known };
  }
  return best;
}

/** Of a heading over several lines that says nothing as a whole, what its last line says, or one above. */
function readAny<Heading>(parts: readonly string[], { read }: HeadingReader<Heading>): Heading | null {
  for (const part of [...parts].reverse()) {
    const heading = read(part);
    if (heading !== null) return heading;
  }
  return null;
}

const isUnderHeading = ({ box }: Segment, columns: readonly Column<unknown>[]): boolean =>
  columns.some((column) => column.heading !== null && sharedAcross(column.box, box) > 0);

/** Rows may begin with words of their own left of all headings: a column without a heading. */
function withRowHeads<Heading>(
  rows: readonly Line[],
  columns: readonly Column<Heading>[],
): readonly Column<Heading>[] {
  const [first] = columns;
  const heads: Box[] = [];
  for (const { segments } of rows) {
    const [head] = segments;
    if (!first || !head || segments.length < 3 || head.box[2] > first.box[0] - heightOf(head.box)) break;
    heads.push(head.box);
  }
  return heads.length === 0 ? columns : [{ text: '', box: boxAround(heads), heading: null }, ...columns];
}

/** Segments that stand above one another are one cell of the heading. */
function columnsOf(lines: readonly Line[]): { text: string; box: Box; parts: string[] }[] {
  const cells: { parts: Segment[]; box: Box }[] = [];
  for (const segment of lines.flatMap(({ segments }) => segments)) {
    const cell = cells.find(({ box }) => sharedAcross(box, segment.box) > 0);
    if (cell) {
      cell.parts.push(segment);
      cell.box = boxAround([cell.box, segment.box]);
    } else cells.push({ parts: [segment], box: segment.box });
  }
  return cells
    .sort((a, b) => a.box[0] - b.box[0])
    .map(({ parts, box }) => {
      const texts = parts.map(({ text }) => text);
      return { text: texts.join(' '), box, parts: texts };
    });
}

function tableUnder<Heading>(
  lines: readonly Line[],
  at: number,
  { columns, height }: FoundHeading<Heading>,
  reader: HeadingReader<Heading>,
): Table<Heading> | null {
  const anchor = Math.max(
    0,
    columns.findIndex(({ heading }) => heading !== null && reader.anchors(heading)),
  );
  const rows: { cells: Passage[][]; box: Box; filled: number }[] = [];
  let to = at + height;
  for (; to < lines.length; to += 1) {
    const [line, above] = [lines[to], lines[to - 1]];
    if (!line || !above || tooFar(line, above, rows) || endsAt(lines, to, columns, reader)) break;
    const cells = cellsOf(line, columns);
    if (rows.length > 0 && reader.isRow) {
      const whole = cells.map((cell) => (cell.length === 0 ? null : joined(cell)));
      const headings = columns.map(({ heading }) => heading);
      if (!reader.isRow(whole, headings)) break;
    }
    const last = rows[rows.length - 1];
    const begins =
      !last ||
      beginsRow(cells[anchor] ?? [], columns[anchor]?.heading, reader) ||
      line.box[1] - last.box[3] > 1.2 * line.height;
    if (!begins) {
      cells.forEach((cell, index) => last.cells[index]?.push(...cell));
      last.box = boxAround([last.box, line.box]);
    } else rows.push({ cells, box: line.box, filled: cells.filter(({ length }) => length > 0).length });
  }
  if (rows.length === 0) return null;
  return {
    page: lines[at]?.page ?? 1,
    columns,
    from: at,
    to,
    rows: rows.map(({ cells, box }) => ({
      box,
      cells: cells.map((cell) => (cell.length === 0 ? null : joined(cell))),
    })),
  };
}

function beginsRow<Heading>(
  cell: readonly Passage[],
  heading: Heading | null | undefined,
  reader: HeadingReader<Heading>,
): boolean {
  if (cell.length === 0) return false;
  return !heading || !reader.begins || reader.begins(joined(cell).text, heading);
}

/** Further below the line above than rows of this table are from one another. */
function tooFar(line: Line, above: Line, rows: readonly { readonly box: Box }[]): boolean {
  const gap = line.box[1] - above.box[3];
  const [first, second] = rows;
  const usual = first && second ? second.box[1] - first.box[3] : 0;
  // Between a heading and its first row a line may have been drawn.
  const most = first ? 2.6 : 3.4;
  return gap > Math.max(most * Math.min(line.height, above.height), 1.7 * usual);
}

function endsAt<Heading>(
  lines: readonly Line[],
  at: number,
  columns: readonly Column<Heading>[],
  reader: HeadingReader<Heading>,
): boolean {
  const line = lines[at];
  if (!line) return true;
  if (line.segments.some((segment) => reader.endsTable(segment))) return true;
  if (headingAt(lines, at, reader) !== null) return true;
  const [only, second, third] = line.segments;
  if (line.segments.some(({ text }) => SUM.test(text))) return true;
  // A note under the table.
  if (/^[*†‡]/.test(only?.text ?? '')) return true;
  // Nothing but labels: the next row of a form whose values stand below.
  if (line.segments.every(({ text }) => text.length > 2 && reader.read(text) !== null)) return true;
  // A label with its value under a table of more columns is a field of its own.
  const isField = columns.length >= 4 || /^\d{1,2}[.)]\s/.test(only?.text ?? '');
  if (only && second && !third && isField && reader.read(only.text) !== null) return true;
  // A sentence under the table, which runs through its columns.
  const crossed = only
    ? columns.filter(({ box }) => centreOf(box) > only.box[0] && centreOf(box) < only.box[2])
    : [];
  return line.segments.length === 1 && crossed.length > 1 && (only?.words.length ?? 0) > 4;
}

/** A row that adds up the others is the last, and none of them. */
const SUM =
  /^(?:grand |sub-?)?(?:totals?|summe|gesamt|sum|avg\.?|average|mean|mittelwert|moyenne|media)\s*:?(?:\s*\d*(?:[.,]\d+)?)$/i;
