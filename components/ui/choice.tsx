import { type ComponentProps, type ReactNode, useId } from 'react';
import { FieldError, type FieldWords } from './field';

type Tick = Omit<ComponentProps<'input'>, 'className' | 'id' | 'type'>;

export interface CheckboxProps extends Tick {
  says: ReactNode;
  /** A second, quieter part of the sentence. */
  note?: ReactNode;
  error?: string | undefined;
}

export function Checkbox({ says, note, error, ...input }: CheckboxProps) {
  const id = useId();
  return (
    <span className="block">
      <ChoiceLine
        type="checkbox"
        id={id}
        says={says}
        note={note}
        errorId={error && `${id}-error`}
        {...input}
      />
      {error && <FieldError id={`${id}-error`} says={error} />}
    </span>
  );
}

export interface ChoiceOption {
  value: string;
  says: ReactNode;
  note?: ReactNode;
  disabled?: boolean;
}

export interface ChoiceGroupProps extends Omit<FieldWords, 'frozen'>, Tick {
  options: readonly ChoiceOption[];
  /** Values ticked from the start, where the group is not steered by a form. */
  chosen?: readonly string[];
}

/** Several of these: give it `{...register('covers')}`. */
export function CheckboxGroup(props: ChoiceGroupProps) {
  return <Group type="checkbox" {...props} />;
}

/** One of these. */
export function RadioGroup(props: ChoiceGroupProps) {
  return <Group type="radio" {...props} />;
}

function Group({
  type,
  label,
  hint,
  error,
  className = '',
  options,
  chosen,
  ...input
}: ChoiceGroupProps & ChoiceType) {
  const id = useId();
  const name = input.name ?? id;
  return (
    <fieldset
      className={`min-w-0 ${className}`}
      aria-describedby={error ? `${id}-error` : undefined}
      {...(type === 'radio' ? { role: 'radiogroup' } : {})}
    >
      <legend className="font-cond text-word leading-[1.125rem]">{label}</legend>
      {hint && <span className="block text-source text-quiet">{hint}</span>}
      {options.map((option) => (
        <ChoiceLine
          key={option.value}
          {...input}
          type={type}
          name={name}
          id={`${id}-${option.value}`}
          value={option.value}
          says={option.says}
          note={option.note}
          disabled={option.disabled ?? input.disabled}
          errorId={error && `${id}-error`}
          {...(chosen ? { defaultChecked: chosen.includes(option.value) } : {})}
        />
      ))}
      {error && <FieldError id={`${id}-error`} says={error} />}
    </fieldset>
  );
}

interface ChoiceType {
  type: 'checkbox' | 'radio';
}

interface ChoiceLineProps extends ChoiceType, Tick {
  id: string;
  says: ReactNode;
  note?: ReactNode;
  errorId: string | undefined;
}

function ChoiceLine({ says, note, errorId, ...input }: ChoiceLineProps) {
  return (
    <label htmlFor={input.id} className="flex items-start gap-2 py-[5px] touch:min-h-12 touch:items-center">
      <input {...input} className="lw-check mt-[1px] touch:mt-0" aria-describedby={errorId} />
      <span>
        {says}
        {note && <span className="text-quiet"> {note}</span>}
      </span>
    </label>
  );
}
