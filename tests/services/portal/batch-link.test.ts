import { eq } from 'drizzle-orm';
import { describe, expect, test } from 'vitest';

import { withTenant } from '@/db/client';
import { batches, batchLinks } from '@/db/schema/batches';
import { identifySession } from '@/lib/auth/identify';
import { batchLinkToken } from '@/lib/batches/batch-link-token';
import { newId } from '@/lib/ids';
import { openBatchLink } from '@/lib/people/open-batch-link';
import { listBatchLinks } from '@/lib/portal/list-batch-links';
import { readBatchLink } from '@/lib/portal/read-batch-link';
import { sendBatchLink } from '@/lib/portal/send-batch-link';
import { standingBatchUrl } from '@/lib/portal/standing-batch-url';
import { withdrawBatchLinks } from '@/lib/portal/withdraw-batch-links';

import { makeBatch, makeDispatchedBatch } from '../../factories/batches';
import { lastAudit } from '../../factories/standing';
import { makeWorld, TODAY } from '../../factories/world';
import { openDatabase } from '../open-database';
import { makeSent, queuedMails, refusalOf } from './portal-kit';

const base = openDatabase();

async function setup() {
  const sent = await makeSent(base, { pieces: [41] });
  const [link] = await base.owner.select().from(batchLinks).where(eq(batchLinks.batchId, sent.batchId));
  return { ...sent, linkId: link?.id ?? '', token: batchLinkToken(link?.id ?? '') };
}

const look = (token: string) =>
  withTenant(base.db, { kind: 'door' }, (tx) =>
    readBatchLink(
      {
        tx,
        tenant: { kind: 'door' },
        actor: { kind: 'nobody', name: 'nobody', roles: [] },
        now: TODAY,
        requestId: newId(),
        address: null,
      },
      { token },
    ),
  );
const open = (token: string) => openBatchLink(base.db, { token, now: TODAY });

describe('a link from the mail', () => {
  test('says what it is for, as often as it is looked at, and that changes nothing', async () => {
    const { batch, linkId, token } = await setup();
    for (let fetched = 0; fetched < 3; fetched++) {
      expect(await look(token)).toMatchObject({
        state: 'open',
        batch: { id: batch.id, number: batch.number, pieces: 41, specification: 'AMS 2770 rev R' },
      });
    }
    const [link] = await base.owner.select().from(batchLinks).where(eq(batchLinks.id, linkId));
    expect(link).toMatchObject({ firstOpenedAt: null, withdrawnAt: null });
  });

  test('opens again and again, on any device, and reaches that batch only', async () => {
    const { world, batch, batchId, linkId, token } = await setup();
    const other = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
    for (let press = 0; press < 2; press++) expect(await open(token)).toEqual({ kind: 'link', linkId });
    const identity = await identifySession(base.db, { kind: 'link', linkId });
    expect(identity?.tenant).toEqual({
      kind: 'processor',
      processorId: world.processorId,
      batchId,
      personId: null,
    });
    const seen = await withTenant(base.db, identity?.tenant ?? { kind: 'door' }, (tx) =>
      tx.select({ id: batches.id, number: batches.number }).from(batches),
    );
    expect(seen).toEqual([{ id: batchId, number: batch.number }]);
    expect(seen.map((one) => one.id)).not.toContain(other.id);
  });

  test('that nobody made opens nothing', async () => {
    await setup();
    expect(await look('made-up')).toEqual({ state: 'unknown', batch: null });
    expect(await open('made-up')).toBeNull();
  });

  test.each(['settled', 'stocked', 'cancelled'] as const)(
    'ends with a batch that is %s, also for who is inside',
    async (stage) => {
      const { batchId, linkId, token } = await setup();
      await base.owner.update(batches).set({ stage }).where(eq(batches.id, batchId));
      expect((await look(token)).state).toBe(stage === 'cancelled' ? 'cancelled' : 'settled');
      expect(await open(token)).toBeNull();
      expect(await identifySession(base.db, { kind: 'link', linkId })).toBeNull();
    },
  );

  test('tells no price and nothing else of the shop', async () => {
    const { token } = await setup();
    expect(Object.keys((await look(token)).batch ?? {}).sort()).toEqual([
      'id',
      'number',
      'orderNumber',
      'pieces',
      'process',
      'processor',
      'processorId',
      'shop',
      'shopPhone',
      'specification',
      'stage',
      'wantedBackOn',
      'zone',
    ]);
  });
});

describe('the shop', () => {
  test('withdraws all links of a batch: whoever is inside is out, and mails carry none any more', async () => {
    const { world, batchId, linkId, token } = await setup();
    await world.as(['lead'], (ctx) => withdrawBatchLinks(ctx, { batchId }));
    await world.as(['lead'], (ctx) => withdrawBatchLinks(ctx, { batchId }));
    expect((await look(token)).state).toBe('withdrawn');
    expect(await open(token)).toBeNull();
    expect(await identifySession(base.db, { kind: 'link', linkId })).toBeNull();
    await world.as(['lead'], async (ctx) => {
      expect(await standingBatchUrl(ctx, { batchId, processorId: world.processorId })).toBeNull();
      expect(await lastAudit(ctx, 'batch.withdraw_links')).toMatchObject({
        entityId: batchId,
        after: { links: [linkId] },
      });
      expect(await listBatchLinks(ctx, { batchId })).toMatchObject({
        links: [{ id: linkId, withdrawnAt: TODAY }],
        ended: false,
      });
    });
  });

  test('sends a new link, to the desk or to somebody else; the earlier ones go on working', async () => {
    const { world, batchId, token } = await setup();
    expect(await world.as(['lead'], (ctx) => sendBatchLink(ctx, { batchId }))).toEqual({
      sentTo: `desk-${world.processorId}@processor.test`,
    });
    await world.as(['lead'], (ctx) => sendBatchLink(ctx, { batchId, to: 'night-shift@processor.test' }));
    const mails = (await queuedMails(base.owner, world.shopId)).filter(
      (mail) => mail.template === 'batch-link',
    );
    expect(mails.map((mail) => mail.to)).toEqual([
      [`desk-${world.processorId}@processor.test`],
      ['night-shift@processor.test'],
    ]);
    const tokens = mails.map((mail) => String(mail.props['url']).split('/b/')[1] ?? '');
    for (const one of [token, ...tokens]) expect(await open(one)).not.toBeNull();
    await world.as(['lead'], async (ctx) =>
      expect(await lastAudit(ctx, 'batch.send_link')).toMatchObject({
        after: { to: 'night-shift@processor.test' },
      }),
    );
  });

  test('sends none for a batch that has not left or is over, and only those who dispatch may', async () => {
    const { world, batchId } = await setup();
    const built = await world.as(['lead'], (ctx) => makeBatch(ctx, world.processorId));
    const stranger = await makeWorld(base.db, base.owner);
    expect(
      await refusalOf(world.as(['lead'], (ctx) => sendBatchLink(ctx, { batchId: built.id }))),
    ).toMatchObject({ code: 'conflict' });
    expect(
      await refusalOf(world.as(['inspector', 'office'], (ctx) => sendBatchLink(ctx, { batchId }))),
    ).toMatchObject({ code: 'not_allowed' });
    expect(
      await refusalOf(world.as(['auditor'], (ctx) => withdrawBatchLinks(ctx, { batchId }))),
    ).toMatchObject({ code: 'not_allowed' });
    expect(await refusalOf(stranger.as(['lead'], (ctx) => sendBatchLink(ctx, { batchId })))).toMatchObject({
      code: 'not_found',
    });
    expect(
      await refusalOf(stranger.as(['lead'], (ctx) => withdrawBatchLinks(ctx, { batchId }))),
    ).toMatchObject({ code: 'not_found' });
    expect(await refusalOf(stranger.as(['lead'], (ctx) => listBatchLinks(ctx, { batchId })))).toMatchObject({
      code: 'not_found',
    });
    await base.owner.update(batches).set({ stage: 'settled' }).where(eq(batches.id, batchId));
    expect(await refusalOf(world.as(['lead'], (ctx) => sendBatchLink(ctx, { batchId })))).toMatchObject({
      code: 'conflict',
    });
  });
});
