import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { fewestLoads } from '@/lib/trade/heat-treat/fewest-loads';
import type { LoadGroup } from '@/lib/trade/heat-treat/load-needs';
import { planLoads } from '@/lib/trade/heat-treat/load-plan';
import { usableRange } from '@/lib/trade/heat-treat/usable-range';
import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import { MELTING } from '@/lib/trade/tables/melting';
import { QUENCH_DELAYS } from '@/lib/trade/tables/quench-delays';
import { SOAK_TIMES } from '@/lib/trade/tables/soak-times';
import { SOLUTION_TEMPERATURES } from '@/lib/trade/tables/solution-temperatures';
import { mmFromInches } from '@/lib/trade/units/length';
import { celsiusDifferenceFromFahrenheit, fahrenheitFromCelsius } from '@/lib/trade/units/temperature';

const TABLES = {
  solution: SOLUTION_TEMPERATURES,
  melting: MELTING,
  soak: SOAK_TIMES,
  quenchDelays: QUENCH_DELAYS,
  ageing: AGEING_CYCLES,
};
/** ±10 °F, as FAA-H-8083-30 has metal held. */
const TEN_F = celsiusDifferenceFromFahrenheit(10);

const group = (key: string, change: Partial<LoadGroup> = {}): LoadGroup => ({
  key,
  alloy: '2024',
  form: 'sheet',
  clad: false,
  thicknessMm: 1.6,
  thinnestMm: 1.6,
  from: 'O',
  to: 'T42',
  process: 'solution_heat_treat',
  medium: 'air',
  quench: 'cold water',
  ...change,
});
const inches = (printed: number) => ({
  thicknessMm: mmFromInches(printed),
  thinnestMm: mmFromInches(printed),
});
const T62 = { to: 'T62', process: 'solution_heat_treat_and_age' } as const;
const plan = (groups: readonly LoadGroup[]) => planLoads(TABLES, groups, TEN_F);
const loadsOf = (groups: readonly LoadGroup[]) => plan(groups).loads.map((load) => load.groups);
const whyApart = (a: Partial<LoadGroup>, b: Partial<LoadGroup>) => {
  const { apart } = plan([group('a', a), group('b', b)]);
  return apart.map(({ reason }) => reason);
};

describe('what may share a load', () => {
  test('2024 and 7075 sheet make two loads, because they meet only where 7075 may melt', () => {
    const { method, loads, apart } = plan([
      group('2024', { clad: true }),
      group('7075', { alloy: '7075', ...T62 }),
    ]);
    expect(method).toBe('exact');
    expect(loads.map((load) => load.groups)).toEqual([['2024'], ['7075']]);
    expect(apart).toMatchObject([{ between: [['2024'], ['7075']], reason: 'meet_only_above_melting_risk' }]);
  });

  test('the trap of ranges that overlap on paper: 910–930 and 860–930 °F, 2024 with 7075 or 7178 sheet', () => {
    for (const alloy of ['7075', '7178'] as const)
      for (const clad of [true, false])
        expect(whyApart({}, { alloy, clad })).toEqual(['meet_only_above_melting_risk']);
    const usable = usableRange(TABLES, { alloy: '7075', form: 'sheet', clad: false });
    expect(usable.ok && usable.usableC.map((c) => Math.round(fahrenheitFromCelsius(c)))).toEqual([860, 900]);
    expect(usable.ok && usable.printedC.map((c) => Math.round(fahrenheitFromCelsius(c)))).toEqual([860, 930]);
  });

  test('the trap of an overlap narrower than the furnace: 2014 and 2024 meet in 5 °F, and the furnace keeps ±10 °F', () => {
    expect(whyApart({ alloy: '2014' }, { alloy: '2024' })).toEqual(['overlap_narrower_than_furnace']);
    expect(whyApart({ alloy: '2017' }, { alloy: '2024' })).toEqual(['overlap_narrower_than_furnace']);
    // In 20 °F the furnace just fits.
    expect(whyApart({ alloy: '2014' }, { alloy: '2017' })).toEqual([]);
    expect(whyApart({ alloy: '7075', form: 'plate' }, { alloy: '7075', form: 'extrusion' })).toEqual([]);
  });

  test('a range as narrow as the furnace is no reason to split its own alloy', () => {
    const groups = [group('thin', inches(0.04)), group('thick', inches(0.125))];
    expect(planLoads(TABLES, groups, 6).loads).toHaveLength(1);
  });

  test.each([
    ['ranges apart', { alloy: '2024' }, { alloy: '6061' }, 'temperatures_do_not_meet'],
    ['another medium', {}, { medium: 'salt' }, 'medium_differs'],
    ['another quench', {}, { quench: 'polymer' }, 'quench_differs'],
    ['ageing or none', {}, T62, 'ageing_differs'],
    ['another ageing', { alloy: '6061', ...T62 }, { alloy: '2219', ...T62 }, 'ageing_differs'],
    ['solution or ageing only', {}, { from: 'T3', to: 'T81', process: 'artificial_age' }, 'process_differs'],
  ] as const)('%s keeps a pair apart', (_name, a, b, reason) => {
    expect(whyApart(a, b)).toEqual([reason]);
  });

  test('7075 and 7178 sheet to T62 share solution and ageing', () => {
    const { loads } = plan([
      group('7075', { alloy: '7075', ...T62 }),
      group('7178', { alloy: '7178', ...T62 }),
    ]);
    expect(loads).toHaveLength(1);
    expect(loads[0]?.ageing).toMatchObject([{ kind: 'artificial' }]);
  });
});

describe('thickness in a load', () => {
  test('the thickest section governs the soak, the thinnest the quench delay', () => {
    const { loads } = plan([group('thin', inches(0.025)), group('thick', inches(0.25))]);
    expect(loads).toMatchObject([
      {
        groups: ['thin', 'thick'],
        governingMm: 6.35,
        thinnestMm: 0.635,
        maxDelayS: 7,
        solution: { soakMin: 55, longestMin: null },
      },
    ]);
  });

  test('clad sheet shares a load only while the thickest section soaks no longer than it may', () => {
    const clad = group('clad', { clad: true, ...inches(0.032) });
    // Up to 0.090 in soaks 35 min, which is the longest for 0.032 in clad; above it is 40 min.
    expect(plan([clad, group('bare', inches(0.09))]).loads).toMatchObject([
      { solution: { soakMin: 35, longestMin: 35 } },
    ]);
    expect(plan([clad, group('bare', inches(0.091))]).apart).toMatchObject([
      { reason: 'clad_would_soak_too_long' },
    ]);
    expect(loadsOf([{ ...clad, clad: false }, group('bare', inches(0.091))])).toHaveLength(1);
  });

  test('a middle group goes to one side; the pair that could have shared says so', () => {
    const clad = (key: string, thickness: number) => group(key, { clad: true, ...inches(thickness) });
    const { loads, apart } = plan([clad('thin', 0.032), clad('middle', 0.09), clad('thick', 0.125)]);
    expect(loads.map((load) => load.groups)).toHaveLength(2);
    expect(apart.map(({ reason }) => reason).sort()).toEqual([
      'clad_would_soak_too_long',
      'fits_but_planned_apart',
    ]);
  });
});

describe('what cannot be planned', () => {
  test.each([
    ['an alloy without a range', { alloy: '5052' }, 'alloy_not_in_table'],
    ['a form without a range', { alloy: '6013', form: 'bar' }, 'form_not_in_table'],
    ['a casting', { form: 'casting' }, 'form_not_in_table'],
    ['a section beyond the soak table', inches(4.5), 'thicker_than_table'],
    ['no thickness', { thicknessMm: 0 }, 'thickness_not_positive'],
    ['ageing that no table gives', { ...T62, form: 'plate' }, 'no_ageing_cycle_in_table'],
  ] as const)('%s is left out, with its reason', (_name, change, reason) => {
    const { loads, unplaced } = plan([group('good'), group('odd', change)]);
    expect(loads.map((load) => load.groups)).toEqual([['good']]);
    expect(unplaced).toEqual([{ group: 'odd', reason }]);
  });

  test('nothing to plan makes no load', () => {
    expect(plan([])).toEqual({ method: 'exact', loads: [], apart: [], unplaced: [] });
  });

  test("a shop's table in which clad may soak less than it must leaves the group out rather than dropping it", () => {
    const soak = {
      ...SOAK_TIMES,
      rows: SOAK_TIMES.rows.map((row) => ({ ...row, air: { minMin: 30, maxCladMin: 20 } })),
    };
    const { loads, unplaced } = planLoads({ ...TABLES, soak }, [group('clad', { clad: true })], TEN_F);
    expect({ loads, unplaced }).toEqual({
      loads: [],
      unplaced: [{ group: 'clad', reason: 'clad_would_soak_too_long' }],
    });
  });
});

describe('the number of loads', () => {
  const anyGroup = fc
    .record({
      alloy: fc.constantFrom('2014', '2017', '2024', '2117', '2219', '6061', '7050', '7075', '7178'),
      form: fc.constantFrom('sheet', 'plate', 'extrusion'),
      clad: fc.boolean(),
      printed: fc.constantFrom(0.016, 0.02, 0.032, 0.04, 0.063, 0.09, 0.125, 0.25, 0.5, 1),
      to: fc.constantFrom('T42', 'T62'),
      medium: fc.constantFrom('air', 'salt'),
    } as const)
    .map(({ printed, to, ...rest }) => ({
      ...rest,
      ...inches(printed),
      to,
      process: to === 'T62' ? ('solution_heat_treat_and_age' as const) : ('solution_heat_treat' as const),
    }));
  const groups = (most: number) =>
    fc.array(anyGroup, { maxLength: most }).map((all) => all.map((one, at) => group(`g${at}`, one)));

  /** Written otherwise than the planner: puts one after the other into each load there is, or a new one. */
  function fewestByTrial(all: readonly LoadGroup[], loads: readonly (readonly LoadGroup[])[] = []): number {
    const [next, ...rest] = all;
    if (!next) return loads.length;
    const ways = [
      [...loads, [next]],
      ...loads.map((_, at) => loads.map((load, position) => (position === at ? [...load, next] : load))),
    ];
    const possible = ways.filter((way) => way.every((load) => plan(load).loads.length === 1));
    return Math.min(...possible.map((way) => fewestByTrial(rest, way)));
  }

  test('every group is in one load or left out, no load breaks a rule, and there are never more loads than groups', () => {
    fc.assert(
      fc.property(groups(20), (all) => {
        const { loads, unplaced } = plan(all);
        const placed = [...loads.flatMap((load) => load.groups), ...unplaced.map((one) => one.group)];
        expect([...placed].sort()).toEqual(all.map(({ key }) => key).sort());
        expect(loads.length).toBeLessThanOrEqual(all.length);
        for (const { groups: keys, solution } of loads) {
          const together = all.filter(({ key }) => keys.includes(key));
          expect(solution?.longestMin ?? Infinity).toBeGreaterThanOrEqual(solution?.soakMin ?? 0);
          expect(new Set(together.map(({ medium }) => medium)).size).toBe(1);
          for (const { alloy, form, clad } of together) {
            const range = usableRange(TABLES, { alloy, form: form === 'casting' ? 'sheet' : form, clad });
            const [low = NaN, high = NaN] = solution?.temperatureC ?? [];
            expect(range.ok && low >= range.usableC[0] - 1e-9 && high <= range.usableC[1] + 1e-9).toBe(true);
          }
        }
      }),
      { numRuns: 60 },
    );
  });

  test('no way of trying finds fewer loads than the exact plan', () => {
    fc.assert(
      fc.property(groups(5), (all) => {
        const { loads, unplaced, method } = plan(all);
        const left = all.filter(({ key }) => !unplaced.some((one) => one.group === key));
        expect(method).toBe('exact');
        expect(loads.length).toBe(fewestByTrial(left));
      }),
      { numRuns: 40 },
    );
  });

  test('the trap of taking the first load that fits: a ring of six is three loads, never four', () => {
    // Each may be with its two neighbours only: 0-1, 2-3, 4-5, while first fit in a bad order makes four.
    const ring = (together: readonly number[]) =>
      together.length <= 2 &&
      together.every((a) => together.every((b) => a === b || [1, 5].includes((a - b + 6) % 6)));
    expect(fewestLoads(6, ring)).toMatchObject({ method: 'exact' });
    expect(fewestLoads(6, ring).loads).toHaveLength(3);
  });

  test('more than twelve different groups are planned well and said to be, and equal ones count as one', () => {
    const thicknesses = [0.016, 0.02, 0.032, 0.063, 0.09, 0.125, 0.25, 0.5, 1, 1.5, 2, 2.5, 3];
    const clad = thicknesses.map((thickness) => group(`${thickness}`, { clad: true, ...inches(thickness) }));
    expect(plan(clad).method).toBe('good');
    const same = Array.from({ length: 40 }, (_, at) => group(`${at}`));
    expect(plan(same)).toMatchObject({ method: 'exact', apart: [] });
    expect(plan(same).loads).toHaveLength(1);
  });

  test('twelve different groups are planned in under 50 ms', () => {
    const all = [0.016, 0.02, 0.032, 0.063, 0.09, 0.125].flatMap((thickness) =>
      [true, false].map((clad) => group(`${thickness} ${clad}`, { clad, ...inches(thickness) })),
    );
    // Time of this process, not of the clock: what else the machine does is no matter of the plan.
    const runs = Array.from({ length: 8 }, () => {
      const began = process.cpuUsage();
      expect(plan(all).method).toBe('exact');
      return process.cpuUsage(began).user / 1000;
    });
    expect(Math.min(...runs)).toBeLessThan(50);
  });
});
