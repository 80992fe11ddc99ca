import { and, eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { invitations, memberships, users } from '@/db/schema/people';
import { sendMailJob } from '@/lib/jobs/definitions/send-mail';
import { newId } from '@/lib/ids';
import { acceptInvitation, readInvitation } from '@/lib/people/accept-invitation';
import { changeRoles, setPersonActive } from '@/lib/people/change-member';
import { invitePerson, renewInvitation, withdrawInvitation } from '@/lib/people/invite-person';
import { signInWithPassword } from '@/lib/people/sign-in-with-password';
import { listPeople } from '@/lib/people/team';

import { makeColleague } from '../../factories/invoices';
import { lastAudit } from '../../factories/standing';
import { makeWorld, TODAY, type World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { runJobs } from '../run-jobs';
import { atTheDoor } from './at-the-door';

const base = openDatabase();
const PASSWORD = 'copper rivet tide table';

const invited = () => ({ email: `new-${newId()}@shop.test`, name: 'Ida Fjord', roles: ['lead' as const] });

async function mailedToken(): Promise<string> {
  const ran = await runJobs(base, sendMailJob);
  const { url } = ran.at(-1)?.data['props'] as { url: string };
  return url.split('/').at(-1) ?? '';
}

async function invite(world: World, given = invited()) {
  const { invitationId } = await world.as(['admin'], (ctx) => invitePerson(ctx, given));
  return { ...given, invitationId, token: await mailedToken() };
}

const accept = (
  token: string,
  given: { name?: string; password?: string } = { name: 'Ida Fjord', password: PASSWORD },
  now = TODAY,
) => atTheDoor(base.db, (ctx) => acceptInvitation(ctx, { token, ...given }), { now });
const rolesOf = async (world: World, userId: string) =>
  (
    await base.owner
      .select()
      .from(memberships)
      .where(and(eq(memberships.userId, userId), eq(memberships.shopId, world.shopId)))
  )[0];

test('an invitation comes by mail, is looked at without harm, and makes an account with its roles', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { email, token } = await invite(world);
  for (let look = 0; look < 2; look++)
    expect(await atTheDoor(base.db, (ctx) => readInvitation(ctx, { token }))).toMatchObject({
      state: 'open',
      email,
      name: 'Ida Fjord',
      roles: ['lead'],
      hasAccount: false,
    });
  expect(await accept(token)).toEqual({ email, hadAccount: false });
  expect(await signInWithPassword(base.db, { email, password: PASSWORD, address: newId() })).toMatchObject({
    shopId: world.shopId,
  });
  expect(await world.as(['admin'], (ctx) => lastAudit(ctx, 'invitation.send'))).toMatchObject({
    actorName: 'Test Person',
    after: { email, roles: ['lead'] },
  });
  expect(await world.as(['admin'], (ctx) => lastAudit(ctx, 'invitation.accept'))).toMatchObject({
    actorName: 'Ida Fjord',
  });
});

test('an invitation is accepted once, also when it is pressed twice at the same moment', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { token } = await invite(world);
  const both = await Promise.allSettled([accept(token), accept(token)]);
  expect(both.filter((outcome) => outcome.status === 'fulfilled')).toHaveLength(1);
  await expect(accept(token)).rejects.toMatchObject({ code: 'gone' });
  expect(await atTheDoor(base.db, (ctx) => readInvitation(ctx, { token }))).toMatchObject({
    state: 'accepted',
  });
});

test('an invitation that is withdrawn, renewed, past its time or made up opens nothing', async () => {
  const world = await makeWorld(base.db, base.owner);
  const withdrawn = await invite(world);
  await world.as(['admin'], (ctx) => withdrawInvitation(ctx, withdrawn));
  await expect(accept(withdrawn.token)).rejects.toMatchObject({ code: 'gone' });

  const renewed = await invite(world);
  await world.as(['admin'], (ctx) => renewInvitation(ctx, renewed));
  await expect(accept(renewed.token)).rejects.toMatchObject({ code: 'gone' });
  expect(await accept(await mailedToken())).toMatchObject({ hadAccount: false });

  const late = await invite(world);
  await expect(
    accept(late.token, undefined, new Date(TODAY.getTime() + 15 * 86_400_000)),
  ).rejects.toMatchObject({ code: 'gone' });
  await expect(accept('made-up-by-somebody-who-guesses')).rejects.toMatchObject({ code: 'gone' });
  expect(
    await atTheDoor(base.db, (ctx) => readInvitation(ctx, { token: 'made-up-by-somebody' })),
  ).toMatchObject({ state: 'unknown', email: null });
});

test('an account that exists gains the shop and keeps its name and password', async () => {
  const [one, two] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const email = `person-${one.userId}@shop.test`;
  const { token } = await invite(two, { email, name: 'Called otherwise', roles: ['lead'] });
  expect(await atTheDoor(base.db, (ctx) => readInvitation(ctx, { token }))).toMatchObject({
    hasAccount: true,
  });
  expect(await accept(token, { name: 'Overwritten', password: PASSWORD })).toEqual({
    email,
    hadAccount: true,
  });
  const [user] = await base.owner.select().from(users).where(eq(users.id, one.userId));
  expect(user).toMatchObject({ name: 'Test Person', passwordHash: null });
  expect(await rolesOf(two, one.userId)).toMatchObject({ roles: ['lead'], active: true });
});

test('without a password no account is made, and the invitation stays', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { token } = await invite(world);
  await expect(accept(token, { name: 'Ida' })).rejects.toMatchObject({
    code: 'bad_input',
    details: { fields: [{ field: 'password' }] },
  });
  expect(await accept(token)).toMatchObject({ hadAccount: false });
});

test('nobody is invited twice, and nobody who is in', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { email } = await invite(world);
  await expect(
    world.as(['admin'], (ctx) => invitePerson(ctx, { email, name: 'Again', roles: ['lead'] })),
  ).rejects.toMatchObject({ code: 'conflict', details: { fields: [{ field: 'email' }] } });
  await expect(
    world.as(['admin'], (ctx) =>
      invitePerson(ctx, { email: `person-${world.userId}@shop.test`, name: 'In', roles: ['lead'] }),
    ),
  ).rejects.toMatchObject({ code: 'conflict' });
});

test('only an admin manages people', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { invitationId } = await invite(world);
  for (const work of [
    () => world.as(['lead', 'inspector', 'office', 'auditor'], (ctx) => invitePerson(ctx, invited())),
    () => world.as(['lead'], (ctx) => withdrawInvitation(ctx, { invitationId })),
    () => world.as(['auditor'], (ctx) => listPeople(ctx)),
    () =>
      world.as(['office'], (ctx) =>
        changeRoles(ctx, { personId: world.userId, roles: ['admin'], version: 1 }),
      ),
  ])
    await expect(work()).rejects.toMatchObject({ code: 'not_allowed' });
});

test('another shop’s people and invitations are not there', async () => {
  const [one, two] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const { invitationId } = await invite(one);
  await expect(two.as(['admin'], (ctx) => withdrawInvitation(ctx, { invitationId }))).rejects.toMatchObject({
    code: 'not_found',
  });
  await expect(two.as(['admin'], (ctx) => renewInvitation(ctx, { invitationId }))).rejects.toMatchObject({
    code: 'not_found',
  });
  await expect(
    two.as(['admin'], (ctx) => changeRoles(ctx, { personId: one.userId, roles: ['auditor'], version: 1 })),
  ).rejects.toMatchObject({ code: 'not_found' });
  const { people, invitations: pending } = await two.as(['admin'], (ctx) => listPeople(ctx));
  expect(people.map((person) => person.personId)).toEqual([two.userId]);
  expect(pending).toEqual([]);
  expect(await base.owner.select().from(invitations).where(eq(invitations.id, invitationId))).toMatchObject([
    { withdrawnAt: null },
  ]);
});

test('roles are changed under their version, and the trail tells before and after', async () => {
  const world = await makeWorld(base.db, base.owner);
  const colleague = await makeColleague(world, base.owner);
  expect(
    await world.as(['admin'], (ctx) =>
      changeRoles(ctx, { personId: colleague.userId, roles: ['auditor'], version: 1 }),
    ),
  ).toEqual({ version: 2 });
  await expect(
    world.as(['admin'], (ctx) =>
      changeRoles(ctx, { personId: colleague.userId, roles: ['lead'], version: 1 }),
    ),
  ).rejects.toMatchObject({ code: 'conflict' });
  expect(await world.as(['admin'], (ctx) => lastAudit(ctx, 'person.change_roles'))).toMatchObject({
    entityId: colleague.userId,
    before: { roles: ['lead', 'inspector', 'office', 'admin'] },
    after: { roles: ['auditor'] },
  });
});

test('the last admin stays one, and stays in', async () => {
  const world = await makeWorld(base.db, base.owner);
  await expect(
    world.as(['admin'], (ctx) => changeRoles(ctx, { personId: world.userId, roles: ['lead'], version: 1 })),
  ).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('last admin') });
  await expect(
    world.as(['admin'], (ctx) => setPersonActive(ctx, { personId: world.userId, active: false, version: 1 })),
  ).rejects.toMatchObject({ code: 'conflict' });
});

test('two admins who take the role from each other at the same moment leave one', async () => {
  const world = await makeWorld(base.db, base.owner);
  const colleague = await makeColleague(world, base.owner);
  const both = await Promise.allSettled([
    world.as(['admin'], (ctx) =>
      changeRoles(ctx, { personId: colleague.userId, roles: ['lead'], version: 1 }),
    ),
    world.as(['admin'], (ctx) => changeRoles(ctx, { personId: world.userId, roles: ['lead'], version: 1 })),
  ]);
  expect(both.filter((outcome) => outcome.status === 'fulfilled')).toHaveLength(1);
  const { people } = await world.as(['admin'], (ctx) => listPeople(ctx));
  expect(people.filter((person) => person.roles.includes('admin'))).toHaveLength(1);
});

test('an admin whose account is blocked everywhere does not count as one', async () => {
  const world = await makeWorld(base.db, base.owner);
  const colleague = await makeColleague(world, base.owner);
  await base.owner.update(users).set({ active: false }).where(eq(users.id, colleague.userId));
  await expect(
    world.as(['admin'], (ctx) => changeRoles(ctx, { personId: world.userId, roles: ['lead'], version: 1 })),
  ).rejects.toMatchObject({ code: 'conflict' });
});

test('a closed person comes back by an invitation, with its roles', async () => {
  const world = await makeWorld(base.db, base.owner);
  const colleague = await makeColleague(world, base.owner);
  await world.as(['admin'], (ctx) =>
    setPersonActive(ctx, { personId: colleague.userId, active: false, version: 1 }),
  );
  expect(await rolesOf(world, colleague.userId)).toMatchObject({ active: false });
  await world.as(['admin'], (ctx) =>
    setPersonActive(ctx, { personId: colleague.userId, active: true, version: 2 }),
  );
  expect(await rolesOf(world, colleague.userId)).toMatchObject({ active: true });
});
