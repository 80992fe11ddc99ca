import type { Declaration } from './endpoint';

/** The cache key of a read; the server's prefetch and the browser's query meet under it. */
export const queryKeyOf = (declaration: Declaration, input: Record<string, unknown>): readonly unknown[] => [
  declaration.id,
  defined(input),
];

/** A key does not tell `undefined` from absent. */
const defined = (input: Record<string, unknown>) =>
  Object.fromEntries(Object.entries(input).filter(([, value]) => value !== undefined));
