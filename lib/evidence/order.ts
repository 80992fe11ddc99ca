import { z } from 'zod';

/** A day of the calendar, `YYYY-MM-DD`. */
export const Day = z.iso.date();

const Range = z.object({ min: z.number().nullish(), max: z.number().nullish() });
const Setting = z.object({ set_f: z.number(), tolerance_f: z.number() });

/** What was ordered, each part absent where nothing was asked. One that is not known here is kept, and is a note. */
export const Requirements = z.looseObject({
  alloy: z.string().optional(),
  temper_in: z.string().optional(),
  temper_out: z.string().optional(),
  solution: Setting.extend({
    soak_min_minutes: z.number().optional(),
    soak_max_minutes: z.number().optional(),
  }).optional(),
  quench: z
    .object({
      medium: z.string().optional(),
      max_medium_temp_f: z.number().optional(),
      max_delay_seconds: z.number().optional(),
    })
    .optional(),
  age: z
    .object({
      kind: z.enum(['natural', 'artificial']),
      min_hours: z.number().optional(),
      max_hours: z.number().optional(),
      set_f: z.number().optional(),
      tolerance_f: z.number().optional(),
    })
    .optional(),
  hardness: Range.extend({ scale: z.string() }).optional(),
  conductivity_pct_iacs: Range.optional(),
  thickness: Range.extend({ unit: z.string() }).optional(),
  bake: Setting.partial().extend({
    min_hours: z.number().optional(),
    max_hours_after_plating: z.number().optional(),
  }).optional(),
});
export type Requirements = z.output<typeof Requirements>;

export const OrderLine = z.looseObject({
  line: z.int(),
  part_number: z.string(),
  rev: z.string().nullish(),
  description: z.string().nullish(),
  qty: z.int(),
  material: z.string().nullish(),
  lot: z.string().nullish(),
  thickness_in: z.number().nullish(),
  serials: z.array(z.string()).nullish(),
});
export type OrderLine = z.output<typeof OrderLine>;

/** What was sent out to a processor, as a document from it is compared with. */
export const Order = z.looseObject({
  batch: z.string(),
  po: z.string(),
  processor: z.looseObject({ name: z.string(), address: z.array(z.string()).nullish() }),
  process: z.string(),
  dispatched: Day.nullish(),
  due: Day.nullish(),
  spec: z.string().nullish(),
  spec_rev: z.string().nullish(),
  class_type: z.string().nullish(),
  requirements: Requirements.default({}),
  lines: z.array(OrderLine),
  price: z
    .looseObject({
      currency: z.string(),
      unit_price: z.number().nullish(),
      lot_minimum: z.number().nullish(),
      certification_fee: z.number().nullish(),
      qty_total: z.int().nullish(),
    })
    .nullish(),
});
export type Order = z.output<typeof Order>;

export const Orders = z.object({ orders: z.array(Order) });
