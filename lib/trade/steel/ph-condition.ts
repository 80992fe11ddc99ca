import { referenceTo, type Table } from '../table';
import type { PhSteelConditionRow } from '../tables/ph-steel-conditions';
import { ksiFromMpa, mpaFromKsi } from '../units/stress';
import { celsiusDifferenceFromFahrenheit, celsiusFromFahrenheit } from '../units/temperature';
import { minFromHours } from '../units/time';
import type { Verdict } from '../verdict';
import { KSI_TOLERANCE } from './ksi-tolerance';

export interface PhCondition {
  readonly condition: string;
  readonly temperatureC: number;
  readonly toleranceC: number;
  readonly soakMin: number;
  readonly soakMinMax: number;
  readonly tensileMpaMin: number;
  readonly hrcMin: number;
  readonly hrcMax: number;
}

/**
 * The ageing of a precipitation-hardening stainless steel to a condition, and what it then has.
 *
 * Worked example: 17-4PH to H1025 is 1025 ± 10 °F, 551.7 ± 5.6 °C, for 4 h to 4 h 30 min; 155 ksi at least, HRC 35 to 42.
 */
export function phCondition(
  table: Table<PhSteelConditionRow>,
  asked: { readonly steel: string; readonly condition: string },
): Verdict<PhCondition, 'steel_not_in_table' | 'condition_not_in_table'> {
  const ofSteel = table.rows.filter(({ steels }) => steels.includes(asked.steel));
  if (ofSteel.length === 0) return { ok: false, reason: 'steel_not_in_table' };
  const row = ofSteel.find(({ condition }) => condition === asked.condition);
  if (!row) return { ok: false, reason: 'condition_not_in_table' };
  return { ok: true, ...conditionOf(row), source: row.source, readFrom: referenceTo(table) };
}

/**
 * Conditions whose least tensile strength is at least the one asked for, in MPa, weakest first: the weakest that is
 * strong enough is the toughest.
 *
 * Worked example: 150 ksi, 1034 MPa, of 17-4PH: H1025, H925, H900.
 */
export function phConditionsFor(
  table: Table<PhSteelConditionRow>,
  asked: { readonly steel: string; readonly tensileMpaMin: number },
): Verdict<{ readonly conditions: readonly PhCondition[] }, 'steel_not_in_table' | 'stronger_than_table'> {
  const ofSteel = table.rows.filter(({ steels }) => steels.includes(asked.steel));
  if (ofSteel.length === 0) return { ok: false, reason: 'steel_not_in_table' };
  const [first, ...rest] = ofSteel
    .filter(({ tensileKsiMin }) => tensileKsiMin >= ksiFromMpa(asked.tensileMpaMin) - KSI_TOLERANCE)
    .sort((a, b) => a.tensileKsiMin - b.tensileKsiMin);
  if (!first) return { ok: false, reason: 'stronger_than_table' };
  const conditions = [first, ...rest].map(conditionOf);
  return { ok: true, conditions, source: first.source, readFrom: referenceTo(table) };
}

const conditionOf = (row: PhSteelConditionRow): PhCondition => ({
  condition: row.condition,
  temperatureC: celsiusFromFahrenheit(row.ageF),
  toleranceC: celsiusDifferenceFromFahrenheit(row.toleranceF),
  soakMin: minFromHours(row.hours),
  soakMinMax: minFromHours(row.hours) + row.plusMin,
  tensileMpaMin: mpaFromKsi(row.tensileKsiMin),
  hrcMin: row.hrc[0],
  hrcMax: row.hrc[1],
});
