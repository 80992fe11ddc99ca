import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { DossierScreen } from '@/components/dossiers/dossier-screen';
import { getDossierEndpoint, listMadeDossiersEndpoint } from '@/lib/dossiers/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';
import { readId } from '@/app/(shop)/lots/search';

export const metadata: Metadata = { title: 'Dossier' };

export default async function DossierPage({ params }: { params: Promise<{ id: string }> }) {
  const lotId = readId((await params).id);
  return (
    <Prefetched
      queries={[
        ask(getMeEndpoint, {}),
        ask(getDossierEndpoint, { lotId }),
        ask(listMadeDossiersEndpoint, { lotId }),
      ]}
    >
      <DossierScreen lotId={lotId} />
    </Prefetched>
  );
}
