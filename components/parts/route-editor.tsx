'use client';

import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { FieldError, SelectField, TextField } from '@/components/ui/field';
import { Section } from '@/components/ui/section';
import { PROCESS_WORDS, PROCESSES } from '@/lib/trade/process';
import { EMPTY_STEP, type PartValues } from './part-form-values';
import { ProofEditor } from './proof-editor';

const PROCESS_OPTIONS = PROCESSES.map((value) => ({ value, says: PROCESS_WORDS[value] }));

/** The outside steps in their order; what each must prove stands under it. */
export function RouteEditor({ usedSteps }: { usedSteps: readonly string[] }) {
  const { control, formState } = useFormContext<PartValues>();
  const { fields, append, remove, swap } = useFieldArray({ control, name: 'route', keyName: 'key' });
  const fault = formState.errors.route?.message ?? formState.errors.route?.root?.message;
  return (
    <Section title="Outside steps" note="in the order the pieces take them">
      {fault && <FieldError id="route-error" says={fault} />}
      {fields.length === 0 && (
        <Empty
          says="No step yet."
          comes="A part needs at least one outside step before lots of it can be made."
        />
      )}
      <ol>
        {fields.map((field, at) => (
          <StepFields
            key={field.key}
            at={at}
            isLast={at === fields.length - 1}
            isUsed={field.id !== undefined && usedSteps.includes(field.id)}
            onUp={() => swap(at, at - 1)}
            onDown={() => swap(at, at + 1)}
            onRemove={() => remove(at)}
          />
        ))}
      </ol>
      <div className="pt-3">
        <Button size="small" onClick={() => append(EMPTY_STEP)}>
          Add a step
        </Button>
      </div>
    </Section>
  );
}

interface StepFieldsProps {
  at: number;
  isLast: boolean;
  isUsed: boolean;
  onUp: () => void;
  onDown: () => void;
  onRemove: () => void;
}

function StepFields({ at, isLast, isUsed, onUp, onDown, onRemove }: StepFieldsProps) {
  const { register, formState } = useFormContext<PartValues>();
  const errors = formState.errors.route?.[at];
  const step = at + 1;
  return (
    <li className="border-b border-rule pt-2 pb-4">
      <fieldset className="min-w-0">
        <legend className="sr-only">Step {step}</legend>
        <div className="flex flex-wrap items-baseline gap-x-4">
          <span aria-hidden="true" className="font-cond text-sub">
            Step <span className="num">{step}</span>
          </span>
          <span className="ml-auto flex flex-wrap items-center gap-x-4">
            {at > 0 && (
              <Button look="word" aria-label={`Move step ${step} up`} onClick={onUp}>
                Up
              </Button>
            )}
            {!isLast && (
              <Button look="word" aria-label={`Move step ${step} down`} onClick={onDown}>
                Down
              </Button>
            )}
            {isUsed ? (
              <span className="text-second text-quiet">stays: lots have waited for it</span>
            ) : (
              <Button look="word" aria-label={`Take step ${step} out`} onClick={onRemove}>
                Take out
              </Button>
            )}
          </span>
        </div>
        <div className="grid grid-cols-6 gap-x-4 gap-y-3 pt-1.5 max-md:grid-cols-2">
          <SelectField
            className="col-span-2"
            label="Process"
            empty="Choose"
            options={PROCESS_OPTIONS}
            error={errors?.process?.message}
            {...register(`route.${at}.process`)}
          />
          <TextField
            className="col-span-2"
            label="Specification"
            mono
            autoComplete="off"
            error={errors?.specification?.message}
            {...register(`route.${at}.specification`)}
          />
          <TextField
            label="Its revision"
            mono
            autoComplete="off"
            error={errors?.specificationRevision?.message}
            {...register(`route.${at}.specificationRevision`)}
          />
          <TextField
            label="Class, type, grade"
            autoComplete="off"
            error={errors?.classType?.message}
            {...register(`route.${at}.classType`)}
          />
          <TextField
            label="From condition"
            mono
            autoComplete="off"
            error={errors?.conditionBefore?.message}
            {...register(`route.${at}.conditionBefore`)}
          />
          <TextField
            label="To condition"
            mono
            autoComplete="off"
            error={errors?.targetCondition?.message}
            {...register(`route.${at}.targetCondition`)}
          />
          <TextField
            className="col-span-4 max-md:col-span-2"
            label="Note to the processor"
            autoComplete="off"
            error={errors?.note?.message}
            {...register(`route.${at}.note`)}
          />
        </div>
        <ProofEditor step={at} />
      </fieldset>
    </li>
  );
}
