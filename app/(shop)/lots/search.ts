import { notFound } from 'next/navigation';

import type { LotFilter } from '@/components/lots/lots-screen';
import { Id } from '@/lib/api/shapes';
import { listLots } from '@/lib/lots/contract';

const FILTERS = ['text', 'where', 'partId'] as const;

/** What an address says that means nothing is left out; the rest still works. */
export function readLotFilter(search: Record<string, string | string[] | undefined>): LotFilter {
  const filter: Record<string, string> = {};
  for (const name of FILTERS) {
    const value = search[name];
    if (typeof value === 'string' && value !== '' && listLots.input.shape[name].safeParse(value).success)
      filter[name] = value;
  }
  return filter;
}

/** An address with something else than an id in it leads nowhere. */
export function readId(text: string): string {
  const id = Id.safeParse(text);
  return id.success ? id.data : notFound();
}
