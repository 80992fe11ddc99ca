import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';
import type { z } from 'zod';

import { approvals, processors, shopProcessors } from '@/db/schema/organisations';
import { invitations, memberships } from '@/db/schema/people';
import { sendMailJob } from '@/lib/jobs/definitions/send-mail';
import { newId } from '@/lib/ids';
import { acceptInvitation } from '@/lib/people/accept-invitation';
import { addProcessor } from '@/lib/processors/add-processor';
import { addApproval, withdrawApproval } from '@/lib/processors/approvals';
import type { addProcessor as declaration } from '@/lib/processors/contract';
import { inviteProcessor } from '@/lib/processors/invite-processor';
import { getProcessor, listProcessors } from '@/lib/processors/queries';
import { updateProcessor } from '@/lib/processors/update-processor';

import { makeDispatchedBatch } from '../../factories/batches';
import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { atTheDoor } from '../people/at-the-door';
import { runJobs } from '../run-jobs';

const base = openDatabase();

const given = (): z.output<(typeof declaration)['input']> => ({
  name: 'Cinder Vale Plating',
  email: `desk-${newId()}@cinder.test`,
  phone: '555 0177',
  contactName: 'Ona Reyes',
  contactEmail: null,
  note: null,
});
const add = (world: World, input = given()) => world.as(['admin'], (ctx) => addProcessor(ctx, input));
const year = {
  reference: 'Q-200',
  processes: ['anodize' as const],
  specifications: ['MIL-A-8625'],
  validFrom: '2026-01-01',
  validTo: '2026-12-31',
};

test('a processor is added with its contact, and the trail says so', async () => {
  const world = await makeWorld(base.db, base.owner);
  const input = given();
  const { processorId } = await add(world, input);
  expect(await world.as(['auditor'], (ctx) => getProcessor(ctx, { processorId }))).toMatchObject({
    name: input.name,
    email: input.email,
    phone: '555 0177',
    contactName: 'Ona Reyes',
    contactEmail: input.email,
    active: true,
    approvals: [],
  });
  expect(await world.as(['admin'], (ctx) => lastAudit(ctx, 'processor.add'))).toMatchObject({
    entityId: processorId,
  });
});

test('one that another shop knows is linked, keeps its own name, and tells nothing of the other shop', async () => {
  const [one, two] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const input = { ...given(), note: 'pays late' };
  const { processorId } = await add(one, input);
  const linked = await add(two, {
    ...input,
    name: 'Another name',
    phone: '555 9999',
    contactName: 'Somebody Else',
    note: null,
  });
  expect(linked.processorId).toBe(processorId);
  expect(await base.owner.select().from(processors).where(eq(processors.email, input.email))).toHaveLength(1);
  const seen = await two.as(['admin'], (ctx) => getProcessor(ctx, { processorId }));
  expect(seen).toMatchObject({
    name: 'Cinder Vale Plating',
    phone: '555 0177',
    contactName: 'Somebody Else',
    note: null,
  });
  expect(JSON.stringify(seen)).not.toContain('pays late');
});

test('two shops that add the same processor at the same moment share it', async () => {
  const worlds = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const input = given();
  const added = await Promise.all(worlds.map((world) => add(world, input)));
  expect(new Set(added.map(({ processorId }) => processorId)).size).toBe(1);
});

test('nobody adds a processor twice, and only who may adds one', async () => {
  const world = await makeWorld(base.db, base.owner);
  const input = given();
  await add(world, input);
  await expect(add(world, input)).rejects.toMatchObject({
    code: 'conflict',
    details: { fields: [{ field: 'email' }] },
  });
  await expect(
    world.as(['lead', 'office', 'auditor'], (ctx) => addProcessor(ctx, given())),
  ).rejects.toMatchObject({ code: 'not_allowed' });
});

test('a processor of another shop is not there: not to see, change, approve or invite', async () => {
  const [one, two] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const { processorId } = one;
  for (const attempt of [
    () => two.as(['admin'], (ctx) => getProcessor(ctx, { processorId })),
    () =>
      two.as(['admin'], (ctx) =>
        updateProcessor(ctx, {
          processorId,
          contactName: null,
          contactEmail: 'x@y.test',
          note: null,
          active: false,
          version: 1,
        }),
      ),
    () => two.as(['admin'], (ctx) => addApproval(ctx, { processorId, ...year })),
    () => two.as(['admin'], (ctx) => inviteProcessor(ctx, { processorId })),
  ])
    await expect(attempt()).rejects.toMatchObject({ code: 'not_found' });
  expect(
    await base.owner.select().from(shopProcessors).where(eq(shopProcessors.processorId, processorId)),
  ).toMatchObject([{ active: true, version: 1 }]);
});

test('the contact is changed under its version', async () => {
  const world = await makeWorld(base.db, base.owner);
  const change = (version: number) =>
    world.as(['inspector'], (ctx) =>
      updateProcessor(ctx, {
        processorId: world.processorId,
        contactName: 'Ona',
        contactEmail: 'ona@cinder.test',
        note: 'rings back',
        active: true,
        version,
      }),
    );
  expect(await change(1)).toEqual({ version: 2 });
  await expect(change(1)).rejects.toMatchObject({ code: 'conflict' });
});

test('an approval stands with its state on the shop’s day, and ends when it is withdrawn', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { processorId } = world;
  const put = (dates: Partial<typeof year>) =>
    world.as(['inspector'], (ctx) => addApproval(ctx, { processorId, ...year, ...dates }));
  const { approvalId } = await put({});
  await put({ reference: 'Q-old', validFrom: '2025-01-01', validTo: '2026-06-16' });
  await put({ reference: 'Q-last-day', validTo: '2026-06-17' });
  await put({ reference: 'Q-new', validFrom: '2026-06-18' });
  const states = async () =>
    Object.fromEntries(
      (await world.as(['lead'], (ctx) => getProcessor(ctx, { processorId }))).approvals.map((approval) => [
        approval.reference,
        approval.state,
      ]),
    );
  expect(await states()).toEqual({
    'Q-200': 'holds',
    'Q-old': 'ended',
    'Q-last-day': 'holds',
    'Q-new': 'begins_later',
  });

  await world.as(['inspector'], (ctx) =>
    withdrawApproval(ctx, { processorId, approvalId, reason: 'the bath was found out of range' }),
  );
  expect(await states()).toMatchObject({ 'Q-200': 'withdrawn' });
  await expect(
    world.as(['inspector'], (ctx) => withdrawApproval(ctx, { processorId, approvalId, reason: 'twice' })),
  ).rejects.toMatchObject({ code: 'not_found' });
  expect(await world.as(['admin'], (ctx) => lastAudit(ctx, 'processor.withdraw_approval'))).toMatchObject({
    after: { reason: 'the bath was found out of range' },
  });
  expect(await base.owner.select().from(approvals).where(eq(approvals.id, approvalId))).toHaveLength(1);
});

test('the list tells what holds today and what is out, by name, page by page', async () => {
  const world = await makeWorld(base.db, base.owner);
  for (const name of ['Beta Works', 'alpha Works', 'Beta Works']) await add(world, { ...given(), name });
  await world.as(['lead', 'admin'], (ctx) => makeDispatchedBatch(ctx, world.processorId, { pieces: [7] }));
  const names: string[] = [];
  let after: string | undefined;
  do {
    const page = await world.as(['lead'], (ctx) =>
      listProcessors(ctx, { limit: 2, after, active: undefined }),
    );
    names.push(...page.rows.map((row) => row.name));
    after = page.next ?? undefined;
  } while (after !== undefined);
  expect(names.slice(0, 3)).toEqual(['alpha Works', 'Beta Works', 'Beta Works']);
  expect(names).toHaveLength(4);
  const { rows } = await world.as(['lead'], (ctx) =>
    listProcessors(ctx, { limit: 50, after: undefined, active: 'true' }),
  );
  expect(rows.find((row) => row.processorId === world.processorId)).toMatchObject({
    openBatches: 1,
    piecesOut: 7,
    approvalEndsOn: '2027-06-17',
  });
  await expect(
    world.as(['lead'], (ctx) => listProcessors(ctx, { limit: 2, after: 'nowhere', active: undefined })),
  ).rejects.toMatchObject({ code: 'bad_input' });
});

test('an invitation to a processor’s own account goes to its own e-mail, whoever asks', async () => {
  const world = await makeWorld(base.db, base.owner);
  const input = { ...given(), contactEmail: 'a-friend@shop.test' };
  const { processorId } = await add(world, input);
  expect(await world.as(['admin'], (ctx) => inviteProcessor(ctx, { processorId }))).toEqual({
    email: input.email,
  });
  const [ran] = await runJobs(base, sendMailJob);
  expect(ran?.data['to']).toEqual([input.email]);
  const token = (ran?.data['props'] as { url: string }).url.split('/').at(-1) ?? '';
  await atTheDoor(base.db, (ctx) =>
    acceptInvitation(ctx, { token, name: 'Ona Reyes', password: 'copper rivet tide table' }),
  );
  expect(
    await base.owner.select().from(memberships).where(eq(memberships.processorId, processorId)),
  ).toMatchObject([{ roles: ['processor'], active: true }]);
  await expect(world.as(['admin'], (ctx) => inviteProcessor(ctx, { processorId }))).rejects.toMatchObject({
    code: 'conflict',
  });
});

test('a second invitation ends the first', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { processorId } = await add(world);
  for (let at = 0; at < 2; at++) await world.as(['admin'], (ctx) => inviteProcessor(ctx, { processorId }));
  const sent = await base.owner
    .select()
    .from(invitations)
    .where(eq(invitations.processorId, processorId))
    .orderBy(invitations.id);
  expect(sent.map((invitation) => invitation.withdrawnAt === null)).toEqual([false, true]);
});
