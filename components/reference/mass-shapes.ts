import type { Shape } from '@/lib/trade/mass/mass-and-area';

export type MassForm = Shape['form'];
export const FORMS: Record<MassForm, string> = {
  sheet: 'sheet',
  plate: 'plate',
  round_bar: 'round bar',
  square_bar: 'square bar',
  hex_bar: 'hexagon bar',
  tube: 'tube',
};

/** What the second and third measure of a shape are; the first is its length. */
export const MEASURES: Record<MassForm, readonly [second: string, third: string | null]> = {
  sheet: ['Width', 'Thickness'],
  plate: ['Width', 'Thickness'],
  round_bar: ['Diameter', null],
  square_bar: ['Across flats', null],
  hex_bar: ['Across flats', null],
  tube: ['Outside', 'Wall'],
};

/** The shape of the measures typed, in mm; null while one that it needs is missing. */
export function shapeOf(
  form: MassForm,
  [lengthMm, second, third]: readonly [number | null, number | null, number | null],
): Shape | null {
  if (lengthMm === null || second === null) return null;
  switch (form) {
    case 'sheet':
    case 'plate':
      return third === null ? null : { form, lengthMm, widthMm: second, thicknessMm: third };
    case 'round_bar':
      return { form, lengthMm, diameterMm: second };
    case 'square_bar':
    case 'hex_bar':
      return { form, lengthMm, acrossFlatsMm: second };
    case 'tube':
      return third === null ? null : { form, lengthMm, outsideDiameterMm: second, wallMm: third };
  }
}
