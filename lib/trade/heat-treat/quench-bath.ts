import { referenceTo, type Table } from '../table';
import type { QuenchBathRow, QuenchMedium, QuenchRule } from '../tables/quench-media';
import { celsiusDifferenceFromFahrenheit, celsiusFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';

export interface QuenchBath {
  readonly startC?: { readonly from?: number; readonly to: number };
  /** A difference: how much warmer the bath may get. */
  readonly maxRiseC?: number;
  readonly anyTimeToC?: number;
  readonly maxConcentrationPercent?: number;
}

/**
 * How warm a quench may be at its start and how warm it may get, in °C. Documents differ: the rule says by whose figures.
 *
 * @example quenchBath(QUENCH_BATHS, {rule: 'faa', medium: 'cold water'}) starts at 29.4 °C at most, and rises by 11.1 °C
 */
export function quenchBath(
  table: Table<QuenchBathRow>,
  asked: { readonly rule: QuenchRule; readonly medium: QuenchMedium },
): Verdict<QuenchBath, 'not_in_table'> {
  const row = table.rows.find(({ rule, medium }) => rule === asked.rule && medium === asked.medium);
  if (!row) return { ok: false, reason: 'not_in_table' };
  const { startF, maxRiseF, anyTimeToF, maxConcentrationPercent } = row;
  return {
    ok: true,
    ...(startF && {
      startC: {
        to: celsiusFromFahrenheit(startF.to),
        ...(startF.from !== undefined && { from: celsiusFromFahrenheit(startF.from) }),
      },
    }),
    ...(maxRiseF !== undefined && { maxRiseC: celsiusDifferenceFromFahrenheit(maxRiseF) }),
    ...(anyTimeToF !== undefined && { anyTimeToC: celsiusFromFahrenheit(anyTimeToF) }),
    ...(maxConcentrationPercent !== undefined && { maxConcentrationPercent }),
    source: row.source,
    readFrom: referenceTo(table),
  };
}

export type BathStanding =
  'within' | 'start_outside' | 'rose_too_far' | 'too_warm' | 'temperatures_out_of_order';

/** Whether a bath kept its limits, by its temperature at the start and the highest it reached, °C. */
export function checkQuenchBath(
  { startC, maxRiseC, anyTimeToC }: QuenchBath,
  bath: { readonly atStartC: number; readonly highestC: number },
): BathStanding {
  if (!(bath.highestC >= bath.atStartC)) return 'temperatures_out_of_order';
  if (startC && (exceeds(bath.atStartC, startC.to) || exceeds(startC.from ?? -Infinity, bath.atStartC)))
    return 'start_outside';
  if (maxRiseC !== undefined && exceeds(bath.highestC - bath.atStartC, maxRiseC)) return 'rose_too_far';
  return anyTimeToC !== undefined && exceeds(bath.highestC, anyTimeToC) ? 'too_warm' : 'within';
}

/** A limit printed in °F, read off in °C, is not exceeded by what is left of binary fractions. */
const exceeds = (value: number, limit: number): boolean => value > limit + 1e-9;
