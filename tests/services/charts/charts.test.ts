import { expect, test } from 'vitest';

import { recordOfSolution } from '@/db/seed/furnace-record';
import { getChart } from '@/lib/charts/get-chart';
import { judgeChart } from '@/lib/charts/judge-chart';
import type { ToProve } from '@/lib/parts/to-prove';

import { makeDispatchedBatch } from '../../factories/batches';
import { asked, handIn, HEAT_TREAT, makePaperWorld, readAll } from '../../factories/papers';
import { lastAudit } from '../../factories/standing';
import { makeWorld, TODAY, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

const record = (soakedMin: number) => recordOfSolution({ endedAt: TODAY, soakedMin });

async function handedIn(content: Buffer, requirements: readonly ToProve[] = HEAT_TREAT) {
  const world = await makePaperWorld(base);
  const batch = await world.as(['lead'], (ctx) =>
    makeDispatchedBatch(ctx, world.processorId, { requirements }),
  );
  const chartId = await handIn(world, batch.id, { kind: 'chart', content });
  return { world, batch, chartId };
}

const chartOf = (world: World, chartId: string) =>
  world.as(['inspector'], (ctx) => getChart(ctx, { chartId }));

/** As the batch asks; what it leaves open is left open. */
const ASKED = { set: 920, tolerance: 10, unit: 'F', soakMinutes: 35, maxQuenchDelayS: 10 };

test('a chart is held against what its batch asks, and passes', async () => {
  const { world, batch, chartId } = await handedIn(record(45));
  expect(await chartOf(world, chartId)).toMatchObject({ state: 'waiting', kept: null, asked: ASKED });
  await readAll(base);
  const { kept, ...chart } = await chartOf(world, chartId);
  expect(chart).toMatchObject({
    state: 'read',
    fault: null,
    file: { name: 'furnace-2.csv' },
    batch: { id: batch.id, processor: 'Alder Ridge Heat Treating' },
    others: [],
  });
  expect(kept).toMatchObject({ requirement: ASKED, corrections: {}, judged: { verdict: 'pass' } });
  expect(kept?.judged.soak_minutes).toBeGreaterThanOrEqual(35);
});

test('a soak that was cut short fails, with how long it was', async () => {
  const { world, chartId } = await handedIn(record(12));
  await readAll(base);
  const { kept } = await chartOf(world, chartId);
  expect(kept?.judged.verdict).toBe('fail');
  expect(kept?.judged.flags.map(({ code }) => code)).toContain('short_soak');
  expect(kept?.judged.soak_minutes).toBeLessThan(35);
});

test('where the batch asks for no temperature, a person says what it is held against', async () => {
  const { world, chartId } = await handedIn(record(45), [asked('Hardness', 'HRB 63 or more')]);
  await readAll(base);
  expect(await chartOf(world, chartId)).toMatchObject({
    state: 'unreadable',
    asked: null,
    kept: null,
    fault: expect.stringContaining('Say what the chart is to be held against.') as string,
  });
  const requirement = { set: 920, tolerance: 10, unit: 'F' as const, soakMinutes: 30 };
  await world.as(['inspector'], (ctx) => judgeChart(ctx, { chartId, requirement, corrections: {} }));
  await readAll(base);
  expect(await chartOf(world, chartId)).toMatchObject({
    state: 'read',
    fault: null,
    kept: { requirement, judged: { verdict: 'pass' } },
  });
});

test('held against other figures it is judged anew, and the trail says by whom against what', async () => {
  const { world, chartId } = await handedIn(record(45));
  await readAll(base);
  const requirement = { set: 920, tolerance: 10, unit: 'F' as const, soakMinutes: 120 };
  await world.as(['inspector'], async (ctx) => {
    await judgeChart(ctx, { chartId, requirement, corrections: {} });
    expect(await lastAudit(ctx, 'chart.judge')).toMatchObject({ entityId: chartId, after: { requirement } });
  });
  expect((await chartOf(world, chartId)).state).toBe('waiting');
  await readAll(base);
  expect(await chartOf(world, chartId)).toMatchObject({
    state: 'read',
    kept: { requirement, judged: { verdict: 'fail' } },
  });
});

test('a thermocouple that a person leaves out counts for nothing, and stays left out', async () => {
  const { world, chartId } = await handedIn(record(45));
  await readAll(base);
  const { kept } = await chartOf(world, chartId);
  if (!kept) throw new Error('not read');
  const column = kept.judged.understood.channels.find(({ name }) => name.startsWith('TC3'))?.column ?? -1;
  const corrections = { channels: [{ column, excluded: true }] };
  await world.as(['inspector'], (ctx) =>
    judgeChart(ctx, { chartId, requirement: kept.requirement, corrections }),
  );
  await readAll(base);
  const { kept: again } = await chartOf(world, chartId);
  expect(again?.corrections).toEqual(corrections);
  expect(again?.judged.understood.channels.find((one) => one.column === column)?.excluded).toBe('by_hand');
});

test('a file without times and temperatures is told as such', async () => {
  const { world, chartId } = await handedIn(Buffer.from('Dear Sir,\nthe chart follows by post.\n'));
  await readAll(base);
  expect(await chartOf(world, chartId)).toMatchObject({
    state: 'unreadable',
    fault: expect.stringMatching(/\.$/) as string,
    kept: null,
  });
});

test('a lead or an auditor judges none; another shop is told that there is no such chart', async () => {
  const { world, chartId } = await handedIn(record(45));
  const requirement = { set: 900, tolerance: 50, unit: 'F' as const };
  for (const role of ['auditor', 'office'] as const)
    await expect(
      world.as([role], (ctx) => judgeChart(ctx, { chartId, requirement, corrections: {} })),
    ).rejects.toMatchObject({ code: 'not_allowed' });
  const stranger = await makeWorld(base.db, base.owner);
  await expect(chartOf(stranger, chartId)).rejects.toMatchObject({ code: 'not_found' });
  await expect(
    stranger.as(['inspector'], (ctx) => judgeChart(ctx, { chartId, requirement, corrections: {} })),
  ).rejects.toMatchObject({ code: 'not_found' });
});
