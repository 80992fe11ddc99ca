'use client';
import { useRead } from '@/components/api/use-api';
import { ButtonLink } from '@/components/ui/button';
import { PageHead } from '@/components/ui/page-head';
import { BatchTag } from '@/components/ui/tag';
import { getBatch } from '@/lib/batches/contract';
import { getTraveller, listBatchDocuments } from '@/lib/batches/paper-contract';

import { TravellerSheet } from './traveller-sheet';

/** The traveller at reading size; once it was made, the paper itself is one press away. */
export function TravellerScreen({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const { data: says } = useRead(getTraveller, { batchId });
  const { data: made } = useRead(listBatchDocuments, { batchId });
  const paper = made.documents.find((one) => one.kind === 'traveller' && one.fileId !== null);
  return (
    <>
      <PageHead
        tag={<BatchTag href={`/batches/${batchId}`} size="head" stage={batch.stage} number={batch.number} />}
        title="Traveller"
        sub={
          says.documentVersion === 0
            ? 'A draft: the paper with its code is made when the batch is dispatched.'
            : `Version ${says.documentVersion}, as it was stated.`
        }
        actions={
          <>
            <ButtonLink href={`/batches/${batchId}`}>Back to the batch</ButtonLink>
            {paper?.fileId && (
              <ButtonLink
                look="primary"
                href={`/api/files/${paper.fileId}/content?inline=1`}
                target="_blank"
                prefetch={false}
              >
                Open the paper
              </ButtonLink>
            )}
          </>
        }
      />
      <div className="bg-bench px-3 py-5 md:px-6">
        <TravellerSheet says={says} />
      </div>
    </>
  );
}
