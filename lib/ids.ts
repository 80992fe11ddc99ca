import { uuidv7 } from 'uuidv7';

/** A new time-ordered id (UUID version 7, RFC 9562), so that rows of one day lie side by side in every index. */
export const newId = (): string => uuidv7();

/** The holder of pieces in a place that needs no holder (scrapped, lost). */
export const NO_HOLDER = '00000000-0000-0000-0000-000000000000';
