'use client';
import Link from 'next/link';

import { useWrite } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { CheckList, CheckRow } from '@/components/ui/check-row';
import { Moment } from '@/components/ui/day';
import { getCertificate, listCertificates } from '@/lib/certificates/contract';
import { takeUpCertificate } from '@/lib/certificates/prove-contract';

import { certificateName, STATE_WORDS } from './certificate-words';
import type { Proving } from './use-proving';

/** What an inspector should know before the first row: the file, copies of it, and what else came for this batch. */
export function CertificateWarnings({ proving: { data, mayProve } }: { proving: Proving }) {
  const { certificate, file, sameFile, others, batch } = data;
  const nothing = file.verified && sameFile.length === 0 && certificate.setAsideAt === null;
  return (
    <>
      {!nothing && (
        <CheckList label="Before you begin">
          {!file.verified && (
            <CheckRow
              level="stop"
              sentence={`${file.name} did not arrive whole.`}
              rest="Nobody can sign for it. Ask for it again."
            />
          )}
          {certificate.setAsideAt !== null && <SetAsideRow certificate={certificate} mayProve={mayProve} />}
          {sameFile.map((same) => (
            <CheckRow
              key={same.certificateId}
              level="warn"
              sentence={
                same.sameBatch
                  ? 'The very same file is in this batch already.'
                  : `The very same file was sent for ${same.batchNumber}.`
              }
              rest={
                same.sameBatch
                  ? 'One of the two is a second copy: set it aside.'
                  : `Look whether it is of ${batch.number} at all.${same.signed ? ` It is signed for ${same.batchNumber}.` : ''}`
              }
              waysOut={
                <Link href={`/certificates/${same.certificateId}`} className="lw-word-button">
                  Open the other
                </Link>
              }
            />
          ))}
        </CheckList>
      )}
      {others.length > 0 && (
        <p className="pb-2 text-second">
          <span className="text-quiet">Also for {batch.number}: </span>
          {others.map((other, at) => (
            <span key={other.id}>
              {at > 0 && ', '}
              <Link href={`/certificates/${other.id}`}>{certificateName(other)}</Link>{' '}
              <span className="text-quiet">{STATE_WORDS[other.state]}</span>
            </span>
          ))}
        </p>
      )}
    </>
  );
}

function SetAsideRow({
  certificate,
  mayProve,
}: {
  certificate: Proving['data']['certificate'];
  mayProve: boolean;
}) {
  const clock = useClock();
  const takeUp = useWrite(takeUpCertificate, { refreshes: [getCertificate, listCertificates] });
  return (
    <CheckRow
      level="note"
      sentence="This certificate is set aside."
      rest={
        <>
          {certificate.setAsideReason}.{' '}
          {certificate.setAsideAt && <Moment at={new Date(certificate.setAsideAt)} clock={clock} />}
        </>
      }
      waysOut={
        mayProve && (
          <Button
            look="word"
            onClick={() =>
              takeUp
                .mutateAsync({ certificateId: certificate.id, version: certificate.version })
                .catch(() => undefined)
            }
          >
            Take it up again
          </Button>
        )
      }
    />
  );
}
