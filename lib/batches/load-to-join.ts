import type { BatchTables } from '@/lib/reference/batch-tables';
import type { KeptApart } from '@/lib/trade/heat-treat/load-plan';
import { APART_WORDS } from '@/lib/reference/load-words';

import { groupedBy } from './grouped-by';
import { kindOf, loadsOfBatch, type LoadLine, type LoadsOfBatch, type NotPlanned } from './loads-of-batch';
import { notPlannedWords } from './not-planned-words';

/** The furnace load of a batch that a waiting lot could join, by its number in the plan; else why there is none. */
export type LoadToJoin =
  | { readonly number: number }
  | { readonly number: null; readonly because: KeptApart['reason'] | 'no_load_yet' }
  | { readonly number: null; readonly notPlanned: NotPlanned };

/**
 * Which load a lot could ride along in: the first of the plan whose lines may share a cycle with it, so that no load is
 * added. Asked of many lots for one batch, whose plan is made once.
 *
 * @param lines that are on the batch.
 * @returns what answers for one lot; null where its process is not planned in loads.
 * @example 2024 bare 0.063 in to T42 joins the load of 2024 bare 0.050 in; 7075 gets a load of its own.
 */
export function loadsToJoin(
  tables: BatchTables,
  lines: readonly LoadLine[],
): (waiting: LoadLine) => LoadToJoin | null {
  // One line of each kind says all that a load asks.
  const loads = (loadsOfBatch(tables, lines)?.loads ?? []).map((load) =>
    [...groupedBy(load.lines, kindOf).values()].flatMap(([first]) => first ?? []),
  );
  return (waiting) => {
    const alone = loadsOfBatch(tables, [waiting]);
    if (!alone) return null;
    const [left] = alone.unplaced;
    if (left) return { number: null, notPlanned: left.reason };
    const plans = loads.map((load) => loadsOfBatch(tables, [...load, waiting]));
    const at = plans.findIndex((plan) => plan?.loads.length === 1);
    if (at >= 0) return { number: at + 1 };
    const against = plans.flatMap((plan) => plan?.apart ?? []).filter(isAbout(waiting));
    // Beside one kind alone it may be fine; what keeps it out of the load is the kind that it cannot share with.
    const reason = against.find((one) => one.reason !== 'fits_but_planned_apart') ?? against[0];
    return { number: null, because: reason?.reason ?? 'no_load_yet' };
  };
}

const isAbout =
  ({ id }: LoadLine) =>
  ({ between }: LoadsOfBatch<LoadLine>['apart'][number]): boolean =>
    between.flat().some((line) => line.id === id);

/** `load 2`, or why it would take a load of its own. */
export function loadToJoinWords(found: LoadToJoin): string {
  if (found.number !== null) return `load ${found.number}`;
  if ('notPlanned' in found) return `not planned: ${notPlannedWords(found.notPlanned)}`;
  return found.because === 'no_load_yet'
    ? 'a load of its own'
    : `a load of its own: ${APART_WORDS[found.because]}`;
}
