import { heightOf, sharedAcross } from '../../layout/box';
import { spotIn, type Passage } from '../../layout/passage';
import type { Line, Segment } from '../../layout/lines';
import type { Box } from '../../page';
import { TRUST } from './answers';
import type { Candidate } from './candidates';
import { daysIn } from './dates';
import { labelAtStart } from './find-labels';
import type { Paper } from './paper';
import type { Sheet } from './sheet';
import { stepsIn } from './steps';

/** How a firm is written. */
export const LEGAL =
  /(?:^|[\s,])(?:inc|incorporated|llc|l\.l\.c|ltd|limited|corp|corporation|co|company|gmbh|ag|kg|sa|s\.a|sas|sarl|s\.a\.s|srl|s\.r\.l|spa|s\.p\.a|bv|b\.v|nv|oy|ab|aps|plc|lp|llp|pty|s\.l)\.?(?=$|[\s,)•|·–-])/iu;
/** What firms that do such work have in their names. */
const TRADE =
  /\b(?:heat[- ]?treat(?:ing|ers?|ment)?|thermal|metallurg\w*|plating|platers?|metal\s+(?:finishing|treating|processing)|finishing|finishers|coatings?|anodi[sz](?:ing|ers)|surface\s+\w+|ndt|ndi|nde|inspection\s+(?:services?|labs?)|testing|laborator(?:y|ies)|labs?|process(?:ing|ors)|aero(?:space)?|industries|technolog(?:y|ies)|services|works|h[aä]rterei|galvanik|oberfl[aä]chen\w*|w[aä]rmebehandlung|traitements?(?:\s+\w+)?|furnace|treaters)\b/iu;
const TITLE =
  /\b(?:certificate|certification|certificat|certified|report|conformance|conformity|compliance|record|statement|zeugnis|bescheinigung|pr[uü]fbericht|werkszeugnis|proc[eè]s|page|copy|original|form|traveler|purchase order|results?|process details|remarks|requirements?|subject|re:)\b/iu;
/** How a mail begins. */
const GREETING =
  /^(?:hello|hi|dear|good (?:morning|day|afternoon|evening)|to whom|guten tag|hallo|bonjour|hej)\b/iu;
const ADDRESS =
  /\b(?:street|st|avenue|ave|road|rd|drive|dr|blvd|lane|ln|way|suite|unit|p\.?o\.? box|stra(?:ß|ss)e|str|rue|industrial park|tel|phone|fax|www|http|e-?mail)\b\.?|@|\b[A-Z]{2}\s+\d{5}\b|^\d/iu;

/** The firm that did the work: of the letterhead, of a label, of the statement. Never the customer. */
export function processors(paper: Paper): Candidate<string>[] {
  const customers = paper.answers.filter(({ key }) => key === 'customer');
  const customerWords = customers.flatMap(({ values }) =>
    values.slice(0, 1).map(({ passage }) => bare(passage.text)),
  );
  const asked = paper.answers.flatMap((answer): Candidate<string>[] => {
    if (answer.key !== 'processor') return [];
    const [value] = answer.values;
    const name = value && nameIn(value.passage);
    if (!name || !value) return [];
    const vague = /^(?:from|von|de|company|facility|manufacturer)/.test(answer.words);
    const likely = looksLikeFirm(name.value) ? 0.75 : 0.3;
    return [{ ...name, trust: TRUST[value.how] * (vague ? likely : 0.95) }];
  });
  const headed = paper.sheets.slice(0, 2).flatMap((sheet) =>
    letterhead(
      sheet,
      customers.flatMap(({ label }) => (label?.page === sheet.page ? [label.box] : [])),
    ),
  );
  const said = paper.paragraphs.flatMap(inStatement);
  return [...asked, ...headed, ...said].filter(
    ({ value }) => !customerWords.some((words) => words.startsWith(bare(value))),
  );
}

const bare = (text: string): string => text.toLowerCase().replace(/[^\p{L}\p{N}]/gu, '');
const looksLikeFirm = (text: string): boolean => LEGAL.test(text) || TRADE.test(text);

function letterhead(sheet: Sheet, customers: readonly Box[]): Candidate<string>[] {
  const heights = sheet.lines.flatMap(({ segments }) => segments.map(tall)).sort((a, b) => a - b);
  const usual = heights[Math.floor(heights.length / 2)] ?? 10;
  const tallest = Math.max(
    ...sheet.lines
      .slice(0, 8)
      .flatMap(({ segments }) => segments.filter((one) => !TITLE.test(one.text)).map(tall)),
    usual,
  );
  return sheet.lines.flatMap((line, index) =>
    line.segments.flatMap((segment): Candidate<string>[] => {
      const label = labelAtStart(segment.text);
      if ((label?.marked ?? false) || (label?.whole ?? false) || underCustomer(segment, line, customers))
        return [];
      const name = nameIn(segment);
      if (!name || TITLE.test(name.value) || GREETING.test(name.value)) return [];
      const trust = weigh({
        name: name.value,
        index,
        line,
        sheet,
        big: tall(segment) / usual,
        tallest: tall(segment) >= 0.98 * tallest,
      });
      return trust > 0 ? [{ ...name, trust }] : [];
    }),
  );
}

/** Of the letters: a word without tall letters is boxed lower. */
const tall = ({ words }: Segment): number => Math.max(...words.map(({ box }) => heightOf(box)));

interface Weighed {
  readonly name: string;
  readonly index: number;
  readonly line: Line;
  readonly sheet: Sheet;
  readonly big: number;
  readonly tallest: boolean;
}

function weigh({ name, index, line, sheet, big, tallest }: Weighed): number {
  const firm = (LEGAL.test(name) ? 0.3 : 0) + (TRADE.test(name) ? 0.3 : 0);
  const top = line.box[1] < 0.25 * sheet.height;
  const foot = line.box[3] > 0.9 * sheet.height;
  const first = index === 0 ? 0.15 : 0;
  const size = big > 1.25 && top ? 0.2 : 0;
  const head = tallest && top && big > 1.25 ? 0.15 : 0;
  if (firm === 0 && !(tallest && top && big > 1.2) && index > 0) return 0;
  if (!top && !foot && LEGAL.test(name)) return 0.1;
  // Under the name of who signed a mail.
  if (!top && !foot) return isAlone(line) && TRADE.test(name) ? 0.05 : 0;
  return Math.min(0.95, firm + first + size + head + (foot ? 0.05 : 0.1));
}

const isAlone = ({ segments }: Line): boolean =>
  segments.length === 1 && /^\p{Lu}[^.:;!?]*$/u.test(segments[0]?.text ?? '');

/** In the block under "Customer", "Sold to", "Ship to", or beside it. */
function underCustomer(segment: Segment, line: Line, customers: readonly Box[]): boolean {
  return customers.some((box) => {
    const below = line.box[1] - box[3];
    const level =
      Math.abs(line.box[1] - box[1]) < heightOf(box) &&
      segment.box[0] > box[2] &&
      segment.box[0] - box[2] < 150;
    return (
      level ||
      (below > -2 &&
        below < 5.5 * Math.max(10, heightOf(box)) &&
        (sharedAcross(box, segment.box) > 0 || Math.abs(segment.box[0] - box[0]) < 90))
    );
  });
}

/** The name without the address that may follow on its line. */
function nameIn(passage: Passage): Candidate<string> | null {
  const [first = ''] = passage.text.split(/\s+[•·|–—]\s*|\s+-\s+|\s*<|,?\s+(?=\d{2,}\s+\p{L})|\s{3,}/u);
  const value = first.replace(/^[\s:,.-]+|[\s:,;-]+$/g, '');
  const words = value.split(/\s+/);
  if (words.length > 8 || (value.match(/\p{L}/gu)?.length ?? 0) < 4 || /\d{3}/.test(value)) return null;
  if (ADDRESS.test(value) && !LEGAL.test(value) && !TRADE.test(value)) return null;
  if (stepsIn(value)[0]?.start === 0 && !LEGAL.test(value)) return null;
  if (daysIn(value).length > 0 || /[@]|www\./i.test(value)) return null;
  const at = passage.text.indexOf(value);
  const spot = spotIn(passage, Math.max(0, at), Math.max(0, at) + value.length);
  return spot && { value, spot, trust: 0 };
}

/** "Example Thermal certifies that …", "processed by Example Plating Inc." */
function inStatement(passage: Passage): Candidate<string>[] {
  const patterns = [
    /(?:^|[.\s])((?:\p{Lu}[\p{L}&.'-]*,?\s+){1,5}(?:Inc\.?|LLC|Ltd\.?|Corp\.?|Co\.?|GmbH|Company)?)\s*(?:hereby\s+)?(?:certif(?:y|ies)|attests|confirms|best[aä]tigt|bescheinigt|certifie)\b/u,
    /\b(?:processed|performed|plated|treated|inspected)\s+(?:by|at)\s+((?:\p{Lu}[\p{L}&.'-]*,?\s?){1,5})/u,
  ];
  return patterns.flatMap((pattern) => {
    const match = pattern.exec(passage.text);
    const value = match?.[1]?.trim().replace(/,$/, '');
    if (!match || !value || !looksLikeFirm(value)) return [];
    const at = match.index + match[0].indexOf(value);
    const spot = spotIn(passage, at, at + value.length);
    return spot ? [{ value, spot, trust: 0.5 }] : [];
  });
}
