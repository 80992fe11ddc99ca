'use client';

import { useRouter } from 'next/navigation';
import { useWrite } from '@/components/api/use-api';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { createPart, listParts } from '@/lib/parts/contract';
import { PartForm } from './part-form';
import { EMPTY_PART } from './part-form-values';

export function NewPart() {
  const router = useRouter();
  const create = useWrite(createPart, { refreshes: [listParts] });
  return (
    <>
      <PageHead
        title="A new part"
        sub="One drawing number, what it is made from, and the outside steps it takes."
      />
      <PartForm
        values={EMPTY_PART}
        action="Add the part"
        busyLabel="Adding"
        cancelHref="/parts"
        save={async (input, options) => {
          const { id } = await create.mutateAsync(input, options);
          showMessage({
            says: `${input.number} rev ${input.revision} added.`,
            action: { says: 'Add a lot of it', href: `/lots/new?part=${id}` },
          });
          router.push(`/parts/${id}`);
        }}
      />
    </>
  );
}
