import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { beforeAll, expect, test } from 'vitest';

import { batchLinks } from '@/db/schema/batches';
import { ALL_ENDPOINTS } from '@/lib/api/all-endpoints';
import type { Declaration, Side } from '@/lib/api/endpoint';
import { PERMISSIONS } from '@/lib/auth/permissions';
import { SHOP_ROLES, type Role } from '@/lib/auth/roles';
import { inOwningShop } from '@/lib/files/in-owning-shop';
import { newId } from '@/lib/ids';
import { enterOwnTable } from '@/lib/reference/enter-own-table';
import { sendPaper } from '@/lib/portal/send-paper';
import { addToIntake } from '@/lib/readings/settle-intake';

import { makeDispatchedBatch } from '../factories/batches';
import { makeFile } from '../factories/evidence';
import { ALL, makeApprovedInvoice } from '../factories/invoices';
import { makeWorld, type World } from '../factories/world';
import { cookieFor, makeSignedIn, openApi, send } from './harness';
import { sampleInput } from './sample-input';

const base = openApi();

const declarations: readonly Declaration[] = ALL_ENDPOINTS.map(({ declaration }) => declaration);
/** What `authorize` says, apart from what a verb may refuse for reasons of its own. */
const NOT_YOUR_ROLE = 'Your roles in this shop do not allow this. An admin can change them.';
/** An answer about a thing of another shop may be an empty list, as for a thing that does not exist; it names nothing. */
const ANY_ID = /[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-/;
const NOT_YOUR_SIDE = 'This belongs to another side of Lotwright.';

interface Walker {
  says: string;
  /** Null for nobody. */
  role: Role | null;
  side: 'shop' | 'processor' | 'nobody';
  cookie(): Promise<string | null>;
}

let shopA: World;
let shopB: World;
/** Things of shop A, by the names that endpoints give them. */
let known: Record<string, unknown>;
/** A batch that nobody walks over, and its link. */
let linkId: string;

beforeAll(async () => {
  [shopA, shopB] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  await makeApprovedInvoice(shopA, base.owner);
  await shopA.as(ALL, async (ctx) =>
    addToIntake(ctx, { fileId: await makeFile(ctx, { purpose: 'certificate' }) }),
  );
  const [batch, linked] = await shopA.as(
    ALL,
    async (ctx) =>
      [
        await makeDispatchedBatch(ctx, shopA.processorId),
        await makeDispatchedBatch(ctx, shopA.processorId),
      ] as const,
  );
  await shopA.asProcessor(async (ctx) => {
    const fileId = await inOwningShop(ctx, shopA.shopId, (inner) =>
      makeFile(inner, { purpose: 'chart', batchId: batch.id, processorId: shopA.processorId }),
    );
    await sendPaper(ctx, { batchId: batch.id, kind: 'chart', fileId });
  });
  linkId = newId();
  await base.owner.insert(batchLinks).values({
    id: linkId,
    shopId: shopA.shopId,
    batchId: linked.id,
    processorId: shopA.processorId,
    tokenHash: randomUUID(),
    createdAt: new Date(),
  });
  await shopA.as(['lead'], (ctx) =>
    enterOwnTable(ctx, {
      ...{ tableId: 'quench-delays', title: 'Own procedure', edition: 'issue 1', clause: '2', follows: null },
      ...{ heads: ['from (in)', 'max (s)'], cells: [['0', '4']] },
    }),
  );
  known = { ...(await idsOf(shopA)), batchId: batch.id, tableId: 'quench-delays' };
}, 120_000);

const TABLES = {
  batchId: 'batches',
  lineId: 'batch_lines',
  requirementId: 'requirements',
  lotId: 'lots',
  partId: 'parts',
  stepId: 'route_steps',
  certificateId: 'certificates',
  chartId: 'charts',
  intakeId: 'intake',
  invoiceId: 'invoices',
  fileId: 'files',
  receiptId: 'receipts',
  nonconformanceId: 'nonconformances',
  documentId: 'batch_documents',
  approvalId: 'approvals',
  equipmentId: 'equipment',
  entryId: 'reference_tables',
  releaseId: 'releases',
  locationId: 'locations',
  messageId: 'messages',
  paymentId: 'payments',
  linkId: 'batch_links',
  assemblyId: 'assemblies',
} as const;

/** One thing of each kind; where the world has none, an id of nothing. */
async function idsOf(world: World): Promise<Record<string, string>> {
  const found: Record<string, string> = {
    processorId: world.processorId,
    personId: world.userId,
    userId: world.userId,
  };
  for (const [name, table] of Object.entries(TABLES)) {
    const { rows } = await base.owner.execute<{ id: string }>(
      sql`select id from ${sql.raw(table)} where shop_id = ${world.shopId} order by id limit 1`,
    );
    found[name] = rows[0]?.id ?? randomUUID();
  }
  return found;
}

const person = (
  organisation: () => { shopId: string } | { processorId: string },
  role: Role,
  says: string,
): Walker => ({
  says,
  role,
  side: role === 'processor' ? 'processor' : 'shop',
  // A person of their own for each step: some steps end the session they were walked with.
  cookie: async () => (await makeSignedIn(base.owner, organisation(), [role])).cookie,
});

const own: readonly Walker[] = [
  ...SHOP_ROLES.map((role) => person(() => ({ shopId: shopA.shopId }), role, role)),
  person(() => ({ processorId: shopA.processorId }), 'processor', 'processor'),
  { says: 'link', role: 'processor', side: 'processor', cookie: () => cookieFor({ kind: 'link', linkId }) },
  { says: 'nobody', role: null, side: 'nobody', cookie: () => Promise.resolve(null) },
];

const strangers: readonly Walker[] = [
  ...SHOP_ROLES.map((role) => person(() => ({ shopId: shopB.shopId }), role, `${role} of another shop`)),
  person(() => ({ processorId: shopB.processorId }), 'processor', 'another processor'),
];

const SIDES: Record<Side, readonly Walker['side'][]> = {
  public: ['shop', 'processor', 'nobody'],
  any: ['shop', 'processor'],
  shop: ['shop'],
  portal: ['processor'],
};

/** The whole table, read once more and without the code that enforces it. */
function mayWalk({ permission, side }: Declaration, walker: Walker): 'yes' | 401 | 403 {
  const allowed: readonly string[] | 'everyone' = PERMISSIONS[permission];
  const hasRole = allowed === 'everyone' || (walker.role !== null && allowed.includes(walker.role));
  if (!hasRole) return walker.role === null ? 401 : 403;
  return SIDES[side].includes(walker.side) ? 'yes' : 403;
}

interface Step {
  status: number;
  text: string;
}

async function step(declaration: Declaration, walker: Walker): Promise<Step> {
  const cookie = await walker.cookie();
  const response = await send(
    declaration,
    sampleInput(declaration, known),
    cookie === null ? {} : { cookie },
  );
  // What streams is not read to its end: whether it came at all is what counts.
  const isText = /json|text/.test(response.headers.get('content-type') ?? '');
  return { status: response.status, text: isText ? await response.text() : '' };
}

const nameOf = ({ method, path }: Declaration): string => `${method.toUpperCase()} ${path}`;

/** Everything of shop A, as one line a table: what must not have moved. */
async function stateOfA(): Promise<string[]> {
  const { rows: tables } = await base.owner.execute<{ name: string }>(
    sql`select table_name as name from information_schema.columns where table_schema = 'public' and column_name = 'shop_id' order by 1`,
  );
  const state: string[] = [];
  for (const { name } of tables) {
    const { rows } = await base.owner.execute<{ sum: string | null }>(
      sql`select md5(string_agg(t::text, '|' order by t::text)) as sum from ${sql.raw(`"${name}"`)} t where shop_id = ${shopA.shopId}`,
    );
    state.push(`${name} ${rows[0]?.sum ?? 'empty'}`);
  }
  return state;
}

test('the walk has somewhere to go', () => {
  expect(declarations.length).toBeGreaterThan(100);
});

test(
  'strangers get nothing of the shop, change nothing of it, and nothing breaks',
  { timeout: 600_000 },
  async () => {
    const before = await stateOfA();
    const idsOfA = new Set(Object.values({ ...(await idsOf(shopA)), shopId: shopA.shopId }).map(String));
    const faults: string[] = [];
    for (const walker of strangers) {
      for (const declaration of declarations) {
        const { status, text } = await step(declaration, walker);
        const expected = mayWalk(declaration, walker);
        // A published table is nobody's.
        const asksForAThing = /\{(?!token|tableId)\w+\}/.test(declaration.path);
        if (status >= 500) faults.push(`${walker.says}: ${nameOf(declaration)} broke with ${status} ${text}`);
        else if (expected !== 'yes' && status !== expected)
          faults.push(`${walker.says}: ${nameOf(declaration)} is ${status}, the table says ${expected}`);
        else if (status < 300 && asksForAThing && (declaration.method !== 'get' || ANY_ID.test(text)))
          faults.push(
            `${walker.says}: ${nameOf(declaration)} answered ${status} about a thing of another shop`,
          );
        else if (status < 300 && [...idsOfA].some((id) => text.includes(id)))
          faults.push(`${walker.says}: ${nameOf(declaration)} told of the other shop: ${text.slice(0, 200)}`);
      }
    }
    expect(faults).toEqual([]);
    expect(await stateOfA()).toEqual(before);
  },
);

test('the link of one batch reaches no other', { timeout: 600_000 }, async () => {
  const link = own.find((walker) => walker.says === 'link');
  if (!link) throw new Error('no link');
  const about = declarations.filter(
    (declaration) => mayWalk(declaration, link) === 'yes' && declaration.path.includes('{batchId}'),
  );
  expect(about.length).toBeGreaterThan(3);
  const faults: string[] = [];
  for (const declaration of about) {
    const { status } = await step(declaration, link);
    if (status < 400 || status >= 500) faults.push(`${nameOf(declaration)} answered ${status}`);
  }
  expect(faults).toEqual([]);
});

test(
  'each role may do what the table of permissions says, no more and no less',
  { timeout: 900_000 },
  async () => {
    const faults: string[] = [];
    const walked = new Map<string, number>();
    // Those who may not go first: afterwards there is less to refuse.
    for (const wanted of ['no', 'yes'] as const) {
      for (const walker of own) {
        for (const declaration of declarations) {
          const expected = mayWalk(declaration, walker);
          if ((expected === 'yes') !== (wanted === 'yes')) continue;
          const { status, text } = await step(declaration, walker);
          const fault = faultOf(expected, status, text);
          if (expected === 'yes')
            walked.set(nameOf(declaration), Math.min(walked.get(nameOf(declaration)) ?? 999, status));
          if (fault !== null) faults.push(`${walker.says}: ${nameOf(declaration)} ${fault}`);
        }
      }
    }
    expect(faults).toEqual([]);
    // A walk that is stopped at the gate by its own input would prove little about what lies behind.
    const stopped = [...walked].filter(([, status]) => status === 400).map(([name]) => name);
    expect(stopped.length).toBeLessThan(walked.size / 6);
  },
);

function faultOf(expected: 'yes' | 401 | 403, status: number, text: string): string | null {
  if (status >= 500) return `broke with ${status} ${text}`;
  if (expected !== 'yes') return status === expected ? null : `is ${status}, the table says ${expected}`;
  if (status === 401 || text.includes(NOT_YOUR_ROLE) || text.includes(NOT_YOUR_SIDE))
    return `is refused with ${status}, the table allows it`;
  return null;
}
