import { spotIn, type Passage, type Spot } from '../../layout/passage';
import type { Paper } from './paper';

export interface ReadStatement {
  readonly present: boolean;
  readonly spot: Spot | null;
  readonly belief: number;
}

/** Somebody certifies. */
const CERTIFIES =
  /\b(?:we|i|this|hereby|undersigned|it is)\b[^.:;]{0,60}\b(?:certif(?:y|ies|ied)|attests?|declares?|confirms?)\b|\bcertif(?:y|ies|ied)\s+(?:that|herewith|to\s+(?:meet|conform|comply|be\b)|(?:the|all)\s+(?:above|listed|parts?|material|items?))\b|\bthis is to certify\b|\bcertified\s+(?:true|correct|as)\b|\bhereby certif\w+|(?:wir|hiermit|es wird)\s[^.:;]{0,60}(?:best.{1,2}tig\w*|bescheinig\w*|zertifizier\w*)|\b(?:certifions|attestons|certifie|atteste|d[eé]clarons)\b|\b(?:certificamos|certifica|se certifica)\b/iu;

/** What was done conforms. */
const CONFORMS =
  /\b(?:has|have|were|was|been|is|are|parts?|material|items?|articles?)\b[^.:;]{0,120}\b(?:conforms?|comply|complies|compl(?:ied|iance)|meets?|satisf(?:y|ies)|in (?:full )?(?:conformance|compliance|conformity|accordance)|in accordance)\b[^.;]{0,80}(?:requirements?|specifications?|drawings?|order|above|stated|listed|contract|standards?|\b(?:AMS|MIL|ASTM|NAS|QQ)\b)/iu;
const ALL_MEET =
  /\b(?:conforms?|comply|complies|meets?)\s+(?:to|with)?\s*(?:all|the)\s+(?:\w+\s+){0,5}(?:requirements?|specifications?|drawings?)/iu;
const HAVE_BEEN_MET =
  /\b(?:all|the)\s+(?:\w+\s+){0,3}requirements?\b[^.;]{0,90}\b(?:ha(?:ve|s) been|were|was|are)\s+(?:fully\s+)?(?:met|satisfied|fulfilled|complied with)\b/iu;
const GERMAN_FRENCH =
  /(?:entspr(?:echen|icht)|erf[uü]ll(?:en|t))[^.;]{0,80}(?:anforderung\w*|spezifikation\w*|vorschrift\w*|bestell\w*)|(?:sont|est)\s+conformes?\s+(?:à|a|aux?)|cumplen?\s+con/iu;

const DENIES =
  /\b(?:do(?:es)? not|not|nicht|failed to|except)\s+(?:conform|comply|meet|erf)|\bunless\b|\bshall (?:conform|comply|meet)|\bmust (?:conform|comply|meet)/iu;

/** Whether somebody certifies, in a sentence, that the work conforms. A title alone certifies nothing. */
export function readStatement(paper: Paper): ReadStatement {
  for (const paragraph of paper.paragraphs) {
    const found = statementIn(paragraph);
    if (found) return { present: true, spot: found, belief: 0.96 };
  }
  const [first] = paper.paragraphs;
  return { present: false, spot: first ? spotIn(first, 0, first.text.length) : null, belief: 0.85 };
}

function statementIn(passage: Passage): Spot | null {
  const { text } = passage;
  if (passage.words.length < 5) return null;
  const match =
    CERTIFIES.exec(text) ??
    CONFORMS.exec(text) ??
    ALL_MEET.exec(text) ??
    HAVE_BEEN_MET.exec(text) ??
    GERMAN_FRENCH.exec(text);
  if (!match || DENIES.test(text.slice(Math.max(0, match.index - 30), match.index + match[0].length)))
    return null;
  return spotIn(passage, 0, text.length);
}
