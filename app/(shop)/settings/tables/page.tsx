import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { TablesScreen } from '@/components/settings/tables-screen';
import { listReferenceTablesEndpoint } from '@/lib/reference/endpoints';

export const metadata: Metadata = { title: 'Tables of the trade' };

export default function TablesPage() {
  return (
    <Prefetched queries={[ask(listReferenceTablesEndpoint, {})]}>
      <TablesScreen />
    </Prefetched>
  );
}
