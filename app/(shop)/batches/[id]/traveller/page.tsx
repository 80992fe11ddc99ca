import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { TravellerScreen } from '@/components/batches/traveller-screen';
import { getBatchEndpoint, getTravellerEndpoint, listBatchDocumentsEndpoint } from '@/lib/batches/endpoints';

export const metadata: Metadata = { title: 'Traveller' };

export default async function TravellerPage({ params }: { params: Promise<{ id: string }> }) {
  const { id: batchId } = await params;
  return (
    <Prefetched
      queries={[
        ask(getBatchEndpoint, { batchId }),
        ask(getTravellerEndpoint, { batchId }),
        ask(listBatchDocumentsEndpoint, { batchId }),
      ]}
    >
      <TravellerScreen batchId={batchId} />
    </Prefetched>
  );
}
