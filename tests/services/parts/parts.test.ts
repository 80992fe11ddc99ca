import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { auditEntries } from '@/db/schema/audit';
import { PartInput } from '@/lib/parts/contract';
import { createPart } from '@/lib/parts/create-part';
import { editPart } from '@/lib/parts/edit-part';
import { getPart, listParts } from '@/lib/parts/queries';
import { revisePart } from '@/lib/parts/revise-part';
import { createLot } from '@/lib/lots/create-lot';
import { LotInput } from '@/lib/lots/contract';
import { newId } from '@/lib/ids';

import { somePdf, uploadFile } from '../../factories/uploads';
import { makeWorld, TODAY } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

const STEP = {
  process: 'solution_heat_treat_and_age',
  specification: 'AMS 2770',
  specificationRevision: 'R',
  conditionBefore: 'O',
  targetCondition: 'T42',
  toProve: [{ characteristic: 'Hardness', limit: '63 to 83', unit: 'HRB' }],
} as const;

const rib = (changes: Partial<Parameters<typeof PartInput.parse>[0]> & object = {}): PartInput =>
  PartInput.parse({
    number: 'FL-4418-03',
    revision: 'C',
    name: 'Bulkhead web',
    alloy: '2024',
    form: 'sheet',
    clad: true,
    thickness: '0.032 in',
    madeCondition: 'O',
    endCondition: 'T42',
    route: [STEP],
    ...changes,
  });

const world = () => makeWorld(base.db, base.owner);

test('a part is kept as it was typed, with its measures in SI, and the audit tells of it', async () => {
  const { as } = await world();
  const { id } = await as(['lead'], (ctx) => createPart(ctx, rib({ length: '61.5 in', mass: '186 g' })));
  const part = await as(['auditor'], (ctx) => getPart(ctx, { partId: id }));
  expect(part).toMatchObject({
    number: 'FL-4418-03',
    revision: 'C',
    thickness: { entered: '0.032 in', value: 0.8128 },
    length: { entered: '61.5 in', value: 1562.1 },
    mass: { value: 186 },
    area: null,
    lotCount: 0,
  });
  expect(part.route).toMatchObject([
    {
      seq: 1,
      process: 'solution_heat_treat_and_age',
      targetCondition: 'T42',
      classType: null,
      waiting: 0,
      used: false,
      toProve: [{ characteristic: 'Hardness' }],
    },
  ]);
  const audit = await as(['admin'], ({ tx }) =>
    tx.select({ action: auditEntries.action }).from(auditEntries).where(eq(auditEntries.entityId, id)),
  );
  expect(audit).toEqual([{ action: 'part.create' }]);
});

test('what the order states is kept with its step, goes on to the next revision, and blanks are not kept', async () => {
  const { as } = await world();
  const ordering = { part_type: ' pressed web ', restrictions: '' };
  const { id } = await as(['lead'], (ctx) => createPart(ctx, rib({ route: [{ ...STEP, ordering }] })));
  const part = await as(['lead'], (ctx) => getPart(ctx, { partId: id }));
  expect(part.route[0]?.ordering).toEqual({ part_type: 'pressed web' });
  const next = await as(['lead'], (ctx) =>
    revisePart(ctx, {
      ...rib({ revision: 'D', route: [{ ...STEP, ordering: part.route[0]?.ordering }] }),
      partId: id,
    }),
  );
  const revised = await as(['lead'], (ctx) => getPart(ctx, { partId: next.id }));
  expect(revised.route[0]?.ordering).toEqual({ part_type: 'pressed web' });
});

test('only a lead or an admin changes parts; everybody in the shop reads them', async () => {
  const { as } = await world();
  await expect(as(['inspector', 'office'], (ctx) => createPart(ctx, rib()))).rejects.toMatchObject({
    code: 'not_allowed',
  });
  const { id } = await as(['lead'], (ctx) => createPart(ctx, rib()));
  await expect(
    as(['auditor'], (ctx) => editPart(ctx, { ...rib(), partId: id, version: 1 })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  await expect(
    as(['office'], (ctx) => revisePart(ctx, { ...rib({ revision: 'D' }), partId: id })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
});

test.each([
  [{ number: ' ' }, ['number']],
  [{ thickness: '0.032' }, ['thickness']],
  [{ mass: '3 in' }, ['mass']],
  [{ form: 'wire' }, ['form']],
  [
    { route: [{ ...STEP, specification: '', toProve: [{ characteristic: '' }] }] },
    ['route.0.specification', 'route.0.toProve.0.characteristic'],
  ],
])('%j names the field', (changes, fields) => {
  const parsed = PartInput.safeParse({ ...rib(), ...changes });
  expect(parsed.error?.issues.map(({ path }) => path.join('.'))).toEqual(fields);
});

test('a number that is here is not added again, but revised', async () => {
  const { as } = await world();
  await as(['lead'], (ctx) => createPart(ctx, rib()));
  await expect(as(['lead'], (ctx) => createPart(ctx, rib()))).rejects.toMatchObject({
    code: 'conflict',
    details: { fields: [{ field: 'revision' }] },
  });
  await expect(as(['lead'], (ctx) => createPart(ctx, rib({ revision: 'D' })))).rejects.toMatchObject({
    code: 'conflict',
    details: { fields: [{ field: 'number' }] },
  });
});

test('a new revision supersedes the old, and old lots keep theirs', async () => {
  const { as } = await world();
  const { id } = await as(['lead'], (ctx) => createPart(ctx, rib()));
  const lot = await as(['lead'], (ctx) =>
    createLot(ctx, LotInput.parse({ partId: id, heat: 'H-1', pieces: 10 })),
  );
  const before = await as(['lead'], (ctx) => getPart(ctx, { partId: id }));
  const next = await as(['lead'], (ctx) =>
    revisePart(ctx, {
      ...rib({ revision: 'D', thickness: '0.040 in' }),
      partId: id,
      route: before.route.map((step) => ({
        ...STEP,
        id: step.id,
        classType: '',
        note: '',
        toProve: [],
        ordering: {},
      })),
    }),
  );

  const [old, now] = await as(
    ['lead'],
    async (ctx) => [await getPart(ctx, { partId: id }), await getPart(ctx, { partId: next.id })] as const,
  );
  expect(old).toMatchObject({
    supersededAt: TODAY,
    lots: [{ id: lot.id, made: 10, places: [{ place: 'making', pieces: 10 }] }],
    route: [{ waiting: 10, used: true }],
  });
  expect(now).toMatchObject({
    revision: 'D',
    supersededAt: null,
    lotCount: 0,
    revisions: [
      { revision: 'D', lots: 0 },
      { revision: 'C', lots: 1 },
    ],
  });
  expect(now.route[0]?.id).not.toBe(old.route[0]?.id);
  await expect(
    as(['lead'], (ctx) => revisePart(ctx, { ...rib({ revision: 'E' }), partId: id })),
  ).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringMatching(/superseded already/) as string,
  });
  const listed = await as(['lead'], (ctx) => listParts(ctx, { limit: 50, superseded: '0' }));
  expect(listed.rows.map(({ revision }) => revision)).toEqual(['D']);
});

test('two people who revise at once: one wins', async () => {
  const { as } = await world();
  const { id } = await as(['lead'], (ctx) => createPart(ctx, rib()));
  const outcomes = await Promise.allSettled(
    ['D', 'E'].map((revision) =>
      as(['lead'], (ctx) => revisePart(ctx, { ...rib({ revision }), partId: id })),
    ),
  );
  expect(outcomes.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
});

test('the route is changed, reordered and added to; steps keep their identity', async () => {
  const { as } = await world();
  const { id } = await as(['lead'], (ctx) =>
    createPart(ctx, rib({ route: [STEP, { ...STEP, process: 'anodize', specification: 'MIL-A-8625' }] })),
  );
  const { route } = await as(['lead'], (ctx) => getPart(ctx, { partId: id }));
  const [first, second] = route.map((step) => step.id);
  const film = { ...STEP, process: 'chemical_film' as const, specification: 'MIL-DTL-5541' };
  await as(['lead'], (ctx) =>
    editPart(ctx, {
      ...rib({
        route: [
          { ...STEP, id: second, process: 'anodize', specification: 'MIL-PRF-8625' },
          film,
          { ...STEP, id: first },
        ],
      }),
      partId: id,
      version: 1,
    }),
  );
  const after = await as(['lead'], (ctx) => getPart(ctx, { partId: id }));
  expect(after.version).toBe(2);
  expect(after.route.map((step) => [step.seq, step.specification])).toEqual([
    [1, 'MIL-PRF-8625'],
    [2, 'MIL-DTL-5541'],
    [3, 'AMS 2770'],
  ]);
  expect([after.route[0]?.id, after.route[2]?.id]).toEqual([second, first]);
});

test('a step that lots have waited for cannot be taken out, and the number is fixed with the first lot', async () => {
  const { as } = await world();
  const { id } = await as(['lead'], (ctx) => createPart(ctx, rib()));
  await as(['lead'], (ctx) => createLot(ctx, LotInput.parse({ partId: id, heat: 'H-1', pieces: 10 })));
  await expect(
    as(['lead'], (ctx) => editPart(ctx, { ...rib({ route: [] }), partId: id, version: 1 })),
  ).rejects.toMatchObject({ code: 'conflict', details: { fields: [{ field: 'route' }] } });
  await expect(
    as(['lead'], (ctx) => editPart(ctx, { ...rib({ number: 'FL-1' }), partId: id, version: 1 })),
  ).rejects.toMatchObject({ details: { fields: [{ field: 'number' }] } });
  await expect(
    as(['lead'], (ctx) => editPart(ctx, { ...rib({ serialised: true }), partId: id, version: 1 })),
  ).rejects.toMatchObject({ details: { fields: [{ field: 'serialised' }] } });
});

test('who saves over another is told', async () => {
  const { as } = await world();
  const { id } = await as(['lead'], (ctx) => createPart(ctx, rib()));
  const { route } = await as(['lead'], (ctx) => getPart(ctx, { partId: id }));
  const kept = route.map((step) => ({ ...STEP, id: step.id }));
  await as(['lead'], (ctx) =>
    editPart(ctx, { ...rib({ name: 'Web', route: kept }), partId: id, version: 1 }),
  );
  await expect(
    as(['lead'], (ctx) => editPart(ctx, { ...rib({ name: 'Rib', route: kept }), partId: id, version: 1 })),
  ).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringMatching(/changed meanwhile/) as string,
  });
});

test('another shop sees, changes and revises nothing', async () => {
  const { as } = await world();
  const { id } = await as(['lead'], (ctx) => createPart(ctx, rib()));
  const stranger = await world();
  await expect(stranger.as(['lead'], (ctx) => getPart(ctx, { partId: id }))).rejects.toMatchObject({
    code: 'not_found',
  });
  await expect(
    stranger.as(['lead'], (ctx) => editPart(ctx, { ...rib(), partId: id, version: 1 })),
  ).rejects.toMatchObject({ code: 'not_found' });
  await expect(
    stranger.as(['lead'], (ctx) => revisePart(ctx, { ...rib(), partId: id })),
  ).rejects.toMatchObject({ code: 'not_found' });
  await expect(stranger.as(['lead'], (ctx) => createPart(ctx, rib()))).resolves.toMatchObject({ version: 1 });
});

test('a drawing is a verified drawing', async () => {
  const { as } = await world();
  const now = new Date();
  const drawingFileId = await uploadFile((work) => as(['lead'], work, now), {
    purpose: 'drawing',
    name: 'FL-4418-03_C.pdf',
    content: somePdf(newId()),
  });
  const { id } = await as(['lead'], (ctx) => createPart(ctx, rib({ drawingFileId })));
  expect((await as(['lead'], (ctx) => getPart(ctx, { partId: id }))).drawing).toMatchObject({
    id: drawingFileId,
    name: 'FL-4418-03_C.pdf',
  });
  await expect(
    as(['lead'], (ctx) => createPart(ctx, rib({ number: 'FL-2', drawingFileId: newId() }))),
  ).rejects.toMatchObject({ details: { fields: [{ field: 'drawingFileId' }] } });
});

test('the list pages by key and finds by number, name and alloy', async () => {
  const { as } = await world();
  for (const number of ['FL-3', 'FL-1', 'FL-2', 'RU-1'])
    await as(['lead'], (ctx) =>
      createPart(
        ctx,
        rib({
          number,
          name: number === 'RU-1' ? 'Rudder horn' : 'Web',
          alloy: number === 'FL-2' ? '7075' : '2024',
        }),
      ),
    );
  const read = (input: object) =>
    as(['lead'], (ctx) => listParts(ctx, { limit: 2, superseded: '0', ...input }));
  const first = await read({});
  const second = await read({ after: first.next });
  expect([...first.rows, ...second.rows].map(({ number }) => number)).toEqual([
    'FL-1',
    'FL-2',
    'FL-3',
    'RU-1',
  ]);
  expect(second.next).toBeNull();
  for (const [text, found] of [
    ['fl-', 2],
    ['horn', 1],
    ['7075', 1],
    ['%', 0],
  ] as const)
    expect((await read({ text })).rows).toHaveLength(found);
});
