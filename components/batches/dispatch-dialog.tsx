'use client';
import { useRead } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { showMessage } from '@/components/ui/message';
import { getBatchChecks } from '@/lib/batches/check-contract';
import { dispatchBatch, type Batch } from '@/lib/batches/contract';

import { useBatchWrite } from './use-batch-write';

interface DialogOfBatch {
  batch: Batch;
  open: boolean;
  onClose: () => void;
}

/** What dispatching does, before it is done: it cannot be taken back without a word to the processor. */
export function DispatchDialog({ batch, open, onClose }: DialogOfBatch) {
  const { data } = useRead(getBatchChecks, { batchId: batch.id });
  const { run, busy } = useBatchWrite(dispatchBatch);
  const warns = data.findings.filter((finding) => finding.level === 'warn');
  const passed = data.findings.filter((finding) => finding.passed !== null);
  const send = async () => {
    const done = await run({ batchId: batch.id, version: batch.version });
    onClose();
    if (done)
      showMessage({
        says: `${batch.number} is dispatched. The mail to ${batch.contactEmail} goes as soon as the papers are made.`,
      });
  };
  return (
    <Dialog
      open={open}
      onClose={onClose}
      busy={busy}
      onSubmit={send}
      title={`Dispatch ${batch.number} to ${batch.processor}`}
      lead={`${batch.pieces.toLocaleString('en-US')} pieces leave the shop. All of this happens, or nothing does:`}
      actions={
        <>
          <Button look="primary" type="submit" busy={busy} busyLabel="Dispatching">
            {`Dispatch ${batch.pieces.toLocaleString('en-US')} pc`}
          </Button>
          <Button onClick={onClose}>Keep it here</Button>
        </>
      }
    >
      <ul className="list-disc pl-5 text-row">
        <li>Lines and requirements are frozen as they stand.</li>
        <li>
          Traveller and order <span className="num">{batch.orderNumber}</span> are made as version 1.
        </li>
        <li>The pieces count as on the way to {batch.processor}.</li>
        <li>
          A mail with its link goes to <span className="[overflow-wrap:anywhere]">{batch.contactEmail}</span>.
        </li>
      </ul>
      {warns.length > 0 && (
        <div className="mt-3 border-l-4 border-dispatched py-[3px] pl-3">
          <strong>{warns.length === 1 ? 'One thing warns:' : `${warns.length} things warn:`}</strong>
          {warns.map((finding) => (
            <p key={finding.code + finding.subject} className="text-second">
              {finding.sentence} {finding.rest}
            </p>
          ))}
        </div>
      )}
      {passed.map((finding) => (
        <div
          key={finding.code + finding.subject}
          className="mt-3 border-l-4 border-held py-[3px] pl-3 text-second"
        >
          <strong>Let pass by {finding.passed?.by}:</strong> {finding.sentence} The reason prints on the
          traveller.
        </div>
      ))}
    </Dialog>
  );
}
