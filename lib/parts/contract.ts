import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment, PageQuery, pageOf } from '@/lib/api/shapes';
import { PLACES } from '@/lib/stock/places';

import { readMeasure, type Quantity } from './measure';
import { PROCESSES, PRODUCT_FORMS } from '@/lib/trade/process';
import { OrderingAnswers } from './ordering-answers';
import { ToProve } from './to-prove';

const must = (name: string, longest: number) =>
  z
    .string(`${name} is missing.`)
    .trim()
    .min(1, `${name} is missing.`)
    .max(longest, `${name} is longer than ${longest} letters.`);
const may = (name: string, longest: number) =>
  z.string().trim().max(longest, `${name} is longer than ${longest} letters.`).default('');

/** Kept as it was typed, with its unit; empty where it is not given. */
const measure = (quantity: Quantity, name: string) =>
  may(name, 40).superRefine((typed, issues) => {
    const read = typed === '' ? null : readMeasure(typed, quantity, name);
    if (read && !read.ok) issues.addIssue({ code: 'custom', message: read.message });
  });

export const StepInput = z.object({
  /** The step that is changed; without it a new one. */
  id: Id.optional(),
  process: z.enum(PROCESSES, 'Choose the process.'),
  specification: must('The specification', 80),
  specificationRevision: may('The revision', 24),
  classType: may('Class, type, grade', 120),
  conditionBefore: may('The condition before', 24),
  targetCondition: may('The condition after', 24),
  toProve: z.array(ToProve).max(30, 'Keep it to 30 things to prove.').default([]),
  /** What the order states beside the fields here, by item of the ordering information. */
  ordering: OrderingAnswers.default({}),
  note: may('The note', 500),
});
export type StepInput = z.output<typeof StepInput>;

export const PartInput = z.object({
  number: must('The drawing number', 60),
  revision: must('The revision', 12),
  name: must('The name', 160),
  alloy: must('The alloy', 80),
  form: z.enum(PRODUCT_FORMS, 'Choose the product form.'),
  clad: z.boolean().default(false),
  thickness: measure('length', 'Thickness'),
  madeCondition: must('The condition it is made in', 24),
  endCondition: must('The condition it must end in', 24),
  length: measure('length', 'Length'),
  width: measure('length', 'Width'),
  height: measure('length', 'Height'),
  mass: measure('mass', 'Mass'),
  area: measure('area', 'Area'),
  serialised: z.boolean().default(false),
  note: may('The note', 2000),
  drawingFileId: Id.nullable().default(null),
  route: z.array(StepInput).max(20, 'Keep the route to 20 steps.').default([]),
});
export type PartInput = z.output<typeof PartInput>;

export const PiecesAt = z.object({ place: z.enum(PLACES), pieces: z.int() });
export type PiecesAt = z.output<typeof PiecesAt>;

export const PartRow = z.object({
  id: Id,
  number: z.string(),
  revision: z.string(),
  name: z.string(),
  alloy: z.string(),
  form: z.enum(PRODUCT_FORMS),
  clad: z.boolean(),
  thickness: z.string().nullable(),
  madeCondition: z.string(),
  endCondition: z.string(),
  serialised: z.boolean(),
  supersededAt: Moment.nullable(),
  processes: z.array(z.enum(PROCESSES)),
  lots: z.int(),
  places: z.array(PiecesAt),
});
export type PartRow = z.output<typeof PartRow>;

const Measure = z.object({ entered: z.string(), value: z.number() }).nullable();

export const RouteStep = z.object({
  id: Id,
  seq: z.int(),
  process: z.enum(PROCESSES),
  specification: z.string(),
  specificationRevision: z.string().nullable(),
  classType: z.string().nullable(),
  conditionBefore: z.string().nullable(),
  targetCondition: z.string().nullable(),
  toProve: z.array(ToProve),
  ordering: OrderingAnswers,
  note: z.string().nullable(),
  /** Pieces that wait for it now. */
  waiting: z.int(),
  /** Lots have waited for it: it can be changed, but not taken out. */
  used: z.boolean(),
});
export type RouteStep = z.output<typeof RouteStep>;

export const FileRef = z.object({
  id: Id,
  name: z.string(),
  size: z.int(),
  mediaType: z.string(),
  sha256: z.string().nullable(),
});

export const Part = z.object({
  id: Id,
  version: z.int(),
  number: z.string(),
  revision: z.string(),
  name: z.string(),
  alloy: z.string(),
  form: z.enum(PRODUCT_FORMS),
  clad: z.boolean(),
  thickness: Measure,
  madeCondition: z.string(),
  endCondition: z.string(),
  length: Measure,
  width: Measure,
  height: Measure,
  mass: Measure,
  area: Measure,
  /** Of one piece, g and mm², where sizes and stock form say a plain shape: the most it can be. */
  computed: z
    .object({ massG: z.number(), areaMm2: z.number(), rule: z.string(), density: z.string() })
    .nullable(),
  serialised: z.boolean(),
  note: z.string().nullable(),
  supersededAt: Moment.nullable(),
  createdAt: Moment,
  drawing: FileRef.nullable(),
  route: z.array(RouteStep),
  revisions: z.array(
    z.object({
      id: Id,
      revision: z.string(),
      supersededAt: Moment.nullable(),
      createdAt: Moment,
      lots: z.int(),
    }),
  ),
  /** Newest first, at most 50; the list of lots has all. */
  lots: z.array(
    z.object({
      id: Id,
      number: z.string(),
      heat: z.string(),
      madeOn: Moment,
      made: z.int(),
      places: z.array(PiecesAt),
    }),
  ),
  lotCount: z.int(),
  neededFor: z.array(
    z.object({ assemblyId: Id, assembly: z.string(), neededOn: z.string().nullable(), pieces: z.int() }),
  ),
});
export type Part = z.output<typeof Part>;

const PartRef = z.object({ id: Id, version: z.int() });

export const listParts = declare({
  id: 'listParts',
  method: 'get',
  path: '/parts',
  summary: 'Parts by drawing number',
  side: 'shop',
  permission: 'part.read',
  input: PageQuery.extend({
    /** Beginning of the number, or any part of the name or alloy. */
    text: z.string().trim().max(80).optional(),
    superseded: z.enum(['0', '1']).default('0'),
  }),
  response: pageOf(PartRow),
});

export const getPart = declare({
  id: 'getPart',
  method: 'get',
  path: '/parts/{partId}',
  summary: 'One revision of a part, its route and where its pieces are',
  side: 'shop',
  permission: 'part.read',
  input: z.object({ partId: Id }),
  response: Part,
});

export const createPart = declare({
  id: 'createPart',
  method: 'post',
  path: '/parts',
  summary: 'Add a part with its route',
  side: 'shop',
  permission: 'part.edit',
  input: PartInput,
  response: PartRef,
});

export const editPart = declare({
  id: 'editPart',
  method: 'put',
  path: '/parts/{partId}',
  summary: 'Change a part; its number and revision only while it has no lots',
  side: 'shop',
  permission: 'part.edit',
  input: PartInput.extend({ partId: Id, version: z.int() }),
  response: PartRef,
});

export const revisePart = declare({
  id: 'revisePart',
  method: 'post',
  path: '/parts/{partId}/revisions',
  summary: 'Add the next revision; the one before is superseded and keeps its lots',
  side: 'shop',
  permission: 'part.edit',
  input: PartInput.extend({ partId: Id }),
  response: PartRef,
});
