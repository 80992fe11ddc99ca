import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { PartsScreen, type PartFilter } from '@/components/parts/parts-screen';
import { listPartsEndpoint } from '@/lib/parts/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Parts' };

export default async function PartsPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const filter = readFilter(await searchParams);
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(listPartsEndpoint, { ...filter })]}>
      <PartsScreen filter={filter} />
    </Prefetched>
  );
}

const readFilter = ({ text, superseded }: Record<string, string | string[] | undefined>): PartFilter => ({
  ...(typeof text === 'string' && text.trim() !== '' ? { text: text.trim().slice(0, 80) } : {}),
  ...(superseded === '1' ? { superseded } : {}),
});
