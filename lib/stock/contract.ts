import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Done, Id, Moment, PageQuery, pageOf, Pieces } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';
import { PROCESSES } from '@/lib/trade/process';

export const Location = z.object({ id: Id, name: z.string(), pieces: z.int(), closed: z.boolean() });
export type Location = z.output<typeof Location>;

/** The named pieces of a serialised lot; without them the first by serial are taken. */
const PieceIds = z.array(Id).max(1000).optional();
const Named = z.array(z.object({ id: Id, serial: z.string() }));

export const listLocations = declare({
  id: 'listLocations',
  method: 'get',
  path: '/stock/locations',
  summary: 'Shelves, bins and racks, with what lies in each',
  side: 'shop',
  permission: 'stock.read',
  input: z.object({}),
  response: z.object({ rows: z.array(Location) }),
});

export const addLocation = declare({
  id: 'addLocation',
  method: 'post',
  path: '/stock/locations',
  summary: 'Name a place in the stores',
  side: 'shop',
  permission: 'stock.release',
  input: z.object({
    name: z.string().trim().min(1, 'Give the place a name.').max(60, 'Write 60 characters or less.'),
  }),
  response: z.object({ id: Id }),
});

export const closeLocation = declare({
  id: 'closeLocation',
  method: 'post',
  path: '/stock/locations/{locationId}/close',
  summary: 'Close an empty place of the stores: nothing goes there any more',
  side: 'shop',
  permission: 'stock.release',
  input: z.object({ locationId: Id }),
  response: Done,
});

export const reopenLocation = declare({
  id: 'reopenLocation',
  method: 'post',
  path: '/stock/locations/{locationId}/reopen',
  summary: 'Open a closed place of the stores again',
  side: 'shop',
  permission: 'stock.release',
  input: z.object({ locationId: Id }),
  response: Done,
});

export const StockRow = z.object({
  lotId: Id,
  lotNumber: z.string(),
  heat: z.string(),
  partId: Id,
  partNumber: z.string(),
  partRevision: z.string(),
  partName: z.string(),
  condition: z.string(),
  locationId: Id,
  location: z.string(),
  pieces: z.int(),
});
export type StockRow = z.output<typeof StockRow>;

export const listStock = declare({
  id: 'listStock',
  method: 'get',
  path: '/stock',
  summary: 'Released pieces by part, lot and place',
  side: 'shop',
  permission: 'stock.read',
  input: PageQuery.extend({
    locationId: Id.optional(),
    /** Beginning of the part's, the lot's or the heat's number, or anywhere in the part's name. */
    text: z.string().trim().max(80).optional(),
  }),
  response: pageOf(StockRow),
});

export const StockSpot = z.object({
  pieces: z.int(),
  named: Named,
  /** Open assemblies that need the part, earliest need first, and how many more each of them takes. */
  needs: z.array(
    z.object({ assemblyId: Id, name: z.string(), neededOn: z.string().nullable(), open: z.int() }),
  ),
});
export type StockSpot = z.output<typeof StockSpot>;

export const getStockSpot = declare({
  id: 'getStockSpot',
  method: 'get',
  path: '/stock/lots/{lotId}/at/{locationId}',
  summary: 'Pieces of one lot in one place, and which assemblies need them',
  side: 'shop',
  permission: 'stock.read',
  input: z.object({ lotId: Id, locationId: Id }),
  response: StockSpot,
});

const Numbered = z.object({ id: Id, number: z.string() });

export const GateLine = z.object({
  lineId: Id,
  lineNo: z.int(),
  lotId: Id,
  lotNumber: z.string(),
  partNumber: z.string(),
  partRevision: z.string(),
  partName: z.string(),
  pieces: z.int(),
  released: z.int(),
  mayPass: z.int(),
  nextProcess: z.enum(PROCESSES).nullable(),
  missing: z.array(
    z.object({
      reason: z.enum(['nothing_back', 'not_proved', 'on_hold', 'not_paid', 'still_away']),
      pieces: z.int(),
      detail: z.array(z.string()),
    }),
  ),
  /** What the reasons are about: batches whose money is open, nonconformances that hold pieces. */
  unpaid: z.array(Numbered),
  holds: z.array(Numbered),
  /** In quarantine, where the lot's pieces have names. */
  named: Named,
  /** Where this part went the last time, else where anything went last. */
  usualLocationId: Id.nullable(),
});
export type GateLine = z.output<typeof GateLine>;

/** How many pieces of an assembly are fitted, or in stock and counted for it alone. */
const Readiness = z.object({ id: Id, name: z.string(), ready: z.int(), needed: z.int() });

export const getGate = declare({
  id: 'getGate',
  method: 'get',
  path: '/batches/{batchId}/gate',
  summary: 'What may be released of a batch now, and what is still missing',
  side: 'shop',
  permission: 'stock.read',
  input: z.object({ batchId: Id }),
  response: z.object({
    batchId: Id,
    number: z.string(),
    stage: z.enum(STAGES),
    processor: z.string(),
    dispatched: z.boolean(),
    lines: z.array(GateLine),
    locations: z.array(Location),
    assemblies: z.array(Readiness),
  }),
});

export const releasePieces = declare({
  id: 'releasePieces',
  method: 'post',
  path: '/batches/{batchId}/release',
  summary: 'Release proved pieces to a stock place, or on to their next outside step',
  side: 'shop',
  permission: 'stock.release',
  input: z.object({
    batchId: Id,
    lines: z
      .array(z.object({ lineId: Id, pieces: Pieces, locationId: Id.nullable(), pieceIds: PieceIds }))
      .min(1, 'Choose at least one line to release.')
      .max(500),
  }),
  /** `assemblies`: those that came nearer by it, with how they stand now. */
  response: z.object({
    releases: z.array(z.object({ id: Id, lineId: Id, pieces: z.int() })),
    assemblies: z.array(Readiness),
  }),
});

export const Release = z.object({
  id: Id,
  lotId: Id,
  lotNumber: z.string(),
  heat: z.string(),
  partNumber: z.string(),
  partRevision: z.string(),
  partName: z.string(),
  /** Alloy and thickness, as on the drawing. */
  material: z.string(),
  condition: z.string(),
  pieces: z.int(),
  location: z.string().nullable(),
  /** Where they go on to instead of a place in stock. */
  nextProcess: z.enum(PROCESSES).nullable(),
  batchNumber: z.string(),
  /** Names of the pieces, where the lot's pieces have names. */
  serials: z.array(z.string()),
  certificates: z.array(z.string()),
  provedOn: Day.nullable(),
  releasedBy: z.string(),
  releasedAt: Moment,
});
export type Release = z.output<typeof Release>;

export const listReleases = declare({
  id: 'listReleases',
  method: 'get',
  path: '/batches/{batchId}/releases',
  summary: 'What was released of a batch: one label each',
  side: 'shop',
  permission: 'stock.read',
  input: z.object({ batchId: Id }),
  response: z.object({ rows: z.array(Release) }),
});

export const fitPieces = declare({
  id: 'fitPieces',
  method: 'post',
  path: '/stock/fit',
  summary: 'Issue pieces from a stock place to an assembly',
  side: 'shop',
  permission: 'stock.fit',
  input: z.object({ lotId: Id, locationId: Id, assemblyId: Id, pieces: Pieces, pieceIds: PieceIds }),
  response: Done,
});

export const takeOutPieces = declare({
  id: 'takeOutPieces',
  method: 'post',
  path: '/stock/take-out',
  summary: 'Take pieces out of an open assembly, back to a stock place',
  side: 'shop',
  permission: 'stock.fit',
  input: z.object({ lotId: Id, assemblyId: Id, locationId: Id, pieces: Pieces, pieceIds: PieceIds }),
  response: Done,
});

export const moveStock = declare({
  id: 'moveStock',
  method: 'post',
  path: '/stock/move',
  summary: 'Move pieces from one stock place to another',
  side: 'shop',
  permission: 'stock.release',
  input: z.object({ lotId: Id, fromLocationId: Id, toLocationId: Id, pieces: Pieces, pieceIds: PieceIds }),
  response: Done,
});
