import type { Ink } from './grey';

/** How a page lies: degrees clockwise that its lines lean, and whether they run down the picture instead of across. */
export interface Lie {
  readonly skew: number;
  readonly sideways: boolean;
}

const STEEPEST = 7;
const COARSE = 0.5;
const FINE = 0.05;
const MOST_POINTS = 60_000;

/**
 * Finds how the lines of text lie from the ink's shadow along each direction: along the lines it is in sharp bands.
 *
 * `ink` should have 75 to 150 pixels to the inch and no rules. Skew is found within ±7 degrees.
 */
export function findLie(ink: Ink): Lie {
  const points = inkPoints(ink);
  if (points.x.length < 50) return { skew: 0, sideways: false };
  const across = bestAngle(points.x, points.y, ink);
  const down = bestAngle(points.y, points.x, { width: ink.height, height: ink.width });
  const sideways = down.sharpness > across.sharpness;
  // Seen from the side, a line leaning clockwise falls the other way.
  return { sideways, skew: sideways ? -down.angle : across.angle };
}

interface Points {
  readonly x: Float32Array;
  readonly y: Float32Array;
}

/** Where ink begins along each column and row: edges say more than areas, and are fewer. */
function inkPoints({ width, height, data }: Ink): Points {
  const xs: number[] = [];
  const ys: number[] = [];
  for (let y = 1; y < height; y++) {
    for (let x = 1; x < width; x++) {
      const at = y * width + x;
      if (data[at] === 1) {
        xs.push(x);
        ys.push(y);
      }
    }
  }
  const step = Math.max(1, Math.ceil(xs.length / MOST_POINTS));
  const kept = (values: number[]) => Float32Array.from(values.filter((_, i) => i % step === 0));
  return { x: kept(xs), y: kept(ys) };
}

function bestAngle(x: Float32Array, y: Float32Array, size: { width: number; height: number }) {
  let best = { angle: 0, sharpness: -1 };
  const search = (from: number, to: number, step: number) => {
    for (let angle = from; angle <= to + 1e-9; angle += step) {
      const sharpness = sharpnessAt(x, y, size, angle);
      if (sharpness > best.sharpness) best = { angle, sharpness };
    }
  };
  search(-STEEPEST, STEEPEST, COARSE);
  const middle = best.angle;
  search(middle - COARSE, middle + COARSE, FINE);
  return best;
}

function sharpnessAt(
  x: Float32Array,
  y: Float32Array,
  size: { width: number; height: number },
  angle: number,
): number {
  const slope = Math.tan((angle * Math.PI) / 180);
  const offset = Math.ceil(Math.abs(slope) * size.width) + 1;
  const bands = new Float32Array(size.height + 2 * offset + 2);
  for (let i = 0; i < x.length; i++) {
    const at = ((y[i] as number) - slope * (x[i] as number) + offset) | 0;
    bands[at] = (bands[at] as number) + 1;
  }
  let sharpness = 0;
  for (let i = 1; i < bands.length; i++) {
    const change = (bands[i] as number) - (bands[i - 1] as number);
    sharpness += change * change;
  }
  return sharpness / x.length;
}
