import { statedItems, type OrderingAnswers } from './ordering-answers';
import type { ToProve } from './to-prove';
import { PROCESS_WORDS, type Process } from '@/lib/trade/process';

interface Step {
  process: Process;
  specification: string;
  specificationRevision: string | null;
  classType: string | null;
  conditionBefore: string | null;
  targetCondition: string | null;
  toProve: readonly ToProve[];
  ordering: OrderingAnswers;
  note: string | null;
}

/** A step in one line with all that can change of it, for the history. */
export function stepWords(step: Step, at: number): string {
  const { specification, specificationRevision, classType, conditionBefore, targetCondition, note, toProve } =
    step;
  const conditions = [conditionBefore, targetCondition].filter(Boolean).join(' to ');
  const proofs = toProve.map(({ characteristic, limit, unit, source, sourceText }) =>
    [characteristic, limit, unit, `(${[source, sourceText].filter(Boolean).join(' ')})`]
      .filter(Boolean)
      .join(' '),
  );
  const stated = statedItems(step.ordering).map(({ item, says }) => `${item}: ${says}`);
  const parts = [
    `${at + 1} ${PROCESS_WORDS[step.process]}`,
    specification,
    specificationRevision,
    classType,
    conditions,
    note,
    proofs.length > 0 ? `proves ${proofs.join('; ')}` : '',
    stated.length > 0 ? `states ${stated.join('; ')}` : '',
  ];
  return parts.filter(Boolean).join(' ');
}
