import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { loadsOfBatch } from '@/lib/batches/loads-of-batch';
import { ToProve } from '@/lib/parts/to-prove';
import { readLimit } from '@/lib/readings/limit-words';
import { BATCH_TABLES } from '@/lib/reference/batch-tables';
import { coatingLimit, temperatureLimit } from '@/lib/requirements/limit';
import type { AskedLine } from '@/lib/requirements/proposal';
import { proposeRequirements } from '@/lib/requirements/propose-requirements';
import { readSampling, sampleAsOrdered } from '@/lib/requirements/sample-as-ordered';
import { isSameCharacteristic, notAskedYet } from '@/lib/requirements/same-characteristic';
import { PROCESSES } from '@/lib/trade/process';
import { celsiusFromFahrenheit } from '@/lib/trade/units/temperature';

import { lineOf, type PartChange } from '../batches/facts-of-batch';

type Step = NonNullable<Parameters<typeof lineOf>[2][number]>;

const SOLUTION: Step = {
  process: 'solution_heat_treat_and_age',
  specification: 'AMS 2770',
  specificationRevision: 'R',
  classType: null,
  conditionBefore: 'O',
  targetCondition: 'T42',
};
const SHEET: PartChange = { alloy: '2024', madeCondition: 'O', endCondition: 'T42', thicknessMm: 1.016 };
const BOLT: PartChange = {
  alloy: '4340',
  form: 'bar',
  madeCondition: 'annealed',
  endCondition: 'HRC 40 to 43',
};

const asked = (part: PartChange, step: Step, more: Partial<AskedLine> = {}): AskedLine => ({
  ...lineOf(1, part, [step]),
  ordering: {},
  pieces: null,
  units: 'inch',
  load: null,
  ...more,
});
const proposed = (...of: Parameters<typeof asked>) => proposeRequirements(BATCH_TABLES, asked(...of));
/** `910 to 930 °F` by characteristic. */
const limits = (...of: Parameters<typeof asked>) =>
  Object.fromEntries(
    proposed(...of).map(({ characteristic, limit, unit }) => [
      characteristic,
      [limit, unit].filter(Boolean).join(' '),
    ]),
  );

describe('aluminium', () => {
  test('2024 bare sheet to T42: temperature, soak, quench, rest, and the pair that shows the condition', () =>
    expect(limits(SHEET, SOLUTION)).toEqual({
      'Solution temperature': '910 to 930 °F',
      Soak: '30 or more min',
      'Quench delay': '10 or less s',
      'Quench medium': 'cold water',
      'Quench medium temperature': '90 or less °F',
      'Natural ageing': '96 or more h',
      Hardness: 'HRB 63 to 83',
      Conductivity: '28.5 to 34.0 % IACS',
    }));

  test('clad sheet has a longest soak, and no pair without a correlation for its cladding', () => {
    const clad = limits({ ...SHEET, clad: true }, SOLUTION);
    expect(clad['Soak']).toMatch(/^\d+ to \d+ min$/);
    expect(clad).not.toHaveProperty('Hardness');
    expect(clad).not.toHaveProperty('Conductivity');
  });

  test('to T62 it is aged in an oven, in the person’s degrees', () => {
    const step = { ...SOLUTION, targetCondition: 'T62' };
    expect(limits(SHEET, step)['Ageing temperature']).toBe('370 to 380 °F');
    expect(limits(SHEET, step)['Ageing time']).toMatch(/^\d+ to \d+ h$/);
    expect(limits(SHEET, step, { units: 'metric' })['Ageing temperature']).toBe('188 to 193 °C');
    expect(limits(SHEET, step)).not.toHaveProperty('Natural ageing');
  });

  test('in a load with thicker metal the load’s soak is asked for', () => {
    const alone = asked(SHEET, SOLUTION);
    const beside = asked({ ...SHEET, thicknessMm: 12.7 }, SOLUTION);
    const load = loadsOfBatch(BATCH_TABLES, [alone, { ...beside, id: 'other', stepId: 'other' }])?.loads[0];
    const shared = limits(SHEET, SOLUTION, { load: load ?? null });
    expect(Number.parseInt(shared['Soak'] ?? '')).toBeGreaterThan(30);
  });

  test('the bath is that of the document ordered', () => {
    const by = (specification: string) =>
      limits(SHEET, { ...SOLUTION, specification })['Quench medium temperature'];
    expect([by('AMS 2770'), by('MIL-H-6088'), by('another')]).toEqual([
      '90 or less °F',
      '100 or less °F',
      '85 or less °F',
    ]);
  });

  test('of an alloy or thickness that no table has nothing is proposed', () => {
    expect(proposed({ ...SHEET, alloy: 'Unobtainium 9' }, SOLUTION)).toEqual([]);
    expect(limits({ ...SHEET, thicknessMm: null }, SOLUTION)).not.toHaveProperty('Soak');
  });
});

describe('steel', () => {
  test('4340 to a tensile range: austenitized, tempered, and the range itself from the drawing', () => {
    const step: Step = {
      process: 'harden_and_temper',
      specification: 'AMS 2759/1',
      targetCondition: '160 to 180 ksi',
    };
    const found = proposed({ ...BOLT, endCondition: '160 to 180 ksi' }, step);
    expect(found.map(({ characteristic }) => characteristic)).toEqual(
      expect.arrayContaining(['Austenitizing temperature', 'Tensile strength']),
    );
    expect(found.find(({ characteristic }) => characteristic === 'Tensile strength')).toMatchObject({
      limit: '160 to 180',
      unit: 'ksi',
      source: 'drawing',
    });
  });

  test('17-4PH to H1025', () =>
    expect(
      limits(
        { ...BOLT, alloy: '17-4PH', endCondition: 'H1025' },
        { process: 'artificial_age', specification: 'AMS 2759/3', targetCondition: 'H1025' },
      ),
    ).toEqual({
      'Ageing temperature': '1015 to 1035 °F',
      'Ageing time': '4.0 to 4.5 h',
      Hardness: 'HRC 35 to 42',
    }));
});

describe('finishes', () => {
  const CADMIUM: Step = {
    process: 'cadmium_plate',
    specification: 'QQ-P-416',
    specificationRevision: 'F',
    classType: 'type II class 2',
  };

  test('cadmium class 2 on hard steel: thickness, salt spray, and the bake of that revision', () =>
    expect(limits(BOLT, CADMIUM)).toEqual({
      'Coating thickness': '0.0003 or more in',
      'Salt spray': '96 or more h',
      'Bake temperature': '350 to 400 °F',
      'Bake time': '23 or more h',
      'Bake start': '4 or less h',
    }));

  test('soft steel is not baked, and a revision that nobody said asks for nothing', () => {
    expect(limits({ ...BOLT, endCondition: 'HRC 20 to 24' }, CADMIUM)).not.toHaveProperty('Bake time');
    expect(limits(BOLT, { ...CADMIUM, specificationRevision: null })).not.toHaveProperty('Bake time');
  });

  test('a metric reader has microns', () =>
    expect(limits(BOLT, CADMIUM, { units: 'metric' })['Coating thickness']).toBe('7.7 or more µm'));
});

test('penetrant states what the order chose, and only that', () => {
  const penetrant = (classType: string) =>
    limits({}, { process: 'fluorescent_penetrant', specification: 'ASTM E1417', classType });
  expect(penetrant('type I, level 3')).toEqual({
    'Penetrant type': 'type I, fluorescent',
    Sensitivity: 'level 3, high',
  });
  expect(penetrant('')).toEqual({});
});

describe('passivation', () => {
  const STAINLESS: PartChange = { alloy: '304', form: 'bar', endCondition: 'annealed' };
  const by = (specification: string, classType: string | null, more: Partial<AskedLine> = {}) =>
    limits(
      STAINLESS,
      { process: 'passivation', specification, specificationRevision: null, classType },
      more,
    );

  test('by ASTM A967 nitric 2, practice C: bath, temperature, time, and two hours of salt spray', () =>
    expect(by('ASTM A967', 'nitric 2, practice C')).toEqual({
      'Passivation bath': 'nitric acid, 20 to 45 %',
      'Passivation temperature': '70 to 90 °F',
      'Passivation time': '30 or more min',
      'Passivation test': 'practice C, salt spray',
      'Salt spray': '2 or more h',
    }));

  test('with another test no salt spray is asked for, and the step’s own words count', () => {
    expect(
      by('ASTM A967', 'citric 1', { ordering: { sampling_plan: 'copper sulphate, one of a lot' } }),
    ).toEqual({
      'Passivation bath': 'citric acid, 4 to 10 %',
      'Passivation temperature': '140 to 160 °F',
      'Passivation time': '4 or more min',
      'Passivation test': 'practice D, copper sulfate',
    });
  });

  test('a bath or test that nobody named is not guessed', () =>
    expect(by('ASTM A967', null)).toEqual({
      'Passivation test':
        'as the drawing says, by one practice: A water immersion, B humidity, C salt spray, D copper sulfate or another',
    }));

  test('by AMS 2700 the class, or what holds without one; an old QQ-P-35 asks for nitric acid and class 4', () => {
    expect(by('AMS 2700', 'method 1, class 3')).toEqual({ 'Passivation test': 'class 3' });
    expect(by('AMS 2700', null)).toEqual({ 'Passivation test': 'class 2, one part per lot' });
    expect(by('QQ-P-35', null)).toEqual({
      'Passivation bath': 'nitric acid, method 1',
      'Passivation test': 'class 4',
    });
    expect(by('a house instruction', 'nitric 2')).toEqual({});
  });
});

describe('what only the drawing knows is asked and never invented', () => {
  const by = (process: (typeof PROCESSES)[number], specification: string, more: Partial<AskedLine> = {}) =>
    proposed({}, { process, specification, specificationRevision: null, classType: null }, more);

  test('peening: intensity and coverage, with what holds otherwise where a document says it', () => {
    const peened = by('shot_peen', 'AMS-S-13165');
    expect(peened.map(({ characteristic, limit }) => [characteristic, limit])).toEqual([
      ['Peening intensity', 'as the drawing says, otherwise by thickness and material'],
      ['Coverage', 'as the drawing says, otherwise 100 % by eye'],
      ['Shot', 'as the drawing says'],
    ]);
    for (const one of peened)
      expect(one).toMatchObject({
        source: 'drawing',
        sourceText: expect.stringMatching(/the drawing decides$/),
      });
  });

  test('what the step states of it is proposed as it stands', () =>
    expect(by('shot_peen', 'AMS2430', { ordering: { intensity: '0.008 to 0.012 A' } })[0]).toMatchObject({
      characteristic: 'Peening intensity',
      limit: '0.008 to 0.012 A',
      source: 'specification',
    }));

  test('a document that no table has still asks for intensity and coverage', () =>
    expect(by('shot_peen', 'house instruction 7').map(({ characteristic }) => characteristic)).toEqual([
      'Peening intensity',
      'Coverage',
    ]));

  test.each(['radiography', 'ultrasonic'] as const)('%s: acceptance and inspector', (process) => {
    const asked = by(process, 'ASTM E1742', { ordering: { acceptance_criteria: 'grade B' } });
    expect(asked.map(({ characteristic, limit }) => [characteristic, limit]).slice(1)).toEqual([
      ['Acceptance level', 'grade B'],
      ['Inspector qualification', 'as the drawing says'],
    ]);
  });
});

describe('samples', () => {
  test.each([
    ['AQL 1.0', { aqlPct: 1, level: 'II', severity: 'normal', isZeroAcceptance: false }],
    ['tightened, level S-2, AQL 0.65', { aqlPct: 0.65, level: 'S2', severity: 'tightened' }],
    ['AQL 2.5, c = 0', { aqlPct: 2.5, isZeroAcceptance: true }],
  ])('%s', (stated, plan) => expect(readSampling(stated)).toMatchObject(plan));

  test('a plan without a quality level is not guessed', () =>
    expect(readSampling('by the specification')).toBeNull());

  test('60 pieces at AQL 1.0: 13, accept none', () => {
    expect(sampleAsOrdered(BATCH_TABLES, 'AQL 1.0', 60)).toMatchObject({ inspect: 13, accept: 0, reject: 1 });
    expect(limits({}, {}, { pieces: 60, ordering: { sampling_plan: 'AQL 1.0' } })['Sample size']).toBe(
      '13 or more pc',
    );
  });
});

describe('whatever is proposed', () => {
  const anyStep = fc.record({
    process: fc.constantFrom(...PROCESSES),
    specification: fc.constantFrom(
      'AMS 2770',
      'QQ-P-416',
      'MIL-PRF-8625',
      'ASTM E1417',
      'AMS 2759/9',
      'ASTM A967',
      'AMS2430',
      '',
    ),
    specificationRevision: fc.constantFrom('F', 'D', null),
    classType: fc.constantFrom('type II class 1', 'type III class 2', 'level 4', 'nitric 1', null),
    targetCondition: fc.constantFrom('T42', 'T62', 'T6', 'H1025', '160 to 180 ksi', 'HRC 36 to 40', null),
  });
  const anyPart = fc.record({
    alloy: fc.constantFrom('2024', '7075', '6061', '4130', '4340', '17-4PH', 'nothing'),
    form: fc.constantFrom('sheet' as const, 'bar' as const, 'casting' as const),
    clad: fc.boolean(),
    thicknessMm: fc.option(fc.double({ min: 0.2, max: 80, noNaN: true })),
    endCondition: fc.constantFrom('T42', 'T62', 'HRC 40 to 44', 'H900'),
  });

  test('is kept by the order as it is, names its source and how sure it is, and never twice', () =>
    fc.assert(
      fc.property(
        anyPart,
        anyStep,
        fc.constantFrom('inch' as const, 'metric' as const),
        (part, step, units) => {
          const all = proposed(part, step, { units, pieces: 40, ordering: { sampling_plan: 'AQL 1.0' } });
          for (const one of all) {
            expect(ToProve.safeParse(one)).toMatchObject({ success: true, data: one });
            expect(one.sourceText).toMatch(
              one.source === 'specification' ? /trust/ : /^condition |the drawing decides$/,
            );
            if (/\d/.test(one.limit) && one.unit !== '')
              expect(readLimit(one.limit, one.unit)).not.toBeNull();
          }
          expect(new Set(all.map(({ characteristic }) => characteristic)).size).toBe(all.length);
          // A second press proposes nothing more.
          expect(notAskedYet(all, all)).toEqual([]);
        },
      ),
    ));

  test('a limit in other units is never wider than its table', () =>
    fc.assert(
      fc.property(fc.integer({ min: 100, max: 1900 }), fc.integer({ min: 0, max: 60 }), (low, width) => {
        const span = { min: celsiusFromFahrenheit(low), max: celsiusFromFahrenheit(low + width) };
        expect(readLimit(temperatureLimit(span, 'inch')?.limit ?? '', '°F')).toMatchObject({
          min: low,
          max: low + width,
        });
        const metric = readLimit(temperatureLimit({ min: span.min }, 'metric')?.limit ?? '', '°C');
        expect(metric?.min).toBeGreaterThanOrEqual(span.min - 1e-6);
      }),
    ));

  test('coating limits are written without idle noughts', () => {
    expect(coatingLimit({ min: 0.00762 }, 'inch')).toEqual({ limit: '0.0003 or more', unit: 'in' });
    expect(coatingLimit({ min: 0.0127, max: 0.1143 }, 'inch')?.limit).toBe('0.0005 to 0.0045');
    expect(coatingLimit({ min: 0.025 }, 'metric')?.limit).toBe('25 or more');
  });
});

describe('what a person typed stands', () => {
  test.each([
    ['Thickness', 'Coating thickness', true],
    ['Age', 'Ageing time', true],
    ['Bake', 'Bake time', true],
    ['Bake', 'Bake start', false],
    ['Bake temperature', 'Bake time', false],
    ['Quench delay', 'Quench medium temperature', false],
    ['Quench medium', 'Quench medium temperature', false],
    ['hardness', 'Hardness', true],
    ['Salt spray', 'Coating thickness', false],
    ['Signature, name, date', 'Hardness', false],
  ])('%s and %s are the same: %s', (typed, proposal, same) => {
    expect(isSameCharacteristic(typed, proposal)).toBe(same);
    expect(isSameCharacteristic(proposal, typed)).toBe(same);
  });

  test('only what is not asked for is left', () => {
    const left = notAskedYet(proposed(SHEET, SOLUTION), [
      { characteristic: 'Hardness' },
      { characteristic: 'soak' },
    ]);
    expect(left.map(({ characteristic }) => characteristic)).not.toContain('Hardness');
    expect(left.map(({ characteristic }) => characteristic)).not.toContain('Soak');
    expect(left).toHaveLength(6);
  });
});
