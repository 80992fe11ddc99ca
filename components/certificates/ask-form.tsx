'use client';
import { useState, type FormEvent } from 'react';

import { useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { TextArea } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { listMessages, writeToProcessor } from '@/lib/messages/contract';

interface AskFormProps {
  batchId: string;
  /** As the processor is called in a sentence. */
  processor: string;
  lineId: string | null;
  /** What is wrong, as the row knows it. */
  body: string;
  onDone: () => void;
}

/** Asks the processor from the row that does not hold; it goes to the batch's thread and out as a mail. */
export function AskForm({ batchId, processor, lineId, body: begun, onDone }: AskFormProps) {
  const [body, setBody] = useState(begun);
  const write = useWrite(writeToProcessor, { refreshes: [listMessages] });
  const ask = async (event: FormEvent) => {
    event.preventDefault();
    const done = await write.mutateAsync({ batchId, kind: 'question', body, lineId }).catch(() => null);
    if (!done) return;
    showMessage({
      says: `${processor} is asked, by mail and in the thread of the batch.`,
      action: { says: 'Open the thread', href: `/batches/${batchId}#messages` },
    });
    onDone();
  };
  return (
    <form
      noValidate
      onSubmit={ask}
      aria-label={`Ask ${processor}`}
      className="flex max-w-prose flex-col gap-2.5"
    >
      <TextArea
        label={`To ${processor}`}
        rows={2}
        value={body}
        maxLength={4000}
        autoFocus
        error={
          write.error ? (write.error.problem.fields?.[0]?.message ?? write.error.problem.title) : undefined
        }
        onChange={(event) => setBody(event.currentTarget.value)}
      />
      <div className="flex flex-wrap gap-2">
        <Button type="submit" busy={write.isPending} busyLabel="Asking">
          Ask {processor} to correct
        </Button>
        <Button onClick={onDone}>Do not ask</Button>
      </div>
    </form>
  );
}
