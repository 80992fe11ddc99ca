'use client';
import { useRead } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { getAssembly } from '@/lib/assemblies/contract';

import { AssemblyForm } from './assembly-form';

export function EditAssembly({ assemblyId }: { assemblyId: string }) {
  const { data } = useRead(getAssembly, { assemblyId });
  const may = useMay('assembly.edit');
  const back = (
    <ButtonLink look="word" href={`/assemblies/${assemblyId}`}>
      To the assembly
    </ButtonLink>
  );
  if (data.closed)
    return (
      <Empty
        says={`${data.name} is closed.`}
        comes="It waits for nothing more and is not changed any more."
        action={back}
      />
    );
  if (!may) return <Empty says="Leads and admins change assemblies." action={back} />;
  return <AssemblyForm assembly={data} />;
}
