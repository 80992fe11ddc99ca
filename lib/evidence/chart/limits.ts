import {
  celsiusDifferenceFromFahrenheit,
  celsiusFromFahrenheit,
  fahrenheitDifferenceFromCelsius,
  fahrenheitFromCelsius,
} from '@/lib/trade/units/temperature';

import type { ChartRequirement, TemperatureUnit } from './requirement';

/** The band in the unit of one channel. */
export interface Limits {
  readonly lower: number;
  readonly upper: number;
}

/** So that 538 - 5.6 is 532.4, as it is written. */
const LAST_BIT = 1e-9;

/**
 * The band in a channel's unit. Where that is not the requirement's, the limits are rounded to the step in which the
 * channel was written: 930 °F is 498.9 °C to a recorder with one decimal, and a reading of 498.9 is not above it.
 *
 * @example 920 ± 10 °F is 487.8 to 498.9 °C for a channel written in tenths.
 */
export function limitsIn(
  { set, tolerance, unit }: ChartRequirement,
  to: TemperatureUnit,
  step: number,
): Limits {
  const [lower, upper] = [set - tolerance, set + tolerance];
  if (to === unit) return { lower: lower - LAST_BIT, upper: upper + LAST_BIT };
  return {
    lower: rounded(degreesIn(lower, unit, to), step) - LAST_BIT,
    upper: rounded(degreesIn(upper, unit, to), step) + LAST_BIT,
  };
}

const rounded = (value: number, step: number): number => Math.round(value / step) * step;

/** A temperature in another unit. */
export function degreesIn(degrees: number, from: TemperatureUnit, to: TemperatureUnit): number {
  if (from === to) return degrees;
  return to === 'C' ? celsiusFromFahrenheit(degrees) : fahrenheitFromCelsius(degrees);
}

/** A difference of temperatures in another unit. */
export function differenceIn(degrees: number, from: TemperatureUnit, to: TemperatureUnit): number {
  if (from === to) return degrees;
  return to === 'C' ? celsiusDifferenceFromFahrenheit(degrees) : fahrenheitDifferenceFromCelsius(degrees);
}
