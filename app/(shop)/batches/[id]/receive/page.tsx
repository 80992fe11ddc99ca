import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { CountScreen } from '@/components/receipts/count-screen';
import { getReceivingEndpoint } from '@/lib/receipts/endpoints';
import { getTablesInForceEndpoint } from '@/lib/reference/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Count in' };

export default async function CountInPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  return (
    <Prefetched
      queries={[
        ask(getMeEndpoint, {}),
        ask(getTablesInForceEndpoint, {}),
        ask(getReceivingEndpoint, { batchId: id }),
      ]}
    >
      <CountScreen batchId={id} />
    </Prefetched>
  );
}
