'use client';
import Link from 'next/link';

import { usePages } from '@/components/api/use-api';
import { useClock, useMay } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { Day, Moment } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { PageHead } from '@/components/ui/page-head';
import { Cell, GroupRow, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import { listCertificates, type CertificateRow } from '@/lib/certificates/contract';

import { certificateName, STATE_WORDS } from './certificate-words';
import { IntakeSection } from './intake-section';

const COLUMNS = [
  { says: 'Certificate' },
  { says: 'Dated', className: 'md:max-lg:hidden' },
  { says: 'Batch' },
  { says: 'From' },
  { says: 'Came' },
  { says: 'Decided', right: true },
  { says: 'Covers', right: true },
  { says: 'State' },
];

/** What waits to be proved, then what was. */
export function CertificatesScreen() {
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(
    listCertificates,
    {},
  );
  const rows = data?.pages.flatMap((page) => page.rows) ?? [];
  const waiting = rows.filter((row) => row.state === 'waiting');
  const done = rows.filter((row) => row.state !== 'waiting');
  const mayCount = useMay('receipt.count');
  return (
    <>
      <PageHead
        title="Certificates"
        sub={isPending ? undefined : waitingWords(waiting.length)}
        actions={
          <>
            {mayCount && <ButtonLink href="/receive">Count in</ButtonLink>}
            <ButtonLink href="/nonconformances">Nonconformances</ButtonLink>
          </>
        }
      />
      <IntakeSection />
      {isPending && <Loading label="Loading certificates" rows={8} />}
      {error && <Failing says="The certificates could not be read." again={error.message} />}
      {data && rows.length === 0 && (
        <Empty
          says="No certificate has come yet."
          comes="A processor sends them from the link in the dispatch mail; one that came on paper is added at its batch."
          action={<Link href="/batches">To the batches</Link>}
        />
      )}
      {rows.length > 0 && (
        <Table label="Certificates" columns={COLUMNS}>
          {waiting.length > 0 && (
            <GroupRow says="Waiting to be proved" count={waiting.length} span={COLUMNS.length} />
          )}
          {waiting.map((row) => (
            <CertificateLine key={row.id} row={row} />
          ))}
          {done.length > 0 && <GroupRow says="Signed or set aside" span={COLUMNS.length} />}
          {done.map((row) => (
            <CertificateLine key={row.id} row={row} />
          ))}
        </Table>
      )}
      {hasNextPage && (
        <div className="pt-3">
          <Button
            size="small"
            busy={isFetchingNextPage}
            busyLabel="Reading on"
            onClick={() => fetchNextPage().then(() => undefined)}
          >
            Show more
          </Button>
        </div>
      )}
    </>
  );
}

function CertificateLine({ row }: { row: CertificateRow }) {
  const clock = useClock();
  return (
    <Row state={row.state === 'set_aside' ? 'off' : 'rest'}>
      <Cell className="max-w-96 min-w-28 [overflow-wrap:anywhere]">
        <Link href={`/certificates/${row.id}`} className="num font-semibold">
          {certificateName(row)}
        </Link>
      </Cell>
      <Cell head="Dated" className="whitespace-nowrap md:max-lg:hidden">
        {row.datedOn && <Day day={row.datedOn} clock={clock} short />}
      </Cell>
      <Cell>
        <BatchTag stage={row.stage} number={row.batchNumber} href={`/batches/${row.batchId}`} size="row" />
      </Cell>
      <Cell head="From">{row.processor}</Cell>
      <Cell head="Came">
        <Moment at={new Date(row.createdAt)} clock={clock} />
      </Cell>
      <Cell figure head="Decided">
        {row.decided} of {row.requirements}
      </Cell>
      <Cell figure head="Covers">
        {row.coveredPieces > 0 ? row.coveredPieces : ''}
      </Cell>
      <Cell quiet={row.state !== 'waiting'} strong={row.state === 'waiting'}>
        {row.fileVerified ? STATE_WORDS[row.state] : 'did not arrive whole'}
      </Cell>
    </Row>
  );
}

function waitingWords(count: number): string {
  if (count === 0) return 'None waits to be proved.';
  return count === 1 ? 'One waits to be proved.' : `${count} wait to be proved.`;
}
