import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { AuditScreen, type AuditFilter } from '@/components/audit/audit-screen';
import { listAudit } from '@/lib/audit/contract';
import { listAuditEndpoint, listAuditFiltersEndpoint } from '@/lib/audit/endpoints';

export const metadata: Metadata = { title: 'Audit trail' };

const FILTERS = ['entity', 'entityId', 'personId', 'from', 'to'] as const;

export default async function AuditPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const filter = readFilter(await searchParams);
  return (
    <Prefetched
      queries={[ask(listAuditFiltersEndpoint, {}), ask(listAuditEndpoint, { ...filter, limit: 50 })]}
    >
      <AuditScreen filter={filter} />
    </Prefetched>
  );
}

/** What an address says that means nothing is left out; the rest still works. */
function readFilter(search: Record<string, string | string[] | undefined>): AuditFilter {
  const filter: AuditFilter = {};
  for (const name of FILTERS) {
    const value = search[name];
    if (typeof value === 'string' && listAudit.input.shape[name].safeParse(value).success)
      filter[name] = value;
  }
  return filter;
}
