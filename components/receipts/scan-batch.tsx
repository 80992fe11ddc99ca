'use client';
import { useRouter } from 'next/navigation';
import { useEffect, useRef, useState, type FormEvent } from 'react';

import { useLazyRead } from '@/components/api/use-api';
import { CameraScan } from '@/components/shell/camera-scan';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { TextField } from '@/components/ui/field';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import { call } from '@/lib/api/client';
import { listBatches, type BatchRow } from '@/lib/batches/contract';
import { findForReceiving } from '@/lib/receipts/contract';

/**
 * Which batch is on the bench: by its code, its number, or from what is out.
 *
 * @param asked what a scanner typed and sent before this page was awake.
 */
export function ScanBatch({ asked = '' }: { asked?: string }) {
  const router = useRouter();
  const [camera, setCamera] = useState(false);
  const [refused, setRefused] = useState<string>();

  const open = async (text: string) => {
    if (text.trim() === '') return setRefused('Scan a code or type a number.');
    try {
      const { batchId } = await call(findForReceiving, { text });
      router.push(`/batches/${batchId}/receive`);
    } catch (error) {
      setCamera(false);
      setRefused(error instanceof Error ? error.message : 'Not found.');
    }
  };
  const openAsked = useRef(() => open(asked));
  useEffect(() => {
    if (asked !== '') void openAsked.current();
  }, [asked]);
  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const text = new FormData(event.currentTarget).get('number');
    await open(typeof text === 'string' ? text : '');
  };

  return (
    <>
      <PageHead
        title="Count in"
        sub="Scan the code of the traveller, or type the number of the batch or the order."
      />
      <form noValidate onSubmit={submit} className="flex max-w-prose flex-wrap items-start gap-2.5">
        <TextField
          className="min-w-56 flex-1"
          label="Number"
          name="number"
          defaultValue={asked}
          mono
          autoFocus
          autoComplete="off"
          autoCapitalize="characters"
          spellCheck={false}
          error={refused}
          onChange={() => setRefused(undefined)}
        />
        <span className="flex gap-2 sm:pt-6">
          <Button look="primary" type="submit">
            Open
          </Button>
          <Button onClick={() => setCamera(!camera)}>{camera ? 'Close the camera' : 'Use the camera'}</Button>
        </span>
      </form>
      {camera && (
        <div className="max-w-sm pt-3">
          <CameraScan onCode={(code) => void open(code)} />
        </div>
      )}
      <OutNow />
    </>
  );
}

const COLUMNS = [{ says: 'Batch' }, { says: 'Order' }, { says: 'Processor' }, { says: 'Back', right: true }];

function OutNow() {
  const atProcessor = useLazyRead(listBatches, { stage: 'at_processor', limit: 50 }).data?.rows ?? [];
  const dispatched = useLazyRead(listBatches, { stage: 'dispatched', limit: 50 }).data?.rows ?? [];
  const rows = [...atProcessor, ...dispatched];
  return (
    <Section title="Out now" note={rows.length > 0 ? rows.length : undefined} className="pt-6">
      {rows.length === 0 ? (
        <Empty
          says="Nothing is out."
          comes="A batch stands here from its dispatch until all of it is back."
        />
      ) : (
        <Table label="Batches that are out" columns={COLUMNS}>
          {rows.map((row) => (
            <OutRow key={row.id} row={row} />
          ))}
        </Table>
      )}
    </Section>
  );
}

function OutRow({ row }: { row: BatchRow }) {
  return (
    <Row>
      <Cell>
        <BatchTag stage={row.stage} number={row.number} href={`/batches/${row.id}/receive`} />
      </Cell>
      <Cell code head="Order" className="whitespace-nowrap">
        {row.orderNumber}
      </Cell>
      <Cell>{row.processor}</Cell>
      <Cell figure head="Back">
        {row.piecesBack} of {row.pieces}
      </Cell>
    </Row>
  );
}
