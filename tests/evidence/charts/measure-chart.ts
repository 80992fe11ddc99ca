/**
 * A million rows of nine channels: how long reading and judging takes beside papaparse alone, and how much memory. Each
 * runs in a process of its own on the same file, one after the other, in turns.
 */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

import Papa from 'papaparse';

import { extremesOf } from '@/lib/evidence/chart/extremes';
import { readChart } from '@/lib/evidence/chart/read-chart';
import { recordingOf } from '@/lib/evidence/chart/recording';
import { reduced } from '@/lib/evidence/chart/reduced';
import { timeSpan } from '@/lib/evidence/chart/spans';

import { longChart } from './long-chart';

const ROWS = 1_000_000;
const CHANNELS = 9;
const ROUNDS = 3;
const REQUIREMENT = { set: 920, tolerance: 10, unit: 'F', soakMinutes: 30, maxQuenchDelayS: 10 } as const;

const WORK = {
  papaparse: (path: string) => Papa.parse(readFileSync(path, 'utf8'), { skipEmptyLines: true }).data.length,
  readChart: (path: string) => readChart(new Uint8Array(readFileSync(path)), REQUIREMENT).understood.rows,
};
type Work = keyof typeof WORK;

function measured(work: Work, path: string): { seconds: number; megabytes: number } {
  const self = fileURLToPath(import.meta.url);
  const { stdout, stderr } = spawnSync(process.execPath, ['--import', 'tsx', self, work, path], {
    encoding: 'utf8',
  });
  if (stdout === '') throw new Error(stderr);
  return JSON.parse(stdout) as { seconds: number; megabytes: number };
}

/** What a zoom costs before the canvas is painted: from the whole run to a few rows, in a thousand steps. */
function measureRedraws(bytes: Uint8Array): void {
  const recording = recordingOf(bytes, REQUIREMENT);
  const begun = performance.now();
  const extremes = recording.channels.map(({ values }) => extremesOf(values));
  console.log(`extremes of all channels ${(performance.now() - begun).toFixed(0)} ms, once`);
  const { from, to } = timeSpan(recording);
  const times = Array.from({ length: 1000 }, (_, step) => {
    const half = ((to - from) / 2) * 0.99 ** step;
    const middle = from + (to - from) * (0.3 + (0.4 * step) / 1000);
    const before = performance.now();
    reduced(recording.seconds, extremes, { from: middle - half, to: middle + half, columns: 1200 });
    return performance.now() - before;
  }).toSorted((one, other) => one - other);
  console.log(
    `a redraw ${times[500]?.toFixed(2) ?? ''} ms in the middle, ${times[990]?.toFixed(2) ?? ''} ms at the 99th of a hundred (a frame has 16.7)`,
  );
}

const [, , work, path] = process.argv;
if (work !== undefined && path !== undefined) {
  const before = performance.now();
  const rows = WORK[work as Work](path);
  const seconds = (performance.now() - before) / 1000;
  if (rows < ROWS) throw new Error(`Only ${rows} rows were read.`);
  process.stdout.write(JSON.stringify({ seconds, megabytes: process.resourceUsage().maxRSS / 1024 }));
} else {
  const folder = mkdtempSync(join(tmpdir(), 'chart-'));
  const file = join(folder, 'chart.csv');
  const bytes = longChart(ROWS, CHANNELS);
  writeFileSync(file, bytes);
  console.log(`${ROWS} rows of ${CHANNELS} channels, ${(bytes.length / 1e6).toFixed(0)} MB`);
  const seconds: Record<Work, number[]> = { papaparse: [], readChart: [] };
  for (let round = 1; round <= ROUNDS; round++) {
    for (const one of ['papaparse', 'readChart'] as const) {
      const found = measured(one, file);
      seconds[one].push(found.seconds);
      console.log(
        `${one.padEnd(10)} ${found.seconds.toFixed(2)} s, ${found.megabytes.toFixed(0)} MB at most`,
      );
    }
  }
  rmSync(folder, { recursive: true });
  measureRedraws(bytes);
  const middle = (times: readonly number[]) =>
    times.toSorted((a, b) => a - b)[Math.floor(times.length / 2)] ?? 0;
  console.log(
    `readChart takes ${(middle(seconds.readChart) / middle(seconds.papaparse)).toFixed(2)} of papaparse's time (asked: at most 2)`,
  );
}
