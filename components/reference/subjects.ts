/** The calculators of the bench, by the last part of their address. */
export const SUBJECTS = {
  fit: 'Fit in a tank or furnace',
  soak: 'Soak and quench delay',
} as const;

export type Subject = keyof typeof SUBJECTS;

export const isSubject = (text: string): text is Subject => Object.hasOwn(SUBJECTS, text);

/** The one shown where none is named. */
export const FIRST_SUBJECT: Subject = 'fit';
