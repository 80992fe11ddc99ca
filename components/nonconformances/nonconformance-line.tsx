'use client';
import Link from 'next/link';

import { useClock } from '@/components/session/use-me';
import { Moment } from '@/components/ui/day';
import { Cell, Row } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import type { NonconformanceRow } from '@/lib/nonconformances/contract';
import { KIND_WORDS } from '@/lib/nonconformances/kind';

export const NONCONFORMANCE_COLUMNS = [
  { says: 'Number' },
  { says: 'Batch' },
  { says: 'Line and part' },
  { says: 'Pieces', right: true },
  { says: 'Kind' },
  { says: 'What' },
  { says: 'Since' },
];

/** One nonconformance in a list. On the page of its own batch the tag would only repeat the page. */
export function NonconformanceLine({
  row,
  ofOneBatch = false,
}: {
  row: NonconformanceRow;
  ofOneBatch?: boolean;
}) {
  const clock = useClock();
  const left = row.pieces - row.decided;
  const isOpen = row.closedAt === null;
  return (
    <Row state={isOpen ? 'asks' : 'rest'}>
      <Cell>
        <Link href={`/nonconformances/${row.id}`} className="num font-semibold">
          {row.number}
        </Link>
      </Cell>
      {!ofOneBatch && (
        <Cell>
          <BatchTag stage={row.stage} number={row.batchNumber} href={`/batches/${row.batchId}`} size="row" />
        </Cell>
      )}
      <Cell>
        <span className="num">{row.lineNo}</span> {row.partNumber}{' '}
        <span className="text-quiet">lot {row.lotNumber}</span>
      </Cell>
      <Cell figure head="Pieces">
        {isOpen && left < row.pieces ? `${left} of ${row.pieces}` : row.pieces}
      </Cell>
      <Cell strong className={isOpen ? 'text-held-ink' : ''}>
        {KIND_WORDS[row.kind]}
      </Cell>
      <Cell>{row.what}</Cell>
      <Cell head="Since">
        <Moment at={new Date(row.openedAt)} clock={clock} />
      </Cell>
    </Row>
  );
}
