import type { HiddenText } from '../../page';
import type { DrawnGlyph, DrawnRun } from './drawn';
import type { GraphicsState } from './graphics-state';
import { compose, xOf, yOf } from './matrix';

/** A character as pdf.js hands it over; its width is in the font's own units. */
export interface Glyph {
  readonly unicode: string;
  readonly width: number;
  readonly isSpace: boolean;
}

/** Text render modes: 3 paints nothing, 7 only cuts. */
const PAINTS_NOTHING = new Set([3, 7]);
const FAINTEST_ALPHA = 0.06;
/** A kern as wide as this, in sizes of the font, to the left means that the writer went back to write elsewhere. */
const STEP_BACK = 0.3;

/** The height of a font in the units of its size: 1 but for fonts made of little drawings. */
function heightOf(state: GraphicsState): number {
  const font = state.font;
  if (!font?.isType3Font) return 1;
  const scale = Math.abs(font.fontMatrix?.[3] ?? 0.001);
  const height = Math.abs((font.bbox?.[3] ?? 0) - (font.bbox?.[1] ?? 0)) * scale;
  return height > 0.2 && height < 5 ? height / 1.2 : 1;
}

/**
 * Replays one operator that shows text: gives the runs it draws and moves the state's pen.
 *
 * `visible` is whether the layer it stands on is switched on.
 */
export function drawText(
  state: GraphicsState,
  glyphs: readonly (Glyph | number | null)[],
  order: number,
  visible: boolean,
): DrawnRun[] {
  const { font } = state;
  if (!font || state.fontSize === 0) return [];

  const direction = state.fontSize < 0 ? -1 : 1;
  const size = Math.abs(state.fontSize);
  const across = state.horizontalScale * direction;
  const text = compose(state.matrix, state.textMatrix);
  const stretch = Math.hypot(text[0], text[1]) * Math.abs(across);
  const height = Math.hypot(text[2], text[3]) * size * heightOf(state);
  const sign = across < 0 ? -1 : 1;
  const length = Math.hypot(text[0], text[1]) || 1;
  const along: readonly [number, number] = [(text[0] / length) * sign, (text[1] / length) * sign];
  const x = xOf(text, state.x, state.y + state.rise);
  const y = yOf(text, state.x, state.y + state.rise);
  const widthScale = size * (font.fontMatrix?.[0] ?? 0.001);

  const pieces: DrawnGlyph[][] = [[]];
  let pen = 0;
  for (const glyph of glyphs) {
    if (glyph === null) continue;
    if (typeof glyph === 'number') {
      pen -= (glyph * size) / 1000;
      if (glyph * state.horizontalScale > STEP_BACK * 1000) pieces.push([]);
      continue;
    }
    const width = glyph.width * widthScale;
    pieces.at(-1)?.push({ text: glyph.unicode, from: pen * stretch, to: (pen + width) * stretch });
    pen += width + ((glyph.isSpace ? state.wordSpacing : 0) + state.charSpacing) * direction;
  }
  if (font.vertical) state.y -= pen;
  else state.x += pen * across;

  const why = whyUnseen(state, height, visible);
  const shared = {
    x,
    y,
    along,
    size: height,
    spacing: state.charSpacing * stretch,
    why,
    clip: state.clip,
    order,
  };
  return pieces
    .filter((piece) => piece.length > 0)
    .map((piece) => ({ ...shared, glyphs: piece, colour: inkOf(state) }));
}

const inkOf = (state: GraphicsState) => (state.renderMode % 4 === 1 ? state.strokeColour : state.fillColour);

function whyUnseen(state: GraphicsState, height: number, visible: boolean): HiddenText['why'] | null {
  if (!visible || PAINTS_NOTHING.has(state.renderMode)) return 'invisible';
  const alpha = state.renderMode % 4 === 1 ? state.strokeAlpha : state.fillAlpha;
  if (alpha < FAINTEST_ALPHA) return 'invisible';
  return height < 2 ? 'size' : null;
}
