import type { Process } from '../../../trade/process';
import { spotIn, type Spot } from '../../layout/passage';
import { TRUST } from './answers';
import { mostBelieved, type Candidate, type Chosen } from './candidates';
import { wordsIn } from './codes';
import type { LabelKey } from './labels';
import type { Paper } from './paper';

export type NdtField = 'method' | 'type' | 'sensitivity' | 'result' | 'personnel_level';

const NDT: ReadonlySet<Process> = new Set([
  'fluorescent_penetrant',
  'magnetic_particle',
  'radiography',
  'ultrasonic',
]);

interface FieldRule {
  readonly keys: readonly LabelKey[];
  /** The value within what the label answers; all of it where nothing narrower is found and `whole` is set. */
  readonly within: RegExp;
  readonly whole: boolean;
  readonly said: RegExp;
}

const NUMERAL = String.raw`(?:IV|V|I{1,3}|[1-5]|½|1\/2|[l|]{1,3})`;

const RULES: Record<NdtField, FieldRule> = {
  method: {
    keys: ['method'],
    within: /\b(?:method\s*)?([A-D])\b(?![.'])|\b(wet|dry)\b[\w\s,-]*/iu,
    whole: true,
    said: /\bmethod\s*:?\s*["“]?([A-D])\b/iu,
  },
  type: {
    keys: ['ndt_type', 'class_type'],
    within: new RegExp(String.raw`(?:type\s*)?\b(${NUMERAL})\b`, 'iu'),
    whole: false,
    said: new RegExp(String.raw`\btype\s*:?\s*["“]?(${NUMERAL})\b`, 'iu'),
  },
  sensitivity: {
    keys: ['sensitivity'],
    within: new RegExp(String.raw`(?:level\s*|sens\w*\s*)?(?<!\w)(${NUMERAL})(?!\w)`, 'iu'),
    whole: false,
    said: new RegExp(
      String.raw`\bsens(?:itivity)?\.?\s*(?:level)?\s*:?\s*(${NUMERAL})(?!\w)|\blevel\s*(${NUMERAL})\s+sensitivity`,
      'iu',
    ),
  },
  personnel_level: {
    keys: ['personnel_level'],
    within: new RegExp(String.raw`(?:level|lvl\.?|stufe|niveau)?\s*(?<!\w)(${NUMERAL})(?!\w)`, 'iu'),
    whole: false,
    said: new RegExp(
      String.raw`\b(?:inspector|personnel|certified|qualified|NAS\s?410|EN\s?4179|SNT-TC-1A)[^.;]{0,40}?\b(?:level|lvl\.?)\s*:?\s*(${NUMERAL})(?!\w)|\b(?:level|lvl\.?)\s*(${NUMERAL})\s+(?:inspector|\w+ inspector|technician|personnel|per NAS)`,
      'iu',
    ),
  },
  result: {
    keys: ['indications', 'result'],
    within:
      /\b(?:accept(?:ed|able)?|no\s+(?:rejectable\s+|relevant\s+)?(?:indications?|defects?|cracks?)[\w\s]*|pass(?:ed)?|reject(?:ed)?|fail(?:ed)?|keine anzeigen|aucune indication|conforme)\b/iu,
    whole: false,
    said: /\b(no\s+(?:rejectable\s+|relevant\s+|reportable\s+|linear\s+)*(?:indications?|defects?|discontinuities|cracks?)(?:\s+(?:were\s+)?(?:found|noted|observed|detected))?|found acceptable)\b/iu,
  },
};

/** What a certificate of inspection states; null for other processes. */
export function readNdt(
  paper: Paper,
  process: Process | null,
): Record<NdtField, Chosen<string> | null> | null {
  if (!process || !NDT.has(process)) return null;
  const read = (field: NdtField): Chosen<string> | null => mostBelieved(candidatesFor(paper, RULES[field]));
  return {
    method: read('method'),
    type: read('type'),
    sensitivity: read('sensitivity'),
    result: read('result'),
    personnel_level: read('personnel_level'),
  };
}

function candidatesFor(paper: Paper, rule: FieldRule): Candidate<string>[] {
  const asked = paper.answers.flatMap((answer): Candidate<string>[] => {
    const wide = rule.keys.includes(answer.key) || answer.also.some((key) => rule.keys.includes(key));
    // "Class" is not "type", and a level of quality not a person's.
    if (!wide || (answer.key === 'class_type' && !/typ/.test(answer.words))) return [];
    for (const { passage, how } of answer.values) {
      const match = rule.said.exec(passage.text) ?? rule.within.exec(passage.text);
      const spot = match && spotIn(passage, match.index, match.index + match[0].length);
      if (match && spot) return [{ value: valueOf(match), spot, trust: TRUST[how] }];
      const words = rule.whole ? wordsIn(passage) : null;
      if (words && words.value.length < 40) return [{ ...words, trust: 0.7 * TRUST[how] }];
    }
    return [];
  });
  const said = paper.paragraphs.flatMap((paragraph): Candidate<string>[] => {
    const match = rule.said.exec(paragraph.text);
    const spot: Spot | null = match && spotIn(paragraph, match.index, match.index + match[0].length);
    return match && spot ? [{ value: valueOf(match), spot, trust: 0.7 }] : [];
  });
  return [...asked, ...said];
}

function valueOf(match: RegExpExecArray): string {
  const value = (match.slice(1).find((group) => group !== undefined) ?? match[0]).trim();
  if (/^[ivl|]+$/i.test(value)) return value.replace(/[l|]/g, 'I').toUpperCase();
  return value.length === 1 ? value.toUpperCase() : value;
}
