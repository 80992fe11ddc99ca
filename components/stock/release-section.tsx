'use client';
import Link from 'next/link';

import { useLazyRead } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { ButtonLink } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { PROCESS_WORDS } from '@/lib/trade/process';
import { getGate, listReleases } from '@/lib/stock/contract';

const COLUMNS = [
  { says: 'When' },
  { says: 'Lot' },
  { says: 'Part' },
  { says: 'Pieces', right: true },
  { says: 'To' },
  { says: 'By' },
];

/** What passed the gate of one batch and what may pass now, on its page. */
export function ReleaseSection({ batchId }: { batchId: string }) {
  const clock = useClock();
  const { data, error, isPending } = useLazyRead(listReleases, { batchId });
  const { data: gate } = useLazyRead(getGate, { batchId });
  const mayPass = gate?.lines.reduce((sum, line) => sum + line.mayPass, 0) ?? 0;
  const rows = data?.rows ?? [];
  const isOver = gate ? gate.lines.every((line) => line.released >= line.pieces) : false;
  return (
    <Section
      id="release"
      title="Release"
      note={mayPass > 0 ? `${mayPass} may pass now` : undefined}
      action={
        <span className="flex flex-wrap items-center gap-4">
          {rows.length > 0 && (
            <ButtonLink look="word" href={`/batches/${batchId}/labels`}>
              Labels
            </ButtonLink>
          )}
          {gate?.dispatched && !isOver && (
            <ButtonLink size="small" href={`/batches/${batchId}/release`}>
              {mayPass > 0 ? `Release ${mayPass}` : 'What is missing'}
            </ButtonLink>
          )}
        </span>
      }
    >
      {isPending && <Loading rows={2} label="Loading releases" />}
      {error && <Failing says="The releases could not be read." again={error.message} />}
      {data && rows.length === 0 && (
        <Empty
          says="Nothing is released yet."
          comes="Pieces pass when they are counted in, proved, not on hold and paid."
        />
      )}
      {rows.length > 0 && (
        <Table label="Released of this batch" columns={COLUMNS} dense>
          {rows.map((row) => (
            <Row key={row.id}>
              <Cell head="When">
                <Moment at={new Date(row.releasedAt)} clock={clock} />
              </Cell>
              <Cell>
                <Link href={`/lots/${row.lotId}`} className="num font-semibold">
                  {row.lotNumber}
                </Link>
              </Cell>
              <Cell>
                <span className="num">{row.partNumber}</span>{' '}
                <span className="text-quiet">rev {row.partRevision}</span>
              </Cell>
              <Cell figure head="Pieces">
                {row.pieces}
              </Cell>
              <Cell head="To">
                {row.location ??
                  (row.nextProcess ? `on to ${PROCESS_WORDS[row.nextProcess]}` : 'the next step')}
              </Cell>
              <Cell quiet>{row.releasedBy}</Cell>
            </Row>
          ))}
        </Table>
      )}
    </Section>
  );
}
