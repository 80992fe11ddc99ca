import type { Grey, Ink } from './grey';
import { findInk, inkThreshold } from './find-ink';
import { findLie } from './find-skew';
import {
  chainProjections,
  inverseOf,
  quarterTurn,
  rotationAbout,
  SAME_PLACE,
  type Projection,
} from './projection';
import { shrink } from './shrink';
import { warp } from './warp';

export interface Straightened {
  readonly picture: Grey;
  /** Degrees clockwise the picture was turned by, beside the small turn that levels its lines. */
  readonly turned: 0 | 90 | 180 | 270;
  /** From a place in the picture that was given to its place in the straightened one. */
  readonly projection: Projection;
}

/** Fine enough to see lines of text apart. */
const DPI_TO_LOOK = 90;
const STRAIGHT_ENOUGH = 0.08;

/** Turns a levelled page so that its lines of text run level. It may still stand on its head. */
export function straighten(picture: Grey, dpi: number): Straightened {
  const factor = Math.max(1, Math.round(dpi / DPI_TO_LOOK));
  const small = shrink(picture, factor);
  const ink = withoutLongRuns(findInk(small, Math.max(140, inkThreshold(small))), (dpi / factor) * 0.45);
  const lie = findLie(ink);
  const quarter = lie.sideways ? 90 : 0;
  const skew = Math.abs(lie.skew) < STRAIGHT_ENOUGH ? 0 : lie.skew;
  return turnBy(picture, quarter, skew);
}

/** The same page turned further, clockwise. */
export function turnFurther({ picture, turned, projection }: Straightened, degrees: 90 | 180): Straightened {
  return {
    picture: degrees === 180 ? headOver(picture) : quarterOver(picture),
    turned: ((turned + degrees) % 360) as Straightened['turned'],
    projection: chainProjections(projection, quarterTurn(degrees, picture.width, picture.height)),
  };
}

const headOver = ({ width, height, data }: Grey): Grey => ({ width, height, data: data.slice().reverse() });

function quarterOver({ width, height, data }: Grey): Grey {
  const out = new Uint8Array(data.length);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) out[x * height + (height - 1 - y)] = data[y * width + x] as number;
  }
  return { width: height, height: width, data: out };
}

function turnBy(picture: Grey, quarter: 0 | 90, skew: number): Straightened {
  if (quarter === 0 && skew === 0) return { picture, turned: 0, projection: SAME_PLACE };
  const turn = quarterTurn(quarter, picture.width, picture.height);
  const [width, height] = quarter === 90 ? [picture.height, picture.width] : [picture.width, picture.height];
  const level = rotationAbout((-skew * Math.PI) / 180, width / 2, height / 2);
  const projection = chainProjections(turn, level);
  return { picture: warp(picture, inverseOf(projection), { width, height }), turned: quarter, projection };
}

/** Rules would outweigh the text, and those of a plot may lean. Runs along rows and columns longer than `longest` go. */
function withoutLongRuns(ink: Ink, longest: number): Ink {
  const { width, height, data } = ink;
  const out = data.slice();
  const drop = (start: number, count: number, step: number) => {
    for (let i = 0, at = start; i < count; i++, at += step) out[at] = 0;
  };
  for (let y = 0; y < height; y++) {
    for (let x = 0, run = 0; x <= width; x++) {
      if (x < width && data[y * width + x] === 1) run++;
      else {
        if (run > longest) drop(y * width + x - run, run, 1);
        run = 0;
      }
    }
  }
  for (let x = 0; x < width; x++) {
    for (let y = 0, run = 0; y <= height; y++) {
      if (y < height && data[y * width + x] === 1) run++;
      else {
        if (run > longest) drop((y - run) * width + x, run, width);
        run = 0;
      }
    }
  }
  return { width, height, data: out };
}
