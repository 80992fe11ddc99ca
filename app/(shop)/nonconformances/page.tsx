import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { NonconformancesScreen } from '@/components/nonconformances/nonconformances-screen';
import { listNonconformancesEndpoint } from '@/lib/nonconformances/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Nonconformances' };

export default function NonconformancesPage() {
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(listNonconformancesEndpoint, {})]}>
      <NonconformancesScreen />
    </Prefetched>
  );
}
