import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { batchDocuments, overrides } from '@/db/schema/batches';
import { routeSteps } from '@/db/schema/parts';
import { referenceTables } from '@/db/schema/reference';
import { dispatchBatch } from '@/lib/batches/dispatch-batch';
import { getBatchLines } from '@/lib/batches/get-batch-lines';
import { getLoadPlan } from '@/lib/batches/get-load-plan';
import { overrideCheck } from '@/lib/batches/override-check';
import { getBatchChecks } from '@/lib/batches/queries';
import { reissueBatch } from '@/lib/batches/reissue-batch';
import { setRequirements } from '@/lib/batches/set-requirements';
import { newId } from '@/lib/ids';
import { enterOwnTable as declaration } from '@/lib/reference/contract';
import { checkOwnTable, enterOwnTable, withdrawOwnTable } from '@/lib/reference/enter-own-table';
import { getReferenceTable, getTablesInForce, listReferenceTables } from '@/lib/reference/queries';
import { addRequirements } from '@/lib/requirements/add-requirements';
import { proposeForBatch } from '@/lib/requirements/propose-for-batch';
import { TravellerContent } from '@/lib/travellers/content';

import { makeApproval, makeBatch } from '../../factories/batches';
import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const world = () => makeWorld(base.db, base.owner);

/** Invented figures: shorter than the published ones, so that it shows whose they are. */
const OWN = {
  tableId: 'quench-delays',
  title: 'Own procedure HT-12',
  edition: 'issue 3',
  clause: 'Table 2',
  heads: ['From (in)', 'Max (s)'],
  cells: [
    ['0', '4'],
    ['0.032', '6'],
  ],
  follows: null as string | null,
};
const DOCUMENT = 'Own procedure HT-12, issue 3, Table 2';
const enter = (here: World, given: Partial<typeof OWN> = {}) =>
  here.as(['lead'], (ctx) => enterOwnTable(ctx, { ...OWN, ...given }));
const look = (here: World, entryId?: string) =>
  here.as(['auditor'], (ctx) =>
    getReferenceTable(ctx, { tableId: OWN.tableId, ...(entryId !== undefined && { entryId }) }),
  );

test('an own edition is entered, is in force with who entered it, and the trail says so', async () => {
  const here = await world();
  expect(await look(here)).toMatchObject({ shown: null, isInForce: true, cells: { length: 4 } });
  const { entryId } = await enter(here);
  const found = await look(here);
  expect(found).toMatchObject({
    shown: { id: entryId, title: OWN.title, edition: 'issue 3', clause: 'Table 2', rows: 2 },
    isInForce: true,
    cells: [
      ['0', '4', '', ''],
      ['0.032', '6', '', ''],
    ],
  });
  expect(found.sources[0]).toBe(`${DOCUMENT} (entered by ${found.shown?.enteredByName ?? ''})`);
  await here.as(['lead'], async (ctx) => {
    expect(await lastAudit(ctx, 'reference_table.enter')).toMatchObject({
      entityId: entryId,
      after: { table: found.title, edition: DOCUMENT, rows: 2 },
    });
    const { subjects } = await listReferenceTables(ctx);
    const own = subjects.flatMap(({ tables }) => tables).filter((one) => one.own !== null);
    expect(own.map(({ tableId }) => tableId)).toEqual([OWN.tableId]);
    expect(await getTablesInForce(ctx)).toMatchObject({ own: [{ id: entryId, rows: { length: 2 } }] });
  });
});

test('a new entry follows the one before, which stays; withdrawn, the published table holds again', async () => {
  const here = await world();
  const first = await enter(here);
  const second = await enter(here, { edition: 'issue 4', follows: first.entryId });
  expect(await look(here)).toMatchObject({
    shown: { id: second.entryId },
    history: [
      { id: second.entryId, supersededAt: null },
      { id: first.entryId, supersededAt: expect.any(Date) as Date },
    ],
  });
  expect(await look(here, first.entryId)).toMatchObject({ shown: { edition: 'issue 3' }, isInForce: false });
  await here.as(['admin'], async (ctx) => {
    await withdrawOwnTable(ctx, { tableId: OWN.tableId, entryId: second.entryId });
    expect(await lastAudit(ctx, 'reference_table.withdraw')).toMatchObject({ entityId: second.entryId });
  });
  expect(await look(here)).toMatchObject({ shown: null, history: { length: 2 } });
});

test('an inspector, a second person at once, an edition that is over, a table that there is not are refused', async () => {
  const here = await world();
  await here.as(['inspector'], async (ctx) => {
    await expect(enterOwnTable(ctx, OWN)).rejects.toMatchObject({ code: 'not_allowed' });
    await expect(checkOwnTable(ctx, OWN)).rejects.toMatchObject({ code: 'not_allowed' });
  });
  const { entryId } = await enter(here);
  await expect(enter(here)).rejects.toMatchObject({ code: 'conflict' });
  await expect(enter(here, { follows: newId() })).rejects.toMatchObject({ code: 'conflict' });
  await expect(enter(here, { tableId: 'no-such-table' })).rejects.toMatchObject({ code: 'not_found' });
  const withdraw = (id: string) =>
    here.as(['lead'], (ctx) => withdrawOwnTable(ctx, { tableId: OWN.tableId, entryId: id }));
  await here.as(['inspector'], (ctx) =>
    expect(withdrawOwnTable(ctx, { tableId: OWN.tableId, entryId })).rejects.toMatchObject({
      code: 'not_allowed',
    }),
  );
  await withdraw(entryId);
  await expect(withdraw(entryId)).rejects.toMatchObject({ code: 'conflict' });
  await expect(withdraw(newId())).rejects.toMatchObject({ code: 'not_found' });
});

test.each([
  ['letters for a figure', { cells: [['thin', '4']] }, 'Row 1, from (in): thin is not what stands here.'],
  ['a figure out of range', { cells: [['0', '9999']] }, 'from 0 to 600 s'],
  ['an empty cell that may not be', { cells: [['0', '']] }, 'Row 1, max (s): Is empty'],
  [
    'rows in no order',
    {
      cells: [
        ['1', '9'],
        ['0', '4'],
      ],
    },
    'Row 2, from (in): Is not above that of row 1.',
  ],
  ['no column of the table', { heads: ['thickness'], cells: [['0']] }, 'must name the columns'],
  ['no rows', { cells: [] }, 'no rows under them'],
])('%s is refused in words', async (_, wrong, says) => {
  const here = await world();
  const refusal = await enter(here, wrong).then(
    () => null,
    (error: unknown) => error,
  );
  expect(refusal).toMatchObject({ code: 'bad_input' });
  expect(JSON.stringify(refusal)).toContain(says);
  expect(await look(here)).toMatchObject({ shown: null });
});

test('title, edition and clause are asked for', () => {
  for (const field of ['title', 'edition', 'clause'])
    expect(declaration.input.safeParse({ ...OWN, [field]: ' ' }).success).toBe(false);
});

test('what a file would change is said before it is entered', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const { heads, cells } = await sheetInForce(here);
    const changed = cells.map((line, at) => (at === 0 ? [line[0] ?? '', '3', ...line.slice(2)] : line));
    expect(
      await checkOwnTable(ctx, { tableId: OWN.tableId, heads: [...heads, 'note'], cells: changed }),
    ).toEqual({
      fault: null,
      ignored: ['note'],
      problems: [[], [], [], []],
      changes: { same: 3, added: 1, gone: 1 },
    });
  });
});

const sheetInForce = async (here: World) => {
  const { columns, cells } = await look(here);
  return { heads: columns.map(({ head }) => head), cells };
};

async function quenched(here: World) {
  return here.as(['lead'], async (ctx) => {
    await makeApproval(ctx, here.processorId);
    return makeBatch(ctx, here.processorId);
  });
}

const delayAsked = (here: World, batchId: string) =>
  here.as(['lead'], async (ctx) => {
    const { lines } = await proposeForBatch(ctx, { batchId, units: 'inch' });
    return lines[0]?.proposals.find(({ characteristic }) => characteristic === 'Quench delay');
  });

test('checks, load plan and requirements are read from it and name it; another shop is not reached', async () => {
  const [here, elsewhere] = [await world(), await world()];
  const [batch, other] = [await quenched(here), await quenched(elsewhere)];
  const before = await delayAsked(here, batch.id);
  const { entryId } = await enter(here);
  const readFrom = { table: OWN.tableId, edition: DOCUMENT, entry: entryId };
  expect(await delayAsked(here, batch.id)).toMatchObject({ limit: '6 or less', readFrom });
  await here.as(['lead'], async (ctx) => {
    const { findings } = await getBatchChecks(ctx, { batchId: batch.id });
    const note = findings.find(({ code }) => code === 'soak_and_quench');
    expect(note?.rest).toContain('within 6 s');
    expect(note?.source).toContain(`${DOCUMENT} (entered by`);
    expect(note?.readFrom).toContainEqual(readFrom);
    const { loads } = await getLoadPlan(ctx, { batchId: batch.id });
    expect(loads[0]?.solution?.maxDelayS).toBe(6);
    expect(loads[0]?.sources.join()).toContain(DOCUMENT);
  });
  expect(await delayAsked(elsewhere, other.id)).toEqual(before);
  await elsewhere.as(['admin'], async (ctx) => {
    await expect(getReferenceTable(ctx, { tableId: OWN.tableId, entryId })).rejects.toMatchObject({
      code: 'not_found',
    });
    await expect(withdrawOwnTable(ctx, { tableId: OWN.tableId, entryId })).rejects.toMatchObject({
      code: 'not_found',
    });
    expect(await getTablesInForce(ctx)).toEqual({ own: [] });
  });
});

test('what was frozen stays as it was read when the table changes or is withdrawn', async () => {
  const here = await world();
  const batch = await quenched(here);
  const { entryId } = await enter(here);
  const proposed = await delayAsked(here, batch.id);
  const sent = await here.as(['lead'], async (ctx) => {
    const { lines } = await getBatchLines(ctx, { batchId: batch.id });
    const asked = await addRequirements(ctx, {
      batchId: batch.id,
      version: batch.version,
      lines: [{ lineId: lines[0]?.id ?? '', requirements: proposed ? [proposed] : [] }],
    });
    return dispatchBatch(ctx, { batchId: batch.id, version: asked.version });
  });
  const kept = async () => {
    const { requirements } = await here.as(['lead'], (ctx) => getBatchLines(ctx, { batchId: batch.id }));
    return requirements.filter(({ characteristic }) => characteristic === 'Quench delay');
  };
  const [frozen, first] = [await kept(), await travellerOf(here, batch.id)];
  const own = { table: OWN.tableId, edition: DOCUMENT, entry: entryId };
  expect(frozen).toMatchObject([{ limit: '6 or less', readFrom: { ...own, gave: '6 s or less' } }]);
  expect(first.tables).toContainEqual(own);
  expect(first.tables).toContainEqual(expect.objectContaining({ table: 'soak-times' }));
  expect(first.furnaceLoads?.sources.join()).toContain(DOCUMENT);

  const second = await enter(here, { edition: 'issue 4', cells: [['0', '2']], follows: entryId });
  await here.as(['lead'], (ctx) => withdrawOwnTable(ctx, { tableId: OWN.tableId, entryId: second.entryId }));
  expect(await kept()).toEqual(frozen);
  await here.as(['lead'], (ctx) =>
    reissueBatch(ctx, {
      batchId: batch.id,
      version: sent.version,
      note: 'Van on Friday',
      prices: [],
      requirements: [],
    }),
  );
  const again = await travellerOf(here, batch.id);
  expect(again.documentVersion).toBe(2);
  expect([again.tables, again.furnaceLoads]).toEqual([first.tables, first.furnaceLoads]);
});

test('a blocker that is let pass records the table that it was found by', async () => {
  const here = await world();
  const batch = await quenched(here);
  await here.as(['admin'], async (ctx) => {
    await ctx.tx.update(routeSteps).set({ targetCondition: 'T3' });
    const { findings } = await getBatchChecks(ctx, { batchId: batch.id });
    const stop = findings.find(({ code }) => code === 'condition_not_made');
    await overrideCheck(ctx, {
      batchId: batch.id,
      version: batch.version,
      check: 'condition_not_made',
      subject: stop?.subject ?? '',
      reason: 'The customer wants the papers of the mill with it.',
    });
    const [kept] = await ctx.tx.select().from(overrides).where(eq(overrides.batchId, batch.id));
    expect(kept?.readFrom).toEqual(stop?.readFrom);
    expect(stop?.readFrom?.[0]?.table).toMatch(/^temper-/);
  });
});

async function travellerOf(here: World, batchId: string) {
  const papers = await here.as(['lead'], ({ tx }) =>
    tx.select().from(batchDocuments).where(eq(batchDocuments.batchId, batchId)),
  );
  const [last] = papers
    .filter(({ kind }) => kind === 'traveller')
    .toSorted((one, other) => other.documentVersion - one.documentVersion);
  return TravellerContent.parse(last?.content);
}

test('a limit that was typed over was not read from a table', async () => {
  const here = await world();
  const batch = await quenched(here);
  const proposed = await delayAsked(here, batch.id);
  await here.as(['lead'], async (ctx) => {
    await setRequirements(ctx, {
      batchId: batch.id,
      version: batch.version,
      lineId: null,
      requirements: proposed ? [proposed, { ...proposed, limit: '3 or less' }] : [],
    });
    const { requirements } = await getBatchLines(ctx, { batchId: batch.id });
    expect(requirements.map(({ readFrom }) => readFrom?.table ?? null)).toEqual(['quench-delays', null]);
  });
});

test('rows of an entry cannot be changed, not even by a program error', async () => {
  const here = await world();
  const { entryId } = await enter(here);
  await here.as(['admin'], ({ tx }) =>
    expect(
      tx
        .update(referenceTables)
        .set({ rows: [{ fromIn: 0, maxS: 9 }] })
        .where(eq(referenceTables.id, entryId)),
    ).rejects.toThrow(),
  );
});
