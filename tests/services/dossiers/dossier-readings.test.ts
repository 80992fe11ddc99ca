import { eq } from 'drizzle-orm';
import { Readable } from 'node:stream';
import { expect, test } from 'vitest';

import { recordOfSolution } from '@/db/seed/furnace-record';
import { dossiers } from '@/db/schema/dossiers';
import { files } from '@/db/schema/files';
import { drawCharts } from '@/lib/dossiers/draw-charts';
import { requestDossier } from '@/lib/dossiers/queries';
import { readDossier } from '@/lib/dossiers/read-dossier';
import { renderDossier } from '@/lib/dossiers/render-dossier';
import { assembleDossierJob } from '@/lib/jobs/definitions/assemble-dossier';
import { correctReading } from '@/lib/readings/correct-reading';
import { readObject } from '@/lib/storage/object-store';

import { makeDispatchedBatch } from '../../factories/batches';
import { makeLot } from '../../factories/lots';
import { certificatePaper, handIn, HEAT_TREAT, makePaperWorld, readAll } from '../../factories/papers';
import { TODAY, type World } from '../../factories/world';
import { readPdf } from '../../unit/pdf/read-pdf';
import { openDatabase } from '../open-database';
import { runJobs } from '../run-jobs';

const base = openDatabase();

const record = (soakedMin: number) => recordOfSolution({ endedAt: TODAY, soakedMin });

/** A lot that is away, with a certificate and these charts of its batch, all read. */
async function lotWithPapers(charts: readonly Buffer[]) {
  const world = await makePaperWorld(base);
  const { lot, batch } = await world.as(['lead'], async (ctx) => {
    const made = await makeLot(ctx, { pieces: 10 });
    return {
      lot: made,
      batch: await makeDispatchedBatch(ctx, world.processorId, { lots: [made], requirements: HEAT_TREAT }),
    };
  });
  const paper = await certificatePaper(world, batch.id);
  const certificateId = await handIn(world, batch.id, { kind: 'certificate', content: paper });
  for (const [at, content] of charts.entries())
    await handIn(world, batch.id, { kind: 'chart', name: `furnace-${at + 1}.csv`, content });
  await readAll(base);
  return { world, lotId: lot.id, certificateId };
}

const contentOf = (world: World, lotId: string) => world.as(['auditor'], (ctx) => readDossier(ctx, lotId));

const open = async (file: { storageKey: string }) => Readable.from([await readObject(file.storageKey)]);

/** The dossier as the worker makes it, as text. */
async function madeDossier(world: World, lotId: string): Promise<string> {
  const { id } = await world.as(['auditor'], (ctx) => requestDossier(ctx, { lotId }));
  for (const { error } of await runJobs(base, assembleDossierJob)) if (error) throw error;
  const [made] = await base.owner
    .select({ key: files.storageKey })
    .from(dossiers)
    .innerJoin(files, eq(files.id, dossiers.documentFileId))
    .where(eq(dossiers.id, id));
  return (await readPdf(await readObject(made?.key ?? ''))).join(' ');
}

test('each chart that was read is drawn from its original, with what it shows and why', async () => {
  const { world, lotId } = await lotWithPapers([record(45), record(12)]);
  const { batches } = await contentOf(world, lotId);
  expect(batches[0]?.charts).toMatchObject([
    { fileName: 'furnace-1.csv', verdict: 'pass', requirement: { set: 920, soakMinutes: 35 } },
    { fileName: 'furnace-2.csv', verdict: 'fail' },
  ]);
  const text = await madeDossier(world, lotId);
  expect(text).toContain('Furnace chart furnace-1.csv: shows what was asked');
  expect(text).toContain('Furnace chart furnace-2.csv: does not show what was asked');
  expect(text).toContain('920 ± 10 °F, soak 35 min or more, quench delay 10 s or less');
  for (const { why } of batches[0]?.charts ?? []) expect(text).toContain(why.split('.')[0]);
  // What only the pictures say.
  expect(text.split('band 910 to 930 °F')).toHaveLength(3);
  for (const name of ['TC1 F', 'TC2 F', 'TC3 F', 'Set point F']) expect(text).toContain(name);
});

test('charts and corrections are drawn the same again, byte for byte', async () => {
  const { world, lotId, certificateId } = await lotWithPapers([record(45)]);
  await world.as(['inspector'], (ctx) =>
    correctReading(ctx, { certificateId, field: 'lines[0].qty_accepted', corrected: '9' }),
  );
  const content = await contentOf(world, lotId);
  const make = async () =>
    renderDossier(content, { statedAt: TODAY, pictures: await drawCharts(content, open) });
  const [once, again] = [await make(), await make()];
  expect(once.equals(again)).toBe(true);
  const bare = await renderDossier(content, { statedAt: TODAY, pictures: new Map() });
  expect(bare.length).toBeLessThan(once.length);
});

test('what a person corrected stands beside what the machine read, the earlier correction too', async () => {
  const { world, lotId, certificateId } = await lotWithPapers([]);
  expect(await madeDossier(world, lotId)).not.toContain('corrected by a person');
  for (const corrected of ['9', '8'])
    await world.as(['inspector'], (ctx) =>
      correctReading(ctx, { certificateId, field: 'lines[0].qty_accepted', corrected }),
    );
  expect((await contentOf(world, lotId)).batches[0]?.corrections).toMatchObject([
    { field: 'lines[0].qty_accepted', read: '10', corrected: '9', by: 'Test Person' },
    { field: 'lines[0].qty_accepted', read: '10', corrected: '8' },
  ]);
  const text = await madeDossier(world, lotId);
  expect(text).toContain('Read by machine, corrected by a person');
  expect(text).toMatch(/Row 1, pieces accepted\s+10\s+9\s+Test Person/);
  expect(text).toMatch(/Row 1, pieces accepted\s+10\s+8\s+Test Person/);
});

test('a chart that was not read is an original like any other, without a picture', async () => {
  const { world, lotId } = await lotWithPapers([Buffer.from('The chart follows by post.\n')]);
  const content = await contentOf(world, lotId);
  expect(content.batches[0]?.charts).toEqual([]);
  expect(content.files.map(({ purpose }) => purpose)).toContain('chart');
  expect(await madeDossier(world, lotId)).not.toContain('Furnace chart');
});

test('no picture is drawn of a chart whose bytes changed', async () => {
  const { world, lotId } = await lotWithPapers([record(45)]);
  const content = await contentOf(world, lotId);
  await expect(drawCharts(content, () => Promise.resolve(Readable.from([record(60)])))).rejects.toThrow(
    'no longer has its hash',
  );
});
