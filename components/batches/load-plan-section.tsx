'use client';
import { useRead } from '@/components/api/use-api';
import { useMay, useMe } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { getBatch, getBatchLines } from '@/lib/batches/contract';
import { getLoadPlan, setLoads, type LoadPlan } from '@/lib/batches/load-contract';

import { LoadPlanView } from './load-plan-view';
import { useBatchWrite } from './use-batch-write';

/** How the lines lie in the fewest furnace loads; one press writes the loads into the lines. */
export function LoadPlanSection({ batchId }: { batchId: string }) {
  const { data: plan } = useRead(getLoadPlan, { batchId });
  const units = useMe()?.units ?? 'inch';
  if (plan.method === null) return null;
  return (
    <Section
      id="load-plan"
      title="Load plan"
      note={noteOf(plan)}
      action={plan.loads.length > 0 && <SetLoads batchId={batchId} plan={plan} />}
    >
      {plan.loads.length === 0 && plan.unplaced.length === 0 ? (
        <Empty says="No line to plan." comes="Loads follow from the lines." />
      ) : (
        <LoadPlanView plan={plan} units={units} />
      )}
    </Section>
  );
}

function noteOf({ loads, method }: LoadPlan): string {
  const count = `${loads.length} ${loads.length === 1 ? 'load' : 'loads'}`;
  if (loads.length < 2) return count;
  return method === 'exact'
    ? `${count}: exact, no plan has fewer`
    : `${count}: a good plan, one with fewer may exist`;
}

function SetLoads({ batchId, plan }: { batchId: string; plan: LoadPlan }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const { data } = useRead(getBatchLines, { batchId });
  const mayBuild = useMay('batch.build');
  const { run, busy } = useBatchWrite(setLoads);
  if (plan.isSet) return <span className="text-second text-quiet">the lines lie so</span>;
  if (!mayBuild) return null;
  const before = data.lines.map(({ id, loadNo }) => ({ lineId: id, loadNo }));
  const set = async () => {
    const done = await run({
      batchId,
      version: batch.version,
      loads: [
        ...plan.loads.flatMap(({ number, lines }) => lines.map(({ lineId }) => ({ lineId, loadNo: number }))),
        ...plan.unplaced.map(({ lineId }) => ({ lineId, loadNo: null })),
      ],
    });
    if (!done) return;
    showMessage({
      says: `${plan.loads.length === 1 ? 'One load is' : `${plan.loads.length} loads are`} set.`,
      action: { says: 'Undo', run: () => run({ batchId, version: done.version, loads: before }) },
    });
  };
  return (
    <Button size="small" busy={busy} busyLabel="Setting" onClick={set}>
      Set these loads
    </Button>
  );
}
