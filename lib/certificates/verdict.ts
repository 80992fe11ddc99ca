/** What a certificate says of one requirement, as an inspector decides it. */
export const VERDICTS = ['meets', 'does_not_meet', 'not_stated', 'cannot_tell'] as const;
export type Verdict = (typeof VERDICTS)[number];
