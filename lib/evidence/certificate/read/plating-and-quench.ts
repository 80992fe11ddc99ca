import { passageFrom, spotIn, type Passage } from '../../layout/passage';
import { fitting, type Answer } from './answers';
import type { Candidate } from './candidates';
import { readingAt, type Reading } from './codes';
import { isLimit } from './cycle-attributes';
import { dayOf } from './dates';
import { momentsIn } from './moments';
import type { Paper } from './paper';
import { durationsIn, numberFrom } from './quantities';
import { localMinute, workDaysOf } from './work-days';

const PLATED =
  /\b(?:plating|plate|plt\.?|platt\w*|cadmiage|zingage|beschichtung|d[eé]p[oô]t)\s+(?:was\s+)?(?:\w+\s+)?(?:compl\w*\.?|finish\w*|end\w*|stopp?\w*|out|termin\w*|beendet)|out of (?:the\s+)?plating(?:\s+(?:tank|bath|line|solution))?|removed from (?:the\s+)?(?:plating|tank|bath)(?:\s+(?:tank|bath|line|solution))?|left (?:the\s+)?plating(?:\s+(?:tank|bath|line|solution))?|plated (?:at|on|:)|(?:cadmium|zinc)\s+plated/giu;

/** When the parts came out of the plating bath. */
export function platingEnds(paper: Paper): Candidate<string>[] {
  const days = workDaysOf(paper);
  const asked = paper.answers.flatMap((answer): Candidate<string>[] => {
    if (answer.key !== 'plating_end' && !(answer.key === 'time_out' && isPlatingRow(paper, answer)))
      return [];
    const found = fitting(answer, (passage) => momentOf(paper, passage, days.at(answer.row, answer.order)));
    return found ? [found] : [];
  });
  if (asked.length > 0) return asked;
  return paper.paragraphs.flatMap((paragraph): Candidate<string>[] => {
    return [...paragraph.text.matchAll(PLATED)].flatMap((match) => {
      const end = match.index + match[0].length;
      const found = momentOf(paper, passageFrom(paragraph, end, clauseEnd(paragraph.text, end)), null);
      return found ? [{ ...found, trust: 0.75 }] : [];
    });
  });
}

/** The row of a record of operations that tells of the plating. */
function isPlatingRow({ answers }: Paper, { row }: Answer): boolean {
  const words = answers.flatMap((one) =>
    one.row === row &&
    one.row !== null &&
    (one.key === 'process' || one.key === 'description' || one.key === 'remarks')
      ? one.values.map(({ passage }) => passage.text)
      : [],
  );
  return words.some(
    (text) =>
      /\b(?:plat(?:e|ed|ing)|cad(?:mium)?|zinc|nickel|chrom(?:e|ium))\b/i.test(text) &&
      !/\b(?:strike|bak\w+|clean\w*|relief|pre-?plate|post-?plate)\b/i.test(text),
  );
}

const clauseEnd = (text: string, from: number): number => {
  const stop = text.slice(from).search(/[;]|\.\s|\bbak(?:e|ed|ing)\b/i);
  return stop < 0 ? text.length : from + stop;
};

function momentOf(paper: Paper, passage: Passage, workDay: string | null): Reading<string> | null {
  for (const { day, time, start, end } of momentsIn(passage.text, true)) {
    const value = localMinute(day ? dayOf(day, paper.dayOrder) : workDay, time);
    if (value) return readingAt(passage, start, end, value);
  }
  return null;
}

const DELAY =
  /(?:quench\s*delay|furnace[- ]to[- ]quench|door[- ]to[- ]quench|(?:time|delay) to quench|delay|transfer(?:red)?(?:\s+time)?|quench(?:ed)?(?:\s+\w+){0,5}\s+(?:within|in|after)|within|abschreckverzug|verzug|d[eé]lai)\W+(?:\w+\s+){0,5}?(?=\d)/giu;
/** "7 sec transfer", "6 s quench delay". */
const BEFORE_DELAY =
  /(?<![\d.,-])(?=\d+(?:[.,]\d+)?\s*-?\s*(?:s|secs?|seconds?)\.?\s+(?:max\.?\s+)?(?:quench|transfer|delay|to quench|from (?:furnace|door)))/giu;
const SECONDS = /^(\d+(?:[.,]\d+)?)\s*-?\s*(?:s|sec|secs|seconds?|sek\.?|sekunden|secondes?)(?![\p{L}])/iu;

/** Seconds from opening the furnace until the parts are in the quench. */
export function quenchDelays(paper: Paper): Candidate<number>[] {
  const asked = paper.answers.flatMap((answer): Candidate<number>[] => {
    if (answer.also.includes('requirement')) return [];
    if (answer.key === 'quench_delay' || answer.key === 'quench_medium') {
      const found = fitting(answer, (passage) =>
        answer.key === 'quench_delay' ? secondsOf(paper, passage, answer) : secondsBeside(paper, passage),
      );
      return found ? [found] : [];
    }
    return [];
  });
  if (asked.length > 0) return asked;
  return paper.paragraphs.flatMap((paragraph) => {
    const found: Candidate<number>[] = [];
    for (const match of [...paragraph.text.matchAll(DELAY), ...paragraph.text.matchAll(BEFORE_DELAY)]) {
      const at = match.index + match[0].length;
      const seconds = SECONDS.exec(paragraph.text.slice(at));
      const spot = seconds && spotIn(paragraph, match.index, at + seconds[0].length);
      if (!seconds || !spot) continue;
      const limit =
        /max|allow|limit|requir/i.test(match[0]) ||
        isLimit(paragraph.text, { start: at, end: at + seconds[0].length });
      const within = /^within/i.test(match[0]);
      const stated = limit ? 0.2 : 0.8;
      // "Within 10 seconds" may be what is allowed; what is stated of the load stands elsewhere then.
      found.push({
        value: numberFrom(seconds[1] ?? '', paper.decimal),
        spot,
        trust: within ? 0.6 : stated,
      });
    }
    return found;
  });
}

function secondsOf(paper: Paper, passage: Passage, { qualifier, words }: Answer): Reading<number> | null {
  const all = durationsIn(passage.text, paper.decimal);
  const best =
    all.find((one) => !isLimit(passage.text, one) && one.value < 10) ??
    (all.length === 1 ? all[0] : undefined);
  if (best) return readingAt(passage, best.start, best.end, Math.round(best.value * 600) / 10);
  const bare = /^\D{0,3}(\d{1,3}(?:[.,]\d+)?)\s*(?:["”″]|s\w*)?\s*(?:$|[(/])/.exec(passage.text);
  const known =
    /\b(?:s|secs?|seconds?|sek)\b/i.test(`${qualifier} ${words}`) ||
    /["”″]/.test(passage.text) ||
    words.includes('delay') ||
    words.includes('verzug');
  return bare && known
    ? readingAt(passage, 0, bare[0].length, numberFrom(bare[1] ?? '', paper.decimal))
    : null;
}

/** "Oil, 9 s" where the medium was asked for. */
function secondsBeside(paper: Paper, passage: Passage): Reading<number> | null {
  const all = durationsIn(passage.text, paper.decimal).filter(
    (one) => one.value < 1 && !isLimit(passage.text, one),
  );
  const [only] = all;
  return only && all.length === 1
    ? readingAt(passage, only.start, only.end, Math.round(only.value * 600) / 10)
    : null;
}

const MEDIA: readonly (readonly [RegExp, string])[] = [
  [/\b(?:polymer|glycol|glykol|pag|uc?on)\b/iu, 'polymer'],
  [/\b(?:water|wasser|eau|agua|acqua|vann|vatten|h2o)\b/iu, 'water'],
  [/(?:\boil|(?:ö|\bo)l(?:bad)?|\bhuile|\baceite)(?![\p{L}])/iu, 'oil'],
  [/\b(?:nitrogen|stickstoff|azote|n2)\b/iu, 'nitrogen'],
  [/\b(?:argon)\b/iu, 'argon'],
  [/\b(?:salt|salz|sel)\b/iu, 'salt'],
  [/\b(?:brine)\b/iu, 'brine'],
  [/\b(?:air|luft|aire?)\b/iu, 'air'],
];

const QUENCHED =
  /(?:quench(?:ed|ing|ant)?|abgeschreckt|tremp[eé]e?s?)\s+(?:\w+\s+){0,4}?(?:in|into|with|dans|en|medium|media)?\s*:?\s*|\b(?=(?:oil|water|polymer|glycol|air)[- ]quench)/iu;

export function quenchMedia(paper: Paper): Candidate<string>[] {
  const asked = paper.answers.flatMap((answer): Candidate<string>[] => {
    if (answer.key !== 'quench_medium') return [];
    const found = fitting(answer, (passage) => mediumIn(passage, 0, passage.text.length));
    return found ? [found] : [];
  });
  const said = paper.paragraphs.flatMap((paragraph): Candidate<string>[] => {
    const match = QUENCHED.exec(paragraph.text);
    const found =
      match &&
      mediumIn(paragraph, match.index, Math.min(paragraph.text.length, match.index + match[0].length + 40));
    return found ? [{ ...found, trust: 0.7 }] : [];
  });
  return [...asked, ...said];
}

/** The medium that is named first. */
function mediumIn(passage: Passage, from: number, until: number): Reading<string> | null {
  const text = passage.text.slice(from, until);
  const found = MEDIA.flatMap(([pattern, value]) => {
    const match = pattern.exec(text);
    return match ? [{ value, at: match.index, length: match[0].length }] : [];
  }).sort((a, b) => a.at - b.at);
  const [first] = found;
  return first ? readingAt(passage, from + first.at, from + first.at + first.length, first.value) : null;
}
