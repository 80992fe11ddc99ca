import { fahrenheitFromCelsius } from '@/lib/trade/units/temperature';

import type { Check } from './compared';
import { cannotTell, meets, notStated, wrong, type Outcome } from './outcome';
import { halfOfLastPlace, sideOf } from './range';
import { sayNumber } from './say';

/** The quench came soon enough, in the medium ordered, and cold enough. */
export const isQuenched: Check = (compared) => {
  const { quench } = compared.order.requirements;
  if (!quench) return [];
  return [
    ...(quench.max_delay_seconds === undefined ? [] : [delayOutcome(quench.max_delay_seconds, compared)]),
    ...(quench.medium === undefined ? [] : [mediumOutcome(quench.medium, compared)]),
    ...(quench.max_medium_temp_f === undefined ? [] : [warmthOutcome(quench.max_medium_temp_f, compared)]),
  ];
};

type Given = Parameters<Check>[0];

function delayOutcome(most: number, { stated: { quench_delay_s: delay } }: Given): Outcome {
  const asked = { requirement: `quench delay ≤ ${sayNumber(most)} s`, ordered: `≤ ${sayNumber(most)} s` };
  if (delay === null) return notStated(asked);
  const says = { ...asked, stated: `${sayNumber(delay)} s` };
  return sideOf(delay, { max: most }) === 'within'
    ? meets(says, `${sayNumber(delay)} s is within ${sayNumber(most)} s.`)
    : wrong(
        'quench_delay_exceeded',
        says,
        `The quench came after ${sayNumber(delay)} s; the order allows ${sayNumber(most)} s.`,
      );
}

/** Words for one medium. What is mixed into water comes before the water. */
const MEDIA: readonly (readonly [string, RegExp])[] = [
  ['polymer', /polymer|glycol|\bpag\b|aqua-?quench|uc[oa]n/i],
  ['brine', /brine|salt\s*water/i],
  ['salt', /\bsalt\b/i],
  ['oil', /\boil\b/i],
  ['water', /water|\bh2o\b/i],
  ['air', /\bair\b|fan\s*cool/i],
  ['gas', /\bgas\b|nitrogen|argon|helium/i],
];
const mediumIn = (written: string): string | null =>
  MEDIA.find(([, pattern]) => pattern.test(written))?.[0] ?? null;

function mediumOutcome(medium: string, { stated: { quench_medium: given } }: Given): Outcome {
  const asked = { requirement: `quench in ${medium}`, ordered: medium };
  if (given === null) return notStated(asked);
  const says = { ...asked, stated: given };
  if (given.toLowerCase() === medium.toLowerCase()) return meets(says, 'It is the medium ordered.');
  const [one, other] = [mediumIn(medium), mediumIn(given)];
  if (one === null || other === null) return cannotTell(says, 'The words have to be compared.');
  return one === other
    ? meets(says, 'It is the medium ordered.')
    : wrong(
        'quench_medium_mismatch',
        says,
        `The order asks for a quench in ${medium}, the certificate says ${given}.`,
      );
}

const MEDIUM_TEMPERATURE = /^quench(?:_medium|ant)?_temp(?:erature)?$/;

function warmthOutcome(most: number, { stated: { facts } }: Given): Outcome {
  const limit = `≤ ${sayNumber(most)} °F`;
  const asked = { requirement: `quench medium ${limit}`, ordered: limit };
  const fact = facts.find(({ field }) => MEDIUM_TEMPERATURE.test(field));
  const unit = fact?.unit?.replace('°', '').toUpperCase();
  if (typeof fact?.value !== 'number') return notStated(asked);
  if (unit !== 'F' && unit !== 'C') return cannotTell(asked, `${fact.raw} is printed without °F or °C.`);
  const inF = unit === 'C' ? fahrenheitFromCelsius(fact.value) : fact.value;
  const allowance = unit === 'C' ? halfOfLastPlace(fact.value) * 1.8 : 0;
  const says = { ...asked, stated: `${sayNumber(fact.value)} °${unit}` };
  return sideOf(inF, { max: most }, allowance) === 'within'
    ? meets(says, `${sayNumber(inF)} °F is ${limit}.`)
    : wrong(
        'quench_medium_too_warm',
        says,
        `The quench was at ${sayNumber(inF)} °F; the order allows ${limit}.`,
      );
}
