import type { Metadata } from 'next';

import { ask, Prefetched, readOnServer } from '@/app/_kit/prefetch';
import { readId } from '@/app/(shop)/lots/search';
import { RevisePart } from '@/components/parts/revise-part';
import { getPartEndpoint } from '@/lib/parts/endpoints';
import { getTablesInForceEndpoint } from '@/lib/reference/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

type Props = { params: Promise<{ id: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { number, revision } = await readOnServer(getPartEndpoint, { partId: readId((await params).id) });
  return { title: `Revise ${number} rev ${revision}` };
}

export default async function RevisePartPage({ params }: Props) {
  const partId = readId((await params).id);
  return (
    <Prefetched
      queries={[ask(getMeEndpoint, {}), ask(getTablesInForceEndpoint, {}), ask(getPartEndpoint, { partId })]}
    >
      <RevisePart partId={partId} />
    </Prefetched>
  );
}
