import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  foreignKey,
  index,
  integer,
  pgEnum,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';

import { PLACES } from '@/lib/stock/places';

import { createdColumn, idColumn, moment, ownShopOnly, shopColumn } from './columns';
import { files } from './files';
import { shops } from './organisations';
import { parts } from './parts';

export const place = pgEnum('place', PLACES);

export const lots = pgTable(
  'lots',
  {
    id: idColumn(),
    shopId: shopColumn().references(() => shops.id),
    number: text('number').notNull(),
    partId: uuid('part_id').notNull(),
    /** The mill's heat or melt number. */
    heat: text('heat').notNull(),
    madeOn: moment('made_on').notNull(),
    serialised: boolean('serialised').notNull().default(false),
    millCertificateFileId: uuid('mill_certificate_file_id'),
    note: text('note'),
    version: integer('version').notNull().default(1),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('lots_shop').on(t.shopId, t.id),
    unique('lots_number').on(t.shopId, t.number),
    index('lots_number_search').on(t.shopId, t.number.op('text_pattern_ops')),
    index('lots_part').on(t.shopId, t.partId),
    foreignKey({ columns: [t.shopId, t.partId], foreignColumns: [parts.shopId, parts.id] }),
    foreignKey({ columns: [t.shopId, t.millCertificateFileId], foreignColumns: [files.shopId, files.id] }),
    ownShopOnly(),
  ],
);

/** Named pieces of a serialised lot. `place` and `holderId` are written by the ledger's trigger alone. */
export const pieces = pgTable(
  'pieces',
  {
    id: idColumn(),
    shopId: shopColumn(),
    lotId: uuid('lot_id').notNull(),
    serial: text('serial').notNull(),
    place: place('place'),
    holderId: uuid('holder_id'),
  },
  (t) => [
    unique('pieces_serial').on(t.lotId, t.serial),
    foreignKey({ columns: [t.shopId, t.lotId], foreignColumns: [lots.shopId, lots.id] }),
    ownShopOnly(),
  ],
);

/** The ledger: pieces of a lot went from one place to another. Rows are only ever added. */
export const movements = pgTable(
  'movements',
  {
    id: idColumn(),
    shopId: shopColumn(),
    lotId: uuid('lot_id').notNull(),
    pieces: integer('pieces').notNull(),
    /** Null only where pieces come into being. */
    fromPlace: place('from_place'),
    fromHolderId: uuid('from_holder_id'),
    toPlace: place('to_place').notNull(),
    toHolderId: uuid('to_holder_id').notNull(),
    /** The named pieces, where the lot is serialised. */
    pieceIds: uuid('piece_ids').array(),
    batchLineId: uuid('batch_line_id'),
    /** Why: `made`, `packed`, `dispatched`, `received` … */
    reason: text('reason').notNull(),
    note: text('note'),
    movedBy: text('moved_by').notNull(),
    movedAt: moment('moved_at').notNull(),
  },
  (t) => [
    check('pieces_positive', sql`${t.pieces} > 0`),
    check('from_is_whole', sql`(${t.fromPlace} is null) = (${t.fromHolderId} is null)`),
    check(
      'goes_somewhere',
      sql`${t.fromPlace} is null or (${t.fromPlace}, ${t.fromHolderId}) <> (${t.toPlace}, ${t.toHolderId})`,
    ),
    check('names_are_counted', sql`${t.pieceIds} is null or cardinality(${t.pieceIds}) = ${t.pieces}`),
    index('movements_lot').on(t.shopId, t.lotId, t.movedAt),
    index('movements_line').on(t.batchLineId),
    foreignKey({ columns: [t.shopId, t.lotId], foreignColumns: [lots.shopId, lots.id] }),
    ownShopOnly(),
  ],
);

/** Sums of the movements, kept by the ledger's trigger; the application may only read them. */
export const balances = pgTable(
  'balances',
  {
    shopId: shopColumn(),
    lotId: uuid('lot_id').notNull(),
    place: place('place').notNull(),
    holderId: uuid('holder_id').notNull(),
    pieces: integer('pieces').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.lotId, t.place, t.holderId] }),
    check('never_negative', sql`${t.pieces} >= 0`),
    index('balances_place')
      .on(t.shopId, t.place, t.holderId)
      .where(sql`pieces > 0`),
    foreignKey({ columns: [t.shopId, t.lotId], foreignColumns: [lots.shopId, lots.id] }),
    ownShopOnly(),
  ],
);

/** A shelf, bin or rack in the shop's stores. */
export const locations = pgTable(
  'locations',
  {
    id: idColumn(),
    shopId: shopColumn().references(() => shops.id),
    name: text('name').notNull(),
    closedAt: moment('closed_at'),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('locations_shop').on(t.shopId, t.id),
    unique('locations_name').on(t.shopId, t.name),
    ownShopOnly(),
  ],
);
