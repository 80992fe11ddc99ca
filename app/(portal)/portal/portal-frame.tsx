import { cookies } from 'next/headers';
import { redirect } from 'next/navigation';
import type { ReactNode } from 'react';

import { readOnServer } from '@/app/_kit/prefetch';
import { signOutHere } from '@/app/_kit/sign-out';
import { PortalHeadSearch, PortalPhoneSearch } from '@/components/portal/portal-search';
import { KEYS_COOKIE, LOOK_COOKIE, readLook, readSingleKeys } from '@/components/shell/look';
import { PersonPanel } from '@/components/shell/person-panel';
import { ShopShell } from '@/components/shell/shop-shell';
import { getMeEndpoint } from '@/lib/session/endpoints';

const SECTIONS = [
  { says: 'Work', href: '/portal', letter: 'W', also: ['/portal/batches'] },
  { says: 'Account', href: '/portal/account', letter: 'A' },
];

/** Head and sections for people of a processor. Who came by the link of one batch is taken there. */
export async function PortalFrame({ at, children }: { at?: string | undefined; children: ReactNode }) {
  const me = await readOnServer(getMeEndpoint, {});
  if (me.organisation.kind === 'shop') redirect('/');
  if (me.batchId !== null) redirect(`/portal/batches/${me.batchId}${at === 'ask' ? '#ask' : ''}`);
  const kept = await cookies();
  const singleKeys = me.singleKeys && readSingleKeys(kept.get(KEYS_COOKIE)?.value);
  return (
    <ShopShell
      organisation={me.organisation.name}
      person={me.name}
      roles={[]}
      home="/portal"
      sections={SECTIONS}
      singleKeys={singleKeys}
      numberField={<PortalHeadSearch />}
      scan={<PortalPhoneSearch />}
      personPanel={
        <PersonPanel
          look={readLook(kept.get(LOOK_COOKIE)?.value)}
          singleKeys={singleKeys}
          accountHref="/portal/account"
          signOut={signOutHere}
        />
      }
    >
      {children}
    </ShopShell>
  );
}
