import type { Metadata } from 'next';
import { notFound } from 'next/navigation';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { ProcessorScreen } from '@/components/processors/processor-screen';
import { Id } from '@/lib/api/shapes';
import { listBatchesEndpoint } from '@/lib/batches/endpoints';
import { listEquipmentEndpoint } from '@/lib/equipment/endpoints';
import { getProcessorEndpoint } from '@/lib/processors/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Processor' };

export default async function ProcessorPage({ params }: { params: Promise<{ processorId: string }> }) {
  const { processorId } = await params;
  if (!Id.safeParse(processorId).success) notFound();
  return (
    <Prefetched
      queries={[
        ask(getProcessorEndpoint, { processorId }),
        ask(listEquipmentEndpoint, { processorId }),
        ask(listBatchesEndpoint, { processorId, limit: 20 }),
        ask(getMeEndpoint, {}),
      ]}
    >
      <ProcessorScreen processorId={processorId} now={new Date()} />
    </Prefetched>
  );
}
