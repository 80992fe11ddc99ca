import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { NewLot } from '@/components/lots/new-lot';
import { Id } from '@/lib/api/shapes';
import { getPartEndpoint } from '@/lib/parts/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'A new lot' };

export default async function NewLotPage({ searchParams }: { searchParams: Promise<{ part?: string }> }) {
  const asked = Id.safeParse((await searchParams).part);
  const partId = asked.success ? asked.data : null;
  return (
    <Prefetched
      queries={[ask(getMeEndpoint, {}), ...(partId === null ? [] : [ask(getPartEndpoint, { partId })])]}
    >
      <NewLot key={partId} partId={partId} />
    </Prefetched>
  );
}
