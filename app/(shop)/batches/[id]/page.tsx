import type { Metadata } from 'next';

import { ask, Prefetched, readOnServer } from '@/app/_kit/prefetch';
import { historyOf } from '@/components/audit/history-of';
import { BatchScreen } from '@/components/batches/batch-screen';
import { listAuditEndpoint } from '@/lib/audit/endpoints';
import {
  getBatchChecksEndpoint,
  getBatchEndpoint,
  getBatchLinesEndpoint,
  getLoadPlanEndpoint,
  getTravellerEndpoint,
  listBatchDocumentsEndpoint,
  listStepProcessorsEndpoint,
} from '@/lib/batches/endpoints';
import { listCertificatesEndpoint } from '@/lib/certificates/endpoints';
import { listInvoicesEndpoint } from '@/lib/invoices/endpoints';
import { listMessagesEndpoint } from '@/lib/messages/endpoints';
import { listNonconformancesEndpoint } from '@/lib/nonconformances/endpoints';
import { listBatchLinksEndpoint } from '@/lib/portal/link-endpoints';
import { listReceiptsEndpoint } from '@/lib/receipts/endpoints';
import { getGateEndpoint, listReleasesEndpoint } from '@/lib/stock/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

type Props = { params: Promise<{ id: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { number } = await readOnServer(getBatchEndpoint, { batchId: (await params).id });
  return { title: number };
}

export default async function BatchPage({ params }: Props) {
  const { id: batchId } = await params;
  const { process, step, dispatchedAt } = await readOnServer(getBatchEndpoint, { batchId });
  return (
    <Prefetched
      queries={[
        ask(getMeEndpoint, {}),
        ask(getBatchEndpoint, { batchId }),
        ask(getBatchLinesEndpoint, { batchId }),
        ask(listAuditEndpoint, historyOf('batch', batchId)),
        ...(dispatchedAt === null
          ? [
              ask(getBatchChecksEndpoint, { batchId }),
              ask(getTravellerEndpoint, { batchId }),
              ask(listStepProcessorsEndpoint, { process, specification: step.specification }),
              ask(getLoadPlanEndpoint, { batchId }),
            ]
          : sentBatch(batchId)),
      ]}
    >
      <BatchScreen batchId={batchId} />
    </Prefetched>
  );
}

/** What its page shows once it has left: how it comes back, is proved, paid and released. */
const sentBatch = (batchId: string) => [
  ask(listBatchDocumentsEndpoint, { batchId }),
  ask(listBatchLinksEndpoint, { batchId }),
  ask(listMessagesEndpoint, { batchId }),
  ask(listReceiptsEndpoint, { batchId }),
  ask(listCertificatesEndpoint, { batchId, limit: 200 }),
  ask(listNonconformancesEndpoint, { batchId, limit: 200 }),
  ask(listInvoicesEndpoint, { batchId, limit: 200 }),
  ask(listReleasesEndpoint, { batchId }),
  ask(getGateEndpoint, { batchId }),
];
