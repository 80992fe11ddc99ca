import type { Process } from '@/lib/trade/process';

/** Pieces of a lot that left for one step in one batch. */
export interface SentOut {
  stepId: string;
  process: Process;
  pieces: number;
}

/**
 * The treatments that some piece of a lot may have had when more of it leaves for a step. Batches of one step that
 * together hold no more than the lot had different pieces, and count once; beyond that some piece went out again, and
 * each of them may have held it. Of the step that it leaves for, batches with other pieces do not count.
 */
export function solutionTreatedBefore(
  sent: readonly SentOut[],
  leaves: { stepId: string; pieces: number; made: number },
): Process[] {
  return [...new Set(sent.map(({ stepId }) => stepId))].flatMap((stepId) => {
    const ofStep = sent.filter((one) => one.stepId === stepId);
    const isThis = stepId === leaves.stepId;
    const pieces = ofStep.reduce((sum, one) => sum + one.pieces, isThis ? leaves.pieces : 0);
    const areOthers = pieces <= leaves.made;
    if (isThis && areOthers) return [];
    return ofStep.slice(0, areOthers ? 1 : ofStep.length).map(({ process }) => process);
  });
}
