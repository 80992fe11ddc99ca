import type { OrderRuleId } from '@/lib/trade/tables/order-rule';

/** What a rule about the order of steps has against a route. Rules that only note something are not shown here. */
export const ROUTE_RULE_WORDS: Partial<Record<OrderRuleId, string>> = {
  stress_relief_before_plating:
    'steel this strong is relieved of stress before it is plated; the route has no such step',
  bake_after_plating:
    'steel this strong is baked after plating, or hydrogen cracks it; neither the route nor what must be proved asks for a bake',
  heat_before_finish: 'heat treatment comes before a finish, which does not stand its heat',
  inspect_after_heat_treatment:
    'it is inspected after heat treatment, which makes the cracks that are looked for',
  temper_etch_after_grinding: 'hard steel that was ground is temper etched before it is plated or baked',
  inspect_before_coating: 'it is inspected before it is covered; a coating hides cracks',
  magnetic_particle_before_and_after_plating:
    'plating this thick is inspected by magnetic particle before it and again after it',
  peen_before_plating: 'it is shot peened before it is plated',
  no_heat_after_peening: 'heat after shot peening takes the compression out again',
  no_hardening_of_peened: 'plating that is hardened by heat would undo the shot peening',
  no_nitrate_for_magnesium: 'nitrate salt and magnesium explode',
  nitrate_attacks_alloy: 'nitrate salt attacks this alloy',
  salt_trapped: 'salt stays in its seams',
  no_cadmium_on_titanium: 'cadmium next to titanium makes it brittle',
  no_cadmium_in_heat: 'cadmium does not stand the heat that it gets in service',
  no_cadmium_in_fuel: 'cadmium is kept out of fuel and vacuum',
  no_anodize_with_inserts: 'an anodize bath attacks inserts of other metals',
  no_anodize_that_traps: 'acid stays in its seams',
  no_oven_on_film: 'an oven spoils chemical film',
  passivate_after_age: 'it is passivated after ageing',
  passivate_free_machining: 'free-machining steel is attacked by plain nitric acid',
  bake_below_temper: 'the bake is too near the temperature at which the part was tempered',
  temper_band: 'it is tempered where this steel becomes brittle',
  no_bake_on_anodize: 'a bake crazes an anodized surface',
  not_to_be_plated: 'the specification does not allow steel this strong to be plated',
  fluorescent_before_visible: 'visible dye before fluorescent penetrant hides what the second would show',
  age_after_solution: 'ageing comes after solution treatment, which undoes it',
  strength_not_stated: 'it says no strength, so nobody can tell whether it must be baked after plating',
  revision_decides_bake:
    'the hours of the bake hang on the revision of the specification, which the table does not have',
  no_bake_rule_known: 'the specification says nothing about a bake, which is usual for steel this strong',
};
