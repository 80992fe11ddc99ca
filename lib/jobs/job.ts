import type { z } from 'zod';

import type { Ctx } from '@/lib/auth/context';

/** What a job works with. Network calls stand between transactions, never inside one. */
export interface JobTools {
  /** Opens a transaction in the shop and hands in a context whose actor is this job. */
  inShop<T>(shopId: string, work: (ctx: Ctx) => Promise<T>): Promise<T>;
  /** The same before it is known whose it is: a webhook's event. */
  atDoor<T>(work: (ctx: Ctx) => Promise<T>): Promise<T>;
  now(): Date;
  /** Which attempt this is, from 1. */
  attempt: number;
  /** Why it is run: what the job that was given up for it said last. Null where nothing was given up. */
  gaveUp: string | null;
}

export interface Job<Payload extends z.ZodType = z.ZodType> {
  /** Verb and noun, also the queue's name: `send-mail`. */
  name: string;
  payload: Payload;
  /** Safe to run twice: a job that died half way is run again from the start. */
  run(tools: JobTools, payload: z.output<Payload>): Promise<void>;
  /** Attempts after the first; the pause doubles from `retryDelayS`. */
  retries: number;
  retryDelayS: number;
  /** One at a time and in order, where the outside world demands it. */
  concurrency: number;
}

/** Declares a job: a name, a shape and what it calls. */
export function job<Payload extends z.ZodType>(
  given: Pick<Job<Payload>, 'name' | 'payload' | 'run'> & Partial<Job<Payload>>,
): Job<Payload> {
  return { retries: 12, retryDelayS: 5, concurrency: 1, ...given };
}
