import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { JobsScreen } from '@/components/jobs/jobs-screen';
import { listFailedJobsEndpoint } from '@/lib/jobs/endpoints';

export const metadata: Metadata = { title: 'Work that failed' };

export default function JobsPage() {
  return (
    <Prefetched queries={[ask(listFailedJobsEndpoint, {})]}>
      <JobsScreen now={new Date()} />
    </Prefetched>
  );
}
