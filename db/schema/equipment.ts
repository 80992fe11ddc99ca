import { sql } from 'drizzle-orm';
import {
  check,
  foreignKey,
  index,
  integer,
  pgEnum,
  pgTable,
  text,
  unique,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';

import { EQUIPMENT_KINDS } from '@/lib/equipment/equipment-kind';

import { createdColumn, idColumn, measure, moment, ownShopOnly, shopColumn } from './columns';
import { shopProcessors } from './organisations';

export const equipmentKind = pgEnum('equipment_kind', EQUIPMENT_KINDS);

/** What one shop knows of a furnace, oven or tank of its processor: the room inside, what it carries, how hot it gets. */
export const equipment = pgTable(
  'equipment',
  {
    id: idColumn(),
    shopId: shopColumn(),
    processorId: uuid('processor_id').notNull(),
    kind: equipmentKind('kind').notNull(),
    name: text('name').notNull(),
    /** Inside, in mm, and as it was typed. */
    lengthMm: measure('length_mm').notNull(),
    lengthEntered: text('length_entered').notNull(),
    widthMm: measure('width_mm').notNull(),
    widthEntered: text('width_entered').notNull(),
    heightMm: measure('height_mm').notNull(),
    heightEntered: text('height_entered').notNull(),
    /** What hearth, rack or hoist carries. */
    limitG: measure('limit_g'),
    limitEntered: text('limit_entered'),
    temperatureCMin: measure('temperature_c_min'),
    temperatureMinEntered: text('temperature_min_entered'),
    temperatureCMax: measure('temperature_c_max'),
    temperatureMaxEntered: text('temperature_max_entered'),
    /** Uniformity class of its survey. */
    furnaceClass: integer('furnace_class'),
    retiredAt: moment('retired_at'),
    version: integer('version').notNull().default(1),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('equipment_shop').on(t.shopId, t.id),
    uniqueIndex('equipment_name')
      .on(t.shopId, t.processorId, t.name)
      .where(sql`retired_at is null`),
    index('equipment_processor').on(t.shopId, t.processorId),
    check('size_positive', sql`${t.lengthMm} > 0 and ${t.widthMm} > 0 and ${t.heightMm} > 0`),
    check('limit_positive', sql`${t.limitG} > 0`),
    check('temperatures_in_order', sql`${t.temperatureCMin} <= ${t.temperatureCMax}`),
    check('class_known', sql`${t.furnaceClass} between 1 and 6`),
    foreignKey({
      columns: [t.shopId, t.processorId],
      foreignColumns: [shopProcessors.shopId, shopProcessors.processorId],
    }),
    ownShopOnly(),
  ],
);
