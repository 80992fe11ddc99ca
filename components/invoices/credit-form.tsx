'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';

import { showOnForm } from '@/components/api/show-on-form';
import { Button } from '@/components/ui/button';
import { NumberInput, TextField } from '@/components/ui/field';
import type { InvoiceDetail } from '@/lib/invoices/contract';
import { creditInvoice } from '@/lib/invoices/pay-contract';
import { amountText } from '@/lib/money';

import { amountField } from './amount-field';
import { useInvoiceWrite } from './use-invoice-write';

const Credit = z.object({
  amountMinor: amountField({ name: 'The credit' }),
  reference: creditInvoice.input.shape.reference,
});

/** A credit of the processor on what is still to be paid. */
export function CreditForm({ invoice, onDone }: { invoice: InvoiceDetail; onDone: () => void }) {
  const form = useForm<z.input<typeof Credit>, unknown, z.output<typeof Credit>>({
    resolver: zodResolver(Credit),
    defaultValues: { amountMinor: '', reference: '' },
  });
  const { write } = useInvoiceWrite(creditInvoice);
  const { errors } = form.formState;
  const save = form.handleSubmit(async (values) => {
    await write
      .mutateAsync(
        { invoiceId: invoice.id, version: invoice.version, ...values },
        { onError: showOnForm(form) },
      )
      .then(onDone, () => undefined);
  });
  return (
    <form noValidate onSubmit={save} className="flex flex-col gap-3 border-t border-rule pt-3">
      <NumberInput
        label="Credit"
        unit={invoice.currency}
        hint={`${amountText(invoice.balanceMinor)} is left to pay`}
        error={errors.amountMinor?.message}
        {...form.register('amountMinor')}
      />
      <TextField
        label="Number of the credit"
        mono
        error={errors.reference?.message}
        {...form.register('reference')}
      />
      {errors.root && (
        <p role="alert" className="text-held-ink">
          {errors.root.message}
        </p>
      )}
      <div className="flex gap-2.5">
        <Button type="submit" busy={write.isPending} busyLabel="Entering">
          Enter the credit
        </Button>
        <Button look="word" onClick={onDone}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
