import type { Source } from '@/lib/trade/source';

import type { OwnTable, OwnTables } from './in-force';

/** A shop's own edition of a table, as it is kept. */
export interface OwnEntry {
  readonly id: string;
  readonly tableId: string;
  /** The specification, its edition, and where in it the table stands. */
  readonly title: string;
  readonly edition: string;
  readonly clause: string;
  readonly enteredByName: string;
  /** Checked by the table's schema before they were kept. */
  readonly rows: readonly unknown[];
}

/** `AMS 2770, revision R, Table 4`: the document as a person looks it up. */
export const documentOf = ({
  title,
  edition,
  clause,
}: Pick<OwnEntry, 'title' | 'edition' | 'clause'>): string =>
  [title, edition, clause].filter((one) => one !== '').join(', ');

/** The shop's editions as tables. Each row is read, by the person who entered it, in the shop's own copy. */
export const ownTables = (entries: readonly OwnEntry[]): OwnTables =>
  new Map(entries.map((entry) => [entry.tableId, ownTable(entry)]));

function ownTable(entry: OwnEntry): OwnTable {
  const document = documentOf(entry);
  const source: Source = {
    document,
    confidence: 'read',
    certainty: 'high',
    enteredBy: entry.enteredByName,
  };
  return {
    edition: document,
    entry: entry.id,
    rows: entry.rows.map((row) => ({ ...(row as object), source })),
  };
}
