'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import { computedMass } from '@/lib/parts/computed-mass';
import { inBaseUnit } from '@/lib/parts/measure';
import { PART_TABLES } from '@/lib/reference/published-tables';
import { sourceWords } from '@/lib/batches/source-words';
import type { PartValues } from './part-form-values';
import { useTypedMaterial } from './use-typed-part';

/** Mass and area from the sizes, where nobody typed them: shown as computed, never kept. */
export function ComputedSize() {
  const { control } = useFormContext<PartValues>();
  const material = useTypedMaterial();
  const [length = '', width = '', height = '', thickness = '', mass, area, condition] = useWatch({
    control,
    name: ['length', 'width', 'height', 'thickness', 'mass', 'area', 'endCondition'],
  });
  const found = computedMass(PART_TABLES, material, { length, width, height, thickness }, condition);
  if (!found || (mass && area)) return null;
  return (
    <p className="pb-2 text-second" aria-live="polite">
      Computed: {!mass && <span className="num">{inBaseUnit(found.massG, 'mass')}</span>}
      {!mass && !area && ', '}
      {!area && <span className="num">{inBaseUnit(found.areaMm2, 'area')}</span>}
      <span className="block text-source text-quiet">
        As {found.rule}; nothing taken off, so the most it can be. Density {found.density.gPerCm3.toFixed(3)}{' '}
        g/cm³: {sourceWords(found.density.source)}. It is shown and not kept: enter what you weigh.
      </span>
    </p>
  );
}
