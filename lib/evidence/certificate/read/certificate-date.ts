import { boxAround } from '../../layout/box';
import { spotIn, type Passage } from '../../layout/passage';
import type { Answer } from './answers';
import { TRUST } from './answers';
import type { Candidate } from './candidates';
import { daysIn, dayOf } from './dates';
import type { LabelKey } from './labels';
import type { Paper } from './paper';

/** How far a label speaks for the date of the certificate. */
const WEIGHT: Partial<Record<LabelKey, number>> = { certificate_date: 1, date: 0.9 };

/** Words before a day that make it another day than the certificate's. */
const ANOTHER =
  /(?:received|rec'?d|shipped|ship|due|order(?:ed)?|process(?:ed|ing)?|plat(?:ed|ing)|bak(?:ed?|ing)|inspect(?:ed|ion)|test(?:ed)?|calibrat\w*|cal\.?|expir\w*|valid|print(?:ed)?|revis\w*|rev|start(?:ed)?|end(?:ed)?|in|out|from|to|on|soak\w*|age\w*|quench\w*|eingang\w*|between|until|form|effective)\.?\s*(?:date|on|the|:)?\s*:?\s*$/i;

/**
 * Days that may be the certificate's. The value is null where the day is written so that it cannot be told from another.
 */
export function certificateDates(paper: Paper): Candidate<string | null>[] {
  const found = candidatesOn(paper);
  return found.map((one) => (isLikelyOnly(paper, one.spot.raw) ? { ...one, trust: one.trust * 0.6 } : one));
}

/** It could be another day in the other order, and no day of the document shows which is meant. */
function isLikelyOnly({ isDayOrderShown }: Paper, raw: string): boolean {
  const [day] = daysIn(raw);
  return !isDayOrderShown && day?.dayFirst !== day?.monthFirst && day?.shows === null;
}

function candidatesOn(paper: Paper): Candidate<string | null>[] {
  const asked = paper.answers.flatMap((answer) => fromAnswer(paper, answer));
  if (asked.some(({ trust }) => trust > 0.6)) return asked;
  return [...asked, ...standingAlone(paper), ...inSentences(paper)];
}

/** "our certificate of conformity no. 26-118, dated 7 March 2026", over the end of a line too. */
function inSentences(paper: Paper): Candidate<string | null>[] {
  return paper.paragraphs.flatMap((paragraph) =>
    daysIn(paragraph.text).flatMap((found): Candidate<string | null>[] => {
      const spot = spotIn(paragraph, found.start, found.end);
      const before = paragraph.text.slice(Math.max(0, found.start - 90), found.start);
      if (!spot || !NUMBERED_AND_DATED.test(before)) return [];
      return [{ value: dayOf(found, paper.dayOrder), spot, trust: 0.65 }];
    }),
  );
}

function fromAnswer(paper: Paper, answer: Answer): Candidate<string | null>[] {
  const weight = WEIGHT[answer.key];
  if (weight === undefined || (answer.key === 'date' && answer.step)) return [];
  for (const { passage, how } of answer.values) {
    const [found] = daysIn(passage.text);
    const spot = found && spotIn(passage, found.start, found.end);
    if (!found || !spot) continue;
    // Far behind the label it answers something else.
    if (found.start > 24) continue;
    const beside = answer.key === 'date' && belongsToSignature(paper, answer);
    const stamp = beside ? 0.6 : 1;
    // In the part of the form that tells of a step it may be the day of the work.
    const inStep = answer.key === 'date' && answer.section !== null && !beside ? 0.5 : 1;
    const inTable = answer.row && answer.key === 'date' && isWorkRow(paper, answer) ? 0.3 : 1;
    return [
      { value: dayOf(found, paper.dayOrder), spot, trust: TRUST[how] * weight * stamp * inTable * inStep },
    ];
  }
  return [];
}

/** Among the cells of the same row are times or temperatures: it is the day of the work. */
const isWorkRow = (paper: Paper, answer: Answer): boolean =>
  paper.answers.some(
    ({ row, key }) => row === answer.row && (key === 'temperature' || key === 'time_in' || key === 'minutes'),
  );

/** The date beside a signature says when it was signed, which need not be the certificate's date but mostly is. */
function belongsToSignature(paper: Paper, answer: Answer): boolean {
  const { label } = answer;
  if (!label) return false;
  return paper.answers.some(
    ({ key, page, label: other }) =>
      (key === 'signature' || key === 'signer' || key === 'signer_title') &&
      page === answer.page &&
      other !== null &&
      Math.abs(other.box[1] - label.box[1]) < 60,
  );
}

/** A day that stands by itself near the top, as in a letter. */
function standingAlone(paper: Paper): Candidate<string | null>[] {
  return paper.sheets
    .slice(0, 1)
    .flatMap((sheet) =>
      sheet.lines.flatMap((line) =>
        line.segments.flatMap((segment) => dayAlone(paper, segment, line.box[1] / sheet.height)),
      ),
    );
}

function dayAlone(paper: Paper, segment: Passage, down: number): Candidate<string | null>[] {
  const [found] = daysIn(segment.text);
  if (!found) return [];
  const before = segment.text.slice(0, found.start);
  const numbered = NUMBERED_AND_DATED.test(before);
  if (!numbered && paper.answers.some((answer) => coversOther(answer, segment))) return [];
  const spot = spotIn(segment, found.start, found.end);
  if (!spot || ANOTHER.test(before) || /\d:\d\d/.test(segment.text)) return [];
  const alone =
    before.replace(/^[^,]{0,30},\s*$/, '').trim().length < 3 && segment.text.length - found.end < 3;
  const said = /\b(?:dated|date|issued|certified|signed)\b[^.]{0,20}$/i.test(before) || numbered ? 0.7 : 0;
  const trust = alone && down < 0.45 ? 0.75 : Math.max(said, alone ? 0.5 : 0);
  return trust > 0 ? [{ value: dayOf(found, paper.dayOrder), spot, trust }] : [];
}

/** "Certificat N° 26-118 du", "Zeugnis Nr. 4711 vom". */
const NUMBERED_AND_DATED =
  /\b(?:certificat\w*|cert|zeugnis\w*|bescheinigung\w*|report|certificado|certificato)\b(?:(?!order|\bp\.?o\b)[^;]){0,50}(?:\b(?:du|vom|dtd|dated|issued(?: on)?|of|del|de fecha)|\d\S*\s*[-–,·|/])\s*$/i;

/** The segment is what another label than a plain date asks for. */
function coversOther(answer: Answer, segment: Passage): boolean {
  if (answer.key === 'date' || answer.key === 'certificate_date') return false;
  const here = segment.words[0];
  const value = answer.values[0]?.passage.words[0];
  if (!here || !value || value.page !== here.page) return false;
  const box = boxAround(segment.words.map((word) => word.box));
  return value.box[0] >= box[0] - 1 && value.box[2] <= box[2] + 1 && Math.abs(value.box[1] - here.box[1]) < 2;
}
