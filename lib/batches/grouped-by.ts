/** Rows by what they have in common, in their order. */
export function groupedBy<Row, Key>(rows: readonly Row[], keyOf: (row: Row) => Key): Map<Key, Row[]> {
  const groups = new Map<Key, Row[]>();
  for (const row of rows) {
    const known = groups.get(keyOf(row));
    if (known) known.push(row);
    else groups.set(keyOf(row), [row]);
  }
  return groups;
}
