import type { Metadata } from 'next';
import { notFound } from 'next/navigation';

import { readOnServer } from '@/app/_kit/prefetch';
import { SharedDossier } from '@/components/dossiers/shared-dossier';
import { PublicHead } from '@/components/shell/public-head';
import { SkipLink } from '@/components/shell/skip-link';
import { openDossierLinkEndpoint, readDossierLinkEndpoint } from '@/lib/dossiers/endpoints';

export const metadata: Metadata = { title: 'A dossier for you', referrer: 'no-referrer' };

/** A page cannot answer 410; one whose link has ended answers 404 and says in words which way it ended. */
export default async function SharedDossierPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const { state } = await readOnServer(readDossierLinkEndpoint, { token });
  if (state !== 'open') notFound();
  const opened = await readOnServer(openDossierLinkEndpoint, { token });
  return (
    <>
      <SkipLink />
      <PublicHead />
      <main id="page" tabIndex={-1} className="lw-page px-6 pb-9 max-md:px-4">
        <SharedDossier token={token} opened={opened} />
      </main>
    </>
  );
}
