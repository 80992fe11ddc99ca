import { expect, test } from 'vitest';

import { askedOfChart } from '@/lib/charts/asked-of-chart';

const solution = { set_f: 920, tolerance_f: 10 };

test('temperature and time may be two requirements; of several times the strictest counts', () => {
  expect(
    askedOfChart([
      { solution },
      { solution: { soak_min_minutes: 35, soak_max_minutes: 60 } as never },
      { solution: { soak_min_minutes: 40 } as never },
      { quench: { max_delay_seconds: 15 } },
      { quench: { max_delay_seconds: 10 } },
    ]),
  ).toEqual({
    set: 920,
    tolerance: 10,
    unit: 'F',
    soakMinutes: 40,
    soakMinutesMax: 60,
    maxQuenchDelayS: 10,
  });
});

test('lines that ask for different temperatures have no chart in common', () => {
  expect(askedOfChart([{ solution }, { solution: { set_f: 935, tolerance_f: 10 } }])).toBeNull();
  expect(askedOfChart([{ solution }, { solution: { ...solution, tolerance_f: 5 } }])).toBeNull();
});

test('hours are minutes; a time without a temperature asks nothing of a chart', () => {
  expect(askedOfChart([{ bake: { set_f: 375, tolerance_f: 25, min_hours: 23 } }])).toMatchObject({
    set: 375,
    soakMinutes: 23 * 60,
  });
  expect(askedOfChart([{ age: { kind: 'natural', min_hours: 96 } }, {}])).toBeNull();
});
