import { referenceTo, type Table } from '../table';
import type { AnodizeLimitRow } from '../tables/anodize-limits';
import { mmFromInches } from '../units/length';
import type { Verdict } from '../verdict';

export interface Composition {
  readonly copperPercent: number;
  readonly siliconPercent: number;
  /** All alloying elements together. */
  readonly alloyingPercent: number;
}

/**
 * Whether an anodize type is used on an alloy of this composition, in percent. Types without a limit have none here.
 *
 * Worked example: type I is not used on an alloy with 5.1 % copper.
 */
export function anodizeSuitsAlloy(
  table: Table<AnodizeLimitRow>,
  type: string,
  alloy: Composition,
): Verdict<{ readonly isSuited: boolean }, 'type_without_limit'> {
  const row = table.rows.find(({ types, mostPercent }) => mostPercent && types.includes(type));
  if (!row?.mostPercent) return { ok: false, reason: 'type_without_limit' };
  const { copper, silicon, alloying } = row.mostPercent;
  const isSuited =
    alloy.copperPercent <= copper && alloy.siliconPercent <= silicon && alloy.alloyingPercent <= alloying;
  return { ok: true, isSuited, source: row.source, readFrom: referenceTo(table) };
}

/**
 * Whether parts may be pressed together on an anodize type, and how near its thickness can be held, in mm either way.
 *
 * Worked example: type II is too brittle for a force fit; type III can be held to about 0.0001 in, 0.00254 mm.
 */
export function anodizeFit(
  table: Table<AnodizeLimitRow>,
  type: string,
): Verdict<{ readonly mayBeForceFitted: boolean; readonly controlMm?: number }, 'type_without_limit'> {
  const rows = table.rows.filter(({ types, mostPercent }) => !mostPercent && types.includes(type));
  const [first] = rows;
  if (!first) return { ok: false, reason: 'type_without_limit' };
  const controlIn = rows.find((row) => row.controlIn !== undefined)?.controlIn;
  return {
    ok: true,
    mayBeForceFitted: !rows.some(({ notForceFitted }) => notForceFitted),
    ...(controlIn !== undefined && { controlMm: mmFromInches(controlIn) }),
    source: first.source,
    readFrom: referenceTo(table),
  };
}
