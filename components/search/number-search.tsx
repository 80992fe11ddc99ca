'use client';
import { NumberField, type NumberHit } from '@/components/shell/number-field';
import { ScanSheet } from '@/components/shell/scan-sheet';
import { call } from '@/lib/api/client';
import { searchNumbers } from '@/lib/search/contract';

import { KINDS_WORDS, searchPage } from './kind-words';

/** The first of each kind; where that is not all, the way to the whole list stands last. */
async function search(text: string): Promise<NumberHit[]> {
  const { hits, more } = await call(searchNumbers, { text });
  if (more.length === 0) return hits;
  const kinds = more.map((kind) => KINDS_WORDS[kind].toLowerCase()).join(', ');
  return [
    ...hits,
    {
      kind: 'Whole list',
      number: `${text}…`,
      says: `all ${kinds} that begin so`,
      href: searchPage(text, more.length === 1 ? more[0] : undefined),
    },
  ];
}

/** The field in the head, bound to the search. */
export const HeadSearch = () => <NumberField search={search} />;

/** The same behind "Scan a tag" on a phone. */
export const PhoneSearch = () => <ScanSheet search={search} />;
