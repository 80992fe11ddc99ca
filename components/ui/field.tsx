import { type ComponentProps, type ReactNode, useId } from 'react';
import { VerdictMark } from './marks';

export interface FieldWords {
  label: ReactNode;
  /** Said under the field while nothing is wrong. */
  hint?: ReactNode;
  /** What is, then what to do: "The lot has 41. Enter 41 or less." */
  error?: string | undefined;
  /** Why it cannot be changed: "frozen at dispatch". */
  frozen?: string | undefined;
  className?: string;
}

interface FieldProps extends FieldWords {
  id: string;
  children: ReactNode;
}

/** Label above, what one types, what it means or what is wrong with it below. */
export function Field({ id, label, hint, error, frozen, className = '', children }: FieldProps) {
  const below = frozen ?? hint;
  return (
    <div className={`flex min-w-0 flex-col gap-1.5 ${className}`}>
      <label id={`${id}-label`} htmlFor={id} className="font-cond text-word leading-[1.125rem]">
        {label}
      </label>
      {children}
      {error && <FieldError id={`${id}-error`} says={error} />}
      {!error && below && (
        <span id={`${id}-hint`} className="text-source text-quiet">
          {below}
        </span>
      )}
    </div>
  );
}

export function FieldError({ id, says }: { id: string; says: string }) {
  return (
    <span id={id} className="flex items-start gap-1.5 text-row font-medium text-held-ink">
      <VerdictMark verdict="does_not_meet" size={13} className="mt-[3px]" />
      {says}
    </span>
  );
}

/** What ties an input to its label, its hint and its fault. */
export function fieldAttributes(
  id: string,
  { error, hint, frozen }: Pick<FieldWords, 'error' | 'hint' | 'frozen'>,
) {
  const below = error ? `${id}-error` : `${id}-hint`;
  return {
    id,
    'aria-invalid': error ? true : undefined,
    'aria-describedby': error || hint || frozen ? below : undefined,
  };
}

type InputProps = Omit<ComponentProps<'input'>, 'className' | 'id'>;

export interface TextFieldProps extends FieldWords, InputProps {
  /** Stands inside at the right, as on a form: in, °F, USD. */
  unit?: ReactNode;
  /** Numbers and codes are set in mono. */
  mono?: boolean;
  id?: string;
}

export function TextField({
  label,
  hint,
  error,
  frozen,
  className,
  unit,
  mono = false,
  id,
  ...input
}: TextFieldProps) {
  const made = useId();
  const fieldId = id ?? made;
  const words = { label, hint, error, frozen };
  return (
    <Field id={fieldId} {...words} {...(className ? { className } : {})}>
      <span className="relative block">
        <input
          type="text"
          {...input}
          {...fieldAttributes(fieldId, words)}
          readOnly={input.readOnly ?? Boolean(frozen)}
          className={`lw-input ${mono ? 'lw-input-number' : ''} ${unit ? 'pr-14' : ''}`}
        />
        {unit && (
          <span className="pointer-events-none absolute inset-y-0 right-2.5 flex items-center font-cond text-caption text-faint">
            {unit}
          </span>
        )}
      </span>
    </Field>
  );
}

/** Kept as it was typed; what it means is settled by `numberField`. */
export function NumberInput(props: TextFieldProps) {
  return <TextField inputMode="decimal" autoComplete="off" mono {...props} />;
}

/** The day picker of the device; days travel as `2026-04-16`. */
export function DateField(props: TextFieldProps) {
  return <TextField {...props} type="date" />;
}

export interface SelectFieldProps extends FieldWords, Omit<ComponentProps<'select'>, 'className' | 'id'> {
  /** The first line while nothing is chosen: "Choose a processor". */
  empty?: string;
  options: readonly SelectOption[];
  id?: string;
}

export interface SelectOption {
  value: string;
  says: string;
  disabled?: boolean;
}

export function SelectField({
  label,
  hint,
  error,
  frozen,
  className,
  empty,
  options,
  id,
  ...select
}: SelectFieldProps) {
  const made = useId();
  const fieldId = id ?? made;
  const words = { label, hint, error, frozen };
  return (
    <Field id={fieldId} {...words} {...(className ? { className } : {})}>
      <select
        {...select}
        {...fieldAttributes(fieldId, words)}
        disabled={select.disabled ?? Boolean(frozen)}
        className="lw-input"
      >
        {empty !== undefined && <option value="">{empty}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value} disabled={option.disabled}>
            {option.says}
          </option>
        ))}
      </select>
    </Field>
  );
}

export interface TextAreaProps extends FieldWords, Omit<ComponentProps<'textarea'>, 'className' | 'id'> {
  id?: string;
}

export function TextArea({ label, hint, error, frozen, className, id, rows = 3, ...area }: TextAreaProps) {
  const made = useId();
  const fieldId = id ?? made;
  const words = { label, hint, error, frozen };
  return (
    <Field id={fieldId} {...words} {...(className ? { className } : {})}>
      <textarea
        rows={rows}
        {...area}
        {...fieldAttributes(fieldId, words)}
        readOnly={area.readOnly ?? Boolean(frozen)}
        className="lw-input"
      />
    </Field>
  );
}
