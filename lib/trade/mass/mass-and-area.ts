import type { Source } from '../source';
import type { Verdict } from '../verdict';

/** Plain stock shapes with their measures in millimetres; a part is taken as the stock it is cut from. */
export type Shape =
  | { form: 'sheet' | 'plate'; lengthMm: number; widthMm: number; thicknessMm: number }
  | { form: 'round_bar'; lengthMm: number; diameterMm: number }
  | { form: 'square_bar' | 'hex_bar'; lengthMm: number; acrossFlatsMm: number }
  | { form: 'tube'; lengthMm: number; outsideDiameterMm: number; wallMm: number };

export interface MassAndArea {
  readonly massKg: number;
  /** The whole wetted surface, edges, ends and a tube's bore included: what a bath sees. */
  readonly areaM2: number;
  readonly volumeMm3: number;
}

const GEOMETRY: Source = { document: 'Geometry of the form', confidence: 'computed', certainty: 'high' };

/**
 * Mass and surface of a plain shape. Holes, radii and cut-outs are not taken off, so both are upper values.
 *
 * @param densityGPerCm3 of the material, over 0, from the table of densities.
 * @returns refused as `size_not_positive`, `density_not_positive`, or `wall_closes_bore` where twice the wall is the
 *   outside diameter or more.
 * @example a 2024 sheet of 1000 × 500 × 2 mm at 2.78 g/cm³: 2.78 kg and 1.006 m².
 */
export function massAndArea(
  shape: Shape,
  densityGPerCm3: number,
): Verdict<MassAndArea, 'size_not_positive' | 'density_not_positive' | 'wall_closes_bore'> {
  if (!(densityGPerCm3 > 0 && densityGPerCm3 < Infinity))
    return { ok: false, reason: 'density_not_positive' };
  const { form: _, ...sizes } = shape;
  if (!Object.values(sizes).every((size) => size > 0 && size < Infinity))
    return { ok: false, reason: 'size_not_positive' };
  if (shape.form === 'tube' && 2 * shape.wallMm >= shape.outsideDiameterMm)
    return { ok: false, reason: 'wall_closes_bore' };
  const { sectionMm2, perimeterMm } = sectionOf(shape);
  const volumeMm3 = sectionMm2 * shape.lengthMm;
  return {
    ok: true,
    massKg: volumeMm3 * densityGPerCm3 * KG_PER_G_PER_CM3_AND_MM3,
    areaM2: (perimeterMm * shape.lengthMm + 2 * sectionMm2) * M2_PER_MM2,
    volumeMm3,
    source: GEOMETRY,
  };
}

const KG_PER_G_PER_CM3_AND_MM3 = 1e-6;
const M2_PER_MM2 = 1e-6;

/** The cut across the length: its area, and its outline with that of a bore. */
function sectionOf(shape: Shape): { sectionMm2: number; perimeterMm: number } {
  switch (shape.form) {
    case 'sheet':
    case 'plate':
      return {
        sectionMm2: shape.widthMm * shape.thicknessMm,
        perimeterMm: 2 * (shape.widthMm + shape.thicknessMm),
      };
    case 'round_bar':
      return {
        sectionMm2: (Math.PI / 4) * shape.diameterMm ** 2,
        perimeterMm: Math.PI * shape.diameterMm,
      };
    case 'square_bar':
      return { sectionMm2: shape.acrossFlatsMm ** 2, perimeterMm: 4 * shape.acrossFlatsMm };
    case 'hex_bar':
      return {
        sectionMm2: (Math.sqrt(3) / 2) * shape.acrossFlatsMm ** 2,
        perimeterMm: 2 * Math.sqrt(3) * shape.acrossFlatsMm,
      };
    case 'tube': {
      const boreMm = shape.outsideDiameterMm - 2 * shape.wallMm;
      return {
        sectionMm2: (Math.PI / 4) * (shape.outsideDiameterMm ** 2 - boreMm ** 2),
        perimeterMm: Math.PI * (shape.outsideDiameterMm + boreMm),
      };
    }
  }
}
