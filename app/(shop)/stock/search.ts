import type { StockFilter } from '@/components/stock/stock-screen';
import { listStock } from '@/lib/stock/contract';

/** What an address says that means nothing is left out; the rest still works. */
export function readStockFilter(search: Record<string, string | string[] | undefined>): StockFilter {
  const { text, locationId } = listStock.input.shape;
  const [typed, place] = [
    text.safeParse(search['text'] ?? undefined),
    locationId.safeParse(search['place'] ?? undefined),
  ];
  return {
    ...(typed.success && typed.data ? { text: typed.data } : {}),
    ...(place.success && place.data !== undefined ? { locationId: place.data } : {}),
  };
}
