'use client';
import { useState } from 'react';

import type { ApiError } from '@/lib/api/client';
import type { MessageSide, MessageView, Thread } from '@/lib/messages/contract';

import { openQuestions } from './thread';
import type { Draft } from './write-message';

export const EMPTY_DRAFT: Draft = { body: '', lineId: '' };

/**
 * What one writes and what it answers. A question that waits is taken up by itself: most of what is written then is
 * its answer.
 */
export function useAnswering(thread: Thread, mySide: MessageSide) {
  const [chosen, setChosen] = useState<string | 'nothing' | null>(null);
  const open = openQuestions(thread.messages, mySide);
  const answering: MessageView | null =
    chosen === 'nothing' ? null : (open.find((one) => one.id === chosen) ?? open.at(-1) ?? null);
  return {
    answering,
    answer: (question: MessageView) => setChosen(question.id),
    notAnswering: () => setChosen('nothing'),
  };
}

/** The sentence for the field, whichever of its inputs was refused. */
export const messageError = (error: ApiError | null): string | undefined =>
  error ? (error.problem.fields?.[0]?.message ?? error.problem.title) : undefined;
