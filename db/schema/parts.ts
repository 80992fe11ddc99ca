import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  date,
  foreignKey,
  index,
  integer,
  jsonb,
  pgEnum,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';

import { PROCESSES, PRODUCT_FORMS } from '@/lib/trade/process';
import type { OrderingAnswers } from '@/lib/parts/ordering-answers';
import type { ToProve } from '@/lib/parts/to-prove';

import { createdColumn, idColumn, measure, moment, ownShopOnly, shopColumn } from './columns';
import { files } from './files';
import { shops } from './organisations';

export const productForm = pgEnum('product_form', PRODUCT_FORMS);
export const process = pgEnum('process', PROCESSES);

/** One revision of a drawing. Measures are SI; beside each stands what was typed (`0.040 in`). */
export const parts = pgTable(
  'parts',
  {
    id: idColumn(),
    shopId: shopColumn().references(() => shops.id),
    number: text('number').notNull(),
    revision: text('revision').notNull(),
    name: text('name').notNull(),
    alloy: text('alloy').notNull(),
    form: productForm('form').notNull(),
    clad: boolean('clad').notNull().default(false),
    thicknessMm: measure('thickness_mm'),
    thicknessEntered: text('thickness_entered'),
    madeCondition: text('made_condition').notNull(),
    endCondition: text('end_condition').notNull(),
    lengthMm: measure('length_mm'),
    lengthEntered: text('length_entered'),
    widthMm: measure('width_mm'),
    widthEntered: text('width_entered'),
    heightMm: measure('height_mm'),
    heightEntered: text('height_entered'),
    massG: measure('mass_g'),
    massEntered: text('mass_entered'),
    areaMm2: measure('area_mm2'),
    areaEntered: text('area_entered'),
    serialised: boolean('serialised').notNull().default(false),
    drawingFileId: uuid('drawing_file_id'),
    note: text('note'),
    /** Set when a later revision took its place. */
    supersededAt: moment('superseded_at'),
    version: integer('version').notNull().default(1),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('parts_shop').on(t.shopId, t.id),
    unique('parts_number_revision').on(t.shopId, t.number, t.revision),
    index('parts_number_search').on(t.shopId, t.number.op('text_pattern_ops')),
    foreignKey({ columns: [t.shopId, t.drawingFileId], foreignColumns: [files.shopId, files.id] }),
    ownShopOnly(),
  ],
);

/** One outside step of a part's route, in order. */
export const routeSteps = pgTable(
  'route_steps',
  {
    id: idColumn(),
    shopId: shopColumn(),
    partId: uuid('part_id').notNull(),
    seq: integer('seq').notNull(),
    process: process('process').notNull(),
    specification: text('specification').notNull(),
    specificationRevision: text('specification_revision'),
    classType: text('class_type'),
    conditionBefore: text('condition_before'),
    targetCondition: text('target_condition'),
    toProve: jsonb('to_prove').$type<ToProve[]>().notNull().default([]),
    /** What the order states beside the columns here. */
    ordering: jsonb('ordering').$type<OrderingAnswers>().notNull().default({}),
    note: text('note'),
  },
  (t) => [
    unique('route_steps_shop').on(t.shopId, t.id),
    unique('route_steps_order').on(t.partId, t.seq),
    foreignKey({ columns: [t.shopId, t.partId], foreignColumns: [parts.shopId, parts.id] }),
    ownShopOnly(),
  ],
);

export const assemblies = pgTable(
  'assemblies',
  {
    id: idColumn(),
    shopId: shopColumn().references(() => shops.id),
    name: text('name').notNull(),
    neededOn: date('needed_on'),
    note: text('note'),
    closedAt: moment('closed_at'),
    version: integer('version').notNull().default(1),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('assemblies_shop').on(t.shopId, t.id),
    unique('assemblies_name').on(t.shopId, t.name),
    ownShopOnly(),
  ],
);

export const assemblyNeeds = pgTable(
  'assembly_needs',
  {
    id: idColumn(),
    shopId: shopColumn(),
    assemblyId: uuid('assembly_id').notNull(),
    /** The part in any revision; which revision fits is the drawing's business. */
    partNumber: text('part_number').notNull(),
    pieces: integer('pieces').notNull(),
  },
  (t) => [
    unique('assembly_needs_once').on(t.assemblyId, t.partNumber),
    foreignKey({ columns: [t.shopId, t.assemblyId], foreignColumns: [assemblies.shopId, assemblies.id] }),
    check('pieces_positive', sql`${t.pieces} > 0`),
    index('assembly_needs_part').on(t.shopId, t.partNumber),
    ownShopOnly(),
  ],
);
