import { randomBytes } from 'node:crypto';
import type { Form } from './form';
import { missing } from './payment-fault';
import type { PaymentsState } from './store';

/** One request as the handlers see it. They are all synchronous, so no two ever interleave. */
export interface Call {
  state: PaymentsState;
  /** From the path: `/v1/accounts/:id`. */
  id: string;
  form: Form;
  nowMs: number;
  requestId: string | null;
  idempotencyKey: string | null;
  apiVersion: string;
  /** Of the stand-in itself, for the pages it links to. */
  address: string;
  settleAfterMs: number;
}

export function seconds(call: Pick<Call, 'nowMs'>): number {
  return Math.floor(call.nowMs / 1000);
}

/** Ids look like the real ones, so that nothing downstream learns to expect something shorter. */
export function newPaymentId(prefix: string): string {
  const letters = 'abcdefghijklmnopqrstuvwxyzABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789';
  return `${prefix}_1${[...randomBytes(23)].map((byte) => letters[byte % letters.length]).join('')}`;
}

/** The thing with this id, or the refusal of the wire. `param` names the parameter that carried the id, if it was one. */
export function mustFind<T>(things: Record<string, T>, id: string, noun: string, param?: string): T {
  const found = Object.hasOwn(things, id) ? things[id] : undefined;
  if (found === undefined) throw missing(noun, id, param);
  return found;
}

/** Newest first, from after a given id, as every list on the wire. */
export function listOf<T extends { id: string; created: number }>(
  things: Record<string, T>,
  form: Form,
  url: string,
) {
  const limit = Math.min(Math.max(Number(form['limit'] ?? 10), 1), 100);
  const after = form['starting_after'];
  // Later entries of one second come first too: the order of making is the order of the keys.
  const all = Object.values(things).reverse();
  const from = typeof after === 'string' ? all.findIndex(({ id }) => id === after) + 1 : 0;
  const data = all.slice(from, from + limit);
  return { object: 'list', url, has_more: from + limit < all.length, data };
}
