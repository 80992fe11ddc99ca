import { temperOf } from '@/lib/parts/material-of';
import type { BatchTables } from '@/lib/reference/batch-tables';
import type { LoadGroup, LoadProcess } from '@/lib/trade/heat-treat/load-needs';
import { planLoads, type KeptApart, type LoadPlan, type PlannedLoad } from '@/lib/trade/heat-treat/load-plan';
import type { Process } from '@/lib/trade/process';
import { celsiusDifferenceFromFahrenheit } from '@/lib/trade/units/temperature';

import type { CheckedLine } from './check';
import { groupedBy } from './grouped-by';
import { metalOf } from './metal-of';

/** ±10 °F, as FAA-H-8083-30 has metal held in a furnace. */
const UNIFORMITY_C = celsiusDifferenceFromFahrenheit(10);

/** What loads are planned of: lines of a batch, and lots that could join it. */
export type LoadLine = Pick<CheckedLine, 'id' | 'part' | 'step' | 'stepId'>;

export interface LoadOfLines<Line> extends PlannedLoad {
  readonly lines: readonly Line[];
  /** The thickest part: its thickness governs the soak. */
  readonly governing: Line;
}

export interface LoadsOfBatch<Line> {
  readonly method: LoadPlan['method'];
  readonly loads: readonly LoadOfLines<Line>[];
  readonly apart: readonly (Omit<KeptApart, 'between'> & {
    readonly between: readonly [readonly Line[], readonly Line[]];
  })[];
  /** Nothing is concluded about them. */
  readonly unplaced: readonly Line[];
}

/**
 * The fewest furnace loads that lines of a heat treatment may share, and why lines are kept apart. Null for a process
 * that is not planned in loads. Air and cold water, unless the order names salt, a hot quench or polymer.
 */
export function loadsOfBatch<Line extends LoadLine>(
  tables: BatchTables,
  lines: readonly Line[],
): LoadsOfBatch<Line> | null {
  const treated = lines.filter(({ step }) => isLoadProcess(step.process));
  if (treated.length === 0) return null;
  const byStep = groupedBy(treated, ({ stepId }) => stepId);
  const groups = [...byStep.values()].flatMap(([line]) => (line ? groupOf(tables, line) : []));
  const plan = planLoads(tables.loads, groups, UNIFORMITY_C);
  const linesOf = (keys: readonly string[]) => keys.flatMap((key) => byStep.get(key) ?? []);
  const placed = new Set(plan.loads.flatMap((load) => load.groups));
  return {
    method: plan.method,
    loads: plan.loads.flatMap((load) => {
      const together = inOrder(lines, linesOf(load.groups));
      const governing = together.find(({ part }) => part.thicknessMm === load.governingMm) ?? together[0];
      return governing ? [{ ...load, lines: together, governing }] : [];
    }),
    apart: plan.apart.map(({ between: [one, other], ...why }) => ({
      ...why,
      between: [inOrder(lines, linesOf(one)), inOrder(lines, linesOf(other))] as const,
    })),
    unplaced: treated.filter(({ stepId }) => !placed.has(stepId)),
  };
}

const LOAD_PROCESSES: readonly Process[] = [
  'solution_heat_treat',
  'solution_heat_treat_and_age',
  'artificial_age',
];

const isLoadProcess = (process: Process): process is LoadProcess => LOAD_PROCESSES.includes(process);

function inOrder<Line>(all: readonly Line[], some: readonly Line[]): Line[] {
  const these = new Set(some);
  return all.filter((line) => these.has(line));
}

function groupOf(tables: BatchTables, { stepId, part, step }: LoadLine): LoadGroup[] {
  const found = metalOf(tables, part);
  const { process } = step;
  if (found.known !== 'yes' || !isLoadProcess(process) || part.thicknessMm === null) return [];
  const { alloy, family, form, clad } = found.material;
  const from = temperOf(tables.material.tempers, step.conditionBefore ?? part.madeCondition);
  const to = temperOf(tables.material.tempers, step.targetCondition ?? part.endCondition);
  if (family !== 'wrought_aluminium' || !form || !from || !to) return [];
  const { thicknessMm } = part;
  const group = { key: stepId, alloy, form, clad, thicknessMm, thinnestMm: thicknessMm, from, to, process };
  return [{ ...group, ...bathOf(step) }];
}

function bathOf({ classType, specification }: LoadLine['step']): Pick<LoadGroup, 'medium' | 'quench'> {
  const said = `${classType ?? ''} ${specification}`;
  const medium = /\bsalt\b/i.test(said) ? 'salt' : 'air';
  const [, named] = /\b(hot water|boiling water|polymer|glycol|spray)\b/i.exec(said) ?? [];
  return { medium, quench: QUENCHES[named?.toLowerCase() ?? ''] ?? 'cold water' };
}

const QUENCHES: Readonly<Record<string, LoadGroup['quench']>> = {
  'hot water': 'hot water',
  'boiling water': 'boiling water',
  polymer: 'polymer',
  glycol: 'polymer',
  spray: 'spray',
};
