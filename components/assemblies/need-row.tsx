'use client';
import { useDeferredValue, useId } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';

import { useLazyRead } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { NumberInput, TextField } from '@/components/ui/field';
import { listParts } from '@/lib/parts/contract';

import type { AssemblyFieldsIn, AssemblyFieldsOut } from './assembly-fields';

interface NeedRowProps {
  at: number;
  /** What is fitted of it already; the part cannot be taken out then. */
  fitted: number;
  isLast: boolean;
  onRemove: () => void;
  /** Typing in the last row makes a new one. */
  onTyped: () => void;
}

/** One part of the list: its number with suggestions as one types, and how many. */
export function NeedRow({ at, fitted, isLast, onRemove, onTyped }: NeedRowProps) {
  const { register, control, formState } = useFormContext<AssemblyFieldsIn, unknown, AssemblyFieldsOut>();
  const listId = useId();
  const typed = useWatch({ control, name: `needs.${at}.partNumber` }).trim();
  const looked = useDeferredValue(typed);
  const { data } = useLazyRead(listParts, { text: looked, limit: 8 }, { enabled: looked.length >= 2 });
  const known = data?.rows.find((part) => part.number === typed);
  const errors = formState.errors.needs?.[at];
  const hint =
    known?.name ??
    (data && typed.length >= 2 && data.rows.length === 0 ? 'No part has this number yet.' : undefined);
  const name = register(`needs.${at}.partNumber`);
  return (
    <li className="grid grid-cols-[minmax(0,1fr)_6.5rem] items-start gap-x-3 gap-y-1 border-b border-rule py-2 sm:grid-cols-[minmax(0,22rem)_8rem_1fr]">
      <TextField
        {...name}
        label={`Part ${at + 1}`}
        mono
        list={listId}
        autoComplete="off"
        hint={hint}
        error={errors?.partNumber?.message}
        onChange={(event) => {
          if (isLast && event.currentTarget.value !== '') onTyped();
          return name.onChange(event);
        }}
      />
      <datalist id={listId}>
        {data?.rows.map((part) => (
          <option key={part.id} value={part.number}>
            {part.name}
          </option>
        ))}
      </datalist>
      <NumberInput
        label="Pieces"
        inputMode="numeric"
        error={errors?.pieces?.message}
        hint={fitted > 0 ? `${fitted} fitted` : undefined}
        {...register(`needs.${at}.pieces`)}
      />
      <div className="max-sm:col-span-2 sm:pt-7">
        {!isLast && (
          <Button look="word" onClick={onRemove} notNow={fitted > 0 && `${fitted} are fitted: it stays.`}>
            Take out
            <span className="sr-only"> part {at + 1}</span>
          </Button>
        )}
      </div>
    </li>
  );
}
