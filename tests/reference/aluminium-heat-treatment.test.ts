import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { ageingCycles, type AgeingHold } from '@/lib/trade/heat-treat/ageing-cycle';
import { annealCycle } from '@/lib/trade/heat-treat/anneal-cycle';
import { checkQuench } from '@/lib/trade/heat-treat/check-quench';
import { checkAgeingDoor, cladRecovery } from '@/lib/trade/heat-treat/furnace-interruptions';
import { fullStrengthBy, naturalAgeing } from '@/lib/trade/heat-treat/natural-ageing';
import { overheatingMargin } from '@/lib/trade/heat-treat/overheating-margin';
import { checkQuenchBath, quenchBath } from '@/lib/trade/heat-treat/quench-bath';
import { quenchDelay } from '@/lib/trade/heat-treat/quench-delay';
import { requiredSoak } from '@/lib/trade/heat-treat/required-soak';
import { soakRun } from '@/lib/trade/heat-treat/soak-run';
import { solutionRange } from '@/lib/trade/heat-treat/solution-range';
import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import { AGEING_ELSEWHERE } from '@/lib/trade/tables/ageing-elsewhere';
import { ANNEALS } from '@/lib/trade/tables/anneals';
import { AGEING_DOOR, CLAD_RECOVERY } from '@/lib/trade/tables/furnace-interruptions';
import { MELTING } from '@/lib/trade/tables/melting';
import { QUENCH_DELAYS } from '@/lib/trade/tables/quench-delays';
import { QUENCH_BATHS, QUENCH_MEDIA, QUENCH_RULES } from '@/lib/trade/tables/quench-media';
import { SOAK_TIMES, SOAK_TIMES_HANDBOOK } from '@/lib/trade/tables/soak-times';
import {
  SOLUTION_TEMPERATURES,
  SOLUTION_TEMPERATURES_HANDBOOK,
  SOLUTION_TEMPERATURES_PROCESSOR,
  SOLUTION_TEMPERATURES_PRODUCER,
} from '@/lib/trade/tables/solution-temperatures';
import { STRENGTHENING } from '@/lib/trade/tables/strengthening';
import { mmFromInches } from '@/lib/trade/units/length';
import { fahrenheitFromCelsius, fahrenheitDifferenceFromCelsius } from '@/lib/trade/units/temperature';
import { hoursFromMin } from '@/lib/trade/units/time';

import { alloyOf, formOf, temperOf } from './trade-words';
import { casesOf, numberOf, publishedRows } from './values';

const MEDIA = ['air', 'salt'] as const;
const at = (seconds: number) => new Date(Date.UTC(2026, 0, 5, 9, 0, seconds));
const minute = (minutes: number) => at(minutes * 60);

/** `8-12`, or the same twice where one figure is printed. */
function spanOf(printed: string): [number, number] {
  const [from = '', to = from] = printed.split('-');
  return [numberOf(from), numberOf(to)];
}

const closeTo = (computed: readonly number[] | undefined, printed: readonly number[]) => {
  expect(computed).toHaveLength(printed.length);
  printed.forEach((value, index) => expect(computed?.[index]).toBeCloseTo(value, 9));
};

describe('solution temperatures', () => {
  const TABLES: Record<string, typeof SOLUTION_TEMPERATURES> = {
    main: SOLUTION_TEMPERATURES,
    producer: SOLUTION_TEMPERATURES_PRODUCER,
    handbook: SOLUTION_TEMPERATURES_HANDBOOK,
    processor: SOLUTION_TEMPERATURES_PROCESSOR,
  };
  const rangeOf = (table: string, alloy: string, form: string) => {
    const range = solutionRange(TABLES[table] ?? SOLUTION_TEMPERATURES, {
      alloy: alloyOf(alloy),
      form: form === 'rivet wire' ? form : wroughtFormOf(form),
    });
    if (!range.ok) throw new Error(range.reason);
    return range;
  };

  test('2024 sheet is treated from 910 to 930 °F: 487.8 to 498.9 °C', () => {
    const range = rangeOf('main', '2024', 'sheet');
    expect(range.rangeC?.map((temperatureC) => temperatureC.toFixed(1))).toEqual(['487.8', '498.9']);
  });

  test.each(
    casesOf(
      publishedRows('solution-temperatures', [
        'table',
        'alloy',
        'form',
        'low_f',
        'high_f',
        'set_from_f',
        'set_to_f',
        'melting_risk_above_f',
        'clad_high_f',
        'hold_within_f',
        'soak_min',
      ]),
      (row) => `${row.alloy} ${row.form}: ${row.low_f} to ${row.high_f}, set ${row.set_from_f} °F`,
    ),
  )('%s', (_name, row) => {
    const range = rangeOf(row.table, row.alloy, row.form);
    const inF = (temperatureC: number | undefined) =>
      temperatureC === undefined ? '' : String(Math.round(fahrenheitFromCelsius(temperatureC) * 1e6) / 1e6);
    expect(inF(range.rangeC?.[0])).toBe(row.low_f);
    expect(inF(range.rangeC?.[1])).toBe(row.high_f);
    expect(inF(range.setPointC?.[0])).toBe(row.set_from_f);
    expect(inF(range.setPointC?.[1])).toBe(row.set_to_f);
    expect(inF(range.meltingRiskAboveC)).toBe(row.melting_risk_above_f);
    expect(inF(range.cladHighC)).toBe(row.clad_high_f);
    if (row.hold_within_f)
      expect(fahrenheitDifferenceFromCelsius(range.holdWithinC ?? NaN)).toBeCloseTo(
        numberOf(row.hold_within_f),
        9,
      );
    expect(range.soakMin?.join('-') ?? '').toBe(row.soak_min);
    expect(range.source).toMatchObject({ confidence: row.confidence, certainty: row.certainty });
  });

  test.each(
    casesOf(
      publishedRows('solution-temperatures-celsius', ['alloy', 'form', 'low_c', 'high_c']),
      (row) => `${row.alloy} ${row.form}: ${row.low_c} to ${row.high_c} °C by the table's own rounding`,
    ),
  )('%s', (_name, row) => {
    const range = rangeOf('main', row.alloy, row.form);
    expect(range.rangeC?.map(Math.round)).toEqual([numberOf(row.low_c), numberOf(row.high_c)]);
  });

  test('a form and an alloy that the table has not are refused', () => {
    expect(solutionRange(SOLUTION_TEMPERATURES, { alloy: '6013', form: 'bar' })).toMatchObject({
      reason: 'form_not_in_table',
    });
    expect(solutionRange(SOLUTION_TEMPERATURES, { alloy: '5052', form: 'sheet' })).toEqual({
      ok: false,
      reason: 'alloy_not_in_table',
    });
  });

  test("the producer's figures for 6061 and 6013 lie inside the ranges that govern", () => {
    for (const [alloy, from, to] of [
      ['6061', 985, 985],
      ['6013', 1050, 1060],
    ] as const) {
      const [low = NaN, high = NaN] = rangeOf('main', alloy, 'sheet').rangeC ?? [];
      expect(fahrenheitFromCelsius(low)).toBeLessThanOrEqual(from);
      expect(fahrenheitFromCelsius(high)).toBeGreaterThanOrEqual(to);
    }
  });
});

function wroughtFormOf(word: string) {
  const form = formOf(word);
  if (form === 'casting') throw new Error('a casting is not wrought');
  return form;
}

describe('overheating', () => {
  test.each(
    casesOf(
      publishedRows('melting', ['alloy', 'melts_from_f', 'raised_by_f']),
      (row) => `${row.alloy} begins to melt at ${row.melts_from_f} °F`,
    ),
  )('%s', (_name, row) => {
    const margin = overheatingMargin(MELTING, { alloy: alloyOf(row.alloy), temperatureC: 450 });
    if (!margin.ok) throw new Error(margin.reason);
    expect(fahrenheitFromCelsius(450 + margin.marginC)).toBeCloseTo(numberOf(row.melts_from_f), 9);
    expect(fahrenheitDifferenceFromCelsius(margin.homogeneousMarginC - margin.marginC)).toBeCloseTo(
      row.raised_by_f ? numberOf(row.raised_by_f) : 0,
      9,
    );
    expect(margin.source.confidence).toBe(row.confidence);
  });

  test('2024 at the top of its range is 5 °F from melting', () => {
    const margin = overheatingMargin(MELTING, { alloy: '2024', temperatureC: (930 - 32) / 1.8 });
    expect(margin.ok && fahrenheitDifferenceFromCelsius(margin.marginC)).toBeCloseTo(5, 9);
  });

  test('7075 sheet at 910 °F: molten where it is not homogeneous, and no margin where it is', () => {
    const margin = overheatingMargin(MELTING, { alloy: '7075', temperatureC: (910 - 32) / 1.8 });
    expect(margin.ok && margin.marginC).toBeLessThan(0);
    expect(margin.ok && margin.homogeneousMarginC).toBeCloseTo(0, 9);
  });

  test('no range that governs reaches the beginning of melting of its alloy, but the sheet rules of 7075 and 7178', () => {
    const molten = SOLUTION_TEMPERATURES.rows.flatMap(({ alloys, forms, rangeF }) =>
      alloys === 'any' || !rangeF
        ? []
        : alloys.filter((alloy) => {
            const margin = overheatingMargin(MELTING, { alloy, temperatureC: (rangeF[1] - 32) / 1.8 });
            return margin.ok && margin.homogeneousMarginC < -1e-9 && forms !== 'any';
          }),
    );
    expect(molten).toEqual(['7075', '7178']);
  });

  test('an alloy that the table has not is refused', () => {
    expect(overheatingMargin(MELTING, { alloy: '5052', temperatureC: 400 })).toEqual({
      ok: false,
      reason: 'alloy_not_in_table',
    });
  });
});

describe('soak', () => {
  const soakOf = (thicknessMm: number, medium: 'air' | 'salt' = 'air', clad = true) =>
    requiredSoak(SOAK_TIMES, { thicknessMm, medium, clad });

  test('1.6 mm clad in air soaks 30 min, at most 40 min', () => {
    expect(soakOf(1.6)).toMatchObject({ ok: true, soakMin: 30, longestMin: 40 });
  });

  test.each(
    casesOf(
      publishedRows('soak-times', ['table', 'thickness_in', 'medium', 'soak_min', 'longest_clad_min']),
      (row) => `${row.thickness_in} in, ${row.medium}: ${row.soak_min} to ${row.longest_clad_min} min`,
    ),
  )('%s', (_name, row) => {
    const table = row.table === 'handbook' ? SOAK_TIMES_HANDBOOK : SOAK_TIMES;
    const thicknessMm = mmFromInches(numberOf(row.thickness_in));
    const medium = row.medium === 'salt' ? 'salt' : 'air';
    const clad = requiredSoak(table, { thicknessMm, medium, clad: true });
    if (!clad.ok) throw new Error(clad.reason);
    expect(clad.soakMin).toBe(numberOf(row.soak_min));
    expect(clad.longestMin).toBe(row.longest_clad_min ? numberOf(row.longest_clad_min) : null);
    expect(clad.source.confidence).toBe(row.confidence);
    expect(requiredSoak(table, { thicknessMm, medium, clad: false })).toMatchObject({ longestMin: null });
  });

  test('0.032 in stays in its row when it was entered as 0.8128 mm, and the next thousandth does not', () => {
    expect(soakOf(0.8128)).toMatchObject({ soakMin: 25 });
    expect(soakOf(mmFromInches(0.032) + 0.0001)).toMatchObject({ soakMin: 25 });
    expect(soakOf(mmFromInches(0.0325))).toMatchObject({ soakMin: 30 });
  });

  test('beyond the table and below nothing there is no answer', () => {
    expect(soakOf(mmFromInches(4))).toMatchObject({ ok: true });
    expect(soakOf(mmFromInches(4.001))).toMatchObject({ ok: false, reason: 'thicker_than_table' });
    for (const none of [0, -1, NaN, Infinity])
      expect(soakOf(none)).toEqual({ ok: false, reason: 'thickness_not_positive' });
  });

  test('from thin sheet to heavy forgings the table stays between 10 min and 12 h (FAA-H-8083-30)', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 101.6, noNaN: true }),
        fc.constantFrom(...MEDIA),
        (mm, medium) => {
          const soak = soakOf(mm, medium);
          expect(soak.ok && soak.soakMin >= 10 && soak.soakMin <= 720).toBe(true);
        },
      ),
    );
  });

  test('a thicker section never soaks for less time, salt never longer than air, clad always has its ten minutes', () => {
    const mm = fc.double({ min: 0.1, max: 101.6, noNaN: true });
    fc.assert(
      fc.property(mm, mm, fc.constantFrom(...MEDIA), (a, b, medium) => {
        const thin = soakOf(Math.min(a, b), medium);
        const thick = soakOf(Math.max(a, b), medium);
        const salt = soakOf(a, 'salt');
        const air = soakOf(a, 'air');
        if (!thin.ok || !thick.ok || !salt.ok || !air.ok) throw new Error('outside the table');
        expect(thin.soakMin).toBeLessThanOrEqual(thick.soakMin);
        expect(thin.longestMin ?? NaN).toBeLessThanOrEqual(thick.longestMin ?? NaN);
        expect(salt.soakMin).toBeLessThanOrEqual(air.soakMin);
        expect((thin.longestMin ?? NaN) - thin.soakMin).toBeGreaterThanOrEqual(5);
      }),
    );
  });
});

describe('the clock of the soak', () => {
  test('the trap of counting from the first couple: the coldest metal starts the soak (FAA-H-8083-30)', () => {
    const readings = [
      { at: minute(0), metalC: [490, 470] },
      { at: minute(20), metalC: [493, 489] },
      { at: minute(50), metalC: [494, 492] },
    ];
    expect(soakRun(readings, 488)).toMatchObject({
      ok: true,
      startedAt: minute(20),
      soakedMin: 30,
      hottestC: 494,
    });
  });

  test('metal that falls below the range has interrupted the soak (AMS2770R extract)', () => {
    const readings = [490, 486, 490].map((temperatureC, index) => ({
      at: minute(index * 10),
      metalC: [temperatureC],
    }));
    expect(soakRun(readings, 488)).toEqual({ ok: false, reason: 'interrupted' });
  });

  test('metal that never gets there, and a chart without readings', () => {
    expect(soakRun([{ at: minute(0), metalC: [480] }], 488)).toEqual({ ok: false, reason: 'never_reached' });
    expect(soakRun([], 488)).toEqual({ ok: false, reason: 'no_readings' });
    expect(soakRun([{ at: minute(0), metalC: [] }], 488)).toEqual({ ok: false, reason: 'no_readings' });
  });
});

describe('quench', () => {
  const delayOf = (thinnestMm: number) => quenchDelay(QUENCH_DELAYS, { alloy: '2024', thinnestMm });

  test('1.6 mm may take 10 s, longer while above 412.8 °C', () => {
    const delay = delayOf(1.6);
    expect(delay).toMatchObject({ ok: true, maxDelayS: 10 });
    expect(delay.ok && delay.lateAboveC).toBeCloseTo(412.8, 1);
  });

  test.each(
    casesOf(
      publishedRows('quench-delays', ['unit', 'thickness', 'max_s']),
      (row) => `${row.thickness} ${row.unit} may take ${row.max_s} s`,
    ),
  )('%s', (_name, row) => {
    const thickness = numberOf(row.thickness);
    expect(delayOf(row.unit === 'in' ? mmFromInches(thickness) : thickness)).toMatchObject({
      maxDelayS: numberOf(row.max_s),
    });
  });

  test.each(
    casesOf(
      publishedRows('quench-late-above', ['alloy', 'above_f']),
      (row) => `${row.alloy} may be late above ${row.above_f} °F`,
    ),
  )('%s', (_name, row) => {
    const delay = quenchDelay(QUENCH_DELAYS, { alloy: alloyOf(row.alloy), thinnestMm: 2 });
    expect(delay.ok && fahrenheitFromCelsius(delay.lateAboveC ?? NaN)).toBeCloseTo(numberOf(row.above_f), 9);
  });

  test('between two rows the shorter time holds, and no thickness is refused', () => {
    expect(delayOf(mmFromInches(0.0315))).toMatchObject({ maxDelayS: 7 });
    expect(delayOf(0)).toEqual({ ok: false, reason: 'thickness_not_positive' });
  });

  test('a thicker section never has less time', () => {
    const mm = fc.double({ min: 0.01, max: 200, noNaN: true });
    fc.assert(
      fc.property(mm, mm, (a, b) => {
        const thin = delayOf(Math.min(a, b));
        const thick = delayOf(Math.max(a, b));
        expect(thin.ok && thick.ok && thin.maxDelayS <= thick.maxDelayS).toBe(true);
      }),
    );
  });

  const LIMIT = { maxDelayS: 10, lateAboveC: (775 - 32) / 1.8 };

  test('the trap of timing from the door standing open, or to the first part under (T.O. 1-1A-9 Table 3-10 note)', () => {
    // The door begins to open at 0 s and stands open at 4 s; the first part is under at 8 s, the last at 11 s.
    const moments = { medium: 'air', doorBeginsToOpenAt: at(0), lastPartUnderAt: at(11) } as const;
    expect(checkQuench(LIMIT, moments, null)).toEqual({ standing: 'late', delayS: 11 });
    const bath = { medium: 'salt', firstPartLeavesSaltAt: at(2), lastPartUnderAt: at(12) } as const;
    expect(checkQuench(LIMIT, bath, null)).toEqual({ standing: 'in_time', delayS: 10 });
  });

  test('a late load is good while it is still above 775 °F, and not when nobody measured', () => {
    const moments = { medium: 'air', doorBeginsToOpenAt: at(0), lastPartUnderAt: at(14) } as const;
    expect(checkQuench(LIMIT, moments, 420).standing).toBe('late_but_hot_enough');
    expect(checkQuench(LIMIT, moments, 412).standing).toBe('late');
    expect(checkQuench(LIMIT, moments, null).standing).toBe('late');
  });

  test('moments in the wrong order are told, not counted', () => {
    const moments = { medium: 'air', doorBeginsToOpenAt: at(9), lastPartUnderAt: at(3) } as const;
    expect(checkQuench(LIMIT, moments, null).standing).toBe('moments_out_of_order');
  });
});

describe('quench baths', () => {
  const bathOf = (ruleWord: string, mediumWord: string) => {
    const rule = QUENCH_RULES.find((known) => known === ruleWord);
    const medium = QUENCH_MEDIA.find((known) => known === mediumWord);
    if (!rule || !medium) throw new Error(`${ruleWord} ${mediumWord}`);
    const bath = quenchBath(QUENCH_BATHS, { rule, medium });
    if (!bath.ok) throw new Error(bath.reason);
    return bath;
  };

  test.each(
    casesOf(
      publishedRows('quench-baths', [
        'rule',
        'medium',
        'start_from_f',
        'start_to_f',
        'max_rise_f',
        'any_time_to_f',
        'concentration_percent',
      ]),
      (row) => `${row.medium} starts at ${row.start_to_f} °F at most, rises ${row.max_rise_f} °F`,
    ),
  )('%s', (_name, row) => {
    const bath = bathOf(row.rule, row.medium);
    const inF = (temperatureC: number | undefined) =>
      temperatureC === undefined ? '' : fahrenheitFromCelsius(temperatureC).toFixed(0);
    expect(inF(bath.startC?.from)).toBe(row.start_from_f);
    expect(inF(bath.startC?.to)).toBe(row.start_to_f);
    expect(inF(bath.anyTimeToC)).toBe(row.any_time_to_f);
    expect(bath.maxConcentrationPercent?.toString() ?? '').toBe(row.concentration_percent);
    if (row.max_rise_f)
      expect(fahrenheitDifferenceFromCelsius(bath.maxRiseC ?? NaN)).toBeCloseTo(numberOf(row.max_rise_f), 9);
    expect(bath.source.confidence).toBe(row.confidence);
  });

  test('the trap of converting a rise like a temperature: 20 °F more are 11.1 °C more', () => {
    const bath = bathOf('faa', 'cold water');
    expect(checkQuenchBath(bath, { atStartC: 25, highestC: 36 })).toBe('within');
    expect(checkQuenchBath(bath, { atStartC: 25, highestC: 36.2 })).toBe('rose_too_far');
  });

  test('each way of leaving the limits has its name', () => {
    const mil = bathOf('mil_h_6088g', 'cold water');
    expect(checkQuenchBath(mil, { atStartC: 38, highestC: 38 })).toBe('start_outside');
    expect(checkQuenchBath(mil, { atStartC: 37, highestC: 44 })).toBe('too_warm');
    expect(checkQuenchBath(mil, { atStartC: 37, highestC: 30 })).toBe('temperatures_out_of_order');
    expect(checkQuenchBath(bathOf('faa', 'hot water'), { atStartC: 60, highestC: 61 })).toBe('start_outside');
    expect(checkQuenchBath(bathOf('ams_2770', 'boiling water'), { atStartC: 100, highestC: 100 })).toBe(
      'within',
    );
  });

  test('what a rule does not speak of is refused', () => {
    expect(quenchBath(QUENCH_BATHS, { rule: 'faa', medium: 'polymer' })).toEqual({
      ok: false,
      reason: 'not_in_table',
    });
  });
});

describe('ageing', () => {
  const cyclesOf = (
    table: typeof AGEING_CYCLES,
    row: { alloy: string; form: string; from: string; to: string },
  ) => {
    const found = ageingCycles(table, {
      alloy: alloyOf(row.alloy),
      form: formOf(row.form),
      from: temperOf(row.from),
      to: temperOf(row.to),
    });
    if (!found.ok) throw new Error(found.reason);
    return found.cycles;
  };
  const holdsAt = (hold: AgeingHold | undefined, setF: string, hours: string, nominal = '') => {
    if (!hold) return false;
    const sameSet =
      hold.setC.map((c) => Math.round(fahrenheitFromCelsius(c))).join('-') === spanOf(setF).join('-');
    const [from = NaN, to = NaN] = (hold.holdMin ?? []).map(hoursFromMin);
    if (hours === '') return sameSet && !hold.holdMin;
    if (hours.startsWith('~'))
      return sameSet && from <= numberOf(hours.slice(1)) && numberOf(hours.slice(1)) <= to;
    const named = nominal === '' || hoursFromMin(hold.nominalMin ?? NaN) === numberOf(nominal);
    return sameSet && named && `${from}-${to}` === spanOf(hours).join('-');
  };

  test.each(
    casesOf(
      publishedRows('ageing-cycles', [
        'table',
        'alloy',
        'form',
        'from',
        'to',
        'kind',
        'set_f',
        'limits_f',
        'hours',
        'nominal_hours',
        'second_set_f',
        'second_hours',
      ]),
      (row) =>
        `${row.alloy} ${row.form}, ${row.from} to ${row.to}: ${row.set_f} °F ${row.hours} h ${row.kind}`,
    ),
  )('%s', (_name, row) => {
    const cycles = cyclesOf(row.table === 'elsewhere' ? AGEING_ELSEWHERE : AGEING_CYCLES, row);
    const match = cycles.find(({ kind, naturalMin, holds }) => {
      if (row.kind !== kind) return false;
      if (kind === 'natural') return hoursFromMin(naturalMin ?? NaN) === numberOf(row.hours);
      const [first, second] = holds;
      return (
        holdsAt(first, row.set_f, row.hours, row.nominal_hours) &&
        (row.second_set_f === '' || holdsAt(second, row.second_set_f, row.second_hours))
      );
    });
    expect(match).toBeDefined();
    if (row.limits_f) closeTo(match?.holds[0]?.limitsC?.map(fahrenheitFromCelsius), spanOf(row.limits_f));
  });

  test('specifications differ about 2024-T62, and each cycle says which it is from (from memory)', () => {
    const cycles = cyclesOf(AGEING_CYCLES, { alloy: '2024', form: 'sheet', from: 'T42', to: 'T62' });
    expect(cycles.map(({ source }) => source.document)).toEqual([
      'AMS 2770',
      'MIL-H-6088G table of ageing treatments',
    ]);
  });

  test('a form or a change that the table has not is refused', () => {
    const asked = { alloy: '2024', form: 'plate', from: 'T42', to: 'T62' } as const;
    expect(ageingCycles(AGEING_CYCLES, asked)).toMatchObject({ reason: 'form_not_in_table' });
    expect(ageingCycles(AGEING_CYCLES, { ...asked, to: 'T73' })).toEqual({
      ok: false,
      reason: 'not_in_table',
    });
  });

  test('2024 lies 96 h before it is tested: from Monday 9:00 to Friday 9:00 (T.O. 1-1A-9 para 3-18)', () => {
    expect(naturalAgeing(AGEING_CYCLES, '2024', new Date('2026-01-05T09:00:00Z'))).toMatchObject({
      naturalMin: 5760,
      endsAt: new Date('2026-01-09T09:00:00Z'),
    });
  });

  test('6013 lies two weeks (producer data page); 7xxx has no such time and is refused', () => {
    expect(naturalAgeing(AGEING_CYCLES, '6013', minute(0))).toMatchObject({ naturalMin: 336 * 60 });
    for (const alloy of ['7075', '7178', '7050'] as const)
      expect(naturalAgeing(AGEING_CYCLES, alloy, minute(0))).toEqual({ ok: false, reason: 'not_in_table' });
  });

  test.each([
    ['2017', 'natural_ageing'],
    ['2024', 'natural_ageing'],
    ['2014', 'artificial_ageing'],
    ['7075', 'artificial_ageing'],
    ['7178', 'artificial_ageing'],
  ] as const)('%s reaches full strength by %s (T.O. 1-1A-9 para 3-18)', (alloy, by) => {
    expect(fullStrengthBy(STRENGTHENING, alloy)).toMatchObject({ fullStrengthBy: by });
    expect(fullStrengthBy(STRENGTHENING, '5052')).toMatchObject({ reason: 'alloy_not_in_table' });
  });
});

describe('anneal and interruptions', () => {
  test.each(['6013', '6061'] as const)(
    '%s is annealed 2 to 3 h at 775 °F, cooled 50 °F an hour to 500 °F (producer data page)',
    (alloy) => {
      const cycle = annealCycle(ANNEALS, alloy);
      if (!cycle.ok) throw new Error(cycle.reason);
      expect(fahrenheitFromCelsius(cycle.holdC)).toBeCloseTo(775, 9);
      expect(cycle.holdMin).toEqual([120, 180]);
      expect(fahrenheitDifferenceFromCelsius(cycle.coolCPerHour)).toBeCloseTo(50, 9);
      expect(fahrenheitFromCelsius(cycle.coolToC)).toBeCloseTo(500, 9);
    },
  );

  test('an alloy without an anneal in the table is refused', () => {
    expect(annealCycle(ANNEALS, '2024')).toEqual({ ok: false, reason: 'alloy_not_in_table' });
  });

  test.each([
    [0.063, 30],
    [0.124, 30],
    [0.125, 60],
    [0.5, 60],
  ])('Alclad of %f in: the furnace recovers within %d min (AMS2770R extract)', (inches, maxRecoveryMin) => {
    expect(cladRecovery(CLAD_RECOVERY, mmFromInches(inches))).toMatchObject({ maxRecoveryMin });
  });

  test('recovery without a thickness is refused', () => {
    expect(cladRecovery(CLAD_RECOVERY, 0)).toEqual({ ok: false, reason: 'thickness_not_positive' });
  });

  test.each([
    [[1, 2, 1.5, 2], 'within'],
    [[1, 1, 1, 1, 1], 'too_often'],
    [[2.5], 'too_long'],
    [[], 'within'],
  ] as const)('openings of %j min while ageing are %s (AMS2770R extract)', (openingsMin, standing) => {
    expect(checkAgeingDoor(AGEING_DOOR, openingsMin)).toMatchObject({ standing });
  });
});
