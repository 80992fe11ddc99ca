import fc from 'fast-check';
import { expect, test } from 'vitest';

import type { JudgedChart } from '@/lib/evidence/chart/judged-chart';
import { readChart } from '@/lib/evidence/chart/read-chart';

import { ASKED, runs, type Run } from '../../../evidence/charts/stories';

const RUNS = runs(77);
const clean = cleanOf(RUNS);
const START = Date.UTC(2026, 4, 20, 6);
const anyRun = fc.nat({ max: RUNS.length - 1 });
const runAt = (at: number): Run => RUNS[at] ?? clean;
const FEW = { numRuns: 25 };

function cleanOf([first]: readonly Run[]): Run {
  if (!first) throw new Error('There is no run.');
  return first;
}

interface Writing {
  readonly shiftS?: number;
  readonly unit?: 'F' | 'C';
  readonly digits?: number;
  readonly order?: readonly number[];
}

function written(
  { seconds, channels }: Run,
  { shiftS = 0, unit = 'F', digits = 1, order }: Writing = {},
): Uint8Array {
  const columns = (order ?? channels.map((_, at) => at)).flatMap((at) => channels[at] ?? []);
  const lines = seconds.map((second, row) => {
    const cells = columns.map(({ values }) => {
      const value = values[row] ?? 'open';
      if (value === 'open') return 'OPEN';
      return (unit === 'F' ? value : (value - 32) / 1.8).toFixed(digits);
    });
    return [new Date(START + (second + shiftS) * 1000).toISOString().slice(0, 19), ...cells].join(',');
  });
  const heading = ['Time', ...columns.map(({ name }) => `${name} (°${unit})`)].join(',');
  return new TextEncoder().encode([heading, ...lines].join('\n'));
}

const codes = ({ flags }: JudgedChart) =>
  flags.map(({ code, channel }) => `${code} ${channel ?? ''}`).toSorted();
const secondsOf = (moment: string | null) => (moment === null ? null : Date.parse(`${moment}Z`) / 1000);

test('a chart that begins later says the same, that much later', () => {
  fc.assert(
    fc.property(anyRun, fc.integer({ min: 0, max: 40 * 86_400 }), (at, shiftS) => {
      const run = runAt(at);
      const [now, later] = [readChart(written(run), ASKED), readChart(written(run, { shiftS }), ASKED)];
      expect([
        later.verdict,
        later.soak_minutes,
        later.quench_delay_s,
        later.max_temperature,
        codes(later),
      ]).toEqual([now.verdict, now.soak_minutes, now.quench_delay_s, now.max_temperature, codes(now)]);
      expect((secondsOf(later.soak_start) ?? 0) - (secondsOf(now.soak_start) ?? 0)).toBe(shiftS);
    }),
    FEW,
  );
});

test('in the other unit a chart says the same', () => {
  fc.assert(
    fc.property(anyRun, fc.integer({ min: 2, max: 4 }), (at, digits) => {
      const run = runAt(at);
      const [inF, inC] = [
        readChart(written(run), ASKED),
        readChart(written(run, { unit: 'C', digits }), ASKED),
      ];
      expect([inC.verdict, inC.soak_minutes, codes(inC)]).toEqual([
        inF.verdict,
        inF.soak_minutes,
        codes(inF),
      ]);
      expect(inC.max_temperature).toBeCloseTo(inF.max_temperature ?? Number.NaN, 1);
      expect(inC.understood.unit).toBe('C');
    }),
    FEW,
  );
});

test('the order of the columns does not matter', () => {
  const withOrder = anyRun.chain((at) =>
    fc
      .shuffledSubarray(
        runAt(at).channels.map((_, column) => column),
        { minLength: runAt(at).channels.length },
      )
      .map((order) => ({ at, order })),
  );
  fc.assert(
    fc.property(withOrder, ({ at, order }) => {
      const run = runAt(at);
      const [straight, mixed] = [readChart(written(run), ASKED), readChart(written(run, { order }), ASKED)];
      expect([mixed.verdict, mixed.soak_start, mixed.soak_end, mixed.quench_delay_s, codes(mixed)]).toEqual([
        straight.verdict,
        straight.soak_start,
        straight.soak_end,
        straight.quench_delay_s,
        codes(straight),
      ]);
    }),
    FEW,
  );
});

test('one cooler reading ends the soak where it stands', () => {
  const from = clean.seconds.findIndex((second) => second === clean.truth.soakFrom);
  const to = clean.seconds.findIndex((second) => second === clean.truth.soakTo);
  fc.assert(
    fc.property(
      fc.integer({ min: from + 1, max: to - 1 }),
      fc.nat({ max: clean.channels.length - 1 }),
      fc.integer({ min: 890, max: 909 }),
      (row, channel, degrees) => {
        const channels = clean.channels.map((one, at) =>
          at === channel ? { ...one, values: one.values.with(row, degrees) } : one,
        );
        const cooler = readChart(written({ ...clean, channels }), ASKED);
        const before = readChart(written(clean), ASKED);
        expect(cooler.soak_start).toBe(before.soak_start);
        expect((secondsOf(cooler.soak_end) ?? 0) - START / 1000).toBe(clean.seconds[row]);
      },
    ),
    FEW,
  );
});

test('a further thermocouple never lengthens the soak', () => {
  fc.assert(
    fc.property(fc.double({ min: -9, max: 9, noNaN: true }), (off) => {
      const [first] = clean.channels;
      if (!first) throw new Error('No channel.');
      const further = {
        ...first,
        name: 'TC9',
        values: first.values.map((value) => (value === 'open' ? value : Math.round((value + off) * 10) / 10)),
      };
      const more = readChart(written({ ...clean, channels: [...clean.channels, further] }), ASKED);
      expect(more.soak_minutes).toBeLessThanOrEqual(readChart(written(clean), ASKED).soak_minutes ?? 0);
    }),
    FEW,
  );
});

test('asking for more never turns what fails into what passes', () => {
  fc.assert(
    fc.property(
      anyRun,
      fc.integer({ min: 1, max: 80 }),
      fc.integer({ min: 0, max: 30 }),
      (at, asked, more) => {
        const run = runAt(at);
        const file = written(run);
        const { verdict } = readChart(file, { ...ASKED, soakMinutes: asked, soakMinutesMax: 200 });
        const stricter = readChart(file, { ...ASKED, soakMinutes: asked + more, soakMinutesMax: 200 });
        if (verdict === 'fail') expect(stricter.verdict).toBe('fail');
      },
    ),
    FEW,
  );
});
