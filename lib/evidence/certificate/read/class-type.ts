import { spotIn, type Passage, type Spot } from '../../layout/passage';
import { TRUST, type Answer } from './answers';
import type { Candidate } from './candidates';
import { changeInTwoPlaces, joinedParts } from './class-parts';
import { annealed, wordsIn } from './codes';
import type { Paper } from './paper';

const ROMAN = String.raw`(?:[IVXl1|]{1,4}[A-C]?|\d{1,2}[A-C]?|[A-D])(?![\p{L}\d])`;
const KIND = String.raw`(?:type|SC|class|method|grade|form|ty\.?|cl\.?|gr\.?|sensitivity(?:\s+level)?|level|typ|klasse|classe|tipo|clase|m[eé]thode|methode)`;
const DESIGNATION = new RegExp(
  String.raw`(?<![\p{L}])${KIND}\.?\s*:?\s*${ROMAN}(?:\s*(?:[,;/&]|and|-)?\s*${KIND}\.?\s*:?\s*${ROMAN})*`,
  'giu',
);

/** A temper of aluminium, a condition or a strength of steel. */
const TEMPER = String.raw`(?:T\d{1,5}|O|0|F|W|H\d{2,4}|HT\s?\d{2,3}|Rc?\s?\d{2}|\d{2,3}(?:\s?-\s?\d{2,3})?\s?ksi|N|A|cond(?:ition)?\.?\s?[A-Z]\d*)`;
const CHANGE = new RegExp(
  String.raw`(?:(?<alloy>[A-Z]?\d{4}|\d{2}-\dPH|[\w-]+)\s*-?\s*)?(?<![\p{L}\d])${TEMPER}\s*(?:to|->|→|=>|in|auf|zu|vers|a|=)\s*(?:(?:[A-Z]?\d{4})\s*-?\s*)?${TEMPER}(?![\p{L}\d])`,
  'giu',
);
const ALUMINIUM_CHANGE =
  /(?<![\d-])([1-8]\d{3})\s?-?\s?(O|0|F|W|T\d{1,4}|H\d{2,3})\s*(?:to|->|→|=>|–|nach|auf|en|vers|a|à|into)\s*(?:([1-8]\d{3})\s?-?\s?)?(O|F|W|[T7]\d{1,4})(?![\p{L}\d])/iu;

/**
 * Class, type, method and the like as one designation, or the change of condition that was made.
 *
 * @param behind what stands behind the number of the specification.
 */
export function classTypes(
  paper: Paper,
  behind: { readonly rest: string; readonly spot: Spot } | null,
): Candidate<string>[] {
  const changes = paper.paragraphs.flatMap((paragraph) => changeIn(paragraph));
  const labelled = joinedUp(
    paper.answers.filter(({ key, also }) => key === 'class_type' || also.includes('class_type')),
  );
  const asked = paper.answers.flatMap((answer) => conditionChange(answer));
  const rest = behind ? designation(behind.rest) : null;
  const fromSpecification = rest && behind ? [{ value: rest, spot: behind.spot, trust: 0.9 }] : [];
  const said = paper.paragraphs.flatMap((paragraph) => designationsIn(paragraph));
  return [
    ...joinedParts(paper),
    ...changeInTwoPlaces(paper),
    ...asked,
    ...labelled,
    ...changes,
    ...fromSpecification,
    ...said,
  ];
}

function changeIn(passage: Passage): Candidate<string>[] {
  const match = ALUMINIUM_CHANGE.exec(passage.text);
  const spot = match && spotIn(passage, match.index, match.index + match[0].length);
  if (!match || !spot) return [];
  const [, alloy = '', from = '', again, to = ''] = match;
  const before = from === '0' ? 'O' : from.toUpperCase();
  return [{ value: `${alloy}-${before} to ${again ?? alloy}-${afterTemper(to)}`, spot, trust: 0.9 }];
}

/** A T that was recognised as a 7: tempers begin with letters. */
const afterTemper = (written: string): string => written.toUpperCase().replace(/^7/, 'T');

function conditionChange(answer: Answer): Candidate<string>[] {
  if (answer.key !== 'condition' && answer.key !== 'class_type') return [];
  for (const { passage, how } of answer.values) {
    CHANGE.lastIndex = 0;
    const match = CHANGE.exec(passage.text);
    const spot = match && spotIn(passage, 0, passage.text.length);
    if (spot && !ALUMINIUM_CHANGE.test(passage.text))
      return [{ value: annealed(passage.text.trim()), spot, trust: 0.85 * TRUST[how] }];
  }
  return [];
}

const BEGINS_WITH_NUMERAL = new RegExp(String.raw`^${ROMAN}[\s,]+${KIND}\.?\s*${ROMAN}`, 'iu');

/** What is asked for as type, class and the like. */
function joinedUp(answers: readonly Answer[]): Candidate<string>[] {
  const read = answers.flatMap((answer) => {
    for (const { passage, how } of answer.values) {
      const words = wordsIn(passage);
      if (!words || words.value.length > 60) continue;
      return [{ answer, words, trust: TRUST[how] }];
    }
    return [];
  });
  const parts: { name: string; text: string; spot: Spot; trust: number }[] = [];
  for (const { answer, words, trust } of read) {
    const name = answer.words.replace(/\s*no\.?$/, '').trim();
    // "Class Type II Class 1": the label's last word belongs to the value.
    const last = name.split(/[\s/]+/).at(-1) ?? '';
    const said = designation(BEGINS_WITH_NUMERAL.test(words.value) ? `${last} ${words.value}` : words.value);
    const single =
      /^(?:type|class|grade|typ|klasse|classe|tipo|clase)$/.test(name) &&
      new RegExp(`^${ROMAN}$`, 'iu').test(words.value);
    const text = single ? `${english(name)} ${roman(words.value)}` : (said ?? annealed(words.value));
    if (!single && !said && !/\d/.test(text) && !/^[\p{L}\s,/-]{5,40}$/u.test(text)) continue;
    if (!parts.some((part) => part.text === text)) parts.push({ name, text, spot: words.spot, trust });
  }
  const [first] = parts;
  if (!first) return [];
  return [{ value: first.text, spot: first.spot, trust: first.trust * (parts.length > 1 ? 0.9 : 1) }];
}

const ENGLISH: Readonly<Record<string, string>> = {
  typ: 'Type',
  tipo: 'Type',
  ty: 'Type',
  klasse: 'Class',
  classe: 'Class',
  clase: 'Class',
  cl: 'Class',
  gr: 'Grade',
  methode: 'Method',
  méthode: 'Method',
};
function english(name: string): string {
  const plain = name
    .toLowerCase()
    .replace(/\.$/, '')
    .replace(/^sensitivity(?: level)?$/, 'level');
  if (plain === 'sc') return 'SC';
  return ENGLISH[plain] ?? plain.charAt(0).toUpperCase() + plain.slice(1);
}
const roman = (numeral: string): string =>
  /^[IVXl1|]{2,}[A-C]?$/.test(numeral) && /[IVXl|]/.test(numeral)
    ? numeral.replace(/[l1|]/g, 'I')
    : numeral.replace(/^[l|]$/, 'I');

/** Type, class, method, level and the like in a text, as one. */
export function designation(text: string): string | null {
  DESIGNATION.lastIndex = 0;
  const match = DESIGNATION.exec(text);
  return match && spelled(match[0]);
}

/** Magnetic particle inspection is ordered in words. */
const MEDIUM =
  /\b(?:wet|dry)\b[\s,-]*(?:(?:continuous|residual|fluorescent|visible|magnetic particle|method|powder)\b[\s,-]*){1,3}/giu;

function designationsIn(passage: Passage): Candidate<string>[] {
  const media = [...passage.text.matchAll(MEDIUM)].flatMap((match) => {
    const value = match[0].replace(/[\s,-]+$/, '');
    const spot = spotIn(passage, match.index, match.index + value.length);
    return spot ? [{ value, spot, trust: 0.4 }] : [];
  });
  return [
    ...media,
    ...[...passage.text.matchAll(DESIGNATION)].flatMap((match) => {
      const spot = spotIn(passage, match.index, match.index + match[0].length);
      // "Level 2" alone is a person's, "Method A" alone may be anything.
      const alone = /^(?:level|sensitivity|method|form)/i.test(match[0]);
      return spot ? [{ value: spelled(match[0]), spot, trust: alone ? 0.1 : 0.55 }] : [];
    }),
  ];
}

/** "TYPE II, CL. 2" as "Type II Class 2". */
function spelled(text: string): string {
  return text
    .replace(/\s*[,;/&:]\s*/g, ' ')
    .replace(
      new RegExp(`(${KIND})\\.?\\s*(?=${ROMAN})`, 'giu'),
      (_, word: string) => `${english(word.replace(/\s+/g, ' '))} `,
    )
    .replace(new RegExp(`(?<= )${ROMAN}`, 'giu'), (numeral) => roman(numeral))
    .replace(/\s+/g, ' ')
    .trim();
}

/** The condition after the work. */
export function conditions(paper: Paper, classType: string | null): Candidate<string>[] {
  const asked = paper.answers.flatMap((answer): Candidate<string>[] => {
    if (answer.key !== 'condition' && !answer.also.includes('condition')) return [];
    for (const { passage, how } of answer.values) {
      const last = lastTemper(passage.text);
      const spot = last && spotIn(passage, last.start, last.end);
      if (last && spot) return [{ value: last.value, spot, trust: TRUST[how] }];
    }
    return [];
  });
  const said = paper.paragraphs.flatMap((paragraph) => {
    const match =
      /\b(?:to|in|into)\s+(?:the\s+)?(?:-?(T\d{1,4})\b(?:\s+(?:temper|condition))?|(?:condition|cond\.?|temper)\s+([A-Z]{1,2}\s?\d{2,4}|T\d{1,4}|O)\b)/.exec(
        paragraph.text,
      );
    const spot = match && spotIn(paragraph, match.index, match.index + match[0].length);
    const value = match?.[1] ?? match?.[2];
    return spot && value ? [{ value, spot, trust: 0.7 }] : [];
  });
  const changed = paper.paragraphs.flatMap((paragraph) => {
    const match = ALUMINIUM_CHANGE.exec(paragraph.text);
    const spot = match && spotIn(paragraph, match.index, match.index + match[0].length);
    return match?.[4] && spot ? [{ value: afterTemper(match[4]), spot, trust: classType ? 0.85 : 0.7 }] : [];
  });
  return [...asked, ...said, ...changed];
}

function lastTemper(text: string): { value: string; start: number; end: number } | null {
  const all = [
    ...text.matchAll(
      /(?<![A-Z\d])(T\d{1,5}|H\d{3,4}|HT\s?\d{2,3}|O|W|F|RH\s?\d{3,4}|TH\s?\d{3,4}|\d{2,3}\s?-\s?\d{2,3}\s?ksi|\d{2,3}\s?ksi|\d{2}\s?-\s?\d{2}\s?HRC)(?![A-Z\d])/gi,
    ),
  ];
  const last = all[all.length - 1];
  return last
    ? {
        value: last[0].toUpperCase().replace('KSI', 'ksi'),
        start: last.index,
        end: last.index + last[0].length,
      }
    : null;
}

/** The alloy where it is stated apart from a line's material. */
export function alloys(paper: Paper): Candidate<string>[] {
  const asked = paper.answers.flatMap((answer): Candidate<string>[] => {
    if (answer.key !== 'alloy') return [];
    for (const { passage, how } of answer.values) {
      const words = wordsIn(passage);
      if (words && /\d/.test(words.value) && words.value.length < 40)
        return [{ ...words, trust: TRUST[how] }];
    }
    return [];
  });
  const changed = paper.paragraphs.flatMap((paragraph) => {
    const match = ALUMINIUM_CHANGE.exec(paragraph.text);
    const spot = match && spotIn(paragraph, match.index, match.index + match[0].length);
    return match?.[1] && spot ? [{ value: match[1], spot, trust: 0.6 }] : [];
  });
  return [...asked, ...changed];
}
