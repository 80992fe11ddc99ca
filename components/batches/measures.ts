import { fahrenheitFromCelsius } from '@/lib/trade/units/temperature';

/** How a person wants masses and areas. */
export type Units = 'inch' | 'metric';

const G_PER_LB = 453.59237;
const MM2_PER_FT2 = 92_903.04;

export const massUnit = (units: Units): string => (units === 'inch' ? 'lb' : 'kg');
export const areaUnit = (units: Units): string => (units === 'inch' ? 'ft²' : 'm²');

/** `5.7`: the unit stands in the head of the column. */
export const massText = (grams: number, units: Units): string =>
  (units === 'inch' ? grams / G_PER_LB : grams / 1000).toFixed(1);
export const areaText = (mm2: number, units: Units): string =>
  (units === 'inch' ? mm2 / MM2_PER_FT2 : mm2 / 1_000_000).toFixed(units === 'inch' ? 1 : 2);

/**
 * Of one piece, with its unit, to three figures: `1.38 lb`, `0.16 oz`; `627 g`, `1.25 kg`. Small pieces in the small
 * unit, so that nothing rounds to none.
 */
export function massWords(grams: number, units: Units): string {
  if (units === 'metric') return grams < 1000 ? `${rounded(grams)} g` : `${rounded(grams / 1000)} kg`;
  const pounds = grams / G_PER_LB;
  return pounds < 0.1 ? `${rounded(pounds * 16)} oz` : `${rounded(pounds)} lb`;
}

/** The same of an area: `6.02 ft²`, `31.4 in²`; `0.559 m²`, `203 cm²`. */
export function areaWords(mm2: number, units: Units): string {
  if (units === 'metric') return mm2 < 100_000 ? `${rounded(mm2 / 100)} cm²` : `${rounded(mm2 / 1e6)} m²`;
  const feet = mm2 / MM2_PER_FT2;
  return feet < 1 ? `${rounded(feet * 144)} in²` : `${rounded(feet)} ft²`;
}

const rounded = (value: number): string =>
  Number(value.toPrecision(3)).toLocaleString('en-US', { maximumSignificantDigits: 3 });

/** °C as a person reads it: `920`; the unit is `temperatureUnit`. */
export const temperatureText = (celsius: number, units: Units): string =>
  Math.round(units === 'inch' ? fahrenheitFromCelsius(celsius) : celsius).toString();
export const temperatureUnit = (units: Units): string => (units === 'inch' ? '°F' : '°C');

/** Of all pieces of a line: as the part says it, or else what can be computed; null where neither is known. */
export interface Known {
  value: number;
  isComputed: boolean;
}
export const massKnown = (line: Sized): Known | null => known(line.massG, line.computed?.massG, line.pieces);
export const areaKnown = (line: Sized & { areaMm2: number | null }): Known | null =>
  known(line.areaMm2, line.computed?.areaMm2, line.pieces);

interface Sized {
  massG: number | null;
  computed: { massG: number; areaMm2: number } | null;
  pieces: number;
}

function known(own: number | null, computed: number | undefined, pieces: number): Known | null {
  if (own !== null) return { value: own * pieces, isComputed: false };
  return computed === undefined ? null : { value: computed * pieces, isComputed: true };
}

/** The sum over lines, or null where one of them is not known: a sum of what happens to be known would mislead. */
export function sumOfKnown(each: readonly (Known | null)[]): Known | null {
  const all = each.filter((one) => one !== null);
  if (all.length < each.length) return null;
  return {
    value: all.reduce((sum, { value }) => sum + value, 0),
    isComputed: all.some(({ isComputed }) => isComputed),
  };
}
