'use client';
import { useRouter } from 'next/navigation';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { Button, ButtonLink } from '@/components/ui/button';
import { DateField, NumberInput, SelectField, TextField } from '@/components/ui/field';
import { enterInvoice, type InvoiceDetail } from '@/lib/invoices/contract';
import { amountText, CURRENCIES, parseAmount } from '@/lib/money';

import { AsRead } from './as-read';
import { EnterLine } from './enter-line';
import { emptyLine, linesOf, type EnterIn, type EnterOut } from './enter-values';
import { FieldSpot } from './field-spot';
import { fieldId, type InvoiceSpots } from './use-invoice-spots';
import { useInvoiceWrite } from './use-invoice-write';

/** What the invoice says, typed as it stands there; what is wrong is said beside its field and nothing typed is lost. */
export function EnterForm({ invoice, spots }: { invoice: InvoiceDetail; spots: InvoiceSpots }) {
  const router = useRouter();
  const form = useFormContext<EnterIn, unknown, EnterOut>();
  const lines = useFieldArray({ control: form.control, name: 'lines' });
  const { write } = useInvoiceWrite(enterInvoice);
  const { errors, isSubmitting } = form.formState;
  const enter = form.handleSubmit(async (values) => {
    const done = await write
      .mutateAsync(
        { invoiceId: invoice.id, version: invoice.version, ...values, lines: linesOf(values.lines) },
        { onError: showOnForm(form) },
      )
      .catch(() => null);
    if (done) router.replace(`/invoices/${invoice.id}`);
  });
  return (
    <div className="min-w-0">
      {invoice.file && <AsRead invoiceId={invoice.id} read={spots.read} />}
      <FieldSpot spots={spots} />
      <form
        noValidate
        onSubmit={enter}
        onFocus={({ target }) => spots.choose(target.getAttribute('name'))}
        aria-label="What the invoice says"
      >
        <div className="grid grid-cols-2 items-start gap-x-3 gap-y-3 border-t-heavy border-ink pt-3 sm:grid-cols-3">
          <TextField
            label="Number of the invoice"
            mono
            error={errors.number?.message}
            id={fieldId('number')}
            {...form.register('number')}
          />
          <DateField
            label="Dated"
            error={errors.datedOn?.message}
            id={fieldId('datedOn')}
            {...form.register('datedOn')}
          />
          <DateField
            label="Due"
            hint="if it says so"
            error={errors.dueOn?.message}
            id={fieldId('dueOn')}
            {...form.register('dueOn')}
          />
        </div>
        <div className="pt-2">
          {lines.fields.map((line, at) => (
            <EnterLine
              key={line.id}
              at={at}
              invoice={invoice}
              onRemove={lines.fields.length > 1 ? () => lines.remove(at) : undefined}
            />
          ))}
          <div className="py-2">
            <Button look="word" onClick={() => lines.append(emptyLine('other'))}>
              Add a line
            </Button>
          </div>
        </div>
        <div className="grid grid-cols-2 items-start gap-3 border-t-heavy border-ink pt-3 sm:grid-cols-[1fr_7rem_9rem]">
          <Adds />
          <SelectField
            label="Currency"
            options={CURRENCIES.map((one) => ({ value: one, says: one }))}
            error={errors.currency?.message}
            {...form.register('currency')}
          />
          <NumberInput
            label="Total it asks for"
            error={errors.totalMinor?.message}
            id={fieldId('totalMinor')}
            {...form.register('totalMinor')}
          />
        </div>
        {errors.root && (
          <p role="alert" className="pt-3 font-medium text-held-ink">
            {errors.root.message}
          </p>
        )}
        <div className="flex flex-wrap items-center gap-3 pt-4">
          <Button look="primary" size="big" type="submit" busy={isSubmitting} busyLabel="Comparing">
            Hold it against the order
          </Button>
          {invoice.totalMinor !== null && (
            <ButtonLink look="word" href={`/invoices/${invoice.id}`}>
              Leave it as it was
            </ButtonLink>
          )}
        </div>
        {invoice.differences.some((one) => one.clearance) && (
          <p className="pt-2 text-second text-quiet">
            What was cleared is taken back when it is entered again.
          </p>
        )}
      </form>
    </div>
  );
}

function Adds() {
  const amounts = useWatch<EnterIn, 'lines'>({ name: 'lines' }).map(({ amountMinor }) => {
    const text = amountMinor.trim().replace('−', '-');
    return text.startsWith('-') ? -(parseAmount(text.slice(1)) ?? 0) : (parseAmount(text) ?? 0);
  });
  return (
    <p className="col-span-2 pt-5 text-second text-quiet sm:col-span-1" aria-live="polite">
      The lines add up to{' '}
      <strong className="num text-ink">{amountText(amounts.reduce((sum, one) => sum + one, 0))}</strong>
    </p>
  );
}
