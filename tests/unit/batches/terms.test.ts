import fc from 'fast-check';
import { expect, test } from 'vitest';

import { expectedPrice } from '@/lib/batches/expected-price';
import { reissueChanges, type StatedTerms } from '@/lib/batches/reissue-changes';

test('pieces under the lot minimum are brought up to it; the fee for papers comes on top', () => {
  expect(
    expectedPrice({
      lotMinimumMinor: 18000,
      certificationFeeMinor: 2500,
      lines: [{ pieces: 10, unitPriceMinor: 400 }],
    }),
  ).toEqual({ workMinor: 4000, toMinimumMinor: 14000, certificationFeeMinor: 2500, totalMinor: 20500 });
});

test('an empty order asks for no minimum', () => {
  expect(expectedPrice({ lotMinimumMinor: 18000, certificationFeeMinor: 0, lines: [] }).totalMinor).toBe(0);
});

test('one more piece never makes an order cheaper, and never less than the minimum', () => {
  const order = fc.record({
    lotMinimumMinor: fc.nat(100_000),
    certificationFeeMinor: fc.nat(10_000),
    pieces: fc.integer({ min: 1, max: 500 }),
    each: fc.nat(5_000),
  });
  fc.assert(
    fc.property(order, ({ pieces, each, ...terms }) => {
      const price = (count: number) =>
        expectedPrice({ ...terms, lines: [{ pieces: count, unitPriceMinor: each }] }).totalMinor;
      expect(price(pieces + 1)).toBeGreaterThanOrEqual(price(pieces));
      expect(price(pieces)).toBeGreaterThanOrEqual(terms.lotMinimumMinor + terms.certificationFeeMinor);
    }),
  );
});

const terms: StatedTerms = {
  zone: 'UTC',
  now: new Date('2026-06-17T12:00:00Z'),
  wantedBackOn: '2026-07-01',
  note: null,
  lotMinimumMinor: 18000,
  certificationFeeMinor: 0,
  lines: [{ id: 'a', lineNo: 1, unitPriceMinor: 245 }],
  requirements: [
    { id: 'r', lineId: 'a', characteristic: 'Hardness', limit: '63 to 83', unit: 'HRB' },
    { id: 's', lineId: null, characteristic: 'Furnace chart', limit: '', unit: '' },
  ],
};

test('nothing changed is nothing said', () => {
  expect(reissueChanges(terms, { ...terms, note: '' })).toEqual([]);
});

test('each change names what it was', () => {
  const after: StatedTerms = {
    ...terms,
    wantedBackOn: null,
    note: 'Van on Friday',
    lotMinimumMinor: 20000,
    certificationFeeMinor: 2500,
    lines: [{ id: 'a', lineNo: 1, unitPriceMinor: 260 }],
    requirements: [
      { id: 'r', lineId: 'a', characteristic: 'Hardness', limit: '65 to 83', unit: 'HRB' },
      { id: 's', lineId: null, characteristic: 'Furnace chart', limit: 'of each load', unit: '' },
    ],
  };
  expect(reissueChanges(terms, after)).toEqual([
    'wanted back no day, was Wed 1 Jul',
    'line 1 at 2.60 each, was 2.45',
    'lot minimum 200.00, was 180.00',
    'certificates 25.00, was 0.00',
    'Hardness of line 1: 65 to 83 HRB, was 63 to 83 HRB',
    'Furnace chart: of each load, was no limit',
    'note: Van on Friday',
  ]);
});
