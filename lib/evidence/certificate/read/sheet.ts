import { heightOf, sharedAcross } from '../../layout/box';
import { linesOf, type Line, type Segment } from '../../layout/lines';
import { joined, passageFrom, spotIn, type Passage, type Spot } from '../../layout/passage';
import type { Table } from '../../layout/tables';
import type { Mark, Page } from '../../page';
import { labelAtStart, labelsIn, type FoundLabel } from './find-labels';
import type { LabelKey } from './labels';
import { labelledTables } from './labelled-tables';
import { labelsOnTop } from './labels-on-top';
import { paragraphLines, paragraphsOf } from './paragraphs';
import { sectionBeside, sectionOf } from './sections';
import type { Step } from './steps';

/** A label and what may be its value, the likeliest first. */
export interface Asked {
  readonly label: FoundLabel;
  readonly spot: Spot;
  /** The step in whose part of the form it stands. */
  readonly section: Step | null;
  readonly values: readonly AskedValue[];
  /** Reading order over the whole certificate. */
  readonly order: number;
  /** What stands before the label in the same place. */
  readonly before: string;
}

export interface AskedValue {
  readonly passage: Passage;
  /** Where it stands to its label; `line` is everything up to the line's next label. */
  readonly how: 'same' | 'right' | 'below' | 'line';
}

/** A page taken apart. */
export interface Sheet {
  readonly page: number;
  readonly width: number;
  readonly height: number;
  readonly origin: Page['origin'];
  readonly lines: readonly Line[];
  readonly marks: readonly Mark[];
  readonly tables: readonly Table<FoundLabel>[];
  /** The step in whose part of the form each table stands. */
  readonly sections: readonly (Step | null)[];
  readonly asked: readonly Asked[];
  /** Sentences over all their lines; a line that is none stands alone. */
  readonly paragraphs: readonly Passage[];
}

export function sheetOf(page: Page): Sheet {
  const lines = labelsOnTop(linesOf(page));
  const tables = labelledTables(lines);
  return {
    page: page.number,
    width: page.width,
    height: page.height,
    origin: page.origin,
    lines,
    marks: page.marks,
    tables,
    sections: tables.map(({ from }) => {
      const first = lines[from]?.segments[0];
      return first ? sectionOf(lines, from, first) : null;
    }),
    asked: askedOn(lines, tables, page),
    paragraphs: paragraphsOf(lines),
  };
}

interface Labelled {
  readonly segment: Segment;
  readonly labels: readonly FoundLabel[];
  /** Begins with a label that has nothing but its value behind it in the same place, or elsewhere. */
  readonly isLabel: boolean;
}

/** How far down a page its foot begins. */
const FOOT = 0.88;

function askedOn(
  lines: readonly Line[],
  tables: readonly Table<FoundLabel>[],
  { number: page, height }: Page,
): Asked[] {
  const labelled = lines.map(({ segments }) =>
    segments.map((segment): Labelled => {
      const labels = labelsIn(segment.text);
      // One letter is a revision or a unit.
      const isLabel = segment.text.length > 1 && labels.some(({ whole, marked }) => whole || marked);
      return { segment, labels, isLabel };
    }),
  );
  const asked: Asked[] = [];
  const prose = new Set(
    paragraphLines(lines).flatMap((part) => part.slice(1).map((line) => lines.indexOf(line))),
  );
  labelled.forEach((row, index) => {
    // The cells of a table's heading have their values in the table.
    const inTable = tables.some(({ from, to }) => index >= from && index < to);
    row.forEach(({ segment, labels }, place) => {
      labels.forEach((label, turn) => {
        if (inTable && (label.whole || !label.marked)) return;
        // In the middle of a sentence the first word of a line is no label.
        if (prose.has(index) && !label.marked && !(label.whole && row.length > 1)) return;
        const until = labels[turn + 1]?.start ?? segment.text.length;
        const spot = spotIn(segment, label.start, label.end);
        if (!spot) return;
        const values = valuesOf({ label, until, segment, place, index, lines, labelled });
        const section = sectionBeside(lines, index, segment, row.slice(0, place)) ?? null;
        // At the foot of a page its whole line tells what a number is of.
        const left = segment.box[1] > FOOT * height ? row.slice(0, place).map((one) => one.segment.text) : [];
        const before = [...left, segment.text.slice(0, label.start)].join(' ');
        asked.push({
          label,
          spot,
          section,
          values,
          before,
          order: page * 1e6 + index * 1000 + place * 10 + turn,
        });
      });
    });
  });
  return asked;
}

interface Place {
  readonly label: FoundLabel;
  readonly until: number;
  readonly segment: Segment;
  readonly place: number;
  readonly index: number;
  readonly lines: readonly Line[];
  readonly labelled: readonly (readonly Labelled[])[];
}

function valuesOf(where: Place): AskedValue[] {
  const { label, until, segment } = where;
  const same = passageFrom(segment, label.end, until);
  const last = until === segment.text.length;
  const right = last ? toTheRight(where) : [];
  const below = last ? belowIt(where) : null;
  const values: AskedValue[] = [];
  // "N/A" is an answer: nothing that stands further on is one.
  if (NOTHING.test(same.text) || (same.text.trim() === '' && NOTHING.test(right[0]?.text ?? ''))) return [];
  if (/[\p{L}\p{N}]/u.test(same.text)) {
    values.push({ passage: same, how: 'same' });
    if (right.length > 0) values.push({ passage: joined([same, ...right]), how: 'line' });
    return values;
  }
  const [next] = right;
  if (next) values.push({ passage: next, how: 'right' });
  // Dots of a leader may be read as letters: what comes behind them is tried too.
  for (const further of right.slice(1)) values.push({ passage: further, how: 'line' });
  if (right.length > 1) values.push({ passage: joined(right), how: 'line' });
  if (below) {
    const value: AskedValue = { passage: below, how: 'below' };
    // Without a colon a label looks down first where its neighbour is no value but stands in another column's row.
    if (
      next &&
      !label.marked &&
      startsLevel(segment, below) &&
      !closeBy(segment, next) &&
      !(/\d/.test(next.text) && !/\d/.test(below.text))
    )
      values.unshift(value);
    else values.push(value);
  }
  return values;
}

const NOTHING = /^[\s:]*(?:n\.?\/?a\.?|not applicable|none|-{1,3}|—)\s*$/i;

const startsLevel = ({ box }: Segment, below: Segment): boolean =>
  Math.abs(box[0] - below.box[0]) < 3 && below.box[1] - box[3] < 0.9 * heightOf(below.box);

const closeBy = ({ box }: Segment, next: Segment): boolean => next.box[0] - box[2] < 4 * heightOf(box);

/** "Method 1 Type 2" is what "Class" asks for, and no question. */
const isPartOf = (first: FoundLabel, asking: FoundLabel): boolean =>
  first.key === asking.key ||
  (DESIGNATES.has(first.key) && (DESIGNATES.has(asking.key) || asking.key === 'condition'));
const DESIGNATES: ReadonlySet<LabelKey> = new Set([
  'class_type',
  'method',
  'sensitivity',
  'ndt_type',
  'personnel_level',
  'specification',
]);

/** A label and a figure for it in one place; least and most belong to the readings before them. */
const saysValue = ({ start, end, words }: FoundLabel, text: string): boolean =>
  start < 4 && !/^(?:min|max)/.test(words) && /\d/.test(text.slice(end));

/** What follows on the line, up to the next label. */
function toTheRight({ label, labelled, index, place }: Place): Segment[] {
  const following: Segment[] = [];
  for (const { segment, labels, isLabel } of (labelled[index] ?? []).slice(place + 1)) {
    // A label with its value in one place, without a colon: "Delay 7 s".
    const [first] = labels;
    if (isLabel || (first && !isPartOf(first, label) && saysValue(first, segment.text))) break;
    if (/[\p{L}\p{N}]/u.test(segment.text)) following.push(segment);
  }
  return following;
}

/** What stands right under the label, in its column. */
function belowIt({ segment, index, lines, labelled }: Place): Segment | null {
  const height = heightOf(segment.box);
  for (let next = index + 1; next < Math.min(lines.length, index + 4); next += 1) {
    const line = lines[next];
    if (!line || line.box[1] - segment.box[3] > 2.6 * Math.max(height, line.height * 0.8)) return null;
    const under = (labelled[next] ?? []).filter(
      (other) =>
        sharedAcross(other.segment.box, segment.box) > 0 ||
        Math.abs(other.segment.box[0] - segment.box[0]) < height,
    );
    const [found] = under.sort(
      (a, b) => Math.abs(a.segment.box[0] - segment.box[0]) - Math.abs(b.segment.box[0] - segment.box[0]),
    );
    if (!found) continue;
    const [first] = found.labels;
    // The same in another language, under the label: look past it.
    if (first?.whole && first.key === labelAtStart(segment.text)?.key) continue;
    return found.isLabel ? null : found.segment;
  }
  return null;
}
