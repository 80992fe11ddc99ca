import type { Ink, PixelBox } from './grey';

/** Long straight runs of ink: lines of forms and tables, and areas filled with ink. */
export interface Rules {
  readonly lines: readonly PixelBox[];
  readonly areas: readonly PixelBox[];
  /** Ink of the lines alone; what crosses them is left out. */
  readonly ink: Ink;
}

/** In inches. Letters of headings stay below the lengths, lines of forms below the thickness. */
const SHORTEST_ACROSS = 0.3;
const SHORTEST_DOWN = 0.28;
const THICKEST = 0.045;
const THINNEST_AREA = 0.085;
/** Print breaks up: so many white pixels do not end a line. */
const GAP = 2;

/**
 * Finds the rules of a straightened page.
 *
 * Lines of tables spoil recognition, so their own ink is given for wiping off; a letter that crosses one keeps its ink.
 */
export function findRules(ink: Ink, dpi: number): Rules {
  const across = longRuns(ink, Math.round(SHORTEST_ACROSS * dpi));
  const turned = transpose(ink);
  const down = longRuns(turned, Math.round(SHORTEST_DOWN * dpi));
  const boxesAcross = gather(across);
  const boxesDown = gather(down).map(([l, t, r, b]): PixelBox => [t, l, b, r]);
  const thickest = Math.max(3, Math.round(THICKEST * dpi));
  const areas = boxesAcross.filter((box) => box[3] - box[1] >= THINNEST_AREA * dpi);
  return {
    lines: [
      ...boxesAcross.filter((box) => box[3] - box[1] <= thickest + (box[2] - box[0]) * 0.01),
      ...boxesDown.filter((box) => box[2] - box[0] <= thickest + (box[3] - box[1]) * 0.01),
    ],
    areas,
    ink: inkOfLines(ink, { turned, across, down, thickest }),
  };
}

interface Run {
  readonly row: number;
  readonly from: number;
  readonly to: number;
}

function longRuns({ width, height, data }: Ink, shortest: number): Run[] {
  const runs: Run[] = [];
  for (let row = 0; row < height; row++) {
    const line = row * width;
    let from = -1;
    let last = -1;
    for (let x = 0; x < width; x++) {
      if (data[line + x] === 0) continue;
      if (from < 0 || x - last > GAP + 1) {
        if (from >= 0 && last + 1 - from >= shortest) runs.push({ row, from, to: last + 1 });
        from = x;
      }
      last = x;
    }
    if (from >= 0 && last + 1 - from >= shortest) runs.push({ row, from, to: last + 1 });
  }
  return runs;
}

/** In blocks, so that neither picture is read against its grain. */
function transpose({ width, height, data }: Ink): Ink {
  const out = new Uint8Array(data.length);
  const block = 32;
  for (let top = 0; top < height; top += block) {
    for (let left = 0; left < width; left += block) {
      const [bottom, right] = [Math.min(height, top + block), Math.min(width, left + block)];
      for (let y = top; y < bottom; y++) {
        for (let x = left; x < right; x++) out[x * height + y] = data[y * width + x] as number;
      }
    }
  }
  return { width: height, height: width, data: out };
}

/** Runs of neighbouring rows that overlap are one line. */
function gather(runs: readonly Run[]): PixelBox[] {
  const open: [number, number, number, number][] = [];
  const done: PixelBox[] = [];
  for (const { row, from, to } of runs) {
    for (let i = open.length - 1; i >= 0; i--) {
      const box = open[i] as [number, number, number, number];
      if (row - box[3] > GAP) done.push(...open.splice(i, 1));
    }
    const touching = open.filter((box) => from <= box[2] && to >= box[0]);
    const first = touching[0];
    if (!first) {
      open.push([from, row, to, row + 1]);
      continue;
    }
    first[0] = Math.min(first[0], from);
    first[2] = Math.max(first[2], to);
    first[3] = row + 1;
    for (const other of touching.slice(1)) {
      first[0] = Math.min(first[0], other[0]);
      first[1] = Math.min(first[1], other[1]);
      first[2] = Math.max(first[2], other[2]);
      open.splice(open.indexOf(other), 1);
    }
  }
  return [...done, ...open];
}

function inkOfLines(
  ink: Ink,
  { turned, across, down, thickest }: { turned: Ink; across: Run[]; down: Run[]; thickest: number },
): Ink {
  const { width, height } = ink;
  const out = new Uint8Array(width * height);
  const wipe = (x: number, y: number) => {
    out[y * width + x] = 1;
  };
  // Where two lines cross both are thick; that ink is a line's all the same.
  const seen = new Uint8Array(width * height);
  for (const { row, from, to } of across) seen.fill(1, row * width + from, row * width + to);
  for (const { row, from, to } of down) {
    for (let y = from; y < to; y++) {
      if (seen[y * width + row] === 1) wipe(row, y);
    }
  }
  markThin(turned, across, thickest, wipe);
  markThin(ink, down, thickest, (x, y) => wipe(y, x));
  return { width, height, data: out };
}

/** Marks the ink of runs where, measured across them in `sideways`, it is no thicker than a line. */
function markThin(
  sideways: Ink,
  runs: readonly Run[],
  thickest: number,
  mark: (x: number, y: number) => void,
): void {
  const { width: depth, data } = sideways;
  for (const { row, from, to } of runs) {
    for (let x = from; x < to; x++) {
      const line = x * depth;
      if (data[line + row] === 0) continue;
      let top = row;
      while (top > 0 && row - top <= thickest && data[line + top - 1] === 1) top--;
      let bottom = row + 1;
      while (bottom < depth && bottom - top <= thickest && data[line + bottom] === 1) bottom++;
      if (bottom - top <= thickest) mark(x, row);
    }
  }
}
