export type Severity = 'blocker' | 'warning' | 'note';

/** The last ones come from the tables of embrittlement and inspection, whose rows say more. */
export type OrderRuleId =
  | 'stress_relief_before_plating'
  | 'bake_after_plating'
  | 'bake_before_chromate'
  | 'straighten_before_age'
  | 'age_after_straightening'
  | 'heat_before_finish'
  | 'inspect_after_heat_treatment'
  | 'temper_etch_after_grinding'
  | 'inspect_before_coating'
  | 'magnetic_particle_before_and_after_plating'
  | 'demagnetise_before_plating'
  | 'peen_before_plating'
  | 'no_heat_after_peening'
  | 'no_hardening_of_peened'
  | 'bake_limit_of_peened_steel'
  | 'decontaminate_peened_aluminium'
  | 'protect_peened'
  | 'no_nitrate_for_magnesium'
  | 'nitrate_attacks_alloy'
  | 'salt_trapped'
  | 'dry_before_salt'
  | 'no_cadmium_on_titanium'
  | 'no_cadmium_in_heat'
  | 'no_cadmium_in_fuel'
  | 'no_anodize_with_inserts'
  | 'no_anodize_that_traps'
  | 'prime_film_soon'
  | 'no_oven_on_film'
  | 'count_clad_solution'
  | 'passivate_after_age'
  | 'passivate_free_machining'
  | 'case_before_plating'
  | 'bake_below_temper'
  | 'temper_band'
  | 'no_bake_on_anodize'
  | 'limit_acid'
  | 'impregnate_before_finish'
  | 'not_to_be_plated'
  | 'special_cleaning'
  | 'fluorescent_before_visible'
  | 'age_after_solution'
  | 'strength_not_stated'
  | 'revision_decides_bake'
  | 'no_bake_rule_known';

/** How hard a rule is, and where it comes from. A shop's own edition may make a rule harder or softer. */
export interface OrderRuleRow {
  readonly rule: OrderRuleId;
  readonly severity: Severity;
}
