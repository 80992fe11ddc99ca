/// <reference types="vite/client" />
import { encode } from 'next-auth/jwt';
import { beforeAll } from 'vitest';

import type { Db } from '@/db/client';
import { memberships, users } from '@/db/schema/people';
import { requestOf } from '@/lib/api/client';
import type { Declaration, InputOf, OutputOf } from '@/lib/api/endpoint';
import { Problem } from '@/lib/api/shapes';
import type { Role } from '@/lib/auth/roles';
import type { SessionClaims } from '@/lib/auth/session-claims';
import { env } from '@/lib/env';
import { newId } from '@/lib/ids';

import { TODAY } from '../factories/world';
import { openDatabase } from '../services/open-database';

type Handler = (request: Request, route: { params: Promise<Record<string, string>> }) => Promise<Response>;

const routes = import.meta.glob<Record<string, Handler>>(['/app/api/**/route.ts', '!/app/api/auth/**']);

/** The application's route handlers on a database of this file's own. */
export function openApi(): { db: Db; owner: Db } {
  const base = openDatabase();
  beforeAll(() => {
    Object.assign(globalThis, { lotwrightDb: base.db, lotwrightReplica: base.db });
  });
  return base;
}

export interface Caller {
  cookie?: string;
  bearer?: string;
}

interface Sent extends Caller {
  key?: string;
  headers?: Record<string, string>;
  /** Sent instead of what the input would be as JSON. */
  rawBody?: string;
}

/** Calls an endpoint as a browser or a program would, through its route. */
export async function send(
  declaration: Declaration,
  input: Record<string, unknown>,
  sent: Sent = {},
): Promise<Response> {
  const { url, body } = requestOf(declaration, input);
  const params = Object.fromEntries(
    [...declaration.path.matchAll(/\{(\w+)\}/g)].map((match) => [
      match[1] ?? '',
      String(input[match[1] ?? '']),
    ]),
  );
  const handler = await handlerOf(declaration);
  const text = sent.rawBody ?? body;
  const request = new Request(new URL(url, env.APP_URL), {
    method: declaration.method.toUpperCase(),
    headers: {
      ...(text === undefined ? {} : { 'content-type': 'application/json' }),
      ...(sent.cookie === undefined ? {} : { cookie: sent.cookie }),
      ...(sent.bearer === undefined ? {} : { authorization: `Bearer ${sent.bearer}` }),
      ...(sent.key === undefined ? {} : { 'idempotency-key': sent.key }),
      ...sent.headers,
    },
    ...(text === undefined ? {} : { body: text }),
  });
  return handler(request, { params: Promise.resolve(params) });
}

async function handlerOf({ method, path }: Declaration): Promise<Handler> {
  const file = `/app/api${path.replaceAll('{', '[').replaceAll('}', ']')}/route.ts`;
  const handler = (await routes[file]?.())?.[method.toUpperCase()];
  if (!handler) throw new Error(`no ${method} in ${file}`);
  return handler;
}

/** The answer of a call that must succeed. */
export async function ask<D extends Declaration>(
  declaration: D,
  input: InputOf<D>,
  sent: Sent = {},
): Promise<OutputOf<D>> {
  const response = await send(declaration, input as Record<string, unknown>, sent);
  const body: unknown = await response.json();
  if (!response.ok) throw new Error(`${declaration.id} answered ${response.status}: ${JSON.stringify(body)}`);
  return body as OutputOf<D>;
}

/** The problem of a call that must be refused, with the form of RFC 9457. */
export async function refusal(response: Response): Promise<Problem> {
  if (response.headers.get('content-type') !== 'application/problem+json')
    throw new Error(`not a problem: ${response.status} ${await response.text()}`);
  return Problem.parse(await response.json());
}

/** The cookie that signing in would have set. */
export async function cookieFor(claims: SessionClaims): Promise<string> {
  const name = 'authjs.session-token';
  return `${name}=${await encode({ token: { claims }, secret: env.AUTH_SECRET, salt: name })}`;
}

/** A person with these roles in a shop or at a processor, and their cookie. */
export async function makeSignedIn(
  owner: Db,
  organisation: { shopId: string } | { processorId: string },
  roles: readonly Role[],
): Promise<{ userId: string; email: string; cookie: string }> {
  const userId = newId();
  const email = `${roles.join('-')}-${userId}@people.test`;
  await owner
    .insert(users)
    .values({ id: userId, email, name: `Person ${roles.join(' ')}`, createdAt: TODAY });
  await owner.insert(memberships).values({ userId, roles: [...roles], ...organisation, createdAt: TODAY });
  return {
    userId,
    email,
    cookie: await cookieFor({ kind: 'person', userId, sessionVersion: 1, ...organisation }),
  };
}
