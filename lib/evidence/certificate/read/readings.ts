import { findSpecifications } from '../../../trade/lineage/recognise-specification';
import { boxAround } from '../../layout/box';
import { passageFrom, spotIn, type Passage, type Spot } from '../../layout/passage';
import { TRUST, widestFirst, type Answer } from './answers';
import { daysIn } from './dates';
import type { Paper } from './paper';
import { numberFrom, type DecimalSign } from './quantities';
import { isKind, KINDS, NUMBERS, SAID, UNITS, type ReadingKind } from './reading-kinds';

export interface ReadReading {
  readonly kind: ReadingKind;
  readonly unit: string | null;
  readonly values: readonly number[];
  readonly spot: Spot;
  readonly trust: number;
}

/** All readings: of the forms and tables; where those have none of a kind, of the sentences. */
export function readReadings(paper: Paper): ReadReading[] {
  const asked: (ReadReading & { readonly group: string })[] = [];
  for (const answer of paper.answers) {
    const kind = kindAsked(answer);
    if (kind === null) continue;
    const isLimit = answer.also.includes('requirement');
    const values = widestFirst(answer);
    for (const { passage: whole, how } of values) {
      const passage = isLimit ? behindFound(whole) : whole;
      const found = passage && valuesIn(passage, kind, `${answer.qualifier} ${answer.words}`, paper.decimal);
      if (!found) continue;
      const group = answer.row?.split('.').slice(0, 2).join('.') ?? '';
      asked.push({ kind, ...found, trust: TRUST[how], group });
      break;
    }
  }
  const kinds = new Set(asked.map(({ kind }) => kind));
  const said = paper.paragraphs.flatMap((paragraph) => inSentences(paragraph, paper, kinds));
  const sure = new Set([...kinds, ...said.map(({ kind }) => kind)]);
  const bare = paper.paragraphs.flatMap((paragraph) => besideUnit(paragraph, paper, sure));
  return merged([...asked, ...said, ...bare]);
}

/** "Required 84 HRB min.; found 87, 88": what was found. Null where nothing says that it was. */
function behindFound(passage: Passage): Passage | null {
  const match = /\b(?:found|actuals?|results?|achieved|measured|obtained|observed|ist)\b\W*/iu.exec(
    passage.text,
  );
  return match && passageFrom(passage, match.index + match[0].length);
}

/** What the label asks for; a column of results says it by its unit alone. */
function kindAsked({ key, qualifier }: Answer): ReadingKind | null {
  if (isKind(key)) return key;
  if (key !== 'result') return null;
  return (
    (['hardness', 'conductivity', 'thickness'] as const).find((kind) =>
      UNITS[kind].some(({ name, pattern }) => name !== 'in' && name !== 'mm' && pattern.test(qualifier)),
    ) ?? null
  );
}

const UNIT_TELLS: readonly (readonly [ReadingKind, RegExp])[] = [
  [
    'hardness',
    new RegExp(
      String.raw`(?<![\p{L}\d.])(?:HR[A-H]\s*:?\s*${NUMBERS}|${NUMBERS}\s*HR[A-H])(?![\p{L}\d.])`,
      'iu',
    ),
  ],
  ['conductivity', new RegExp(String.raw`(?<![\p{L}\d.])${NUMBERS}\s*%?\s*IACS`, 'iu')],
];

/** Figures whose unit says of itself what they are of: "30.4 / 30.6 % IACS". */
function besideUnit(
  passage: Passage,
  paper: Paper,
  known: ReadonlySet<ReadingKind>,
): (ReadReading & { group: string })[] {
  return UNIT_TELLS.flatMap(([kind, pattern]) => {
    const match = known.has(kind) ? null : pattern.exec(withoutLimits(passage.text, kind));
    const found =
      match &&
      valuesIn(passageFrom(passage, match.index, match.index + match[0].length), kind, '', paper.decimal);
    return found ? [{ kind, ...found, trust: 0.6, group: '' }] : [];
  });
}

/** Readings of one kind and unit are one series: rows of a table, places of a form. The same series twice is once. */
function merged(readings: readonly (ReadReading & { readonly group: string })[]): ReadReading[] {
  const series: (ReadReading & { readonly group: string })[] = [];
  for (const reading of readings) {
    const at = series.findIndex(
      ({ kind, unit }) =>
        kind === reading.kind && (unit === reading.unit || unit === null || reading.unit === null),
    );
    const known = series[at];
    if (!known) series.push(reading);
    else if (known.unit === null && reading.unit !== null && String(known.values) === String(reading.values))
      series[at] = reading;
    else if (
      !isWithin(reading.values, known.values) ||
      (reading.group !== '' && reading.group === known.group)
    )
      series[at] = {
        ...known,
        values: [...known.values, ...reading.values],
        spot: around(known.spot, reading.spot),
      };
  }
  return series.map(({ kind, unit, values, spot, trust }) => ({ kind, unit, values, spot, trust }));
}

const isWithin = (few: readonly number[], many: readonly number[]): boolean =>
  few.every((value) => many.includes(value));

const around = (a: Spot, b: Spot): Spot =>
  a.page === b.page ? { ...a, raw: `${a.raw} ${b.raw}`, box: boxAround([a.box, b.box]) } : a;

/** Limits are not readings: "(63 min)", "required: 28.5 - 32.5", "≥ 63 HRB". */
const LIMITS: readonly RegExp[] = [
  /\([^()]*(?:\bmin|\bmax|req|spec|limit|≥|≤|[<>]|accept|soll|\bto\b)[^()]*\)?/giu,
  /(?:\breq(?:uire(?:ment|d)s?|'?d|\.)?|\bspec(?:ification|ified|\.)?|\bmin(?:imum|\.)?|\bmax(?:imum|\.)?|\blimits?|\bnominal|\btarget|\bsoll\w*|\bavg\.?|\baverage|\bmean|\bmittel\w*|≥|≤|>=|<=|[<>])\s*(?:is|of|value|range|limits?)?\s*:?\s*(?:[A-Z%/µμ]{1,6}\s*)?\d+(?:[.,]\d+)?(?:\s*(?:-|–|to|\/)\s*\d+(?:[.,]\d+)?)?\s*(?:[%A-Za-zµμ/°]{1,10})?(?:\s*(?:min|max)\w*)?/giu,
  /\d+(?:[.,]\d+)?\s*(?:[%A-Za-zµμ/]{0,10})\s*(?:\bmin(?:imum)?\b|\bmax(?:imum)?\b|\breq(?:uired|'?d)\b)\.?(?!\s*[:=])/giu,
  /\b(?:specimens?|samples?|test\s?(?:piece)?s?|pieces?|pc|no\.?|#|reading|probe|s\/?n)\s*(?:no\.?\s*|#\s*)?\d{1,3}\s*[:.)=]/giu,
  /\d+\s*of\s*\d+(?:\s*(?:pcs|pieces|tested|parts|samples|specimens))?/giu,
  /\d+\s*(?:readings?|places?|pcs?|pieces?|samples?|specimens?|tests?|kgf?|kg|gf|g|kHz|measurements?|locations?|parts?)\b/giu,
];

/** Only inches are written so, with nothing before the point. */
const IN_INCHES = /(?<![\d.])\.00\d/;

const STATISTICS: readonly RegExp[] = [
  /\bmin(?:imum)?\.?\s*[:=]?\s*\d*\.?\d/iu,
  /\bmax(?:imum)?\.?\s*[:=]?\s*\d*\.?\d/iu,
  /\b(?:avg|average|mean|mittel\w*|moy(?:enne)?|ø)\.?\s*[:=]?\s*\d*\.?\d/iu,
];

function valuesIn(
  passage: Passage,
  kind: ReadingKind,
  about: string,
  sign: DecimalSign,
): { values: number[]; unit: string | null; spot: Spot } | null {
  const text = withoutLimits(passage.text, kind);
  const unit =
    UNITS[kind].find(({ pattern }) => pattern.test(text)) ??
    UNITS[kind].find(({ pattern }) => pattern.test(about)) ??
    UNITS[kind].find(({ pattern }) => pattern.test(passage.text)) ??
    (kind === 'thickness' && IN_INCHES.test(text)
      ? UNITS.thickness.find(({ name }) => name === 'in')
      : undefined);
  const figures = new RegExp(
    sign === ','
      ? String.raw`(?<![\p{L}\d.,])\d+(?:[.,]\d+)?`
      : String.raw`(?<![\p{L}\d.])(?:\d{1,3}(?:,\d{3})+|\d*\.\d+|\d+)`,
    'gu',
  );
  const found = [...text.matchAll(figures)].flatMap((match) => {
    const end = match.index + match[0].length;
    const value = numberFrom(match[0], sign);
    const [low, high] = unit?.range ?? (kind === 'thickness' ? [NaN, NaN] : [5, 1200]);
    return value >= low && value <= high && !/^[\p{L}]/u.test(stripUnit(text.slice(end), kind))
      ? [{ value, start: match.index, end }]
      : [];
  });
  const [first] = found;
  const last = found[found.length - 1];
  const spot = first && last && spotIn(passage, first.start, last.end);
  if (!spot) return null;
  return { values: found.map(({ value }) => value), unit: unit?.name ?? null, spot };
}

/** A unit right behind a figure is no word that it belongs to. */
const stripUnit = (after: string, kind: ReadingKind): string => {
  for (const { pattern } of UNITS[kind]) {
    const match = pattern.exec(after);
    if (match && match.index <= 1) return after.slice(match.index + match[0].length);
  }
  return after;
};

/** As long as before, with limits, days and specifications blanked out. */
function withoutLimits(text: string, kind: ReadingKind): string {
  let plain = text;
  const blank = (start: number, end: number): void => {
    plain = plain.slice(0, start) + ' '.repeat(end - start) + plain.slice(end);
  };
  for (const { at, length } of findSpecifications(plain)) blank(at, at + length);
  for (const { start, end } of daysIn(plain)) blank(start, end);
  if (kind !== 'conductivity')
    for (const match of plain.matchAll(new RegExp(String.raw`(?<![\p{L}\d.])${NUMBERS}\s*%?\s*IACS`, 'giu')))
      blank(match.index, match.index + match[0].length);
  if (kind !== 'hardness')
    for (const match of plain.matchAll(/HR[A-Z0-9]{1,3}\s?\d+(?:[.,]\d+)?/g))
      blank(match.index, match.index + match[0].length);
  // Least, most and mean together are what was measured, without the mean.
  if (STATISTICS.every((pattern) => pattern.test(plain)))
    for (const match of plain.matchAll(/\b(?:min|max)(?:imum)?\.?\s*[:=]?\s*(?=[\d.])/giu))
      blank(match.index, match.index + match[0].length);
  for (const pattern of LIMITS) {
    for (const match of plain.matchAll(pattern)) blank(match.index, match.index + match[0].length);
  }
  return plain;
}

function inSentences(
  passage: Passage,
  paper: Paper,
  known: ReadonlySet<ReadingKind>,
): (ReadReading & { group: string })[] {
  return KINDS.filter((kind) => !known.has(kind)).flatMap((kind) => {
    const match = SAID[kind].exec(passage.text);
    if (!match) return [];
    const others = KINDS.filter((other) => other !== kind).flatMap((other) => {
      const at = passage.text.slice(match.index + match[0].length).search(SAID[other]);
      return at < 0 ? [] : [match.index + match[0].length + at];
    });
    const stop = passage.text.slice(match.index).search(/[.;](?:\s|$)/);
    const sentence = stop < 0 ? passage.text.length : match.index + stop;
    const region = passageFrom(passage, match.index + match[0].length, Math.min(sentence, ...others));
    const found = valuesIn(region, kind, match[0], paper.decimal);
    // In a sentence the unit must be said, or any figure would do.
    return found &&
      found.unit !== null &&
      UNITS[kind].some(
        ({ name, pattern }) => name === found.unit && pattern.test(`${region.text} ${match[0]}`),
      )
      ? [{ kind, ...found, trust: 0.7, group: '' }]
      : [];
  });
}
