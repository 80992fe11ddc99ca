import type { Metadata } from 'next';

import { ask, Prefetched, viewer } from '@/app/_kit/prefetch';
import { TidelineScreen } from '@/components/tideline/tideline-screen';
import { getTidelineEndpoint } from '@/lib/tideline/endpoints';

export const metadata: Metadata = { title: 'Tideline' };

export default async function TidelinePage({ searchParams }: { searchParams: Promise<{ view?: string }> }) {
  const [{ actor }, { view }] = await Promise.all([viewer(), searchParams]);
  return (
    <Prefetched queries={[ask(getTidelineEndpoint, {})]}>
      <TidelineScreen roles={actor.roles} view={view === 'list' ? 'list' : 'lanes'} />
    </Prefetched>
  );
}
