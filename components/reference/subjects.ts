/** The calculators of the bench, by the last part of their address. */
export const SUBJECTS = {
  fit: 'Fit in a tank or furnace',
  soak: 'Soak and quench delay',
  load: 'What may share a load',
  holding: 'As-quenched time',
  clad: 'Clad re-treatments',
  temper: 'Which temper from which',
  hardness: 'Hardness conversion',
  acceptance: 'Hardness and conductivity',
  specification: 'Specifications',
  route: 'Order of steps',
  finish: 'Build-up of a finish',
  bake: 'Bake after plating',
  samples: 'Samples to take',
  mass: 'Mass and area',
  steel: 'Steel windows',
  pyrometry: 'Pyrometry',
  colours: 'Oxide colours of steel',
} as const;

export type Subject = keyof typeof SUBJECTS;

export const isSubject = (text: string): text is Subject => Object.hasOwn(SUBJECTS, text);

/** The one shown where none is named. */
export const FIRST_SUBJECT: Subject = 'fit';
