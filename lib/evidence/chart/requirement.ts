import { z } from 'zod';

/** °F or °C, as the contract writes them. */
export const TemperatureUnit = z.enum(['F', 'C']);
export type TemperatureUnit = z.output<typeof TemperatureUnit>;

/** What a chart must show. Temperatures are in `unit`; each limit that is absent was not asked. */
export const ChartRequirement = z.object({
  set: z.number(),
  /** Plus and minus, over 0. */
  tolerance: z.number().positive(),
  unit: TemperatureUnit,
  soakMinutes: z.number().nonnegative().optional(),
  soakMinutesMax: z.number().positive().optional(),
  maxQuenchDelayS: z.number().positive().optional(),
  /** Degrees over the upper limit that are allowed; without it none. */
  maxOvershoot: z.number().nonnegative().optional(),
});
export type ChartRequirement = z.output<typeof ChartRequirement>;
