import { inchesFromMm, mmFromInches } from '@/lib/trade/units/length';
import { ksiFromMpa, mpaFromKsi } from '@/lib/trade/units/stress';
import { celsiusFromFahrenheit, fahrenheitFromCelsius } from '@/lib/trade/units/temperature';

/** What has a unit that changes; `fine` is a length of coatings and limits, with more places. */
const MEASURES = ['length', 'fine', 'temperature', 'stress'] as const;
export type MeasureKind = (typeof MEASURES)[number];
/** What a field of the bench measures; a `number` has no unit that changes, a `word` is typed or chosen. */
export type BenchKind = MeasureKind | 'number' | 'word';
export type BenchUnits = 'inch' | 'metric';

const WORDS = {
  inch: { length: 'in', fine: 'in', temperature: '°F', stress: 'ksi' },
  metric: { length: 'mm', fine: 'mm', temperature: '°C', stress: 'MPa' },
};
/** How exactly a measure is written again after its unit was changed. */
const PLACES = {
  inch: { length: 3, fine: 5, temperature: 0, stress: 0 },
  metric: { length: 3, fine: 4, temperature: 0, stress: 0 },
};

const isMeasure = (kind: BenchKind): kind is MeasureKind => MEASURES.some((one) => one === kind);

export const unitWord = (kind: BenchKind, units: BenchUnits): string | undefined =>
  isMeasure(kind) ? WORDS[units][kind] : undefined;

/** A measure as typed, in mm, °C or MPa; null where it is no number. Fractions of an inch may be typed: `1 1/4`. */
export function readBench(typed: string, kind: BenchKind, units: BenchUnits): number | null {
  const value = readNumber(typed);
  if (value === null || units === 'metric' || !isMeasure(kind)) return value;
  return FROM_INCH[kind](value);
}

/** A measure in mm, °C or MPa as it is written in the units chosen, without its unit. */
export function benchText(value: number, kind: BenchKind, units: BenchUnits): string {
  if (!isMeasure(kind)) return String(value);
  return String(Number(inUnits(value, kind, units).toFixed(PLACES[units][kind])));
}

/** A measure in mm, °C or MPa as a number in the units chosen: where it stands on an axis. */
export const inUnits = (value: number, kind: MeasureKind, units: BenchUnits): number =>
  units === 'metric' ? value : TO_INCH[kind](value);

const FROM_INCH: Record<MeasureKind, (value: number) => number> = {
  length: mmFromInches,
  fine: mmFromInches,
  temperature: celsiusFromFahrenheit,
  stress: mpaFromKsi,
};
const TO_INCH: Record<MeasureKind, (value: number) => number> = {
  length: inchesFromMm,
  fine: inchesFromMm,
  temperature: fahrenheitFromCelsius,
  stress: ksiFromMpa,
};

function readNumber(typed: string): number | null {
  const text = typed.trim().replace('−', '-');
  const [, whole, above, below] = /^(?:(\d+) )?(\d+)\/(\d+)$/.exec(text) ?? [];
  if (above !== undefined)
    return Number(below) === 0 ? null : Number(whole ?? 0) + Number(above) / Number(below);
  return /^-?(\d+\.?\d*|\.\d+)$/.test(text) ? Number(text) : null;
}
