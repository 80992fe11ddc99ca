import { iacsFromMsPerM } from '@/lib/trade/acceptance/conductivity';
import { ksiFromMpa } from '@/lib/trade/units/stress';
import { z } from 'zod';

import type { Reading } from '../certificate';
import type { Check } from './compared';
import { cannotTell, doubtful, meets, notStated, wrong, type DiscrepancyCode, type Outcome } from './outcome';
import { halfOfLastPlace, sideOf } from './range';
import { conductivityUnit, lengthUnit, stressUnit } from './reading-units';
import { readingsOf } from './readings-of';
import { sayList, sayNumber, sayRange, type Range } from './say';

interface Limit {
  /** As in `thickness`, `conductivity`. */
  readonly name: string;
  readonly range: Range;
  readonly unit: string;
  readonly code: DiscrepancyCode;
  /** What a value in a printed unit is in the order's, and how much rounding may hide; null where it cannot be. */
  readonly convert: (value: number, printed: string) => { value: number; allowance: number } | null;
  /** Units it may have been in where none is printed. */
  readonly mayBe: readonly string[];
}

/** Conductivity within its limits, in % IACS or MS/m. */
export const conducts: Check = (compared) => {
  const range = compared.order.requirements.conductivity_pct_iacs;
  if (!range) return [];
  return judgeReadings(readingsOf(compared, /^conductivity/), {
    name: 'conductivity',
    range,
    unit: '% IACS',
    code: 'conductivity_out_of_range',
    mayBe: ['% IACS', 'MS/m'],
    convert: (value, printed) => {
      const unit = conductivityUnit(printed);
      if (unit === null) return null;
      return unit === '% IACS'
        ? { value, allowance: 0 }
        : { value: iacsFromMsPerM(value), allowance: iacsFromMsPerM(halfOfLastPlace(value)) };
    },
  });
};

/** A coating neither too thin nor too thick, in any unit. */
export const isThickEnough: Check = (compared) => {
  const range = compared.order.requirements.thickness;
  if (!range) return [];
  const asked = lengthUnit(range.unit);
  return judgeReadings(readingsOf(compared, /thickness/), {
    name: 'coating thickness',
    range,
    unit: asked?.says ?? range.unit,
    code: 'thickness_out_of_range',
    mayBe: ['microinch', 'mil', 'in', 'micron', 'mm'],
    convert: (value, printed) => {
      const given = lengthUnit(printed);
      if (!asked || !given) return printed === range.unit ? { value, allowance: 0 } : null;
      const factor = given.micrometres / asked.micrometres;
      // Between inches and parts of an inch only the point moves; between inch and metre the printed value was rounded.
      const isRounded = given.system !== asked.system;
      return { value: value * factor, allowance: isRounded ? halfOfLastPlace(value) * factor : 0 };
    },
  });
};

const Tensile = z.looseObject({
  min: z.number().nullish(),
  max: z.number().nullish(),
  unit: z.string().optional(),
});

/** Tensile strength, where an order asks for it, in ksi, psi or MPa. */
export const isStrongEnough: Check = (compared) => {
  const { requirements } = compared.order;
  const asked = Tensile.safeParse(requirements['tensile_ksi'] ?? requirements['tensile']);
  if (!asked.success) return [];
  const inKsi = (value: number, printed: string) => {
    const unit = stressUnit(printed);
    if (unit === null) return null;
    const ksi = { ksi: value, psi: value / 1000, MPa: ksiFromMpa(value) }[unit];
    return { value: ksi, allowance: unit === 'MPa' ? ksiFromMpa(halfOfLastPlace(value)) : 0 };
  };
  const unit = asked.data.unit ?? 'ksi';
  const limit = (value: number | null | undefined) =>
    value == null ? null : (inKsi(value, unit)?.value ?? null);
  return judgeReadings(readingsOf(compared, /^tensile/), {
    name: 'tensile strength',
    range: { min: limit(asked.data.min), max: limit(asked.data.max) },
    unit: 'ksi',
    code: 'tensile_out_of_range',
    mayBe: ['ksi', 'psi', 'MPa'],
    convert: inKsi,
  });
};

function judgeReadings(readings: readonly Reading[], limit: Limit): Outcome[] {
  const ordered = `${sayRange(limit.range, sayNumber)} ${limit.unit}`;
  const asked = { requirement: `${limit.name} ${ordered}`, ordered };
  if (readings.length === 0) return [notStated(asked)];
  return readings.map((reading) => judgeReading(reading, limit, asked));
}

function judgeReading(
  { values, unit }: Reading,
  limit: Limit,
  asked: { requirement: string; ordered: string },
): Outcome {
  const says = { ...asked, stated: `${sayList(values)}${unit === null ? '' : ` ${unit}`}` };
  if (unit === null) return withoutUnit(values, limit, says);
  const converted = values.map((value) => limit.convert(value, unit));
  if (converted.some((one) => one === null))
    return cannotTell(says, `The unit ${unit} cannot be compared with ${limit.unit}.`);
  const known = converted.filter((one) => one !== null);
  const isConverted = known.some(({ value }, index) => Math.abs(value - (values[index] ?? value)) > 1e-9);
  const rounding = known.some(({ allowance }) => allowance > 0)
    ? ', give or take the rounding of what is printed'
    : '';
  const note = isConverted ? ` (${sayList(known.map(({ value }) => value))} ${limit.unit}${rounding})` : '';
  const out = known.find(({ value, allowance }) => sideOf(value, limit.range, allowance) !== 'within');
  if (!out) return meets(says, `${says.stated}${note} lies within ${asked.ordered}.`);
  return wrong(
    limit.code,
    says,
    `The ${limit.name} is stated as ${says.stated}${note}: ${sayNumber(out.value)} ${limit.unit} is ${sideOf(out.value, limit.range, out.allowance)} ${asked.ordered}.`,
  );
}

/** Without a unit nothing is proved; only what would be out by every unit is a discrepancy. */
function withoutUnit(
  values: readonly number[],
  limit: Limit,
  says: { requirement: string; ordered: string; stated: string },
): Outcome {
  const mayFit = limit.mayBe.some((unit) =>
    values.every((value) => {
      const converted = limit.convert(value, unit);
      return converted !== null && sideOf(converted.value, limit.range, converted.allowance) === 'within';
    }),
  );
  return mayFit
    ? cannotTell(says, `${says.stated} is printed without a unit.`)
    : doubtful(
        limit.code,
        says,
        `The ${limit.name} is stated as ${says.stated} without a unit; in none is it within ${says.ordered}.`,
      );
}
