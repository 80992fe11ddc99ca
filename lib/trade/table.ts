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
  /** The shop's entry it was made of; a published table has none. */
  readonly entry?: string;
  readonly rows: readonly (Row & { readonly source: Source })[];
}

/** Which table a verdict was read from; kept with it, so that it can be understood when the table has changed. */
export interface TableReference {
  readonly table: string;
  readonly edition: string;
  /** The shop's own entry; without it, the published table. */
  readonly entry?: string;
}

export const referenceTo = ({ id, edition, entry }: Table<unknown>): TableReference => ({
  table: id,
  edition,
  ...(entry !== undefined && { entry }),
});
