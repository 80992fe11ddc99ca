import type { Metadata } from 'next';
import { notFound } from 'next/navigation';

import { readOnServer, viewer } from '@/app/_kit/prefetch';
import { LinkOpen } from '@/components/portal/link-open';
import { PortalShell } from '@/components/shell/portal-shell';
import type { Identity } from '@/lib/auth/identify';
import { readBatchLinkEndpoint } from '@/lib/portal/link-endpoints';

interface LinkPageProps {
  params: Promise<{ token: string }>;
  searchParams: Promise<{ at?: string | string[] }>;
}

export const metadata: Metadata = { title: 'A batch for you' };

export default async function LinkPage({ params, searchParams }: LinkPageProps) {
  const { token } = await params;
  const { at } = await searchParams;
  const { state, batch } = await readOnServer(readBatchLinkEndpoint, { token });
  if (batch === null || state !== 'open') notFound();
  const { actor, tenant } = await viewer();
  const mayAlready =
    tenant.kind === 'processor' &&
    tenant.processorId === batch.processorId &&
    (tenant.batchId ?? batch.id) === batch.id;
  return (
    <PortalShell
      shop={batch.shop}
      call={batch.shopPhone === null ? undefined : { says: 'Call the shop', phone: batch.shopPhone }}
    >
      <LinkOpen
        batch={batch}
        now={new Date()}
        action={`/b/${encodeURIComponent(token)}/open`}
        at={at === 'ask' ? 'ask' : undefined}
        straightTo={mayAlready ? `/portal/batches/${batch.id}${at === 'ask' ? '#ask' : ''}` : undefined}
        signedInAs={signedInAs({ actor, tenant })}
      />
    </PortalShell>
  );
}

const signedInAs = ({ actor }: Identity): string | undefined =>
  actor.kind === 'person' ? actor.name : undefined;
