import { z } from 'zod';

import { ChannelRole } from './judged-chart';
import { TemperatureUnit } from './requirement';

export const DATE_ORDERS = ['DMY', 'MDY', 'YMD'] as const;
export const DateOrder = z.enum(DATE_ORDERS);
export type DateOrder = z.output<typeof DateOrder>;

export const ElapsedUnit = z.enum(['ms', 's', 'min', 'h']);
export type ElapsedUnit = z.output<typeof ElapsedUnit>;

/** What a person says about an export instead of what was guessed. Columns count from 0, all columns of the file. */
export const ChartCorrections = z.object({
  delimiter: z.enum([',', ';', '\t', '|', ' ']).optional(),
  decimal: z.enum(['.', ',']).optional(),
  /** The column with the time, or with date and time. */
  timeColumn: z.int().min(0).optional(),
  /** The column with the day, where it is another one. */
  dateColumn: z.int().min(0).optional(),
  dateOrder: DateOrder.optional(),
  /** Whether the times count from the start of the run. */
  elapsed: z.boolean().optional(),
  /** Of a column that counts in numbers. */
  elapsedUnit: ElapsedUnit.optional(),
  /** When the run began, `YYYY-MM-DDTHH:mm:ss`, for elapsed time; only its day is used for times of the day. */
  startedAt: z.iso.datetime({ local: true }).optional(),
  unit: TemperatureUnit.optional(),
  channels: z
    .array(
      z.object({
        column: z.int().min(0),
        name: z.string().optional(),
        role: ChannelRole.optional(),
        /** True excludes it, false counts it although it looked broken. */
        excluded: z.boolean().optional(),
      }),
    )
    .optional(),
});
export type ChartCorrections = z.output<typeof ChartCorrections>;
