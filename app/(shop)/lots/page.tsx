import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { LotsScreen } from '@/components/lots/lots-screen';
import { listLotsEndpoint } from '@/lib/lots/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

import { readLotFilter } from './search';

export const metadata: Metadata = { title: 'Lots' };

export default async function LotsPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const filter = readLotFilter(await searchParams);
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(listLotsEndpoint, { ...filter })]}>
      <LotsScreen filter={filter} />
    </Prefetched>
  );
}
