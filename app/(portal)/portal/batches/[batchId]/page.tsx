import type { Metadata } from 'next';
import { cache } from 'react';

import { ask, Prefetched, readOnServer, viewer } from '@/app/_kit/prefetch';
import { signOutHere } from '@/app/_kit/sign-out';
import { PortalBatch } from '@/components/portal/portal-batch';
import { PortalShell } from '@/components/shell/portal-shell';
import { Button } from '@/components/ui/button';
import { getPortalBatchEndpoint, listPortalMessagesEndpoint } from '@/lib/portal/endpoints';

interface BatchPageProps {
  params: Promise<{ batchId: string }>;
}

/** For the head and the title, read once. */
const readBatch = cache((batchId: string) => readOnServer(getPortalBatchEndpoint, { batchId }));

export async function generateMetadata({ params }: BatchPageProps): Promise<Metadata> {
  const { number, shop } = await readBatch((await params).batchId);
  return { title: `${number} for ${shop.name}` };
}

export default async function PortalBatchPage({ params }: BatchPageProps) {
  const { batchId } = await params;
  const { actor } = await viewer();
  const { shop, contactName, number } = await readBatch(batchId);
  const call =
    shop.phone === null
      ? undefined
      : { says: `Call ${contactName?.split(' ')[0] ?? 'the shop'}`, phone: shop.phone };
  return (
    <PortalShell
      shop={shop.name}
      call={call}
      kept="What you answer here is kept on this device and sent when it is back."
    >
      {actor.kind === 'person' && (
        <p className="pb-2">
          <a href="/portal" className="lw-word-button">
            All work
          </a>
        </p>
      )}
      <Prefetched
        queries={[ask(getPortalBatchEndpoint, { batchId }), ask(listPortalMessagesEndpoint, { batchId })]}
      >
        <PortalBatch batchId={batchId} now={new Date().toISOString()} />
      </Prefetched>
      {actor.kind === 'link' && (
        <form
          action={signOutHere}
          className="no-print flex flex-wrap items-center gap-x-3 border-t border-rule pt-3 text-second text-quiet"
        >
          <span>This device is signed in for {number} only.</span>
          <Button type="submit" look="word">
            End it here
          </Button>
        </form>
      )}
    </PortalShell>
  );
}
