import { cleanPage } from './picture/clean-page';
import type { Component } from './picture/find-components';
import { toGrey, type Coloured } from './picture/colours';
import { findSheet, type Corners } from './picture/find-sheet';
import { findStamps } from './picture/find-stamps';
import { guessUpsideDown } from './picture/guess-upside-down';
import type { Grey, Ink, PixelBox } from './picture/grey';
import { levelLight } from './picture/level-light';
import { chainProjections, quarterTurn, SAME_PLACE, type Projection } from './picture/projection';
import { rectify } from './picture/rectify';
import { shrink } from './picture/shrink';
import { straighten, turnFurther, type Straightened } from './picture/straighten';
import { boxThroughProjection } from './box';

/** A page's picture as it comes out of a file. `dpi` is null where the file does not say. */
export interface PagePicture {
  readonly picture: Grey | Coloured;
  readonly channels: 1 | 3;
  readonly dpi: number | null;
  /** Degrees clockwise the picture is turned already, against the page as filed. */
  readonly turned: 0 | 90 | 180 | 270;
}

/** A page fit for recognition, with what was seen on the way. Boxes are pixels of the straightened page. */
export interface Prepared {
  readonly source: PagePicture;
  readonly straight: Straightened;
  readonly dpi: number;
  readonly photograph: boolean;
  /** Text alone. */
  readonly text: Grey;
  readonly rules: readonly PixelBox[];
  readonly ink: Ink;
  readonly components: readonly Component[];
  readonly stamps: readonly PixelBox[];
  readonly hands: readonly PixelBox[];
}

/** Long side of the little picture in which a sheet's edges are looked for. */
const LITTLE = 420;
const LONG_SIDE_INCHES = 11;
const TILE_INCHES = 0.3;

/** Corrects light, perspective, skew and turn, and takes off what is not text. */
export function preparePage(source: PagePicture): Prepared {
  const coloured = source.channels === 3 ? source.picture : null;
  const grey = coloured ? toGrey(coloured) : source.picture;
  const sheet = sheetIn(grey);
  const dpiAsIs = source.dpi ?? Math.max(grey.width, grey.height) / LONG_SIDE_INCHES;
  const stamps = coloured && !sheet ? findStamps(coloured, grey, dpiAsIs) : null;

  const flat = sheet
    ? rectify(grey, sheet)
    : { picture: stamps?.without ?? grey, dpi: dpiAsIs, projection: SAME_PLACE };
  const level = levelLight(flat.picture, Math.round(TILE_INCHES * flat.dpi));
  const lying = straighten(level, flat.dpi);
  const straight = { ...lying, projection: chainProjections(flat.projection, lying.projection) };
  const page: Prepared = {
    source,
    straight,
    dpi: flat.dpi,
    photograph: sheet !== null,
    ...cleaned(straight, flat.dpi),
    stamps: onPage(stamps?.boxes, straight.projection),
    hands: onPage(stamps?.hands, straight.projection),
  };
  return guessUpsideDown(page.components, page.dpi) ? turnPrepared(page, 180) : page;
}

/** The same page, its straightened picture turned further. */
export function turnPrepared(page: Prepared, degrees: 90 | 180): Prepared {
  const straight = turnFurther(page.straight, degrees);
  const { width, height } = page.straight.picture;
  const turn = quarterTurn(degrees, width, height);
  const over = (boxes: readonly PixelBox[]) => boxes.map((box) => boxThroughProjection(turn, box));
  return {
    ...page,
    straight,
    ...cleaned(straight, page.dpi),
    stamps: over(page.stamps),
    hands: over(page.hands),
  };
}

function cleaned({ picture }: Straightened, dpi: number) {
  const { picture: text, rules, ink, components } = cleanPage(picture, dpi);
  return { text, rules, ink, components };
}

const onPage = (boxes: readonly PixelBox[] | undefined, projection: Projection) =>
  (boxes ?? []).map((box) => boxThroughProjection(projection, box));

/** Corners of a sheet in the picture's own pixels. */
function sheetIn(grey: Grey): Corners | null {
  const factor = Math.max(1, Math.round(Math.max(grey.width, grey.height) / LITTLE));
  const corners = findSheet(shrink(grey, factor));
  if (!corners) return null;
  const scaled = corners.map(([x, y]) => [x * factor, y * factor] as const);
  return scaled as unknown as Corners;
}
