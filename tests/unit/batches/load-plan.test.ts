import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';

import { LoadPlanView } from '@/components/batches/load-plan-view';
import { areaWords, massWords, sumOfKnown } from '@/components/batches/measures';
import { loadPlanOf } from '@/lib/batches/load-plan';
import { BATCH_TABLES } from '@/lib/reference/batch-tables';

import { lineOf, type PartChange } from './facts-of-batch';

const STEP = {
  process: 'solution_heat_treat_and_age',
  specification: 'AMS 2770',
  specificationRevision: 'R',
  classType: 'natural age',
  conditionBefore: 'O',
  targetCondition: 'T42',
} as const;
const sheet = (thicknessMm: number, more: PartChange = {}): PartChange => ({
  alloy: '2024',
  madeCondition: 'O',
  endCondition: 'T42',
  thicknessMm,
  thickness: `${thicknessMm} mm`,
  ...more,
});
const planOf = (parts: readonly PartChange[], more: Parameters<typeof lineOf>[3] = {}) =>
  loadPlanOf(
    BATCH_TABLES,
    parts.map((part, at) => lineOf(at + 1, part, [STEP], more)),
  );

const THIN_CLAD = sheet(0.8, { clad: true });
const THICK_BARE = sheet(6.3);

describe('the load plan of a batch', () => {
  test('thin clad beside thick bare takes two loads, each governed by its own thickness', () => {
    const plan = planOf([THIN_CLAD, THICK_BARE]);
    expect(plan.method).toBe('exact');
    expect(plan.loads.map(({ lines, governing }) => [lines.map(({ lineNo }) => lineNo), governing])).toEqual([
      [[1], { lineId: 'line-1', lineNo: 1, thickness: '0.8 mm', thicknessMm: 0.8 }],
      [[2], { lineId: 'line-2', lineNo: 2, thickness: '6.3 mm', thicknessMm: 6.3 }],
    ]);
    expect(plan.apart).toMatchObject([{ between: [[1], [2]], reason: 'clad_would_soak_too_long' }]);
    expect(plan.apart[0]?.source).toMatch(/trust/);
  });

  test('each load says what it soaks, and each line what it would alone', () => {
    const [load] = planOf([sheet(0.8), THICK_BARE]).loads;
    const alone = load?.lines.map(({ soak }) => soak?.soakMin ?? 0) ?? [];
    expect(load?.solution?.soakMin).toBe(Math.max(...alone));
    expect(alone[0]).toBeLessThan(alone[1] ?? 0);
    expect(load?.solution).toMatchObject({ medium: 'air', quench: 'cold water', longestMin: null });
  });

  test.each([
    ['its part says no thickness', sheet(1.6, { thicknessMm: null, thickness: null })],
    ['no table here knows its alloy', sheet(1.6, { alloy: 'Unobtainium 9' })],
    ['loads are planned for wrought aluminium only', sheet(1.6, { alloy: '4130' })],
  ])('a line is left out because %s', (says, part) => {
    const plan = planOf([sheet(1.6), part]);
    expect(plan.loads.flatMap(({ lines }) => lines.map(({ lineNo }) => lineNo))).toEqual([1]);
    expect(plan.unplaced).toMatchObject([{ lineNo: 2, says }]);
  });

  test('plating is not planned in furnace loads', () =>
    expect(loadPlanOf(BATCH_TABLES, [lineOf(1, {}, [{}])])).toMatchObject({ method: null, loads: [] }));

  test('it is set once the lines of each load share a number of their own', () => {
    const lines = [lineOf(1, THIN_CLAD, [STEP]), lineOf(2, THICK_BARE, [STEP])];
    const lie = (numbers: readonly (number | null)[]) =>
      loadPlanOf(
        BATCH_TABLES,
        lines.map((line, at) => ({ ...line, loadNo: numbers[at] ?? null })),
      ).isSet;
    expect([lie([2, 1]), lie([1, 1]), lie([1, null]), lie([null, null])]).toEqual([
      true,
      false,
      false,
      false,
    ]);
  });

  test('its mass is what the parts say, computed where they do not, and unknown where one is neither', () => {
    const sized = { lengthMm: 1000, widthMm: 500 };
    const mass = (...parts: PartChange[]) => planOf(parts, { pieces: 2 }).loads[0]?.mass;
    expect(mass(sheet(2, { massG: 100 }), sheet(2, { massG: 50 }))).toEqual({
      massG: 300,
      isComputed: false,
    });
    expect(mass(sheet(2, sized))).toMatchObject({ isComputed: true });
    expect(mass(sheet(2, sized))?.massG).toBeCloseTo(2 * 2767.99, 1);
    expect(mass(sheet(2, { massG: 100 }), sheet(2))).toBeNull();
  });
});

describe('as it is shown', () => {
  const seen = (units: 'inch' | 'metric', parts: readonly PartChange[]) =>
    renderToStaticMarkup(createElement(LoadPlanView, { plan: planOf(parts), units })).replace(
      /<[^>]*>/g,
      ' ',
    );

  test('temperatures in the person’s unit, why lines are apart, and sources', () => {
    const inches = seen('inch', [THIN_CLAD, THICK_BARE]);
    expect(inches).toMatch(/910 to 930\s+°F/);
    expect(inches).toMatch(/Line 1 and line 2 are kept apart:/);
    expect(inches).toMatch(/trust/);
    expect(seen('metric', [THICK_BARE])).toMatch(/488 to 499\s+°C/);
  });

  test('no raw code, nothing undefined', () =>
    expect(seen('inch', [THIN_CLAD, THICK_BARE, sheet(1.6, { alloy: 'X' })])).not.toMatch(
      /[a-z]+_[a-z]+|undefined|NaN/,
    ));
});

describe('mass and area of one piece', () => {
  test.each([
    [627, 'inch', '1.38 lb'],
    [20, 'inch', '0.705 oz'],
    [627, 'metric', '627 g'],
    [1250, 'metric', '1.25 kg'],
  ] as const)('%f g in %s is %s', (grams, units, says) => expect(massWords(grams, units)).toBe(says));

  test.each([
    [559_152.4, 'inch', '6.02 ft²'],
    [20_258, 'inch', '31.4 in²'],
    [559_152.4, 'metric', '0.559 m²'],
    [20_258, 'metric', '203 cm²'],
  ] as const)('%f mm² in %s is %s', (mm2, units, says) => expect(areaWords(mm2, units)).toBe(says));

  test('a sum with a computed part is computed, with an unknown one unknown', () => {
    const weighed = { value: 2, isComputed: false };
    expect(sumOfKnown([weighed, { value: 3, isComputed: true }])).toEqual({ value: 5, isComputed: true });
    expect(sumOfKnown([weighed, weighed])).toEqual({ value: 4, isComputed: false });
    expect(sumOfKnown([weighed, null])).toBeNull();
  });
});
