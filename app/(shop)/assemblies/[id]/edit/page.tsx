import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { EditAssembly } from '@/components/assemblies/edit-assembly';
import { getAssemblyEndpoint } from '@/lib/assemblies/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Change an assembly' };

export default async function EditAssemblyPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(getAssemblyEndpoint, { assemblyId: id })]}>
      <EditAssembly assemblyId={id} />
    </Prefetched>
  );
}
