'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import { areaWords, massWords } from '@/components/batches/measures';
import { useTables } from '@/components/reference/use-tables';
import { useMe } from '@/components/session/use-me';
import { computedMass, typedSizes } from '@/lib/parts/computed-mass';
import { sourceWords } from '@/lib/batches/source-words';
import type { PartValues } from './part-form-values';
import { useTypedMaterial } from './use-typed-part';

/** Mass and area from the sizes, where nobody typed them: shown as computed, never kept. */
export function ComputedSize() {
  const { control } = useFormContext<PartValues>();
  const tables = useTables();
  const material = useTypedMaterial();
  const units = useMe()?.units ?? 'inch';
  const [length = '', width = '', height = '', thickness = '', mass, area, condition] = useWatch({
    control,
    name: ['length', 'width', 'height', 'thickness', 'mass', 'area', 'endCondition'],
  });
  const found = computedMass(tables, material, typedSizes({ length, width, height, thickness }), condition);
  if (!found || (mass && area)) return null;
  return (
    <p className="pb-2 text-second" aria-live="polite">
      Computed, about {!mass && <span className="num">{massWords(found.massG, units)}</span>}
      {!mass && !area && ' and '}
      {!area && <span className="num">{areaWords(found.areaMm2, units)}</span>}
      <span className="block text-source text-quiet">
        As {found.rule}; nothing taken off, so the most it can be. Density {found.density.gPerCm3.toFixed(3)}{' '}
        g/cm³: {sourceWords(found.density.source)}. It is shown and not kept: enter what you weigh.
      </span>
    </p>
  );
}
