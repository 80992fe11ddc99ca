import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { BatchesScreen } from '@/components/batches/batches-screen';
import { listBatchesEndpoint } from '@/lib/batches/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

import { readBatchFilter } from './search';

export const metadata: Metadata = { title: 'Batches' };

export default async function BatchesPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const filter = readBatchFilter(await searchParams);
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(listBatchesEndpoint, { ...filter })]}>
      <BatchesScreen filter={filter} />
    </Prefetched>
  );
}
