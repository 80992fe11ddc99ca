import { subDays } from 'date-fns';
import { drizzle } from 'drizzle-orm/node-postgres';
import pg from 'pg';

import { createAssembly } from '@/lib/assemblies/change-assembly';
import { env } from '@/lib/env';
import type { PartInput } from '@/lib/parts/contract';
import { createPart } from '@/lib/parts/create-part';
import { addLocation } from '@/lib/stock/add-location';

import { campaignThread, type Campaign } from './campaign';
import { catalogue } from './catalogue';
import { ASSEMBLIES } from './needs';
import { addDays, dayOf, seedOrganisations, type DemoPerson } from './organisations';
import { seedPaymentService } from './payment-service';
import { ROUTES } from './routes';
import { openStage, playAll, StagePlay, type Thread } from './stage-play';
import { CAMPAIGNS, OTHER_YARD } from './story';

/** Mails of so many days are still in the inbox. */
const MAILS_OF_DAYS = 10;

/** Tells the demonstration's story up to today, into an empty database. Dates are relative to the day it is told. */
async function main(): Promise<void> {
  const today = new Date();
  const owner = new pg.Pool({ connectionString: env.DATABASE_OWNER_URL, max: 2 });
  const stage = openStage(env.DATABASE_URL);
  try {
    const cast = await seedOrganisations(drizzle(owner), { since: subDays(today, 365), today });
    await seedPaymentService(drizzle(owner), cast);
    const play = new StagePlay(stage.db, cast, today);
    const ours = await openYard(play, {
      shopId: cast.shopId,
      lead: cast.people.lead,
      inspector: cast.people.inspector,
      office: cast.people.office,
      parts: catalogue(),
      stores: ['Rack A 1', 'Rack A 2', 'Bin cabinet, drawer 14', 'Float shelf'],
    });
    const theirs = await openYard(play, {
      shopId: cast.otherShopId,
      lead: cast.otherOwner,
      inspector: cast.otherOwner,
      office: cast.otherOwner,
      parts: otherParts(),
      stores: ['Shelf 1'],
    });
    await makeAssemblies(play, cast.people.lead);
    await playAll([...ours(CAMPAIGNS), ...theirs(OTHER_YARD)], today);
    await keepOldMailsBack(owner, today);
  } finally {
    await stage.pool.end();
    await owner.end();
  }
}

interface Yard {
  shopId: string;
  lead: DemoPerson;
  inspector: DemoPerson;
  office: DemoPerson;
  parts: readonly PartInput[];
  stores: readonly string[];
}

/** Enters a yard's parts and stores, and hands back what turns campaigns into threads of the story. */
async function openYard(
  play: StagePlay,
  { parts, stores, ...crew }: Yard,
): Promise<(campaigns: readonly Campaign[]) => Thread[]> {
  const opened = subDays(play.today, 364);
  const { ids, locationId } = await play.asPerson(
    { ...crew.lead, roles: ['lead', 'inspector', 'admin'] },
    opened,
    async (ctx) => {
      const ids = new Map<string, string>();
      for (const part of parts) ids.set(part.number, (await createPart(ctx, part)).id);
      const places = [];
      for (const name of stores) places.push(await addLocation(ctx, { name }));
      return { ids, locationId: places[0]?.id ?? '' };
    },
    crew.shopId,
  );
  return (campaigns) =>
    campaigns.map((campaign) =>
      campaignThread({ play, crew: { ...crew, locationId }, parts: ids }, campaign),
    );
}

const makeAssemblies = (play: StagePlay, lead: DemoPerson): Promise<void> =>
  play.asPerson(lead, subDays(play.today, 60), async (ctx) => {
    for (const { name, neededInDays, needs } of ASSEMBLIES) {
      await createAssembly(ctx, {
        name,
        neededOn: dayOf(addDays(play.today, neededInDays)),
        note: null,
        needs: needs.map(([partNumber, pieces]) => ({ partNumber, pieces })),
      });
    }
  });

/** Papers of long ago are made by the worker as all are, but after what is dispatched today, and their mails were read long ago. */
async function keepOldMailsBack(owner: pg.Pool, today: Date): Promise<void> {
  await owner.query(
    `update pgboss.job set data = jsonb_set(data, '{mail}', '"none"'), priority = -1 where name = 'render-documents'
       and (data->>'batchId')::uuid in (select id from batches where dispatched_at < $1)`,
    [subDays(today, MAILS_OF_DAYS)],
  );
}

function otherParts(): PartInput[] {
  const [model] = catalogue();
  if (!model) throw new Error('the catalogue is empty');
  const part = (number: string, name: string): PartInput => ({
    ...model,
    number,
    name,
    revision: 'A',
    route: ROUTES.t42.steps.map((step) => ({ ...step })),
    endCondition: 'T42',
  });
  return [part('LS-20-114', 'Cowl flap bracket'), part('LS-31-002', 'Baggage door skin')];
}

await main();
