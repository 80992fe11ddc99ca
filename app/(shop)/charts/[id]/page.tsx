import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { ChartScreen } from '@/components/chart/chart-screen';
import { getChartEndpoint } from '@/lib/charts/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'A furnace chart' };

export default async function ChartPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(getChartEndpoint, { chartId: id })]}>
      <ChartScreen chartId={id} />
    </Prefetched>
  );
}
