/** What a blocker that was let pass says on paper. */
export const OVERRIDDEN_WORDS: Readonly<Record<string, string>> = {
  processor_not_approved: 'sent although no approval for this step stands today',
  line_of_other_step: 'sent although its route says another step',
  condition_not_made: 'sent although no heat treater makes the condition asked for',
  clad_reheats_used_up: 'sent although its clad metal has had its solution treatments',
  route_bake_after_plating: 'sent for plating although no bake is asked for after it',
  route_stress_relief_before_plating: 'sent for plating although it was not relieved of stress',
  route_heat_before_finish: 'sent although heat treatment and finish stand the wrong way round',
  route_inspect_after_heat_treatment: 'sent although it is inspected before its last heat treatment',
  route_inspect_before_coating: 'sent although it is inspected only after it is covered',
  route_not_to_be_plated: 'sent for plating although its specification does not allow steel this strong',
};
