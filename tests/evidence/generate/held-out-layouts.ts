import type { Layout } from './layout';

/** Layouts written after the rules of reading, so that the rules could not be made for them. */
export const HELD_OUT_LAYOUTS: readonly Layout[] = [];
