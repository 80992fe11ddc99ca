import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { ImportScreen } from '@/components/lots/import-screen';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Import lots' };

export default function ImportLotsPage() {
  return (
    <Prefetched queries={[ask(getMeEndpoint, {})]}>
      <ImportScreen />
    </Prefetched>
  );
}
