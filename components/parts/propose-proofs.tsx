'use client';

import { useFormContext } from 'react-hook-form';
import { useMe } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { showMessage } from '@/components/ui/message';
import { ApiError, call } from '@/lib/api/client';
import type { ToProve } from '@/lib/parts/to-prove';
import { proposeForStep, type StepAsked } from '@/lib/requirements/contract';
import { notAskedYet } from '@/lib/requirements/same-characteristic';
import { PROCESSES } from '@/lib/trade/process';
import type { PartValues } from './part-form-values';
import { conditionBefore } from './use-typed-part';

/** Asks the tables what this step should have proved and adds it below what is there; nothing typed is changed. */
export function ProposeProofs({ step, append }: { step: number; append: (proofs: ToProve[]) => void }) {
  const { getValues } = useFormContext<PartValues>();
  const units = useMe()?.units ?? 'inch';
  const propose = async () => {
    const asked = askedOf(getValues(), step, units);
    if (!asked) {
      showMessage({ says: 'Choose the process first: what is proposed follows from it.' });
      return;
    }
    try {
      const { proposals } = await call(proposeForStep, asked);
      const added = notAskedYet(proposals, getValues(`route.${step}.toProve`) ?? []);
      append(added);
      showMessage({ says: saysOf(proposals.length, added.length) });
    } catch (error) {
      if (!(error instanceof ApiError)) throw error;
      showMessage({ says: error.message, failed: true });
    }
  };
  return (
    <Button look="word" aria-label={`Propose what step ${step + 1} must prove`} onClick={propose}>
      Propose from the tables
    </Button>
  );
}

export function askedOf(part: PartValues, at: number, units: 'inch' | 'metric'): StepAsked | null {
  const route = part.route ?? [];
  const step = route[at];
  const process = PROCESSES.find((one) => one === step?.process);
  if (!step || !process) return null;
  return {
    process,
    alloy: part.alloy,
    form: part.form,
    clad: part.clad ? '1' : '0',
    thickness: part.thickness ?? '',
    madeCondition: part.madeCondition,
    endCondition: part.endCondition,
    specification: step.specification,
    specificationRevision: step.specificationRevision ?? '',
    classType: step.classType ?? '',
    conditionBefore: conditionBefore(route, at, part.madeCondition),
    targetCondition: step.targetCondition ?? '',
    units,
  };
}

function saysOf(found: number, added: number): string {
  if (added > 0)
    return `${added} proposed, each with where it stands. Look them over; what was there is as it was.`;
  return found > 0
    ? 'All that the tables propose is asked for already.'
    : 'The tables have no limit for this material, condition and specification.';
}
