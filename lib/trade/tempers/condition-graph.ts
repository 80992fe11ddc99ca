import type { Alloy } from '../alloys/alloy';
import type { ProductForm } from '../process';
import type { Source } from '../source';
import { referenceTo, type Table, type TableReference } from '../table';
import type { AgeingRow } from '../tables/ageing-cycles';
import type { TemperRow } from '../tables/tempers';
import type { Operation, TransitionCaution, TransitionRow } from '../tables/temper-transitions';
import { isAsQuenched, isHeatTreated, TEMPERS, type Temper } from './temper';

/** The tables that conditions are worked out from; a shop's own edition of any of them may stand in. */
export interface ConditionRules {
  readonly designations: Table<TemperRow>;
  readonly transitions: Table<TransitionRow>;
  readonly ageing: Table<AgeingRow>;
}

export interface ConditionMaterial {
  readonly alloy: Alloy;
  readonly form: ProductForm;
  readonly clad: boolean;
}

/** What is done to get from one condition to the next, and what has to be borne in mind. */
export interface ConditionStep {
  readonly from: Temper;
  readonly to: Temper;
  readonly by: readonly Operation[];
  readonly cautions: readonly (TransitionCaution | DerivedCaution)[];
  readonly source: Source;
  readonly readFrom: TableReference;
}

/** `counts_as_reheat`: a re-heat-treatment of clad metal. `loses_mill_cold_work`: and with it the mill's allowables. */
export type DerivedCaution = 'counts_as_reheat' | 'loses_mill_cold_work';

export const isSameState = (a: Temper, b: Temper): boolean => a === b || (isAsQuenched(a) && isAsQuenched(b));

type Paths = ReadonlyMap<Temper, readonly ConditionStep[]>;

/** A batch asks the same of the same tables for hundreds of lines. */
const KNOWN = new WeakMap<ConditionRules, Map<string, Paths>>();

/** Conditions that can be made, each with the fewest steps that lead to it; the condition itself has none. */
export function pathsFrom(rules: ConditionRules, material: ConditionMaterial, from: Temper): Paths {
  const known = KNOWN.get(rules) ?? new Map<string, Paths>();
  KNOWN.set(rules, known);
  const question = `${material.alloy} ${material.form} ${material.clad} ${from}`;
  const paths = known.get(question) ?? findPaths(rules, material, from);
  known.set(question, paths);
  return paths;
}

function findPaths(rules: ConditionRules, material: ConditionMaterial, from: Temper): Paths {
  const paths = new Map<Temper, readonly ConditionStep[]>([[from, []]]);
  // A map can be added to while it is walked: what is found is looked at in its turn, nearest first.
  for (const [condition, path] of paths)
    for (const step of stepsFrom(rules, material, condition))
      if (![...paths.keys()].some((known) => isSameState(known, step.to)))
        paths.set(step.to, [...path, step]);
  return paths;
}

function stepsFrom(rules: ConditionRules, material: ConditionMaterial, from: Temper): ConditionStep[] {
  const { transitions } = rules;
  const exactFirst = [...transitions.rows].sort((a, b) => Number(isWild(a)) - Number(isWild(b)));
  const direct = exactFirst.flatMap((row) =>
    row.result.is === 'made' && startsFrom(row, material, from)
      ? [
          toStep(
            rules,
            material,
            { from, to: row.to, by: row.result.by, cautions: row.result.cautions ?? [] },
            row,
          ),
        ]
      : [],
  );
  return [...direct, ...ageingSteps(rules, material, from)];
}

const isWild = ({ from }: TransitionRow) => from === 'any' || from === 'any_heat_treated';

/** Whether a row of the transitions speaks of this material in this condition. */
export function startsFrom(row: TransitionRow, { alloy, form }: ConditionMaterial, from: Temper): boolean {
  if (!row.alloys.includes(alloy) || (row.forms && !row.forms.includes(form))) return false;
  if (row.from === 'any') return row.to !== from;
  if (row.from === 'any_heat_treated') return row.to !== from && isHeatTreated(from);
  return isSameState(row.from, from);
}

const OPERATION_OF = {
  natural: 'natural_age',
  artificial: 'artificial_age',
  two_step: 'two_step_age',
  second_step: 'second_step_age',
} as const;

/** Ageing that the table of cycles knows is a way too. What a user makes from quenched metal gets the user's name. */
function ageingSteps(rules: ConditionRules, material: ConditionMaterial, from: Temper): ConditionStep[] {
  return rules.ageing.rows.flatMap((row) =>
    row.alloys.includes(material.alloy) && (row.forms?.includes(material.form) ?? true)
      ? row.changes
          .filter(([before]) => isSameState(before, from))
          .map(([, after]) => {
            const to = isAsQuenched(from) ? nameByUser(rules, after) : after;
            const change = { from, to, by: [OPERATION_OF[row.cycle.kind]], cautions: [] };
            return { ...change, source: row.source, readFrom: referenceTo(rules.ageing) };
          })
      : [],
  );
}

export const nameByUser = ({ designations }: ConditionRules, temper: Temper): Temper =>
  designations.rows.find((row) => row.temper === temper)?.madeByUserIs ?? temper;

function toStep(
  { designations, transitions }: ConditionRules,
  { clad }: ConditionMaterial,
  change: Pick<ConditionStep, 'from' | 'to' | 'by' | 'cautions'>,
  row: { readonly source: Source },
): ConditionStep {
  const treats = change.by.some((operation) => /solution_heat_treat/.test(operation));
  const coldWorked = designations.rows.some(({ temper, coldWork }) => temper === change.from && coldWork);
  const derived: DerivedCaution[] = [
    ...(treats && clad && isHeatTreated(change.from) ? (['counts_as_reheat'] as const) : []),
    ...(treats && coldWorked ? (['loses_mill_cold_work'] as const) : []),
  ];
  const cautions = [...change.cautions, ...derived];
  return { ...change, cautions, source: row.source, readFrom: referenceTo(transitions) };
}

/** In the order of the designations, for lists that people choose from. */
export const inTemperOrder = (a: Temper, b: Temper): number => TEMPERS.indexOf(a) - TEMPERS.indexOf(b);
