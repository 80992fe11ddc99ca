import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { AssemblyForm } from '@/components/assemblies/assembly-form';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Add an assembly' };

export default function NewAssemblyPage() {
  return (
    <Prefetched queries={[ask(getMeEndpoint, {})]}>
      <AssemblyForm />
    </Prefetched>
  );
}
