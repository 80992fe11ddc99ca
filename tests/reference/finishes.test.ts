import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { anodizeFit, anodizeSuitsAlloy } from '@/lib/trade/finishes/anodize-limits';
import { dimensionChange, type Coating } from '@/lib/trade/finishes/dimension-change';
import { exposureLimit } from '@/lib/trade/finishes/exposure-limit';
import { filmCheckDue } from '@/lib/trade/finishes/film-check-due';
import { finishAsOrdered } from '@/lib/trade/finishes/finish-as-ordered';
import { finishedLimits, preFinishLimits } from '@/lib/trade/finishes/finish-limits';
import { passivationAsOrdered } from '@/lib/trade/finishes/passivation-as-ordered';
import { passivationTest } from '@/lib/trade/finishes/passivation-test';
import { passivationBath } from '@/lib/trade/finishes/passivation-bath';
import { readDesignation } from '@/lib/trade/finishes/read-designation';
import { ANODIZE_LIMITS } from '@/lib/trade/tables/anodize-limits';
import {
  BUILD_UP_SURFACES,
  COATING_GROWTH,
  type BuildUpSurface,
  type BuildUpTreatment,
} from '@/lib/trade/tables/build-up';
import { CONVERSION_CLASSES } from '@/lib/trade/tables/conversion-classes';
import { EXPOSURE_LIMITS, type ExposureItem } from '@/lib/trade/tables/exposure-limits';
import { FILM_CONTROL } from '@/lib/trade/tables/film-control';
import { FINISH_DEFAULTS } from '@/lib/trade/tables/finish-defaults';
import { PASSIVATION_TESTS } from '@/lib/trade/tables/passivation-tests';
import { PASSIVATION_BATHS } from '@/lib/trade/tables/passivation-baths';
import { PLATING_CLASSES } from '@/lib/trade/tables/plating-classes';
import { inchesFromMm, mmFromInches } from '@/lib/trade/units/length';
import { celsiusFromFahrenheit, fahrenheitFromCelsius } from '@/lib/trade/units/temperature';

import { named, numberOf, publishedRows } from './values';

const TABLES = { classes: [PLATING_CLASSES, CONVERSION_CLASSES], defaults: FINISH_DEFAULTS };
const ordered = (specification: string, classType: string) =>
  finishAsOrdered(TABLES, { specification, classType });

test('QQ-P-416 type II class 2 is at least 0.00762 mm, with chromate and 96 h to white corrosion', () => {
  const found = ordered('QQ-P-416F', 'type II class 2');
  expect(found).toMatchObject({
    ok: true,
    finish: 'cadmium',
    designation: { type: 'II', class: '2' },
    assumed: [],
    notStated: [],
    source: { document: 'QQ-P-416F (1 Oct 1991), carried on as AMS-QQ-P-416, 1.2.2' },
    readFrom: { table: 'plating-classes' },
  });
  expect(found.ok && found.thickness?.minMm).toBeCloseTo(0.00762, 12);
  expect(found.ok && found.facts).toContainEqual(
    expect.objectContaining({ says: 'chromate', saltSprayHours: 96, saltSprayTo: 'white_corrosion' }),
  );
});

describe('published classes and types', () => {
  const rows = publishedRows('finish-classes', [
    'specification',
    'class_type',
    'unit',
    'thickness_min',
    'thickness_max',
    'thickness_nominal',
    'salt_spray_h',
    'most_F',
    'weight_min',
    'weight_max',
    'says',
  ]);
  test.each(named(rows))(
    '$said: $specification $class_type: $thickness_min$unit $salt_spray_h h $most_F °F $weight_min $says',
    (row) => {
      const found = ordered(row.specification, row.class_type);
      if (!found.ok) throw new Error(found.reason);
      const printed = (mm = NaN) => (row.unit === 'in' ? inchesFromMm(mm) : mm * 1000);
      if (row.thickness_min !== '')
        expect(printed(found.thickness?.minMm)).toBeCloseTo(numberOf(row.thickness_min), 10);
      if (row.thickness_max !== '')
        expect(printed(found.thickness?.maxMm)).toBeCloseTo(numberOf(row.thickness_max), 10);
      if (row.thickness_nominal !== '')
        expect(printed(found.thickness?.nominalMm)).toBeCloseTo(numberOf(row.thickness_nominal), 10);
      const fits = found.facts.filter(
        (fact) =>
          (row.salt_spray_h === '' || fact.saltSprayHours === numberOf(row.salt_spray_h)) &&
          (row.most_F === '' ||
            Math.abs(fahrenheitFromCelsius(fact.temperatureCMax ?? NaN) - numberOf(row.most_F)) < 1e-9) &&
          (row.weight_min === '' || fact.weight?.min === numberOf(row.weight_min)) &&
          (row.weight_max === '' || fact.weight?.max === numberOf(row.weight_max)) &&
          (row.says === '' || fact.says === row.says),
      );
      expect(fits.map(({ source }) => [source.confidence, source.certainty])).toContainEqual([
        row.confidence,
        row.certainty,
      ]);
    },
  );
  test('MIL-DTL-81706B Table I: class 1A qualifies by 336 h and class 3 by 168 h', () => {
    expect(ordered('MIL-DTL-81706B', 'class 1A')).toMatchObject({ facts: [{ qualificationHours: 336 }] });
    expect(ordered('MIL-DTL-81706B', 'class 3')).toMatchObject({ facts: [{ qualificationHours: 168 }] });
  });
  test('ASTM B633 Table 2 as posted prints microns and inches of the same steps', () => {
    const inches = [0.0002, 0.0003, 0.0005, 0.001];
    inches.forEach((printed, at) => {
      const found = ordered('ASTM B633-19', `SC ${at + 1}`);
      expect(inchesFromMm((found.ok && found.thickness?.minMm) || NaN)).toBeCloseTo(printed, 4);
    });
  });
  test('two sources of the hardening bake of electroless nickel are both kept', () => {
    const found = ordered('MIL-C-26074E', 'class 2');
    const bakes = found.ok
      ? found.facts.flatMap(({ hardeningC }) =>
          hardeningC ? [hardeningC.map((c) => Math.round(fahrenheitFromCelsius(c)))] : [],
        )
      : [];
    expect(bakes).toEqual([
      [650, 750],
      [725, 750],
    ]);
  });
  test('what the order leaves out is named', () => {
    expect(ordered('QQ-P-416', '')).toMatchObject({ notStated: ['type', 'class'] });
    expect(ordered('ASTM B633', 'Fe/Zn 12')).toMatchObject({ notStated: ['type'] });
    expect(ordered('QQ-N-290A', 'class 2')).toMatchObject({ notStated: [] });
    expect(ordered('QQ-N-290A', 'class 1')).toMatchObject({ notStated: ['grade'] });
  });
  test.each([
    ['QQ-P-416F', 'class 7', 'designation_not_in_table'],
    ['AMS 2404', 'grade D', 'designation_not_in_table'],
    ['AMS 2400', 'type II', 'specification_not_in_table'],
  ])('%s %s is refused: %s', (specification, classType, reason) => {
    expect(ordered(specification, classType)).toMatchObject({ ok: false, reason });
  });
  test.each([
    ['Type II, Class 1A', { type: 'II', class: '1A' }],
    ['ty III cl 2', { type: 'III', class: '2' }],
    ['SC 2 (Fe/Zn 8) type VI', { type: 'VI', serviceCondition: '2', feZn: '8' }],
    ['type I, method D, sensitivity level 3', { type: 'I', method: 'D', level: '3' }],
    ['160 to 180 ksi', {}],
  ])('"%s" is read as %o', (typed, designation) => {
    expect(readDesignation(typed)).toEqual(designation);
  });
});

describe('the trap of an order that does not say which', () => {
  test('MIL-DTL-5541 with no type means Type I, with hexavalent chromium', () => {
    const found = ordered('MIL-DTL-5541F', 'class 1A');
    expect(found).toMatchObject({
      designation: { type: 'I', class: '1A' },
      assumed: [{ key: 'type', value: 'I', source: { confidence: 'read' } }],
      notStated: [],
    });
    expect(found.ok && found.facts.map(({ says }) => says)).toContain('with hexavalent chromium');
    expect(ordered('MIL-C-5541', 'class 1A')).toMatchObject({ designation: { type: 'I' } });
  });
  test('MIL-DTL-5541 with Type II stays Type II', () => {
    expect(ordered('MIL-DTL-5541F', 'type II class 1A')).toMatchObject({
      designation: { type: 'II' },
      assumed: [],
    });
  });
  test('QQ-P-35 asks for nitric acid, tested to class 4, unless engineering allows citric', () => {
    const nitric = { acids: ['nitric'], methods: ['1'], testClass: '4' };
    const ask = (specification: string, engineeringAllowsCitric: boolean) =>
      passivationAsOrdered(FINISH_DEFAULTS, { specification, engineeringAllowsCitric });
    expect(ask('QQ-P-35C', false)).toMatchObject({ ok: true, ...nitric });
    expect(ask('AMS-QQ-P-35', false)).toMatchObject({ ok: true, ...nitric });
    expect(ask('QQ-P-35', true)).toMatchObject({
      acids: ['nitric', 'citric'],
      methods: ['1', '2'],
      testClass: '4',
    });
    expect(ask('AMS 2700F', false)).toMatchObject({ ok: false, reason: 'specification_not_in_table' });
  });
});

describe('tests of passivated lots', () => {
  test.each(named(publishedRows('passivation-tests', ['practice', 'says'])))(
    '$said: practice $practice',
    (row) => {
      const found = { ok: true, practice: row.practice, says: row.says, source: { document: row.source } };
      expect(
        passivationTest(PASSIVATION_TESTS, `nitric 2, practice ${row.practice.toLowerCase()}`),
      ).toMatchObject(found);
      expect(passivationTest(PASSIVATION_TESTS, `${row.says} test`)).toMatchObject(found);
    },
  );

  test('a sulphate is a sulfate, and a test that is not named is not guessed', () => {
    expect(passivationTest(PASSIVATION_TESTS, 'copper sulphate')).toMatchObject({ practice: 'D' });
    expect(passivationTest(PASSIVATION_TESTS, 'nitric 2')).toEqual({ ok: false, reason: 'test_not_stated' });
  });
});

describe('passivation baths', () => {
  const rows = publishedRows('passivation-baths', [
    'acid',
    'number',
    'percent_low',
    'percent_high',
    'dichromate_percent',
    'low_F',
    'high_F',
    'least_min',
    'salt_spray_h',
  ]);
  test.each(named(rows))('$said: $acid $number', (row) => {
    const found = passivationBath(PASSIVATION_BATHS, {
      acid: row.acid as 'nitric' | 'citric',
      number: numberOf(row.number),
    });
    expect(found).toMatchObject({
      ok: true,
      percent: [numberOf(row.percent_low), numberOf(row.percent_high)],
      leastMin: numberOf(row.least_min),
      saltSprayHours: numberOf(row.salt_spray_h),
      ...(row.dichromate_percent !== '' && { dichromatePercent: numberOf(row.dichromate_percent) }),
    });
    if (!found.ok) return;
    expect(fahrenheitFromCelsius(found.temperatureCMin)).toBeCloseTo(numberOf(row.low_F), 9);
    expect(fahrenheitFromCelsius(found.temperatureCMax)).toBeCloseTo(numberOf(row.high_F), 9);
    expect('dichromatePercent' in found).toBe(row.dichromate_percent !== '');
  });
  test('a bath nobody numbers is refused', () => {
    expect(passivationBath(PASSIVATION_BATHS, { acid: 'citric', number: 9 })).toMatchObject({
      reason: 'bath_not_in_table',
    });
  });
});

const BUILD_UP = { surfaces: BUILD_UP_SURFACES, growth: COATING_GROWTH };
const coat = (treatment: BuildUpTreatment, surface: BuildUpSurface, min: number, max = min): Coating => ({
  treatment,
  surface,
  thicknessMm: { min, max },
});

describe('growth', () => {
  const rows = publishedRows('build-up', [
    'treatment',
    'surface',
    'thickness_in',
    'change_in_min',
    'change_in_max',
  ]);
  test.each(named(rows))(
    '$said: $thickness_in in of $treatment on $surface changes it by $change_in_min to $change_in_max in',
    (row) => {
      const thickness = mmFromInches(numberOf(row.thickness_in));
      const found = dimensionChange(
        BUILD_UP,
        coat(row.treatment as BuildUpTreatment, row.surface as BuildUpSurface, thickness),
      );
      expect(inchesFromMm((found.ok && found.changeMm.min) || 0)).toBeCloseTo(
        numberOf(row.change_in_min),
        10,
      );
      expect(inchesFromMm((found.ok && found.changeMm.max) || 0)).toBeCloseTo(
        numberOf(row.change_in_max),
        10,
      );
    },
  );

  test('the trap of the thread: a pitch diameter moves four times plating, but four times the growth of anodize', () => {
    const thick = mmFromInches(0.002);
    const change = (treatment: BuildUpTreatment) => {
      const found = dimensionChange(BUILD_UP, coat(treatment, 'external_thread_pitch_diameter', thick));
      return found.ok ? found.changeMm.max / thick : NaN;
    };
    expect(change('plating')).toBeCloseTo(4, 12);
    expect(change('anodize_type_iii')).toBeCloseTo(2, 12);
    const perFace = 1 / Math.sin(Math.PI / 6);
    expect(change('plating')).toBeCloseTo(2 * perFace, 12);
  });
  test('the trap of one growth of sulfuric anodize: both published shares are spanned, the processor’s own goes first', () => {
    const type2 = coat('anodize_type_ii', 'flat', 0.012);
    const published = dimensionChange(BUILD_UP, type2);
    expect(published.ok && published.bySource.map(({ growthMm }) => growthMm.max)).toEqual([0.004, 0.006]);
    expect(published).toMatchObject({ growthMm: { min: 0.004, max: 0.006 } });
    const source = { document: 'Processor’s letter of 2026', confidence: 'read', certainty: 'high' } as const;
    const own = dimensionChange(BUILD_UP, { ...type2, outwardShare: { share: 0.4, source } });
    expect(own).toMatchObject({ source });
    expect(own.ok && own.growthMm.min).toBeCloseTo(0.0048, 12);
    const negligible = dimensionChange(BUILD_UP, {
      ...coat('anodize_type_i', 'flat', 0.01),
      outwardShare: { share: 0.5, source },
    });
    expect(negligible).toMatchObject({ growthMm: { min: 0.005, max: 0.005 } });
  });
  test('an outside diameter of 9.980 to 9.990 mm with 0.005 to 0.010 mm of plating becomes 9.990 to 10.010 mm', () => {
    const found = finishedLimits(BUILD_UP, coat('plating', 'outside_diameter', 0.005, 0.01), {
      min: 9.98,
      max: 9.99,
    });
    expect(found.ok && found.limitsMm.min).toBeCloseTo(9.99, 9);
    expect(found.ok && found.limitsMm.max).toBeCloseTo(10.01, 9);
  });
  test('a bore of 10.000 to 10.030 mm finished is made 10.020 to 10.040 mm', () => {
    const found = preFinishLimits(BUILD_UP, coat('plating', 'bore', 0.005, 0.01), { min: 10, max: 10.03 });
    expect(found.ok && found.limitsMm.min).toBeCloseTo(10.02, 9);
    expect(found.ok && found.limitsMm.max).toBeCloseTo(10.04, 9);
  });
  test.each([
    [{ min: 10, max: 10.005 }, 'coating_takes_the_tolerance'],
    [{ min: 10.03, max: 10 }, 'limits_upside_down'],
  ])('finished limits %o are refused: %s', (finished, reason) => {
    expect(preFinishLimits(BUILD_UP, coat('plating', 'bore', 0.005, 0.01), finished)).toMatchObject({
      ok: false,
      reason,
    });
  });
  test.each([
    [{ thicknessMm: { min: 0.01, max: 0.005 } }, 'thickness_not_a_range'],
    [{ thicknessMm: { min: -1, max: 0 } }, 'thickness_not_a_range'],
    [{ thicknessMm: { min: NaN, max: NaN } }, 'thickness_not_a_range'],
    [
      { outwardShare: { share: 1.2, source: { document: 'x', confidence: 'read', certainty: 'low' } } },
      'share_not_between_0_and_1',
    ],
  ] as const)('%o is refused: %s', (more, reason) => {
    const coating = { ...coat('plating', 'flat', 0.01), ...more };
    expect(dimensionChange(BUILD_UP, coating)).toMatchObject({ ok: false, reason });
    expect(finishedLimits(BUILD_UP, coating, { min: 1, max: 2 })).toMatchObject({ ok: false, reason });
  });
  test('law: limits before finishing and finished limits are inverse', () => {
    const treatments = fc.constantFrom(...COATING_GROWTH.rows.map(({ treatment }) => treatment));
    const surfaces = fc.constantFrom(...BUILD_UP_SURFACES.rows.map(({ surface }) => surface));
    const mm = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(treatments, surfaces, mm(0, 0.05), mm(0, 0.05), mm(1, 200), mm(0, 1), (...drawn) => {
        const [treatment, surface, thin, more, low, tolerance] = drawn;
        const coating = coat(treatment, surface, thin, thin + more);
        const finished = { min: low, max: low + tolerance };
        const before = preFinishLimits(BUILD_UP, coating, finished);
        if (!before.ok) {
          expect(before.reason).toBe('coating_takes_the_tolerance');
          return;
        }
        const after = finishedLimits(BUILD_UP, coating, before.limitsMm);
        expect(after.ok && after.limitsMm.min).toBeCloseTo(finished.min, 9);
        expect(after.ok && after.limitsMm.max).toBeCloseTo(finished.max, 9);
      }),
    );
  });
  test('law: a thicker coating never changes a dimension less', () => {
    const mm = fc.double({ min: 0, max: 0.1, noNaN: true });
    fc.assert(
      fc.property(mm, mm, (a, b) => {
        const change = (thick: number) => {
          const found = dimensionChange(BUILD_UP, coat('anodize_type_iii', 'outside_diameter', thick));
          return found.ok ? found.changeMm.max : NaN;
        };
        expect(change(Math.min(a, b))).toBeLessThanOrEqual(change(Math.max(a, b)));
      }),
    );
  });
});

describe('highest temperatures', () => {
  const rows = publishedRows('exposure-limits', ['item', 'most_F', 'most_C']);
  test.each(named(rows))('$said: $item at most $most_F °F, $most_C °C', (row) => {
    const found = exposureLimit(EXPOSURE_LIMITS, { item: row.item as ExposureItem });
    expect(found.source).toMatchObject({ confidence: row.confidence, certainty: row.certainty });
    if (row.most_F === '') {
      expect(found.ok).toBe(false);
      return;
    }
    expect(found.ok && fahrenheitFromCelsius(found.temperatureCMax)).toBeCloseTo(numberOf(row.most_F), 9);
    expect(found.ok && Math.round(found.temperatureCMax)).toBe(numberOf(row.most_C));
  });
  test('MIL-STD-867C 5.5: steel tempered at 425 °F sees at most 375 °F afterwards', () => {
    const found = exposureLimit(EXPOSURE_LIMITS, {
      item: 'hardened_steel_bake',
      temperedAtC: celsiusFromFahrenheit(425),
    });
    expect(found.ok && fahrenheitFromCelsius(found.temperatureCMax)).toBeCloseTo(375, 9);
    expect(exposureLimit(EXPOSURE_LIMITS, { item: 'hardened_steel_bake' })).toMatchObject({
      reason: 'tempering_not_stated',
    });
  });
  test('AMS 2770 practice, from memory: aged aluminium stays below its ageing temperature', () => {
    expect(exposureLimit(EXPOSURE_LIMITS, { item: 'aluminium_t6_t73_bake', agedAtC: 121 })).toMatchObject({
      temperatureCMax: 121,
    });
    expect(exposureLimit(EXPOSURE_LIMITS, { item: 'aluminium_t6_t73_bake' })).toMatchObject({
      reason: 'ageing_not_stated',
    });
  });
});

describe('anodize and chemical film', () => {
  test.each([
    [5, 0, 6, true],
    [5.1, 0, 6, false],
    [0, 7.1, 7.1, false],
    [4, 1, 7.6, false],
  ])(
    'MIL-A-8625F 3.3, from memory: type I with %d %% copper, %d %% silicon, %d %% together: %s',
    (copperPercent, siliconPercent, alloyingPercent, isSuited) => {
      expect(
        anodizeSuitsAlloy(ANODIZE_LIMITS, 'I', { copperPercent, siliconPercent, alloyingPercent }),
      ).toMatchObject({ ok: true, isSuited });
    },
  );
  test('MIL-A-8625F 6.10.4-6.10.5: type III is held to about 0.0001 in; thinner types are too brittle for a force fit', () => {
    const hard = anodizeFit(ANODIZE_LIMITS, 'III');
    expect(hard).toMatchObject({ ok: true, mayBeForceFitted: true });
    expect(hard.ok && inchesFromMm(hard.controlMm ?? NaN)).toBeCloseTo(0.0001, 12);
    for (const type of ['I', 'IB', 'IC', 'IIB', 'II'])
      expect(anodizeFit(ANODIZE_LIMITS, type)).toMatchObject({ mayBeForceFitted: false });
    expect(anodizeFit(ANODIZE_LIMITS, 'IV')).toMatchObject({ reason: 'type_without_limit' });
    expect(
      anodizeSuitsAlloy(ANODIZE_LIMITS, 'II', { copperPercent: 6, siliconPercent: 0, alloyingPercent: 6 }),
    ).toMatchObject({ reason: 'type_without_limit' });
  });
  test('MIL-DTL-5541F 4.2.1.1: panels of 2 March are good until 6 April, an analysis until 9 March', () => {
    const last = new Date('2026-03-02T00:00:00Z');
    expect(filmCheckDue(FILM_CONTROL, 'corrosion_and_adhesion', last)).toMatchObject({
      dueBy: new Date('2026-04-06T00:00:00Z'),
    });
    expect(filmCheckDue(FILM_CONTROL, 'solution_analysis', last)).toMatchObject({
      dueBy: new Date('2026-03-09T00:00:00Z'),
    });
  });
});
