import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { PlacesScreen } from '@/components/stock/places-screen';
import { getMeEndpoint } from '@/lib/session/endpoints';
import { listLocationsEndpoint } from '@/lib/stock/endpoints';

export const metadata: Metadata = { title: 'Places' };

export default function PlacesPage() {
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(listLocationsEndpoint, {})]}>
      <PlacesScreen />
    </Prefetched>
  );
}
