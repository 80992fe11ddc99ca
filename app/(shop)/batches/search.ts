import type { BatchFilter } from '@/components/batches/batches-screen';
import type { AskedStep } from '@/components/batches/new-batch-form';
import { listBatches } from '@/lib/batches/contract';
import { listWaitingLots } from '@/lib/batches/waiting-contract';

type Search = Record<string, string | string[] | undefined>;

/** A stage that is none shows all batches. */
export function readBatchFilter(search: Search): BatchFilter {
  const { stage } = listBatches.input.pick({ stage: true }).catch({}).parse(search);
  return stage === undefined ? {} : { stage };
}

/** The step the address asks for; null where it asks for none. */
export function readAskedStep(search: Search): AskedStep | null {
  const asked = listWaitingLots.input
    .pick({ process: true, specification: true, specificationRevision: true, classType: true })
    .safeParse(search);
  if (!asked.success) return null;
  const { process, specification, specificationRevision, classType } = asked.data;
  return {
    process,
    specification,
    ...(specificationRevision === undefined ? {} : { specificationRevision }),
    ...(classType === undefined ? {} : { classType }),
  };
}
