'use client';
import { useState } from 'react';

import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/field';
import type { InvoiceDetail } from '@/lib/invoices/contract';
import { refuseInvoice } from '@/lib/invoices/pay-contract';

import { invoiceName } from './invoice-words';
import { useInvoiceWrite } from './use-invoice-write';

interface RefuseDialogProps {
  invoice: InvoiceDetail;
  open: boolean;
  onClose: () => void;
}

export function RefuseDialog({ invoice, open, onClose }: RefuseDialogProps) {
  const [reason, setReason] = useState('');
  const [error, setError] = useState<string>();
  const { run, write } = useInvoiceWrite(refuseInvoice);
  const refuse = async () => {
    if (reason.trim().length < 5) return setError('Give the reason in a few words.');
    const done = await run({ invoiceId: invoice.id, version: invoice.version, reason });
    if (done) onClose();
  };
  return (
    <Dialog
      open={open}
      onClose={onClose}
      busy={write.isPending}
      title={`Refuse invoice ${invoiceName(invoice)}`}
      lead={`${invoice.processor} is told by mail, with the reason. Nothing is paid for it; a corrected copy may carry the same number.`}
      onSubmit={refuse}
      actions={
        <>
          <Button look="stop" type="submit" busy={write.isPending} busyLabel="Refusing">
            Refuse invoice
          </Button>
          <Button onClick={onClose}>Keep it</Button>
        </>
      }
    >
      <TextArea
        label="Reason"
        maxLength={500}
        value={reason}
        error={error}
        onChange={(event) => setReason(event.currentTarget.value)}
      />
    </Dialog>
  );
}
