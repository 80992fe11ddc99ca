import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { mailedLinks, memberships, users } from '@/db/schema/people';
import { hashToken, identifySession } from '@/lib/auth/identify';
import { sendMailJob } from '@/lib/jobs/definitions/send-mail';
import { newId } from '@/lib/ids';
import { changePassword, proveCurrentPassword } from '@/lib/people/change-password';
import { endMySessions } from '@/lib/people/end-my-sessions';
import { getAccount, updateAccount } from '@/lib/people/my-account';
import { requestReset, requestSignInLink } from '@/lib/people/request-mailed-link';
import { resetPassword } from '@/lib/people/reset-password';
import { signInWithPassword } from '@/lib/people/sign-in-with-password';

import { givePassword, PASSWORD } from '../../factories/evidence';
import { lastAudit } from '../../factories/standing';
import { makeWorld, TODAY, type World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { runJobs } from '../run-jobs';
import { atTheDoor, personActor } from './at-the-door';

const base = openDatabase();

async function setup() {
  const world = await makeWorld(base.db, base.owner);
  await givePassword(base.owner, world.userId);
  return { world, email: `person-${world.userId}@shop.test`, actor: personActor(world.userId) };
}

const NEW = 'copper rivet tide table';
const canEnter = async (email: string, password: string) =>
  (await signInWithPassword(base.db, { email, password, address: newId() })) !== null;
const holds = async (world: World) =>
  (await identifySession(base.db, {
    kind: 'person',
    userId: world.userId,
    sessionVersion: 1,
    shopId: world.shopId,
  })) !== null;
const outside = (actor: ReturnType<typeof personActor>) => ({
  inTenant: <T>(work: Parameters<typeof atTheDoor<T>>[1]) => atTheDoor(base.db, work, { actor }),
});

test('another password is chosen, every session ends, and the trail says so', async () => {
  const { world, email, actor } = await setup();
  await proveCurrentPassword(outside(actor), { current: PASSWORD });
  expect(
    await atTheDoor(base.db, (ctx) => changePassword(ctx, { current: PASSWORD, password: NEW }), { actor }),
  ).toEqual({ email });
  expect(await canEnter(email, NEW)).toBe(true);
  expect(await canEnter(email, PASSWORD)).toBe(false);
  expect(await holds(world)).toBe(false);
  expect(await world.as(['admin'], (ctx) => lastAudit(ctx, 'person.change_password'))).toMatchObject({
    entityId: world.userId,
    actorName: 'Test Person',
  });
});

test('who does not know the password may not change it, and runs out of tries', async () => {
  const { actor } = await setup();
  const guess = () => proveCurrentPassword(outside(actor), { current: 'not the password' });
  await expect(guess()).rejects.toMatchObject({
    code: 'bad_input',
    details: { fields: [{ field: 'current' }] },
  });
  for (let at = 0; at < 7; at++) await guess().catch(() => undefined);
  await expect(guess()).rejects.toMatchObject({ code: 'too_many' });
});

test('nobody, a link and a token have no account to change', async () => {
  await expect(
    atTheDoor(base.db, (ctx) => changePassword(ctx, { current: '', password: NEW })),
  ).rejects.toMatchObject({ code: 'not_signed_in' });
  const link = { kind: 'link', linkId: newId(), name: 'Desk', roles: ['processor'] } as const;
  await expect(atTheDoor(base.db, (ctx) => getAccount(ctx), { actor: link })).rejects.toMatchObject({
    code: 'not_allowed',
  });
  const { world } = await setup();
  const token = {
    kind: 'token',
    tokenId: newId(),
    userId: world.userId,
    name: 'Robot',
    roles: ['lead'],
    scopes: ['batch.read'],
  } as const;
  await expect(atTheDoor(base.db, (ctx) => endMySessions(ctx), { actor: token })).rejects.toMatchObject({
    code: 'not_allowed',
  });
});

test.each(['aaaaaaaaaaaaaaaa', 'own-email'])(
  'a password that is the first thing to try (%s) is refused',
  async (given) => {
    const { email, actor } = await setup();
    const password = given === 'own-email' ? email : given;
    await expect(
      atTheDoor(base.db, (ctx) => changePassword(ctx, { current: PASSWORD, password }), { actor }),
    ).rejects.toMatchObject({ code: 'bad_input', details: { fields: [{ field: 'password' }] } });
    expect(await canEnter(email, PASSWORD)).toBe(true);
  },
);

test('signing out everywhere ends every session', async () => {
  const { world, actor } = await setup();
  expect(await holds(world)).toBe(true);
  await atTheDoor(base.db, (ctx) => endMySessions(ctx), { actor });
  expect(await holds(world)).toBe(false);
});

test('name and choices are kept, and told to each shop of the person', async () => {
  const { world, actor } = await setup();
  const other = await makeWorld(base.db, base.owner);
  await base.owner
    .insert(memberships)
    .values({ userId: world.userId, shopId: other.shopId, roles: ['lead'], createdAt: TODAY });
  await atTheDoor(base.db, (ctx) => updateAccount(ctx, { name: 'Renamed Person', units: 'metric' }), {
    actor,
  });
  expect(await atTheDoor(base.db, (ctx) => getAccount(ctx), { actor })).toMatchObject({
    name: 'Renamed Person',
    units: 'metric',
    singleKeys: true,
    hasPassword: true,
  });
  for (const shop of [world, other]) {
    const entry = await shop.as(['admin'], (ctx) => lastAudit(ctx, 'person.update_account'));
    expect(entry).toMatchObject({ before: { name: 'Test Person' }, after: { name: 'Renamed Person' } });
  }
});

/** The mail that waits, sent, and the token in its address. */
async function tokenMailed(): Promise<string> {
  const [ran] = await runJobs(base, sendMailJob);
  if (!ran || ran.error) throw new Error('no mail left', { cause: ran?.error });
  const { url } = ran.data['props'] as { url: string };
  return new URL(url).pathname.split('/').at(-1) ?? '';
}

test('a reset comes by mail, works once, ends every session and every other link', async () => {
  const { world, email } = await setup();
  const otherLink = newId() + newId();
  await base.owner.insert(mailedLinks).values({
    userId: world.userId,
    purpose: 'sign_in',
    tokenHash: hashToken(otherLink),
    expiresAt: new Date(TODAY.getTime() + 60_000),
    createdAt: TODAY,
  });
  expect(await atTheDoor(base.db, (ctx) => requestReset(ctx, { email }))).toEqual({ done: true });
  const token = await tokenMailed();
  expect(await atTheDoor(base.db, (ctx) => resetPassword(ctx, { token, password: NEW }))).toEqual({ email });
  expect(await canEnter(email, NEW)).toBe(true);
  expect(await holds(world)).toBe(false);
  const left = await base.owner.select().from(mailedLinks).where(eq(mailedLinks.userId, world.userId));
  expect(left.every((link) => link.usedAt !== null)).toBe(true);
  await expect(
    atTheDoor(base.db, (ctx) => resetPassword(ctx, { token, password: 'and a third one now' })),
  ).rejects.toMatchObject({ code: 'gone' });
});

test('a reset that is refused does not use the link up', async () => {
  const { email } = await setup();
  await atTheDoor(base.db, (ctx) => requestReset(ctx, { email }));
  const token = await tokenMailed();
  await expect(
    atTheDoor(base.db, (ctx) => resetPassword(ctx, { token, password: email })),
  ).rejects.toMatchObject({ code: 'bad_input' });
  expect(await atTheDoor(base.db, (ctx) => resetPassword(ctx, { token, password: NEW }))).toEqual({ email });
});

test('a reset past its hour is gone', async () => {
  const { email } = await setup();
  await atTheDoor(base.db, (ctx) => requestReset(ctx, { email }));
  const token = await tokenMailed();
  const later = new Date(TODAY.getTime() + 61 * 60_000);
  await expect(
    atTheDoor(base.db, (ctx) => resetPassword(ctx, { token, password: NEW }), { now: later }),
  ).rejects.toMatchObject({ code: 'gone' });
});

test('who is asked for is not told: an unknown address gets the same answer and no mail', async () => {
  expect(
    await atTheDoor(base.db, (ctx) => requestSignInLink(ctx, { email: `ghost-${newId()}@shop.test` })),
  ).toEqual({ done: true });
  const { world, email } = await setup();
  await base.owner.update(users).set({ active: false }).where(eq(users.id, world.userId));
  expect(await atTheDoor(base.db, (ctx) => requestSignInLink(ctx, { email }))).toEqual({ done: true });
  expect(await runJobs(base, sendMailJob)).toEqual([]);
});

test('a sign-in link keeps where its person was going, and only inside the product', async () => {
  const { email } = await setup();
  await atTheDoor(base.db, (ctx) => requestSignInLink(ctx, { email, next: '/batches?stage=held' }));
  await atTheDoor(base.db, (ctx) => requestSignInLink(ctx, { email, next: 'https://elsewhere.test/' }));
  const urls = (await runJobs(base, sendMailJob)).map(
    ({ data }) => new URL((data['props'] as { url: string }).url),
  );
  expect(urls.map((url) => url.searchParams.get('next'))).toEqual(['/batches?stage=held', null]);
});

test('five mails an hour are enough for one account', async () => {
  const { email } = await setup();
  for (let at = 0; at < 5; at++) await atTheDoor(base.db, (ctx) => requestSignInLink(ctx, { email }));
  await expect(atTheDoor(base.db, (ctx) => requestSignInLink(ctx, { email }))).rejects.toMatchObject({
    code: 'too_many',
    message: expect.stringContaining('Wait'),
  });
  expect(await runJobs(base, sendMailJob)).toHaveLength(5);
});
