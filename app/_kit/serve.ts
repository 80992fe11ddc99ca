import { createHmac } from 'node:crypto';

import { primary, replica } from '@/db/pools';
import { withTenant } from '@/db/client';
import type { Endpoint } from '@/lib/api/endpoint';
import { authorize } from '@/lib/auth/authorize';
import { personOf, type Ctx } from '@/lib/auth/context';
import type { Identity } from '@/lib/auth/identify';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { log } from '@/lib/log';

import { clientAddress } from './client-address';
import { once } from './idempotency';
import { problemResponse } from './problem';
import { jsonBodyOf } from './request-body';
import { identify } from './session';

type RouteHandler = (
  request: Request,
  route: { params: Promise<Record<string, string>> },
) => Promise<Response>;

/**
 * Turns an endpoint into a route: who, may they, is the input right, in whose rows, done once, told in one form.
 * The only door of the browser and of programs.
 *
 * @param readBody what the input of a write is made of, where it is not the JSON that came
 */
export function serve(endpoint: Endpoint, readBody = jsonBodyOf): RouteHandler {
  return async (request, route) => {
    const requestId = request.headers.get('x-request-id')?.slice(0, 64) ?? newId();
    const startedAt = performance.now();
    try {
      const asked = { request, params: await route.params, requestId, readBody };
      const response = await answer(endpoint, asked);
      log.info(
        {
          requestId,
          operation: endpoint.declaration.id,
          status: response.status,
          ms: Math.round(performance.now() - startedAt),
        },
        'answered',
      );
      return response;
    } catch (error) {
      const response = problemResponse(error, requestId);
      log.info(
        {
          requestId,
          operation: endpoint.declaration.id,
          status: response.status,
          ms: Math.round(performance.now() - startedAt),
        },
        'refused',
      );
      return response;
    }
  };
}

interface Asked {
  request: Request;
  params: Record<string, string>;
  requestId: string;
  readBody: typeof jsonBodyOf;
}

async function answer(
  endpoint: Endpoint,
  { request, params, requestId, readBody }: Asked,
): Promise<Response> {
  const { declaration } = endpoint;
  const now = new Date();
  const isRead = declaration.method === 'get';
  if (!isRead) refuseForeignOrigin(request);
  const identity = atItsSide(await identify(request.headers, now), endpoint);
  standBefore(identity, endpoint);

  const body = isRead ? queryOf(request) : await readBody(request);
  const input: Record<string, unknown> = declaration.input.parse({ ...body, ...params });
  const address = clientAddress(request.headers);
  const key = isRead ? null : request.headers.get('idempotency-key');

  const owner = keyOwnerOf(identity);
  const inTenant = <T>(work: (ctx: Ctx) => Promise<T>): Promise<T> =>
    withTenant(
      isRead ? replica() : primary(),
      identity.tenant,
      (tx) => work({ tenant: identity.tenant, actor: identity.actor, tx, now, requestId, address }),
      owner,
    );

  const found = await endpoint.outside?.({ inTenant }, input);
  const work = async (ctx: Ctx): Promise<unknown> => {
    const result = await endpoint.run(ctx, input, found);
    return result instanceof Response ? result : declaration.response.parse(result);
  };
  const result = await inTenant((ctx) =>
    key === null
      ? work(ctx)
      : once(ctx.tx, { owner, key, operation: declaration.id, requestHash: hashOf(input), now }, () =>
          work(ctx),
        ),
  );
  if (result instanceof Response) return result;
  return Response.json(result, { headers: { 'x-request-id': requestId, 'cache-control': 'no-store' } });
}

/** What is for everyone is done at the door, whoever comes: a signed-in person may open a link that was sent to another. */
const atItsSide = (identity: Identity, { declaration }: Endpoint): Identity =>
  declaration.side === 'public' ? { ...identity, tenant: { kind: 'door' } } : identity;

/** The permission first, then the side: a processor at a shop's door is told the same as any stranger. */
function standBefore(identity: Identity, { declaration }: Endpoint): void {
  authorize(identity, declaration.permission);
  const side = identity.tenant.kind;
  const fits =
    declaration.side === 'public' ||
    (declaration.side === 'any' && side !== 'door') ||
    (declaration.side === 'shop' && side === 'shop') ||
    (declaration.side === 'portal' && side === 'processor');
  if (!fits) throw new AppError('not_allowed', 'This belongs to another side of Lotwright.');
}

/** Cookies come along with a form on a foreign page; its Origin does not lie. Programs with a token send none. */
function refuseForeignOrigin(request: Request): void {
  const origin = request.headers.get('origin');
  if (origin !== null && origin !== new URL(env.APP_URL).origin)
    throw new AppError('not_allowed', 'This came from a page that is not Lotwright.');
}

function queryOf(request: Request): Record<string, unknown> {
  const query: Record<string, unknown> = {};
  const search = new URL(request.url).searchParams;
  for (const name of new Set(search.keys())) {
    const values = search.getAll(name);
    query[name] = values.length > 1 ? values : values[0];
  }
  return query;
}

/** Whose idempotency keys: a person's in one organisation, a link's, or (door) nobody's in common. */
function keyOwnerOf({ actor, tenant }: Identity): string {
  const who = actor.kind === 'link' ? actor.linkId : personOf(actor);
  if (who === null) return '';
  return tenant.kind === 'shop' ? `${tenant.shopId}:${who}` : `${tenant.kind}:${who}`;
}

/** Keyed, because some inputs hold a password, which a plain hash in the database would give away to guessing. */
const hashOf = (input: unknown): string =>
  createHmac('sha256', env.AUTH_SECRET).update(JSON.stringify(input)).digest('hex');
