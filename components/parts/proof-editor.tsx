'use client';

import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { SelectField, TextField } from '@/components/ui/field';
import { REQUIREMENT_SOURCES } from '@/lib/parts/to-prove';
import { EMPTY_PROOF, type PartValues } from './part-form-values';
import { ProposeProofs } from './propose-proofs';

const SOURCE_OPTIONS = REQUIREMENT_SOURCES.map((value) => ({ value, says: value }));

/** What the papers must show for one step: a row each, ready to be put on the order. */
export function ProofEditor({ step }: { step: number }) {
  const { control, register, formState } = useFormContext<PartValues>();
  const { fields, append, remove } = useFieldArray({
    control,
    name: `route.${step}.toProve`,
    keyName: 'key',
  });
  const errors = formState.errors.route?.[step]?.toProve;
  return (
    <div
      className="mt-3 border-l-4 border-rule pl-3"
      role="group"
      aria-label={`To prove at step ${step + 1}`}
    >
      <p className="font-cond text-word">
        To be proved{' '}
        {fields.length === 0 && (
          <span className="font-normal text-quiet">nothing beyond the process itself</span>
        )}
      </p>
      {fields.map((field, at) => {
        const path = `route.${step}.toProve.${at}` as const;
        const row = errors?.[at];
        return (
          <div
            key={field.key}
            className="grid grid-cols-[2fr_2fr_1fr_1.3fr_2fr_auto] items-start gap-x-3 gap-y-2 border-b border-rule py-2 max-lg:grid-cols-[3fr_3fr_2fr] max-md:grid-cols-2"
          >
            <TextField
              label="Characteristic"
              autoComplete="off"
              error={row?.characteristic?.message}
              {...register(`${path}.characteristic`)}
            />
            <TextField
              label="Limit"
              autoComplete="off"
              error={row?.limit?.message}
              {...register(`${path}.limit`)}
            />
            <TextField
              label="Unit"
              autoComplete="off"
              error={row?.unit?.message}
              {...register(`${path}.unit`)}
            />
            <SelectField
              label="From the"
              options={SOURCE_OPTIONS}
              error={row?.source?.message}
              {...register(`${path}.source`)}
            />
            <TextField
              label="Where in it"
              autoComplete="off"
              error={row?.sourceText?.message}
              {...register(`${path}.sourceText`)}
            />
            <span className="self-end pb-2">
              <Button
                look="word"
                aria-label={`Take out what is to prove ${at + 1} of step ${step + 1}`}
                onClick={() => remove(at)}
              >
                Take out
              </Button>
            </span>
          </div>
        );
      })}
      <div className="flex flex-wrap gap-x-4 pt-2">
        <Button
          look="word"
          aria-label={`Add what step ${step + 1} must prove`}
          onClick={() => append(EMPTY_PROOF)}
        >
          Add what must be proved
        </Button>
        <ProposeProofs step={step} append={append} />
      </div>
    </div>
  );
}
