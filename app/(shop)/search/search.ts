import type { SearchFilter } from '@/components/search/search-screen';
import { listNumbers } from '@/lib/search/contract';

/** What an address says that means nothing is left out; the rest still works. */
export function readSearchFilter(search: Record<string, string | string[] | undefined>): SearchFilter {
  const { text, kind } = listNumbers.input.shape;
  const [typed, chosen] = [text.safeParse(search['text']), kind.safeParse(search['kind'])];
  return {
    ...(typed.success ? { text: typed.data } : {}),
    ...(chosen.success ? { kind: chosen.data } : {}),
  };
}
