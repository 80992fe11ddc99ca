import type { Grey } from './grey';
import type { Point } from './projection';

/** The corners of a sheet of paper on a darker ground: upper left, upper right, lower right, lower left. */
export type Corners = readonly [Point, Point, Point, Point];

const STEEPEST = 0.42;
const SLOPES = 43;
/** Of a side's length, the share along which its edge must be seen. */
const SEEN = 0.45;
/** How much brighter the paper must be than the ground beside it, in shades. */
const STEP = 9;
const STRONGEST = 40;
const REACH = 2;
const BEYOND = 40;
const MOST_CANDIDATES = 40;
const GROUND_AROUND = 0.2;

interface Side {
  /** `at` is where the edge crosses the middle of the picture, `slope` its lean: position = at + slope · (along − middle). */
  readonly at: number;
  readonly slope: number;
  readonly seen: number;
}

/**
 * Finds the sheet in a photograph by its four edges: long, almost straight, bright within and darker outside.
 *
 * `picture` should be small, about 400 pixels on its longer side. An edge that is not in the picture is taken to be the
 * picture's own. Gives null when fewer than two edges are seen, as in a scan.
 */
export function findSheet(picture: Grey): Corners | null {
  if (!hasGroundAround(picture)) return null;
  const soft = soften(picture);
  const turned = transposed(soft);
  const { width, height } = soft;
  const left = findSide(turned, 1);
  const right = findSide(turned, -1);
  const top = findSide(soft, 1);
  const bottom = findSide(soft, -1);
  if ([left, right, top, bottom].filter((side) => side !== null).length < 2) return null;

  const l = left ?? { at: 0, slope: 0, seen: 0 };
  const r = right ?? { at: width, slope: 0, seen: 0 };
  const t = top ?? { at: 0, slope: 0, seen: 0 };
  const b = bottom ?? { at: height, slope: 0, seen: 0 };
  const corner = (upright: Side, level: Side): Point => {
    // x = u0 + u1·(y − h/2), y = v0 + v1·(x − w/2)
    const x =
      (upright.at + upright.slope * (level.at - height / 2 - (level.slope * width) / 2)) /
      (1 - upright.slope * level.slope);
    return [x, level.at + level.slope * (x - width / 2)];
  };
  const corners: Corners = [corner(l, t), corner(r, t), corner(r, b), corner(l, b)];
  return isSheet(corners, width, height) ? corners : null;
}

/** Whether enough of the picture's rim is darker than paper: quickly told, and not so of a scan. */
function hasGroundAround({ width, height, data }: Grey): boolean {
  const rim: number[] = [];
  for (let x = 0; x < width; x++)
    rim.push(data[2 * width + x] as number, data[(height - 3) * width + x] as number);
  for (let y = 0; y < height; y++)
    rim.push(data[y * width + 2] as number, data[y * width + width - 3] as number);
  const paper = Uint8Array.from(data).sort()[Math.floor(data.length * 0.85)] ?? 255;
  return rim.filter((value) => value < paper - 2 * STEP).length > GROUND_AROUND * rim.length;
}

/** Large enough, and bulging nowhere inwards. */
function isSheet(corners: Corners, width: number, height: number): boolean {
  let twice = 0;
  for (let i = 0; i < 4; i++) {
    const [a, b, c] = [corners[i] as Point, corners[(i + 1) % 4] as Point, corners[(i + 2) % 4] as Point];
    if ((b[0] - a[0]) * (c[1] - b[1]) - (b[1] - a[1]) * (c[0] - b[0]) <= 0) return false;
    twice += a[0] * b[1] - b[0] * a[1];
  }
  return twice / 2 > 0.2 * width * height;
}

/**
 * The strongest edge across the picture that has ground, and no paper, beyond it. `inwards` 1 looks for the upper edge of
 * a sheet (brighter below) in the upper part, −1 for the lower edge in the lower part.
 */
function findSide(picture: Grey, inwards: 1 | -1): Side | null {
  const { width, height } = picture;
  const strength = edgeStrength(picture, inwards);
  const [from, to] = inwards === 1 ? [0, height * 0.48] : [height * 0.52, height];
  const candidates: (Side & { score: number })[] = [];
  for (let s = 0; s < SLOPES; s++) {
    const slope = -STEEPEST + (2 * STEEPEST * s) / (SLOPES - 1);
    for (let at = Math.floor(from); at < to; at++) {
      let [score, seen] = [0, 0];
      for (let x = 0; x < width; x += 2) {
        const y = Math.round(at + slope * (x - width / 2));
        if (y < REACH || y >= height - REACH) continue;
        const here = strength[y * width + x] as number;
        score += here;
        if (here >= STEP) seen++;
      }
      const share = seen / (width / 2);
      if (share > SEEN) candidates.push({ at, slope, seen: share, score });
    }
  }
  candidates.sort((a, b) => b.score - a.score);
  return candidates.slice(0, MOST_CANDIDATES).find((side) => hasGroundBeyond(picture, side, inwards)) ?? null;
}

function edgeStrength({ width, height, data }: Grey, inwards: 1 | -1): Float32Array {
  const strength = new Float32Array(width * height);
  for (let y = REACH; y < height - REACH; y++) {
    for (let x = 0; x < width; x++) {
      const rise =
        ((data[(y + REACH) * width + x] as number) - (data[(y - REACH) * width + x] as number)) * inwards;
      strength[y * width + x] = rise < STEP / 2 ? 0 : Math.min(STRONGEST, rise);
    }
  }
  return strength;
}

/** Beyond the lines and dark bands of a form there is paper again; beyond a sheet there is none. */
function hasGroundBeyond({ width, height, data }: Grey, { at, slope }: Side, inwards: 1 | -1): boolean {
  let [ground, all] = [0, 0];
  for (let x = 0; x < width; x += 4) {
    const edge = at + slope * (x - width / 2);
    const inside: number[] = [];
    for (let k = 3; k < 16; k++) {
      const y = Math.round(edge + inwards * k);
      if (y >= 0 && y < height) inside.push(data[y * width + x] as number);
    }
    const paper = inside.sort((a, b) => a - b)[Math.floor(inside.length * 0.7)];
    if (paper === undefined) continue;
    for (let k = 3; k < BEYOND; k++) {
      const y = Math.round(edge - inwards * k);
      if (y < 0 || y >= height) break;
      all++;
      if ((data[y * width + x] as number) < paper - STEP) ground++;
    }
  }
  // A rim of a few pixels is a scanner's shadow, and cutting it off changes nothing.
  return all > width / 2 && ground > 0.8 * all;
}

function soften({ width, height, data }: Grey): Grey {
  const out = new Uint8Array(data.length);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      let [sum, count] = [0, 0];
      for (let v = Math.max(0, y - 1); v <= Math.min(height - 1, y + 1); v++) {
        for (let u = Math.max(0, x - 1); u <= Math.min(width - 1, x + 1); u++) {
          sum += data[v * width + u] as number;
          count++;
        }
      }
      out[y * width + x] = sum / count;
    }
  }
  return { width, height, data: out };
}

function transposed({ width, height, data }: Grey): Grey {
  const out = new Uint8Array(data.length);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) out[x * height + y] = data[y * width + x] as number;
  }
  return { width: height, height: width, data: out };
}
