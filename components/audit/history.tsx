'use client';
import { useLazyRead } from '@/components/api/use-api';
import { Section } from '@/components/ui/section';
import { getMe } from '@/lib/session/contract';

import { historyOf } from './history-of';
import { Trail } from './trail';

interface HistoryProps {
  /** The kind of thing, as it is recorded: `batch`, `lot`, `invoice` … */
  entity: string;
  id: string;
  title?: string;
}

/** What happened to one thing. Read when it is shown, where the page has not laid it in. */
export function History({ entity, id, title = 'History' }: HistoryProps) {
  const { data: me } = useLazyRead(getMe, {});
  return (
    <Section title={title} note="newest first">
      <Trail asked={historyOf(entity, id)} zone={me?.organisation.zone ?? 'UTC'} ofOneThing />
    </Section>
  );
}
