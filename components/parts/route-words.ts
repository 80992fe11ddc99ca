import { ROUTE_RULE_WORDS } from '@/lib/batches/route-rule-words';
import type { RouteFinding } from '@/lib/trade/route/route';
import type { OrderRuleId } from '@/lib/trade/tables/order-rule';

/** What a rule only notes; what it warns of or stops has its words with the checks before dispatch. */
const NOTES: Partial<Record<OrderRuleId, string>> = {
  bake_before_chromate: 'it is baked before the chromate, which does not stand the heat of the bake',
  straighten_before_age: 'straighten it soon after the quench, before it ages',
  age_after_straightening: 'forming and straightening come before artificial ageing',
  demagnetise_before_plating: 'demagnetise it after inspection, before it is plated',
  bake_limit_of_peened_steel: 'the bake stays under the heat that peened steel stands',
  decontaminate_peened_aluminium: 'traces of steel shot are taken off aluminium after peening',
  protect_peened: 'a peened surface is protected from corrosion until it is finished',
  dry_before_salt: 'parts go into a salt bath dry and clean, or it spits',
  prime_film_soon: 'chemical film is primed soon after it is dry',
  count_clad_solution: 'clad metal: each solution treatment counts against its limit',
  case_before_plating: 'a hardened case is plated as strong steel is',
  limit_acid: 'keep strong steel out of acid as far as can be',
  impregnate_before_finish: 'a casting that leaks is impregnated before it is finished',
  special_cleaning: 'steel this strong is cleaned without acid before plating',
};

export function ruleWords(rule: OrderRuleId): string {
  const words = ROUTE_RULE_WORDS[rule] ?? NOTES[rule] ?? rule.replaceAll('_', ' ');
  return `${words.charAt(0).toUpperCase()}${words.slice(1)}.`;
}

/** `Steps 2 and 3` */
export const stepsWords = ({ steps }: RouteFinding): string =>
  steps.length === 0
    ? 'The route'
    : `${steps.length === 1 ? 'Step' : 'Steps'} ${steps.map((step) => step + 1).join(' and ')}`;
