'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useRead, useWrite } from '@/components/api/use-api';
import { Edge } from '@/components/ui/edge';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { editPart, getPart, listParts } from '@/lib/parts/contract';
import { PartForm } from './part-form';
import { valuesOf } from './part-form-values';

/** Corrects a part. What one started from is kept, so that a change by another in the meantime is noticed. */
export function EditPart({ partId }: { partId: string }) {
  const router = useRouter();
  const { data } = useRead(getPart, { partId });
  const [part] = useState(data);
  const edit = useWrite(editPart, { refreshes: [getPart, listParts] });
  const fixed =
    part.lotCount > 0
      ? `on the papers of ${part.lotCount === 1 ? '1 lot' : `${part.lotCount} lots`}; revise the part`
      : undefined;
  return (
    <>
      <PageHead title={`Correct ${part.number} rev ${part.revision}`} sub={part.name} />
      <PartForm
        values={valuesOf(part)}
        frozen={{
          number: fixed,
          revision: fixed,
          serialised:
            fixed && (part.serialised ? 'Each piece has its own serial.' : 'Its pieces have no serials.'),
        }}
        usedSteps={part.route.filter(({ used }) => used).map(({ id }) => id)}
        drawingName={part.drawing?.name}
        action="Keep the changes"
        busyLabel="Keeping"
        cancelHref={`/parts/${partId}`}
        save={async (input, options) => {
          await edit.mutateAsync({ ...input, partId, version: part.version }, options);
          showMessage({ says: `${input.number} rev ${input.revision} changed.` });
          router.push(`/parts/${partId}`);
        }}
      >
        {part.supersededAt !== null && (
          <Edge level="warn">
            <strong>Rev {part.revision} is superseded.</strong> What you change here is for lots that were
            made from it.
          </Edge>
        )}
      </PartForm>
    </>
  );
}
