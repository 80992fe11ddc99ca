'use client';
import { useState } from 'react';

import { useLazyRead, useWrite } from '@/components/api/use-api';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import { listMessages, writeToProcessor, type Thread } from '@/lib/messages/contract';

import { ThreadList } from './thread';
import { EMPTY_DRAFT, messageError, useAnswering } from './use-draft';
import { WriteMessage } from './write-message';

interface BatchMessagesProps {
  batchId: string;
  /** When the page was made; days and times are told against it. */
  now: string;
  /** An auditor reads only. */
  mayWrite: boolean;
}

/** Questions and answers with the processor, on the shop's page of a batch. */
export function BatchMessages({ batchId, now, mayWrite }: BatchMessagesProps) {
  const { data, error } = useLazyRead(listMessages, { batchId }, { refreshEveryMs: 30_000 });
  return (
    <Section id="messages" title="Questions and answers" note={data?.other}>
      {!data && !error && <Loading rows={2} label="Loading what was said" />}
      {error && !data && (
        <Failing says="What was said is not here just now." again="It is asked for again by itself." />
      )}
      {data && <Said thread={data} batchId={batchId} now={now} mayWrite={mayWrite} />}
    </Section>
  );
}

function Said({ thread, batchId, now, mayWrite }: BatchMessagesProps & { thread: Thread }) {
  const [draft, setDraft] = useState(EMPTY_DRAFT);
  const { answering, answer, notAnswering } = useAnswering(thread, 'shop');
  const write = useWrite(writeToProcessor, { refreshes: [listMessages] });
  const writes = mayWrite && thread.closed === null;
  const send = (kind: 'question' | 'answer' | 'note') =>
    write
      .mutateAsync({
        batchId,
        kind,
        body: draft.body,
        lineId: (!answering && draft.lineId) || null,
        answersId: kind === 'answer' ? (answering?.id ?? null) : null,
      })
      .then(() => setDraft(EMPTY_DRAFT))
      // Told beside the field, out of the mutation's own state.
      .catch(() => undefined);
  return (
    <>
      {thread.messages.length === 0 ? (
        <Empty
          says="Nothing was said yet."
          comes={
            thread.closed ?? `What you write goes to ${thread.other} as a mail and stays with the batch.`
          }
        />
      ) : (
        <ThreadList
          thread={thread}
          clock={{ zone: thread.zone, now: new Date(now) }}
          mySide="shop"
          onAnswer={writes ? answer : undefined}
        />
      )}
      {writes && (
        <WriteMessage
          thread={thread}
          draft={draft}
          onDraft={setDraft}
          answering={answering}
          onNotAnswering={notAnswering}
          onSend={send}
          error={messageError(write.error)}
        />
      )}
    </>
  );
}
