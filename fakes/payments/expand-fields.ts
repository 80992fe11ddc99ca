import type { PaymentsState } from './store';

/** Replaces ids by the things they name, where the caller asked for it: `expand[]=latest_charge.transfer`. */
export function expandFields(state: PaymentsState, body: unknown, paths: readonly string[]): unknown {
  if (paths.length === 0) return body;
  const copy: unknown = structuredClone(body);
  for (const path of paths) expandPath(state, copy, path.split('.'));
  return copy;
}

function expandPath(state: PaymentsState, at: unknown, [field, ...rest]: string[]): void {
  if (field === undefined) return;
  if (Array.isArray(at)) {
    for (const each of at) expandPath(state, each, [field, ...rest]);
    return;
  }
  if (typeof at !== 'object' || at === null) return;
  const holder = at as Record<string, unknown>;
  const value = holder[field];
  if (typeof value === 'string') holder[field] = structuredClone(thingOf(state, value)) ?? value;
  expandPath(state, holder[field], rest);
}

function thingOf(state: PaymentsState, id: string): object | undefined {
  const shelves: Readonly<Record<string, Record<string, object>>> = {
    acct: state.accounts,
    cus: state.customers,
    pm: state.paymentMethods,
    seti: state.setupIntents,
    pi: state.paymentIntents,
    ch: state.charges,
    tr: state.transfers,
    re: state.refunds,
  };
  return shelves[id.split('_')[0] ?? '']?.[id];
}
