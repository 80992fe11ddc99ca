import type { KeptApart } from '@/lib/trade/heat-treat/load-plan';

/** Why lines do not share a furnace load. */
export const APART_WORDS: Record<KeptApart['reason'], string> = {
  process_differs: 'they ask for different processes',
  medium_differs: 'one is heated in air, one in salt',
  quench_differs: 'they are quenched differently',
  temperatures_do_not_meet: 'their solution temperatures do not meet',
  meet_only_above_melting_risk: 'their solution temperatures meet only where one of them may melt',
  overlap_narrower_than_furnace: 'their solution temperatures meet in less than a furnace keeps to',
  ageing_differs: 'they are aged differently',
  clad_would_soak_too_long: 'clad sheet would soak longer than it may beside the thicker section',
  fits_but_planned_apart: 'they could share; with what else is here it would take no load fewer',
};
