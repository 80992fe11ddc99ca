import { temperOf } from '@/lib/parts/material-of';
import type { BatchTables } from '@/lib/reference/batch-tables';
import type { LoadGroup, LoadProcess } from '@/lib/trade/heat-treat/load-needs';
import { requiredSoak } from '@/lib/trade/heat-treat/required-soak';
import { planLoads, type KeptApart, type LoadPlan, type PlannedLoad } from '@/lib/trade/heat-treat/load-plan';
import type { Process } from '@/lib/trade/process';
import { celsiusDifferenceFromFahrenheit } from '@/lib/trade/units/temperature';

import type { CheckedPart, CheckedStep } from './check';
import { groupedBy } from './grouped-by';
import { metalOf } from './metal-of';

/** ±10 °F, as FAA-H-8083-30 has metal held in a furnace. */
const UNIFORMITY_C = celsiusDifferenceFromFahrenheit(10);

/** What loads are planned of: lines of a batch, and lots that could join it. */
export interface LoadLine {
  readonly id: string;
  readonly part: Pick<
    CheckedPart,
    'alloy' | 'form' | 'clad' | 'thicknessMm' | 'madeCondition' | 'endCondition'
  >;
  readonly step: Omit<CheckedStep, 'id' | 'ordering'>;
}

export interface LoadOfLines<Line> extends PlannedLoad {
  readonly lines: readonly Line[];
  /** The thickest part: its thickness governs the soak. */
  readonly governing: Line;
  readonly medium: LoadGroup['medium'];
  readonly quench: LoadGroup['quench'];
}

/** Why no load is planned for a line: what the tables lack for it, or what its part does not say. */
export type NotPlanned =
  | LoadPlan['unplaced'][number]['reason']
  | 'material_not_known'
  | 'not_wrought_aluminium'
  | 'form_not_stated'
  | 'condition_not_known'
  | 'thickness_not_stated';

export interface LoadsOfBatch<Line> {
  readonly method: LoadPlan['method'];
  readonly loads: readonly LoadOfLines<Line>[];
  readonly apart: readonly (Omit<KeptApart, 'between'> & {
    readonly between: readonly [readonly Line[], readonly Line[]];
  })[];
  /** Nothing is concluded about them. */
  readonly unplaced: readonly { readonly line: Line; readonly reason: NotPlanned }[];
}

/**
 * The fewest furnace loads that lines of a heat treatment may share, and why lines are kept apart. Null for a process
 * that is not planned in loads. Air and cold water, unless the order names salt, a hot quench or polymer.
 */
export function loadsOfBatch<Line extends LoadLine>(
  tables: BatchTables,
  lines: readonly Line[],
): LoadsOfBatch<Line> | null {
  const known = PLANNED.get(lines);
  // What was planned of these very lines holds these very lines.
  if (known?.tables === tables) return known.plan as LoadsOfBatch<Line> | null;
  const plan = planOf(tables, lines);
  PLANNED.set(lines, { tables, plan });
  return plan;
}

/** Several checks ask for the plan of the same lines. */
const PLANNED = new WeakMap<
  readonly LoadLine[],
  { tables: BatchTables; plan: LoadsOfBatch<LoadLine> | null }
>();

function planOf<Line extends LoadLine>(
  tables: BatchTables,
  lines: readonly Line[],
): LoadsOfBatch<Line> | null {
  const treated = lines.filter(({ step }) => isLoadProcess(step.process));
  if (treated.length === 0) return null;
  const kinds = new Map(treated.map((line) => [line, kindOf(line)]));
  const byKind = groupedBy(treated, (line) => kinds.get(line) ?? '');
  const asked = [...byKind].flatMap(([kind, [line]]) => (line ? [groupOf(tables, kind, line)] : []));
  const groups = asked.flatMap((one) => ('group' in one ? one.group : []));
  const plan = planLoads(tables.loads, groups, UNIFORMITY_C);
  const linesOf = (keys: readonly string[]) => keys.flatMap((key) => byKind.get(key) ?? []);
  const reasons = new Map<string, NotPlanned>([
    ...asked.flatMap((one) => ('reason' in one ? [[one.kind, one.reason] as const] : [])),
    ...plan.unplaced.map(({ group, reason }) => [group, reason] as const),
  ]);
  return {
    method: plan.method,
    loads: plan.loads.flatMap((load) => {
      const together = inOrder(lines, linesOf(load.groups));
      const governing = together.find(({ part }) => part.thicknessMm === load.governingMm) ?? together[0];
      return governing ? [{ ...load, lines: together, governing, ...bathOf(governing.step) }] : [];
    }),
    apart: plan.apart.map(({ between: [one, other], ...why }) => ({
      ...why,
      between: [inOrder(lines, linesOf(one)), inOrder(lines, linesOf(other))] as const,
    })),
    unplaced: treated.flatMap((line) => {
      const reason = reasons.get(kinds.get(line) ?? '');
      return reason ? [{ line, reason }] : [];
    }),
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

/** All that a plan looks at: lines of one metal, thickness and treatment are planned as one, whatever parts they are. */
export const kindOf = ({ part, step }: LoadLine): string =>
  [
    ...[part.alloy, part.form, part.clad, part.thicknessMm, part.madeCondition, part.endCondition],
    ...[step.process, step.specification, step.classType, step.conditionBefore, step.targetCondition],
  ].join('\n');

type Asked = { readonly group: LoadGroup } | { readonly kind: string; readonly reason: NotPlanned };

function groupOf(tables: BatchTables, kind: string, { part, step }: LoadLine): Asked {
  const not = (reason: NotPlanned) => ({ kind, reason });
  const found = metalOf(tables, part);
  const { process } = step;
  if (found.known !== 'yes' || !isLoadProcess(process)) return not('material_not_known');
  const { alloy, family, form, clad } = found.material;
  if (family !== 'wrought_aluminium') return not('not_wrought_aluminium');
  if (!form) return not('form_not_stated');
  const from = temperOf(tables.material.tempers, step.conditionBefore ?? part.madeCondition);
  const to = temperOf(tables.material.tempers, step.targetCondition ?? part.endCondition);
  if (!from || !to) return not('condition_not_known');
  const { thicknessMm } = part;
  if (thicknessMm === null) return not('thickness_not_stated');
  const group = { key: kind, alloy, form, clad, thicknessMm, thinnestMm: thicknessMm, from, to, process };
  return { group: { ...group, ...bathOf(step) } };
}

/** How long a line would soak if it were alone, in minutes; null where the table does not say. */
export function soakAlone(
  tables: BatchTables,
  { part, step }: LoadLine,
): { soakMin: number; longestMin: number | null } | null {
  const found = metalOf(tables, part);
  if (found.known !== 'yes' || part.thicknessMm === null) return null;
  const { medium } = bathOf(step);
  const section = { thicknessMm: part.thicknessMm, medium, clad: found.material.clad };
  const soak = requiredSoak(tables.loads.soak, section);
  return soak.ok ? { soakMin: soak.soakMin, longestMin: soak.longestMin } : null;
}

/** Air and cold water, unless the order names another. */
export function bathOf({ classType, specification }: LoadLine['step']): Pick<LoadGroup, 'medium' | 'quench'> {
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
