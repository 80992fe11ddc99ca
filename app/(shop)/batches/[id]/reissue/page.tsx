import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { ReissueScreen } from '@/components/batches/reissue-screen';
import { getBatchEndpoint, getBatchLinesEndpoint } from '@/lib/batches/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Re-issue' };

export default async function ReissuePage({ params }: { params: Promise<{ id: string }> }) {
  const { id: batchId } = await params;
  return (
    <Prefetched
      queries={[
        ask(getMeEndpoint, {}),
        ask(getBatchEndpoint, { batchId }),
        ask(getBatchLinesEndpoint, { batchId }),
      ]}
    >
      <ReissueScreen batchId={batchId} />
    </Prefetched>
  );
}
