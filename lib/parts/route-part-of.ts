import type { RoutePart } from '@/lib/trade/route/route';
import { phCondition } from '@/lib/trade/steel/ph-condition';
import type { Table } from '@/lib/trade/table';
import type { PhSteelConditionRow } from '@/lib/trade/tables/ph-steel-conditions';

import type { PartMaterial } from './material-of';
import { strengthOf } from './strength-of';

/**
 * What the rules of a route ask of a part, from its material and the condition it ends in: strength is read from
 * `160 to 180 ksi` or `HRC 36 to 40`, or is that of a stainless condition such as H1025. What nobody states is left out.
 */
export function routePartOf(
  phConditions: Table<PhSteelConditionRow>,
  { alloy, family, form, clad }: PartMaterial,
  endCondition: string,
): RoutePart {
  const aged = phCondition(phConditions, { steel: alloy, condition: endCondition.trim().toUpperCase() });
  const strength = aged.ok ? { hrc: aged.hrcMax } : strengthOf(endCondition);
  return { alloy, family, form, isClad: clad, ...strength };
}
