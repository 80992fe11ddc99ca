import type { OrderRuleId } from '@/lib/trade/tables/order-rule';

/** Rules about the order of steps that a table makes, or a shop could make, a blocker. */
const ROUTE: Partial<Record<OrderRuleId, string>> = {
  stress_relief_before_plating: 'sent for plating although it was not relieved of stress',
  bake_after_plating: 'sent for plating although no bake is asked for after it',
  heat_before_finish: 'sent although heat treatment and finish stand the wrong way round',
  inspect_after_heat_treatment: 'sent although it is inspected before its last heat treatment',
  temper_etch_after_grinding: 'sent although ground hard steel was not temper etched',
  inspect_before_coating: 'sent although it is inspected only after it is covered',
  magnetic_particle_before_and_after_plating:
    'sent for thick plating although it is not inspected by magnetic particle on both sides of it',
  peen_before_plating: 'sent although it is shot peened after it is plated',
  no_heat_after_peening: 'sent into heat although it was shot peened',
  no_hardening_of_peened: 'sent although hardening the plating undoes the shot peening',
  no_nitrate_for_magnesium: 'sent although magnesium and nitrate salt explode',
  nitrate_attacks_alloy: 'sent although nitrate salt attacks its alloy',
  salt_trapped: 'sent although salt stays in its seams',
  no_cadmium_on_titanium: 'sent for cadmium although titanium lies next to it',
  no_cadmium_in_heat: 'sent for cadmium although it gets too hot in service',
  no_cadmium_in_fuel: 'sent for cadmium although it serves in fuel or vacuum',
  no_anodize_with_inserts: 'sent for anodizing although it has inserts of other metals',
  no_anodize_that_traps: 'sent for anodizing although acid stays in its seams',
  no_oven_on_film: 'sent into an oven although it has chemical film',
  passivate_after_age: 'sent although it is passivated before ageing',
  passivate_free_machining: 'sent for passivation although its steel is attacked by plain nitric acid',
  bake_below_temper: 'sent although its bake is too near its tempering temperature',
  temper_band: 'sent although it is tempered where its steel becomes brittle',
  no_bake_on_anodize: 'sent into an oven although it is anodized',
  not_to_be_plated: 'sent for plating although its specification does not allow steel this strong',
  fluorescent_before_visible: 'sent although visible dye comes before fluorescent penetrant',
  age_after_solution: 'sent although ageing comes before solution treatment',
  strength_not_stated: 'sent although it says no strength to decide the bake by',
  revision_decides_bake: 'sent although its revision does not decide the bake',
  no_bake_rule_known: 'sent although its specification says nothing about a bake',
};

/** What a blocker that was let pass says on paper. */
export const OVERRIDDEN_WORDS: Readonly<Record<string, string>> = {
  processor_not_approved: 'sent although no approval for this step stands today',
  line_of_other_step: 'sent although its route says another step',
  condition_not_made: 'sent although no heat treater makes the condition asked for',
  clad_reheats_used_up: 'sent although its clad metal has had its solution treatments',
  part_fits_nowhere: 'sent although it fits none of the equipment that is entered',
  ...Object.fromEntries(Object.entries(ROUTE).map(([rule, says]) => [`route_${rule}`, says])),
};
