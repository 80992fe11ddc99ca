import type { Metadata } from 'next';

import { ask, Prefetched, readOnServer } from '@/app/_kit/prefetch';
import { readId } from '@/app/(shop)/lots/search';
import { PartScreen } from '@/components/parts/part-screen';
import { getPartEndpoint } from '@/lib/parts/endpoints';
import { getTablesInForceEndpoint } from '@/lib/reference/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

type Props = { params: Promise<{ id: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { number, revision } = await readOnServer(getPartEndpoint, { partId: readId((await params).id) });
  return { title: `${number} rev ${revision}` };
}

export default async function PartPage({ params }: Props) {
  const partId = readId((await params).id);
  return (
    <Prefetched
      queries={[ask(getMeEndpoint, {}), ask(getTablesInForceEndpoint, {}), ask(getPartEndpoint, { partId })]}
    >
      <PartScreen partId={partId} />
    </Prefetched>
  );
}
