'use client';

import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { FieldError, SelectField, TextField } from '@/components/ui/field';
import { Section } from '@/components/ui/section';
import { PROCESS_WORDS, PROCESSES } from '@/lib/trade/process';
import { EMPTY_STEP, type PartValues } from './part-form-values';
import { ConditionAdvice, ConditionList } from './condition-advice';
import { OrderingEditor } from './ordering-editor';
import { ProofEditor } from './proof-editor';
import { RouteFindings } from './route-findings';
import { SpecificationAdvice } from './specification-advice';
import { conditionBefore, useTypedRoute } from './use-typed-part';

const PROCESS_OPTIONS = PROCESSES.map((value) => ({ value, says: PROCESS_WORDS[value] }));

/** The outside steps in their order; what each must prove stands under it. */
export function RouteEditor({ usedSteps }: { usedSteps: readonly string[] }) {
  const { control, formState } = useFormContext<PartValues>();
  const { fields, append, remove, swap, replace } = useFieldArray({ control, name: 'route', keyName: 'key' });
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
      <RouteFindings onTake={replace} />
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
  const { register, formState, control } = useFormContext<PartValues>();
  const made = useWatch({ control, name: 'madeCondition' });
  const route = useTypedRoute();
  const before = conditionBefore(route, at, made);
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
        <div className="grid grid-cols-6 gap-x-4 gap-y-3 pt-1.5 max-lg:grid-cols-4 max-md:grid-cols-2">
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
            list="conditions-made"
            {...register(`route.${at}.conditionBefore`)}
          />
          <TextField
            label="To condition"
            mono
            autoComplete="off"
            error={errors?.targetCondition?.message}
            list={`conditions-after-${at}`}
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
        <ConditionList id={`conditions-after-${at}`} after={before} />
        <SpecificationAdvice at={at} />
        {changesCondition(route[at]?.process) && (
          <ConditionAdvice from={before} to={route[at]?.targetCondition ?? ''} maker="step" />
        )}
        <OrderingEditor at={at} />
        <ProofEditor step={at} />
      </fieldset>
    </li>
  );
}

/** Only a heat treatment makes a condition; another step just says in which one the pieces are. */
const changesCondition = (process: string | undefined): boolean =>
  process !== undefined && HEAT_TREATMENTS.some((one) => one === process);
const HEAT_TREATMENTS = ['solution_heat_treat_and_age', 'solution_heat_treat', 'artificial_age', 'anneal'];
