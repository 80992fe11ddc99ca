import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { NewBatchForm } from '@/components/batches/new-batch-form';
import { NewBatchSteps } from '@/components/batches/new-batch-steps';
import {
  listStepProcessorsEndpoint,
  listWaitingLotsEndpoint,
  listWaitingStepsEndpoint,
} from '@/lib/batches/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

import { readAskedStep } from '../search';

export const metadata: Metadata = { title: 'Start a batch' };

export default async function NewBatchPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const step = readAskedStep(await searchParams);
  if (step === null) {
    return (
      <Prefetched queries={[ask(getMeEndpoint, {}), ask(listWaitingStepsEndpoint, {})]}>
        <NewBatchSteps />
      </Prefetched>
    );
  }
  const { process, specification } = step;
  return (
    <Prefetched
      queries={[
        ask(getMeEndpoint, {}),
        ask(listWaitingLotsEndpoint, { ...step }),
        ask(listStepProcessorsEndpoint, { process, specification }),
      ]}
    >
      <NewBatchForm key={JSON.stringify(step)} step={step} />
    </Prefetched>
  );
}
