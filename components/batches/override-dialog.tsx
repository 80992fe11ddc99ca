'use client';
import { useState } from 'react';

import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { overrideCheck, type BatchFinding } from '@/lib/batches/check-contract';
import type { Batch } from '@/lib/batches/contract';

import { useBatchWrite } from './use-batch-write';

/** Letting a blocker pass, with the reason that stays. */
export function OverrideDialog({
  batch,
  finding,
  onClose,
}: {
  batch: Batch;
  finding: BatchFinding | null;
  onClose: () => void;
}) {
  const [reason, setReason] = useState('');
  const [wrong, setWrong] = useState<string>();
  const { run, busy } = useBatchWrite(overrideCheck, (error) => setWrong(error.problem.fields?.[0]?.message));
  const close = () => {
    setReason('');
    setWrong(undefined);
    onClose();
  };
  const pass = async () => {
    if (!finding) return;
    if (reason.trim().length < 20)
      return setWrong('Say why in 20 letters or more; it prints on the traveller.');
    const done = await run({
      batchId: batch.id,
      version: batch.version,
      check: finding.code,
      subject: finding.subject,
      reason,
    });
    if (!done) return;
    close();
    showMessage({ says: 'Let pass. The reason prints on the traveller.' });
  };
  return (
    <Dialog
      open={finding !== null}
      onClose={close}
      busy={busy}
      onSubmit={pass}
      title={`Override: ${finding?.sentence.replace(/\.$/, '') ?? ''}`}
      lead={`${finding?.rest ?? ''} Your name and reason stay on the record and print on the traveller.`}
      actions={
        <>
          <Button look="stop" type="submit" busy={busy} busyLabel="Keeping the reason">
            Override and keep the reason
          </Button>
          <Button onClick={close}>Leave it blocked</Button>
        </>
      }
    >
      <TextArea
        label="Reason"
        hint={`${Math.min(reason.trim().length, 20)} of 20 letters`}
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
