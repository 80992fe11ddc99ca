/**
 * JSON with the keys of every object in order and nothing between, so that the same content is always the same text
 * and its hash can be made again years later.
 */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value))
    return `[${value.map((one) => canonicalJson(one === undefined ? null : one)).join(',')}]`;
  if (value instanceof Date) return JSON.stringify(value.toISOString());
  if (value !== null && typeof value === 'object') {
    const entries = Object.entries(value as Record<string, unknown>).filter(([, one]) => one !== undefined);
    return `{${entries
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, one]) => `${JSON.stringify(key)}:${canonicalJson(one)}`)
      .join(',')}}`;
  }
  return JSON.stringify(value ?? null);
}
