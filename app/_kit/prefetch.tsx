import { dehydrate, HydrationBoundary, QueryClient } from '@tanstack/react-query';
import { headers } from 'next/headers';
import { notFound, redirect } from 'next/navigation';
import { cache, type ReactNode } from 'react';

import { withTenant } from '@/db/client';
import { replica } from '@/db/pools';
import type { Declaration, Endpoint, InputOf, OutputOf } from '@/lib/api/endpoint';
import { queryKeyOf } from '@/lib/api/query-key';
import type { Ctx } from '@/lib/auth/context';
import type { Identity } from '@/lib/auth/identify';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';

import { identify } from './session';

/** Who looks at this page; asked once a request, however many parts of the page ask. */
export const viewer = cache(async (): Promise<Identity> => identify(await headers(), new Date()));

type Asked = readonly [Endpoint, Record<string, unknown>];
interface Answer {
  key: readonly unknown[];
  data: unknown;
}

/** What this request has asked already: title, frame and page of one request often ask the same. */
const answered = cache(() => new Map<string, Promise<Answer>>());

/** One read and what it is asked, checked against each other. */
export const ask = <D extends Declaration>(endpoint: Endpoint<D>, input: InputOf<D>): Asked => [
  endpoint as unknown as Endpoint,
  input as Record<string, unknown>,
];

/**
 * Lays a page's data into the browser's cache before it is drawn, so that no page starts with waiting. A person who is
 * not signed in goes to the sign-in page; what is not theirs and what is not there is the same page.
 */
export async function Prefetched({ queries, children }: { queries: readonly Asked[]; children: ReactNode }) {
  const client = new QueryClient();
  const results = await readAll(queries);
  results.forEach(({ key, data }) => client.setQueryData(key, data));
  return <HydrationBoundary state={dehydrate(client)}>{children}</HydrationBoundary>;
}

/** One read on the server, for what a page's own frame needs (its title, a redirect). */
export async function readOnServer<D extends Declaration>(
  endpoint: Endpoint<D>,
  input: InputOf<D>,
): Promise<OutputOf<D>> {
  const [result] = await readAll([ask(endpoint, input)]);
  return result?.data as OutputOf<D>;
}

async function readAll(queries: readonly Asked[]): Promise<Answer[]> {
  const known = answered();
  const nameOf = ([{ declaration }, input]: Asked): string => JSON.stringify(queryKeyOf(declaration, input));
  const open = queries.filter((asked) => !known.has(nameOf(asked)));
  if (open.length > 0) {
    const reading = readTogether(open);
    open.forEach((asked, at) =>
      known.set(
        nameOf(asked),
        reading.then((answers) => answers[at] as Answer),
      ),
    );
  }
  return Promise.all(queries.map((asked) => known.get(nameOf(asked)) as Promise<Answer>));
}

/** All in one transaction, as whoever looks. */
async function readTogether(queries: readonly Asked[]): Promise<Answer[]> {
  const isPublic = queries.every(([endpoint]) => endpoint.declaration.side === 'public');
  const who = await viewer();
  const identity: Identity = isPublic ? { ...who, tenant: { kind: 'door' } } : who;
  if (identity.tenant.kind === 'door' && !isPublic) await goToSignIn();
  try {
    return await withTenant(replica(), identity.tenant, async (tx) => {
      const ctx: Ctx = { ...identity, tx, now: new Date(), requestId: newId(), address: null };
      const results = [];
      for (const [{ declaration, run }, input] of queries) {
        const asked = declaration.input.safeParse(input);
        // An address that nothing could be asked for: no such thing is there.
        if (!asked.success) notFound();
        const data = declaration.response.parse(await run(ctx, asked.data));
        results.push({ key: queryKeyOf(declaration, input), data });
      }
      return results;
    });
  } catch (error) {
    if (error instanceof AppError && ['not_found', 'not_allowed'].includes(error.code)) notFound();
    throw error;
  }
}

async function goToSignIn(): Promise<never> {
  const path = (await headers()).get('x-path') ?? '/';
  redirect(`/sign-in?next=${encodeURIComponent(path)}`);
}
