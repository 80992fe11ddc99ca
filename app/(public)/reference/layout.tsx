import type { ReactNode } from 'react';

import { readOnServer, viewer } from '@/app/_kit/prefetch';
import { SignedInShop } from '@/app/_kit/signed-in-shop';
import { PublicHead } from '@/components/shell/public-head';
import { SkipLink } from '@/components/shell/skip-link';
import { getMeEndpoint } from '@/lib/session/endpoints';

/** Open to everybody; who is signed in to a shop keeps the shop's head. */
export default async function BenchLayout({ children }: { children: ReactNode }) {
  const { tenant } = await viewer();
  if (tenant.kind === 'shop')
    return <SignedInShop me={await readOnServer(getMeEndpoint, {})}>{children}</SignedInShop>;
  return (
    <>
      <SkipLink />
      <PublicHead />
      <main id="page" tabIndex={-1} className="lw-page px-6 pb-9 max-md:px-4">
        {children}
      </main>
    </>
  );
}
