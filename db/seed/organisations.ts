import { hash } from '@node-rs/argon2';
import type { drizzle } from 'drizzle-orm/node-postgres';

import { equipment } from '@/db/schema/equipment';
import { processors, shopProcessors, shops, approvals } from '@/db/schema/organisations';
import { memberships, users } from '@/db/schema/people';
import type { Role } from '@/lib/auth/roles';
import type { EquipmentFields } from '@/lib/equipment/contract';
import { equipmentColumns } from '@/lib/equipment/equipment-columns';
import { newId } from '@/lib/ids';
import type { Process } from '@/lib/trade/process';

import { INSPECTION_ROOMS, PLATING_ROOMS, THERMAL_ROOMS } from './rooms';
import { DEMO_PASSWORD } from './sign-ins';

type OwnerDb = ReturnType<typeof drizzle>;

export interface DemoPerson {
  id: string;
  name: string;
  roles: readonly Role[];
}

export interface DemoProcessor {
  id: string;
  name: string;
  contact: string;
  /** Who sits at its desk. */
  personId: string;
  processes: readonly Process[];
}

export interface DemoOrganisations {
  shopId: string;
  otherShopId: string;
  people: Record<
    'lead' | 'lead2' | 'inspector' | 'inspector2' | 'office' | 'admin' | 'auditor' | 'foreman',
    DemoPerson
  >;
  otherOwner: DemoPerson;
  processors: Record<'thermal' | 'plating' | 'inspection' | 'peening', DemoProcessor>;
}

const HEAT: readonly Process[] = [
  'solution_heat_treat_and_age',
  'solution_heat_treat',
  'artificial_age',
  'anneal',
  'harden_and_temper',
  'stress_relief',
  'embrittlement_relief',
];
const FINISH: readonly Process[] = [
  'cadmium_plate',
  'zinc_plate',
  'anodize',
  'chemical_film',
  'passivation',
  'embrittlement_relief',
];
const NDT: readonly Process[] = ['fluorescent_penetrant', 'magnetic_particle', 'radiography', 'ultrasonic'];

/** Two yards, four processors that both know, and their people. All invented. */
export async function seedOrganisations(
  owner: OwnerDb,
  { since, today }: { since: Date; today: Date },
): Promise<DemoOrganisations> {
  const passwordHash = await hash(DEMO_PASSWORD);
  const [shopId, otherShopId] = [newId(), newId()];
  await owner.insert(shops).values([
    {
      id: shopId,
      name: 'Merganser Cove Aircraft',
      address: ['Slip 9, Merganser Cove', 'Port Alder'],
      phone: '555 0190',
      zone: 'America/Los_Angeles',
      currency: 'USD',
      orderPrefix: 'MC',
      secondApprovalAboveMinor: 50_000,
      createdAt: since,
    },
    {
      id: otherShopId,
      name: 'Larkspur Sheet Metal',
      address: ['2 Kiln Yard', 'Harrow Ferry'],
      phone: '555 0147',
      zone: 'America/Chicago',
      currency: 'USD',
      orderPrefix: 'LS',
      createdAt: since,
    },
  ]);

  const person = async ({
    name,
    email,
    roles,
    ...organisation
  }: { name: string; email: string; roles: readonly Role[] } & (
    { shopId: string } | { processorId: string }
  )): Promise<DemoPerson> => {
    const id = newId();
    await owner.insert(users).values({ id, name, email, passwordHash, createdAt: since });
    await owner
      .insert(memberships)
      .values({ userId: id, roles: [...roles], ...organisation, createdAt: since });
    return { id, name, roles };
  };
  const inShop = (name: string, email: string, roles: readonly Role[]) =>
    person({ name, email: `${email}@merganser.test`, roles, shopId });

  const people = {
    lead: await inShop('Liv Sandvik', 'liv', ['lead']),
    lead2: await inShop('Bertrand Achterberg-Mwangi', 'bertrand', ['lead']),
    inspector: await inShop('Amos Teller', 'amos', ['inspector']),
    inspector2: await inShop('Ottilie Brandt', 'ottilie', ['inspector', 'lead']),
    office: await inShop('Petra Lindqvist', 'petra', ['office']),
    admin: await inShop('Jun Okabe', 'jun', ['admin']),
    auditor: await inShop('Ada Fennimore', 'ada', ['auditor']),
    foreman: await inShop('Silas Quarrington', 'silas', ['lead', 'inspector', 'office']),
  };
  const otherOwner = await person({
    name: 'Corin Vale',
    email: 'owner@larkspur.test',
    roles: ['lead', 'inspector', 'office', 'admin'],
    shopId: otherShopId,
  });

  const processor = async ({
    name,
    domain,
    contact,
    processes,
    validDays,
    rooms = [],
  }: {
    name: string;
    domain: string;
    contact: string;
    processes: readonly Process[];
    validDays: number;
    rooms?: readonly EquipmentFields[];
  }): Promise<DemoProcessor> => {
    const id = newId();
    const email = `desk@${domain}`;
    await owner.insert(processors).values({
      id,
      name,
      email,
      phone: '555 0112',
      address: ['Works Road', 'Tamarack Junction'],
      zone: 'America/Los_Angeles',
      createdAt: since,
    });
    const desk = await person({ name: contact, email, roles: ['processor'], processorId: id });
    for (const [shop, reference] of [
      [shopId, 'Q-114'],
      [otherShopId, 'AP-7'],
    ] as const) {
      await owner.insert(shopProcessors).values({
        shopId: shop,
        processorId: id,
        contactName: contact,
        contactEmail: email,
        createdAt: since,
      });
      await owner.insert(approvals).values({
        shopId: shop,
        processorId: id,
        reference: `${reference}-${id.slice(-3)}`,
        processes: [...processes],
        validFrom: dayOf(since),
        validTo: dayOf(addDays(today, validDays)),
        createdAt: since,
      });
      for (const room of rooms)
        await owner.insert(equipment).values({
          id: newId(),
          shopId: shop,
          processorId: id,
          ...equipmentColumns(room),
          createdAt: since,
        });
    }
    return { id, name, contact, personId: desk.id, processes };
  };

  return {
    shopId,
    otherShopId,
    people,
    otherOwner,
    processors: {
      thermal: await processor({
        name: 'Galena Thermal',
        domain: 'galena-thermal.test',
        contact: 'Runa Holt',
        processes: HEAT,
        validDays: 21,
        rooms: THERMAL_ROOMS,
      }),
      plating: await processor({
        name: 'Sallow & Finch Plating',
        domain: 'sallowfinch.test',
        contact: 'Imre Vasko',
        processes: FINISH,
        validDays: 240,
        rooms: PLATING_ROOMS,
      }),
      inspection: await processor({
        name: 'Dunlin Inspection',
        domain: 'dunlin.test',
        contact: 'Thea Marsh',
        processes: NDT,
        validDays: 320,
        rooms: INSPECTION_ROOMS,
      }),
      peening: await processor({
        name: 'Cobble Street Peening and Surface Works',
        domain: 'cobblestreet.test',
        contact: 'Joaquim Ferro',
        processes: ['shot_peen', 'phosphate'],
        validDays: 400,
      }),
    },
  };
}

export const addDays = (date: Date, days: number): Date => new Date(date.getTime() + days * 24 * 3600 * 1000);
export const dayOf = (date: Date): string => date.toISOString().slice(0, 10);
