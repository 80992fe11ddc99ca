import type { ChannelRole, FLAG_CODES, JudgedChart } from '@/lib/evidence/chart/judged-chart';

/** A run of a furnace in °F, before any recorder writes it; readings are in tenths, null is none, `open` a broken circuit. */
export interface Run {
  readonly name: string;
  /** Seconds since the start, rising. */
  readonly seconds: readonly number[];
  readonly channels: readonly { name: string; role: ChannelRole; values: readonly (number | 'open')[] }[];
  readonly truth: Truth;
}

export interface Truth {
  /** Seconds since the start; null where the load never soaked. */
  readonly soakFrom: number | null;
  readonly soakTo: number | null;
  readonly overshoot: number;
  readonly quenchDelayS: number | null;
  readonly verdict: JudgedChart['verdict'];
  readonly flags: readonly (typeof FLAG_CODES)[number][];
  readonly excluded: readonly string[];
}

export const ASKED = {
  set: 920,
  tolerance: 10,
  unit: 'F',
  soakMinutes: 30,
  soakMinutesMax: 60,
  maxQuenchDelayS: 10,
} as const;

const [LOWER, UPPER] = [ASKED.set - ASKED.tolerance, ASKED.set + ASKED.tolerance];
const STEP_S = 10;
const HEAT_S = 2400;

interface Plan {
  readonly name: string;
  readonly verdict: JudgedChart['verdict'];
  readonly flags?: Truth['flags'];
  readonly excluded?: readonly string[];
  readonly soakMin?: number;
  readonly delayS?: number;
  readonly loads?: number;
  readonly withControl?: boolean;
  readonly withSetPoint?: boolean;
  /** Changes the readings; times count from the start, `soak` is when the last one should be in the band. */
  readonly change?: (grid: Grid, soak: { from: number; to: number }) => void;
}

interface Grid {
  seconds: number[];
  loads: (number | 'open')[][];
  readonly rowAt: (second: number) => number;
}

const between = (
  grid: Grid,
  load: number,
  [from, to]: readonly [number, number],
  give: (value: number, row: number) => number | 'open',
) => {
  const values = grid.loads[load] ?? [];
  for (let row = grid.rowAt(from); row < grid.rowAt(to); row++) {
    const value = values[row];
    if (typeof value === 'number') values[row] = rounded(give(value, row));
  }
};
const dropRows = (grid: Grid, from: number, to: number) => {
  const [first, count] = [grid.rowAt(from), grid.rowAt(to) - grid.rowAt(from)];
  grid.seconds.splice(first, count);
  for (const values of grid.loads) values.splice(first, count);
};

const PLANS: readonly Plan[] = [
  { name: 'clean', verdict: 'pass' },
  { name: 'clean, with control and set point', verdict: 'pass', withControl: true, withSetPoint: true },
  { name: 'control only', verdict: 'pass', loads: 0, withControl: true, withSetPoint: true },
  { name: 'twelve thermocouples', verdict: 'pass', loads: 12, withSetPoint: true },
  { name: 'one thermocouple', verdict: 'pass', loads: 1 },
  { name: 'short soak', verdict: 'fail', soakMin: 24, flags: ['short_soak'] },
  { name: 'long soak', verdict: 'fail', soakMin: 75 },
  {
    name: 'a dip ends the soak',
    verdict: 'fail',
    soakMin: 50,
    flags: ['short_soak'],
    change: (grid, { from }) => between(grid, 1, [from + 900, from + 960], (value) => value - 16),
  },
  {
    name: 'one cooler row ends the soak',
    verdict: 'fail',
    soakMin: 50,
    flags: ['short_soak'],
    change: (grid, { from }) => between(grid, 1, [from + 900, from + 910], (value) => value - 14),
  },
  {
    name: 'overshoot',
    verdict: 'fail',
    flags: ['overshoot'],
    change: (grid, { from }) => between(grid, 0, [from + 300, from + 480], (value) => value + 15),
  },
  {
    name: 'a gap in the soak',
    verdict: 'review',
    flags: ['gap'],
    change: (grid, { from }) => dropRows(grid, from + 600, from + 900),
  },
  {
    name: 'a gap on the way up',
    verdict: 'pass',
    flags: ['gap'],
    change: (grid) => dropRows(grid, 600, 780),
  },
  {
    name: 'open circuit from the start',
    verdict: 'pass',
    flags: ['open_circuit'],
    excluded: ['TC2'],
    change: (grid) => between(grid, 1, [0, 1e6], () => 'open'),
  },
  {
    name: 'open circuit in the soak',
    verdict: 'pass',
    flags: ['open_circuit'],
    excluded: ['TC2'],
    change: (grid, { from }) => between(grid, 1, [from + 700, 1e6], () => 'open'),
  },
  {
    name: 'open circuit in the quench',
    verdict: 'pass',
    flags: ['open_circuit'],
    change: (grid, { to }) => between(grid, 2, [to + 20, 1e6], () => 'open'),
  },
  {
    name: 'dead from the start',
    verdict: 'pass',
    flags: ['flat_line'],
    excluded: ['TC2'],
    change: (grid) => between(grid, 1, [0, 1e6], () => 71.3),
  },
  {
    name: 'stands still from the soak on',
    verdict: 'review',
    flags: ['flat_line'],
    excluded: ['TC2'],
    change: (grid, { from }) => between(grid, 1, [from + 400, 1e6], () => 919.4),
  },
  {
    name: 'late thermocouple',
    verdict: 'pass',
    soakMin: 55,
    flags: ['late_channel'],
    change: (grid, { from }) =>
      between(
        grid,
        2,
        [0, from + 900],
        (value, row) => value - 60 * Math.min(1, (from + 900 - (grid.seconds[row] ?? 0)) / 900),
      ),
  },
  {
    name: 'a spike in the soak',
    verdict: 'review',
    flags: ['spike'],
    change: (grid, { from }) => between(grid, 0, [from + 500, from + 510], () => 1322.5),
  },
  { name: 'a slow quench', verdict: 'fail', delayS: 22 },
];

/** The twenty runs, the same for the same seed. */
export const runs = (seed: number): readonly Run[] => PLANS.map((plan, at) => runOf(plan, seed + at * 1000));

function runOf(plan: Plan, seed: number): Run {
  const { name, verdict, soakMin = 38, delayS = 7, loads = 4, flags = [], excluded = [] } = plan;
  const random = randomOf(seed);
  const to = HEAT_S + soakMin * 60;
  const seconds = [...steps(0, to, STEP_S), ...steps(to, to + delayS + 90, 1)];
  const heatOf = (slower: number) => (second: number) => {
    const wave = 1.5 * Math.sin(second / 400 + slower * 9) + (random() - 0.5);
    if (second > to + delayS) return 75 + 825 * Math.exp(-(second - to - delayS) / 5);
    if (second > to) return ASKED.set - slower - 2.5 * (second - to) + wave / 3;
    // In the band a little before the planned beginning, crossing it without wavering.
    const way = Math.min(1, second / (HEAT_S * (1 + slower / 40)));
    return 70 + (ASKED.set - 71 - slower) * Math.min(1, way * 1.25 - 0.25 * way * way) + (way < 1 ? 0 : wave);
  };
  const values = Array.from({ length: Math.max(1, loads) }, (_, at) =>
    seconds.map(heatOf((at % 5) * 0.6)).map(tenth),
  );
  const grid: Grid = {
    seconds,
    loads: values,
    rowAt: (second) => {
      const row = grid.seconds.findIndex((one) => one >= second);
      return row < 0 ? grid.seconds.length : row;
    },
  };
  plan.change?.(grid, { from: HEAT_S, to });
  const channels: Run['channels'][number][] = grid.loads.map((readings, at) =>
    loads === 0
      ? { name: 'Control', role: 'control', values: readings }
      : { name: `TC${at + 1}`, role: 'load', values: readings },
  );
  if (plan.withControl && loads > 0) {
    channels.push({
      name: 'Control',
      role: 'control',
      values: grid.seconds.map(heatOf(0)).map((value) => tenth(value + 2)),
    });
  }
  if (plan.withSetPoint)
    channels.push({ name: 'SP', role: 'set_point', values: grid.seconds.map(() => ASKED.set) });
  const counted = channels.filter(
    ({ role, name: own }) => (loads === 0 || role === 'load') && !excluded.includes(own),
  );
  const truth = {
    ...soakByTheRule(
      grid.seconds,
      counted.map(({ values: readings }) => readings),
      flags.includes('spike'),
    ),
    quenchDelayS: delayS,
    verdict,
    flags,
    excluded,
  };
  return { name, seconds: grid.seconds, channels, truth };
}

/** The contract's rule, word for word, over the readings as they will be written. */
function soakByTheRule(
  seconds: readonly number[],
  counted: readonly (readonly (number | 'open')[])[],
  spiked: boolean,
) {
  const numbers = (row: number) =>
    counted
      .map((values) => values[row])
      .filter((value): value is number => typeof value === 'number' && !(spiked && value > 1200));
  const rows = seconds.map((_, row) => row);
  const from = rows.find((row) => Math.min(...numbers(row)) >= LOWER);
  const to = rows.find((row) => from !== undefined && row > from && Math.min(...numbers(row)) < LOWER);
  const highest = Math.max(...rows.flatMap(numbers));
  return {
    soakFrom: from === undefined ? null : (seconds[from] ?? null),
    soakTo: to === undefined ? null : (seconds[to] ?? null),
    overshoot: Math.max(0, highest - UPPER),
  };
}

const steps = (from: number, to: number, step: number): number[] =>
  Array.from({ length: Math.ceil((to - from) / step) }, (_, at) => from + at * step);
const rounded = (value: number | 'open'): number | 'open' => (value === 'open' ? value : tenth(value));
const tenth = (value: number): number => Math.round(value * 10) / 10;

function randomOf(seed: number): () => number {
  let state = (seed * 2_654_435_761) % 2_147_483_647 || 1;
  return () => {
    state = (state * 16_807) % 2_147_483_647;
    return state / 2_147_483_647;
  };
}
