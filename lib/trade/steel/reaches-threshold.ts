import { hardnessFromTensile, tensileFromHardness } from '../hardness/tensile-from-hardness';
import type { HardnessTable } from '../hardness/hardness-table';
import type { EmbrittlementRow } from '../tables/embrittlement-row';
import { ksiFromMpa } from '../units/stress';
import type { Strength } from './bake-hours-by-strength';

export interface Reached {
  readonly isReached: boolean;
  /** Compared over the conversion table, because the rule and the part speak of different measures. */
  readonly isByConversion: boolean;
}

/**
 * Whether a part is as strong as a rule's threshold; null where the part's strength is not known.
 *
 * Compared in the measure in which both are given. Only where there is none is the part's strength converted.
 */
export function reachesThreshold(
  from: NonNullable<EmbrittlementRow['from']>,
  strength: Strength,
  conversion: HardnessTable,
): Reached | null {
  const { hrc, tensileMpa } = strength;
  const isPast = (value: number, limit: number): boolean =>
    from.isOver ? value > limit + TOLERANCE : value >= limit - TOLERANCE;
  const compared: boolean[] = [];
  if (hrc !== undefined && from.hrc !== undefined) compared.push(isPast(hrc, from.hrc));
  if (tensileMpa !== undefined && from.ksi !== undefined)
    compared.push(isPast(ksiFromMpa(tensileMpa), from.ksi));
  if (tensileMpa !== undefined && from.mpa !== undefined) compared.push(isPast(tensileMpa, from.mpa));
  if (compared.length > 0) return { isReached: compared.includes(true), isByConversion: false };

  if (tensileMpa !== undefined && from.hrc !== undefined) {
    const found = hardnessFromTensile(conversion, { material: conversion.material, tensileMpa, to: 'HRC' });
    return {
      isReached: found.ok ? isPast(found.value, from.hrc) : isHarder(found.reason),
      isByConversion: true,
    };
  }
  if (hrc === undefined) return null;
  const found = tensileFromHardness(conversion, { material: conversion.material, from: 'HRC', value: hrc });
  if (!found.ok) return { isReached: isHarder(found.reason), isByConversion: true };
  const limit = from.mpa ?? from.ksi;
  const value = from.mpa === undefined ? ksiFromMpa(found.tensileMpa) : found.tensileMpa;
  return limit === undefined ? null : { isReached: isPast(value, limit), isByConversion: true };
}

/** Beyond the hard end of the table every threshold is reached, beyond the soft end none. */
const isHarder = (reason: string): boolean => reason !== 'below_table';

const TOLERANCE = 1e-6;
