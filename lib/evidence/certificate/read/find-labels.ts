import { folded } from './fold';
import { PHRASES, type Phrase } from './label-phrases';
import type { LabelKey } from './labels';
import { stepsIn, type Step } from './steps';

export interface FoundLabel {
  readonly key: LabelKey;
  /** The label itself, in small letters: "type" is another question than "class". */
  readonly words: string;
  /** What else the same label asks for: "Part No. / Rev". */
  readonly also: readonly LabelKey[];
  /** The step that it speaks of: "Solution temperature". */
  readonly step: Step | null;
  readonly start: number;
  /** Where its value may begin: behind the colon, the dots, the unit in brackets. */
  readonly end: number;
  /** A colon, dots or the like follow: it cannot be a word of a sentence. */
  readonly marked: boolean;
  /** What stands in brackets or behind it and is no value: a unit, a scale. */
  readonly qualifier: string;
  /** Nothing follows in the text it was found in. */
  readonly whole: boolean;
}

/** Numbers of boxes and bullets before a label: "1. Customer", "(3) Part No.", "• Date". */
const LEAD = /^\s*(?:\d{1,2}[.)]\s*|[a-z]\)\s*|\(\s*[\da-z]{1,2}\s*\)\s*|[•*▪□☐✓>·]\s*|[-–]\s+)?/i;

/** What parts label and value: a colon, an equals sign, dots of a leader, a dash with room around it. */
const MARK = /^\s*(?:[.·…_]{2,}\s*:?|(?:\s\.){2,}\s*:?|[:;=]+|\s[-–—]+\s|[-–—]>|»|\|)\s*(?:[.·…_]{3,}\s*)?/;

const UNIT =
  /^[,\s]*(?:[({]([^(){}]{1,40})[)}]|\[([^[\]]{1,40})\]|((?:in\s+)?(?:°\s?[FC]|deg\.?\s?[FC]|[FC]|HR(?:[A-H]|15T|30T|15N|30N|45N)W?|HV\s?\d{0,2}|HBW?|%\s?IACS|IACS|MS\/m|µ-?in|μ-?in|uin|microinch(?:es)?|mils?|µm|μm|um|mm|inch(?:es)?|ksi|MPa|min|mins|minutes|hrs?|hours|h|sec|seconds|s|pcs|ea|%)\.?)(?=\s*(?:[:;=]|\.{2}|…|$)))/i;

/** The label that a text begins with; null where it begins with none. */
export function labelAtStart(text: string): FoundLabel | null {
  const lead = LEAD.exec(text)?.[0].length ?? 0;
  // Figures are folded into letters: "10:36" would begin with "i.O.".
  if (!/[\p{L}#%]/u.test(text.charAt(lead))) return null;
  const plain = folded(text);
  const found = labelAt(text, plain, lead, true);
  // "Sertifikat / Certificate": a language that is not known before one that is.
  const foreign = found ? null : /^[\p{L}][\p{L}\s.°'’-]{1,34}\s?\/\s?(?=\p{L})/u.exec(text.slice(lead));
  const known = foreign && labelAt(text, plain, lead + foreign[0].length, true);
  return known?.whole || known?.marked ? { ...known, start: lead } : found;
}

/**
 * All labels of a text: the one that it begins with, and those further on that a colon or "No." sets apart from the words of
 * a sentence.
 */
export function labelsIn(text: string): FoundLabel[] {
  const plain = folded(text);
  const first = labelAtStart(text);
  const found: FoundLabel[] = first ? [first] : [];
  let at = first ? first.end : 0;
  while (at < text.length) {
    const startsWord =
      at > 0 && /[^a-z0-9&]/.test(plain.charAt(at - 1)) && /[\p{L}#%]/u.test(text.charAt(at));
    const label = startsWord && !isUnitAt(text, at) ? labelAt(text, plain, at, false) : null;
    if (label) found.push(label);
    at = label ? label.end : at + 1;
  }
  return found;
}

/** Behind a figure "HRB" is its unit and asks for nothing. */
const isUnitAt = (text: string, at: number): boolean =>
  /\d\s*$/.test(text.slice(0, at)) &&
  /^(?:HR[A-H]|HR\d\d[TN]|HV|HBW?|F|C|min|mins|minutes|hrs|hours|h|sec|s|pcs|pieces|ea|IACS|% IACS|mils?)(?![\p{L}])/iu.test(
    text.slice(at),
  );

function labelAt(text: string, plain: string, at: number, first: boolean): FoundLabel | null {
  const bare = phraseAt(plain, at);
  const stepped = steppedAt(text, plain, at);
  const best = stepped && stepped.end > (bare?.end ?? 0) ? stepped : bare && { ...bare, step: null };
  if (!best) return null;
  // "OK 74103" is a place in Oklahoma.
  if (/^ok$/i.test(text.slice(at, best.end)) && /^\s+\d{5}(?!\d)/.test(text.slice(best.end))) return null;
  // "L55" is folded into "iss".
  if ((text.slice(at, best.end).match(/\d/g)?.length ?? 0) * 2 > best.end - at) return null;
  // "PO-5001" is a number and no question for one.
  const glued = /^-?\d|^[-/][\p{L}\d]/u.test(text.slice(best.end));
  if (glued && !text.slice(at, best.end).endsWith('#') && !asksTwice(text, plain, best.end)) return null;
  const asked = apart(best.phrase.key, plain.slice(at, best.end));
  const tail = tailOf(text, plain, best.end, asked.key);
  if (best.phrase.needsColon && !/[:=…]|\.{2}/.test(text.slice(best.end, tail.end))) return null;
  const standsOut =
    first || tail.marked || (best.phrase.numbered && /[#.]\s*$|no|num/.test(plain.slice(at, best.end)));
  if (!standsOut) return null;
  return {
    key: asked.key,
    words: text.slice(at, best.end).toLowerCase(),
    also: [...asked.also, ...tail.also],
    step: best.step,
    start: at,
    end: tail.end,
    marked: tail.marked,
    qualifier: tail.qualifier,
    whole: tail.end >= text.trimEnd().length,
  };
}

/** "Acc/Rej": right behind a stroke stands another label and no part of a number. */
const asksTwice = (text: string, plain: string, end: number): boolean =>
  text.charAt(end) === '/' && !/\d/.test(text.charAt(end + 1)) && phraseAt(plain, end + 1) !== null;

/** "Part/Rev" asks for both, "part rev" for the revision. */
function apart(key: LabelKey, words: string): { key: LabelKey; also: readonly LabelKey[] } {
  const owner = { revision: 'part_number', specification_revision: 'specification' } as const;
  return (key === 'revision' || key === 'specification_revision') && /[a-z]\s*\/\s*(?:rev|iss)/.test(words)
    ? { key: owner[key], also: [key] }
    : { key, also: [] };
}

function phraseAt(plain: string, at: number): { phrase: Phrase; end: number } | null {
  let best: { phrase: Phrase; end: number } | null = null;
  for (const phrase of PHRASES.get(plain.charAt(at)) ?? []) {
    phrase.pattern.lastIndex = at;
    const match = phrase.pattern.exec(plain);
    if (!match) continue;
    const end = at + match[0].length;
    if (
      phrase.needsColon &&
      !/^\s*(?:[:/=]|\.{2,}|…|\.?\s*(?:[([][^)\]]{0,40}[)\]]\s*)?[:/])/.test(plain.slice(end))
    )
      continue;
    if (!best || end > best.end) best = { phrase, end };
  }
  return best;
}

/** A step before what is asked of it: "Solution temperature", "Age - start", "Temper soak time". */
function steppedAt(
  text: string,
  plain: string,
  at: number,
): { phrase: Phrase; end: number; step: Step } | null {
  const [step] = stepsIn(text.slice(at));
  if (!step || step.start !== 0) return null;
  const gap =
    /^\s*(?:\([^)]{1,30}\)\s*)?(?:cycle|treatment|heat treat(?:ment)?|furnace|bake)?[\s\-–—,/:]{0,4}/i.exec(
      text.slice(at + step.end),
    );
  for (const skip of [
    gap?.[0].length ?? 0,
    /^[\s\-–—,/:]*/.exec(text.slice(at + step.end))?.[0].length ?? 0,
  ]) {
    const said = phraseAt(plain, at + step.end + skip);
    // A finish is a coating, but of a step it is the end.
    const ends = said?.phrase.key === 'process' && plain.startsWith('finish', at + step.end + skip);
    const found = said && ends ? { ...said, phrase: { ...said.phrase, key: 'time_out' as const } } : said;
    if (found && ATTRIBUTES.has(found.phrase.key)) return { ...found, step: step.step };
  }
  return null;
}

/** What is asked of a step. */
const ATTRIBUTES: ReadonlySet<LabelKey> = new Set([
  'temperature',
  'minutes',
  'time_in',
  'time_out',
  'date',
  'furnace',
  'quench_medium',
]);

interface Tail {
  readonly end: number;
  readonly marked: boolean;
  readonly qualifier: string;
  readonly also: readonly LabelKey[];
}

/** What may stand between a label and its value: another language, a second label, a unit, a colon. */
function tailOf(text: string, plain: string, from: number, key: LabelKey): Tail {
  let end = from + (/^\.(?![.\s]*\.)/.exec(text.slice(from))?.[0].length ?? 0);
  let qualifier = '';
  const also: LabelKey[] = [];
  for (let turn = 0; turn < 6; turn += 1) {
    const second = secondLabel(text, plain, end);
    if (second) {
      if (second.key && second.key !== key && !also.includes(second.key)) also.push(second.key);
      qualifier = `${qualifier} ${text.slice(end, second.end).trim()}`.trim();
      end = second.end;
      continue;
    }
    const [whole = '', inBrackets, inSquare, bare] = UNIT.exec(text.slice(end)) ?? [];
    if (whole === '') break;
    const words = inBrackets ?? inSquare ?? bare ?? '';
    const inside = inBrackets === undefined ? null : phraseAt(folded(inBrackets), 0);
    if (
      inside &&
      inside.end >= (inBrackets ?? '').length - 1 &&
      inside.phrase.key !== key &&
      !also.includes(inside.phrase.key)
    )
      also.push(inside.phrase.key);
    // A value in brackets with digits in it is a value: "(12 pcs)".
    if (inBrackets !== undefined && /\d{2}/.test(inBrackets) && !/hr|hv|hb|mm/i.test(inBrackets)) break;
    qualifier = `${qualifier} ${words}`.trim();
    end += whole.length;
  }
  const mark = MARK.exec(text.slice(end));
  return { end: end + (mark?.[0].length ?? 0), marked: mark !== null, qualifier, also };
}

/** Behind a stroke, an ampersand or "and": the same in another language, or what else is asked for. */
function secondLabel(
  text: string,
  plain: string,
  from: number,
): { key: LabelKey | null; end: number } | null {
  const bridge = /^\s*(?:[/|&+,]|and\b|or\b|et\b|ou\b|und\b|oder\b|[-–](?=\s))\s*/i.exec(text.slice(from));
  if (!bridge) return furtherWords(text, plain, from);
  const at = from + bridge[0].length;
  const found = phraseAt(plain, at);
  if (found) return { key: found.phrase.key, end: found.end + (text.charAt(found.end) === '.' ? 1 : 0) };
  const unknown = /^[\p{L}][\p{L}\s.°'’\-]{1,38}(?=\s*(?:[:(]|$))/u.exec(text.slice(at));
  return unknown && bridge[0].includes('/') ? { key: null, end: at + unknown[0].length } : null;
}

/** "Soak time at temperature", "Hardness required": a second label is a part of the first when nothing else follows it. */
function furtherWords(text: string, plain: string, from: number): { key: LabelKey; end: number } | null {
  const gap = /^[\s,]+/.exec(text.slice(from))?.[0].length ?? 0;
  const found = gap > 0 ? phraseAt(plain, from + gap) : null;
  if (!found) return null;
  const isLast = /^\.?\s*(?:$|[:;=(]|\.{3})/.test(text.slice(found.end));
  const stop = text.charAt(found.end) === '.' ? 1 : 0;
  if (!isLast && !furtherWords(text, plain, found.end + stop)) return null;
  return { key: found.phrase.key, end: found.end + stop };
}
