import type { Corners } from './find-sheet';
import type { Grey } from './grey';
import { chainProjections, inverseOf, scaling, squareOnto, type Point, type Projection } from './projection';
import { warp } from './warp';

export interface Rectified {
  readonly picture: Grey;
  /** Pixels to the inch, if the sheet is of a usual size. */
  readonly dpi: number;
  /** From the photograph to the sheet seen straight on. */
  readonly projection: Projection;
}

/** In points: the sheets certificates are printed on. */
const SHEETS = [
  [612, 792],
  [595, 842],
] as const;
/** Enough for print of 6 points; more pixels tell nothing new. */
const FINEST_DPI = 225;

/** Draws the sheet with these corners as if seen from straight above, in the nearest usual size of paper. */
export function rectify(photograph: Grey, corners: Corners): Rectified {
  const [ul, ur, lr, ll] = corners;
  const across = (distance(ul, ur) + distance(ll, lr)) / 2;
  const down = (distance(ul, ll) + distance(ur, lr)) / 2;
  const ratio = Math.max(across, down) / Math.min(across, down);
  const [short, long] = SHEETS.reduce((best, sheet) =>
    Math.abs(sheet[1] / sheet[0] - ratio) < Math.abs(best[1] / best[0] - ratio) ? sheet : best,
  );
  const [wide, high] = across > down ? [long, short] : [short, long];
  const dpi = Math.min(FINEST_DPI, (72 * Math.max(distance(ul, ur), distance(ll, lr))) / wide);
  const width = Math.round((wide * dpi) / 72);
  const height = Math.round((high * dpi) / 72);
  const fromSheet = chainProjections(scaling(1 / width, 1 / height), squareOnto(corners));
  return { picture: warp(photograph, fromSheet, { width, height }), dpi, projection: inverseOf(fromSheet) };
}

const distance = (a: Point, b: Point) => Math.hypot(a[0] - b[0], a[1] - b[1]);
