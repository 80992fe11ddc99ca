'use client';

import { useFormContext } from 'react-hook-form';
import { SourceLine } from '@/components/reference/source-line';
import { Button } from '@/components/ui/button';
import { Edge } from '@/components/ui/edge';
import type { PartValues } from './part-form-values';
import { useTypedMaterial } from './use-typed-part';

/** A former name of an alloy: what it is called today is proposed, and somebody decides. */
export function AlloyAdvice() {
  const { setValue } = useFormContext<PartValues>();
  const material = useTypedMaterial();
  return (
    <div aria-live="polite">
      {material.known === 'former_name' && (
        <Edge level="warn">
          This is a former name
          {material.formerly.present.length > 0 && `, today ${material.formerly.present.join(' or ')}`}
          {material.formerly.clad && ', clad'}
          {material.formerly.present.length === 0 &&
            material.formerly.chiefElement &&
            `; its number says that the chief alloying element is ${material.formerly.chiefElement}`}
          . Whether today’s material may stand in for it is an engineering decision.
          <span className="flex flex-wrap gap-x-4 pt-1">
            {material.formerly.present.map((name) => (
              <Button
                key={name}
                look="word"
                onClick={() => {
                  setValue('alloy', name, { shouldDirty: true, shouldValidate: true });
                  if (material.formerly.clad) setValue('clad', true, { shouldDirty: true });
                }}
              >
                Write {name}
              </Button>
            ))}
          </span>
          <SourceLine source={material.formerly.source} readFrom={material.formerly.readFrom} />
        </Edge>
      )}
    </div>
  );
}
