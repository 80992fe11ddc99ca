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

/** Of a line's length, the shares along which there must be ink, and thin ink: a row of letters has gaps and stems. */
const ENOUGH = { ink: 0.82, thin: 0.62 };
/** A line shorter than this could be the bar of a word in large type, and must be spotless. */
const SHORT = 0.65;
const SPOTLESS = { ink: 0.96, thin: 0.85 };

/**
 * Finds the rules of a straightened page.
 *
 * Lines of tables spoil recognition, so their own ink is given for wiping off; a letter that crosses one keeps its ink.
 */
export function findRules(ink: Ink, dpi: number): Rules {
  const turned = transpose(ink);
  const thickest = Math.max(3, Math.round(THICKEST * dpi));
  const across = bandsIn(ink, turned, { shortest: SHORTEST_ACROSS * dpi, thickest, dpi });
  const down = bandsIn(turned, ink, { shortest: SHORTEST_DOWN * dpi, thickest, dpi });
  const areas = across.others.filter((box) => box[3] - box[1] >= THINNEST_AREA * dpi);
  const upended = down.lines.map(([l, t, r, b]): PixelBox => [t, l, b, r]);
  return {
    lines: [...across.lines, ...upended],
    areas,
    ink: inkOfLines(ink, { turned, across: across.lines, down: down.lines, thickest }),
  };
}

/** Long runs gathered into bands, parted into lines and the rest. `sideways` is the same ink, transposed. */
function bandsIn(
  ink: Ink,
  sideways: Ink,
  { shortest, thickest, dpi }: { shortest: number; thickest: number; dpi: number },
): { lines: PixelBox[]; others: PixelBox[] } {
  const lines: PixelBox[] = [];
  const others: PixelBox[] = [];
  for (const box of gather(longRuns(ink, Math.round(shortest)))) {
    const narrow = box[3] - box[1] <= thickest + 2 + (box[2] - box[0]) * 0.01;
    const wanted = box[2] - box[0] < SHORT * dpi ? SPOTLESS : ENOUGH;
    if (narrow && isLine(sideways, box, { thickest, wanted })) lines.push(box);
    else others.push(box);
  }
  return { lines, others };
}

function isLine(
  sideways: Ink,
  box: PixelBox,
  { thickest, wanted }: { thickest: number; wanted: { readonly ink: number; readonly thin: number } },
): boolean {
  let [thin, inked, last] = [0, 0, -1];
  eachRunWithin(sideways, box, (x, top, bottom) => {
    if (x !== last) inked++;
    if (x !== last && bottom - top <= thickest) thin++;
    last = x;
  });
  return inked > wanted.ink * (box[2] - box[0]) && thin > wanted.thin * inked;
}

/** Calls `visit` for each run of ink that stands across the band at each place along it. */
function eachRunWithin(
  { width: depth, data }: Ink,
  [left, top, right, bottom]: PixelBox,
  visit: (x: number, from: number, to: number) => void,
): void {
  for (let x = left; x < right; x++) {
    const line = x * depth;
    for (let y = top; y < bottom; y++) {
      if (data[line + y] === 0) continue;
      let from = y;
      while (from > 0 && data[line + from - 1] === 1) from--;
      while (y + 1 < depth && data[line + y + 1] === 1) y++;
      visit(x, from, y + 1);
    }
  }
}

interface Run {
  readonly row: number;
  readonly from: number;
  readonly to: number;
}

/** Each row is taken with its neighbours, so that the steps of a line that leans a little do not break it. */
function longRuns({ width, height, data }: Ink, shortest: number): Run[] {
  const runs: Run[] = [];
  for (let row = 0; row < height; row++) {
    const line = row * width;
    const above = row > 0 ? line - width : line;
    const below = row < height - 1 ? line + width : line;
    let from = -1;
    let last = -1;
    for (let x = 0; x < width; x++) {
      if (((data[line + x] as number) | (data[above + x] as number) | (data[below + x] as number)) === 0)
        continue;
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
  {
    turned,
    across,
    down,
    thickest,
  }: { turned: Ink; across: readonly PixelBox[]; down: readonly PixelBox[]; thickest: number },
): Ink {
  const { width, height, data } = ink;
  const out = new Uint8Array(width * height);
  for (const box of across) {
    eachRunWithin(turned, box, (x, from, to) => {
      if (to - from <= thickest) for (let y = from; y < to; y++) out[y * width + x] = 1;
    });
  }
  for (const box of down) {
    eachRunWithin(ink, box, (y, from, to) => {
      if (to - from <= thickest) out.fill(1, y * width + from, y * width + to);
    });
  }
  // Where two lines cross both are thick; that ink is a line's all the same.
  for (const [left, top, right, bottom] of across) {
    for (const [y0, x0, y1, x1] of down) {
      for (let y = Math.max(top, y0); y < Math.min(bottom, y1); y++) {
        for (let x = Math.max(left, x0); x < Math.min(right, x1); x++)
          out[y * width + x] = data[y * width + x] as number;
      }
    }
  }
  return { width, height, data: out };
}
