import type { ReactNode } from 'react';
import { Keys } from '@/components/ui/keys';
import { NoNetwork } from '@/components/ui/no-network';
import { AppHead, type AppHeadProps } from './app-head';
import { BottomBar } from './bottom-bar';
import { PrintFoot } from './print-foot';
import { SkipLink } from './skip-link';

interface ShopShellProps extends AppHeadProps {
  singleKeys: boolean;
  /** How many things wait for me. */
  forMe?: number;
  /** `<ScanSheet search={…} />` for the bottom bar. */
  scan: ReactNode;
  children: ReactNode;
}

/** Head, page, and the bottom bar of a phone. Serves the shop and, with its own sections, a signed-in processor. */
export function ShopShell({ singleKeys, forMe = 0, scan, children, ...head }: ShopShellProps) {
  const { organisation, person, sections, personPanel } = head;
  return (
    <>
      <SkipLink />
      <Keys singleKeys={singleKeys} />
      <AppHead {...head} />
      <main id="page" tabIndex={-1} className="lw-page px-6 pb-9 max-md:px-4 max-md:pb-24">
        <NoNetwork />
        {children}
        <PrintFoot organisation={organisation} person={person} />
      </main>
      <BottomBar
        sections={sections}
        forMe={forMe}
        scan={scan}
        personPanel={personPanel}
        organisation={organisation}
        person={person}
      />
    </>
  );
}
