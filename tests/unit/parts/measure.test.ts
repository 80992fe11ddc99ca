import fc from 'fast-check';
import { expect, test } from 'vitest';

import { inBaseUnit, readMeasure, type Quantity } from '@/lib/parts/measure';

test.each<[string, Quantity, number]>([
  ['0.040 in', 'length', 1.016],
  ['.063"', 'length', 1.6002],
  ['1 mm', 'length', 1],
  ['1mm', 'length', 1],
  ['1/8 in', 'length', 3.175],
  ['1 1/4 in', 'length', 31.75],
  ['61.5 in', 'length', 1562.1],
  ['6 ft', 'length', 1828.8],
  ['1,250 mm', 'length', 1250],
  ['2.5 lb', 'mass', 1133.9809],
  ['186 g', 'mass', 186],
  ['1.2 KG', 'mass', 1200],
  ['8 oz', 'mass', 226.7962],
  ['1.78 ft²', 'area', 165_367.4112],
  ['12 sq in', 'area', 7741.92],
  ['1650 cm2', 'area', 165_000],
])('%s is read as %s: %d', (typed, quantity, value) =>
  expect(readMeasure(typed, quantity, 'It')).toEqual({ ok: true, value, entered: typed }),
);

test.each<[string, Quantity, RegExp]>([
  ['0.063', 'length', /^Thickness needs its unit. Write it like 0.040 in or 1 mm.$/],
  ['0,063 in', 'length', /cannot be read/],
  ['1/0 in', 'length', /cannot be read/],
  ['thin', 'length', /cannot be read/],
  ['', 'length', /cannot be read/],
  ['-1 mm', 'length', /cannot be read/],
  ['0 mm', 'length', /more than 0/],
  ['1 kg', 'length', /unit that is not known here: kg/],
  ['1 gauge', 'length', /gauge/],
  ['99999999999 m', 'length', /larger than any part/],
])('%s is refused as %s', (typed, quantity, message) =>
  expect(readMeasure(typed, quantity, 'Thickness')).toMatchObject({
    ok: false,
    message: expect.stringMatching(message) as string,
  }),
);

test('what was typed is kept, but for its spaces', () =>
  expect(readMeasure('  0.040   in ', 'length', 'It')).toMatchObject({ entered: '0.040 in' }));
test('the base unit is said', () =>
  expect([inBaseUnit(1.016, 'length'), inBaseUnit(1133.9809, 'mass')]).toEqual(['1.016 mm', '1,134 g']));

test('inches and millimetres of the same length are the same', () =>
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 1_000_000 }), (thousandths) => {
      const inches = readMeasure(`${thousandths / 1000} in`, 'length', 'It');
      const mm = readMeasure(`${((thousandths * 254) / 10_000).toFixed(4)} mm`, 'length', 'It');
      expect(inches).toMatchObject({ ok: true });
      expect(mm.ok && inches.ok && Math.abs(mm.value - inches.value) < 1e-9).toBe(true);
    }),
  ));
