import { redirect } from 'next/navigation';
import type { ReactNode } from 'react';

import { readOnServer } from '@/app/_kit/prefetch';
import { SignedInShop } from '@/app/_kit/signed-in-shop';
import { QueryProvider } from '@/components/api/query-provider';
import { getMeEndpoint } from '@/lib/session/endpoints';

export default async function ShopLayout({ children }: { children: ReactNode }) {
  const me = await readOnServer(getMeEndpoint, {});
  if (me.organisation.kind === 'processor')
    redirect(me.batchId === null ? '/portal' : `/portal/batches/${me.batchId}`);
  return (
    <QueryProvider>
      <SignedInShop me={me}>{children}</SignedInShop>
    </QueryProvider>
  );
}
