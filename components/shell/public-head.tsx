import Link from 'next/link';
import type { ReactNode } from 'react';
import { BrandMark } from '@/components/ui/marks';

/** Before one has signed in. */
export function PublicHead({ children }: { children?: ReactNode }) {
  return (
    <header className="lw-head flex min-h-12 items-center gap-4 border-b-heavy border-ink px-6 max-md:px-4">
      <Link
        href="/"
        className="flex h-12 items-center gap-2 font-cond text-[1.25rem] leading-none font-bold no-underline"
      >
        <BrandMark />
        Lotwright
      </Link>
      {children && (
        <nav aria-label="Site" className="ml-auto flex items-center gap-5">
          {children}
        </nav>
      )}
    </header>
  );
}
