import { averages } from './averages';
import type { Layout } from './layout';
import { spanningHeads } from './spanning-heads';
import { toldByMail } from './told-by-mail';

/** A last few, drawn after the fourth set and likewise without sight of the rules. */
export const FIFTH_HELD_OUT_LAYOUTS: readonly Layout[] = [spanningHeads, averages, toldByMail];
