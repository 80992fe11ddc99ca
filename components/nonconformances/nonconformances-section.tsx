'use client';
import { useState } from 'react';

import { useLazyRead } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import { Table } from '@/components/ui/table';
import { listNonconformances } from '@/lib/nonconformances/contract';

import { HoldForm } from './hold-form';
import { NONCONFORMANCE_COLUMNS, NonconformanceLine } from './nonconformance-line';

const COLUMNS = NONCONFORMANCE_COLUMNS.filter((column) => column.says !== 'Batch');

/** What of one batch is held, or was, on its page. */
export function NonconformancesSection({ batchId, dispatched }: { batchId: string; dispatched: boolean }) {
  const mayRaise = useMay('nonconformance.raise');
  const [holding, setHolding] = useState(false);
  const { data, error, isPending } = useLazyRead(listNonconformances, { batchId, limit: 200 });
  const rows = data?.rows ?? [];
  const open = rows.filter((row) => row.closedAt === null).length;
  return (
    <Section
      id="nonconformances"
      title="Nonconformances"
      note={open > 0 ? `${open} open` : undefined}
      action={
        dispatched &&
        mayRaise &&
        !holding && (
          <Button look="word" onClick={() => setHolding(true)}>
            Hold pieces
          </Button>
        )
      }
    >
      {holding && (
        <div className="py-2">
          <HoldForm batchId={batchId} kind="requirement" what="" onDone={() => setHolding(false)} />
        </div>
      )}
      {isPending && <Loading rows={1} label="Loading nonconformances" />}
      {error && <Failing says="The nonconformances could not be read." again={error.message} />}
      {data && rows.length === 0 && !holding && <Empty says="Nothing of it is held." />}
      {rows.length > 0 && (
        <Table label="Nonconformances of this batch" columns={COLUMNS}>
          {rows.map((row) => (
            <NonconformanceLine key={row.id} row={row} ofOneBatch />
          ))}
        </Table>
      )}
    </Section>
  );
}
