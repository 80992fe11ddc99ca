import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { auditEntries } from '@/db/schema/audit';
import { parts } from '@/db/schema/parts';
import { getBatchLines } from '@/lib/batches/get-batch-lines';
import { setRequirements } from '@/lib/batches/set-requirements';
import { newId } from '@/lib/ids';
import { addRequirements } from '@/lib/requirements/add-requirements';
import { proposeForStep as stepDeclaration } from '@/lib/requirements/contract';
import { proposeForBatch } from '@/lib/requirements/propose-for-batch';
import { proposeForStep } from '@/lib/requirements/propose-for-step';

import { makeBatch, makeDispatchedBatch } from '../../factories/batches';
import { makeWorld } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const world = () => makeWorld(base.db, base.owner);
const named = (all: readonly { characteristic: string }[]) => all.map(({ characteristic }) => characteristic);

test('what the tables propose is added behind what was typed, and then nothing more is proposed', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const batch = await makeBatch(ctx, here.processorId);
    const read = () => getBatchLines(ctx, { batchId: batch.id });
    const [line] = (await read()).lines;
    const lineId = line?.id ?? '';
    const typed = {
      characteristic: 'Soak time',
      limit: '33 to 37',
      unit: 'min',
      source: 'drawing' as const,
      sourceText: 'note 4',
    };
    const changed = await setRequirements(ctx, {
      batchId: batch.id,
      version: batch.version,
      lineId,
      requirements: [typed],
    });

    const { lines } = await proposeForBatch(ctx, { batchId: batch.id, units: 'inch' });
    const [found] = lines;
    expect(named(found?.proposals ?? [])).toEqual(
      expect.arrayContaining(['Solution temperature', 'Quench delay', 'Natural ageing']),
    );
    // The batch asks for hardness and the line for a soak, in words of its own.
    expect(named(found?.proposals ?? [])).not.toContain('Soak');
    expect(named(found?.proposals ?? [])).not.toContain('Hardness');

    await addRequirements(ctx, {
      batchId: batch.id,
      version: changed.version,
      lines: [{ lineId, requirements: found?.proposals ?? [] }],
    });
    const own = (await read()).requirements.filter((one) => one.lineId === lineId);
    expect(own[0]).toMatchObject(typed);
    expect(named(own).slice(1)).toEqual(named(found?.proposals ?? []));
    expect((await proposeForBatch(ctx, { batchId: batch.id, units: 'inch' })).lines[0]?.proposals).toEqual(
      [],
    );
    const entries = await ctx.tx
      .select({ after: auditEntries.after })
      .from(auditEntries)
      .where(eq(auditEntries.action, 'batch.add_requirements'));
    expect(JSON.stringify(entries)).toContain('line 1: Solution temperature 910 to 930 °F');
  });
});

test('a line in one load with thicker metal is asked for the soak of that load', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const batch = await makeBatch(ctx, here.processorId, { pieces: [4, 6] });
    const { lines } = await getBatchLines(ctx, { batchId: batch.id });
    for (const [at, thicknessMm] of [1.016, 12.7].entries())
      await ctx.tx
        .update(parts)
        .set({ clad: false, thicknessMm, thicknessEntered: `${thicknessMm} mm` })
        .where(eq(parts.id, lines[at]?.partId ?? ''));
    const found = await proposeForBatch(ctx, { batchId: batch.id, units: 'inch' });
    const soaks = found.lines.map(
      ({ proposals }) => proposals.find(({ characteristic }) => characteristic === 'Soak')?.limit,
    );
    expect(new Set(soaks).size).toBe(1);
  });
});

test('a step that is being typed is answered from its words', async () => {
  const here = await world();
  const input = stepDeclaration.input.parse({
    alloy: 'Alclad 2024',
    form: 'sheet',
    thickness: '0.040 in',
    process: 'solution_heat_treat_and_age',
    specification: 'AMS 2770',
    conditionBefore: 'O',
    targetCondition: 'T42',
    units: 'metric',
  });
  await here.as(['lead'], async (ctx) => {
    const { proposals } = await proposeForStep(ctx, input);
    expect(proposals).toContainEqual(
      expect.objectContaining({ characteristic: 'Solution temperature', limit: '488 to 498', unit: '°C' }),
    );
  });
});

test('an auditor, a batch that left, a stale version and a line of elsewhere are refused', async () => {
  const here = await world();
  const requirements = [
    { characteristic: 'Soak', limit: '30', unit: 'min', source: 'shop' as const, sourceText: '' },
  ];
  const sent = await here.as(['lead'], async (ctx) => {
    const building = await makeBatch(ctx, here.processorId);
    const asked = { batchId: building.id, version: building.version };
    await expect(
      addRequirements(ctx, { ...asked, lines: [{ lineId: newId(), requirements }] }),
    ).rejects.toMatchObject({ code: 'not_found' });
    const { lines } = await getBatchLines(ctx, { batchId: building.id });
    const [line] = lines;
    await expect(
      addRequirements(ctx, { ...asked, version: 1, lines: [{ lineId: line?.id ?? '', requirements }] }),
    ).rejects.toMatchObject({ code: 'conflict' });
    const batch = await makeDispatchedBatch(ctx, here.processorId);
    const left = await getBatchLines(ctx, { batchId: batch.id });
    const input = {
      batchId: batch.id,
      version: batch.version,
      lines: left.lines.map(({ id }) => ({ lineId: id, requirements })),
    };
    await expect(addRequirements(ctx, input)).rejects.toMatchObject({ code: 'conflict' });
    return input;
  });
  await here.as(['auditor'], async (ctx) => {
    await expect(addRequirements(ctx, sent)).rejects.toMatchObject({ code: 'not_allowed' });
  });
  const elsewhere = await world();
  await elsewhere.as(['lead'], async (ctx) => {
    await expect(addRequirements(ctx, sent)).rejects.toMatchObject({ code: 'not_found' });
    await expect(proposeForBatch(ctx, { batchId: sent.batchId, units: 'inch' })).rejects.toMatchObject({
      code: 'not_found',
    });
  });
});
