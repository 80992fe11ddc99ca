import type { PartTables } from '@/lib/reference/published-tables';
import { densityOf } from '@/lib/trade/alloys/density';
import { massAndArea, type Shape } from '@/lib/trade/mass/mass-and-area';
import type { ProductForm } from '@/lib/trade/process';
import type { Source } from '@/lib/trade/source';

import { materialOf, type MaterialOf, type TypedMaterial } from './material-of';
import { readMeasure } from './measure';

export interface ComputedMass {
  /** Grams of one piece. */
  readonly massG: number;
  /** Square millimetres of one piece, edges included. */
  readonly areaMm2: number;
  /** What it was taken as: `flat stock, length × width × thickness`. */
  readonly rule: string;
  readonly density: { readonly gPerCm3: number; readonly source: Source };
}

/** Outer measures of a part in mm, null where it does not say. */
export interface PartSizes {
  readonly lengthMm: number | null;
  readonly widthMm: number | null;
  readonly heightMm: number | null;
  readonly thicknessMm: number | null;
}

/**
 * Mass and area of one piece from its stock form, sizes and the alloy's density, as an upper value: nothing is taken
 * off for cut-outs. Null where form or sizes do not say a plain shape; an extrusion, a forging and a casting never do.
 */
export function computedMass(
  tables: Pick<PartTables, 'densities'>,
  of: MaterialOf,
  sizes: PartSizes,
  condition: string,
): ComputedMass | null {
  if (of.known !== 'yes' || !of.material.form) return null;
  const taken = shapeOf(of.material.form, sizes);
  const density = densityOf(tables.densities, { alloy: of.material.alloy, condition: condition.trim() });
  if (!taken || !density.ok) return null;
  const found = massAndArea(taken.shape, density.gPerCm3);
  if (!found.ok) return null;
  return {
    massG: found.massKg * 1000,
    areaMm2: found.areaM2 * 1e6,
    rule: taken.rule,
    density: { gPerCm3: density.gPerCm3, source: density.source },
  };
}

/** A part as it is kept: its material, condition and sizes. */
export type KeptPart = TypedMaterial & PartSizes & { readonly endCondition: string };

/** The same of a part that is kept. */
export const computedMassOf = (
  tables: Pick<PartTables, 'densities' | 'material'>,
  part: KeptPart,
): ComputedMass | null => computedMass(tables, materialOf(tables.material, part), part, part.endCondition);

/** Its figures alone, as answers carry them. */
export const computedSize = (found: ComputedMass | null): { massG: number; areaMm2: number } | null =>
  found && { massG: found.massG, areaMm2: found.areaMm2 };

/** Sizes as their fields hold them; what cannot be read counts as not said. */
export const typedSizes = (typed: {
  length: string;
  width: string;
  height: string;
  thickness: string;
}): PartSizes => ({
  lengthMm: inMm(typed.length),
  widthMm: inMm(typed.width),
  heightMm: inMm(typed.height),
  thicknessMm: inMm(typed.thickness),
});

function inMm(typed: string): number | null {
  const read = readMeasure(typed, 'length', '');
  return read.ok ? read.value : null;
}

function shapeOf(
  form: ProductForm,
  { lengthMm, widthMm, heightMm, thicknessMm }: PartSizes,
): { shape: Shape; rule: string } | null {
  if (lengthMm === null || widthMm === null) return null;
  if (form === 'sheet' || form === 'plate') {
    if (thicknessMm === null) return null;
    const shape = { form, lengthMm, widthMm, thicknessMm } as const;
    return { shape, rule: 'a flat blank, length × width × thickness' };
  }
  if (form === 'bar' && heightMm !== null) {
    const shape = { form: 'plate', lengthMm, widthMm, thicknessMm: heightMm } as const;
    return { shape, rule: 'a full block, length × width × height' };
  }
  if (form === 'tube' && thicknessMm !== null && widthMm === heightMm) {
    const shape = { form, lengthMm, outsideDiameterMm: widthMm, wallMm: thicknessMm } as const;
    return { shape, rule: 'a round tube, width is its outside diameter and thickness its wall' };
  }
  return null;
}
