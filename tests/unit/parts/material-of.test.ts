import { expect, test } from 'vitest';

import { materialOf, temperOf } from '@/lib/parts/material-of';
import { routePartOf } from '@/lib/parts/route-part-of';
import { strengthOf } from '@/lib/parts/strength-of';
import { PART_TABLES } from '@/lib/reference/published-tables';
import { mpaFromKsi } from '@/lib/trade/units/stress';

const read = (alloy: string, clad = false) =>
  materialOf(PART_TABLES.material, { alloy, form: 'sheet', clad });

test.each([
  ['2024', { alloy: '2024', family: 'wrought_aluminium', clad: false }],
  ['Alclad 2024-T3', { alloy: '2024', clad: true, saidTemper: 'T3' }],
  ['17-4 PH', { alloy: '17-4PH', family: 'precipitation_hardening_steel' }],
  ['AISI 304', { alloy: '304', family: 'austenitic_stainless' }],
])('%s is a material of the library', (alloy, material) =>
  expect(read(alloy)).toMatchObject({ known: 'yes', material }),
);

test('a ticked box makes it clad whatever the name says', () =>
  expect(read('2024', true)).toMatchObject({ known: 'yes', material: { clad: true } }));

test('no form chosen yet leaves the form open', () =>
  expect(materialOf(PART_TABLES.material, { alloy: '2024', form: '', clad: false })).toMatchObject({
    known: 'yes',
    material: { form: undefined },
  }));

test('24S is a former name: today 2024, and that is an engineering decision', () =>
  expect(read('24S')).toMatchObject({
    known: 'former_name',
    formerly: { present: ['2024'], caution: 'equivalence_is_an_engineering_decision' },
  }));

test('what nobody knows is concluded nothing from', () =>
  expect(read('unobtainium')).toEqual({ known: 'no' }));

test.each([
  ['T42', 'T42'],
  ['-T6', 'T6'],
  ['0', 'O'],
  ['annealed', undefined],
  ['160 to 180 ksi', undefined],
])('condition %s is temper %s', (typed, temper) =>
  expect(temperOf(PART_TABLES.material.tempers, typed)).toBe(temper),
);

test.each([
  ['160 to 180 ksi', { tensileMpa: mpaFromKsi(180) }],
  ['1100-1250 MPa', { tensileMpa: 1250 }],
  ['HRC 36 to 40', { hrc: 40 }],
  ['180/200 ksi, HRC 40-43', { tensileMpa: mpaFromKsi(200), hrc: 43 }],
  ['125 ksi min', {}],
  ['HRC 38 min', {}],
  ['annealed', {}],
])('%s names a highest strength, or none', (condition, strength) =>
  expect(strengthOf(condition)).toEqual(strength),
);

test('17-4PH in H1025 is as hard as its table allows: HRC 42', () => {
  const found = read('17-4PH');
  if (found.known !== 'yes') throw new Error('17-4PH is not read');
  expect(routePartOf(PART_TABLES.phConditions, found.material, 'H1025')).toMatchObject({ hrc: 42 });
});
