import type { Metadata } from 'next';
import { notFound } from 'next/navigation';

import { readOnServer } from '@/app/_kit/prefetch';
import { DossierLinkEnded } from '@/components/dossiers/dossier-link-ended';
import { SharedDossier } from '@/components/dossiers/shared-dossier';
import { PublicHead } from '@/components/shell/public-head';
import { SkipLink } from '@/components/shell/skip-link';
import { openDossierLinkEndpoint, readDossierLinkEndpoint } from '@/lib/dossiers/endpoints';

export const metadata: Metadata = { title: 'A dossier for you', referrer: 'no-referrer' };

/** A link that has ended answers with 410: the status is set in `proxy.ts`, because a page can only say 404. */
export default async function SharedDossierPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const face = await readOnServer(readDossierLinkEndpoint, { token });
  if (face.state === 'unknown') notFound();
  return (
    <>
      <SkipLink />
      <PublicHead />
      <main id="page" tabIndex={-1} className={face.state === 'open' ? 'lw-page px-6 pb-9 max-md:px-4' : 'mx-auto max-w-[46rem] px-4 py-6'}>
        {face.state === 'open' ? <SharedDossier token={token} opened={await readOnServer(openDossierLinkEndpoint, { token })} /> : <DossierLinkEnded {...face} />}
      </main>
    </>
  );
}
