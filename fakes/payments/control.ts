import type { IncomingMessage, ServerResponse } from 'node:http';
import { z } from 'zod';
import { answerJson, redirectTo } from '../answer';
import { readBody } from '../read-body';
import { settleDue } from './settle-intent';
import { FORGERIES } from './webhooks';
import { PAYMENT_FAILURES } from './world';
import type { PaymentsWorld } from './world';

/**
 * What tests (and the buttons of the page) can make happen. All POST, JSON or form:
 *
 *   /control             {"fail": "none" | "refuse" | "drop" | "lose_answer", "times"?: n}
 *   /control/settle      {"payment_intent"?, "outcome"?: "succeed" | "fail"}    all under way, if none is named
 *   /control/webhooks    {"mode": "deliver" | "hold"}                           "hold" lets events pile up
 *   /control/redeliver   {"event"?, "order"?: "as_happened" | "reverse"}        everything not yet delivered, if none is named
 *   /control/forge       {"event"?, "how": "wrong_secret" | "tampered" | "old" | "unsigned"}   the latest, if none is named
 *   /control/reset       forgets everything
 */
export async function serveControl(
  world: PaymentsWorld,
  request: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  const { pathname } = new URL(request.url ?? '/', world.address());
  const isForm = request.headers['content-type']?.startsWith('application/x-www-form-urlencoded') ?? false;
  const body = await readBody(request);
  const given: unknown = isForm
    ? Object.fromEntries(new URLSearchParams(body))
    : JSON.parse(body === '' ? '{}' : body);

  const action = ACTIONS[pathname.replace(/^\/control\/?/, '')];
  if (action === undefined) return answerJson(response, 404, { error: 'There is no such control.' });
  try {
    const result = await action(world, given);
    if (isForm) return redirectTo(response, '/');
    answerJson(response, 200, result);
  } catch (error) {
    answerJson(response, 400, {
      error: error instanceof z.ZodError ? z.prettifyError(error) : String(error),
    });
  }
}

const ACTIONS: Readonly<Record<string, (world: PaymentsWorld, given: unknown) => Promise<unknown>>> = {
  '': async (world, given) => {
    const { fail, times } = z
      .strictObject({ fail: z.enum(PAYMENT_FAILURES), times: z.coerce.number().int().positive().optional() })
      .parse(given);
    world.setFailure(fail, times ?? Number.POSITIVE_INFINITY);
    return { failure: fail };
  },
  settle: async (world, given) => {
    const { payment_intent: intent, outcome } = z
      .strictObject({
        payment_intent: z.string().optional(),
        outcome: z.enum(['succeed', 'fail']).optional(),
      })
      .parse(given);
    const settled = settleDue(
      world.call({ id: '', form: {}, requestId: null, idempotencyKey: null, apiVersion: null }),
      { intent, outcome },
    );
    world.changed();
    return { settled };
  },
  webhooks: async (world, given) => {
    const { mode } = z.strictObject({ mode: z.enum(['deliver', 'hold']) }).parse(given);
    world.holdWebhooks(mode === 'hold');
    return { mode };
  },
  redeliver: async (world, given) => {
    const { event, order } = z
      .strictObject({ event: z.string().optional(), order: z.enum(['as_happened', 'reverse']).optional() })
      .parse(given);
    const waiting = world.store.state.deliveries
      .filter(({ state }) => state !== 'delivered')
      .map((delivery) => delivery.event);
    const events = event === undefined ? waiting : [event];
    return { delivered: await world.webhooks.send(order === 'reverse' ? events.toReversed() : events) };
  },
  forge: async (world, given) => {
    const { event, how } = z
      .strictObject({ event: z.string().optional(), how: z.enum(FORGERIES) })
      .parse(given);
    const forged = event ?? Object.keys(world.store.state.events).at(-1) ?? '';
    return { event: forged, answer: await world.webhooks.forge(forged, how) };
  },
  reset: async (world) => {
    world.store.reset();
    return { ok: true };
  },
};
