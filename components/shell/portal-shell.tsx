import type { ComponentProps, ReactNode } from 'react';
import { NoNetwork } from '@/components/ui/no-network';
import { PortalHead } from './portal-head';
import { SkipLink } from './skip-link';

interface PortalShellProps extends ComponentProps<typeof PortalHead> {
  /** What is kept on this phone without a network. */
  kept?: string;
  children: ReactNode;
}

/** One column at a phone and at a desk: it is read in a plating shop. */
export function PortalShell({ kept, children, ...head }: PortalShellProps) {
  return (
    <>
      <SkipLink />
      <PortalHead {...head} />
      <main id="page" tabIndex={-1} className="lw-page mx-auto max-w-[46rem] px-4 pt-3 pb-24">
        <NoNetwork {...(kept ? { kept } : {})} />
        {children}
      </main>
    </>
  );
}

/** The answer stands in the bottom button: "I have 41, done 10 Apr". */
export function BottomActions({ children }: { children: ReactNode }) {
  return (
    <div className="lw-bottom fixed inset-x-0 bottom-0 z-30 border-t-heavy border-ink bg-paper px-4 pt-2 pb-2.5">
      <div className="mx-auto flex max-w-[44rem] gap-2 *:flex-1">{children}</div>
    </div>
  );
}
