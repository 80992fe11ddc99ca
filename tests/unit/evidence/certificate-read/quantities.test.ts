import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  decimalSignOf,
  durationsIn,
  numberFrom,
  temperaturesIn,
} from '@/lib/evidence/certificate/read/quantities';

test.each([
  ['28,5', '.', 28.5],
  ['28,5', ',', 28.5],
  ['1,200', '.', 1200],
  ['1,200', ',', 1.2],
  ['1.200,5', ',', 1200.5],
  ['0.035', ',', 0.035],
] as const)('%s with the decimal sign %s is %f', (written, sign, value) =>
  expect(numberFrom(written, sign)).toBe(value),
);

test.each([
  ['920°F ± 10', 920, 'F'],
  ['920 ±10 °F', 920, 'F'],
  ['9200F', 920, 'F'],
  ['493,5 °C', 493.5, 'C'],
  ['1575 deg F', 1575, 'F'],
])('%s is %f %s', (written, value, unit) =>
  expect(temperaturesIn(written, ',')[0]).toMatchObject({ value, unit }),
);

test.each([
  ['38 min', 38],
  ['1 h 30 min', 90],
  ['23.5 hours', 1410],
  ['1:30 h', 90],
  ['7 s', 0.116667],
  ['1h30', 90],
])('%s are %f minutes', (written, minutes) => expect(durationsIn(written, '.')[0]?.value).toBe(minutes));

test('a part number is no duration', () => expect(durationsIn('P/N 4h-200, 10-200', '.')).toEqual([]));

test('who writes days with full stops and decimals with a comma means a comma', () => {
  expect(decimalSignOf('05.03.2026 Härte 33,4 HRC, 4130 BAR 1.00 DIA')).toBe(',');
  expect(decimalSignOf('03/05/2026 Hardness 69.0, 70.5 HRB')).toBe('.');
});

test('a number printed with either sign comes back', () =>
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 99_999 }), fc.integer({ min: 0, max: 99 }), (whole, part) => {
      const decimals = String(part).padStart(2, '0');
      expect(numberFrom(`${whole}.${decimals}`, '.')).toBe(Number(`${whole}.${decimals}`));
      expect(numberFrom(`${whole},${decimals}`, ',')).toBe(Number(`${whole}.${decimals}`));
    }),
  ));
