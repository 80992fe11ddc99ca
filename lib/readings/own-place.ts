import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { matchOrder } from '@/lib/evidence/certificate/match/match-order';
import type { Order } from '@/lib/evidence/order';

/**
 * Which of the certificates read in a file stands for a batch: the one that a person named, or else the one that speaks
 * most clearly of its order.
 *
 * @param place counted from 0; null where nobody named one, and one that today's reader does not find counts as that.
 * @returns -1 where nothing was read.
 */
export function ownPlace(
  read: readonly StatedCertificate[],
  { place, order }: { place: number | null; order: Order | null },
): number {
  if (place !== null && place < read.length) return place;
  if (order === null || read.length < 2) return read.length === 0 ? -1 : 0;
  const scores = read.map((stated) => matchOrder(stated, [order]).candidates[0]?.score ?? 0);
  return scores.indexOf(Math.max(...scores));
}
