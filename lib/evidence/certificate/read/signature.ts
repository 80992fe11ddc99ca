import { heightOf, sharedAcross, sharedDown, widthOf } from '../../layout/box';
import { spotIn, type Passage, type Spot } from '../../layout/passage';
import type { Box, Mark } from '../../page';
import { TRUST, type Answer } from './answers';
import type { Candidate } from './candidates';
import { labelAtStart } from './find-labels';
import type { Paper } from './paper';
import type { Sheet } from './sheet';

export interface ReadSignature {
  readonly present: boolean;
  readonly spot: Spot | null;
  readonly belief: number;
}

const SIGNED_IN_WORDS =
  /(?:^|\s)\/\s?s\s?\/|(?:^|\s)gez\.\s+\p{Lu}|(?:electronically|digitally|elektronisch|num[eé]riquement)\s+(?:signed|approved|authenticated|certified|authorized|authorised|released|unterzeichnet|unterschrieben|sign[eé]e?)|\be-?signed\b|(?:signed|approved|signature|released|authorized|authorised)\s+(?:electronically|digitally)|sign[eé]e?\s+(?:[eé]lectroniquement|num[eé]riquement)|firmado\s+(?:electr[oó]nicamente|digitalmente)|firmato\s+digitalmente|(?:elektronisch|digital(?:t)?)\s+(?:freigegeben|ondertekend|signert|signeret|signerad)|(?:electronic|digital|e-?)\s*signature\s*(?:of|by|:|-)\s*\p{L}|signature on file|\((?:electronic(?:ally)?|digital|e-?)\s*sign(?:ature|ed)\)|\(signed\)|(?:signert|signeret|signerad|ondertekend)\s+(?:elektronisk|digitalt|elektronisch|digitaal)/iu;
const UNSIGNED =
  /not\s+(?:electronically\s+)?signed|signature not required|valid without (?:a )?signature|ohne unterschrift g[uü]ltig/iu;

/**
 * Whether the certificate is signed: a stroke of a hand or a picture at the place for it, or words of an electronic
 * signature. A printed name alone is none, an empty line neither.
 */
export function readSignature(paper: Paper): ReadSignature {
  const inWords = paper.paragraphs.flatMap((paragraph) => wordsOfSignature(paragraph));
  const [words] = inWords;
  if (words) return { present: true, spot: words, belief: 0.95 };
  const places = paper.answers.filter(({ key }) => key === 'signature');
  const nearby =
    places.length > 0
      ? places
      : paper.answers.filter(({ key }) => key === 'signer' || key === 'signer_title' || key === 'stamp');
  for (const place of nearby) {
    const mark = markAt(paper, place);
    if (mark)
      return {
        present: true,
        spot: spotOfMark(mark.sheet, mark.mark),
        belief: places.length > 0 ? 0.93 : 0.8,
      };
  }
  for (const place of nearby) {
    const scrawl = scrawlAt(paper, place);
    if (scrawl) return { present: true, spot: scrawl, belief: 0.8 };
  }
  for (const place of nearby) {
    const words = misreadWordsAt(paper, place);
    if (words) return { present: true, spot: words, belief: 0.75 };
  }
  const script = scriptedName(paper);
  if (script) return { present: true, spot: script, belief: 0.85 };
  const loose = places.length === 0 ? looseStroke(paper) : null;
  if (loose) return { present: true, spot: loose, belief: 0.7 };
  const [place] = places;
  return { present: false, spot: place?.label ?? null, belief: place ? 0.9 : 0.75 };
}

function wordsOfSignature(passage: Passage): Spot[] {
  const match = SIGNED_IN_WORDS.exec(passage.text);
  if (!match || UNSIGNED.test(passage.text)) return [];
  const spot = spotIn(
    passage,
    match.index,
    Math.min(passage.text.length, match.index + match[0].length + 24),
  );
  return spot ? [spot] : [];
}

function markAt(paper: Paper, { label, page }: Answer): { sheet: Sheet; mark: Mark } | null {
  const sheet = paper.sheets.find((one) => one.page === page);
  if (!sheet || !label) return null;
  const room = roomFor(label.box);
  const mark = sheet.marks.find(({ kind, box }) => {
    const inside =
      sharedAcross(box, room) > 0.4 * widthOf(box) && sharedDown(box, room) > 0.4 * heightOf(box);
    return inside && (kind === 'stroke' || (kind === 'picture' && isSmall(box, sheet)));
  });
  return mark ? { sheet, mark } : null;
}

/** Above the label's line, on it, or beside it. */
function roomFor([left, top, right, bottom]: Box): Box {
  const height = Math.max(8, bottom - top);
  return [left - 3 * height, top - 6.5 * height, right + 26 * height, bottom + 3.5 * height];
}

/** Letters without a word in them: strokes up and down. */
const NO_WORD = /^[^\p{Ll}\d]{1,5}$/u;

/** Recognition makes letters of a hand's strokes, and does not believe them itself. */
function scrawlAt(paper: Paper, { label, page }: Answer): Spot | null {
  const sheet = paper.sheets.find((one) => one.page === page);
  if (!sheet || !label || sheet.origin !== 'recognised') return null;
  const room = roomFor(label.box);
  for (const { segments } of sheet.lines)
    for (const segment of segments) {
      const inside =
        sharedAcross(segment.box, room) > 0.6 * widthOf(segment.box) &&
        sharedDown(segment.box, room) > 0.4 * heightOf(segment.box);
      const unsure = segment.words.every(
        ({ text, confidence }) => confidence < (NO_WORD.test(text) ? 0.8 : 0.5),
      );
      if (inside && unsure && widthOf(segment.box) > 25) return spotIn(segment, 0, segment.text.length);
    }
  return null;
}

/** How much larger than the other words of a page a name is that stands there as a signature. */
const SCRIPT = 1.45;

/** A name in the large letters that a word processor signs with, which stands in print beside or below once more. */
function scriptedName(paper: Paper): Spot | null {
  for (const sheet of paper.sheets) {
    const segments = sheet.lines.flatMap((line) => line.segments);
    const heights = segments.map(({ box }) => heightOf(box)).sort((a, b) => a - b);
    const usual = heights[Math.floor(heights.length / 2)] ?? 10;
    const found = segments.find((segment) => {
      const name = segment.text.toLowerCase();
      const twin = (other: Passage & { readonly box: Box }): boolean =>
        other !== segment &&
        other.text.toLowerCase().includes(name) &&
        heightOf(segment.box) > 1.25 * heightOf(other.box) &&
        Math.abs(other.box[1] - segment.box[1]) < 90;
      return (
        heightOf(segment.box) > SCRIPT * usual &&
        segment.box[1] > 0.2 * sheet.height &&
        NAME.test(segment.text) &&
        segments.some(twin)
      );
    });
    if (found) return spotIn(found, 0, found.text.length);
  }
  return null;
}

/** What recognition makes of "/s/" before a name: "Is/", "S/T.". */
const MISREAD_S = /^[/Il1|!([{]?\s?[sS5$]\s?[/Il1|!)\]}]\s?(?=\p{Lu})/u;

function misreadWordsAt(paper: Paper, { label, page }: Answer): Spot | null {
  const sheet = paper.sheets.find((one) => one.page === page);
  if (!sheet || !label || sheet.origin !== 'recognised') return null;
  const room = roomFor(label.box);
  for (const { segments } of sheet.lines)
    for (const segment of segments)
      if (
        MISREAD_S.test(segment.text) &&
        sharedAcross(segment.box, room) > 0 &&
        sharedDown(segment.box, room) > 0.4 * heightOf(segment.box)
      )
        return spotIn(segment, 0, segment.text.length);
  return null;
}

/** A picture of a signature or a stamp, not of the page. */
const isSmall = (box: Box, { width, height }: Sheet): boolean =>
  widthOf(box) < 0.5 * width && heightOf(box) < 0.2 * height;

/** Where nothing asks for a signature, a hand's stroke in the lower part of the last pages is one. */
function looseStroke(paper: Paper): Spot | null {
  for (const sheet of paper.sheets) {
    const mark = sheet.marks.find(
      ({ kind, box }) =>
        box[1] > 0.25 * sheet.height &&
        widthOf(box) > 25 &&
        heightOf(box) > 6 &&
        (kind === 'stroke' || (kind === 'picture' && isSmall(box, sheet) && isOverName(box, sheet))),
    );
    if (mark) return spotOfMark(sheet, mark);
  }
  return null;
}

/** A person's name stands right under it. */
const isOverName = (box: Box, { lines }: Sheet): boolean =>
  lines.some(({ segments }) =>
    segments.some(
      (segment) =>
        NAME.test(segment.text) &&
        segment.box[1] > box[1] &&
        segment.box[1] - box[3] < 30 &&
        sharedAcross(segment.box, box) > 0,
    ),
  );

const spotOfMark = ({ page }: Sheet, { box }: Mark): Spot => ({ raw: '', page, box, legible: 1 });

const NAME =
  /^(?:(?:mr|ms|mrs|dr|dipl\.?-?ing|herr|frau)\.?\s+)?\p{Lu}[\p{L}'’-]*\.?(?:\s+(?:\p{Lu}[\p{L}'’-]*\.?|de|van|von|der|la|le|del)){1,3}(?=$|[,;(/|–]|\s+-)/u;
const TITLE =
  /\b(?:manager|inspector|engineer|director|supervisor|technician|coordinator|representative|lead|officer|president|quality\s+\w+|qa|qc|leiter\w*|pr[uü]fer|responsable|jefe)\b/iu;

/** The name of who signed. */
export function signers(paper: Paper): Candidate<string>[] {
  const weight = { signer: 0.95, signature: 0.85 } as const;
  const asked = paper.answers.flatMap((answer): Candidate<string>[] => {
    if (answer.key !== 'signer' && answer.key !== 'signature') return [];
    for (const { passage, how } of answer.values) {
      const text = passage.text.replace(/^[\s:_]*(?:\/\s?s\s?\/)?\s*/, '');
      const at = passage.text.length - text.length;
      const match = NAME.exec(text);
      const spot = match && spotIn(passage, at, at + match[0].length);
      if (!match || !spot || labelAtStart(match[0]) || TITLE.test(match[0])) continue;
      return [{ value: match[0].trim(), spot, trust: TRUST[how] * weight[answer.key] }];
    }
    return [];
  });
  const said = paper.paragraphs.flatMap((paragraph): Candidate<string>[] => {
    const match = /(?:\/\s?s\s?\/|signed by|approved by|certified by)\s*:?\s*/iu.exec(paragraph.text);
    if (!match) return [];
    const at = match.index + match[0].length;
    const name = NAME.exec(paragraph.text.slice(at).split(/\s(?=\d|on\b|at\b)/)[0] ?? '');
    const spot = name && spotIn(paragraph, at, at + name[0].length);
    return name && spot ? [{ value: name[0].trim(), spot, trust: 0.85 }] : [];
  });
  return [...asked, ...said];
}

/** The title of who signed. */
export function signerTitles(paper: Paper): Candidate<string>[] {
  const asked = paper.answers.flatMap((answer): Candidate<string>[] => {
    if (answer.key !== 'signer_title') return [];
    for (const { passage, how } of answer.values) {
      const value = passage.text.replace(/^[\s:_]+|[\s_]+$/g, '');
      const spot = spotIn(passage, 0, passage.text.length);
      if (spot && /\p{L}{2}/u.test(value) && value.length < 50) return [{ value, spot, trust: TRUST[how] }];
    }
    return [];
  });
  const beside = paper.answers.flatMap((answer): Candidate<string>[] => {
    if (answer.key !== 'signer' && answer.key !== 'signature') return [];
    return answer.values.flatMap(({ passage }): Candidate<string>[] => {
      const match = /[,;(/|–]\s*([\p{L}\s./&-]{3,40})\)?\s*$/u.exec(passage.text);
      const spot = match && spotIn(passage, match.index, passage.text.length);
      const value = match?.[1]?.trim();
      return value && spot && TITLE.test(value) ? [{ value, spot, trust: 0.8 }] : [];
    });
  });
  return [...asked, ...beside];
}
