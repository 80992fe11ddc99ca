import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { matchOrder } from '@/lib/evidence/certificate/match/match-order';
import type { Order } from '@/lib/evidence/order';

import { rowsOn } from './rows-on';

export interface SpokenOf {
  order: Order;
  /** Speaks for it clearly enough to be proposed. */
  isClear: boolean;
  reasons: readonly string[];
}

/** Enough to choose from; what is further down has hardly a word in common. */
const MOST = 3;

/**
 * The orders that a certificate speaks of: the one that it clearly belongs to, and any other that has rows on it which
 * are of no order before it. Where none is clear, the likeliest to choose from.
 *
 * @param orders open ones of its processor.
 */
export function speaksOf(
  stated: StatedCertificate,
  orders: readonly Order[],
  { isRecognised }: { isRecognised: boolean },
): SpokenOf[] {
  const { candidates, matched } = matchOrder(stated, orders, { isRecognised });
  const rows = new Map(candidates.map(({ order }) => [order, rowsOn(stated, order)]));
  const own = new Set(matched ? rows.get(matched) : []);
  const spoken = candidates.flatMap(({ order, reasons }) => {
    if (order === matched) return [{ order, isClear: true, reasons }];
    const further = (rows.get(order) ?? []).filter((at) => !own.has(at));
    if (further.length === 0) return [];
    // A row that may be of several orders is nobody's for certain.
    const isClear = further.some((at) =>
      candidates.every((one) => one.order === order || !rows.get(one.order)?.includes(at)),
    );
    return [{ order, isClear, reasons }];
  });
  if (spoken.length > 0) return spoken;
  return candidates.slice(0, MOST).map(({ order, reasons }) => ({ order, isClear: false, reasons }));
}
