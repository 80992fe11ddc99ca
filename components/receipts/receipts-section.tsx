'use client';
import { useLazyRead } from '@/components/api/use-api';
import { FileLink } from '@/components/files/file-link';
import { useClock, useMay } from '@/components/session/use-me';
import { ButtonLink } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { Pieces } from '@/components/ui/pieces';
import { Section } from '@/components/ui/section';
import { Cell, GroupRow, Row, Table } from '@/components/ui/table';
import { listReceipts, type ReceiptRow } from '@/lib/receipts/contract';

const COLUMNS = [
  { says: 'Line' },
  { says: 'Part' },
  { says: 'Good', right: true },
  { says: 'Damaged', right: true },
  { says: 'Short', right: true },
  { says: 'Over', right: true },
  { says: 'Note' },
];

/** What was counted in of one batch, on its page. */
export function ReceiptsSection({ batchId }: { batchId: string }) {
  const mayCount = useMay('receipt.count');
  const { data, error, isPending } = useLazyRead(listReceipts, { batchId });
  const away = data?.away ?? 0;
  return (
    <Section
      id="receipts"
      title="Receipts"
      note={data && away > 0 ? <Away count={away} /> : undefined}
      action={
        data?.dispatched &&
        away > 0 &&
        mayCount && (
          <ButtonLink size="small" href={`/batches/${batchId}/receive`}>
            Count in
          </ButtonLink>
        )
      }
    >
      {isPending && <Loading rows={2} label="Loading receipts" />}
      {error && <Failing says="The receipts could not be read." again={error.message} />}
      {data && data.receipts.length === 0 && (
        <Empty
          says="Nothing is back yet."
          comes={
            data.dispatched
              ? 'Each delivery is counted in here, line by line.'
              : 'It comes back after it has left.'
          }
        />
      )}
      {data && data.receipts.length > 0 && (
        <Table label="Receipts of this batch" columns={COLUMNS} dense>
          {data.receipts.map((receipt) => (
            <Receipt key={receipt.id} receipt={receipt} />
          ))}
        </Table>
      )}
    </Section>
  );
}

const Away = ({ count }: { count: number }) => (
  <>
    <Pieces count={count} /> still away
  </>
);

function Receipt({ receipt }: { receipt: ReceiptRow }) {
  const clock = useClock();
  return (
    <>
      <GroupRow
        span={COLUMNS.length}
        says={
          <>
            <Moment at={new Date(receipt.receivedAt)} clock={clock} />{' '}
            <span className="font-normal text-quiet">by {receipt.receivedBy}</span>
          </>
        }
      />
      {receipt.lines.map((line) => (
        <Row key={line.lineNo}>
          <Cell code head="Line">
            {line.lineNo}
          </Cell>
          <Cell code>{line.partNumber}</Cell>
          <Count head="Good" count={line.good} />
          <Count head="Damaged" count={line.damaged} bad />
          <Count head="Short" count={line.short} bad />
          <Count head="Over" count={line.over} />
          <Cell quiet>{line.note}</Cell>
        </Row>
      ))}
      {(receipt.note ?? receipt.photos.length > 0) && (
        <tr role="row">
          <td role="cell" colSpan={COLUMNS.length}>
            {receipt.note} {receipt.photos.length > 0 && <span className="text-quiet">Photos: </span>}
            {receipt.photos.map((photo, at) => (
              <span key={photo.fileId}>
                {at > 0 && ', '}
                <FileLink file={{ id: photo.fileId, name: photo.name }} />
              </span>
            ))}
          </td>
        </tr>
      )}
    </>
  );
}

function Count({ head, count, bad = false }: { head: string; count: number; bad?: boolean }) {
  return (
    <Cell figure head={head} className={bad && count > 0 ? 'text-held-ink' : ''}>
      {count > 0 ? count : ''}
    </Cell>
  );
}
