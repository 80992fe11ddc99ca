import type { Spot } from '../../layout/passage';
import { TRUST, type Answer } from './answers';
import type { Candidate } from './candidates';
import { wordsIn } from './codes';
import type { LabelKey } from './labels';
import type { Paper } from './paper';

/** What a designation is made of, in the order in which it is mostly written. */
const ORDERS = {
  penetrant: ['Type', 'Method', 'Level', 'Class'],
  other: ['Method', 'Type', 'Class', 'SC', 'Grade'],
} as const;
type Part = (typeof ORDERS)['penetrant' | 'other'][number];

const NAMED: readonly (readonly [RegExp, Part])[] = [
  [/\b(?:typ|type|tipo|ty)\b/, 'Type'],
  [/\b(?:class|klasse|classe|clase|cl)\b/, 'Class'],
  [/\b(?:method|methode|metodo)\b/, 'Method'],
  [/\b(?:level|sens|sensitivity|empfindlichkeit\w*|sensibilite)\b/, 'Level'],
  [/\bgrade\b/, 'Grade'],
];
const KEYS: ReadonlySet<LabelKey> = new Set(['class_type', 'method', 'sensitivity', 'ndt_type']);

const NUMERAL = String.raw`(?:[IVXl1|]{1,4}[A-C]?|\d{1,2}[A-C]?|½|1\/2|[A-D])`;
const ONE = new RegExp(
  String.raw`^\W*(?:(?:type|class|method|level|grade|sensitivity(?: level)?|cl|ty)\.?\s*)?(${NUMERAL})(?=\s*(?:$|[(,;–-]))`,
  'iu',
);

interface Piece {
  readonly part: Part;
  readonly numeral: string;
  readonly spot: Spot;
  readonly trust: number;
}

/** Type, class, method, level that a form asks for in places of their own, or in one with strokes, as one designation. */
export function joinedParts(paper: Paper): Candidate<string>[] {
  const pieces = paper.answers.flatMap((answer) => (KEYS.has(answer.key) ? piecesOf(answer) : []));
  const found = new Map<Part, Piece>();
  for (const piece of pieces) if (!found.has(piece.part)) found.set(piece.part, piece);
  const [first] = found.values();
  if (!first || found.size < 2) return [];
  const order: readonly Part[] = found.has('Level') ? ORDERS.penetrant : ORDERS.other;
  const value = order
    .flatMap((part) => {
      const piece = found.get(part);
      return piece ? [`${part} ${piece.numeral}`] : [];
    })
    .join(' ');
  return [{ value, spot: first.spot, trust: Math.min(...[...found.values()].map(({ trust }) => trust)) }];
}

function piecesOf({ words, values }: Answer): Piece[] {
  const names = words.split(/\s*(?:[/,&]|\band\b)\s*/).flatMap((name) => {
    const [, part] = NAMED.find(([pattern]) => pattern.test(name)) ?? [];
    return part ? [part] : [];
  });
  for (const { passage, how } of values) {
    const read = wordsIn(passage);
    if (!read || read.value.length > 40) continue;
    const texts = names.length > 1 ? read.value.split(/\s*[/,;]\s*|\s+/) : [read.value];
    if (texts.length !== names.length) continue;
    const numerals = texts.map((text) => ONE.exec(text)?.[1] ?? null);
    if (numerals.some((numeral) => numeral === null)) continue;
    return names.flatMap((part, index) => {
      const numeral = numerals[index];
      return numeral ? [{ part, numeral: upright(numeral), spot: read.spot, trust: TRUST[how] }] : [];
    });
  }
  return [];
}

/** Strokes that are ones, and letters in their own size. */
const upright = (numeral: string): string =>
  /^[IVXl1|]{2,}[A-C]?$/i.test(numeral) && /[IVXl|]/i.test(numeral)
    ? numeral.toUpperCase().replace(/[L1|]/g, 'I')
    : numeral.replace(/^[l|]$/, 'I').toUpperCase();

/** "Condition received: O", "Condition supplied: T42": the change that was made, with its alloy. */
export function changeInTwoPlaces(paper: Paper): Candidate<string>[] {
  // "Temper in" may ask for a condition or for when the tempering began: the value tells.
  const temperOf = (
    key: LabelKey,
    moment: LabelKey,
  ): { temper: string; alloy: string | null; spot: Spot } | null => {
    const asked = ({ key: other, step }: Answer): boolean =>
      other === key || (other === moment && step === 'temper');
    for (const answer of paper.answers.filter(asked))
      for (const { passage } of answer.values.slice(0, 1)) {
        const [, alloy = null, temper] =
          /^\W*(?:([1-8]\d{3})\s*-?\s*)?(O|F|W|T\d{1,4})(?![\p{L}\d])/iu.exec(passage.text) ?? [];
        const words = wordsIn(passage);
        if (temper && words) return { temper: temper.toUpperCase(), alloy, spot: words.spot };
      }
    return null;
  };
  const [before, after] = [temperOf('condition_before', 'time_in'), temperOf('condition', 'time_out')];
  if (!before || !after) return [];
  const alloy = before.alloy ?? after.alloy ?? alloyOf(paper);
  if (alloy === null) return [];
  return [{ value: `${alloy}-${before.temper} to ${alloy}-${after.temper}`, spot: after.spot, trust: 0.85 }];
}

/** Of wrought aluminium, where only one is named. */
function alloyOf({ answers }: Paper): string | null {
  const named = answers.flatMap(({ key, values }) =>
    key === 'material' || key === 'alloy'
      ? values.slice(0, 1).flatMap(({ passage }) => /(?<!\d)([1-8]\d{3})(?!\d)/.exec(passage.text)?.[1] ?? [])
      : [],
  );
  const [only, ...others] = new Set(named);
  return only !== undefined && others.length === 0 ? only : null;
}
