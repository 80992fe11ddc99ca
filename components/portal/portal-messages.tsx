'use client';
import { useRead, useWrite } from '@/components/api/use-api';
import { ThreadList } from '@/components/messages/thread';
import { EMPTY_DRAFT, messageError, useAnswering } from '@/components/messages/use-draft';
import { WriteMessage, type Draft } from '@/components/messages/write-message';
import { Button } from '@/components/ui/button';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import type { Clock } from '@/lib/day-words';
import { listPortalMessages, reportTrouble, writeToShop } from '@/lib/portal/contract';

import { ASK_FIELD_ID } from './ask-button';
import { useKept } from './use-kept';

/** Ask, answer, report trouble. What is typed stays on this device until it is sent. */
export function PortalMessages({ batchId, clock }: { batchId: string; clock: Clock }) {
  const { data: thread } = useRead(listPortalMessages, { batchId });
  const [kept, keep] = useKept<Draft>(`message:${batchId}`);
  const draft = kept ?? EMPTY_DRAFT;
  const { answering, answer, notAnswering } = useAnswering(thread, 'processor');
  const write = useWrite(writeToShop, { refreshes: [listPortalMessages] });
  const trouble = useWrite(reportTrouble, { refreshes: [listPortalMessages] });
  const lineId = draft.lineId || null;
  const sent = (says: string) => () => {
    keep(null);
    showMessage({ says });
  };
  // What is refused is told beside the field, out of the mutation's own state.
  const quietly = (work: Promise<unknown>) => work.catch(() => undefined);

  return (
    <Section id="messages" title="Questions, answers, trouble" note={thread.other} className="pt-1 pb-4">
      {thread.messages.length === 0 ? (
        <p className="text-quiet">
          Nothing was said yet. What you write goes to {thread.other} as a mail and stays with the batch.
        </p>
      ) : (
        <ThreadList thread={thread} clock={clock} mySide="processor" onAnswer={answer} />
      )}
      <WriteMessage
        fieldId={ASK_FIELD_ID}
        thread={thread}
        draft={draft}
        onDraft={(next) => keep(next.body === '' && next.lineId === '' ? null : next)}
        answering={answering}
        onNotAnswering={notAnswering}
        error={messageError(write.error ?? trouble.error)}
        onSend={(kind) =>
          quietly(
            write
              .mutateAsync({
                batchId,
                kind,
                body: draft.body,
                lineId: answering ? null : lineId,
                answersId: kind === 'answer' ? (answering?.id ?? null) : null,
              })
              .then(sent(`Sent to ${thread.other}.`)),
          )
        }
        more={
          <Button
            look="stop"
            onClick={() =>
              quietly(
                trouble
                  .mutateAsync({ batchId, body: draft.body, lineId })
                  .then(sent(`${thread.other} is told.`)),
              )
            }
          >
            Report trouble
          </Button>
        }
      />
    </Section>
  );
}
