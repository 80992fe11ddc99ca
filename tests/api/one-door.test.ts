import { and, eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { auditEntries } from '@/db/schema/audit';
import { shopProcessors } from '@/db/schema/organisations';
import { memberships, users } from '@/db/schema/people';
import { createToken, listTokens, revokeToken } from '@/lib/people/token-contract';
import { endMySessions } from '@/lib/people/account-contract';
import { getShopSettings, updateShopSettings } from '@/lib/organisations/contract';
import { getMe } from '@/lib/session/contract';
import { addProcessor, getProcessor, listProcessors, updateProcessor } from '@/lib/processors/contract';
import { newId } from '@/lib/ids';

import { makeWorld } from '../factories/world';
import { ask, cookieFor, makeSignedIn, openApi, refusal, send } from './harness';

const base = openApi();

async function setup() {
  const world = await makeWorld(base.db, base.owner);
  const admin = await makeSignedIn(base.owner, { shopId: world.shopId }, ['admin']);
  const auditor = await makeSignedIn(base.owner, { shopId: world.shopId }, ['auditor']);
  return { world, admin, auditor };
}

const newProcessor = () => ({ name: 'Cinder Vale Plating', email: `desk-${newId()}@cinder.test` });

const linksOf = (shopId: string) =>
  base.owner.select().from(shopProcessors).where(eq(shopProcessors.shopId, shopId));
const trailOf = (shopId: string) =>
  base.owner.select().from(auditEntries).where(eq(auditEntries.shopId, shopId));

test('nobody is told to sign in, and nothing else', async () => {
  const response = await send(listProcessors, {});
  expect(response.status).toBe(401);
  const problem = await refusal(response);
  expect(problem).toMatchObject({
    type: 'about:blank',
    status: 401,
    code: 'not_signed_in',
    title: 'Sign in first.',
  });
  expect(problem.requestId).toBe(response.headers.get('x-request-id'));
});

test('a request keeps the id it came with', async () => {
  const response = await send(listProcessors, {}, { headers: { 'x-request-id': 'from-the-proxy' } });
  expect((await refusal(response)).requestId).toBe('from-the-proxy');
});

test('a forged or foreign cookie is nobody’s', async () => {
  for (const cookie of [
    'authjs.session-token=nonsense',
    'authjs.session-token=eyJhbGciOiJkaXIifQ..a.b.c',
    'other=1',
  ]) {
    expect((await send(getMe, {}, { cookie })).status).toBe(401);
  }
});

test('wrong input names each field in words and changes nothing', async () => {
  const { world, admin } = await setup();
  const response = await send(addProcessor, { name: '', email: 'not-an-address' }, { cookie: admin.cookie });
  expect(response.status).toBe(400);
  const { code, fields } = await refusal(response);
  expect(code).toBe('bad_input');
  expect(fields).toEqual(
    expect.arrayContaining([
      { field: 'name', message: 'Enter the name.' },
      { field: 'email', message: 'Enter an e-mail address, as name@shop.example.' },
    ]),
  );
  expect(await linksOf(world.shopId)).toHaveLength(1);
});

test.each([
  ['what is no JSON', '{"name": "Cinder'],
  ['a list', '[1, 2]'],
  ['a number', '7'],
  ['nothing but null', 'null'],
])('%s as a body is refused in the same form', async (_, rawBody) => {
  const { admin } = await setup();
  const response = await send(addProcessor, newProcessor(), { cookie: admin.cookie, rawBody });
  expect(response.status).toBe(400);
  expect(await refusal(response)).toMatchObject({
    code: 'bad_input',
    title: 'The body must be one JSON object.',
  });
});

test('a body that is too large is refused as such', async () => {
  const { admin } = await setup();
  const response = await send(addProcessor, newProcessor(), {
    cookie: admin.cookie,
    rawBody: JSON.stringify({ ...newProcessor(), note: 'x'.repeat(1_100_000) }),
  });
  expect(response.status).toBe(413);
  expect((await refusal(response)).code).toBe('too_large');
});

test('an id that is no id is bad input, not a fault', async () => {
  const { admin } = await setup();
  const response = await send(
    getProcessor,
    { processorId: "1'; drop table shops; --" },
    { cookie: admin.cookie },
  );
  expect(response.status).toBe(400);
});

test('a form on a foreign page cannot use the cookie', async () => {
  const { world, admin } = await setup();
  const response = await send(addProcessor, newProcessor(), {
    cookie: admin.cookie,
    headers: { origin: 'https://elsewhere.test' },
  });
  expect(response.status).toBe(403);
  expect(await linksOf(world.shopId)).toHaveLength(1);
});

test('the same key twice at once is one effect and one answer', async () => {
  const { world, admin } = await setup();
  const [input, key] = [newProcessor(), newId()];
  const answers = await Promise.all(
    Array.from({ length: 5 }, () => ask(addProcessor, input, { cookie: admin.cookie, key })),
  );
  expect(new Set(answers.map((answer) => answer.processorId)).size).toBe(1);
  expect(await linksOf(world.shopId)).toHaveLength(2);
  expect(await trailOf(world.shopId)).toHaveLength(1);
  expect(await ask(addProcessor, input, { cookie: admin.cookie, key })).toEqual(answers[0]);
});

test('the same key with another body, or for another operation, is a conflict', async () => {
  const { admin } = await setup();
  const key = newId();
  await ask(addProcessor, newProcessor(), { cookie: admin.cookie, key });
  expect((await send(addProcessor, newProcessor(), { cookie: admin.cookie, key })).status).toBe(409);
  expect(
    (
      await send(
        createToken,
        { name: 'With a used key', scopes: ['processor.read'] },
        { cookie: admin.cookie, key },
      )
    ).status,
  ).toBe(409);
});

test('a key belongs to its person: another’s same key is another request', async () => {
  const [one, two] = [await setup(), await setup()];
  const [input, key] = [newProcessor(), newId()];
  await ask(addProcessor, input, { cookie: one.admin.cookie, key });
  await ask(addProcessor, input, { cookie: two.admin.cookie, key });
  expect(await linksOf(two.world.shopId)).toHaveLength(2);
});

test('a refused request gives its key back', async () => {
  const { world, admin } = await setup();
  const key = newId();
  const { contactEmail } = await ask(
    getProcessor,
    { processorId: world.processorId },
    { cookie: admin.cookie },
  );
  const change = (version: number) =>
    send(
      updateProcessor,
      { processorId: world.processorId, contactName: 'Ida', contactEmail, note: null, active: true, version },
      { cookie: admin.cookie, key },
    );
  expect((await change(7)).status).toBe(409);
  expect((await change(1)).status).toBe(200);
});

test('of two people who edit the same thing one is told, and nothing is lost', async () => {
  const { world, admin } = await setup();
  const other = await makeSignedIn(base.owner, { shopId: world.shopId }, ['admin']);
  const shop = await ask(getShopSettings, {}, { cookie: admin.cookie });
  const { id: _, ...choices } = shop;
  const [first, second] = await Promise.all([
    send(updateShopSettings, { ...choices, name: 'Named by one' }, { cookie: admin.cookie }),
    send(updateShopSettings, { ...choices, name: 'Named by the other' }, { cookie: other.cookie }),
  ]);
  expect([first.status, second.status].sort()).toEqual([200, 409]);
  const loser = first.status === 409 ? first : second;
  expect((await refusal(loser)).title).toContain('was changed meanwhile');
  const after = await ask(getShopSettings, {}, { cookie: admin.cookie });
  expect(after.version).toBe(2);
});

test('a token does what it may, no more, and ends when it is revoked', async () => {
  const { world, admin } = await setup();
  const { id, token } = await ask(
    createToken,
    { name: 'The stock counter', scopes: ['processor.read'] },
    { cookie: admin.cookie },
  );
  expect(token).toMatch(/^lw_/);
  expect((await ask(listProcessors, {}, { bearer: token })).rows).toHaveLength(1);
  expect((await send(addProcessor, newProcessor(), { bearer: token })).status).toBe(403);
  expect(
    (await send(createToken, { name: 'Another', scopes: ['processor.read'] }, { bearer: token })).status,
  ).toBe(403);
  expect(await linksOf(world.shopId)).toHaveLength(1);

  const [kept] = (await ask(listTokens, {}, { cookie: admin.cookie })).tokens;
  expect(kept).toMatchObject({ name: 'The stock counter', hint: token.slice(0, 9) });
  expect(kept?.lastUsedAt).not.toBeNull();
  expect(JSON.stringify(kept)).not.toContain(token);

  await ask(revokeToken, { tokenId: id }, { cookie: admin.cookie });
  expect((await send(listProcessors, {}, { bearer: token })).status).toBe(401);
});

test('the token itself is nowhere in the database, not even among kept answers', async () => {
  const { admin } = await setup();
  const key = newId();
  const { token } = await ask(
    createToken,
    { name: 'Kept nowhere', scopes: ['processor.read'] },
    { cookie: admin.cookie, key },
  );
  const { rows } = await base.owner.execute(
    `select id from idempotency_keys where response::text like '%${token}%'`,
  );
  expect(rows).toEqual([]);
  const again = await send(
    createToken,
    { name: 'Kept nowhere', scopes: ['processor.read'] },
    { cookie: admin.cookie, key },
  );
  expect(again.status).toBe(409);
  expect((await ask(listTokens, {}, { cookie: admin.cookie })).tokens).toHaveLength(1);
});

test('a token may carry no more than its owner may, and loses with them', async () => {
  const { world, admin } = await setup();
  const lead = await makeSignedIn(base.owner, { shopId: world.shopId }, ['lead']);
  const refused = await send(
    createToken,
    { name: 'Too much', scopes: ['people.manage'] },
    { cookie: lead.cookie },
  );
  expect((await refusal(refused)).fields?.[0]?.field).toBe('scopes');

  const { token } = await ask(
    createToken,
    { name: 'Editor', scopes: ['processor.edit'] },
    { cookie: admin.cookie },
  );
  await ask(addProcessor, newProcessor(), { bearer: token });
  await base.owner
    .update(memberships)
    .set({ roles: ['lead'] })
    .where(and(eq(memberships.userId, admin.userId), eq(memberships.shopId, world.shopId)));
  expect((await send(addProcessor, newProcessor(), { bearer: token })).status).toBe(403);
});

test('a token past its last day, of a closed person, or made up opens nothing', async () => {
  const { admin, world } = await setup();
  const { token: old } = await ask(
    createToken,
    { name: 'Old', scopes: ['processor.read'], lastDay: '2026-01-31' },
    { cookie: admin.cookie },
  );
  expect((await send(listProcessors, {}, { bearer: old })).status).toBe(401);
  const { token } = await ask(
    createToken,
    { name: 'Whose owner goes', scopes: ['processor.read'] },
    { cookie: admin.cookie },
  );
  await base.owner
    .update(memberships)
    .set({ active: false })
    .where(and(eq(memberships.userId, admin.userId), eq(memberships.shopId, world.shopId)));
  expect((await send(listProcessors, {}, { bearer: token })).status).toBe(401);
  expect((await send(listProcessors, {}, { bearer: 'lw_made-up-by-somebody-who-guesses' })).status).toBe(401);
});

test('a session ends with the next request when its person is blocked, closed in the shop, or signs out everywhere', async () => {
  for (const end of [
    (userId: string) => base.owner.update(users).set({ active: false }).where(eq(users.id, userId)),
    (userId: string) =>
      base.owner.update(memberships).set({ active: false }).where(eq(memberships.userId, userId)),
  ]) {
    const { admin } = await setup();
    expect((await send(getMe, {}, { cookie: admin.cookie })).status).toBe(200);
    await end(admin.userId);
    expect((await send(getMe, {}, { cookie: admin.cookie })).status).toBe(401);
  }
  const { admin } = await setup();
  await ask(endMySessions, {}, { cookie: admin.cookie });
  expect((await send(getMe, {}, { cookie: admin.cookie })).status).toBe(401);
});

test('a changed role counts with the next request', async () => {
  const { auditor } = await setup();
  expect((await send(addProcessor, newProcessor(), { cookie: auditor.cookie })).status).toBe(403);
  await base.owner
    .update(memberships)
    .set({ roles: ['admin'] })
    .where(eq(memberships.userId, auditor.userId));
  expect((await send(addProcessor, newProcessor(), { cookie: auditor.cookie })).status).toBe(200);
});

test('a cookie for a shop that its person does not work for is nobody’s', async () => {
  const [one, two] = [await setup(), await setup()];
  const cookie = await cookieFor({
    kind: 'person',
    userId: one.admin.userId,
    sessionVersion: 1,
    shopId: two.world.shopId,
  });
  expect((await send(getMe, {}, { cookie })).status).toBe(401);
});

test('answers are kept by no cache', async () => {
  const { admin } = await setup();
  expect((await send(getMe, {}, { cookie: admin.cookie })).headers.get('cache-control')).toBe('no-store');
});
