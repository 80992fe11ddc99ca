'use client';
import Link from 'next/link';
import { useState } from 'react';

import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import type { InvoiceDetail } from '@/lib/invoices/contract';
import { payInvoice } from '@/lib/invoices/pay-contract';
import { amountText } from '@/lib/money';

import { invoiceName } from './invoice-words';
import { useInvoiceWrite } from './use-invoice-write';

/** Asks once more, with the sum in the button, because money does not come back by itself. */
export function PayButton({ invoice }: { invoice: InvoiceDetail }) {
  const [open, setOpen] = useState(false);
  const mayPay = useMay('invoice.pay');
  const { run, write } = useInvoiceWrite(payInvoice);
  const { balanceMinor, currency, processor, orderNumber, payable } = invoice;
  const says = `Pay ${amountText(balanceMinor)}`;
  const pay = async () => {
    await run({ invoiceId: invoice.id, version: invoice.version });
    setOpen(false);
  };
  if (!mayPay) return <p className="text-quiet">The office pays {amountText(balanceMinor)}.</p>;
  return (
    <>
      <Button
        look="primary"
        size="big"
        className="w-full"
        notNow={whyNot(invoice)}
        reasonAt="below"
        onClick={() => setOpen(true)}
      >
        {says}
      </Button>
      {!payable.methodSaved && (
        <p className="text-second">
          <Link href="/settings/payments">How the shop pays</Link>
        </p>
      )}
      <Dialog
        open={open}
        onClose={() => setOpen(false)}
        busy={write.isPending}
        title={`${says} ${currency} to ${processor}`}
        lead={`Invoice ${invoiceName(invoice)}, order ${orderNumber}. The money leaves the shop’s saved method; the remittance is mailed when it has moved.`}
        onSubmit={pay}
        actions={
          <>
            <Button look="primary" type="submit" busy={write.isPending} busyLabel="Starting the payment">
              {says}
            </Button>
            <Button onClick={() => setOpen(false)}>Do not pay now</Button>
          </>
        }
      />
    </>
  );
}

function whyNot({ payable, processor }: InvoiceDetail): string | false {
  if (payable.otherHands) return 'You approved it. In this shop another person pays what one has approved.';
  if (!payable.methodSaved) return 'The shop has no way to pay yet. An admin saves one.';
  return (
    !payable.processorReady &&
    `${processor} has not said where its money goes. It does so on its own page, under Account.`
  );
}
