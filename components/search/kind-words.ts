import type { HitKind } from '@/lib/search/contract';

/** What several of a kind are called. */
export const KINDS_WORDS: Record<HitKind, string> = {
  Batch: 'Batches',
  Order: 'Orders',
  Part: 'Parts',
  Lot: 'Lots',
  Certificate: 'Certificates',
  Invoice: 'Invoices',
  Nonconformance: 'Nonconformances',
};

/** The page with everything whose number begins so; of one kind where it is named. */
export function searchPage(text: string, kind?: HitKind): string {
  const asked = new URLSearchParams({ text, ...(kind ? { kind } : {}) });
  return `/search?${asked.toString()}`;
}
