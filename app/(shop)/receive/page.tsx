import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { ScanBatch } from '@/components/receipts/scan-batch';
import { listBatchesEndpoint } from '@/lib/batches/endpoints';

export const metadata: Metadata = { title: 'Count in' };

export default async function ReceivePage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const { number } = await searchParams;
  return (
    <Prefetched
      queries={[
        ask(listBatchesEndpoint, { stage: 'at_processor', limit: 50 }),
        ask(listBatchesEndpoint, { stage: 'dispatched', limit: 50 }),
      ]}
    >
      <ScanBatch asked={typeof number === 'string' ? number : ''} />
    </Prefetched>
  );
}
