import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { AssembliesScreen } from '@/components/assemblies/assemblies-screen';
import { listAssembliesEndpoint } from '@/lib/assemblies/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Assemblies' };

export default async function AssembliesPage({
  searchParams,
}: {
  searchParams: Promise<{ closed?: string | string[] }>;
}) {
  const closed = (await searchParams).closed === '1' ? '1' : '0';
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(listAssembliesEndpoint, { closed })]}>
      <AssembliesScreen closed={closed} />
    </Prefetched>
  );
}
