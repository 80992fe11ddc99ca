import type { AsFiled, Mark, Page, Word } from '../page';
import { joinNear, shareWithin } from './box';
import type { Component } from './picture/find-components';
import { findStrokes } from './picture/find-strokes';
import type { PixelBox } from './picture/grey';
import { chainProjections, inverseOf, quarterTurn, scaling } from './picture/projection';
import { lookAgain } from './picture/second-look';
import { turnPrepared, type Prepared } from './prepare-page';
import type { RecognisedWord, Recogniser } from './recogniser';
import { READING_DPI, resize } from './resize';

/** Words of a page that stands on its head are rubbish, and the recogniser knows. */
const RUBBISH = 0.6;
const FEWEST_LETTERS = 20;
/** A word this doubtful under a stroke is the stroke misread. */
const DOUBTFUL = 0.7;

/** Recognises a prepared page; turns it and tries again where nothing sensible comes out. */
export async function recognisePage(prepared: Prepared, recogniser: Recogniser): Promise<Page> {
  let page = prepared;
  let best = { page, words: await read(page, recogniser) };
  if (prepared.components.length < FEWEST_LETTERS) return assemble(best.page, best.words);
  for (const further of [180, 90, 180] as const) {
    if (meanConfidence(best.words) >= RUBBISH) break;
    page = turnPrepared(page, further);
    const words = await read(page, recogniser);
    if (meanConfidence(words) > meanConfidence(best.words)) best = { page, words };
  }
  return assemble(best.page, best.words);
}

async function read(page: Prepared, recogniser: Recogniser): Promise<RecognisedWord[]> {
  const wanted = READING_DPI / page.dpi;
  const scale = Math.abs(wanted - 1) < 0.05 ? 1 : wanted;
  const picture = scale === 1 ? page.text : await resize(page.text, scale);
  const words = await recogniser.read(picture, { dpi: page.dpi * scale });
  return scale === 1
    ? words
    : words.map((word) => ({ ...word, box: word.box.map((edge) => edge / scale) as unknown as PixelBox }));
}

/** By letters, so that specks read as points do not count. */
function meanConfidence(words: readonly RecognisedWord[]): number {
  let [sum, letters] = [0, 0];
  for (const { text, confidence } of words) {
    sum += confidence * text.length;
    letters += text.length;
  }
  return letters === 0 ? 0 : sum / letters;
}

function assemble(page: Prepared, recognised: readonly RecognisedWord[]): Page {
  const { straight, dpi } = page;
  const points = 72 / dpi;
  const toPoints = (box: PixelBox): PixelBox => box.map((edge) => edge * points) as unknown as PixelBox;
  const sure = recognised.filter(({ confidence }) => confidence >= DOUBTFUL).map(({ box }) => box);
  const componentsAt = byRows(page.components);
  const strokes = [
    ...findStrokes(page.components, [...sure, ...page.stamps], dpi),
    ...page.hands,
    ...scrawled(recognised, dpi),
  ];
  const words = recognised
    .filter((word, index) => isWord(word) || isNumeral(word, recognised[index - 1]))
    .map((word) => ({ ...word, text: lookAgain(word.text, word.box, componentsAt(word.box), page.ink) }))
    .filter(
      ({ box, confidence }) =>
        confidence >= DOUBTFUL || !strokes.some((stroke) => shareWithin(box, stroke) > 0.6),
    );
  const marks = (kind: Mark['kind'], boxes: readonly PixelBox[]) =>
    boxes.map((box): Mark => ({ kind, box: toPoints(box) }));
  const { asFiled, turned } = filed(page);
  return {
    number: 1,
    width: straight.picture.width * points,
    height: straight.picture.height * points,
    turned,
    ...(asFiled ? { asFiled } : {}),
    origin: 'recognised',
    words: words.map(({ text, box, confidence }): Word => ({ text, box: toPoints(box), confidence })),
    marks: [...marks('rule', page.rules), ...marks('stroke', strokes), ...marks('picture', page.stamps)],
    hidden: [],
  };
}

const ROW = 64;

/** The components near a box, looked up by the rows they stand in. */
function byRows(components: readonly Component[]): (box: PixelBox) => Component[] {
  const rows = new Map<number, Component[]>();
  for (const component of components) {
    const row = Math.floor((component.box[1] + component.box[3]) / 2 / ROW);
    const list = rows.get(row);
    if (list) list.push(component);
    else rows.set(row, [component]);
  }
  return (box) => {
    const found: Component[] = [];
    for (let row = Math.floor(box[1] / ROW); row <= Math.floor(box[3] / ROW); row++)
      found.push(...(rows.get(row) ?? []));
    return found;
  };
}

/** In inches: a hand's strokes that a rule cut to pieces, read as signs that are no words. */
const SCRAWL = { apart: 0.35, wide: 0.4, high: 0.09 } as const;

function scrawled(recognised: readonly RecognisedWord[], dpi: number): PixelBox[] {
  const signs = recognised.filter(
    ({ text, confidence, box }) =>
      confidence < 0.5 &&
      /[/\\()<>{}]/.test(text) &&
      !/[\p{L}\p{N}]{2}/u.test(text) &&
      box[3] - box[1] > 0.06 * dpi,
  );
  if (signs.length < 2) return [];
  return joinNear(
    signs.map(({ box }) => box),
    SCRAWL.apart * dpi,
  ).filter((box) => box[2] - box[0] > SCRAWL.wide * dpi && box[3] - box[1] > SCRAWL.high * dpi);
}

/** Remains of rules and dust are read as bars and points of their own. */
const isWord = ({ text, confidence }: RecognisedWord) =>
  /[\p{L}\p{N}]/u.test(text) || (confidence > 0.5 && !/^[|_~=.,'`‘’“”"°•©®«»—–]+$/.test(text));

/** A Roman one is read as a bar: "Type | Class 1A". */
const isNumeral = ({ text }: RecognisedWord, before: RecognisedWord | undefined) =>
  text === '|' && /^(?:type|class|level|method|typ|klasse|classe|tipo|clase)[:.]?$/i.test(before?.text ?? '');

function filed({ source, straight, dpi }: Prepared): { turned: Page['turned']; asFiled: AsFiled | null } {
  const turned = ((source.turned + straight.turned) % 360) as Page['turned'];
  const { width, height } = source.picture;
  const turn = quarterTurn(straight.turned, width, height);
  const toFiled = chainProjections(
    chainProjections(scaling(dpi / 72, dpi / 72), inverseOf(straight.projection)),
    chainProjections(turn, scaling(72 / dpi, 72 / dpi)),
  );
  const scale = toFiled[8] || 1;
  const projection = toFiled.map((value) => value / scale) as unknown as AsFiled['projection'];
  const still = projection.every((value, i) => Math.abs(value - (i % 4 === 0 ? 1 : 0)) < 1e-6);
  const upended = straight.turned % 180 === 90;
  return {
    turned,
    asFiled: still
      ? null
      : {
          width: ((upended ? height : width) * 72) / dpi,
          height: ((upended ? width : height) * 72) / dpi,
          projection,
        },
  };
}
