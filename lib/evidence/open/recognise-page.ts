import type { AsFiled, Mark, Page, Word } from '../page';
import { shareWithin } from './box';
import { findStrokes } from './picture/find-strokes';
import type { PixelBox } from './picture/grey';
import { chainProjections, inverseOf, quarterTurn, scaling } from './picture/projection';
import { overturn } from './picture/straighten';
import { prepareAgain, type Prepared } from './prepare-page';
import type { RecognisedWord, Recogniser } from './recogniser';
import { resize } from './resize';

/** Below this the letters of small print are too few pixels high. */
const LEAST_DPI = 190;
const GOOD_DPI = 250;
/** Words of a page that stands on its head are rubbish, and the recogniser knows. */
const RUBBISH = 0.6;
/** A word this doubtful under a stroke is the stroke misread. */
const DOUBTFUL = 0.7;

/** Recognises a prepared page; turns it over and tries again where nothing sensible comes out. */
export async function recognisePage(prepared: Prepared, recogniser: Recogniser): Promise<Page> {
  const first = await read(prepared, recogniser);
  if (meanConfidence(first) >= RUBBISH || prepared.components.length < 20) return assemble(prepared, first);
  const over = prepareAgain(prepared, overturn(prepared.straight));
  const second = await read(over, recogniser);
  return meanConfidence(second) > meanConfidence(first) ? assemble(over, second) : assemble(prepared, first);
}

async function read(page: Prepared, recogniser: Recogniser): Promise<RecognisedWord[]> {
  const scale = page.dpi < LEAST_DPI ? GOOD_DPI / page.dpi : 1;
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
  const strokes = [...findStrokes(page.components, [...sure, ...page.stamps], dpi), ...page.hands];
  const words = recognised
    .filter(isWord)
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

/** Remains of rules and dust are read as bars and points of their own. */
const isWord = ({ text, confidence }: RecognisedWord) =>
  /[\p{L}\p{N}]/u.test(text) || (confidence > 0.5 && !/^[|_~=.,'`‘’“”"°•©®«»—–]+$/.test(text));

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
