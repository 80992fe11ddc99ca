import type { Line } from '../../layout/lines';
import { tablesOf, type Table } from '../../layout/tables';
import type { Passage } from '../../layout/passage';
import { labelAtStart, type FoundLabel } from './find-labels';
import type { LabelKey } from './labels';
import { stepsIn } from './steps';

/** The tables of a page whose headings are labels. */
export function labelledTables(lines: readonly Line[]): Table<FoundLabel>[] {
  return tablesOf<FoundLabel>(lines, {
    read: headingOf,
    // "Process: Stress relief": the second is the first's value.
    holds: ([first, second, ...more]) =>
      more.length > 0 || first?.key !== 'process' || second?.key !== 'process',
    endsTable: ({ text }) => {
      const label = labelAtStart(text);
      return label !== null && label.marked && /:/.test(text.slice(0, label.end));
    },
    isRow: (cells, headings) =>
      isRowOfParts(
        cells,
        headings.map((heading) => heading?.key ?? null),
      ),
    // A part's name under its number.
    begins: (cell, { key }) => key !== 'part_number' || /\d/.test(cell),
    anchors: ({ key }) => key === 'part_number',
  }).map(withPartColumn);
}

/** A line right under a table of parts that has words where part numbers or pieces stand is none of its rows. */
function isRowOfParts(cells: readonly (Passage | null)[], keys: readonly (LabelKey | null)[]): boolean {
  const at = keys.indexOf('part_number');
  const first = cells.find((cell) => cell !== null)?.text ?? '';
  const label = labelAtStart(first);
  if (at < 0)
    return label === null || label.whole || keys[0] === label.key || !/\d/.test(first.slice(label.end));
  // "Furnace #3", "Stress relieve 1100F"
  if (at <= 1 && (stepsIn(first)[0]?.start === 0 || (label !== null && !label.whole))) return false;
  const counts = cells.filter((_, index) => COUNTS.has(keys[index] ?? 'remarks'));
  const part = cells[at]?.text ?? null;
  const alone = cells.filter((cell) => cell !== null).length === 1;
  // A part's name in a line under its number.
  if (part !== null && !/\d/.test(part))
    return alone && part.length < 30 && label === null && stepsIn(part).length === 0;
  return part === null || counts.every((cell) => cell === null || /\d|^[-–]+$|none|nil/i.test(cell.text));
}

const COUNTS: ReadonlySet<LabelKey> = new Set([
  'quantity',
  'quantity_accepted',
  'quantity_rejected',
  'quantity_received',
]);

/** What a cell of a table's heading asks for: a label, or a step whose figures stand under it. */
function headingOf(text: string): FoundLabel | null {
  const label = labelAtStart(text);
  const [step] = stepsIn(text);
  const names = step?.start === 0 && step.end >= text.trimEnd().length ? step.step : null;
  if (label?.whole) return names && !label.step ? { ...label, step: names } : label;
  // "CERTIFICATE" over a number asks for it as "Certificate:" does.
  const asked = labelAtStart(`${text}:`);
  if (asked?.key === 'certificate_number' && asked.whole) return { ...asked, marked: false };
  if (PLACE_OF_TEST.test(text)) return plainHeading('specimen', text);
  // "Cast/lot": one of the two is known.
  const half = text.includes('/') ? text.split('/').map((part) => labelAtStart(part.trim())) : [];
  const known = half.find((one) => one?.whole);
  if (known) return { ...known, words: text.toLowerCase() };
  if (!names) return null;
  return { ...plainHeading('process', text), step: names };
}

/** Columns for the places or pieces of a test: "No. 2", "Specimen 3", "#4". */
const PLACE_OF_TEST =
  /^(?:(?:no|nr|item|line|part|lot|specimen|sample|piece|pc|test|reading|probe|point|place|location|pos)\.?\s*#?|#)\s*\d{1,2}$/i;

function plainHeading(key: FoundLabel['key'], text: string): FoundLabel {
  const words = text.toLowerCase();
  return {
    key,
    words,
    also: [],
    step: null,
    start: 0,
    end: text.length,
    marked: false,
    qualifier: '',
    whole: true,
  };
}

/** What stands beside part numbers. */
const BESIDE_PARTS: ReadonlySet<FoundLabel['key']> = new Set([
  'revision',
  'lot',
  'material',
  'description',
  'quantity',
  'quantity_accepted',
  'quantity_rejected',
]);

/**
 * Lines without a heading for their part numbers have them under the one heading that says nothing to us, or was recognised
 * as something else: "PIN" for "P/N".
 */
function withPartColumn(table: Table<FoundLabel>): Table<FoundLabel> {
  const keys = table.columns.map(({ heading }) => heading?.key ?? null);
  const beside = new Set(keys.filter((key) => key !== null && BESIDE_PARTS.has(key)));
  if (keys.includes('part_number') || beside.size < 3) return table;
  const isCode = (text: string): boolean =>
    /^(?=.*\d)[A-Z0-9][A-Z0-9./-]{3,}(?:\s+rev\.?\s*[A-Z])?$/i.test(text.trim());
  const found = keys.flatMap((key, column) => {
    const cells = table.rows.flatMap(({ cells: row }) => row[column]?.text ?? []);
    return key === null && cells.length > 0 && cells.every(isCode) ? [column] : [];
  });
  const [only] = found;
  if (found.length !== 1) return table;
  return {
    ...table,
    columns: table.columns.map((column, index) =>
      index === only ? { ...column, heading: plainHeading('part_number', column.text) } : column,
    ),
  };
}
