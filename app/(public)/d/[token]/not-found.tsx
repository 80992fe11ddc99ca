import { headers } from 'next/headers';

import { readOnServer } from '@/app/_kit/prefetch';
import { DossierLinkEnded } from '@/components/dossiers/dossier-link-ended';
import { readDossierLinkEndpoint } from '@/lib/dossiers/endpoints';

/** Says which kind of "not" it is; the token comes from the address, because this page is given no parameters. */
export default async function DossierLinkNotFound() {
  const path = (await headers()).get('x-path') ?? '';
  const token = decodeURIComponent(/^\/d\/([^/?]+)/.exec(path)?.[1] ?? 'none');
  const face = await readOnServer(readDossierLinkEndpoint, { token });
  return <DossierLinkEnded {...face} />;
}
