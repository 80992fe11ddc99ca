import Link from 'next/link';
import type { ReactNode } from 'react';

import { PublicHead } from '@/components/shell/public-head';
import { SkipLink } from '@/components/shell/skip-link';

interface PublicPageProps {
  /** The batch it is about. */
  tag?: ReactNode;
  title: ReactNode;
  /** What this page is for, in a sentence. */
  lead?: ReactNode;
  children?: ReactNode;
}

/** One column to fill in, as narrow as its fields. */
export function PublicPage({ tag, title, lead, children }: PublicPageProps) {
  return (
    <>
      <SkipLink />
      <PublicHead>
        <Link href="/reference">Bench reference</Link>
      </PublicHead>
      <main id="page" tabIndex={-1} className="lw-page px-6 pb-9 max-md:px-4">
        <div className="mx-auto w-full max-w-[27rem] pt-12 max-md:pt-6">
          {tag && <div className="pb-3">{tag}</div>}
          <h1>{title}</h1>
          {lead && <p className="pt-1 text-quiet">{lead}</p>}
          <div className="flex flex-col gap-4 pt-5">{children}</div>
        </div>
      </main>
    </>
  );
}

/** What did not work, above the form, where it is heard at once. */
export function FormRefusal({ says }: { says: string | undefined }) {
  return (
    <div role="alert">
      {says !== undefined && says !== '' && (
        <p className="border-l-4 border-held py-[3px] pl-3 text-held-ink">{says}</p>
      )}
    </div>
  );
}
