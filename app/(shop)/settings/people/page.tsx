import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { PeopleScreen } from '@/components/settings/people-screen';
import { listPeopleEndpoint } from '@/lib/people/endpoints';

export const metadata: Metadata = { title: 'People' };

export default function PeoplePage() {
  return (
    <Prefetched queries={[ask(listPeopleEndpoint, {})]}>
      <PeopleScreen />
    </Prefetched>
  );
}
