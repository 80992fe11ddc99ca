import { z } from 'zod';

import { ALLOYS, type Alloy } from '@/lib/trade/alloys/alloy';
import { HARDNESS_SCALES } from '@/lib/trade/hardness/hardness-table';
import { PRODUCT_FORMS } from '@/lib/trade/process';
import { TEMPERS } from '@/lib/trade/tempers/temper';

/** A figure with its unit and the range in which it can be meant; outside of it, it was typed wrongly. */
const figure = (unit: string, least: number, most: number) => z.number().min(least).max(most).meta({ unit });

export const inches = (most = 40) => figure('in', 0, most);
export const fahrenheit = () => figure('°F', -150, 2500);
export const celsius = () => figure('°C', -100, 1400);
/** How far apart, or within what. */
export const degreesF = (most = 200) => figure('°F', 0, most);
export const seconds = () => figure('s', 0, 600);
export const minutes = (most = 6000) => figure('min', 0, most);
export const hours = (most = 5000) => figure('h', 0, most);
export const ksi = () => figure('ksi', 0, 400);
export const mpa = () => figure('MPa', 0, 3000);
export const hrc = () => figure('HRC', 0, 70);
export const percent = () => figure('%', 0, 100);
export const iacs = () => figure('% IACS', 0, 110);
export const bare = (least: number, most: number) => z.number().min(least).max(most);
export const whole = (least: number, most: number) => z.int().min(least).max(most);

/** Both ends of a range, the lower one first; one figure alone stands for both. */
export const span = (end: z.ZodNumber) =>
  z.tuple([end, end]).refine(([low, high]) => low <= high, 'The second figure is below the first.');

export const words = (most = 200) => z.string().min(1).max(most);
export const listOf = <One extends z.ZodType>(one: One, most = 60) => z.array(one).min(1).max(most);

export const alloy = z.enum(Object.keys(ALLOYS) as [Alloy, ...Alloy[]]);
export const alloys = listOf(alloy);
export const temper = z.enum(TEMPERS);
export const form = z.enum(PRODUCT_FORMS);
export const specifications = listOf(words(60));
/** Ticked, or left empty. */
export const ticked = z.literal(true);

const hardness = bare(0, 1100).exactOptional();
/** One line of a hardness conversion. */
export const byScale = z.strictObject({
  ...{ HRC: hardness, HRB: hardness, HRE: hardness, HRA: hardness },
  ...{ HR15N: hardness, HV: hardness, HBW: hardness, HB500: hardness },
  tensileKsi: ksi().exactOptional(),
  inBrackets: listOf(z.enum(HARDNESS_SCALES)).exactOptional(),
});
