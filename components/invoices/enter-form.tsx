'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { FormProvider, useFieldArray, useForm, useWatch } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { Button, ButtonLink } from '@/components/ui/button';
import { DateField, NumberInput, SelectField, TextField } from '@/components/ui/field';
import { enterInvoice, type InvoiceDetail } from '@/lib/invoices/contract';
import { amountText, CURRENCIES, parseAmount } from '@/lib/money';

import { AsRead } from './as-read';
import { EnterLine } from './enter-line';
import { emptyLine, EnterValues, linesOf, startingValues, type EnterIn, type EnterOut } from './enter-values';
import { useInvoiceWrite } from './use-invoice-write';

/** What the invoice says, typed as it stands there; what is wrong is said beside its field and nothing typed is lost. */
export function EnterForm({ invoice }: { invoice: InvoiceDetail }) {
  const router = useRouter();
  const form = useForm<EnterIn, unknown, EnterOut>({
    resolver: zodResolver(EnterValues),
    defaultValues: startingValues(invoice),
  });
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
    <FormProvider {...form}>
      {invoice.file && <AsRead invoiceId={invoice.id} />}
      <form noValidate onSubmit={enter} aria-label="What the invoice says">
        <div className="grid grid-cols-2 items-start gap-x-3 gap-y-3 border-t-heavy border-ink pt-3 sm:grid-cols-3">
          <TextField
            label="Number of the invoice"
            mono
            error={errors.number?.message}
            {...form.register('number')}
          />
          <DateField label="Dated" error={errors.datedOn?.message} {...form.register('datedOn')} />
          <DateField
            label="Due"
            hint="if it says so"
            error={errors.dueOn?.message}
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
    </FormProvider>
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
