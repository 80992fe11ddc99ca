/** Rows from `from` up to, not with, `to`. */
export interface Run {
  readonly from: number;
  readonly to: number;
}

/** The runs of rows of which something holds. */
export function runsWhere(rows: number, holds: (row: number) => boolean): Run[] {
  const runs: Run[] = [];
  let from = -1;
  for (let row = 0; row <= rows; row++) {
    const does = row < rows && holds(row);
    if (does && from < 0) from = row;
    else if (!does && from >= 0) {
      runs.push({ from, to: row });
      from = -1;
    }
  }
  return runs;
}

/** Runs with fewer than so many rows between them become one. */
export function joined(runs: readonly Run[], apart: number): Run[] {
  const together: Run[] = [];
  for (const run of runs) {
    const before = together[together.length - 1];
    if (before && run.from - before.to <= apart)
      together[together.length - 1] = { from: before.from, to: run.to };
    else together.push(run);
  }
  return together;
}
