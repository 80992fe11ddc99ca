import type { Passage, Spot } from '../../layout/passage';
import type { Row, Table } from '../../layout/tables';
import { labelAtStart, type FoundLabel } from './find-labels';
import type { LabelKey } from './labels';
import type { Sheet } from './sheet';
import { stepsIn, type Step } from './steps';

/** What the document answers to one label. */
export interface Answer {
  readonly key: LabelKey;
  /** The label as it stands, in small letters. */
  readonly words: string;
  readonly also: readonly LabelKey[];
  readonly qualifier: string;
  readonly step: Step | null;
  /** The step of the form's part, which a label that names its own overrules. */
  readonly section: Step | null;
  /** The likeliest first. */
  readonly values: readonly AnswerValue[];
  readonly order: number;
  readonly page: number;
  readonly label: Spot | null;
  /** Row of a table, the same for all answers from it. */
  readonly row: string | null;
  readonly marked: boolean;
  /** Of a registration of the house, as at the foot of a form: it says nothing of this work. */
  readonly registered?: true;
}

export interface AnswerValue {
  readonly passage: Passage;
  readonly how: 'same' | 'right' | 'below' | 'line' | 'column';
}

/** How far a value is believed for where it stands to its label. */
export const TRUST: Readonly<Record<AnswerValue['how'], number>> = {
  same: 0.96,
  right: 0.95,
  below: 0.92,
  line: 0.85,
  column: 0.95,
};

/** Every label of the certificate with what stands for it, from forms and tables alike, in reading order. */
export function answersOf(sheets: readonly Sheet[]): Answer[] {
  return sheets
    .flatMap((sheet) => [
      ...sheet.asked.map(({ label, spot, section, values, order, before }): Answer => ({
        ...(REGISTERED.test(before) && { registered: true as const }),
        key: label.key,
        words: label.words,
        also: label.also,
        qualifier: label.qualifier,
        step: label.step,
        section,
        values,
        order,
        page: sheet.page,
        label: spot,
        row: null,
        marked: label.marked,
      })),
      ...sheet.tables.flatMap((table, index) =>
        answersIn(table, `${sheet.page}.${index}`, sheet.sections[index] ?? null),
      ),
    ])
    .sort((a, b) => a.order - b.order);
}

const REGISTERED =
  /\b(?:(?:AS|EN)\s?9\d{3}|(?:[I1l]SO|nadcap|regist\w+|accredit\w+|A2LA|approv\w+ to|FAA|EASA|repair station|cage)\b)/i;

type LabelTable = Table<FoundLabel>;

function answersIn(table: LabelTable, name: string, section: Step | null): Answer[] {
  return table.rows.flatMap((row, index) => {
    const order = table.page * 1e6 + table.from * 1000 + (index + 1) * 50;
    const from = { table, row, name: `${name}.${index}`, order, section };
    return rowLabelled(from) ?? byColumn(from);
  });
}

interface RowPlace {
  readonly table: LabelTable;
  readonly row: Row;
  readonly name: string;
  readonly order: number;
  readonly section: Step | null;
}

/** Columns that a row's own label asks for: what was found, not what was required. */
const FOUND: ReadonlySet<LabelKey> = new Set(['result']);
const ASIDE: ReadonlySet<LabelKey> = new Set(['requirement', 'verdict', 'remarks']);

/**
 * Answers of a row that begins with its own label: "Hardness | 63 min | 69.0", or "Temperature | 920 °F | 350 °F" under
 * two steps. Null where the columns' headings are the labels.
 */
function rowLabelled({ table, row, name, order, section }: RowPlace): Answer[] | null {
  const headings = table.columns.map(({ heading }) => heading);
  const results = headings.flatMap((heading, index) => (heading && FOUND.has(heading.key) ? [index] : []));
  const steps = headings.flatMap((heading, index) => (index > 0 && heading?.step ? [index] : []));
  const places = headings.flatMap((heading, index) => (heading?.key === 'specimen' ? [index] : []));
  const byStep = steps.length > 1 || (steps.length > 0 && headings[0]?.key === 'test');
  const apart = byStep ? steps : places;
  const asks = results.length > 0 ? results : apart;
  const first = row.cells.findIndex(
    (cell, index) => cell !== null && !/^\d{1,2}\.?$/.test(cell.text) && !asks.includes(index),
  );
  const words = row.cells[first]?.text ?? '';
  const said = labelAtStart(words) ?? labelAtStart(words.replace(/^[^,–-]*[,–-]\s*/, ''));
  // The heading of the first column may ask for all: "Hardness HRB | 1 | 2 | 3".
  const label =
    asks === places && (said === null || said.key === 'result') ? (headings[first] ?? said) : said;
  if (asks.length === 0 || !label) return null;
  const unit = headings.findIndex((heading) => heading?.key === 'unit');
  const aside = row.cells[unit]?.text ?? '';
  const [step] = stepsIn(words);
  return asks.flatMap((column, turn) => {
    const cell = row.cells[column];
    if (!cell) return [];
    return [
      {
        key: label.key,
        words: label.words,
        also: label.also,
        qualifier:
          `${label.qualifier} ${words.slice(label.end)} ${headings[column]?.qualifier ?? ''} ${aside}`.trim(),
        step: headings[column]?.step ?? label.step ?? step?.step ?? null,
        section,
        values: [{ passage: cell, how: 'column' as const }],
        order: order + turn,
        page: table.page,
        label: null,
        // Items side by side: each column is a line of the certificate.
        row:
          asks === places && ASKS_OF_LINES.has(label.key)
            ? `${name.split('.').slice(0, 2).join('.')}.column${column}`
            : name,
        marked: true,
      },
    ];
  });
}

const ASKS_OF_LINES: ReadonlySet<LabelKey> = new Set([
  'part_number',
  'revision',
  'material',
  'lot',
  'heat',
  'serial',
  'quantity',
  'quantity_accepted',
  'quantity_rejected',
  'quantity_received',
]);

function byColumn({ table, row, name, order, section }: RowPlace): Answer[] {
  const namedBy = row.cells.find(
    (cell, index) => cell !== null && namesStep(cell, table.columns[index]?.heading ?? null),
  );
  const [named] = stepsIn(namedBy?.text ?? '');
  const scale = table.columns.findIndex(({ heading }) => heading?.key === 'unit');
  const aside = row.cells[scale]?.text ?? '';
  return table.columns.flatMap(({ heading }, index): Answer[] => {
    const cell = row.cells[index];
    if (!heading || !cell || ASIDE.has(heading.key)) return [];
    // What was found of a step is how long it took.
    const key = heading.key === 'result' && named ? 'minutes' : heading.key;
    return [
      {
        key,
        words: heading.words,
        also: heading.also,
        qualifier: `${heading.qualifier} ${aside}`.trim(),
        step: heading.step ?? (cell === namedBy ? null : (named?.step ?? null)),
        section,
        values: [{ passage: cell, how: 'column' }],
        order: order + index,
        page: table.page,
        label: null,
        row: name,
        marked: true,
      },
    ];
  });
}

/** A cell that says which step the row is of. */
const namesStep = (cell: Passage, heading: FoundLabel | null): boolean =>
  (heading === null || ['process', 'test', 'condition', 'description'].includes(heading.key)) &&
  stepsIn(cell.text).length > 0;

/** What runs on along the line first: a series of readings, or a number and its revision, may stand wide apart. */
export const widestFirst = ({ values }: Answer): AnswerValue[] => {
  const wide = ({ how, passage }: AnswerValue): number => (how === 'line' ? passage.text.length : 0);
  return [...values].sort((a, b) => wide(b) - wide(a));
};

/** The first of an answer's values that is of the shape asked for, with how far its place is to be believed. */
export function fitting<Value>(
  answer: Answer,
  read: (passage: Passage) => { value: Value; spot: Spot } | null,
): { value: Value; spot: Spot; trust: number; how: AnswerValue['how'] } | null {
  for (const { passage, how } of answer.values) {
    const found = read(passage);
    if (found) return { ...found, trust: TRUST[how], how };
  }
  return null;
}
