import fc from 'fast-check';
import { expect, test } from 'vitest';

import { gPerCm3FromLbPerIn3, lbPerIn3FromGPerCm3 } from '@/lib/trade/units/density';
import { inchesFromMm, mmFromInches } from '@/lib/trade/units/length';
import { kgFromPounds, poundsFromKg } from '@/lib/trade/units/mass';
import { ksiFromMpa, mpaFromKsi } from '@/lib/trade/units/stress';
import {
  celsiusDifferenceFromFahrenheit,
  celsiusFromFahrenheit,
  fahrenheitDifferenceFromCelsius,
  fahrenheitFromCelsius,
} from '@/lib/trade/units/temperature';
import { hoursFromMin, minFromHours } from '@/lib/trade/units/time';

const BY_DEFINITION = [
  ['0.032 in in mm', mmFromInches(0.032), 0.8128],
  ['25.4 mm in in', inchesFromMm(25.4), 1],
  ['212 °F in °C', celsiusFromFahrenheit(212), 100],
  ['920 °F in °C', celsiusFromFahrenheit(920), 493.3333333333333],
  ['-40 °C in °F', fahrenheitFromCelsius(-40), -40],
  ['a rise of 18 °F in °C', celsiusDifferenceFromFahrenheit(18), 10],
  ['a band of 10 °C in °F', fahrenheitDifferenceFromCelsius(10), 18],
  ['1 lb in kg', kgFromPounds(1), 0.45359237],
  ['0.45359237 kg in lb', poundsFromKg(0.45359237), 1],
  ['1 ksi in MPa', mpaFromKsi(1), 6.894757293168361],
  ['689.4757293168361 MPa in ksi', ksiFromMpa(689.4757293168361), 100],
  ['1 lb/in³ in g/cm³', gPerCm3FromLbPerIn3(1), 27.679904710203125],
  ['27.679904710203125 g/cm³ in lb/in³', lbPerIn3FromGPerCm3(27.679904710203125), 1],
  ['1.5 h in min', minFromHours(1.5), 90],
  ['90 min in h', hoursFromMin(90), 1.5],
] as const;

test.each(BY_DEFINITION)('by definition of the unit: %s', (_name, computed, defined) => {
  expect(computed).toBeCloseTo(defined, 12);
});

const PAIRS = [
  ['length', mmFromInches, inchesFromMm],
  ['temperature', celsiusFromFahrenheit, fahrenheitFromCelsius],
  ['temperature difference', celsiusDifferenceFromFahrenheit, fahrenheitDifferenceFromCelsius],
  ['mass', kgFromPounds, poundsFromKg],
  ['stress', mpaFromKsi, ksiFromMpa],
  ['density', gPerCm3FromLbPerIn3, lbPerIn3FromGPerCm3],
  ['time', minFromHours, hoursFromMin],
] as const;

test.each(PAIRS)('%s there and back is the same value', (_name, there, back) => {
  fc.assert(
    fc.property(fc.double({ min: -1e4, max: 1e4, noNaN: true }), (value) => {
      expect(Math.abs(back(there(value)) - value)).toBeLessThan(1e-9);
    }),
  );
});

test('a difference of temperatures is not a temperature', () => {
  expect(celsiusDifferenceFromFahrenheit(0)).toBe(0);
  expect(celsiusFromFahrenheit(0)).not.toBe(0);
});
