import { cookies } from 'next/headers';
import { redirect } from 'next/navigation';
import type { ReactNode } from 'react';

import { readOnServer } from '@/app/_kit/prefetch';
import { signOutHere } from '@/app/_kit/sign-out';
import { QueryProvider } from '@/components/api/query-provider';
import { HeadSearch, PhoneSearch } from '@/components/search/number-search';
import { KEYS_COOKIE, LOOK_COOKIE, readLook, readSingleKeys } from '@/components/shell/look';
import { PersonPanel } from '@/components/shell/person-panel';
import { shopSections } from '@/components/shell/sections';
import { ShopShell } from '@/components/shell/shop-shell';
import { getMeEndpoint } from '@/lib/session/endpoints';

export default async function ShopLayout({ children }: { children: ReactNode }) {
  const me = await readOnServer(getMeEndpoint, {});
  if (me.organisation.kind === 'processor')
    redirect(me.batchId === null ? '/portal' : `/portal/batches/${me.batchId}`);
  const kept = await cookies();
  const singleKeys = me.singleKeys && readSingleKeys(kept.get(KEYS_COOKIE)?.value);
  return (
    <QueryProvider>
      <ShopShell
        organisation={me.organisation.name}
        person={me.name}
        roles={me.roles}
        sections={shopSections(me.roles)}
        singleKeys={singleKeys}
        numberField={<HeadSearch />}
        scan={<PhoneSearch />}
        personPanel={
          <PersonPanel
            look={readLook(kept.get(LOOK_COOKIE)?.value)}
            singleKeys={singleKeys}
            accountHref="/settings/account"
            signOut={signOutHere}
          />
        }
      >
        {children}
      </ShopShell>
    </QueryProvider>
  );
}
