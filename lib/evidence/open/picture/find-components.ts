import type { Ink, PixelBox } from './grey';

/** Ink that hangs together, also by corners. */
export interface Component {
  readonly box: PixelBox;
  /** Pixels of ink. */
  readonly area: number;
}

/** Finds all pieces of ink that hang together. Row by row in runs, joined where they touch. */
export function findComponents({ width, height, data }: Ink): Component[] {
  const parent: number[] = [];
  const starts: number[] = [];
  const ends: number[] = [];
  const rows: number[] = [];
  const rootOf = (run: number): number => {
    let root = run;
    while (parent[root] !== root) root = parent[root] as number;
    for (let at = run; parent[at] !== root;) {
      const next = parent[at] as number;
      parent[at] = root;
      at = next;
    }
    return root;
  };

  let above = 0;
  let aboveEnd = 0;
  for (let y = 0; y < height; y++) {
    const first = starts.length;
    let candidate = above;
    const line = y * width;
    for (let x = 0; x < width;) {
      if (data[line + x] === 0) {
        x++;
        continue;
      }
      const start = x;
      while (x < width && data[line + x] === 1) x++;
      const run = starts.length;
      parent.push(run);
      starts.push(start);
      ends.push(x);
      rows.push(y);
      while (candidate < aboveEnd && (ends[candidate] as number) < start) candidate++;
      for (let other = candidate; other < aboveEnd && (starts[other] as number) <= x; other++) {
        const [a, b] = [rootOf(other), rootOf(run)];
        if (a !== b) parent[Math.max(a, b)] = Math.min(a, b);
      }
    }
    above = first;
    aboveEnd = starts.length;
  }
  return collect({ starts, ends, rows }, rootOf);
}

function collect(
  { starts, ends, rows }: { starts: number[]; ends: number[]; rows: number[] },
  rootOf: (run: number) => number,
): Component[] {
  const found = new Map<number, { box: [number, number, number, number]; area: number }>();
  for (let run = 0; run < starts.length; run++) {
    const [start, end, y] = [starts[run] as number, ends[run] as number, rows[run] as number];
    const root = rootOf(run);
    const one = found.get(root);
    if (!one) {
      found.set(root, { box: [start, y, end, y + 1], area: end - start });
      continue;
    }
    one.box[0] = Math.min(one.box[0], start);
    one.box[2] = Math.max(one.box[2], end);
    one.box[3] = y + 1;
    one.area += end - start;
  }
  return [...found.values()];
}
