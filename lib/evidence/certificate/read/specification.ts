import type { Process } from '../../../trade/process';
import { findSpecifications, type FoundSpecification } from '../../../trade/lineage/recognise-specification';
import { spotIn, type Passage } from '../../layout/passage';
import { TRUST, widestFirst, type Answer } from './answers';
import type { Candidate } from './candidates';
import { revisionIn } from './codes';
import type { Paper } from './paper';
import { ORDERED_BY, ORDERS_NOTHING } from './process-signs';

export interface SpecificationRead {
  /** As it is mostly printed: AMS 2770, MIL-DTL-5541, ASTM B633. */
  readonly number: string;
  readonly revision: string | null;
  /** Type, class, condition that stand behind it. */
  readonly rest: string;
  readonly process: Process | null;
}

/** What the number orders; null where it orders no process that we know. */
export const processOrderedBy = (number: string): Process | null =>
  ORDERED_BY.find(([pattern]) => pattern.test(number))?.[1] ?? null;

/** Before a number in a sentence: the work was done to it. */
const DONE_TO =
  /(?:\bper|\bto|in accordance with|\bI\.?A\.?W\.?|requirements of|conform\w* (?:to|with)|according to|\bacc\.? to|gem(?:ä|a)(?:ß|ss)|nach|selon|suivant|conform[eé]ment [aà]|seg[uú]n|\bspec(?:ification)?\.?:?)\s*(?:the\s+)?(?:requirements of\s+)?$/i;

/** The specifications that the work may have been done to. */
export function specifications(paper: Paper): Candidate<SpecificationRead>[] {
  const asked = paper.answers.flatMap((answer) => (asks(answer) ? fromAnswer(paper, answer) : []));
  const said = paper.paragraphs.flatMap((paragraph) => inText(paragraph));
  return [...asked, ...said];
}

const asks = ({ key, also }: Answer): boolean =>
  key === 'specification' ||
  key === 'process' ||
  key === 'class_type' ||
  key === 'method' ||
  also.includes('specification');

function fromAnswer(paper: Paper, answer: Answer): Candidate<SpecificationRead>[] {
  for (const { passage, how } of widestFirst(answer)) {
    const found = findSpecifications(unslipped(passage.text));
    const candidates = found.flatMap((one, index) => {
      const trust = (answer.key === 'specification' ? 1 : 0.85) * TRUST[how] * (index === 0 ? 1 : 0.7);
      const read = readOf(one);
      const behind = behindStroke(passage.text, one, answer.also.includes('specification_revision'));
      const revision = read.revision ?? behind ?? (index === 0 ? revisionBeside(paper, answer) : null);
      return candidate({ ...read, revision }, one, passage, trust);
    });
    if (candidates.length > 0) return candidates;
  }
  return [];
}

/** "AMS 2759/11 / D"; without room around the stroke only where the revision is asked for too. */
function behindStroke(text: string, { at, length }: FoundSpecification, asked: boolean): string | null {
  const [, room = '', revision = null] =
    /^(\s*)\/\s*([A-Z]|\d{2}[a-z]?)(?![\p{L}\d])/u.exec(text.slice(at + length)) ?? [];
  return asked || room !== '' ? revision : null;
}

/** A label or column "Rev" that goes with this specification and not with a part. */
function revisionBeside(paper: Paper, answer: Answer): string | null {
  const beside = paper.answers.filter(
    ({ key, row, order }) =>
      (key === 'specification_revision' && Math.abs(order - answer.order) < 6000) ||
      (key === 'revision' &&
        (row === null ? isNext(paper, answer, order) : row === answer.row && isNext(paper, answer, order))),
  );
  for (const other of beside)
    for (const { passage } of other.values) {
      const read = revisionIn(passage);
      if (read) return read.value;
    }
  return null;
}

/** No part number stands between the specification and the revision, and both on one line. */
export function isNext(paper: Paper, owner: Answer, order: number): boolean {
  if (order < owner.order || order - owner.order > 1000) return false;
  return !paper.answers.some(
    ({ key, order: between }) =>
      (key === 'part_number' || key === 'specification') && between > owner.order && between < order,
  );
}

function inText(passage: Passage): Candidate<SpecificationRead>[] {
  const text = unslipped(passage.text);
  return findSpecifications(text).flatMap((one) => {
    const read = readOf(one);
    const aside = ORDERS_NOTHING.test(one.number);
    const done = DONE_TO.test(text.slice(0, one.at));
    const [whenDone, otherwise] = read.process ? [0.72, 0.6] : [0.4, 0.2];
    const trust = done ? whenDone : otherwise;
    return candidate(read, one, passage, aside ? 0.02 : trust);
  });
}

function candidate(
  value: SpecificationRead,
  { at, length, number }: FoundSpecification,
  passage: Passage,
  trust: number,
): Candidate<SpecificationRead>[] {
  const spot = spotIn(passage, at, at + length);
  if (!spot) return [];
  const likely = value.process ? trust : trust * 0.85;
  return [{ value, spot, trust: ORDERS_NOTHING.test(number) ? trust * 0.1 : likely }];
}

function readOf({ number, revision, rest }: FoundSpecification): SpecificationRead {
  return { number: number.replace(/^AMS(?=\d)/, 'AMS '), revision, rest, process: processOrderedBy(number) };
}

/** Letters and figures that print takes for one another, where the names of specifications leave no choice. */
const unslipped = (text: string): string =>
  text
    .replace(/\b(?:AM5|A?M\$|ANS(?=\s?27))(?=[\s-]?\d)/g, (slip) => 'AMS'.padEnd(slip.length))
    .replace(
      /\b(AMS\s?)([\dOIlSB]{4})(?=[A-Z]?\b)/g,
      (_, body: string, digits: string) =>
        body + digits.replace(/O/g, '0').replace(/[Il]/g, '1').replace(/S/g, '5').replace(/B/g, '8'),
    )
    .replace(/\bM[I1l][L1I](?=-)/g, 'MIL')
    .replace(/\bQ0(?=-)|\b0Q(?=-)/g, 'QQ')
    .replace(/\bA5TM\b/g, 'ASTM');

/** Two readings of one specification; one may name the revision that the other leaves out. */
export const sameSpecification = (a: SpecificationRead, b: SpecificationRead): boolean =>
  a.number.replace(/\W/g, '') === b.number.replace(/\W/g, '');
