import { celsiusFromFahrenheit, fahrenheitFromCelsius } from '@/lib/trade/units/temperature';

import type { ChartRequirement, TemperatureUnit } from './requirement';

/** A reading within a twentieth of the set temperature is one of the soak. */
const NEAR = 0.05;

/**
 * The unit in which a chart's readings come near the set temperature.
 *
 * @returns `sure` where they do so in one unit and never in the other.
 */
export function likelyUnit(
  channels: readonly Float64Array[],
  { set, unit }: ChartRequirement,
): { unit: TemperatureUnit; sure: boolean } {
  const setF = unit === 'F' ? set : fahrenheitFromCelsius(set);
  const setC = unit === 'C' ? set : celsiusFromFahrenheit(set);
  const [nearF, nearC] = [setF, setC].map((degrees) =>
    channels.reduce((sum, values) => sum + shareNear(values, degrees), 0),
  );
  if (nearF === undefined || nearC === undefined || nearF === nearC) return { unit, sure: false };
  return {
    unit: nearF > nearC ? 'F' : 'C',
    sure: Math.max(nearF, nearC) > 0.1 && Math.min(nearF, nearC) < 0.01,
  };
}

/** Over a few thousand readings, which is enough for a share. */
function shareNear(values: Float64Array, degrees: number): number {
  const stride = Math.max(1, Math.floor(values.length / 4000));
  let [near, seen] = [0, 0];
  for (let row = 0; row < values.length; row += stride) {
    seen++;
    if (Math.abs((values[row] ?? 0) - degrees) <= degrees * NEAR) near++;
  }
  return seen === 0 ? 0 : near / seen;
}
