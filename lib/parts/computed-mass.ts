import type { PartTables } from '@/lib/reference/published-tables';
import { densityOf } from '@/lib/trade/alloys/density';
import { massAndArea, type Shape } from '@/lib/trade/mass/mass-and-area';
import type { ProductForm } from '@/lib/trade/process';
import type { Source } from '@/lib/trade/source';

import type { MaterialOf } from './material-of';
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

interface TypedSizes {
  readonly length: string;
  readonly width: string;
  readonly height: string;
  readonly thickness: string;
}

/**
 * Mass and area of one piece from its stock form, sizes and the alloy's density, as an upper value: nothing is taken
 * off for cut-outs. Null where form or sizes do not say a plain shape; an extrusion, a forging and a casting never do.
 */
export function computedMass(
  tables: Pick<PartTables, 'densities'>,
  of: MaterialOf,
  typed: TypedSizes,
  condition: string,
): ComputedMass | null {
  if (of.known !== 'yes' || !of.material.form) return null;
  const taken = shapeOf(of.material.form, typed);
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

function shapeOf(form: ProductForm, typed: TypedSizes): { shape: Shape; rule: string } | null {
  const [lengthMm, widthMm, heightMm, thicknessMm] = [
    typed.length,
    typed.width,
    typed.height,
    typed.thickness,
  ].map(inMm);
  if (lengthMm === undefined || widthMm === undefined) return null;
  if (form === 'sheet' || form === 'plate') {
    if (thicknessMm === undefined) return null;
    const shape = { form, lengthMm, widthMm, thicknessMm } as const;
    return { shape, rule: 'a flat blank, length × width × thickness' };
  }
  if (form === 'bar' && heightMm !== undefined) {
    const shape = { form: 'plate', lengthMm, widthMm, thicknessMm: heightMm } as const;
    return { shape, rule: 'a full block, length × width × height' };
  }
  if (form === 'tube' && thicknessMm !== undefined && widthMm === heightMm) {
    const shape = { form, lengthMm, outsideDiameterMm: widthMm, wallMm: thicknessMm } as const;
    return { shape, rule: 'a round tube, width is its outside diameter and thickness its wall' };
  }
  return null;
}

function inMm(typed: string): number | undefined {
  const read = readMeasure(typed, 'length', '');
  return read.ok ? read.value : undefined;
}
