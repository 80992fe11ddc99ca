import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { BuildUpSurface, BuildUpTreatment, GrowthRow, SurfaceRow } from '../tables/build-up';
import { mmFromInches } from '../units/length';
import type { Verdict } from '../verdict';

export interface BuildUpTables {
  readonly surfaces: Table<SurfaceRow>;
  readonly growth: Table<GrowthRow>;
}

export interface Coating {
  readonly treatment: BuildUpTreatment;
  readonly surface: BuildUpSurface;
  /** On one face, least and most. */
  readonly thicknessMm: Limits;
  /** The processor's own share of the thickness that grows outward, 0 to 1; it goes before the published ones. */
  readonly outwardShare?: { readonly share: number; readonly source: Source };
}

/** Least and most of a dimension in mm. */
export interface Limits {
  readonly min: number;
  readonly max: number;
}

export interface DimensionChange {
  /** Added to the dimension; negative where it gets smaller. Least and most, over thickness and published shares. */
  readonly changeMm: Limits;
  /** Outward growth of one face. */
  readonly growthMm: Limits;
  readonly bySource: readonly { readonly growthMm: Limits; readonly source: Source }[];
}

export type DimensionReason =
  'thickness_not_a_range' | 'share_not_between_0_and_1' | 'treatment_not_in_table' | 'surface_not_in_table';

/**
 * How much a dimension changes in mm when a coating is put on.
 *
 * A 60° thread's pitch diameter moves four times the outward growth: four times the thickness of plating, but only
 * four times the growth of anodize. Where sources differ on the growth the answer spans all of them, unless the
 * processor's own share is given.
 * Worked examples: 0.0003 in of plating puts 0.0012 in on the pitch diameter of a bolt. 0.002 in of type III anodize
 * grows 0.001 in a face and puts 0.004 in on it.
 */
export function dimensionChange(
  tables: BuildUpTables,
  coating: Coating,
): Verdict<DimensionChange, DimensionReason> {
  const { thicknessMm, outwardShare } = coating;
  if (!(thicknessMm.min >= 0 && thicknessMm.min <= thicknessMm.max && thicknessMm.max < Infinity))
    return { ok: false, reason: 'thickness_not_a_range' };
  if (outwardShare && !(outwardShare.share >= 0 && outwardShare.share <= 1))
    return { ok: false, reason: 'share_not_between_0_and_1' };
  const surface = tables.surfaces.rows.find((row) => row.surface === coating.surface);
  if (!surface) return { ok: false, reason: 'surface_not_in_table' };
  const published = tables.growth.rows.filter((row) => row.treatment === coating.treatment);
  const [first] = published;
  if (!first) return { ok: false, reason: 'treatment_not_in_table' };

  const rows: Table<GrowthRow>['rows'] = outwardShare
    ? [{ treatment: coating.treatment, outwardShare: [outwardShare.share, 1], source: outwardShare.source }]
    : published;
  const bySource = rows.map((row) => ({ growthMm: growthOf(row, thicknessMm), source: row.source }));
  const growthMm = {
    min: Math.min(...bySource.map((one) => one.growthMm.min)),
    max: Math.max(...bySource.map((one) => one.growthMm.max)),
  };
  const ends = [growthMm.min * surface.timesGrowth, growthMm.max * surface.timesGrowth];
  return {
    ok: true,
    changeMm: { min: Math.min(...ends), max: Math.max(...ends) },
    growthMm,
    bySource,
    source: outwardShare?.source ?? first.source,
    readFrom: referenceTo(tables.growth),
  };
}

function growthOf(row: GrowthRow, { min, max }: Limits): Limits {
  if ('growthInMax' in row) return { min: 0, max: mmFromInches(row.growthInMax) };
  const [part, of] = row.outwardShare;
  return { min: (min * part) / of, max: (max * part) / of };
}
