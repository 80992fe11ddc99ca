'use client';
import { useLazyRead } from '@/components/api/use-api';
import { useMe } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Loading } from '@/components/ui/loading';
import { showMessage } from '@/components/ui/message';
import { Cell, Row, Table } from '@/components/ui/table';
import type { Batch } from '@/lib/batches/contract';
import { limitWords } from '@/lib/parts/limit-words';
import { linesWords } from '@/lib/parts/lines-words';
import type { ToProve } from '@/lib/parts/to-prove';
import { addRequirements, proposeForBatch } from '@/lib/requirements/contract';

import { useBatchWrite } from './use-batch-write';

interface Proposed {
  lineId: string;
  lineNo: number;
  proposals: readonly ToProve[];
}

/** What the tables would ask of each line beyond what it asks already, to be looked at before it is added. */
export function ProposedRequirements({ batch, onDone }: { batch: Batch; onDone: () => void }) {
  const units = useMe()?.units ?? 'inch';
  const { data, isPending, error } = useLazyRead(proposeForBatch, { batchId: batch.id, units });
  const { run, busy } = useBatchWrite(addRequirements);
  if (isPending) return <Loading rows={3} label="Looking in the tables" />;
  const lines = (data?.lines ?? []).filter(({ proposals }) => proposals.length > 0);
  if (error || lines.length === 0)
    return (
      <Empty
        says={error ? error.message : 'The tables propose nothing more.'}
        comes={error ? undefined : 'What they have is asked for already, or they do not reach these parts.'}
        action={
          <Button look="word" onClick={onDone}>
            Close
          </Button>
        }
      />
    );
  const count = lines.reduce((sum, { proposals }) => sum + proposals.length, 0);
  const add = async () => {
    const done = await run({
      batchId: batch.id,
      version: batch.version,
      lines: lines.map(({ lineId, proposals }) => ({ lineId, requirements: [...proposals] })),
    });
    if (!done) return;
    onDone();
    showMessage({ says: `${count} added to ${lines.length === 1 ? 'one line' : `${lines.length} lines`}.` });
  };
  return (
    <div className="border-l-4 border-ink bg-bench px-3 py-2">
      <ProposedList lines={lines} />
      <p className="py-1 text-source text-quiet">
        Reference values, each with where it stands and how sure that is. Drawing, order and the revision
        invoked come first; every line can be typed over once it is added.
      </p>
      <div className="flex flex-wrap items-center gap-3 pt-1">
        <Button size="small" busy={busy} busyLabel="Adding" onClick={add}>
          {`Add these ${count}`}
        </Button>
        <Button look="word" onClick={onDone}>
          Leave it as it is
        </Button>
      </div>
    </div>
  );
}

const COLUMNS = [{ says: 'What' }, { says: 'Limit' }, { says: 'Where it stands' }];

/** Lines with the same proposals stand together. */
export function ProposedList({ lines }: { lines: readonly Proposed[] }) {
  const same = new Map<string, { lineNos: number[]; proposals: readonly ToProve[] }>();
  for (const { lineNo, proposals } of lines) {
    const key = JSON.stringify(proposals);
    const known = same.get(key) ?? { lineNos: [], proposals };
    known.lineNos.push(lineNo);
    same.set(key, known);
  }
  return [...same.values()].map(({ lineNos, proposals }) => (
    <div key={lineNos.join()} className="pb-2">
      <h3 className="first-letter:uppercase">{linesWords(lineNos)}</h3>
      <Table label={`Proposed for ${linesWords(lineNos)}`} columns={COLUMNS} dense>
        {proposals.map((one) => (
          <Row key={one.characteristic}>
            <Cell className="w-1/4">{one.characteristic}</Cell>
            <Cell code strong head="Limit">
              {limitWords(one)}
            </Cell>
            <Cell quiet>{one.sourceText || one.source}</Cell>
          </Row>
        ))}
      </Table>
    </div>
  ));
}
