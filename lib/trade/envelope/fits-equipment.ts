import type { Verdict } from '../verdict';

import { fitsInPlan, RECTANGLE_IN_RECTANGLE } from './fits-in-plan';

/** The box around a part, or the room that a furnace or tank has for work. */
export interface Box {
  readonly lengthMm: number;
  readonly widthMm: number;
  readonly heightMm: number;
}

/** Which of the part's three measures stands upright. */
export type Upright = 'height' | 'width' | 'length';

export interface EquipmentFit {
  readonly fits: boolean;
  /** Null where it does not fit. */
  readonly upright: Upright | null;
  readonly lies: 'straight' | 'diagonally' | null;
  /** What stops it with the height upright; null where it fits in any allowed way. */
  readonly because: 'too_high' | 'too_large_in_plan' | null;
}

/**
 * Whether a part fits a furnace or tank: its height below the top, its plan straight or diagonally.
 *
 * @param clearanceMm to be kept free all around and above, 0 or more.
 * @param turning `any` lets the part be stood on its side or end; `none` keeps its height upright.
 * @returns the first way that fits: as it is, then on its side, then on its end; refused as `size_not_positive` or
 *   `clearance_negative`.
 * @example 1270 × 102 × 50 mm in 1220 × 610 × 600 mm fits diagonally; 1270 × 203 × 50 mm only when it may be turned.
 */
export function fitsEquipment(
  part: Box,
  room: Box,
  { clearanceMm, turning }: { clearanceMm: number; turning: 'any' | 'none' },
): Verdict<EquipmentFit, 'size_not_positive' | 'clearance_negative'> {
  if (!(clearanceMm >= 0)) return { ok: false, reason: 'clearance_negative' };
  const sizes = [part.lengthMm, part.widthMm, part.heightMm, room.lengthMm, room.widthMm, room.heightMm];
  if (!sizes.every((size) => size > 0 && size < Infinity)) return { ok: false, reason: 'size_not_positive' };
  const free = {
    lengthMm: room.lengthMm - 2 * clearanceMm,
    widthMm: room.widthMm - 2 * clearanceMm,
    heightMm: room.heightMm - clearanceMm,
  };
  const source = RECTANGLE_IN_RECTANGLE;
  const [asItIs, ...turned] = waysUp(part);
  const attempts = [asItIs, ...(turning === 'any' ? turned : [])].map((way) => tryWay(way, free));
  const found = attempts.find(({ fits }) => fits) ?? attempts[0];
  return found ? { ok: true, ...found, source } : { ok: false, reason: 'size_not_positive' };
}

interface WayUp extends Box {
  readonly upright: Upright;
}

const waysUp = ({ lengthMm, widthMm, heightMm }: Box): readonly [WayUp, WayUp, WayUp] => [
  { upright: 'height', lengthMm, widthMm, heightMm },
  { upright: 'width', lengthMm, widthMm: heightMm, heightMm: widthMm },
  { upright: 'length', lengthMm: widthMm, widthMm: heightMm, heightMm: lengthMm },
];

function tryWay({ upright, ...part }: WayUp, free: Box): EquipmentFit {
  if (part.heightMm > free.heightMm) return { fits: false, upright: null, lies: null, because: 'too_high' };
  const plan = fitsInPlan(part, free);
  // A room smaller than its clearances has no plan left.
  if (!plan.ok || !plan.fits) return { fits: false, upright: null, lies: null, because: 'too_large_in_plan' };
  return { fits: true, upright, lies: plan.lies, because: null };
}
