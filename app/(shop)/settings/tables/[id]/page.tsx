import type { Metadata } from 'next';

import { ask, Prefetched, readOnServer } from '@/app/_kit/prefetch';
import { TableScreen } from '@/components/settings/table-screen';
import { getReferenceTableEndpoint } from '@/lib/reference/endpoints';

interface Props {
  params: Promise<{ id: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { title } = await readOnServer(getReferenceTableEndpoint, { tableId: (await params).id });
  return { title };
}

export default async function TablePage({ params, searchParams }: Props) {
  const { edition } = await searchParams;
  const asked = {
    tableId: (await params).id,
    ...(typeof edition === 'string' && { entryId: edition }),
  };
  return (
    <Prefetched queries={[ask(getReferenceTableEndpoint, asked)]}>
      <TableScreen {...asked} />
    </Prefetched>
  );
}
