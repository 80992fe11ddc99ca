import {
  inTemperOrder,
  pathsFrom,
  type ConditionMaterial,
  type ConditionRules,
  type ConditionStep,
} from './condition-graph';
import type { Temper } from './temper';

export interface ReachableCondition {
  readonly condition: Temper;
  readonly path: readonly ConditionStep[];
}

/**
 * Every condition that a heat treater can make of a material in a condition, with the operations that lead there, in
 * the order of the designations. Empty where the tables know no way out of it.
 *
 * @example reachableConditions(RULES, 2024 sheet, 'O') is AQ, T42, T62
 */
export const reachableConditions = (
  rules: ConditionRules,
  material: ConditionMaterial,
  from: Temper,
): ReachableCondition[] =>
  [...pathsFrom(rules, material, from)]
    .filter(([, path]) => path.length > 0)
    .map(([condition, path]) => ({ condition, path }))
    .sort((a, b) => inTemperOrder(a.condition, b.condition));
