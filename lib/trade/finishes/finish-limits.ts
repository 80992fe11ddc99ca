import type { Verdict } from '../verdict';
import {
  dimensionChange,
  type BuildUpTables,
  type Coating,
  type DimensionReason,
  type Limits,
} from './dimension-change';

/**
 * The limits in mm that a dimension has after coating, from its limits before.
 *
 * Worked example: an outside diameter of 9.980 to 9.990 mm with 0.005 to 0.010 mm of plating becomes 9.990 to 10.010 mm.
 */
export function finishedLimits(
  tables: BuildUpTables,
  coating: Coating,
  before: Limits,
): Verdict<{ readonly limitsMm: Limits }, DimensionReason | 'limits_upside_down'> {
  if (!(before.min <= before.max)) return { ok: false, reason: 'limits_upside_down' };
  const found = dimensionChange(tables, coating);
  if (!found.ok) return found;
  const { changeMm, source, readFrom } = found;
  const limitsMm = { min: before.min + changeMm.min, max: before.max + changeMm.max };
  return { ok: true, limitsMm, source, ...(readFrom && { readFrom }) };
}

/**
 * The limits in mm to make a dimension to, so that after coating it lies within its finished limits whatever the
 * thickness turns out to be. The inverse of `finishedLimits`.
 *
 * Where the spread of the coating takes up the whole tolerance nothing is left to machine to: it is refused.
 * Worked example: a bore of 10.000 to 10.030 mm finished, with 0.005 to 0.010 mm of plating, is made 10.020 to
 * 10.040 mm.
 */
export function preFinishLimits(
  tables: BuildUpTables,
  coating: Coating,
  finished: Limits,
): Verdict<
  { readonly limitsMm: Limits },
  DimensionReason | 'limits_upside_down' | 'coating_takes_the_tolerance'
> {
  if (!(finished.min <= finished.max)) return { ok: false, reason: 'limits_upside_down' };
  const found = dimensionChange(tables, coating);
  if (!found.ok) return found;
  const { changeMm, source, readFrom } = found;
  const limitsMm = { min: finished.min - changeMm.min, max: finished.max - changeMm.max };
  if (limitsMm.min > limitsMm.max) return { ok: false, reason: 'coating_takes_the_tolerance', source };
  return { ok: true, limitsMm, source, ...(readFrom && { readFrom }) };
}
