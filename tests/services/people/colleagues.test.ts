import { and, eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { memberships } from '@/db/schema/people';
import { sendMailJob } from '@/lib/jobs/definitions/send-mail';
import { newId } from '@/lib/ids';
import { acceptInvitation } from '@/lib/people/accept-invitation';
import { inviteColleague, listColleagues, setColleagueActive } from '@/lib/people/colleagues';

import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { runJobs } from '../run-jobs';
import { atTheDoor } from './at-the-door';

const base = openDatabase();

async function join(world: World) {
  const email = `hand-${newId()}@processor.test`;
  await world.asProcessor((ctx) => inviteColleague(ctx, { email, name: 'Bo Hand' }));
  const ran = await runJobs(base, sendMailJob);
  const token = (ran.at(-1)?.data['props'] as { url: string }).url.split('/').at(-1) ?? '';
  await atTheDoor(base.db, (ctx) =>
    acceptInvitation(ctx, { token, name: 'Bo Hand', password: 'copper rivet tide table' }),
  );
  const { people } = await world.asProcessor((ctx) => listColleagues(ctx));
  return people.find((person) => person.email === email) ?? { personId: '', active: false };
}

test('a person of the processor lets a colleague in, and closes the way again', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { personId, active } = await join(world);
  expect(active).toBe(true);
  await world.asProcessor((ctx) => setColleagueActive(ctx, { personId, active: false }));
  const { people } = await world.asProcessor((ctx) => listColleagues(ctx));
  expect(people.find((person) => person.personId === personId)).toMatchObject({ active: false });
});

test('the link of one batch lets nobody in and sees nobody', async () => {
  const world = await makeWorld(base.db, base.owner);
  const batchId = newId();
  await expect(
    world.asProcessor((ctx) => inviteColleague(ctx, { email: 'x@y.test', name: 'X' }), batchId),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  await expect(world.asProcessor((ctx) => listColleagues(ctx), batchId)).rejects.toMatchObject({
    code: 'not_allowed',
  });
});

test('the shop has no way there, and one processor none to another', async () => {
  const [one, two] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  await expect(
    one.as(['admin'], (ctx) => inviteColleague(ctx, { email: 'x@y.test', name: 'X' })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  const { personId } = await join(one);
  await expect(
    two.asProcessor((ctx) => setColleagueActive(ctx, { personId, active: false })),
  ).rejects.toMatchObject({ code: 'not_found' });
  expect(
    await base.owner
      .select()
      .from(memberships)
      .where(and(eq(memberships.userId, personId), eq(memberships.processorId, one.processorId))),
  ).toMatchObject([{ active: true }]);
});

test('nobody closes their own way in, and nobody is asked twice', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { people } = await world.asProcessor((ctx) => listColleagues(ctx));
  const me = people.find((person) => person.isMe);
  await expect(
    world.asProcessor((ctx) => setColleagueActive(ctx, { personId: me?.personId ?? '', active: false })),
  ).rejects.toMatchObject({ code: 'conflict' });
  await expect(
    world.asProcessor((ctx) => inviteColleague(ctx, { email: me?.email ?? '', name: 'Me' })),
  ).rejects.toMatchObject({ code: 'conflict' });
});
