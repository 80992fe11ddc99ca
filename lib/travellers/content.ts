import { z } from 'zod';

import { FrozenLine } from '@/lib/batches/frozen-line';
import { TableReferenceShape } from '@/lib/reference/table-reference';
import { PROCESSES } from '@/lib/trade/process';

/** Sheet sizes of the papers. */
export const PAPERS = ['letter', 'a4'] as const;
export type Paper = (typeof PAPERS)[number];

const Party = z.object({ name: z.string(), address: z.array(z.string()), phone: z.string().nullable() });

const ContentLine = FrozenLine.omit({ ordering: true }).extend({
  lineNo: z.int(),
  pieces: z.int(),
  loadNo: z.int().nullable(),
});

const ContentRequirement = z.object({
  /** The lines it holds for; none named: all. */
  lines: z.array(z.int()),
  characteristic: z.string(),
  limit: z.string(),
  unit: z.string(),
  source: z.string(),
});

/** What the order states beside limits: `colour: clear`. */
const StatedForLines = z.object({
  /** The lines it holds for; none named: all. */
  lines: z.array(z.int()),
  item: z.string(),
  says: z.string(),
});
export type StatedForLines = z.infer<typeof StatedForLines>;

/** One furnace load: what it is run at, row by row, in words. */
const TravellerLoad = z.object({
  number: z.int(),
  lines: z.array(z.int()),
  pieces: z.int(),
  rows: z.array(z.object({ name: z.string(), says: z.string(), rest: z.string() })),
});
export type TravellerLoad = z.infer<typeof TravellerLoad>;

const TravellerLoads = z.object({
  /** Set line by line; else as planned. */
  areSet: z.boolean(),
  loads: z.array(TravellerLoad),
  /** Why loads may not be joined. */
  apart: z.array(z.string()),
  /** Tables that the figures were read from. */
  sources: z.array(z.string()),
});
export type TravellerLoads = z.infer<typeof TravellerLoads>;

/** How many pieces of a line are looked at. */
const SampleOfLines = z.object({
  lineNo: z.int(),
  inspect: z.int(),
  pieces: z.int(),
  says: z.string(),
  plan: z.string(),
});
export type SampleOfLines = z.infer<typeof SampleOfLines>;

/**
 * All that a batch's papers show, kept as it was stated: what is made from it again is the same to the byte. Later
 * layouts read older contents, so fields are only ever added, with a default.
 */
const Stated = z.object({
  documentVersion: z.int(),
  paper: z.enum(PAPERS),
  number: z.string(),
  orderNumber: z.string(),
  /** Where days and times are told. */
  zone: z.string(),
  statedAt: z.iso.datetime(),
  statedBy: z.string(),
  dispatchedAt: z.iso.datetime().nullable(),
  wantedBackOn: z.string().nullable(),
  shop: Party,
  processor: Party,
  process: z.enum(PROCESSES),
  specification: z.string(),
  note: z.string().nullable(),
  /** Contents from before this was asked have none. */
  orderStates: z.array(StatedForLines).optional(),
  /** What is different from the version before, in words. */
  changes: z.array(z.string()),
});

export const TravellerContent = Stated.extend({
  kind: z.literal('traveller'),
  lines: z.array(ContentLine),
  requirements: z.array(ContentRequirement),
  cautions: z.array(z.string()),
  /** Contents from before loads were planned have none; a process without a furnace has null. */
  furnaceLoads: TravellerLoads.nullish(),
  samples: z.array(SampleOfLines).optional(),
  /** The tables and editions that its cautions, loads, samples, proposed requirements and overridden checks were read from. */
  tables: z.array(TableReferenceShape).optional(),
  /** Blockers that were let pass, with who did and why. */
  overrides: z.array(
    z.object({ what: z.string(), reason: z.string(), by: z.string(), at: z.iso.datetime() }),
  ),
  /** The link that its code opens, and where links begin. The key itself is not kept. Null on a draft. */
  link: z.object({ base: z.string(), linkId: z.string() }).nullable(),
});
export type TravellerContent = z.infer<typeof TravellerContent>;

export const OrderContent = Stated.extend({
  kind: z.literal('purchase_order'),
  currency: z.string(),
  lotMinimumMinor: z.int(),
  certificationFeeMinor: z.int(),
  lines: z.array(
    ContentLine.pick({
      lineNo: true,
      pieces: true,
      partNumber: true,
      partRevision: true,
      partName: true,
      lotNumber: true,
      conditionBefore: true,
      targetCondition: true,
    }).extend({ unitPriceMinor: z.int() }),
  ),
  requirements: z.array(ContentRequirement),
});
export type OrderContent = z.infer<typeof OrderContent>;

export const PaperContent = z.discriminatedUnion('kind', [TravellerContent, OrderContent]);
export type PaperContent = z.infer<typeof PaperContent>;

/** Shops that count in dollars print on Letter, all others on A4. */
export const paperOf = (currency: string): Paper =>
  currency === 'USD' || currency === 'CAD' ? 'letter' : 'a4';
