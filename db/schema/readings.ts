import {
  foreignKey,
  index,
  integer,
  jsonb,
  pgEnum,
  pgTable,
  real,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';

import { READING_KINDS, READING_STATES } from '@/lib/readings/reading-state';

import { batches } from './batches';
import { createdColumn, idColumn, moment, ownShopOnly, shopColumn } from './columns';
import { files } from './files';

export const readingKind = pgEnum('reading_kind', READING_KINDS);
export const readingState = pgEnum('reading_state', READING_STATES);

/** What the machine read in a file: facts with their places, or why it could not. It proposes; nothing rests on it. */
export const readings = pgTable(
  'readings',
  {
    id: idColumn(),
    shopId: shopColumn(),
    fileId: uuid('file_id').notNull(),
    kind: readingKind('kind').notNull(),
    state: readingState('state').notNull().default('waiting'),
    /** Why it could not be read: a code for programs, a sentence for people. */
    faultCode: text('fault_code'),
    fault: text('fault'),
    /** The facts, in the shape that its kind has in `lib/evidence`. */
    content: jsonb('content'),
    /** The pages with their words, for choosing them on the page. */
    pages: jsonb('pages'),
    /** Which edition of the reader read it. */
    reader: integer('reader'),
    seconds: real('seconds'),
    createdAt: createdColumn(),
    readAt: moment('read_at'),
  },
  (t) => [
    unique('readings_shop').on(t.shopId, t.id),
    unique('readings_file').on(t.fileId),
    index('readings_state').on(t.shopId, t.state),
    foreignKey({ columns: [t.shopId, t.fileId], foreignColumns: [files.shopId, files.id] }),
    ownShopOnly(),
  ],
);

/** What a person put in place of what the machine read. Both are kept. */
export const readingCorrections = pgTable(
  'reading_corrections',
  {
    id: idColumn(),
    shopId: shopColumn(),
    readingId: uuid('reading_id').notNull(),
    /** As in the facts of the reading: `certificate_number`, `lines[0].qty_accepted`. */
    field: text('field').notNull(),
    read: text('read'),
    corrected: text('corrected').notNull(),
    correctedBy: text('corrected_by').notNull(),
    correctedAt: moment('corrected_at').notNull(),
  },
  (t) => [
    index('reading_corrections_reading').on(t.readingId),
    foreignKey({ columns: [t.shopId, t.readingId], foreignColumns: [readings.shopId, readings.id] }),
    ownShopOnly(),
  ],
);

/** A paper that came without saying which batch it is of, until a person has said so or set it aside. */
export const intake = pgTable(
  'intake',
  {
    id: idColumn(),
    shopId: shopColumn(),
    fileId: uuid('file_id').notNull(),
    addedBy: text('added_by').notNull(),
    createdAt: createdColumn(),
    /** Where it went. */
    batchId: uuid('batch_id'),
    setAsideReason: text('set_aside_reason'),
    settledBy: text('settled_by'),
    settledAt: moment('settled_at'),
  },
  (t) => [
    unique('intake_file').on(t.fileId),
    index('intake_open').on(t.shopId, t.settledAt),
    foreignKey({ columns: [t.shopId, t.fileId], foreignColumns: [files.shopId, files.id] }),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    ownShopOnly(),
  ],
);
