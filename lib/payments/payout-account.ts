import { and, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { processors } from '@/db/schema/organisations';
import type { Outside } from '@/lib/api/endpoint';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { log } from '@/lib/log';

import type { linkPayoutAccount as declaration } from './contract';
import { createConnectedAccount, createOnboardingLink } from './payments';
import { toldInWords } from './settings';

/** Whoever holds the link of one batch may not say where all of a processor's money goes; a signed-in person may. */
async function readOwnProcessor(ctx: Ctx) {
  authorize(ctx, 'portal.account');
  const { tenant } = ctx;
  if (tenant.kind !== 'processor' || tenant.batchId !== null || tenant.personId === null)
    throw new AppError(
      'not_allowed',
      'The link in a mail opens its batch only. Sign in to say where your money goes.',
    );
  const [processor] = await ctx.tx
    .select({
      id: processors.id,
      name: processors.name,
      email: processors.email,
      account: processors.stripeAccountId,
      ready: processors.payoutsReady,
    })
    .from(processors)
    .where(eq(processors.id, tenant.processorId));
  if (!processor) throw new Error('a processor without its row');
  return processor;
}

export async function getPayoutAccount(ctx: Ctx) {
  authorize(ctx, 'portal.account');
  const { account, ready } = await readOwnProcessor(ctx);
  if (account === null) return { state: 'none' as const };
  return { state: ready ? ('ready' as const) : ('unfinished' as const) };
}

/** The processor's account at the service (made once), and its page. What is said there comes by webhook. */
export async function makeAccountPage(
  { inTenant }: Outside,
  { country }: z.output<(typeof declaration)['input']>,
): Promise<{ account: string; url: string }> {
  const { id, name, email, account: known } = await inTenant(readOwnProcessor);
  const back = `${env.APP_URL}/portal/account`;
  return toldInWords(async () => {
    const account = known ?? (await createConnectedAccount({ name, email, country, processorId: id }));
    return {
      account,
      url: await createOnboardingLink({
        account,
        returnUrl: `${back}?back=1`,
        refreshUrl: `${back}?again=1`,
      }),
    };
  });
}

export async function linkPayoutAccount(
  ctx: Ctx,
  _: object,
  { account, url }: { account: string; url: string },
) {
  authorize(ctx, 'portal.account');
  const { id } = await readOwnProcessor(ctx);
  await ctx.tx
    .update(processors)
    .set({ stripeAccountId: account })
    .where(and(eq(processors.id, id), isNull(processors.stripeAccountId)));
  // A processor has no chain of its own; each shop's trail tells when it can be paid.
  log.info(
    { requestId: ctx.requestId, processorId: id, by: ctx.actor.name },
    'a processor opened the page of its payout account',
  );
  return { url };
}
