import { describe, expect, test } from 'vitest';

import { JudgedChart } from '@/lib/evidence/chart/judged-chart';
import { readChart } from '@/lib/evidence/chart/read-chart';

import { DIALECTS, START_S } from '../../../evidence/charts/dialects';
import { ASKED, runs } from '../../../evidence/charts/stories';

const moment = (second: number | null) =>
  second === null ? null : new Date((START_S + second) * 1000).toISOString().slice(0, 19);
const secondsOf = (written: string | null) =>
  written === null ? Number.NaN : Date.parse(`${written}Z`) / 1000 - START_S;

const RUNS = runs(20);
/** Each story in a dialect of its own, so that all dialects are met. */
const CHARTS = RUNS.map((run, at) => ({ run, dialect: DIALECTS[at % DIALECTS.length] })).flatMap(
  ({ run, dialect }) => (dialect ? [{ name: `${run.name} (${dialect.name})`, run, dialect }] : []),
);

describe('twenty charts', () => {
  test.each(CHARTS)('$name', ({ run, dialect }) => {
    const { truth } = run;
    const read = JudgedChart.parse(readChart(dialect.write(run), ASKED));
    expect({
      delimiter: read.understood.delimiter,
      decimal: read.understood.decimal,
      // Whether an hour before ten has a leading zero shows only in a file that has one.
      time: read.understood.time.replace('hh:', 'h:'),
      unit: read.understood.unit,
      rows: read.understood.rows,
      channels: read.understood.channels.map(({ name, role }) => ({ name, role })),
    }).toEqual({
      delimiter: dialect.delimiter,
      decimal: dialect.decimal,
      time: dialect.time,
      unit: dialect.unit,
      rows: run.seconds.length,
      channels: run.channels.map(({ name, role }) => ({ name, role })),
    });
    expect(read.soak_start).toBe(moment(truth.soakFrom));
    expect(read.soak_end).toBe(moment(truth.soakTo));
    expect(Math.abs((read.max_overshoot_above_upper_limit ?? -1) - truth.overshoot)).toBeLessThan(0.1);
    expect(Math.abs((read.quench_delay_s ?? -100) - (truth.quenchDelayS ?? 0))).toBeLessThanOrEqual(1);
    expect(
      read.understood.channels.filter(({ excluded }) => excluded !== null).map(({ name }) => name),
    ).toEqual(truth.excluded);
    expect([...new Set(read.flags.map(({ code }) => code))].toSorted()).toEqual(truth.flags.toSorted());
    expect([read.verdict, read.why]).toEqual([truth.verdict, read.why]);
  });
});

describe('the dialect does not change the verdict', () => {
  test.each(DIALECTS.map((dialect) => ({ name: dialect.name, dialect })))('$name', ({ dialect }) => {
    for (const run of RUNS) {
      const read = readChart(dialect.write(run), ASKED);
      const { truth } = run;
      const said = {
        run: run.name,
        verdict: read.verdict,
        flags: [...new Set(read.flags.map(({ code }) => code))].toSorted(),
        // A recorder in °C rounds, so that a reading at the limit may fall on its other side.
        soakIsClose: [
          [read.soak_start, truth.soakFrom],
          [read.soak_end, truth.soakTo],
        ].every(([written, second]) => Math.abs(secondsOf(written as string) - (second as number)) <= 20),
      };
      expect(said).toEqual({
        run: run.name,
        verdict: truth.verdict,
        flags: truth.flags.toSorted(),
        soakIsClose: true,
      });
    }
  });
});
