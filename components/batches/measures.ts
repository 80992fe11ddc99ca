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

/** The sum over lines, or null where one of them does not say: a sum of what happens to be known would mislead. */
export function sumOfKnown(each: readonly (number | null)[]): number | null {
  return each.reduce<number | null>((sum, one) => (sum === null || one === null ? null : sum + one), 0);
}
