import { daysBetween } from '@/lib/day-words';

import type { TidelineBatch } from './contract';

/**
 * How many days a batch is late today. Late begins on the day after the promised one, and ends when everything is
 * back; whether the first or the latest promise counts is the shop's choice. Without a promise, the day the shop
 * wanted it back does not make it late: nobody promised it.
 */
export function daysLate(
  batch: Pick<
    TidelineBatch,
    'stage' | 'promisedOn' | 'firstPromisedOn' | 'lastBackOn' | 'pieces' | 'piecesBack'
  >,
  today: string,
  basis: 'first_promise' | 'latest_promise',
): number {
  const promised = basis === 'first_promise' ? batch.firstPromisedOn : batch.promisedOn;
  const isOut =
    ['dispatched', 'at_processor'].includes(batch.stage) ||
    (batch.stage === 'held' && batch.piecesBack < batch.pieces);
  return promised !== null && isOut ? Math.max(0, daysBetween(promised, today)) : 0;
}
