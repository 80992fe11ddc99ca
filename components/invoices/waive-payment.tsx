'use client';
import { useState } from 'react';

import { useLazyRead, useWrite } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { listAudit } from '@/lib/audit/contract';
import { listInvoices } from '@/lib/invoices/contract';
import { waivePayment } from '@/lib/invoices/pay-contract';
import { getGate } from '@/lib/stock/contract';

/** Offered only where the gate is shut for want of this batch's money. */
export function WaivePayment({ batchId }: { batchId: string }) {
  const mayWaive = useMay('payment.waive');
  const [open, setOpen] = useState(false);
  const [reason, setReason] = useState('');
  const [error, setError] = useState<string>();
  const { data: gate } = useLazyRead(getGate, { batchId }, { enabled: mayWaive });
  const write = useWrite(waivePayment, { refreshes: [getGate, listInvoices, listAudit] });
  const isUnpaid = gate?.lines.some((line) =>
    line.missing.some((one) => one.reason === 'not_paid' && one.detail.includes(gate.number)),
  );
  if (!mayWaive || !isUnpaid) return null;
  const waive = async () => {
    if (reason.trim().length < 5) return setError('Give the reason in a few words.');
    const done = await write
      .mutateAsync({ batchId, reason })
      .catch((problem: unknown) => setError(problem instanceof Error ? problem.message : 'Not waived.'));
    if (!done) return;
    setOpen(false);
    showMessage({
      says: `${gate?.number} may pass without payment.`,
      action: { says: 'Release', href: `/batches/${batchId}/release` },
    });
  };
  return (
    <div className="pt-1">
      <Button look="word" onClick={() => setOpen(true)}>
        Let the pieces pass without payment
      </Button>
      <Dialog
        open={open}
        onClose={() => setOpen(false)}
        busy={write.isPending}
        title={`Waive payment for ${gate?.number}`}
        lead="The pieces may go to stock although money is open. What is owed stays owed. It stands on the record with your name."
        onSubmit={waive}
        actions={
          <>
            <Button look="stop" type="submit" busy={write.isPending} busyLabel="Waiving">
              Waive payment
            </Button>
            <Button onClick={() => setOpen(false)}>Wait for the payment</Button>
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
    </div>
  );
}
