import type { Answer, AnswerValue } from './answers';
import { readingAt } from './codes';
import type { Paper } from './paper';
import { WRITERS, type ReadCell, type ReadLine } from './line-cells';
import { linesInSentences } from './lines-in-sentences';
import { isNext } from './specification';
import { passageFrom as partOf } from '../../layout/passage';

/** All lines: of tables, of the form's fields, of sentences, whichever the certificate has. */
export function readLines(paper: Paper): ReadLine[] {
  const written = paper.answers
    .map(asCount)
    .filter(({ key, also }) => WRITERS[key] ?? also.some((one) => WRITERS[one]));
  const fromTables = tableLines(paper, written);
  const inForms = formLines(
    paper,
    written.filter(({ row }) => row === null || !fromTables.rows.has(row)),
    fromTables.lines.length > 0,
  );
  const lines = fromTables.lines.length > 0 ? complementary(fromTables.lines) : inForms.lines;
  const told = linesInSentences(paper);
  const found = lines.length > 0 ? lines : told;
  completeFrom(found, inForms.shared);
  for (const line of found) {
    const same = told.find(({ part }) => part?.value === line.part?.value);
    if (same && same !== line) completeFrom([line], same);
  }
  for (const line of found) if (line.alloy) line.material ??= line.alloy;
  const none = saidNone(paper);
  if (none) for (const line of found) line.rejected ??= none;
  return withoutRepeats(found);
}

/** "Received 50" and "Shipped 50" ask for a day, unless pieces stand there. */
function asCount(answer: Answer): Answer {
  const counts = { received: 'quantity_received', recd: 'quantity_received', shipped: 'quantity' } as const;
  const [, key] = Object.entries(counts).find(([words]) => words === answer.words.replace(/\W/g, '')) ?? [];
  const [first] = answer.values;
  return answer.key === 'other_date' &&
    key &&
    first &&
    /^[\s:]*\d{1,6}\s*(?:pcs?|ea|pieces|parts)?\.?\s*$/i.test(first.passage.text)
    ? { ...answer, key }
    : answer;
}

/** Two tables may each tell a part of one line: the same part number, and nothing that both tell differently. */
function complementary(lines: readonly ReadLine[]): ReadLine[] {
  const whole: ReadLine[] = [];
  for (const line of lines) {
    const same = whole.find((one) => one.part?.value === line.part?.value && !contradict(one, line));
    if (same) Object.assign(same, { ...line, ...same });
    else whole.push(line);
  }
  return whole;
}

const contradict = (a: ReadLine, b: ReadLine): boolean =>
  (Object.keys(b) as (keyof ReadLine)[]).some(
    (key) => key !== 'part' && a[key] !== undefined && String(a[key].value) !== String(b[key]?.value),
  ) || !(Object.keys(b) as (keyof ReadLine)[]).some((key) => a[key] === undefined);

const NONE_REJECTED =
  /\b(?:no|zero|none of the)\s+(?:parts?|pieces?|pcs\.?|items?)\s+(?:were\s+|was\s+|have been\s+)?rejected\b|\bno\s+rejects\b|\brejects?\s*:\s*(?:none|nil)\b|\bnone\s+(?:were|was)\s+rejected\b|\bkein(?:e)?\s+ausschuss\b|\baucune?\s+(?:pi[eè]ce\s+)?rebut/iu;

/** What is said once of all lines: that no piece was rejected. */
function saidNone({ paragraphs }: Paper): ReadCell<number> | null {
  for (const paragraph of paragraphs) {
    const match = NONE_REJECTED.exec(paragraph.text);
    const read = match && readingAt(paragraph, match.index, match.index + match[0].length, 0);
    if (read) return { ...read, trust: 0.8 };
  }
  return null;
}

function tableLines(paper: Paper, answers: readonly Answer[]): { lines: ReadLine[]; rows: Set<string> } {
  const rows = new Map<string, Answer[]>();
  for (const answer of answers)
    if (answer.row !== null) rows.set(answer.row, [...(rows.get(answer.row) ?? []), answer]);
  const lines: ReadLine[] = [];
  const used = new Set<string>();
  for (const [row, cells] of rows) {
    const parts = cells.filter(({ key, also }) => key === 'part_number' || also.includes('part_number'));
    // Without anything else beside it, it is no line but a field of a form whose values stand below.
    if (parts.length !== 1) continue;
    const line: ReadLine = {};
    for (const answer of cells) write(line, answer, paper, cells);
    if (!line.part) continue;
    lines.push(line);
    used.add(row);
  }
  return { lines, rows: used };
}

/** Writes what a label asks for, and what else it asks for behind a stroke. */
function write(line: ReadLine, answer: Answer, paper: Paper, beside: readonly Answer[]): boolean {
  if (answer.key === 'revision' && ofSpecification(paper, answer, beside)) return false;
  const asked = [answer.key, ...answer.also].filter((key) => WRITERS[key]);
  for (const value of answer.values) {
    const parts = asked.length > 1 ? splitAtStrokes(value, asked.length) : null;
    const done = asked.map((key, index) => WRITERS[key]?.(line, parts?.[index] ?? value, paper) ?? false);
    if (done.some(Boolean)) return true;
  }
  return false;
}

/** "12 / 0" under "Accepted / Rejected"; null where there are not as many parts as questions. */
function splitAtStrokes(value: AnswerValue, count: number): AnswerValue[] | null {
  const { passage } = value;
  const words = passage.text.trim().split(/\s+/);
  const apart =
    words.length === count && !/[/|;]/.test(passage.text) ? /\s+/g : /\s*[/|;]\s*|\s+(?=\d+\s*$)/g;
  const cuts = [...passage.text.matchAll(apart)].filter((_, index) => index < count - 1);
  if (cuts.length !== count - 1) return null;
  const edges = [0, ...cuts.flatMap((cut) => [cut.index, cut.index + cut[0].length]), passage.text.length];
  return Array.from({ length: count }, (_, index) => ({
    ...value,
    passage: partOf(passage, edges[2 * index] ?? 0, edges[2 * index + 1] ?? passage.text.length),
  }));
}

function ofSpecification(paper: Paper, { order, row }: Answer, beside: readonly Answer[]): boolean {
  const owners = row === null ? paper.answers : beside;
  return owners.some(
    (owner) => owner.key === 'specification' && owner.row === row && isNext(paper, owner, order),
  );
}

/** Fields of a form in reading order: each part number begins a line, what stands before the first belongs to it too. */
function formLines(
  paper: Paper,
  answers: readonly Answer[],
  onlyShared: boolean,
): { lines: ReadLine[]; shared: ReadLine } {
  const lines: ReadLine[] = [];
  const before: ReadLine = {};
  for (const answer of answers) {
    const starts = answer.key === 'part_number' || answer.also.includes('part_number');
    if (onlyShared) {
      if (!starts) write(before, answer, paper, []);
      continue;
    }
    const last = lines[lines.length - 1];
    const line: ReadLine = starts || !last ? {} : last;
    if (starts) {
      if (!write(line, answer, paper, [])) continue;
      if (line.part && last?.part && last.part.value === line.part.value)
        Object.assign(last, { ...line, ...last });
      else lines.push(line);
    } else write(last ?? before, answer, paper, []);
  }
  const [first] = lines;
  if (first && lines.length === 1) completeFrom([first], before);
  shareLast(lines);
  return { lines, shared: before };
}

/** Material and lot that stand behind the last of several parts, and at no other, are those of all. */
function shareLast(lines: readonly ReadLine[]): void {
  const last = lines[lines.length - 1];
  const others = lines.slice(0, -1);
  if (!last || others.length === 0) return;
  const { material, lot, heat } = last;
  if (others.some((line) => line.material ?? line.lot ?? line.heat)) return;
  completeFrom(others.length > 1 ? others : [...others, {}], {
    ...(material && { material }),
    ...(lot && { lot }),
    ...(heat && { heat }),
  });
}

/** What is stated once for the whole certificate holds for each line that says nothing else; counts only for a single line. */
function completeFrom(lines: readonly ReadLine[], shared: ReadLine): void {
  for (const line of lines) {
    if (shared.material) line.material ??= shared.material;
    if (shared.lot) line.lot ??= shared.lot;
    if (shared.heat) line.heat ??= shared.heat;
    if (shared.alloy) line.alloy ??= shared.alloy;
    if (lines.length > 1) continue;
    const { accepted, rejected, quantity, received, rev, serials, part } = shared;
    if (part) line.part ??= part;
    if (accepted) line.accepted ??= accepted;
    if (rejected) line.rejected ??= rejected;
    if (quantity) line.quantity ??= quantity;
    if (received) line.received ??= received;
    if (rev) line.rev ??= rev;
    if (serials) line.serials ??= serials;
  }
}

/** The same line once more on a later page, or in the text and the table, is one. */
function withoutRepeats(lines: readonly ReadLine[]): ReadLine[] {
  const key = ({ part, lot, accepted, quantity }: ReadLine): string =>
    [part?.value, lot?.value, accepted?.value ?? quantity?.value].join('|');
  return lines.filter((line, index) => lines.findIndex((other) => key(other) === key(line)) === index);
}

/**
 * Pieces accepted: as stated, or the pieces of the line where none were rejected and no other count is given.
 */
export function acceptedOf({ accepted, quantity, received, rejected }: ReadLine): ReadCell<number> | null {
  if (accepted) return accepted;
  if (quantity && (!rejected || rejected.value === 0)) return quantity;
  if (quantity && rejected && received && quantity.value + rejected.value === received.value) return quantity;
  return received && rejected?.value === 0 ? { ...received, trust: received.trust * 0.8 } : null;
}
