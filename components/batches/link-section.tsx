'use client';
import { useState } from 'react';

import { useLazyRead, useWrite } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { momentWords } from '@/lib/day-words';
import { listBatchLinks, sendBatchLink, withdrawBatchLinks } from '@/lib/portal/link-contract';

const REFRESHED = { refreshes: [listBatchLinks] };

/** The processor's link to this batch: whether it stands, a new one by mail, and its end. */
export function LinkSection({ batchId }: { batchId: string }) {
  const { data } = useLazyRead(listBatchLinks, { batchId });
  const mayDispatch = useMay('batch.dispatch');
  const [asking, setAsking] = useState(false);
  const send = useWrite(sendBatchLink, REFRESHED);
  const withdraw = useWrite(withdrawBatchLinks, REFRESHED);
  if (!data) return null;
  const standing = data.links.filter((link) => link.withdrawnAt === null);
  const opened = standing.find((link) => link.firstOpenedAt !== null)?.firstOpenedAt ?? null;

  const tell = (work: Promise<string>) =>
    work
      .then((says) => showMessage({ says }))
      .catch((error: unknown) =>
        showMessage({ says: error instanceof Error ? error.message : 'Nothing was changed.', failed: true }),
      );
  const sendNew = () => tell(send.mutateAsync({ batchId }).then(({ sentTo }) => `A link goes to ${sentTo}.`));
  const end = () =>
    tell(withdraw.mutateAsync({ batchId }).then(() => 'The link is withdrawn.')).finally(() =>
      setAsking(false),
    );
  return (
    <Section title="Link of the processor">
      <p className="py-1.5 text-second text-quiet">
        {data.ended && 'It ended with the batch. '}
        {!data.ended &&
          (standing.length > 0
            ? `It stands, mailed to ${data.deskEmail}`
            : 'No link stands: the processor cannot open this batch without signing in.')}
        {!data.ended &&
          standing.length > 0 &&
          (opened === null
            ? ', not opened yet.'
            : `, first opened ${momentWords(new Date(opened), { zone: data.zone, now: new Date(opened) })}.`)}
      </p>
      {mayDispatch && !data.ended && (
        <div className="flex flex-wrap gap-2 pb-2">
          <Button size="small" busy={send.isPending} busyLabel="Sending" onClick={sendNew}>
            Mail a link
          </Button>
          {standing.length > 0 && (
            <Button size="small" look="stop" onClick={() => setAsking(true)}>
              Withdraw the link
            </Button>
          )}
        </div>
      )}
      <Dialog
        open={asking}
        onClose={() => setAsking(false)}
        busy={withdraw.isPending}
        onSubmit={end}
        title="Withdraw the link"
        lead="Whoever holds it, in the mail or on the traveller, cannot open this batch any more. A new one can be mailed."
        actions={
          <>
            <Button look="stop" type="submit" busy={withdraw.isPending} busyLabel="Withdrawing">
              Withdraw the link
            </Button>
            <Button onClick={() => setAsking(false)}>Let it stand</Button>
          </>
        }
      />
    </Section>
  );
}
