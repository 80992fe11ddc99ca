import type { Metadata } from 'next';

import { ask, Prefetched, readOnServer } from '@/app/_kit/prefetch';
import { BatchScreen } from '@/components/batches/batch-screen';
import {
  getBatchChecksEndpoint,
  getBatchEndpoint,
  getBatchLinesEndpoint,
  getTravellerEndpoint,
  listStepProcessorsEndpoint,
} from '@/lib/batches/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

type Props = { params: Promise<{ id: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { number } = await readOnServer(getBatchEndpoint, { batchId: (await params).id });
  return { title: number };
}

export default async function BatchPage({ params }: Props) {
  const { id: batchId } = await params;
  const { process, step } = await readOnServer(getBatchEndpoint, { batchId });
  return (
    <Prefetched
      queries={[
        ask(getMeEndpoint, {}),
        ask(getBatchEndpoint, { batchId }),
        ask(getBatchLinesEndpoint, { batchId }),
        ask(getBatchChecksEndpoint, { batchId }),
        ask(getTravellerEndpoint, { batchId }),
        ask(listStepProcessorsEndpoint, { process, specification: step.specification }),
      ]}
    >
      <BatchScreen batchId={batchId} />
    </Prefetched>
  );
}
