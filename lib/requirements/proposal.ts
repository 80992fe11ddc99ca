import { sourceWords } from '@/lib/batches/source-words';
import type { LoadLine, LoadOfLines } from '@/lib/batches/loads-of-batch';
import type { OrderingAnswers } from '@/lib/parts/ordering-answers';
import { limitWords } from '@/lib/parts/limit-words';
import type { ToProve } from '@/lib/parts/to-prove';
import type { Source } from '@/lib/trade/source';

import type { Limit, Units } from './limit';

/** A step of a part for which limits are wanted. */
export interface AskedLine extends LoadLine {
  readonly ordering: OrderingAnswers;
  /** Pieces on the order; null while a route is only drawn up. */
  readonly pieces: number | null;
  readonly units: Units;
  /** How the furnace load is run in which it lies; null: it is taken to lie alone. */
  readonly load: Pick<LoadOfLines<unknown>, 'solution' | 'maxDelayS' | 'ageing'> | null;
}

const LONGEST = 200;

/** One thing to prove with where its limit stands; none where there is no limit. */
export function proposal(characteristic: string, limit: Limit | null, source: Source, note = ''): ToProve[] {
  if (!limit) return [];
  const sourceText = [sourceWords(source), note].filter(Boolean).join('; ').slice(0, LONGEST);
  const readFrom = source.readFrom ? { ...source.readFrom, gave: limitWords(limit) } : null;
  return [{ characteristic, ...limit, source: 'specification', sourceText, readFrom }];
}

/** The same in words that are no figure. */
export const proposalInWords = (characteristic: string, says: string, source: Source): ToProve[] =>
  proposal(characteristic, { limit: says, unit: '' }, source);
