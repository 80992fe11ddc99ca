import type { AcceptanceReason } from '@/lib/trade/acceptance/acceptance-of';
import type { ConditionJudgement } from '@/lib/trade/acceptance/judge-condition';
import type { HardnessBand } from '@/lib/trade/tables/acceptance';
import type { MeasuringRuleRow } from '@/lib/trade/tables/measuring-rules';

const REFUSALS: Record<AcceptanceReason, string> = {
  clad_needs_correlation:
    'The bands are for bare metal. Cladding has a conductivity of its own: clad parts need a correlation proven for their cladding and thickness.',
  alloy_not_in_table: 'The tables have no bands for this alloy.',
  condition_not_in_table: 'The tables have no band for this condition of the alloy.',
};

export const acceptanceRefusal = (reason: AcceptanceReason): string => REFUSALS[reason];

export const PAIRS: Record<ConditionJudgement['pair'], { good: boolean | null; says: string }> = {
  meets: { good: true, says: 'The pair meets' },
  does_not_meet: { good: false, says: 'The pair does not meet' },
  not_shown: { good: null, says: 'Not shown: both readings are needed' },
};

export const JUDGED: Record<ConditionJudgement['hardness'], string> = {
  meets: 'meets',
  does_not_meet: 'does not meet',
  not_measured: 'not measured',
  no_limit_in_this_scale: 'no limit in this scale',
};

/** `HRB 63 to 83`, `HRB 22 at most`. */
export function bandWords({ scale, min, max, isAbout }: HardnessBand): string {
  const about = isAbout ? 'about ' : '';
  if (min === undefined) return `${scale} ${about}${max ?? ''} at most`;
  if (max === undefined) return `${scale} ${about}${min} at least`;
  return `${scale} ${about}${min} to ${max}`;
}

/** What to mind when measuring, said with the rule's own figures. */
export function measuringWords(rule: MeasuringRuleRow): string {
  switch (rule.rule) {
    case 'pair_decides':
      return 'Both readings decide together. Even both do not prove tensile properties.';
    case 'clad_needs_correlation':
      return 'Clad parts need a correlation for their cladding and thickness.';
    case 'temperature_difference':
      return `Probe, standards and part within ${rule.mostC} °C (${rule.mostF} °F) of each other.`;
    case 'lift_off_correction':
      return `A coating over ${rule.overIn} in under the probe needs a correction.`;
    case 'stack_thin_sheet':
      return `${rule.alloy}-${rule.condition} thinner than ${rule.leastIn} in is stacked at ${rule.kHz} kHz.`;
    case 'operator':
      return 'Whoever measures with the indirect instrument is qualified to level 2; with the direct one, trained.';
    case 'brinell':
      return `Brinell on aluminium: ${rule.kgf} kgf, ${rule.ballMm} mm ball, ${rule.holdS} s.`;
    case 'rough_tensile':
      return `Tensile strength is roughly ${rule.ksiPerHb500} ksi for each point of Brinell; it accepts nothing.`;
  }
}
