import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { throttles, mailedLinks, memberships, users } from '@/db/schema/people';
import { hashToken, identifySession } from '@/lib/auth/identify';
import { newId } from '@/lib/ids';
import { chooseOrganisation, countOrganisations } from '@/lib/people/choose-organisation';
import { readMailedLink } from '@/lib/people/read-mailed-link';
import { signInWithMailedLink } from '@/lib/people/sign-in-with-mailed-link';
import { signInWithPassword } from '@/lib/people/sign-in-with-password';

import { givePassword, PASSWORD } from '../../factories/evidence';
import { makeWorld, TODAY } from '../../factories/world';
import { openDatabase } from '../open-database';
import { atTheDoor } from './at-the-door';

const base = openDatabase();

async function setup() {
  const world = await makeWorld(base.db, base.owner);
  await givePassword(base.owner, world.userId);
  const email = `person-${world.userId}@shop.test`;
  // An address of one's own, so that tests do not share a count.
  const address = `198.51.100.${newId()}`;
  return {
    world,
    email,
    address,
    signIn: (password: string, from = address) =>
      signInWithPassword(base.db, { email, password, address: from }),
  };
}

test('the right e-mail and password open the shop, whatever case the e-mail is typed in', async () => {
  const { world, email, address } = await setup();
  const claims = await signInWithPassword(base.db, {
    email: ` ${email.toUpperCase()} `,
    password: PASSWORD,
    address,
  });
  expect(claims).toEqual({ kind: 'person', userId: world.userId, sessionVersion: 1, shopId: world.shopId });
  expect(claims && (await identifySession(base.db, claims))).toMatchObject({
    actor: { kind: 'person', userId: world.userId },
    tenant: { kind: 'shop', shopId: world.shopId },
  });
});

test('a wrong password, an unknown account, a blocked person and one without a password get the same nothing', async () => {
  const { world, email, address, signIn } = await setup();
  expect(await signIn('another-word-entirely')).toBeNull();
  expect(
    await signInWithPassword(base.db, { email: 'nobody@shop.test', password: PASSWORD, address }),
  ).toBeNull();
  await base.owner.update(users).set({ active: false }).where(eq(users.id, world.userId));
  expect(await signIn(PASSWORD)).toBeNull();
  await base.owner.update(users).set({ active: true, passwordHash: null }).where(eq(users.id, world.userId));
  expect(await signInWithPassword(base.db, { email, password: '', address })).toBeNull();
});

test('after eight wrong tries the account waits, for the right password too, and is told how long', async () => {
  const { signIn } = await setup();
  for (let at = 0; at < 8; at++) expect(await signIn('wrong-password-here')).toBeNull();
  await expect(signIn(PASSWORD)).rejects.toMatchObject({
    code: 'too_many',
    message: expect.stringMatching(/^That was too many tries to sign in\. Wait 1[45] min, then try again\.$/),
    details: { extra: { waitS: expect.any(Number) } },
  });
  // From another address as well: it is the account that is guessed at.
  await expect(signIn(PASSWORD, `203.0.113.${newId()}`)).rejects.toMatchObject({ code: 'too_many' });
});

test('an account that does not exist waits just the same', async () => {
  const attempt = { email: `ghost-${newId()}@shop.test`, password: 'wrong-password-here', address: newId() };
  for (let at = 0; at < 8; at++) expect(await signInWithPassword(base.db, attempt)).toBeNull();
  await expect(signInWithPassword(base.db, attempt)).rejects.toMatchObject({
    code: 'too_many',
    message: expect.stringContaining('too many tries'),
  });
});

test('twenty tries at the same moment do not get through together', async () => {
  const { signIn } = await setup();
  const outcomes = await Promise.allSettled(Array.from({ length: 20 }, () => signIn('wrong-password-here')));
  expect(outcomes.filter((outcome) => outcome.status === 'fulfilled')).toHaveLength(8);
});

test('the right password gives the tries back', async () => {
  const { signIn } = await setup();
  for (let round = 0; round < 3; round++) {
    for (let at = 0; at < 7; at++) await signIn('wrong-password-here');
    expect(await signIn(PASSWORD)).not.toBeNull();
  }
});

test('one address that tries one password on everybody waits as a whole', async () => {
  const address = newId();
  const guess = () =>
    signInWithPassword(base.db, { email: `${newId()}@shop.test`, password: 'spring-2026', address });
  for (let at = 0; at < 80; at++) await guess();
  await expect(guess()).rejects.toMatchObject({ code: 'too_many' });
});

test('the counts do not list who has an account', async () => {
  const { email, signIn } = await setup();
  await signIn('wrong-password-here');
  const rows = await base.owner.select().from(throttles);
  expect(rows.length).toBeGreaterThan(0);
  expect(JSON.stringify(rows)).not.toContain(email);
});

async function makeLink(userId: string, given: Partial<typeof mailedLinks.$inferInsert> = {}) {
  const token = newId() + newId();
  await base.owner.insert(mailedLinks).values({
    userId,
    purpose: 'sign_in',
    tokenHash: hashToken(token),
    expiresAt: new Date(TODAY.getTime() + 60_000),
    createdAt: TODAY,
    ...given,
  });
  return token;
}

test('a mailed link signs in once, however often it was looked at before', async () => {
  const { world } = await setup();
  const token = await makeLink(world.userId);
  for (let look = 0; look < 3; look++)
    expect(await atTheDoor(base.db, (ctx) => readMailedLink(ctx, { token }))).toMatchObject({
      state: 'open',
      purpose: 'sign_in',
    });
  expect(await signInWithMailedLink(base.db, { token, now: TODAY })).toMatchObject({ userId: world.userId });
  expect(await signInWithMailedLink(base.db, { token, now: TODAY })).toBeNull();
  expect(await atTheDoor(base.db, (ctx) => readMailedLink(ctx, { token }))).toMatchObject({ state: 'used' });
});

test('of two presses at the same moment one wins', async () => {
  const { world } = await setup();
  const token = await makeLink(world.userId);
  const both = await Promise.all([
    signInWithMailedLink(base.db, { token, now: TODAY }),
    signInWithMailedLink(base.db, { token, now: TODAY }),
  ]);
  expect(both.filter((claims) => claims !== null)).toHaveLength(1);
});

test('a link past its time, made up, or for another purpose does not sign in', async () => {
  const { world } = await setup();
  expect(
    await signInWithMailedLink(base.db, {
      token: await makeLink(world.userId, { expiresAt: TODAY }),
      now: TODAY,
    }),
  ).toBeNull();
  expect(
    await signInWithMailedLink(base.db, {
      token: await makeLink(world.userId, { purpose: 'reset' }),
      now: TODAY,
    }),
  ).toBeNull();
  expect(await signInWithMailedLink(base.db, { token: 'made-up-by-somebody', now: TODAY })).toBeNull();
  expect(await atTheDoor(base.db, (ctx) => readMailedLink(ctx, { token: 'made-up-by-somebody' }))).toEqual({
    state: 'unknown',
    purpose: null,
    name: null,
    email: null,
  });
});

test('somebody who works for two organisations goes from one to the other, and to no third', async () => {
  const [{ world, signIn }, { world: other }, { world: third }] = [
    await setup(),
    await setup(),
    await setup(),
  ];
  const membershipId = newId();
  await base.owner.insert(memberships).values({
    id: membershipId,
    userId: world.userId,
    shopId: other.shopId,
    roles: ['auditor'],
    createdAt: TODAY,
  });
  expect(await countOrganisations(base.db, world.userId)).toBe(2);
  const now = await signIn(PASSWORD);
  expect(await chooseOrganisation(base.db, { now, membershipId })).toMatchObject({
    userId: world.userId,
    shopId: other.shopId,
  });

  const [foreign] = await base.owner
    .select({ id: memberships.id })
    .from(memberships)
    .where(eq(memberships.userId, third.userId));
  expect(await chooseOrganisation(base.db, { now, membershipId: foreign?.id ?? '' })).toBeNull();
  expect(await chooseOrganisation(base.db, { now, membershipId: 'no-id' })).toBeNull();
  expect(await chooseOrganisation(base.db, { now: null, membershipId })).toBeNull();
});
