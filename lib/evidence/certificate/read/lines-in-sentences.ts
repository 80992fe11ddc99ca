import { passageFrom, type Passage } from '../../layout/passage';
import { annealed, countIn, partIn, readingAt, type Reading } from './codes';
import { beginsWithDay } from './identity';
import type { ReadLine } from './line-cells';
import type { Paper } from './paper';

const SENTENCE_TRUST = 0.8;

/** Behind a word for it, or counted: "53 off DX1377-2 issue E". */
const PART =
  /\b(?:p\/?n\.?|part\s*(?:numbers?|no\.?|nos\.?|#)|parts?|articles?|components?|items?(?=:)|drawing|dwg\.?|teile?-?(?:nr\.?|nummer)|r[eé]f(?:[eé]rence)?\.?)\s*:?\s*(?=[A-Z0-9./-]*\d)|(?<=(?<![\p{L}\d.,/-])\d[\d,]*\s*(?:off|x|×|pcs?\.?|pieces?|ea\.?)\s+(?:of\s+)?)(?=[A-Z0-9./-]*\d[A-Z0-9./-]*,?\s+(?:rev|iss(?:ue)?|lot)\b)/giu;
const COUNTS = {
  accepted: [
    /(?<![\p{L}\d.,/-])(\d{1,3}(?:,\d{3})+|\d+)\s*(?:\(\w+\)\s*)?(?:pcs?\.?|pieces?|parts?|ea\.?|units?)?\s*(?:were\s+|was\s+|are\s+|have been\s+)?(?:found\s+)?(?:accepted|acceptable|conforming|passed|good|acc\.|angenommen|accept[eé]es?|aceptadas?)/iu,
    /\b(?:accepted|acc|passed)\s*[:=]?\s*(\d[\d,]*)/iu,
  ],
  rejected: [
    /(?<![\p{L}\d.,/-])(\d{1,3}(?:,\d{3})+|\d+|none|no|zero|nil)\s*(?:\(\w+\)\s*)?(?:pcs?\.?|pieces?|parts?|ea\.?|units?)?\s*(?:were\s+|was\s+|are\s+|have been\s+)?(?:rejected|rej\.|scrap(?:ped)?|rejects?\b|nonconforming|abgelehnt|rebut[eé]es?|rechazadas?)/iu,
    /\b(?:rejected|rejects|rej)\s*[:=]?\s*(\d[\d,]*|none|nil)/iu,
  ],
  quantity: [
    /\b(?:qty|quantity|menge|quantit[eé]|cantidad)\.?\s*(?:of\s+)?[:=]?\s*(\d[\d,]*)/iu,
    /(?<![\p{L}\d.,/-])(\d{1,3}(?:,\d{3})+|\d+)\)?\s*(?:\(\w+\)\s*)?(?:pcs?\b\.?|pieces?\b|ea\b\.?|each\b|off\b|units?\b|parts?\b|st(?:ü|u)ck\b|pi[eè]ces\b|piezas\b)/iu,
  ],
} as const;

/** Up to what ends a material in a sentence; it has a figure in it. */
const MATERIAL = String.raw`((?=[^,;:()]*\d)[A-Z0-9][^,;:()]{2,40}?)(?=\s*(?:[,;:()]|\.\s|\.?$|\blot\b|\bqty\b|\bheat\b|\d+\s*pcs))`;
const MATERIALS: readonly RegExp[] = [
  new RegExp(
    String.raw`\b(?:lot|heat)\s*(?:no\.?|number|#)?\s*:?\s*(?=[A-Z0-9./-]*\d)[A-Z0-9./-]+\s+of\s+${MATERIAL}`,
    'iu',
  ),
  new RegExp(
    String.raw`\b(?:material|matl\.?|made (?:of|from)|manufactured from|werkstoff|mati[eè]re)\s*:?\s*${MATERIAL}`,
    'iu',
  ),
];

/** Lines told in sentences: "12 pcs of P/N 10-200 Rev A, lot L1, accepted 12, rejected 0". */
export function linesInSentences(paper: Paper): ReadLine[] {
  return paper.paragraphs.flatMap((paragraph) =>
    sentencesOf(paragraph).flatMap((sentence) => linesIn(sentence, paper)),
  );
}

/** Where a sentence ends: not behind "Rev." or "No.". */
const SENTENCE_END =
  /(?<!\b(?:rev|no|nos|nr|qty|inc|co|dwg|pt|approx|mat'l|matl|spec|acc|rej|p\/n|pcs|ea|cond|dia))[.]\s+(?=[\p{Lu}\d(])/giu;

function sentencesOf(paragraph: Passage): Passage[] {
  const cuts = [...paragraph.text.matchAll(SENTENCE_END)].map(({ index }) => index + 1);
  const edges = [0, ...cuts, paragraph.text.length];
  const sentences = edges.slice(1).map((end, turn) => passageFrom(paragraph, edges[turn] ?? 0, end));
  const telling = sentences.filter(({ text }) => new RegExp(PART.source, 'iu').test(text));
  // A single part number is told of in all sentences.
  return telling.length > 1 ? telling : [paragraph];
}

function linesIn(passage: Passage, paper: Paper): ReadLine[] {
  const parts = [...passage.text.matchAll(PART)];
  return parts.flatMap((match, index) => {
    const at = match.index + match[0].length;
    const before = index === 0 ? 0 : begins(passage.text, match.index);
    const next = parts[index + 1];
    const until = next ? begins(passage.text, next.index) : passage.text.length;
    const read = partIn(passageFrom(passage, at, until), beginsWithDay);
    if (!read) return [];
    const trust = SENTENCE_TRUST;
    const line: ReadLine = { part: { ...read, value: read.value.part, trust } };
    if (read.value.rev !== null) line.rev = { ...read, value: read.value.rev, trust };
    const around = passageFrom(passage, before, until);
    for (const field of ['accepted', 'rejected', 'quantity'] as const) {
      const count =
        countSaid(around, COUNTS[field], paper) ??
        (parts.length === 1 && field !== 'quantity' ? countElsewhere(paper, field) : null);
      if (count) line[field] = { ...count, trust };
    }
    const lot = said(
      around,
      /\blot\s*(?:no\.?|number|#|code)?\s*:?\s*((?=[A-Z0-9./-]*\d)[A-Z0-9][A-Z0-9./-]*[A-Z0-9]|\d+)/iu,
    );
    if (lot) line.lot = { ...lot, trust };
    const material = MATERIALS.map((pattern) => said(around, pattern)).find((found) => found !== null);
    if (material) line.material = { ...material, value: annealed(material.value), trust: 0.7 };
    return [line];
  });
}

/** Where what is told of a part begins: before its pieces, where they are counted first. */
function begins(text: string, part: number): number {
  const counted =
    /[;,.]?\s*(?:and\s+)?(?:[\p{L}-]+\s+)?\(?\d[\d,]*\)?\s*(?:\(\w+\)\s*)?(?:pcs?\.?|pieces?|ea\.?|each|units?|off|x)\s*(?:,|of|-|–)?\s*$/iu.exec(
      text.slice(0, part),
    );
  return counted ? counted.index + 1 : part;
}

function countElsewhere(paper: Paper, field: 'accepted' | 'rejected'): Reading<number> | null {
  for (const paragraph of paper.paragraphs) {
    const found = countSaid(paragraph, COUNTS[field], paper);
    if (found) return found;
  }
  return null;
}

function countSaid(passage: Passage, patterns: readonly RegExp[], paper: Paper): Reading<number> | null {
  for (const pattern of patterns) {
    const match = pattern.exec(passage.text);
    const written = match?.[1];
    if (!match || written === undefined) continue;
    if (/^(?:no|none|zero|nil)$/i.test(written))
      return readingAt(passage, match.index, match.index + match[0].length, 0);
    const at = match.index + match[0].indexOf(written);
    const count = countIn(passageFrom(passage, at, at + written.length), paper.decimal);
    if (count) return readingAt(passage, match.index, match.index + match[0].length, count.value);
  }
  return null;
}

/** The first that has a figure in it. */
function said(passage: Passage, pattern: RegExp): Reading<string> | null {
  for (const match of passage.text.matchAll(new RegExp(pattern.source, 'giu'))) {
    const value = (match[1] ?? '').replace(/[.,]$/, '');
    if (/\d/.test(value)) return readingAt(passage, match.index, match.index + match[0].length, value);
  }
  return null;
}
