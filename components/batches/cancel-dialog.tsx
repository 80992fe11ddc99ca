'use client';
import { useState } from 'react';

import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import type { Batch } from '@/lib/batches/contract';
import { cancelBatch } from '@/lib/batches/paper-contract';

import { useBatchWrite } from './use-batch-write';

/** Cancelling: what comes back, who is told, and why. */
export function CancelDialog({ batch, open, onClose }: { batch: Batch; open: boolean; onClose: () => void }) {
  const [reason, setReason] = useState('');
  const [wrong, setWrong] = useState<string>();
  const { run, busy } = useBatchWrite(cancelBatch, (error) => setWrong(error.problem.fields?.[0]?.message));
  const left = batch.dispatchedAt !== null;
  const cancel = async () => {
    if (reason.trim().length < 5) return setWrong('Say why, for the processor and for the record.');
    const done = await run({ batchId: batch.id, version: batch.version, reason });
    if (!done) return;
    onClose();
    showMessage({ says: `${batch.number} is cancelled. Its pieces wait for the step again.` });
  };
  return (
    <Dialog
      open={open}
      onClose={onClose}
      busy={busy}
      onSubmit={cancel}
      title={`Cancel ${batch.number}`}
      lead={
        left
          ? `Its ${batch.pieces} pieces wait for the step again, the link ends, and ${batch.processor} is told by mail. Agree with them first where the parts are.`
          : `Its ${batch.pieces} pieces wait for the step again. The number is not used a second time.`
      }
      actions={
        <>
          <Button look="stop" type="submit" busy={busy} busyLabel="Cancelling">
            {`Cancel ${batch.number}`}
          </Button>
          <Button onClick={onClose}>Leave it</Button>
        </>
      }
    >
      <TextArea
        label="Why"
        value={reason}
        error={wrong}
        onChange={(event) => {
          setReason(event.currentTarget.value);
          setWrong(undefined);
        }}
      />
    </Dialog>
  );
}
