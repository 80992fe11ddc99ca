import { expect } from 'vitest';

import type { Killable } from './killable';

export const ROUNDS = 50;
/** Before them, to see how long the work takes on this machine today. */
export const UNDISTURBED = 3;
/** Kills fall anywhere from the beginning of the work to well after its usual end. */
export const BEYOND_THE_END = 1.3;
/** Fewer kills in the middle of the work, and the rounds prove nothing. */
export const FEWEST_HITS = ROUNDS / 5;

/** Runs work that a kill falls into, and gives back what came of it in the end. */
type Disturb = <T>(work: () => Promise<T>) => Promise<T>;

/**
 * Does something in rounds while a process is killed at a random point of each and started again.
 *
 * @param round prepares in quiet, hands the work to `disturb`, then looks at what is there.
 */
export async function inRounds(
  killable: Killable,
  seed: number,
  round: (disturb: Disturb, number: number) => Promise<void>,
): Promise<void> {
  const random = seeded(seed);
  const undisturbed: number[] = [];
  let hits = 0;
  for (let number = 1; number <= UNDISTURBED; number++) {
    await round(async (work) => {
      const began = performance.now();
      const result = await work();
      undisturbed.push(performance.now() - began);
      return result;
    }, -number);
  }
  const usualMs = median(undisturbed);
  for (let number = 1; number <= ROUNDS; number++) {
    killable.prepare();
    await round(async (work) => {
      let isDone = false;
      const again = killable.killAfter(random() * usualMs * BEYOND_THE_END).then(() => {
        if (!isDone) hits++;
        return killable.start();
      });
      const result = await work();
      isDone = true;
      await again;
      return result;
    }, number);
  }
  expect(hits, `kills in the middle, of ${ROUNDS}`).toBeGreaterThanOrEqual(FEWEST_HITS);
}

export const median = (values: readonly number[]): number =>
  values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;

/** Numbers between 0 and 1 that are the same in every run, so that a round that fails can be looked at again. */
export function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state / 2 ** 32;
  };
}
