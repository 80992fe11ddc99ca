import { folded } from './fold';
import { LABELS, type LabelKey } from './labels';

export interface Phrase {
  readonly key: LabelKey;
  readonly pattern: RegExp;
  readonly needsColon: boolean;
  readonly numbered: boolean;
}

const WORDS: Readonly<Record<string, string>> = {
  QTY: String.raw`(?:qty|q['’ ]?ty|quantity|quant|pcs|pc s|pieces|parts|units|no of (?:pcs|pieces|parts)|total|q[. ]?ta|quantita)`,
  ACC: "acc(?:ept(?:ed|able)?|ettat[aei]|[ '’]?d)?|good|ok(?:ay)?|pass(?:ed)?|conform(?:ing|ed)",
  REJ: "rej(?:ect(?:ed|s)?|[ '’]?d)?|scartat[aei]|scrap(?:ped)?|fail(?:ed)?|non[ -]?conform(?:ing)?|nok|discrepant|defective|bad",
  REC: "rec(?:eived|[ '’]?d)|rcvd|rcd|submitted|presented|ordered|in",
  OUT: 'ship(?:ped)?|shpd|out|d[ei]spatched|d[ei]sp|delivered|returned|processed|treated|certified|released',
  COND: 'condition|cond|temper',
  no: String.raw`(?:n\.?[°ºo]s?|n(?=\.\s?:?\s*[^\s.])|nr|num|numbers?|nbr|numero|nummer|#)`,
  cert: String.raw`cert(?:ificate|ification|ificat|if)?`,
  spec: String.raw`spec(?:ification|s)?`,
  temp: String.raw`temp`,
  '%': '%',
  '&': '&',
};

/** With what the words of a group may begin. */
const FIRST: Readonly<Record<string, readonly string[]>> = {
  no: ['n', '#'],
  QTY: ['q', 'p', 'u', 'n', 't'],
  ACC: ['a', 'g', 'o', 'p', 'c'],
  REJ: ['r', 's', 'f', 'n', 'd', 'b'],
  REC: ['r', 's', 'p', 'o', 'i'],
  OUT: ['s', 'o', 'd', 'r', 'p', 't', 'c'],
  COND: ['c', 't'],
};

const BETWEEN = String.raw`[\s./_\-]{0,3}`;
/** Recognition makes an l of a stroke: "AlloylTemper"; folded texts have an i for it. */
const SLIPPED = String.raw`(?:${BETWEEN}|i)`;

function patternOf(words: readonly string[]): RegExp {
  const parts = words.map((word, index) => {
    const may = word.endsWith('?');
    const plain = may ? word.slice(0, -1) : word;
    // As folded texts have it: no l.
    const group = /^[A-Z]+$/.test(plain) ? `(?:${(WORDS[plain] ?? '').replace(/l/g, 'i')})` : WORDS[plain];
    const said = group ?? folded(plain);
    const isLong = plain.length > 3 && (words[index - 1]?.length ?? 0) > 3;
    const between = isLong ? SLIPPED : BETWEEN;
    const before = index === 0 ? '' : between;
    return may ? `(?:${before}${said})?` : `${before}${said}`;
  });
  return new RegExp(`${parts.join('').replace(/\\{2}/g, '\\')}(?:(?<=#)|(?![a-z0-9]))`, 'y');
}

/** By first letter, the longest first: "part no" is not "part". */
export const PHRASES: ReadonlyMap<string, readonly Phrase[]> = indexed();

function indexed(): Map<string, Phrase[]> {
  const all = (Object.keys(LABELS) as LabelKey[]).flatMap((key) =>
    LABELS[key].split(/,\s*/).map((phrase) => ({ key, phrase: phrase.trim() })),
  );
  all.sort((a, b) => b.phrase.length - a.phrase.length);
  const byLetter = new Map<string, Phrase[]>();
  for (const { key, phrase } of all) {
    const needsColon = phrase.endsWith(':');
    const words = phrase.replace(/\s*:$/, '').split(' ');
    const entry = {
      key,
      needsColon,
      pattern: patternOf(words),
      numbered: words.some((word) => word === 'no' || word === 'no?'),
    };
    const letter = folded(words[0] ?? '').charAt(0);
    const first = FIRST[words[0]?.replace('?', '') ?? ''] ?? [letter];
    for (const sign of first) byLetter.set(sign, [...(byLetter.get(sign) ?? []), entry]);
  }
  return byLetter;
}
