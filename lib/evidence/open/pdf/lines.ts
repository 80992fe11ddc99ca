import type { DrawnGlyph, DrawnRun } from './drawn';

/** A character in a line: `from` and `to` in points along the line, common to all of its runs. */
export interface PlacedGlyph extends DrawnGlyph {
  readonly size: number;
  readonly spacing: number;
}

/** Characters that follow each other on one base line. */
export interface Line {
  readonly along: readonly [number, number];
  /** Distance of the base line from the origin, to the right of its direction. */
  readonly across: number;
  readonly glyphs: readonly PlacedGlyph[];
}

interface Placed {
  readonly run: DrawnRun;
  readonly text: string;
  readonly start: number;
  readonly end: number;
  readonly across: number;
}

const SAME_BASE_LINE = 0.25;
const OVERLAP_ALLOWED = 0.3;
const DRAWN_TWICE = 0.12;

/** Directions within half a degree are one. */
const directionOf = (run: DrawnRun) => Math.round((Math.atan2(run.along[1], run.along[0]) * 360) / Math.PI);

/**
 * Puts runs together that stand on one base line.
 *
 * A run is never cut: where two overlap, as an entry typed over a row of dots, they become two lines.
 * A run drawn a second time a hair beside itself, to look bold, is taken once.
 */
export function gatherLines(runs: readonly DrawnRun[]): Line[] {
  const byDirection = new Map<number, DrawnRun[]>();
  for (const run of runs) {
    const key = directionOf(run);
    const group = byDirection.get(key);
    if (group) group.push(run);
    else byDirection.set(key, [run]);
  }
  return [...byDirection.values()].flatMap(linesOfOneDirection);
}

function linesOfOneDirection(runs: readonly DrawnRun[]): Line[] {
  const along = runs[0]?.along ?? [1, 0];
  const placed = runs
    .map((run) => place(run, along))
    .sort((a, b) => a.across - b.across || a.start - b.start);
  const lines: Line[] = [];
  let row: Placed[] = [];
  const finish = () => {
    if (row.length > 0) lines.push(...chain(row, along));
    row = [];
  };
  for (const next of placed) {
    const first = row[0];
    if (first && next.across - first.across > SAME_BASE_LINE * Math.min(first.run.size, next.run.size))
      finish();
    row.push(next);
  }
  finish();
  return lines;
}

function place(run: DrawnRun, [ux, uy]: readonly [number, number]): Placed {
  const start = run.x * ux + run.y * uy;
  const first = run.glyphs[0];
  const last = run.glyphs.at(-1);
  return {
    run,
    text: run.glyphs.map((glyph) => glyph.text).join(''),
    start: start + (first?.from ?? 0),
    end: start + (last?.to ?? 0),
    across: run.y * ux - run.x * uy,
  };
}

function chain(row: readonly Placed[], along: readonly [number, number]): Line[] {
  const chains: { end: number; members: Placed[] }[] = [];
  const sorted = [...row].sort((a, b) => a.start - b.start);
  for (const [i, next] of sorted.entries()) {
    if (isDrawnTwice(next, sorted, i)) continue;
    const fitting = chains
      .filter((each) => each.end <= next.start + OVERLAP_ALLOWED * next.run.size)
      .sort((a, b) => b.end - a.end)[0];
    if (fitting) {
      fitting.members.push(next);
      fitting.end = Math.max(fitting.end, next.end);
    } else {
      chains.push({ end: next.end, members: [next] });
    }
  }
  return chains.map(({ members }) => ({
    along,
    across: members[0]?.across ?? 0,
    glyphs: members.flatMap(({ run }) => {
      const origin = run.x * along[0] + run.y * along[1];
      return run.glyphs.map((glyph) => ({
        text: glyph.text,
        from: origin + glyph.from,
        to: origin + glyph.to,
        size: run.size,
        spacing: run.spacing,
      }));
    }),
  }));
}

function isDrawnTwice(next: Placed, sorted: readonly Placed[], index: number): boolean {
  const reach = DRAWN_TWICE * next.run.size;
  for (let i = index - 1; i >= 0; i--) {
    const earlier = sorted[i];
    if (!earlier || next.start - earlier.start > reach) return false;
    if (earlier.text === next.text && next.text.trim() !== '') return true;
  }
  return false;
}
