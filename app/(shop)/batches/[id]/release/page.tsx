import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { ReleaseScreen } from '@/components/stock/release-screen';
import { getMeEndpoint } from '@/lib/session/endpoints';
import { getGateEndpoint } from '@/lib/stock/endpoints';

export const metadata: Metadata = { title: 'Release' };

export default async function ReleasePage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(getGateEndpoint, { batchId: id })]}>
      <ReleaseScreen batchId={id} />
    </Prefetched>
  );
}
