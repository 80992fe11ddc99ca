'use client';
import Link from 'next/link';
import { useState } from 'react';

import { useLazyRead, useWrite } from '@/components/api/use-api';
import { FileUpload } from '@/components/files/file-upload';
import { useClock, useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { addCertificate, listCertificates } from '@/lib/certificates/contract';

import { certificateName, STATE_WORDS } from './certificate-words';

const COLUMNS = [
  { says: 'Certificate' },
  { says: 'Came' },
  { says: 'Decided', right: true },
  { says: 'Covers', right: true },
  { says: 'State' },
];

/** The certificates of one batch, on its page. */
export function CertificatesSection({ batchId, dispatched }: { batchId: string; dispatched: boolean }) {
  const clock = useClock();
  const mayAdd = useMay('certificate.add');
  const { data, error, isPending } = useLazyRead(listCertificates, { batchId, limit: 200 });
  const rows = data?.rows ?? [];
  return (
    <Section id="certificates" title="Certificates" note={rows.length > 0 ? rows.length : undefined}>
      {isPending && <Loading rows={2} label="Loading certificates" />}
      {error && <Failing says="The certificates could not be read." again={error.message} />}
      {data && rows.length === 0 && (
        <Empty
          says="No certificate yet."
          comes={
            dispatched
              ? 'The processor sends it from its page; add one here that came on paper.'
              : 'It comes after the batch has left.'
          }
        />
      )}
      {rows.length > 0 && (
        <Table label="Certificates of this batch" columns={COLUMNS}>
          {rows.map((row) => (
            <Row key={row.id} state={row.state === 'set_aside' ? 'off' : 'rest'}>
              <Cell>
                <Link href={`/certificates/${row.id}`} className="num font-semibold">
                  {certificateName(row)}
                </Link>
              </Cell>
              <Cell head="Came">
                <Moment at={new Date(row.createdAt)} clock={clock} />
              </Cell>
              <Cell figure head="Decided">
                {row.decided} of {row.requirements}
              </Cell>
              <Cell figure head="Covers">
                {row.coveredPieces > 0 ? row.coveredPieces : ''}
              </Cell>
              <Cell strong={row.state === 'waiting'}>{STATE_WORDS[row.state]}</Cell>
            </Row>
          ))}
        </Table>
      )}
      {dispatched && mayAdd && <AddCertificate batchId={batchId} />}
    </Section>
  );
}

function AddCertificate({ batchId }: { batchId: string }) {
  const [open, setOpen] = useState(false);
  const write = useWrite(addCertificate, { refreshes: [listCertificates] });
  if (!open) {
    return (
      <div className="pt-2">
        <Button look="word" onClick={() => setOpen(true)}>
          Add a certificate
        </Button>
      </div>
    );
  }
  const add = async (fileId: string) => {
    const done = await write
      .mutateAsync({ batchId, fileId })
      .catch((problem: unknown) =>
        showMessage({ says: problem instanceof Error ? problem.message : 'Not added.', failed: true }),
      );
    if (!done) return;
    setOpen(false);
    showMessage({
      says: 'The certificate is added and waits to be proved.',
      action: { says: 'Prove it', href: `/certificates/${done.id}` },
    });
  };
  return (
    <div className="pt-3">
      <FileUpload
        purpose="certificate"
        batchId={batchId}
        label="Certificate"
        hint="PDF or picture, up to 50 MB"
        onArrived={(file) => void add(file.id)}
      />
    </div>
  );
}
