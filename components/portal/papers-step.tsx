'use client';
import { useState } from 'react';

import { useWrite } from '@/components/api/use-api';
import { FileLink } from '@/components/files/file-link';
import { FileUpload } from '@/components/files/file-upload';
import { Failing } from '@/components/ui/failing';
import { SegmentButtons } from '@/components/ui/segments';
import { momentWords, type Clock } from '@/lib/day-words';
import {
  getPortalBatch,
  sendPaper,
  type PaperKind,
  type PortalBatch,
  type PortalPaper,
} from '@/lib/portal/contract';

import { Step } from './step';

const KINDS: readonly { value: PaperKind; says: string }[] = [
  { value: 'certificate', says: 'Certificate' },
  { value: 'chart', says: 'Chart' },
  { value: 'invoice', says: 'Invoice' },
];

/** Certificate, furnace chart, invoice: sent in a minute from a phone, and what the shop has made of each. */
export function PapersStep({ batch, clock }: { batch: PortalBatch; clock: Clock }) {
  const has = (kind: PaperKind) =>
    batch.papers.some((paper) => paper.kind === kind && !['set_aside', 'refused'].includes(paper.state));
  const [kind, setKind] = useState<PaperKind>(
    has('certificate') && !has('invoice') ? 'invoice' : 'certificate',
  );
  const [handedIn, setHandedIn] = useState(0);
  const send = useWrite(sendPaper, { refreshes: [getPortalBatch] });
  const complete = has('certificate') && has('invoice');
  return (
    <Step
      number={3}
      id="papers"
      state={complete ? 'done' : 'open'}
      title="Send the papers"
      aside={wantedWords(has('certificate'), has('invoice'))}
    >
      {batch.papers.length > 0 && (
        <ul aria-label="Papers sent" className="pb-3">
          {batch.papers.map((paper) => (
            <Paper key={paper.id} paper={paper} clock={clock} />
          ))}
        </ul>
      )}
      <SegmentButtons label="What do you send" value={kind} options={KINDS} onChange={setKind} />
      <div className="pt-3">
        <FileUpload
          key={`${kind} ${handedIn}`}
          purpose={kind}
          batchId={batch.id}
          label={`${KINDS.find((one) => one.value === kind)?.says ?? ''} for ${batch.number}`}
          hint="PDF, or a photo in which every line can be read. Up to 50 MB."
          onArrived={(file) =>
            send.mutate(
              { batchId: batch.id, kind, fileId: file.id },
              { onSuccess: () => setHandedIn((count) => count + 1) },
            )
          }
        />
      </div>
      {send.isError && (
        <Failing
          says={`It has arrived but is not handed in: ${send.error.problem.title}`}
          stands="Choose the same file again to hand it in."
        />
      )}
    </Step>
  );
}

function wantedWords(certificate: boolean, invoice: boolean): string | null {
  const wanted = [...(certificate ? [] : ['certificate']), ...(invoice ? [] : ['invoice'])];
  return wanted.length === 0 ? null : `${wanted.join(' and ')} wanted`;
}

const KIND_WORDS: Record<PaperKind, string> = {
  certificate: 'certificate',
  chart: 'chart',
  invoice: 'invoice',
};

function Paper({ paper, clock }: { paper: PortalPaper; clock: Clock }) {
  const bad = paper.state === 'set_aside' || paper.state === 'refused';
  return (
    <li
      className={`flex flex-wrap items-baseline gap-x-3 border-b border-rule py-2 ${bad ? 'border-l-4 border-l-held bg-held-wash pl-3' : ''}`}
    >
      <div className="min-w-0 flex-1 basis-52">
        {paper.file ? (
          <FileLink file={paper.file} />
        ) : (
          <strong>{paper.number ?? `A ${KIND_WORDS[paper.kind]}`}</strong>
        )}
        , {KIND_WORDS[paper.kind]}
        <div className="text-second text-quiet">
          {momentWords(new Date(paper.sentAt), clock)}, {paper.sentBy}
        </div>
      </div>
      <div className={bad ? 'basis-full' : 'text-quiet'}>{stateWords(paper)}</div>
    </li>
  );
}

function stateWords({ kind, state, acceptedPieces, reason }: PortalPaper): string {
  switch (state) {
    case 'waiting':
      return kind === 'certificate' ? 'with the inspector' : 'with the office';
    case 'accepted':
      return `accepted for ${acceptedPieces ?? 0} pc`;
    case 'set_aside':
      return `Set aside${reason ? `: ${reason}` : ''}. Send a corrected one.`;
    case 'refused':
      return `Refused${reason ? `: ${reason}` : ''}. Send a corrected one.`;
    case 'approved':
      return 'approved, to be paid';
    case 'paid':
      return 'paid';
    case 'kept':
      return 'kept with the batch';
  }
}
