'use client';
import type { ReactNode } from 'react';

import { Button } from '@/components/ui/button';
import { momentWords, type Clock } from '@/lib/day-words';
import type { MessageKind, MessageSide, MessageView, Thread } from '@/lib/messages/contract';

interface ThreadListProps {
  thread: Thread;
  clock: Clock;
  mySide: MessageSide;
  /** Where I may answer. */
  onAnswer?: ((question: MessageView) => void) | undefined;
}

/** What both sides have said, oldest first; what waits for my answer stands out and says so. */
export function ThreadList({ thread: { messages, lines }, clock, mySide, onAnswer }: ThreadListProps) {
  const open = new Set(openQuestions(messages, mySide).map((one) => one.id));
  return (
    <ol aria-label="Messages">
      {messages.map((message) => {
        const line = lines.find((one) => one.id === message.lineId);
        const question = messages.find((one) => one.id === message.answersId);
        return (
          <MessageItem
            key={message.id}
            message={message}
            waits={open.has(message.id)}
            mine={message.side === mySide}
            when={momentWords(new Date(message.createdAt), clock)}
            about={line && `line ${line.lineNo}, ${line.part}`}
            question={question}
          >
            {open.has(message.id) && onAnswer && (
              <Button
                look="word"
                aria-label={`Answer ${message.author}: ${message.body.slice(0, 60)}`}
                onClick={() => onAnswer(message)}
              >
                Answer
              </Button>
            )}
          </MessageItem>
        );
      })}
    </ol>
  );
}

/** Questions and trouble of the other side that nobody here has answered. */
export function openQuestions(messages: readonly MessageView[], mySide: MessageSide): MessageView[] {
  const answered = new Set(messages.flatMap((message) => message.answersId ?? []));
  return messages.filter(
    (message) =>
      message.side !== mySide &&
      (message.kind === 'question' || message.kind === 'trouble') &&
      !answered.has(message.id),
  );
}

const KIND_WORDS: Record<MessageKind, string> = {
  question: 'asks',
  answer: 'answers',
  note: 'writes',
  trouble: 'reports trouble',
};

interface MessageItemProps {
  message: MessageView;
  waits: boolean;
  mine: boolean;
  when: string;
  about: string | undefined;
  question: MessageView | undefined;
  children: ReactNode;
}

function MessageItem({
  message: { author, kind, body },
  waits,
  mine,
  when,
  about,
  question,
  children,
}: MessageItemProps) {
  return (
    <li className={`border-b border-rule py-2.5 pl-3 [overflow-wrap:anywhere] ${edgeOf(kind, waits, mine)}`}>
      <p className="flex flex-wrap items-baseline gap-x-2 text-second">
        <strong>{author}</strong>
        <span className={kind === 'trouble' ? 'font-cond text-word text-held-ink' : 'text-quiet'}>
          {KIND_WORDS[kind]}
        </span>
        {about && <span className="text-quiet">about {about}</span>}
        <span className="ml-auto text-quiet">{when}</span>
      </p>
      {question && <p className="truncate text-second text-quiet">to “{question.body}”</p>}
      <p className="whitespace-pre-line">{body}</p>
      {waits && (
        <p className="flex items-center gap-3 text-second">
          <span className="text-dispatched-ink">not answered yet</span>
          {children}
        </p>
      )}
    </li>
  );
}

function edgeOf(kind: MessageKind, waits: boolean, mine: boolean): string {
  if (kind === 'trouble') return 'border-l-4 border-l-held';
  if (waits) return 'border-l-4 border-l-dispatched';
  return mine ? 'border-l-4 border-l-rule' : 'border-l-4 border-l-ink';
}
