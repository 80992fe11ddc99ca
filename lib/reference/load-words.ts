import type { LoadPlan } from '@/lib/trade/heat-treat/load-plan';

type Apart = LoadPlan['apart'][number]['reason'];
type Unplaced = LoadPlan['unplaced'][number]['reason'];

const APART: Record<Apart, string> = {
  process_differs: 'One is solution treated, the other only aged.',
  medium_differs: 'One is heated in air, the other in salt.',
  quench_differs: 'They are quenched differently.',
  temperatures_do_not_meet: 'Their solution temperatures do not meet.',
  meet_only_above_melting_risk: 'Their temperatures meet only where one of them may begin to melt.',
  overlap_narrower_than_furnace: 'Their temperatures meet in less than the furnace keeps to.',
  ageing_differs: 'They are aged differently.',
  clad_would_soak_too_long: 'The thick one needs a longer soak than the thin clad one may have.',
  fits_but_planned_apart: 'These two could share; with the rest it would take no load fewer.',
};

const UNPLACED: Record<Exclude<Unplaced, keyof typeof APART>, string> = {
  alloy_not_in_table: 'the tables do not have this alloy',
  form_not_in_table: 'the tables do not have this form of the alloy',
  no_range_in_table: 'the tables have no solution temperature for it',
  thickness_not_positive: 'its thickness must be more than 0',
  thicker_than_table: 'it is thicker than the soak table goes',
  no_ageing_cycle_in_table: 'the tables have no ageing to this condition',
};

export const apartWords = (reason: Apart): string => APART[reason];

/** Why no load is made for a line; it goes after the name of the line. */
export const unplacedWords = (reason: Unplaced): string =>
  reason in UNPLACED
    ? UNPLACED[reason as keyof typeof UNPLACED]
    : `the tables contradict themselves about it (${APART[reason as Apart].replace(/\.$/, '').toLowerCase()})`;
