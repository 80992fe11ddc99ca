import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Id, Moment, PageQuery, Pieces, pageOf } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';
import { FileRef, PiecesAt } from '@/lib/parts/contract';
import { PROCESSES, PRODUCT_FORMS } from '@/lib/trade/process';
import { PLACES } from '@/lib/stock/places';

import { MOST_ROWS, RawRow } from './import-row';

/** Where pieces can be looked for in the list of lots. */
export const WHEREABOUTS = ['waiting', 'away', 'care', 'stock'] as const;
export type Whereabouts = (typeof WHEREABOUTS)[number];

const Heat = z
  .string('The heat is missing.')
  .trim()
  .min(1, 'The heat is missing. It stands on the mill certificate.')
  .max(60, 'The heat is longer than 60 letters.');
const Note = z.string().trim().max(2000, 'Keep the note under 2000 letters.').default('');
const Serial = z.string().trim().min(1, 'A serial is empty.').max(60, 'A serial is longer than 60 letters.');

export const LotInput = z.object({
  partId: z.uuid('Choose the part.'),
  /** Empty: the shop's next number. */
  number: z.string().trim().max(40, 'The lot number is longer than 40 letters.').default(''),
  heat: Heat,
  /** Empty: today. */
  madeOn: z.union([Day, z.literal('')]).default(''),
  pieces: Pieces.nullable().default(null),
  /** The name of each piece, where the part's pieces are numbered. */
  serials: z.array(Serial).max(5000, 'Make it more than one lot: 5,000 named pieces at most.').default([]),
  millCertificateFileId: Id.nullable().default(null),
  note: Note,
});
export type LotInput = z.output<typeof LotInput>;

const LotRef = z.object({ id: Id, number: z.string(), version: z.int() });
const PartOfLot = z.object({ id: Id, number: z.string(), revision: z.string(), name: z.string() });

export const LotRow = z.object({
  id: Id,
  number: z.string(),
  part: PartOfLot,
  alloy: z.string(),
  heat: z.string(),
  serialised: z.boolean(),
  madeOn: Moment,
  made: z.int(),
  places: z.array(PiecesAt),
  /** The step its waiting pieces wait for; the first, where they wait for two. */
  waitsFor: z.enum(PROCESSES).nullable(),
  hasMillCertificate: z.boolean(),
});
export type LotRow = z.output<typeof LotRow>;

/** What holds pieces in a place: a step they wait for, a line of a batch, a nonconformance, a location, an assembly. */
export const Holder = z.object({
  kind: z.enum(['step', 'batch', 'nonconformance', 'location', 'assembly']),
  id: Id,
  says: z.string(),
  /** The number of the step on the route. */
  seq: z.int().nullable(),
  stage: z.enum(STAGES).nullable(),
});
export type Holder = z.output<typeof Holder>;

export const Spot = z.object({ place: z.enum(PLACES), holder: Holder.nullable() });
export type Spot = z.output<typeof Spot>;

export const Lot = z.object({
  id: Id,
  number: z.string(),
  version: z.int(),
  part: PartOfLot.extend({
    alloy: z.string(),
    form: z.enum(PRODUCT_FORMS),
    clad: z.boolean(),
    thickness: z.string().nullable(),
    madeCondition: z.string(),
    endCondition: z.string(),
    supersededAt: Moment.nullable(),
  }),
  heat: z.string(),
  madeOn: Moment,
  serialised: z.boolean(),
  note: z.string().nullable(),
  createdAt: Moment,
  made: z.int(),
  millCertificate: FileRef.nullable(),
  route: z.array(
    z.object({
      id: Id,
      seq: z.int(),
      process: z.enum(PROCESSES),
      specification: z.string(),
      specificationRevision: z.string().nullable(),
      targetCondition: z.string().nullable(),
    }),
  ),
  whereabouts: z.array(Spot.extend({ pieces: z.int() })),
  batches: z.array(
    z.object({
      id: Id,
      number: z.string(),
      stage: z.enum(STAGES),
      processor: z.string(),
      process: z.enum(PROCESSES),
      pieces: z.int(),
      dispatchedAt: Moment.nullable(),
      promisedOn: z.string().nullable(),
    }),
  ),
  /** Of a serialised lot: each piece by name and where it is. */
  named: z.array(
    z.object({ serial: z.string(), place: z.enum(PLACES).nullable(), holder: Holder.nullable() }),
  ),
});
export type Lot = z.output<typeof Lot>;

export const MovementRow = z.object({
  id: Id,
  at: Moment,
  by: z.string(),
  pieces: z.int(),
  from: Spot.nullable(),
  to: Spot,
  reason: z.string(),
  note: z.string().nullable(),
  serials: z.array(z.string()),
});
export type MovementRow = z.output<typeof MovementRow>;

export const listLots = declare({
  id: 'listLots',
  method: 'get',
  path: '/lots',
  summary: 'Lots, newest first',
  side: 'shop',
  permission: 'lot.read',
  input: PageQuery.extend({
    /** Beginning of the lot's, the part's or the heat's number. */
    text: z.string().trim().max(80).optional(),
    where: z.enum(WHEREABOUTS).optional(),
    partId: Id.optional(),
  }),
  response: pageOf(LotRow),
});

export const getLot = declare({
  id: 'getLot',
  method: 'get',
  path: '/lots/{lotId}',
  summary: 'One lot and where every piece of it is',
  side: 'shop',
  permission: 'lot.read',
  input: z.object({ lotId: Id }),
  response: Lot,
});

export const listMovements = declare({
  id: 'listMovements',
  method: 'get',
  path: '/lots/{lotId}/movements',
  summary: 'The ledger of one lot, newest first',
  side: 'shop',
  permission: 'lot.read',
  input: PageQuery.extend({ lotId: Id }),
  response: pageOf(MovementRow),
});

export const createLot = declare({
  id: 'createLot',
  method: 'post',
  path: '/lots',
  summary: 'Add a lot; its pieces wait for the first step of the route',
  side: 'shop',
  permission: 'lot.create',
  input: LotInput,
  response: LotRef,
});

export const editLot = declare({
  id: 'editLot',
  method: 'put',
  path: '/lots/{lotId}',
  summary: 'Correct the heat or the note of a lot, or give it its mill certificate',
  side: 'shop',
  permission: 'lot.create',
  input: z.object({
    lotId: Id,
    version: z.int(),
    heat: Heat,
    note: Note,
    millCertificateFileId: Id.nullable(),
  }),
  response: LotRef,
});

const Rows = z.object({
  rows: z
    .array(RawRow)
    .min(1, 'The file has no rows.')
    .max(MOST_ROWS, `Import ${MOST_ROWS} rows at most at once. Split the file.`),
});

export const checkLotImport = declare({
  id: 'checkLotImport',
  method: 'post',
  path: '/lots/import/check',
  summary: 'What is wrong with each row of an import; changes nothing',
  side: 'shop',
  permission: 'lot.create',
  input: Rows,
  response: z.object({
    isClean: z.boolean(),
    rows: z.array(
      z.object({
        problems: z.array(z.object({ field: z.string(), message: z.string() })),
        part: PartOfLot.nullable(),
      }),
    ),
  }),
});

export const importLots = declare({
  id: 'importLots',
  method: 'post',
  path: '/lots/import',
  summary: 'Add all lots of a clean import, or none',
  side: 'shop',
  permission: 'lot.create',
  input: Rows,
  response: z.object({ lots: z.array(LotRef), pieces: z.int() }),
});
