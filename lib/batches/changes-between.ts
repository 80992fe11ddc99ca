/** The named fields that differ, as they were and as they are: what an audit entry holds. */
export function changesBetween<Row extends object>(
  before: Row,
  after: Row,
  fields: readonly (keyof Row)[],
): { before: Record<string, unknown>; after: Record<string, unknown> } {
  const changed = fields.filter((field) => before[field] !== after[field]);
  return {
    before: Object.fromEntries(changed.map((field) => [field, before[field]])),
    after: Object.fromEntries(changed.map((field) => [field, after[field]])),
  };
}
