import { cookies } from 'next/headers';
import type { ReactNode } from 'react';

import { HeadSearch, PhoneSearch } from '@/components/search/number-search';
import { MyUnits } from '@/components/session/my-units';
import { ShopFrame } from '@/components/session/shop-frame';
import { KEYS_COOKIE, LOOK_COOKIE, readLook, readSingleKeys } from '@/components/shell/look';
import { PersonPanel } from '@/components/shell/person-panel';
import type { Me } from '@/lib/session/contract';
import { getWaitingEndpoint } from '@/lib/tideline/endpoints';

import { ask, Prefetched } from './prefetch';
import { signOutHere } from './sign-out';

/** Head, search, bottom bar and person's panel around every page that a person of a shop sees. */
export async function SignedInShop({ me, children }: { me: Me; children: ReactNode }) {
  const kept = await cookies();
  const singleKeys = me.singleKeys && readSingleKeys(kept.get(KEYS_COOKIE)?.value);
  return (
    <Prefetched queries={[ask(getWaitingEndpoint, {})]}>
      <ShopFrame
        organisation={me.organisation.name}
        person={me.name}
        roles={me.roles}
        singleKeys={singleKeys}
        numberField={<HeadSearch />}
        scan={<PhoneSearch />}
        personPanel={
          <PersonPanel
            look={readLook(kept.get(LOOK_COOKIE)?.value)}
            singleKeys={singleKeys}
            accountHref="/settings/account"
            signOut={signOutHere}
            extra={<MyUnits units={me.units} />}
          />
        }
      >
        {children}
      </ShopFrame>
    </Prefetched>
  );
}
