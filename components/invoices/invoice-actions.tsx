'use client';
import { useState } from 'react';

import { useClock, useMay } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { Edge } from '@/components/ui/edge';
import { Failing } from '@/components/ui/failing';
import { momentWords } from '@/lib/day-words';
import type { InvoiceDetail } from '@/lib/invoices/contract';
import { approveInvoice, approveInvoiceSecond } from '@/lib/invoices/pay-contract';
import { amountText } from '@/lib/money';

import { payableNow } from './compare-rows';
import { CreditForm } from './credit-form';
import { PayButton } from './pay-button';
import { RefuseDialog } from './refuse-dialog';
import { useInvoiceWrite } from './use-invoice-write';

/** One primary action for the state it is in, and what else may be done. */
export function InvoiceActions({ invoice }: { invoice: InvoiceDetail }) {
  const [open, setOpen] = useState<'refuse' | 'credit' | null>(null);
  const mayApprove = useMay('invoice.approve');
  const mayWrite = useMay('batch.message');
  const { state, approved, balanceMinor } = invoice;
  const mayCredit = mayApprove && approved !== null && balanceMinor > 0 && state !== 'paying';
  return (
    <div className="flex flex-col gap-2.5 pt-4">
      <Now invoice={invoice} />
      {state !== 'refused' && (
        <div className="flex flex-wrap gap-2.5 [&>*]:flex-1">
          {mayWrite && (
            <ButtonLink href={`/batches/${invoice.batchId}#messages`}>
              Write to {invoice.processor}
            </ButtonLink>
          )}
          {mayApprove && approved === null && (
            <Button look="stop" onClick={() => setOpen('refuse')}>
              Refuse invoice
            </Button>
          )}
          {mayCredit && open !== 'credit' && (
            <Button onClick={() => setOpen('credit')}>Enter a credit</Button>
          )}
        </div>
      )}
      {open === 'credit' && mayCredit && <CreditForm invoice={invoice} onDone={() => setOpen(null)} />}
      <RefuseDialog invoice={invoice} open={open === 'refuse'} onClose={() => setOpen(null)} />
    </div>
  );
}

function Now({ invoice }: { invoice: InvoiceDetail }) {
  const clock = useClock();
  const [last] = invoice.payments;
  switch (invoice.state) {
    case 'to_enter':
      return null;
    case 'to_clear':
    case 'to_approve':
      return <Approve invoice={invoice} />;
    case 'second_approval':
      return <ApproveSecond invoice={invoice} />;
    case 'to_pay':
      return <PayButton invoice={invoice} />;
    case 'payment_failed':
      return (
        <>
          <Failing
            says={`${amountText(last?.amountMinor ?? 0)} was not paid.`}
            stands={last?.failure}
            again="It can be paid again, as it is or with another saved method."
          />
          <PayButton invoice={invoice} />
        </>
      );
    case 'paying':
      return (
        <div role="status">
          <Edge level="warn">
            <strong>{amountText(last?.amountMinor ?? 0)} is being paid</strong>, started{' '}
            {last && momentWords(new Date(last.startedAt), clock)} by {last?.by}.{' '}
            {last?.handedOver === false
              ? 'It is on its way to the payment service; while that does not answer, it is tried again by itself.'
              : 'The payment service has it and tells us how it ends; a bank transfer may take days.'}{' '}
            This page follows by itself.
          </Edge>
        </div>
      );
    case 'paid':
      return (
        <p role="status">
          <strong className="text-proved-ink">
            {last?.state === 'succeeded' ? `Paid ${amountText(last.amountMinor)}` : 'Nothing is left to pay'}
          </strong>
          {last?.endedAt &&
            `, ${momentWords(new Date(last.endedAt), clock)}. The remittance is mailed to ${invoice.processor}.`}
        </p>
      );
    case 'refused':
      return (
        <Edge level="stop">
          <strong>Refused:</strong> {invoice.refusedReason} A corrected copy may carry the same number.
        </Edge>
      );
  }
}

function Approve({ invoice }: { invoice: InvoiceDetail }) {
  const mayApprove = useMay('invoice.approve');
  const { run } = useInvoiceWrite(approveInvoice);
  const waiting = invoice.differences
    .filter((one) => one.clearance === null)
    .map((one) => (one.seq === null ? 'the whole' : `line ${one.seq}`));
  const notNow = waiting.length > 0 && `Approve waits for ${[...new Set(waiting)].join(' and ')}.`;
  // Whoever only reads is told whose it is; a button that is never theirs would be a dead one.
  if (!mayApprove) return <p className="text-quiet">The office approves. {notNow}</p>;
  return (
    <Button
      look="primary"
      size="big"
      className="w-full"
      notNow={notNow}
      reasonAt="below"
      busyLabel="Approving"
      onClick={() => run({ invoiceId: invoice.id, version: invoice.version })}
    >
      Approve {amountText(payableNow(invoice))}
    </Button>
  );
}

function ApproveSecond({ invoice }: { invoice: InvoiceDetail }) {
  const maySecond = useMay('invoice.approve_second');
  const { run } = useInvoiceWrite(approveInvoiceSecond);
  if (!maySecond) return <p className="text-quiet">An admin approves a second time.</p>;
  return (
    <Button
      look="primary"
      size="big"
      className="w-full"
      notNow={whyNotSecond(invoice)}
      reasonAt="below"
      busyLabel="Approving"
      onClick={() => run({ invoiceId: invoice.id, version: invoice.version })}
    >
      Approve {amountText(payableNow(invoice))} a second time
    </Button>
  );
}

function whyNotSecond({ approved }: InvoiceDetail): string | false {
  return approved?.byMe === true && 'You approved it first. The second approval is another person’s.';
}
