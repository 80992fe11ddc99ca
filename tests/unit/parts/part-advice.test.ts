import { expect, test } from 'vitest';

import { calledSpecification } from '@/lib/parts/called-specification';
import { computedMass, typedSizes } from '@/lib/parts/computed-mass';
import { conditionsAfter, explainTyped, knownConditions } from '@/lib/parts/condition-choices';
import { materialOf } from '@/lib/parts/material-of';
import { orderingForm } from '@/lib/parts/ordering-form';
import { checkTypedRoute } from '@/lib/parts/typed-route';
import { PART_TABLES } from '@/lib/reference/published-tables';
import type { ProductForm } from '@/lib/trade/process';

const of = (alloy: string, form: ProductForm = 'sheet') =>
  materialOf(PART_TABLES.material, { alloy, form, clad: false });

test('2024 in O is offered what a heat treater makes of it, and T3 is not among it', () => {
  const offered = conditionsAfter(PART_TABLES, of('2024'), 'O');
  expect(offered).toEqual(expect.arrayContaining(['O', 'T42', 'T62']));
  expect(offered).not.toContain('T3');
});

test('before a condition is typed all that the alloy has is offered; for an unknown alloy nothing', () => {
  expect(conditionsAfter(PART_TABLES, of('2024'), '')).toContain('T3');
  expect(knownConditions(PART_TABLES, of('17-4PH'))).toContain('H1025');
  expect(knownConditions(PART_TABLES, of('unobtainium'))).toEqual([]);
});

test('T3 of 2024-O is the mill’s; trying gives T42', () =>
  expect(explainTyped(PART_TABLES, of('2024'), { from: 'O', to: 'T3' })?.found).toMatchObject({
    reach: 'cannot_be_made',
    why: 'needs_mill_cold_work',
    gives: { condition: 'T42' },
  }));

test('conditions that no table has conclude nothing', () =>
  expect(explainTyped(PART_TABLES, of('304'), { from: 'annealed', to: 'annealed' })).toBeNull());

const step = (process: string, specification = '', more = {}) => ({ process, specification, ...more });
const CADMIUM = step('cadmium_plate', 'QQ-P-416', {
  specificationRevision: 'F',
  classType: 'type II class 2',
});

test('strong steel plated without a bake: the bake is proposed after it, and open steps stay', () => {
  const { findings, repaired } = checkTypedRoute(PART_TABLES, of('4340', 'bar'), 'HRC 40 to 42', [
    step(''),
    CADMIUM,
  ]);
  expect(findings).toContainEqual(
    expect.objectContaining({ rule: 'bake_after_plating', severity: 'blocker', steps: [1] }),
  );
  expect(repaired?.slice(-3)).toEqual([
    { is: 'typed', at: 1 },
    { is: 'new', process: 'embrittlement_relief' },
    { is: 'typed', at: 0 },
  ]);
});

test('a route in order, and one of an unknown material, have no proposal', () => {
  expect(
    checkTypedRoute(PART_TABLES, of('304'), 'annealed', [step('passivation', 'AMS 2700')]).repaired,
  ).toBeNull();
  expect(checkTypedRoute(PART_TABLES, of('unobtainium'), 'HRC 42', [CADMIUM]).findings).toEqual([]);
});

const called = (specification: string, on = '2026-04-16') =>
  calledSpecification(PART_TABLES, { specification, revision: '', classType: '' }, on);

test('MIL-H-6088 ended: AMS2770 follows for parts', () =>
  expect(called('MIL-H-6088G')?.successors.map(({ number }) => number)).toContain('AMS2770'));

test('a specification that stands has no successor; words are no specification', () => {
  expect(called('AMS 2770')?.successors).toEqual([]);
  expect(called('as on the drawing')).toBeNull();
});

test('a film without a type is Type I, hexavalent', () =>
  expect(called('MIL-DTL-5541')?.notes.map(({ note }) => note)).toContain('type_i_hexavalent_applies'));

const FILM = {
  specification: 'MIL-DTL-5541',
  specificationRevision: 'F',
  classType: 'type II class 1A',
  conditionBefore: '',
  targetCondition: '',
  ordering: {},
};

test('what an order to MIL-DTL-5541 leaves out is named; type and class stand in their field', () => {
  const form = orderingForm(PART_TABLES, FILM);
  expect(form?.asked.map(({ item }) => item)).toContain('next_step');
  expect(form?.asked.map(({ item }) => item)).not.toContain('type');
  expect(form?.missing.map(({ item }) => item)).toContain('next_step');
});

test('what is stated is missing no longer; blanks state nothing', () => {
  const stated = (says: string) =>
    orderingForm(PART_TABLES, { ...FILM, ordering: { next_step: says } })?.missing.map(({ item }) => item);
  expect(stated('primer')).not.toContain('next_step');
  expect(stated('  ')).toContain('next_step');
});

const TYPED = { length: '1000 mm', width: '500 mm', height: '', thickness: '2 mm' };
const SIZES = typedSizes(TYPED);

test('a 2024 sheet of 1000 × 500 × 2 mm: 2.77 kg and 1.006 m², edges included', () => {
  const found = computedMass(PART_TABLES, of('2024'), SIZES, 'T42');
  expect(found?.massG).toBeCloseTo(2767.99, 1);
  expect(found?.areaMm2).toBeCloseTo(1_006_000, 3);
});

test.each([
  ['a size is missing', of('2024'), typedSizes({ ...TYPED, width: '' })],
  ['an extrusion is no plain shape', of('2024', 'extrusion'), SIZES],
  ['the alloy is not known', of('unobtainium'), SIZES],
])('nothing is computed where %s', (_, material, sizes) =>
  expect(computedMass(PART_TABLES, material, sizes, 'T42')).toBeNull(),
);
