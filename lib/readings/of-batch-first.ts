import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { matchOrder } from '@/lib/evidence/certificate/match/match-order';
import type { Order } from '@/lib/evidence/order';

/** A file may hold certificates for several batches: the one that speaks of this batch comes first. */
export function ofBatchFirst(read: readonly StatedCertificate[], order: Order | null): StatedCertificate[] {
  if (order === null) return [...read];
  const scores = read.map((stated) => matchOrder(stated, [order]).candidates[0]?.score ?? 0);
  const best = scores.indexOf(Math.max(...scores));
  return [...read.slice(best, best + 1), ...read.slice(0, best), ...read.slice(best + 1)];
}
