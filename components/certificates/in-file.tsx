'use client';
import Link from 'next/link';

import { useWrite } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { showMessage } from '@/components/ui/message';
import { getCertificate, listCertificates } from '@/lib/certificates/contract';
import { addFromFile, getCertificateReading, type CertificateReading } from '@/lib/readings/contract';

import type { Proving } from './use-proving';

type Held = CertificateReading['inFile'][number];

/** The certificates of the file where it holds several, or where one is for several batches: each with the batches it is for. */
export function InFile({ proving }: { proving: Proving }) {
  const held = proving.reading.data?.inFile ?? [];
  if (held.length === 0) return null;
  return (
    <section aria-label="Certificates in this file" className="pb-2 text-second">
      <h2 className="font-cond text-word">
        {held.length === 1
          ? 'This certificate speaks of more than one batch'
          : `This file holds ${held.length} certificates`}
      </h2>
      <ul>
        {held.map((one) => (
          <HeldRow key={one.place} held={one} proving={proving} />
        ))}
      </ul>
    </section>
  );
}

function HeldRow({ held, proving }: { held: Held; proving: Proving }) {
  const { number, order, parts, isThis, taken, fits } = held;
  const own = proving.data.certificate.id;
  const others = taken.filter(({ certificateId }) => certificateId !== own);
  return (
    <li className="flex flex-wrap items-baseline gap-x-3 gap-y-1 border-b border-rule py-1.5">
      <strong className="num">{number ?? 'without a number'}</strong>
      {isThis && <span className="font-cond text-word">this one</span>}
      <span className="text-quiet">
        {[order && `order ${order}`, partsWords(parts)].filter(Boolean).join(', ')}
      </span>
      {others.map(({ certificateId, batchNumber }) => (
        <Link key={certificateId} href={`/certificates/${certificateId}`} className="lw-word-button">
          Taken up for {batchNumber}
        </Link>
      ))}
      {fits.map((fit) => (
        <TakeUp key={fit.batchId} held={held} fit={fit} certificateId={own} />
      ))}
      {taken.length === 0 && fits.length === 0 && <span>No open order of this processor fits it.</span>}
    </li>
  );
}

const MOST_PARTS = 3;

function partsWords(parts: readonly string[]): string {
  const more = parts.length - MOST_PARTS;
  return more > 0 ? `${parts.slice(0, MOST_PARTS).join(', ')} and ${more} more` : parts.join(', ');
}

interface TakeUpProps {
  held: Held;
  fit: Held['fits'][number];
  certificateId: string;
}

function TakeUp({ held, fit, certificateId }: TakeUpProps) {
  const mayAdd = useMay('certificate.add');
  const write = useWrite(addFromFile, {
    refreshes: [getCertificateReading, getCertificate, listCertificates],
  });
  const { batchId, batchNumber, isClear, reasons } = fit;
  const take = async () => {
    const done = await write
      .mutateAsync({ certificateId, place: held.place, batchId })
      .catch((error: Error) => {
        showMessage({ says: error.message, failed: true });
      });
    if (done)
      showMessage({
        says: `${held.number ?? 'It'} is a certificate of ${batchNumber} now.`,
        action: { says: 'Prove it', href: `/certificates/${done.certificateId}` },
      });
  };
  return (
    <span className="flex basis-full flex-wrap items-baseline gap-x-3 gap-y-1">
      {mayAdd && (
        <Button size="small" busy={write.isPending} onClick={take}>
          {isClear ? 'Take it up for' : 'It is for'} {batchNumber}
        </Button>
      )}
      <span className="text-quiet">
        {!mayAdd && `It may be for ${batchNumber}. `}
        {reasons.join(' ')}
      </span>
    </span>
  );
}
