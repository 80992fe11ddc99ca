import type { Coloured } from './colours';
import { findComponents } from './find-components';
import type { Grey, PixelBox } from './grey';

export interface Stamps {
  /** Where coloured ink forms something the size of a stamp, of many pieces. */
  readonly boxes: readonly PixelBox[];
  /** Where it is of the size but of few pieces, as handwriting is. */
  readonly hands: readonly PixelBox[];
  /** The page's greys without the coloured ink of stamps that lie over black print. */
  readonly without: Grey;
}

/** Difference between the strongest and the weakest of red, green and blue that makes an ink coloured. */
const COLOURED = 42;
/** Below this strongest colour an ink is black to the eye, or the dark ground of a heading. */
const BLACK = 110;
/** Pixels to a cell of the coarse map. */
const CELL = 4;
/** In inches. */
const NARROWEST = 0.6;
const LOWEST = 0.42;
const REACH = 0.05;
/** Of its cells, the share that must touch black print for a stamp to count as lying over it. */
const OVER_PRINT = 0.02;
/** Letters and frame of a stamp. */
const FEWEST_PIECES = 7;

/**
 * Finds stamps in coloured ink, and takes those off that lie over print, so that the print can be read.
 *
 * Words printed in colour stay: they touch no black print, or are lower than a stamp.
 */
export function findStamps(picture: Coloured, grey: Grey, dpi: number): Stamps | null {
  const map = coarseMap(picture);
  if (map.cells < 40) return null;
  const reach = Math.max(1, Math.round((REACH * dpi) / CELL));
  const grown = grow(map.coloured, map, reach);
  const found = findComponents({ width: map.width, height: map.height, data: grown })
    .filter(
      ({ box }) => (box[2] - box[0]) * CELL > NARROWEST * dpi && (box[3] - box[1]) * CELL > LOWEST * dpi,
    )
    .filter((component) => component.area > 0)
    .map(({ box }) => box);
  if (found.length === 0) return null;

  const without: Grey = { ...grey, data: grey.data.slice() };
  const boxes: PixelBox[] = [];
  const hands: PixelBox[] = [];
  for (const box of found) {
    const { touching, coloured } = countIn(map, box);
    const filled = coloured / ((box[2] - box[0]) * (box[3] - box[1]));
    if (filled > 0.6) continue;
    const pixels = box.map((edge) => edge * CELL) as unknown as PixelBox;
    if (touching > OVER_PRINT * coloured) takeOff(picture, without, pixels);
    if (piecesIn(map, box) >= FEWEST_PIECES) boxes.push(pixels);
    else hands.push(pixels);
  }
  return { boxes, hands, without };
}

interface CoarseMap {
  readonly width: number;
  readonly height: number;
  readonly coloured: Uint8Array;
  readonly black: Uint8Array;
  readonly cells: number;
}

function coarseMap({ width, height, data }: Coloured): CoarseMap {
  const [w, h] = [Math.floor(width / CELL), Math.floor(height / CELL)];
  const coloured = new Uint8Array(w * h);
  const black = new Uint8Array(w * h);
  let cells = 0;
  for (let y = 0; y < h; y++) {
    for (let x = 0; x < w; x++) {
      let [tinted, dark] = [0, 0];
      for (let k = 0; k < CELL; k++) {
        for (let j = 0; j < CELL; j++) {
          const at = ((y * CELL + k) * width + x * CELL + j) * 3;
          const [r, g, b] = [data[at] as number, data[at + 1] as number, data[at + 2] as number];
          const most = Math.max(r, g, b);
          if (most < BLACK) dark++;
          else if (most - Math.min(r, g, b) > COLOURED) tinted++;
        }
      }
      if (tinted >= 3) {
        coloured[y * w + x] = 1;
        cells++;
      }
      if (dark >= 3) black[y * w + x] = 1;
    }
  }
  return { width: w, height: h, coloured, black, cells };
}

function grow(
  mask: Uint8Array,
  { width, height }: { width: number; height: number },
  reach: number,
): Uint8Array {
  const out = new Uint8Array(mask.length);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      if (mask[y * width + x] === 0) continue;
      for (let v = Math.max(0, y - reach); v <= Math.min(height - 1, y + reach); v++) {
        out.fill(1, v * width + Math.max(0, x - reach), v * width + Math.min(width, x + reach + 1));
      }
    }
  }
  return out;
}

function countIn(
  map: CoarseMap,
  [left, top, right, bottom]: PixelBox,
): { touching: number; coloured: number } {
  let [touching, coloured] = [0, 0];
  for (let y = top; y < bottom; y++) {
    for (let x = left; x < right; x++) {
      const at = y * map.width + x;
      if (map.coloured[at] === 0) continue;
      coloured++;
      touching += map.black[at] as number;
    }
  }
  return { touching, coloured };
}

function piecesIn(map: CoarseMap, [left, top, right, bottom]: PixelBox): number {
  const [width, height] = [right - left, bottom - top];
  const data = new Uint8Array(width * height);
  for (let y = 0; y < height; y++) {
    data.set(map.coloured.subarray((top + y) * map.width + left, (top + y) * map.width + right), y * width);
  }
  return findComponents({ width, height, data }).filter(({ area }) => area >= 3).length;
}

/** A pixel of the stamp's ink becomes paper; black print under it, which dims the strongest colour too, stays dark. */
function takeOff({ width, data }: Coloured, grey: Grey, [left, top, right, bottom]: PixelBox): void {
  const counts = new Uint32Array(256);
  const each = (work: (at: number, most: number) => void) => {
    for (let y = top; y < bottom; y++) {
      for (let x = left; x < right; x++) {
        const at = (y * width + x) * 3;
        const [r, g, b] = [data[at] as number, data[at + 1] as number, data[at + 2] as number];
        const most = Math.max(r, g, b);
        if (most >= BLACK && most - Math.min(r, g, b) > COLOURED / 2) work(y * width + x, most);
      }
    }
  };
  let total = 0;
  each((_, most) => {
    counts[most] = (counts[most] as number) + 1;
    total++;
  });
  let ink = 0;
  for (let seen = 0; ink < 255; ink++) {
    seen += counts[ink] as number;
    if (seen > total * 0.35) break;
  }
  each((at, most) => {
    grey.data[at] = Math.min(255, (most * 255) / (0.92 * Math.max(60, ink)));
  });
}
