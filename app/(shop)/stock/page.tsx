import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { StockScreen } from '@/components/stock/stock-screen';
import { getMeEndpoint } from '@/lib/session/endpoints';
import { listLocationsEndpoint, listStockEndpoint } from '@/lib/stock/endpoints';

import { readStockFilter } from './search';

export const metadata: Metadata = { title: 'Stock' };

export default async function StockPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const filter = readStockFilter(await searchParams);
  return (
    <Prefetched
      queries={[
        ask(getMeEndpoint, {}),
        ask(listLocationsEndpoint, {}),
        ask(listStockEndpoint, { ...filter }),
      ]}
    >
      <StockScreen filter={filter} />
    </Prefetched>
  );
}
