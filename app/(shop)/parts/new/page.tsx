import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { NewPart } from '@/components/parts/new-part';
import { getTablesInForceEndpoint } from '@/lib/reference/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'A new part' };

export default function NewPartPage() {
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(getTablesInForceEndpoint, {})]}>
      <NewPart />
    </Prefetched>
  );
}
