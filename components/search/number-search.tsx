'use client';
import { NumberField } from '@/components/shell/number-field';
import { ScanSheet } from '@/components/shell/scan-sheet';
import { call } from '@/lib/api/client';
import { searchNumbers } from '@/lib/search/contract';

const search = async (text: string) => (await call(searchNumbers, { text })).hits;

/** The field in the head, bound to the search. */
export const HeadSearch = () => <NumberField search={search} />;

/** The same behind "Scan a tag" on a phone. */
export const PhoneSearch = () => <ScanSheet search={search} />;
