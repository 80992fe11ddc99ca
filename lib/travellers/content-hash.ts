import { createHash } from 'node:crypto';

/** SHA-256 of all that a paper says, whatever order its fields were kept in. */
export const contentHash = (content: unknown): string =>
  createHash('sha256')
    .update(JSON.stringify(inOrder(content)))
    .digest('hex');

function inOrder(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(inOrder);
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(
    Object.entries(value)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([name, inner]) => [name, inOrder(inner)]),
  );
}
