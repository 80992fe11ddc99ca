import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { AssemblyScreen } from '@/components/assemblies/assembly-screen';
import { getAssemblyEndpoint } from '@/lib/assemblies/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Assembly' };

export default async function AssemblyPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(getAssemblyEndpoint, { assemblyId: id })]}>
      <AssemblyScreen assemblyId={id} />
    </Prefetched>
  );
}
