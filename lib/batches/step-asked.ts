import { PROCESS_WORDS, type Process } from '@/lib/trade/process';

/** What one batch does to all its lines: the process, to one specification at one revision, in one class. */
export interface StepAsked {
  process: Process;
  specification: string;
  specificationRevision: string | null;
  classType: string | null;
}

export const isSameStep = (one: StepAsked, other: StepAsked): boolean =>
  one.process === other.process &&
  one.specification === other.specification &&
  (one.specificationRevision ?? '') === (other.specificationRevision ?? '') &&
  (one.classType ?? '') === (other.classType ?? '');

/** `AMS 2770 rev R, class 2` */
export function specificationWords({
  specification,
  specificationRevision,
  classType,
}: Omit<StepAsked, 'process'>): string {
  return `${specification}${specificationRevision ? ` rev ${specificationRevision}` : ''}${classType ? `, ${classType}` : ''}`;
}

/** `solution and quench to AMS 2770 rev R` */
export const stepWords = (step: StepAsked): string =>
  `${PROCESS_WORDS[step.process]} to ${specificationWords(step)}`;
