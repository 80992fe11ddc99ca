import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { NonconformanceScreen } from '@/components/nonconformances/nonconformance-screen';
import { getNonconformanceEndpoint } from '@/lib/nonconformances/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Nonconformance' };

export default async function NonconformancePage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(getNonconformanceEndpoint, { nonconformanceId: id })]}>
      <NonconformanceScreen nonconformanceId={id} />
    </Prefetched>
  );
}
