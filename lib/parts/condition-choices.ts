import { TEMPERS, type Temper } from '@/lib/trade/tempers/temper';
import { explainCondition } from '@/lib/trade/tempers/explain-condition';
import { reachableConditions } from '@/lib/trade/tempers/reachable-conditions';
import type { PartTables } from '@/lib/reference/published-tables';

import { temperOf, type MaterialOf, type PartMaterial } from './material-of';

type Tables = Pick<PartTables, 'material' | 'conditions' | 'phConditions'>;

/** Conditions that the tables know for an alloy, to choose from; empty where they know none. */
export function knownConditions({ conditions, phConditions }: Tables, of: MaterialOf): string[] {
  if (of.known !== 'yes') return [];
  const { alloy, family } = of.material;
  if (family !== 'wrought_aluminium')
    return phConditions.rows.filter(({ steels }) => steels.includes(alloy)).map(({ condition }) => condition);
  const named = new Set<string>(
    conditions.transitions.rows
      .filter(({ alloys }) => alloys.includes(alloy))
      .flatMap(({ from, to }) => [from, to]),
  );
  return TEMPERS.filter((temper) => named.has(temper));
}

/**
 * Conditions that can follow one: what a heat treater makes of it, and the condition itself. Where the one before
 * cannot be read or leads nowhere, all that the alloy has.
 */
export function conditionsAfter(tables: Tables, of: MaterialOf, before: string): string[] {
  const change = of.known === 'yes' ? readChange(tables, of.material, { from: before, to: before }) : null;
  if (!change) return knownConditions(tables, of);
  const made = reachableConditions(tables.conditions, change.material, change.from);
  return made.length === 0
    ? knownConditions(tables, of)
    : [change.from, ...made.map(({ condition }) => condition)];
}

/**
 * What can be made of one condition, as the library explains it; null where the alloy is no wrought aluminium or a
 * condition cannot be read: then nothing is concluded.
 */
export function explainTyped(tables: Tables, of: MaterialOf, typed: { from: string; to: string }) {
  const change = of.known === 'yes' ? readChange(tables, of.material, typed) : null;
  return change && { ...change, found: explainCondition(tables.conditions, change) };
}

function readChange(
  { material: { tempers } }: Tables,
  { alloy, family, form, clad }: PartMaterial,
  typed: { from: string; to: string },
) {
  const from: Temper | undefined = temperOf(tempers, typed.from);
  const to: Temper | undefined = temperOf(tempers, typed.to);
  if (family !== 'wrought_aluminium' || !form || !from || !to) return null;
  return { material: { alloy, form, clad }, from, to };
}
