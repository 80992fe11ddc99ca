/**
 * Cuts a page out of `limit + 1` rows: the extra row only says that there is more.
 *
 * @param keyOf the sort key of a row, as the next page's `after`.
 */
export function toPage<Row>(
  rows: readonly Row[],
  limit: number,
  keyOf: (row: Row) => string,
): { rows: Row[]; next: string | null } {
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  return { rows: page, next: rows.length > limit && last !== undefined ? keyOf(last) : null };
}
