import { fahrenheitFromCelsius } from '@/lib/trade/units/temperature';
import { inchesFromMm } from '@/lib/trade/units/length';

export type Units = 'inch' | 'metric';
/** A limit in the words of an order, with its unit beside it. */
export interface Limit {
  readonly limit: string;
  readonly unit: string;
}

interface Bounds {
  readonly min?: number | undefined;
  readonly max?: number | undefined;
}

/** `910 to 930`, `30 or more`, `10 or less`; null where nothing bounds it. */
export function limitOf({ min, max }: Bounds, unit: string, places = 0): Limit | null {
  const write = (value: number) => value.toFixed(places);
  if (min !== undefined && max !== undefined)
    return { limit: min === max ? write(min) : `${write(min)} to ${write(max)}`, unit };
  if (min !== undefined) return { limit: `${write(min)} or more`, unit };
  return max === undefined ? null : { limit: `${write(max)} or less`, unit };
}

/** Whole degrees of the person's scale; an end that is no whole degree moves inward, never wider than its table. */
export function temperatureLimit({ min, max }: Bounds, units: Units): Limit | null {
  const inUnits = (celsius: number) => (units === 'inch' ? fahrenheitFromCelsius(celsius) : celsius);
  return limitOf(
    {
      min: min === undefined ? undefined : inward(inUnits(min), Math.ceil),
      max: max === undefined ? undefined : inward(inUnits(max), Math.floor),
    },
    units === 'inch' ? '°F' : '°C',
  );
}

/** A coating: inches to five places, or tenths of a micron. */
export function coatingLimit({ min, max }: Bounds, units: Units): Limit | null {
  const [factor, places] = units === 'inch' ? [inchesFromMm(1), 5] : [1000, 1];
  const rounded = (mm: number | undefined, towards: typeof Math.ceil) =>
    mm === undefined ? undefined : inward(mm * factor * 10 ** places, towards) / 10 ** places;
  const found = limitOf(
    { min: rounded(min, Math.ceil), max: rounded(max, Math.floor) },
    units === 'inch' ? 'in' : 'µm',
    places,
  );
  return (
    found && { ...found, limit: found.limit.replace(/(\.\d*?)0+(?=\D|$)/g, '$1').replace(/\.(?=\D|$)/g, '') }
  );
}

/** Hours, to two places at most, from minutes. */
export const hoursLimit = ({ min, max }: Bounds): Limit | null => {
  const hours = (minutes: number | undefined) =>
    minutes === undefined ? undefined : Number((minutes / 60).toFixed(2));
  const [from, to] = [hours(min), hours(max)];
  const places = Math.max(...[from, to].map((one) => String(one ?? 0).split('.')[1]?.length ?? 0));
  return limitOf({ min: from, max: to }, 'h', places);
};

/** What converting leaves is far less than this and moves no whole degree. */
const NOTHING = 1e-6;
const inward = (value: number, towards: typeof Math.ceil): number =>
  towards(value + (towards === Math.ceil ? -NOTHING : NOTHING));
