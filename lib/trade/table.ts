import type { Source } from './source';

/**
 * A published table as data. Functions read tables and hold no figures themselves, so that a shop's own edition can
 * stand in for the published one, and a verdict can name the edition it was read from.
 */
export interface Table<Row> {
  readonly id: string;
  readonly title: string;
  /** Which printing of the table this is: a document with its revision, or the shop's own title and edition. */
  readonly edition: string;
  readonly rows: readonly (Row & { readonly source: Source })[];
}

/** Which table a verdict was read from; kept with it, so that it can be understood when the table has changed. */
export interface TableReference {
  readonly table: string;
  readonly edition: string;
}

export const referenceTo = (table: Table<unknown>): TableReference => ({
  table: table.id,
  edition: table.edition,
});
