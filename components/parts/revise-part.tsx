'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useRead, useWrite } from '@/components/api/use-api';
import { Edge } from '@/components/ui/edge';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { getPart, listParts, revisePart } from '@/lib/parts/contract';
import { PartForm } from './part-form';
import { valuesForRevision } from './part-form-values';

export function RevisePart({ partId }: { partId: string }) {
  const router = useRouter();
  const { data } = useRead(getPart, { partId });
  const [part] = useState(data);
  const revise = useWrite(revisePart, { refreshes: [getPart, listParts] });
  return (
    <>
      <PageHead title={`Revise ${part.number}`} sub={`${part.name}: the revision after ${part.revision}`} />
      <PartForm
        values={valuesForRevision(part)}
        frozen={{ number: 'a revision keeps its number' }}
        action="Add the revision"
        busyLabel="Adding"
        cancelHref={`/parts/${partId}`}
        save={async (input, options) => {
          const { id } = await revise.mutateAsync({ ...input, partId }, options);
          showMessage({
            says: `${part.number} rev ${input.revision} takes the place of rev ${part.revision}.`,
          });
          router.push(`/parts/${id}`);
        }}
      >
        <Edge level="note">
          <strong>Rev {part.revision} will be superseded.</strong>{' '}
          {part.lotCount > 0 &&
            `Its ${part.lotCount === 1 ? 'lot stays' : `${part.lotCount} lots stay`} with it, with its drawing and its steps. `}
          New lots are made from the revision you add here.
        </Edge>
      </PartForm>
    </>
  );
}
