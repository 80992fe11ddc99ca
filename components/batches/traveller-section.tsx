'use client';
import Link from 'next/link';

import { useLazyRead, useRead } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { ButtonLink } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Section } from '@/components/ui/section';
import { getBatch } from '@/lib/batches/contract';
import { getTraveller, listBatchDocuments, type BatchDocument } from '@/lib/batches/paper-contract';
import type { Clock } from '@/lib/day-words';

import { TravellerSheet } from './traveller-sheet';

const SECONDS = 1000;

/** The paper that goes along, small; and every version of it that was made. */
export function TravellerSection({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const { data: says } = useLazyRead(getTraveller, { batchId });
  return (
    <>
      {batch.dispatchedAt && <Papers batchId={batchId} />}
      <Section
        title="Traveller"
        action={
          <ButtonLink look="word" href={`/batches/${batchId}/traveller`} shortcut="T">
            Open the page
          </ButtonLink>
        }
      >
        <div className="h-56 overflow-hidden border-b-heavy border-ink bg-bench px-5 pt-3.5">
          <Link
            href={`/batches/${batchId}/traveller`}
            tabIndex={-1}
            aria-hidden="true"
            className="no-underline"
          >
            {says && <TravellerSheet says={says} small />}
          </Link>
        </div>
      </Section>
    </>
  );
}

const KINDS = { traveller: 'Traveller', purchase_order: 'Order' } as const;

function Papers({ batchId }: { batchId: string }) {
  const clock = useClock();
  // Asked again only while the worker still makes one.
  const waiting =
    useLazyRead(listBatchDocuments, { batchId }).data?.documents.some((one) => one.fileId === null) ?? true;
  const { data } = useLazyRead(
    listBatchDocuments,
    { batchId },
    waiting ? { refreshEveryMs: 2 * SECONDS } : {},
  );
  return (
    <Section title="Papers" note="every version stays">
      {data?.documents.length === 0 && <p className="py-1.5 text-second text-quiet">None is made yet.</p>}
      <ul aria-label="Papers">
        {(data?.documents ?? []).map((document, at, all) => (
          <Paper
            key={document.id}
            document={document}
            // Both papers of a version say the same of what is different.
            says={all[at - 1]?.documentVersion === document.documentVersion ? [] : document.changes}
            clock={clock}
          />
        ))}
      </ul>
    </Section>
  );
}

function Paper({
  document: { kind, documentVersion, fileId, sha256, statedAt },
  says,
  clock,
}: {
  document: BatchDocument;
  says: readonly string[];
  clock: Clock;
}) {
  const name = `${KINDS[kind]}, version ${documentVersion}`;
  return (
    <li className="border-b border-rule py-[7px] text-second">
      <div className="flex flex-wrap items-baseline gap-x-3">
        {fileId ? (
          <a
            href={`/api/files/${fileId}/content?inline=1`}
            target="_blank"
            rel="noreferrer"
            className="font-semibold"
          >
            {name}
          </a>
        ) : (
          <span>
            <strong>{name}</strong> <span className="text-quiet">is being made</span>
          </span>
        )}
        <span className="ml-auto text-quiet">
          <Moment at={new Date(statedAt)} clock={clock} />
        </span>
      </div>
      {says.map((change) => (
        <div key={change}>{change}</div>
      ))}
      {sha256 && (
        <div className="num text-source text-faint">{`sha-256 ${sha256.slice(0, 4)} ${sha256.slice(4, 8)} … ${sha256.slice(-4)}`}</div>
      )}
    </li>
  );
}
