import { createHash } from 'node:crypto';
import { Readable } from 'node:stream';

import { expect, test } from 'vitest';

import type { DossierContent } from '@/lib/dossiers/content';
import { shareDossier, withdrawDossierLink } from '@/lib/dossiers/dossier-links';
import { makeArchive } from '@/lib/dossiers/make-archive';
import { openDossierLink } from '@/lib/dossiers/queries';
import { readDossier } from '@/lib/dossiers/read-dossier';
import { renderDossier } from '@/lib/dossiers/render-dossier';
import { withTenant } from '@/db/client';
import { NOBODY } from '@/lib/auth/identify';
import type { Ctx } from '@/lib/auth/context';

import { makeDispatchedBatch } from '../../factories/batches';
import { countInAll, givePassword, makeSignedCertificate } from '../../factories/evidence';
import { makeLot } from '../../factories/lots';
import { makeWorld, TODAY, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const ALL = ['lead', 'inspector', 'office', 'admin'] as const;

async function provedLot(world: World): Promise<string> {
  await givePassword(base.owner, world.userId);
  return world.as(ALL, async (ctx) => {
    const lot = await makeLot(ctx, { pieces: 10 });
    const batch = await makeDispatchedBatch(ctx, world.processorId, { lots: [lot] });
    await countInAll(ctx, batch.id, [{ good: 9, damaged: 1 }]);
    await makeSignedCertificate(ctx, batch.id, [9]);
    return lot.id;
  });
}

/** As anybody who holds the address, signed in nowhere. */
const asAnybody = <T>(now: Date, work: (ctx: Ctx) => Promise<T>): Promise<T> =>
  withTenant(base.db, { kind: 'door' }, (tx) =>
    work({ ...NOBODY, tx, now, requestId: 'test', address: null }),
  );

test('the dossier names every step of the chain, and every piece', async () => {
  const world = await makeWorld(base.db, base.owner);
  const lotId = await provedLot(world);
  const content = await world.as(['auditor'], (ctx) => readDossier(ctx, lotId));
  const [batch] = content.batches;
  expect(content.whereabouts.reduce((sum, one) => sum + one.pieces, 0)).toBe(content.lot.made);
  expect(batch?.signatures).toMatchObject([{ pieces: 9, signer: 'Test Person' }]);
  expect(batch?.nonconformances).toMatchObject([{ kind: 'damaged', pieces: 1 }]);
  expect(batch?.requirements[0]?.decisions[0]).toMatchObject({ verdict: 'meets' });
  expect(content.files.map((file) => file.purpose)).toContain('certificate');
  expect(content.movements.map((one) => one.reason)).toEqual(
    expect.arrayContaining(['made', 'packed', 'dispatched', 'received']),
  );
});

test('the same content and time make the same document, byte for byte', async () => {
  const world = await makeWorld(base.db, base.owner);
  const lotId = await provedLot(world);
  const content = await world.as(['auditor'], (ctx) => readDossier(ctx, lotId));
  const stated = { statedAt: TODAY, pictures: new Map() };
  const [once, again] = [await renderDossier(content, stated), await renderDossier(content, stated)];
  expect(once.equals(again)).toBe(true);
});

test('an archive is not made of an original whose bytes changed', async () => {
  const original = Buffer.from('as received');
  const file = {
    id: 'f',
    name: '../../etc/pass\u202Ewd.pdf',
    purpose: 'certificate',
    mediaType: 'application/pdf',
    size: original.length,
    sha256: createHash('sha256').update(original).digest('hex'),
    storageKey: 'k',
    batchNumber: 'B-0001',
  };
  const content = {
    lot: { number: 'L-1' },
    shop: { name: 'S' },
    files: [file],
    auditHead: null,
  } as unknown as DossierContent;
  const archive = { content, document: Buffer.from('%PDF'), statedAt: TODAY };
  const whole = await makeArchive({
    ...archive,
    open: async () => Promise.resolve(Readable.from([original])),
  });
  expect(whole.includes('originals/B-0001/')).toBe(true);
  expect(whole.includes('../')).toBe(false);
  await expect(
    makeArchive({
      ...archive,
      open: async () => Promise.resolve(Readable.from([Buffer.from('as altered')])),
    }),
  ).rejects.toThrow('no longer has its hash');
});

test('a link shows the dossier to anybody who holds it, until its day or until it is withdrawn', async () => {
  const world = await makeWorld(base.db, base.owner);
  const lotId = await provedLot(world);
  const { id, url } = await world.as(['inspector'], (ctx) =>
    shareDossier(ctx, { lotId, forWhom: 'The customer', days: 10 }),
  );
  const token = url.split('/').at(-1) ?? '';
  expect((await asAnybody(TODAY, (ctx) => openDossierLink(ctx, { token }))).evidence.lot.id).toBe(lotId);
  const later = new Date(TODAY.getTime() + 11 * 24 * 3600 * 1000);
  await expect(asAnybody(later, (ctx) => openDossierLink(ctx, { token }))).rejects.toMatchObject({
    code: 'gone',
  });
  await expect(asAnybody(TODAY, (ctx) => openDossierLink(ctx, { token: `${token}x` }))).rejects.toMatchObject(
    { code: 'not_found' },
  );
  await world.as(['inspector'], (ctx) => withdrawDossierLink(ctx, { linkId: id }));
  await expect(asAnybody(TODAY, (ctx) => openDossierLink(ctx, { token }))).rejects.toMatchObject({
    code: 'gone',
  });
});

test('a lead may read a dossier but not give it out; another shop is told that the lot does not exist', async () => {
  const [world, stranger] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const lotId = await provedLot(world);
  await expect(
    world.as(['lead'], (ctx) => shareDossier(ctx, { lotId, forWhom: 'The customer', days: 10 })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  await expect(
    stranger.as(['inspector'], (ctx) => shareDossier(ctx, { lotId, forWhom: 'The customer', days: 10 })),
  ).rejects.toMatchObject({ code: 'not_found' });
});
