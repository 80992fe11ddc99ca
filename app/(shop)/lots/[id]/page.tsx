import type { Metadata } from 'next';

import { ask, Prefetched, readOnServer } from '@/app/_kit/prefetch';
import { LotScreen } from '@/components/lots/lot-screen';
import { getLotEndpoint, listMovementsEndpoint } from '@/lib/lots/endpoints';
import { getTablesInForceEndpoint } from '@/lib/reference/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';
import { readId } from '@/app/(shop)/lots/search';

type Props = { params: Promise<{ id: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { number } = await readOnServer(getLotEndpoint, { lotId: readId((await params).id) });
  return { title: `Lot ${number}` };
}

export default async function LotPage({ params }: Props) {
  const lotId = readId((await params).id);
  return (
    <Prefetched
      queries={[
        ask(getMeEndpoint, {}),
        ask(getTablesInForceEndpoint, {}),
        ask(getLotEndpoint, { lotId }),
        ask(listMovementsEndpoint, { lotId }),
      ]}
    >
      <LotScreen lotId={lotId} />
    </Prefetched>
  );
}
