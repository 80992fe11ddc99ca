/** What a file is read as. */
export const READING_KINDS = ['certificate', 'chart', 'invoice'] as const;
export type ReadingKind = (typeof READING_KINDS)[number];

/** `waiting` for the worker, `read`, or `unreadable` for a reason that is kept. */
export const READING_STATES = ['waiting', 'read', 'unreadable'] as const;
export type ReadingState = (typeof READING_STATES)[number];
