import type { PartTables } from '@/lib/reference/published-tables';
import { callOutFindings, type CallOutFinding } from '@/lib/trade/lineage/call-out-findings';
import type { LineageEventKind } from '@/lib/trade/lineage/lineage-event';
import { recogniseSpecification } from '@/lib/trade/lineage/recognise-specification';
import { standingOn } from '@/lib/trade/lineage/standing-on';
import { successorsOf, type SuccessorFound } from '@/lib/trade/lineage/successors-of';

const ENDED: readonly LineageEventKind[] = ['renamed', 'superseded', 'withdrawn', 'cancelled'];

export interface CalledSpecification {
  /** Written one way: `MIL-H-6088`. */
  readonly number: string;
  /** What took its place in the end, for parts; more than one where the number forks. Empty while it stands. */
  readonly successors: readonly SuccessorFound[];
  /** What the call-out silently means. */
  readonly notes: readonly CallOutFinding[];
}

/**
 * What is known of the specification that a step names: how it stands on a day (`YYYY-MM-DD`), what follows it, what
 * the call-out means. Null where the number is not recognised.
 */
export function calledSpecification(
  { lineage, callOuts }: Pick<PartTables, 'lineage' | 'callOuts'>,
  step: { specification: string; revision: string; classType: string },
  on: string,
): CalledSpecification | null {
  const read = recogniseSpecification(step.specification);
  if (!read) return null;
  const { number, revision, rest } = read;
  const standing = standingOn(lineage, number, { on, by: 'publisher' });
  const hasEnded = standing.ok && ENDED.includes(standing.standing);
  const found = hasEnded ? successorsOf(lineage, number, 'parts') : undefined;
  return {
    number,
    successors: found?.ok ? found.successors.filter(({ last }) => last) : [],
    notes: callOutFindings(callOuts, {
      number,
      revision: step.revision || revision,
      typeStated: /\btype\b/i.test(`${step.classType} ${rest}`),
      forParts: true,
    }),
  };
}
