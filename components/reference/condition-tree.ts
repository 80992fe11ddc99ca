import type { ConditionStep } from '@/lib/trade/tempers/condition-graph';
import type { ReachableCondition } from '@/lib/trade/tempers/reachable-conditions';
import type { Temper } from '@/lib/trade/tempers/temper';

export interface TreeNode {
  readonly condition: Temper;
  /** Steps from where it began. */
  readonly depth: number;
  /** Its line in the drawing, from 0; half lines stand between their branches. */
  readonly line: number;
  /** How it is reached; null where it began. */
  readonly step: ConditionStep | null;
  readonly parent: Temper | null;
}

/** Conditions that can be made as a tree to be drawn: branches under each other, what they come from between them. */
export function conditionTree(from: Temper, reachable: readonly ReachableCondition[]): readonly TreeNode[] {
  const steps = new Map(reachable.flatMap(({ path }) => path.map((step) => [step.to, step] as const)));
  const nodes: TreeNode[] = [];
  let lines = 0;
  const place = (condition: Temper, depth: number): number => {
    const branches = [...steps.values()].filter((step) => step.from === condition).map(({ to }) => to);
    const placed = branches.map((branch) => place(branch, depth + 1));
    const [first] = placed;
    const line = first === undefined ? lines++ : (first + (placed.at(-1) ?? first)) / 2;
    const step = steps.get(condition) ?? null;
    nodes.push({ condition, depth, line, step, parent: step?.from ?? null });
    return line;
  };
  place(from, 0);
  return nodes;
}
