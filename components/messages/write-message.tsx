'use client';
import type { ReactNode } from 'react';

import { FieldError, SelectField, TextArea } from '@/components/ui/field';
import { Button } from '@/components/ui/button';
import type { MessageView, Thread } from '@/lib/messages/contract';

export interface Draft {
  body: string;
  lineId: string;
}

interface WriteMessageProps {
  thread: Thread;
  draft: Draft;
  onDraft: (draft: Draft) => void;
  /** The question that is being answered. */
  answering: MessageView | null;
  onNotAnswering: () => void;
  onSend: (kind: 'question' | 'answer' | 'note') => void | Promise<unknown>;
  error: string | undefined;
  /** A further button: trouble is the processor's to report. */
  more?: ReactNode;
  fieldId?: string;
}

/** One field; what one means is which button one presses. */
export function WriteMessage({
  thread,
  draft,
  onDraft,
  answering,
  onNotAnswering,
  onSend,
  error,
  more,
  fieldId,
}: WriteMessageProps) {
  const { lines, other } = thread;
  return (
    <div className="no-print flex flex-col gap-2.5 pt-3">
      {answering && (
        <p className="border-l-4 border-l-dispatched pl-3 text-second [overflow-wrap:anywhere]">
          Answering {answering.author}: “{answering.body.slice(0, 160)}”{' '}
          <Button look="word" onClick={onNotAnswering}>
            Write something else
          </Button>
        </p>
      )}
      <TextArea
        {...(fieldId ? { id: fieldId } : {})}
        label={answering ? 'Your answer' : `Write to ${other}`}
        rows={3}
        maxLength={4000}
        value={draft.body}
        onChange={(event) => onDraft({ ...draft, body: event.currentTarget.value })}
      />
      {!answering && lines.length > 1 && (
        <SelectField
          label="About"
          empty="the whole batch"
          options={lines.map((line) => ({ value: line.id, says: `line ${line.lineNo}, ${line.part}` }))}
          value={draft.lineId}
          onChange={(event) => onDraft({ ...draft, lineId: event.currentTarget.value })}
        />
      )}
      {error && <FieldError id="message-error" says={error} />}
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        {answering ? (
          <Button onClick={() => onSend('answer')}>Answer</Button>
        ) : (
          <>
            <Button onClick={() => onSend('question')}>Ask {other}</Button>
            {more}
            <Button look="word" onClick={() => onSend('note')}>
              Leave as a note
            </Button>
          </>
        )}
        <span className="text-second text-quiet">It also goes out as a mail.</span>
      </div>
    </div>
  );
}
