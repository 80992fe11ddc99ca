'use client';

import { type ComponentProps, useId, useRef } from 'react';
import { Field, type FieldWords, fieldAttributes } from './field';

export interface PieceCounterProps
  extends FieldWords, Omit<ComponentProps<'input'>, 'className' | 'id' | 'ref'> {
  min?: number;
  max?: number;
  ref?: ComponentProps<'input'>['ref'];
}

/** Minus, number, plus: for gloves and a wet screen. Works with `{...register('good')}` and with a plain form. */
export function PieceCounter({
  label,
  hint,
  error,
  frozen,
  className,
  min = 0,
  max,
  ref,
  ...input
}: PieceCounterProps) {
  const id = useId();
  const own = useRef<HTMLInputElement | null>(null);
  const words = { label, hint, error, frozen };

  const hold = (element: HTMLInputElement | null) => {
    own.current = element;
    if (typeof ref === 'function') ref(element);
    else if (ref) ref.current = element;
  };
  const step = (by: number) =>
    own.current && setAsIfTyped(own.current, within(own.current.value, by, { min, max }));

  return (
    <Field id={id} {...words} {...(className ? { className } : {})}>
      <span className={`flex h-12 border-heavy bg-field ${error ? 'border-held-ink' : 'border-ink'}`}>
        <StepButton
          says="One less"
          about={`${id}-label`}
          sign="−"
          onClick={() => step(-1)}
          disabled={Boolean(frozen)}
        />
        <input
          inputMode="numeric"
          autoComplete="off"
          {...input}
          {...fieldAttributes(id, words)}
          ref={hold}
          readOnly={input.readOnly ?? Boolean(frozen)}
          onFocus={(event) => event.currentTarget.select()}
          className="w-full min-w-14 flex-1 border-x-heavy border-ink bg-transparent text-center font-mono text-[1.1875rem] font-semibold"
        />
        <StepButton
          says="One more"
          about={`${id}-label`}
          sign="+"
          onClick={() => step(1)}
          disabled={Boolean(frozen)}
        />
      </span>
    </Field>
  );
}

interface StepButtonProps {
  says: string;
  /** The label of the count, so that two counters on a page are told apart. */
  about: string;
  sign: string;
  onClick: () => void;
  disabled: boolean;
}

function StepButton({ says, about, sign, ...button }: StepButtonProps) {
  return (
    <button
      type="button"
      aria-label={says}
      aria-describedby={about}
      {...button}
      className="relative flex-none basis-12 text-[1.375rem] leading-none hover:bg-bench focus-visible:z-10 active:bg-deep disabled:text-faint"
    >
      {sign}
    </button>
  );
}

function within(typed: string, by: number, { min, max }: { min: number; max: number | undefined }): number {
  const now = Number.parseInt(typed, 10);
  const next = Number.isNaN(now) ? min : now + by;
  return Math.max(min, max === undefined ? next : Math.min(max, next));
}

/** React and the form listen for typing; writing the value directly would pass them by. */
function setAsIfTyped(input: HTMLInputElement, value: number) {
  const setter = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set;
  setter?.call(input, String(value));
  input.dispatchEvent(new Event('input', { bubbles: true }));
}
