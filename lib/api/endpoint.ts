import type { z } from 'zod';

import type { Ctx } from '@/lib/auth/context';
import type { Permission } from '@/lib/auth/permissions';

export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** Whose door it is: the shop's people, the processor's, either of them, or everyone. */
export type Side = 'shop' | 'portal' | 'any' | 'public';

/**
 * One read or write as the world sees it. Holds no server code, so the browser makes its typed calls, the route its
 * validation and the documentation its text from the same object.
 */
export interface Declaration<
  Input extends z.ZodObject = z.ZodObject,
  Response extends z.ZodType = z.ZodType,
> {
  /** Name of the operation, unique: `dispatchBatch`. */
  id: string;
  method: Method;
  /** Below /api; parameters of the path in braces are taken from the input: `/batches/{batchId}/dispatch`. */
  path: string;
  summary: string;
  side: Side;
  permission: Permission;
  /** Everything that goes in: path parameters, and the query (get) or the JSON body (all others). */
  input: Input;
  /** What comes out as JSON; `BINARY` where the answer is a file or another format. */
  response: Response;
}

export type InputOf<D extends Declaration> = z.input<D['input']>;
export type OutputOf<D extends Declaration> = z.output<D['response']>;

export function declare<Input extends z.ZodObject, Response extends z.ZodType>(
  given: Declaration<Input, Response>,
): Declaration<Input, Response> {
  return given;
}

/** What a step outside the transaction works with. Network calls stand between transactions, never inside one. */
export interface Outside {
  /** A short transaction of its own, as the caller. */
  inTenant<T>(work: (ctx: Ctx) => Promise<T>): Promise<T>;
}

/** A declaration with the verb or query that does it. Lives on the server only. */
export interface Endpoint<D extends Declaration = Declaration> {
  declaration: D;
  /** Network calls that must come first. Runs once the caller may do this and the input is right; safe to run twice. */
  outside?(outside: Outside, input: z.output<D['input']>): Promise<unknown>;
  /**
   * Returns what `response` describes (Dates allowed where it says a moment), or a web Response for a binary answer.
   * `found` is what `outside` brought.
   */
  run(ctx: Ctx, input: z.output<D['input']>, found?: unknown): Promise<unknown>;
}

export function endpoint<D extends Declaration>(
  declaration: D,
  run: (ctx: Ctx, input: z.output<D['input']>) => Promise<z.input<D['response']> | Response>,
): Endpoint<D> {
  return { declaration, run };
}

/** For what needs the network: first `outside`, then `run` in the request's one transaction with what it brought. */
export function endpointInSteps<D extends Declaration, Found>(
  declaration: D,
  steps: {
    outside(outside: Outside, input: z.output<D['input']>): Promise<Found>;
    run(ctx: Ctx, input: z.output<D['input']>, found: Found): Promise<z.input<D['response']> | Response>;
  },
): Endpoint<D> {
  return { declaration, ...steps } as Endpoint<D>;
}
