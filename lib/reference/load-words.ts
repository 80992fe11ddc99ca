import type { LoadPlan } from '@/lib/trade/heat-treat/load-plan';

type Apart = LoadPlan['apart'][number]['reason'];
type Unplaced = LoadPlan['unplaced'][number]['reason'];

/** Why lines do not share a furnace load. */
export const APART_WORDS: Record<Apart, string> = {
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

const UNPLACED: Record<Exclude<Unplaced, Apart>, string> = {
  alloy_not_in_table: 'the tables do not have this alloy',
  form_not_in_table: 'the tables do not have this form of the alloy',
  no_range_in_table: 'the tables have no solution temperature for it',
  thickness_not_positive: 'its thickness must be more than 0',
  thicker_than_table: 'it is thicker than the soak table goes',
  no_ageing_cycle_in_table: 'the tables have no ageing to this condition',
};

/** Why no load is made for a line; it goes after the name of the line. */
export const unplacedWords = (reason: Unplaced): string =>
  reason in UNPLACED
    ? UNPLACED[reason as keyof typeof UNPLACED]
    : `the tables contradict themselves about it (${APART_WORDS[reason as Apart]})`;
