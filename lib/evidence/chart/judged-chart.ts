import { z } from 'zod';

import { TemperatureUnit } from './requirement';

export const CHANNEL_ROLES = ['load', 'control', 'set_point', 'other'] as const;
export const ChannelRole = z.enum(CHANNEL_ROLES);
export type ChannelRole = z.output<typeof ChannelRole>;

/** Why the readings of a thermocouple prove nothing; `by_hand` is a person's correction. */
export const Exclusion = z.enum(['open_circuit', 'flat_line', 'no_readings', 'by_hand']);
export type Exclusion = z.output<typeof Exclusion>;

/**
 * A moment of the chart: `YYYY-MM-DDTHH:mm:ss` where the chart knows the day, `HH:mm:ss` of the day where it does not,
 * and `HH:mm:ss` since the start where it counts elapsed time only.
 */
const Moment = z.string();

export const FLAG_CODES = [
  'gap',
  'open_circuit',
  'flat_line',
  'overshoot',
  'short_soak',
  'late_channel',
  'spike',
] as const;

export const ChartFlag = z.object({
  code: z.enum(FLAG_CODES),
  /** Null where it concerns all of them. */
  channel: z.string().nullable(),
  from: Moment.nullable(),
  to: Moment.nullable(),
  message: z.string(),
});
export type ChartFlag = z.output<typeof ChartFlag>;

export const UnderstoodChannel = z.object({
  /** In the file, from 0. */
  column: z.int(),
  name: z.string(),
  role: ChannelRole,
  excluded: Exclusion.nullable(),
});

/** How the export was read, so that a person can see it and correct it. */
export const Understood = z.object({
  delimiter: z.string(),
  decimal: z.enum(['.', ',']),
  /** As `DD.MM.YYYY HH:mm:ss`; elapsed time begins with `elapsed`. */
  time: z.string(),
  unit: TemperatureUnit,
  rows: z.int(),
  channels: z.array(UnderstoodChannel),
  encoding: z.string(),
  /** Guesses that a person should look at. */
  notes: z.array(z.string()),
});
export type Understood = z.output<typeof Understood>;

/** What else the chart says; temperatures in the requirement's unit, null where it cannot be seen. */
export const ChartFacts = z.object({
  sample_interval_s: z.number().nullable(),
  /** Lowest and highest of the counted thermocouples inside the soak: the furnace's uniformity as this load saw it. */
  soak_lowest: z.number().nullable(),
  soak_highest: z.number().nullable(),
  /** Degrees a minute of the slowest counted thermocouple, between a tenth and nine tenths of the way up. */
  ramp_per_minute: z.number().nullable(),
  /** From the furnace's fall at loading until it is back at the lower limit. */
  recovery_minutes: z.number().nullable(),
});
export type ChartFacts = z.output<typeof ChartFacts>;

/** One chart, read and judged, in the shape that `read:chart` prints. Temperatures are in the requirement's unit. */
export const JudgedChart = z.object({
  understood: Understood,
  soak_start: Moment.nullable(),
  soak_end: Moment.nullable(),
  soak_minutes: z.number().nullable(),
  max_temperature: z.number().nullable(),
  max_overshoot_above_upper_limit: z.number().nullable(),
  minutes_above_upper_limit: z.number().nullable(),
  quench_delay_s: z.number().nullable(),
  verdict: z.enum(['pass', 'fail', 'review']),
  flags: z.array(ChartFlag),
  why: z.string(),
  facts: ChartFacts,
});
export type JudgedChart = z.output<typeof JudgedChart>;
