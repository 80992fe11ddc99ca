'use client';
import { useFormContext, useWatch } from 'react-hook-form';

import { Button } from '@/components/ui/button';
import { NumberInput, SelectField, TextField } from '@/components/ui/field';
import type { InvoiceDetail } from '@/lib/invoices/contract';
import { parseAmount } from '@/lib/money';

import { typedAmount } from './amount-field';
import { kindOf, orderLineWords, OTHER_PIECES, whatOf, type EnterIn, type EnterOut } from './enter-values';
import { LINE_KIND_WORDS } from './invoice-words';
import { fieldId } from './use-invoice-spots';

interface EnterLineProps {
  at: number;
  invoice: InvoiceDetail;
  onRemove?: (() => void) | undefined;
}

/** One line as it stands on the paper. */
export function EnterLine({ at, invoice, onRemove }: EnterLineProps) {
  const form = useFormContext<EnterIn, unknown, EnterOut>();
  const what = useWatch({ control: form.control, name: `lines.${at}.what` });
  const errors = form.formState.errors.lines?.[at];
  const isPieces = kindOf(what) === 'pieces';
  // What was typed as the amount itself stays; until then it follows pieces and price.
  const follow = () => {
    if (form.getFieldState(`lines.${at}.amountMinor`).isDirty) return;
    const { pieces, unitPriceMinor } = form.getValues(`lines.${at}`);
    const each = parseAmount(unitPriceMinor);
    const count = Number(pieces);
    if (each !== null && Number.isInteger(count) && count >= 0)
      form.setValue(`lines.${at}.amountMinor`, typedAmount(count * each), { shouldDirty: false });
  };
  return (
    <fieldset className="border-b border-rule py-3">
      <legend className="sr-only">Line {at + 1}</legend>
      <div className="grid grid-cols-2 items-start gap-x-3 gap-y-2 sm:grid-cols-[minmax(0,1fr)_5rem_6rem_7rem]">
        <SelectField
          className="col-span-2 sm:col-span-1"
          label={`Line ${at + 1} is`}
          options={optionsOf(invoice)}
          id={fieldId(`lines.${at}.what`)}
          {...form.register(`lines.${at}.what`)}
        />
        {isPieces && (
          <NumberInput
            label="Pieces"
            inputMode="numeric"
            error={errors?.pieces?.message}
            id={fieldId(`lines.${at}.pieces`)}
            {...form.register(`lines.${at}.pieces`, { onChange: follow })}
          />
        )}
        {isPieces && (
          <NumberInput
            label="Each"
            error={errors?.unitPriceMinor?.message}
            id={fieldId(`lines.${at}.unitPriceMinor`)}
            {...form.register(`lines.${at}.unitPriceMinor`, { onChange: follow })}
          />
        )}
        <NumberInput
          className={isPieces ? '' : 'sm:col-start-4'}
          label="Amount"
          error={errors?.amountMinor?.message}
          id={fieldId(`lines.${at}.amountMinor`)}
          {...form.register(`lines.${at}.amountMinor`)}
        />
        <TextField
          className="col-span-2 sm:col-span-3"
          label="As it says"
          error={errors?.description?.message}
          maxLength={200}
          id={fieldId(`lines.${at}.description`)}
          {...form.register(`lines.${at}.description`)}
        />
        {onRemove && (
          <span className="self-center pt-4 sm:text-right">
            <Button look="word" aria-label={`Remove line ${at + 1}`} onClick={onRemove}>
              Remove
            </Button>
          </span>
        )}
      </div>
    </fieldset>
  );
}

const CHARGES = ['lot_minimum', 'certification', 'freight', 'tax', 'other'] as const;

const optionsOf = ({ order }: InvoiceDetail) => [
  ...order.lines.map((line) => ({
    value: whatOf(line.lineId),
    says: `${line.lineNo}: ${orderLineWords(line)}`,
  })),
  { value: OTHER_PIECES, says: 'Pieces that are not on the order' },
  ...CHARGES.map((kind) => ({ value: kind, says: LINE_KIND_WORDS[kind] })),
];
