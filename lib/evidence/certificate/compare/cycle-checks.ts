import { z } from 'zod';

import type { Order } from '../../order';
import type { Cycle } from '../certificate';
import type { Check } from './compared';
import { contradictsItself, durationOf, saidMinutes } from './duration';
import { cannotTell, doubtful, meets, notStated, wrong, type DiscrepancyCode, type Outcome } from './outcome';
import { speaksOf } from './on-the-page';
import { sideOf } from './range';
import { sayDuration, sayRange, type Range } from './say';
import { judgeTemperature, saySetting, type Setting } from './temperature';

/** A step in a furnace as an order asks for it; times in minutes or hours. */
const AskedStep = z.looseObject({
  set_f: z.number().optional(),
  tolerance_f: z.number().optional(),
  soak_min_minutes: z.number().optional(),
  soak_max_minutes: z.number().optional(),
  min_minutes: z.number().optional(),
  max_minutes: z.number().optional(),
  min_hours: z.number().optional(),
  max_hours: z.number().optional(),
});

/** Requirements that are one furnace step, and what certificates call it. Ageing and baking have checks of their own. */
export const STEPS: Readonly<Record<string, readonly string[]>> = {
  solution: ['solution'],
  austenitize: ['austenitize', 'harden'],
  harden: ['austenitize', 'harden'],
  temper: ['temper'],
  stress_relief: ['stress_relief'],
  anneal: ['anneal'],
  normalize: ['normalize'],
};

/** Each furnace step was at its temperature and as long as it must be. */
export const holdsFurnaceSteps: Check = ({ stated, order }) =>
  Object.entries(STEPS).flatMap(([key, names]) => {
    const step = AskedStep.safeParse(order.requirements[key]);
    if (!step.success) return [];
    const cycles = stated.cycles.filter((cycle) => names.includes(cycle.step));
    return stepOutcomes(key.replaceAll('_', ' '), step.data, cycles);
  });

export function stepOutcomes(
  name: string,
  asked: z.output<typeof AskedStep>,
  cycles: readonly Cycle[],
): Outcome[] {
  const setting = settingOf(asked);
  const range = {
    min: asked.soak_min_minutes ?? asked.min_minutes ?? hours(asked.min_hours),
    max: asked.soak_max_minutes ?? asked.max_minutes ?? hours(asked.max_hours),
  };
  const isTimed = range.min !== undefined || range.max !== undefined;
  return [
    ...(setting ? temperatureOutcomes(name, setting, cycles) : []),
    ...(isTimed ? soakOutcomes(name, range, cycles) : []),
  ];
}

const hours = (value: number | undefined): number | undefined =>
  value === undefined ? undefined : value * 60;

const settingOf = ({ set_f, tolerance_f }: z.output<typeof AskedStep>): Setting | null =>
  set_f === undefined ? null : { set_f, tolerance_f: tolerance_f ?? 0 };

export function temperatureOutcomes(name: string, setting: Setting, cycles: readonly Cycle[]): Outcome[] {
  const asked = { requirement: `${name} at ${saySetting(setting)}`, ordered: saySetting(setting) };
  const judged = cycles.flatMap((cycle) => judgeTemperature(cycle, setting) ?? []);
  if (judged.length === 0) return [notStated(asked)];
  return judged.map(({ side, stated, note }) => {
    const says = { ...asked, stated };
    if (side === 'within') return meets(says, `${stated} lies within ${saySetting(setting)}.${note}`);
    if (side === 'unit_not_stated') return cannotTell(says, `${stated} is printed without °F or °C.`);
    return wrong(
      'temperature_out_of_range',
      says,
      `The ${name} was set to ${stated}, ${side} ${saySetting(setting)}.${note}`,
    );
  });
}

/** How a time that is too short or too long is called. */
interface TimeCodes {
  readonly short: DiscrepancyCode;
  readonly long: DiscrepancyCode;
}

const SOAK: TimeCodes = { short: 'soak_too_short', long: 'soak_too_long' };

export function soakOutcomes(
  name: string,
  range: Range,
  cycles: readonly Omit<Cycle, 'step' | 'set_temp' | 'unit'>[],
  codes: TimeCodes = SOAK,
): Outcome[] {
  const ordered = sayRange(range, sayDuration);
  const asked = { requirement: `${name} ${ordered}`, ordered };
  const durations = cycles.map(durationOf).filter((duration) => saidMinutes(duration).length > 0);
  if (durations.length === 0) return [notStated(asked)];
  return durations.map((duration) => {
    const says = { ...asked, stated: duration.words };
    const [shortest = 0] = saidMinutes(duration);
    const longest = saidMinutes(duration).at(-1) ?? 0;
    const byTimes = duration.byTimes === null ? '' : ` (${sayDuration(duration.byTimes)} by its times)`;
    if (shortest < 0)
      return wrong('time_arithmetic', says, `The ${name} ends before it starts: ${duration.words}.`, 'check');
    if (sideOf(shortest, range) === 'below')
      return wrong(
        codes.short,
        says,
        `The ${name} took ${duration.words}${byTimes}; the order asks for ${ordered}.`,
      );
    if (sideOf(longest, range) === 'above')
      return wrong(
        codes.long,
        says,
        `The ${name} took ${duration.words}${byTimes}; the order allows ${ordered}.`,
      );
    if (contradictsItself(duration))
      return doubtful(
        'time_arithmetic',
        says,
        `The ${name} is stated as ${sayDuration(duration.stated ?? 0)}, but its times are ${sayDuration(duration.byTimes ?? 0)} apart.`,
      );
    return meets(says, `${duration.words}${byTimes} is ${ordered}.`);
  });
}

const AGEING = /^\W*(?:age|aged|age?ing|auslager|vieilli|maturation)/i;

/** Ageing was done, of the kind ordered and as long as it must be. */
export const isAged: Check = ({ stated, order, pages }) => {
  const { age } = order.requirements;
  if (!age) return [];
  const limit = sayRange({ min: age.min_hours, max: age.max_hours }, (value) => `${value} h`);
  const name = `${age.kind} ageing`;
  const asked = { requirement: limit === 'any' ? name : `${name} ${limit}`, ordered: `${name} ${limit}` };
  const own = stated.cycles.filter(({ step }) => step === `${age.kind}_age` || step === 'age');
  const others = stated.cycles.filter(
    ({ step }) => /_age$/.test(step) && !own.some((one) => one.step === step),
  );
  if (own.length > 0) return agedOutcomes(name, age, own);
  const [other] = others;
  if (other)
    return [
      wrong(
        'age_kind_mismatch',
        { ...asked, stated: other.step.replace('_age', ' ageing') },
        `The order asks for ${name}, the certificate states ${other.step.replace('_age', ' ageing')}.`,
      ),
    ];
  const numbers = [age.min_hours ?? NaN, age.set_f ?? NaN];
  if (speaksOf(AGEING, numbers, pages))
    return [cannotTell(asked, 'The page speaks of ageing that could not be read.')];
  // A certificate that lists no furnace step at all is silent; one that lists the others leaves this one out.
  if (stated.cycles.length === 0) return [notStated(asked)];
  return [
    wrong(
      'age_missing',
      asked,
      `The certificate states the other steps and no ageing; the order asks for ${name} ${limit}.`,
    ),
  ];
};

function agedOutcomes(
  name: string,
  age: NonNullable<Order['requirements']['age']>,
  cycles: readonly Cycle[],
): Outcome[] {
  const range = { min: hours(age.min_hours), max: hours(age.max_hours) };
  const setting = settingOf(age);
  return [
    ...(setting ? temperatureOutcomes(name, setting, cycles) : []),
    ...(range.min === undefined && range.max === undefined
      ? []
      : soakOutcomes(name, range, cycles, { short: 'age_too_short', long: 'age_too_long' })),
  ];
}
