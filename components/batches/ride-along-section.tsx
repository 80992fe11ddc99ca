'use client';
import Link from 'next/link';

import { usePages, useRead } from '@/components/api/use-api';
import { ShowMore } from '@/components/lots/show-more';
import { useMay, useMe } from '@/components/session/use-me';
import { Amount } from '@/components/ui/amount';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Loading } from '@/components/ui/loading';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { addLine, getBatch, getBatchLines, type Batch } from '@/lib/batches/contract';
import { expectedPrice } from '@/lib/batches/expected-price';
import { listWaitingLots, type WaitingLot } from '@/lib/batches/waiting-contract';

import { FigureKnown } from './figure-known';
import { massKnown, massText, massUnit, type Units } from './measures';
import { useBatchWrite } from './use-batch-write';

/** Lots that wait for the same step: while there is room under the lot minimum they cost nothing more. */
export function RideAlongSection({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const { data: held } = useRead(getBatchLines, { batchId });
  const units = useMe()?.units ?? 'inch';
  const { process, step } = batch;
  const { specification, specificationRevision, classType } = step;
  const asked = {
    process,
    specification,
    ...(specificationRevision === null ? {} : { specificationRevision }),
    ...(classType === null ? {} : { classType }),
    besideBatchId: batchId,
  };
  const lots = usePages(listWaitingLots, asked);
  const rows = lots.data?.pages.flatMap((page) => page.rows) ?? [];
  const room = expectedPrice({ ...batch, lines: held.lines }).toMinimumMinor;
  const hasLoads = rows.some(({ load }) => load !== null);
  const columns = [
    { says: 'Lot' },
    { says: 'Part' },
    { says: 'Material' },
    { says: 'Condition' },
    { says: 'Pieces', right: true },
    { says: `Mass, ${massUnit(units)}`, right: true },
    ...(hasLoads ? [{ says: 'Load' }] : []),
    { says: 'Add', hidden: true },
  ];
  return (
    <Section
      id="ride-along"
      title="Lots that could ride along"
      note="waiting for the same step, oldest first"
      action={
        room > 0 && (
          <span className="text-second text-quiet">
            room under the minimum <Amount minor={room} className="font-semibold text-ink" />
          </span>
        )
      }
    >
      {lots.isPending && <Loading rows={3} label="Loading lots that wait" />}
      {lots.data && rows.length === 0 && <Empty says="No other lot waits for this step." />}
      {rows.length > 0 && (
        <Table label="Lots that could ride along" columns={columns}>
          {rows.map((row) => (
            <RideAlong key={row.lotId} batch={batch} row={row} units={units} />
          ))}
        </Table>
      )}
      <ShowMore hasMore={lots.hasNextPage} busy={lots.isFetchingNextPage} more={lots.fetchNextPage} />
    </Section>
  );
}

function RideAlong({ batch, row, units }: { batch: Batch; row: WaitingLot; units: Units }) {
  const mayBuild = useMay('batch.build');
  const { run } = useBatchWrite(addLine);
  const add = async () => {
    const done = await run({ batchId: batch.id, lotId: row.lotId, stepId: row.stepId, pieces: row.pieces });
    if (done) showMessage({ says: `${row.lotNumber} is on ${batch.number}, ${row.pieces} pc.` });
  };
  return (
    <Row>
      <Cell>
        <Link href={`/lots/${row.lotId}`} className="num font-semibold">
          {row.lotNumber}
        </Link>
      </Cell>
      <Cell>
        <span className="num font-semibold">{row.partNumber}</span> <span className="text-quiet">rev</span>{' '}
        <span className="num">{row.partRevision}</span> {row.partName}
        {row.partSuperseded && (
          <span className="block text-source text-dispatched-ink">superseded drawing</span>
        )}
      </Cell>
      <Cell head="Material">
        <span className="font-cond">{row.material}</span>{' '}
        <span className="num whitespace-nowrap">{row.thickness}</span>
      </Cell>
      <Cell code head="Condition" className="whitespace-nowrap">
        {row.conditionBefore}{' '}
        {row.conditionBefore && row.targetCondition && <span className="font-cond text-faint">to</span>}{' '}
        {row.targetCondition}
      </Cell>
      <Cell figure head="Pieces">
        {row.pieces.toLocaleString('en-US')}
      </Cell>
      <Cell figure head={`Mass, ${massUnit(units)}`}>
        <FigureKnown known={massKnown(row)} text={(grams) => massText(grams, units)} />
      </Cell>
      {row.load && (
        <Cell head="Load" className="min-w-28">
          <span className={row.load.number === null ? 'text-second text-quiet' : 'font-semibold'}>
            {row.load.says}
          </span>
        </Cell>
      )}
      <Cell right>
        {mayBuild && (
          <Button look="word" aria-label={`Add ${row.lotNumber}`} onClick={add}>
            Add
          </Button>
        )}
      </Cell>
    </Row>
  );
}
