/**
 * Conditions of aluminium that the tables speak of. AQ is the shop's word for metal that is quenched and not yet aged;
 * W is the designation nearest to it.
 */
export const TEMPERS = [
  'F',
  'O',
  'O1',
  'W',
  'W51',
  'AQ',
  'T3',
  'T31',
  'T351',
  'T361',
  'T37',
  'T4',
  'T42',
  'T451',
  'T6',
  'T61',
  'T62',
  'T651',
  'T7',
  'T72',
  'T73',
  'T7351',
  'T74',
  'T7451',
  'T76',
  'T7651',
  'T8',
  'T81',
  'T851',
  'T861',
  'T87',
  'driven rivet',
] as const;
export type Temper = (typeof TEMPERS)[number];

/** Metal that was solution treated at some time; a further solution treatment of it is a re-heat-treatment. */
export const isHeatTreated = (temper: Temper): boolean => /^(?:W|AQ|T)/.test(temper);

/** Two names of one state: quenched, and neither aged nor stretched. */
export const isAsQuenched = (temper: Temper): boolean => temper === 'AQ' || temper === 'W';
