import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { SearchScreen, type SearchFilter } from '@/components/search/search-screen';
import { listNumbersEndpoint, searchNumbersEndpoint } from '@/lib/search/endpoints';

import { readSearchFilter } from './search';

export const metadata: Metadata = { title: 'Search by number' };

export default async function SearchPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const filter = readSearchFilter(await searchParams);
  return (
    <Prefetched queries={asked(filter)}>
      <SearchScreen filter={filter} />
    </Prefetched>
  );
}

function asked({ text, kind }: SearchFilter) {
  if (text === undefined) return [];
  return kind === undefined
    ? [ask(searchNumbersEndpoint, { text })]
    : [ask(listNumbersEndpoint, { text, kind })];
}
