import { expect, test } from 'vitest';

import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { hasField, withCorrection, withCorrections } from '@/lib/readings/with-corrections';

import { NOTHING_STATED } from './nothing-stated';

const fact = (field: string, value: string | number, confidence: number) => ({
  field,
  value,
  raw: String(value),
  page: 1,
  box: [0, 0, 10, 10] as [number, number, number, number],
  confidence,
});

const STATED: StatedCertificate = {
  ...NOTHING_STATED,
  certificate_number: '26-0O417',
  purchase_order: 'TP-1',
  lines: [{ part_number: 'MC-1', rev: 'A', qty_accepted: 8, qty_rejected: null, material: null, lot: null }],
  readings: [{ kind: 'hardness', unit: 'HRB', values: [58] }],
  conformance_statement: true,
  facts: [fact('certificate_number', '26-0O417', 0.4), fact('lines[0].qty_accepted', 8, 0.9)],
};

test.each([
  ['certificate_number', '26-00417', { certificate_number: '26-00417' }],
  ['certificate_date', '2026-06-17', { certificate_date: '2026-06-17' }],
  ['quench_delay_s', '7,5', { quench_delay_s: 7.5 }],
  ['signature_present', 'yes', { signature_present: true }],
  ['purchase_order', '', { purchase_order: null }],
  ['lines[0].qty_accepted', '10', { lines: [{ qty_accepted: 10 }] }],
  ['readings[0].values', '70; 71', { readings: [{ values: [70, 71] }] }],
])('%s as %s', (field, corrected, expected) => {
  expect(withCorrection(STATED, { field, corrected })).toMatchObject(expected);
});

test.each([
  ['certificate_date', '17 June'],
  ['lines[0].qty_accepted', 'ten'],
  ['signature_present', 'perhaps'],
  ['lines[1].qty_accepted', '10'],
  ['lines.length', '0'],
  ['facts[0].confidence', '1'],
  ['constructor.name', 'x'],
  ['__proto__.toString', 'x'],
  ['lines[0].__proto__.toString', 'x'],
])('%s cannot be %s', (field, corrected) => {
  const before = structuredClone(STATED);
  expect(withCorrection(STATED, { field, corrected })).toBeNull();
  expect(withCorrections(STATED, [{ field, corrected }])).toEqual(before);
  expect({}.toString()).toBe('[object Object]');
});

test('a corrected fact is believed; the others are as they were read', () => {
  const { facts } = withCorrections(STATED, [{ field: 'certificate_number', corrected: '26-00417' }]);
  expect(facts).toMatchObject([
    { value: '26-00417', raw: '26-0O417', confidence: 1 },
    { value: 8, confidence: 0.9 },
  ]);
});

test('of two corrections of a field the later counts', () => {
  const field = 'certificate_number';
  expect(
    withCorrections(STATED, [
      { field, corrected: '26-00411' },
      { field, corrected: '26-00417' },
    ]),
  ).toMatchObject({ certificate_number: '26-00417' });
});

test('a field is one of the certificate’s own', () => {
  expect(hasField(STATED, 'lines[0].rev')).toBe(true);
  expect(hasField(STATED, 'toString')).toBe(false);
});

test('what the machine did not find is stated once a person says so, on the page of the certificate', () => {
  const { signature_present, facts } = withCorrections(STATED, [
    { field: 'signature_present', corrected: 'yes' },
  ]);
  expect(signature_present).toBe(true);
  expect(facts.at(-1)).toMatchObject({ field: 'signature_present', value: 'yes', confidence: 1, page: 1 });
  expect(facts.slice(0, -1)).toEqual(STATED.facts);
});
