import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { WorkList } from '@/components/portal/work-list';
import { listPortalBatchesEndpoint } from '@/lib/portal/endpoints';

import { PortalFrame } from './portal-frame';

export const metadata: Metadata = { title: 'Work' };

interface WorkPageProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function WorkPage({ searchParams }: WorkPageProps) {
  const { shop, show: wanted, at } = await searchParams;
  const show = wanted === 'finished' ? ('finished' as const) : ('open' as const);
  return (
    <PortalFrame at={typeof at === 'string' ? at : undefined}>
      <Prefetched queries={[ask(listPortalBatchesEndpoint, { show })]}>
        <WorkList
          key={show}
          shopId={typeof shop === 'string' ? shop : undefined}
          show={show}
          now={new Date().toISOString()}
        />
      </Prefetched>
    </PortalFrame>
  );
}
