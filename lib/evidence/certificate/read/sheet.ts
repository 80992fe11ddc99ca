import { heightOf, sharedAcross } from '../../layout/box';
import { linesOf, type Line, type Segment } from '../../layout/lines';
import { joined, passageFrom, spotIn, type Passage, type Spot } from '../../layout/passage';
import type { Table } from '../../layout/tables';
import type { Mark, Page } from '../../page';
import { labelAtStart, labelsIn, type FoundLabel } from './find-labels';
import type { LabelKey } from './labels';
import { labelledTables } from './labelled-tables';
import { labelsOnTop } from './labels-on-top';
import { stepsIn, type Step } from './steps';

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
    asked: askedOn(lines, tables, page.number),
    paragraphs: paragraphsOf(lines),
  };
}

interface Labelled {
  readonly segment: Segment;
  readonly labels: readonly FoundLabel[];
  /** Begins with a label that has nothing but its value behind it in the same place, or elsewhere. */
  readonly isLabel: boolean;
}

function askedOn(lines: readonly Line[], tables: readonly Table<FoundLabel>[], page: number): Asked[] {
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
        const before = segment.text.slice(0, label.start);
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

/** What is asked of a step left of a label on its line is asked of the label's step too, when its heading is nearer. */
function sectionBeside(
  lines: readonly Line[],
  index: number,
  segment: Segment,
  left: readonly Labelled[],
): Step | null {
  const own = headingAbove(lines, index, segment);
  const beside = left
    .filter(({ labels }) => labels.some(({ key }) => OF_A_STEP.has(key)))
    .map((one) => headingAbove(lines, index, one.segment))
    .reduce((near, one) => (one.line > near.line ? one : near), own);
  return beside.step;
}

const OF_A_STEP: ReadonlySet<LabelKey> = new Set(['temperature', 'minutes', 'time_in', 'time_out', 'date']);

/** The step that the nearest heading above speaks of. */
const sectionOf = (lines: readonly Line[], index: number, segment: Segment): Step | null =>
  headingAbove(lines, index, segment).step;

interface HeadingAbove {
  readonly step: Step | null;
  /** Index of its line; -1 where there is none. */
  readonly line: number;
}

function headingAbove(lines: readonly Line[], index: number, segment: Segment): HeadingAbove {
  for (let above = index; above >= 0; above -= 1) {
    const line = lines[above];
    // A choice of processes is no heading.
    if (!line || line.segments.filter(({ text }) => stepsIn(text).length > 0).length > 2) continue;
    for (const other of line.segments) {
      if (
        other === segment ||
        !(isHeading(other, line, above === index ? segment : null) || beginsWithStep(other, line))
      )
        continue;
      if (answersLabel(other, line)) continue;
      const beside = above !== index && sharedAcross(other.box, segment.box) <= 0 && line.segments.length > 1;
      if (beside) continue;
      const steps = stepsIn(other.text);
      const [step] = steps;
      if (step) return { step: steps.length === 1 ? step.step : null, line: above };
      if (line.segments.length === 1) return { step: null, line: above };
    }
  }
  return { step: null, line: -1 };
}

/** "Tempering 482 °C (furnace 1)", and what is asked of it beside or below. */
function beginsWithStep(other: Segment, { segments }: Line): boolean {
  const [step, second] = stepsIn(other.text);
  return (
    segments[0] === other &&
    step?.start === 0 &&
    !second &&
    other.words.length < 13 &&
    /\d\s*(?:°|deg|F\b|C\b|hours?\b|hrs?\b|h\b|min\b)/i.test(other.text)
  );
}

/** Words right of a label are its value: the name of a process says what the certificate is of, not where a part begins. */
function answersLabel(other: Segment, { segments }: Line): boolean {
  const before = segments[segments.indexOf(other) - 1];
  return before !== undefined && labelAtStart(before.text)?.whole === true;
}

/** A few words without figures that are no label of a value beside them. Left of the label on its own line also counts. */
function isHeading(other: Segment, line: Line, onLineOf: Segment | null): boolean {
  if (onLineOf && other.box[0] > onLineOf.box[0]) return false;
  const text = other.text.trim().replace(/^(?:section |part )?(?:\d{1,2}|[A-Z])[.)\s]\s*/i, '');
  if (/\d{2}/.test(text) || other.words.length > 7) return false;
  const label = labelAtStart(text);
  const steps = stepsIn(text);
  if (steps.length > 0)
    return (
      label === null ||
      label.key === 'process' ||
      label.key === 'bake' ||
      label.key === 'condition' ||
      !label.marked
    );
  return label === null && line.segments.length === 1 && /^[\p{L}\s&/,.:()\-–]+$/u.test(text);
}

/** Lines that run on in the next one. A line runs on when it is a sentence's and reaches as far right as its neighbours. */
const paragraphsOf = (lines: readonly Line[]): Passage[] =>
  paragraphLines(lines).map((part) => joined(part.flatMap(({ segments }) => segments)));

function paragraphLines(lines: readonly Line[]): Line[][] {
  const paragraphs: Line[][] = [];
  const right = Math.max(0, ...lines.map(({ box }) => box[2]));
  const left = Math.min(right, ...lines.map(({ box }) => box[0]));
  const full = left + 0.8 * (right - left);
  for (const line of lines) {
    const open = paragraphs[paragraphs.length - 1];
    const last = open?.[open.length - 1];
    if (open && last && runsOn(last, line, full)) open.push(line);
    else paragraphs.push([line]);
  }
  return paragraphs;
}

/** A line that ends so is not at its end. */
const GOES_ON = /(?:[,;:–-]|\b(?:and|or|of|the|to|at|on|in|by|per|under|its|our|your|no\.?))$/i;

/** @param full how far right a line of a text reaches at least, unless it is its last. */
function runsOn(last: Line, line: Line, full: number): boolean {
  const words = last.segments.reduce((sum, { words }) => sum + words.length, 0);
  const close = line.box[1] - last.box[3] < 1.1 * Math.max(last.height, line.height);
  const level = Math.abs(line.box[0] - last.box[0]) < 3 * last.height;
  const wide = last.box[2] - last.box[0] > 22 * last.height || words > 8;
  const prose = last.segments.length <= 2 && words >= 5;
  const [first] = line.segments;
  const label = first ? labelAtStart(first.text) : null;
  const before = labelAtStart(last.segments[0]?.text ?? '');
  // Fields and items of a list, each with a label before it.
  const end = last.segments[last.segments.length - 1]?.text ?? '';
  if (label && before && !GOES_ON.test(end)) {
    // Fields and items of a list: each with the same label before it, or shorter than the lines of a text.
    if (label.words === before.words && label.key === before.key) return false;
    if (last.box[2] < full) return false;
  }
  if (label && /[.!]$/.test(end) && last.box[2] < full) return false;
  if (line.segments.length > 2) return false;
  const listed = /^\s*(?:[-–•*·]|\d{1,2}[.)])\s/.test(first?.text ?? '');
  return (
    close &&
    level &&
    wide &&
    prose &&
    !listed &&
    !(label?.marked ?? false) &&
    !(label?.whole && line.segments.length > 1)
  );
}
