import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { ProcessorsScreen } from '@/components/processors/processors-screen';
import { listProcessorsEndpoint } from '@/lib/processors/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Processors' };

export default function ProcessorsPage() {
  return (
    <Prefetched queries={[ask(listProcessorsEndpoint, {}), ask(getMeEndpoint, {})]}>
      <ProcessorsScreen />
    </Prefetched>
  );
}
