import { inchesFromMm, mmFromInches } from '@/lib/trade/units/length';
import { celsiusFromFahrenheit, fahrenheitFromCelsius } from '@/lib/trade/units/temperature';

/** What a field of the bench measures; a `number` has no unit that changes, a `word` is chosen from a list. */
export type BenchKind = 'length' | 'temperature' | 'number' | 'word';
export type BenchUnits = 'inch' | 'metric';

const WORDS = { inch: { length: 'in', temperature: '°F' }, metric: { length: 'mm', temperature: '°C' } };
/** How exactly a measure is written again after its unit was changed. */
const PLACES = { inch: { length: 3, temperature: 0 }, metric: { length: 3, temperature: 0 } };

export const unitWord = (kind: BenchKind, units: BenchUnits): string | undefined =>
  kind === 'length' || kind === 'temperature' ? WORDS[units][kind] : undefined;

/** A measure as typed, in mm or °C; null where it is no number. Fractions of an inch may be typed: `1 1/4`. */
export function readBench(typed: string, kind: BenchKind, units: BenchUnits): number | null {
  const value = readNumber(typed);
  if (value === null || units === 'metric') return value;
  if (kind === 'length') return mmFromInches(value);
  return kind === 'temperature' ? celsiusFromFahrenheit(value) : value;
}

/** A measure in mm or °C as it is written in the units chosen, without its unit. */
export function benchText(value: number, kind: BenchKind, units: BenchUnits): string {
  if (kind !== 'length' && kind !== 'temperature') return String(value);
  const shown = units === 'metric' ? value : inUnit(value, kind);
  return String(Number(shown.toFixed(PLACES[units][kind])));
}

const inUnit = (value: number, kind: 'length' | 'temperature'): number =>
  kind === 'length' ? inchesFromMm(value) : fahrenheitFromCelsius(value);

function readNumber(typed: string): number | null {
  const text = typed.trim().replace('−', '-');
  const [, whole, above, below] = /^(?:(\d+) )?(\d+)\/(\d+)$/.exec(text) ?? [];
  if (above !== undefined)
    return Number(below) === 0 ? null : Number(whole ?? 0) + Number(above) / Number(below);
  return /^-?(\d+\.?\d*|\.\d+)$/.test(text) ? Number(text) : null;
}
