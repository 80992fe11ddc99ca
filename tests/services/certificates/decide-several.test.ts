import { expect, test } from 'vitest';

import { DecideRequirements } from '@/lib/certificates/prove-contract';
import { decideRequirements } from '@/lib/certificates/decide-requirements';
import { getCertificate } from '@/lib/certificates/get-certificate';
import { newId } from '@/lib/ids';

import { makeDispatchedBatch } from '../../factories/batches';
import { makeCertificate } from '../../factories/evidence';
import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const READING = { stated: 'as ordered', verdict: 'meets', overrideReason: null, note: '' } as const;
const TO_PROVE = { limit: '63 to 83', unit: 'HRB', source: 'specification', sourceText: 'AMS 2658' } as const;

/** A certificate of a batch that must prove two things. */
async function setup(world: World) {
  const batch = await world.as(['lead'], (ctx) =>
    makeDispatchedBatch(ctx, world.processorId, {
      requirements: [
        { characteristic: 'Hardness', ...TO_PROVE },
        { characteristic: 'Conductivity', ...TO_PROVE },
      ],
    }),
  );
  const certificateId = await world.as(['inspector'], (ctx) => makeCertificate(ctx, batch.id));
  return { certificateId, ids: (await decisionsOf(world, certificateId)).map((one) => one.id) };
}
const decisionsOf = (world: World, certificateId: string) =>
  world.as(['auditor'], async (ctx) => (await getCertificate(ctx, { certificateId })).requirements);
const first = (ids: readonly string[]) => ids.map((requirementId) => ({ requirementId, version: null }));

test('each requirement gets its decision, and each is audited', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { certificateId, ids } = await setup(world);
  expect(ids).toHaveLength(2);
  const done = await world.as(['inspector'], (ctx) =>
    decideRequirements(ctx, { certificateId, requirements: first(ids), ...READING }),
  );
  expect(done).toEqual({ decided: 2 });
  expect((await decisionsOf(world, certificateId)).map((one) => one.decision?.verdict)).toEqual([
    'meets',
    'meets',
  ]);
  await world.as(['lead'], async (ctx) =>
    expect(await lastAudit(ctx, 'certificate.decide')).toMatchObject({
      entityId: certificateId,
      after: { verdict: 'meets', stated: 'as ordered' },
    }),
  );
});

test('where one was decided meanwhile, or is of another batch, none is written', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { certificateId, ids } = await setup(world);
  const decide = (requirements: ReturnType<typeof first>) =>
    world.as(['inspector'], (ctx) => decideRequirements(ctx, { certificateId, requirements, ...READING }));
  await decide(first(ids.slice(1)));
  await expect(decide(first(ids))).rejects.toMatchObject({ code: 'conflict' });
  await expect(decide([...first(ids.slice(0, 1)), ...first([newId()])])).rejects.toMatchObject({
    code: 'not_found',
  });
  expect((await decisionsOf(world, certificateId)).map((one) => one.decision?.verdict)).toEqual([
    undefined,
    'meets',
  ]);
});

test('a lead may not decide, another shop finds no certificate, and nothing to decide is no input', async () => {
  const [world, stranger] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const { certificateId, ids } = await setup(world);
  const input = { certificateId, requirements: first(ids), ...READING };
  await expect(world.as(['lead'], (ctx) => decideRequirements(ctx, input))).rejects.toMatchObject({
    code: 'not_allowed',
  });
  await expect(stranger.as(['inspector'], (ctx) => decideRequirements(ctx, input))).rejects.toMatchObject({
    code: 'not_found',
  });
  expect(DecideRequirements.safeParse({ ...input, requirements: [] }).success).toBe(false);
});
