import type { Metadata } from 'next';
import { cookies } from 'next/headers';
import { notFound } from 'next/navigation';
import { ShopShell } from '@/components/shell/shop-shell';
import { PersonPanel } from '@/components/shell/person-panel';
import { KEYS_COOKIE, LOOK_COOKIE, readLook, readSingleKeys } from '@/components/shell/look';
import { shopSections } from '@/components/shell/sections';
import { PageHead } from '@/components/ui/page-head';
import { env } from '@/lib/env';
import { DemoForms } from './demo-forms';
import { DemoHeads } from './demo-heads';
import { DemoLive, DemoNumberField, DemoScan } from './demo-live';
import { DemoStates } from './demo-states';
import { DemoTables } from './demo-tables';
import { DemoTags } from './demo-tags';
import { DemoType } from './demo-type';

export const metadata: Metadata = { title: 'Kit' };

/** Every component in every state, for those who build and for the pictures of the tests; only on one's own machine. */
export default async function KitPage() {
  if (!['localhost', '127.0.0.1'].includes(new URL(env.APP_URL).hostname)) notFound();
  const kept = await cookies();
  const look = readLook(kept.get(LOOK_COOKIE)?.value);
  const singleKeys = readSingleKeys(kept.get(KEYS_COOKIE)?.value);
  const roles = ['lead', 'admin'];
  return (
    <ShopShell
      organisation="Tern Slip Floatworks"
      person="Ines Halloran"
      roles={['lead']}
      sections={shopSections(roles, { certificates: 3 })}
      numberField={<DemoNumberField />}
      personPanel={
        <PersonPanel
          look={look}
          singleKeys={singleKeys}
          accountHref="/settings/account"
          signOut="/api/none"
        />
      }
      scan={<DemoScan />}
      forMe={7}
      singleKeys={singleKeys}
    >
      <PageHead title="Kit" sub="Components of Lotwright in every state." />
      <div className="flex flex-col gap-9">
        <DemoTags />
        <div className="grid gap-9 lg:grid-cols-2">
          <DemoType />
          <DemoStates />
        </div>
        <DemoForms />
        <DemoTables />
        <DemoLive />
        <DemoHeads />
      </div>
    </ShopShell>
  );
}
