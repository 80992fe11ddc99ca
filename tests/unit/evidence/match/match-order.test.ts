import fc from 'fast-check';
import { expect, test } from 'vitest';

import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { likeness, mayBeMisread } from '@/lib/evidence/certificate/match/alike';
import { matchOrder } from '@/lib/evidence/certificate/match/match-order';
import { areSameCompany } from '@/lib/evidence/certificate/match/same-company';
import { namesOrder } from '@/lib/evidence/certificate/match/same-order-number';

import { agreeing, heatTreat, penetrant, plating } from '../compare/agreeing-certificate';

test.each([
  ['10-200', '10200', 'same'],
  ['ab 10-200', 'AB-10.200', 'same'],
  ['10-200', '1O-2OO', 'lookalike'],
  ['S5-18B', '55-I8B', 'lookalike'],
  ['10-200', '10-020', 'transposed'],
  ['10-217', '12-017', 'transposed'],
  ['10-200', '10-208', 'near'],
  ['10-200', '10-2000', 'near'],
  ['10-200', '1-200', 'near'],
  ['10-200', '10-311', null],
  ['A1', 'A2', null],
  ['', '', null],
] as const)('%s and %s are %s', (one, other, how) => {
  expect(likeness(one, other)).toBe(how);
  expect(likeness(other, one)).toBe(how);
});

test('one character changed, added or left out is near or nearer', () =>
  fc.assert(
    fc.property(
      fc.stringMatching(/^[0-9]{5,9}$/),
      fc.nat(),
      fc.constantFrom('left out', 'changed', 'added'),
      (number, at, how) => {
        const place = at % number.length;
        const instead = { 'left out': '', changed: '7', added: `7${number.charAt(place)}` }[how];
        const changed = number.slice(0, place) + instead + number.slice(place + 1);
        expect(likeness(number, changed)).not.toBeNull();
      },
    ),
  ));

test.each([
  ['PO-5001', 'PO-5001', true],
  ['5001', 'PO-5001', true],
  ['P.O. # 5001', 'PO-5001', true],
  ['Purchase Order No.: PO 5001', 'PO-5001', true],
  ['Your order number 5001, line 2', 'PO-5001', true],
  ['LW-2026-014', '2026-014', true],
  ['PO LW-501', 'LW-501', true],
  ['5001; 5002', 'PO-5002', true],
  ['PO-5010', 'PO-5001', false],
  ['WO-5001', 'PO-5001', false],
  ['50012', 'PO-5001', false],
  ['', 'PO-5001', false],
  ['no', 'PO-5001', false],
])('%s names order %s: %s', (written, order, is) => expect(namesOrder(written, order)).toBe(is));

test('a number that recognition misread names the order', () => {
  expect(namesOrder('PO-S0O1', 'PO-5001', true)).toBe(true);
  expect(namesOrder('PO-S0O1', 'PO-5001', false)).toBe(false);
});

test.each([
  ['Example Thermal', 'EXAMPLE THERMAL, INC.', true],
  ['Example Thermal', 'Example Thermal Processing Ltd', true],
  ['Nord-Galvanik GmbH', 'Nordgalvanik', true],
  ['Example Thermal', 'Sample Thermal', false],
  ['The Company', 'The Company', false],
])('%s and %s are one company: %s', (one, other, is) => expect(areSameCompany(one, other)).toBe(is));

const ORDERS = [heatTreat(), plating(), penetrant()];
const nothing: Partial<StatedCertificate> = {
  processor: null,
  purchase_order: null,
  batch: null,
  process: null,
  lines: [],
};
const matched = (changes: Partial<StatedCertificate>, orders = ORDERS) =>
  matchOrder({ ...agreeing(heatTreat()), ...changes }, orders);
const lines = (...numbers: string[]) =>
  numbers.map((part_number) => ({
    ...{ part_number, rev: null, qty_accepted: null, qty_rejected: null },
    ...{ material: null, lot: null },
  }));

test.each<[string, Partial<StatedCertificate>]>([
  ['everything', {}],
  ['its order', { ...nothing, purchase_order: '5001' }],
  ['its batch', { ...nothing, batch: 'B0001' }],
  ['its parts', { ...nothing, lines: lines('10-200', '10-311') }],
  ['one of its parts', { ...nothing, lines: lines('10-311') }],
  ['its parts misread', { ...nothing, lines: lines('1O200', '10-31I') }],
  [
    'its parts transposed, from its processor',
    { ...nothing, lines: lines('10-020', '10-131'), processor: 'Example Thermal' },
  ],
  ['its order mistyped, with its parts', { purchase_order: 'PO-5010' }],
  ["another's order, with its parts", { purchase_order: 'PO-5002', batch: null }],
  ["another's order, with its parts and batch", { purchase_order: 'PO-5002' }],
])('a certificate is matched by %s', (_, changes) => {
  expect(matched(changes).matches_batch).toBe('B-0001');
});

test.each<[string, Partial<StatedCertificate>]>([
  ['nothing', nothing],
  [
    'its processor alone',
    { ...nothing, processor: 'Example Thermal', process: 'solution_heat_treat_and_age' },
  ],
  ['parts that are nobody’s', { ...nothing, lines: lines('99-999') }],
  ['two orders at once', { ...nothing, purchase_order: 'PO-5001, PO-5002' }],
])('a certificate with %s is matched to none', (_, changes) => {
  expect(matched(changes).matches_batch).toBeNull();
});

test('of two batches with the same parts, the order decides, and without it nobody', () => {
  const again = heatTreat({ batch: 'B-0009', po: 'PO-6009', dispatched: '2026-03-10' });
  expect(matched({ batch: null, purchase_order: '6009' }, [heatTreat(), again]).matches_batch).toBe('B-0009');
  const unclear = matched({ batch: null, purchase_order: null }, [heatTreat(), again]);
  expect(unclear.matches_batch).toBeNull();
  expect(unclear.candidates.map(({ order }) => order.batch)).toEqual(['B-0001', 'B-0009']);
});

test('a batch that left after the certificate was written is less likely', () => {
  const later = heatTreat({ batch: 'B-0009', po: 'PO-6009', dispatched: '2026-03-15' });
  const { candidates } = matched({ batch: null, purchase_order: null }, [later, heatTreat()]);
  expect(candidates.map(({ order }) => order.batch)).toEqual(['B-0001', 'B-0009']);
});

test('each candidate says why', () => {
  expect(matched({ lines: lines('10-200', '10-131') }).candidates[0]?.reasons).toEqual([
    'It names order PO-5001.',
    'It names batch B-0001.',
    '2 of its 2 part numbers are on the order (10-131 like 10-311).',
    'It comes from Example Thermal.',
    'The process is the one ordered.',
  ]);
});

test.each([
  ['WAS8643-4', 'WA8643-4', true],
  ['WAQ087-6', 'WA9087-6', true],
  ['WA8043-4', 'WA8643-4', false],
  ['WA8634-4', 'WA8643-4', false],
])('recognition may have made %s of %s: %s', (read, ordered, expected) =>
  expect(mayBeMisread(read, ordered)).toBe(expected),
);
