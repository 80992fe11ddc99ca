import { referenceTo, type Table } from '../table';
import type { MagneticParticlePlatingRow } from '../tables/magnetic-particle-plating';
import { inchesFromMm } from '../units/length';
import type { Verdict } from '../verdict';

/**
 * When a part is inspected by magnetic particle that is plated to a thickness in mm.
 *
 * The standard prints 0.0008 to 0.0050 in for both, and 0.0050 in and over for before; at 0.0050 in itself both is
 * asked, because it satisfies either line.
 * Worked example: chromium of 0.002 in, 0.0508 mm, is inspected before and after plating.
 */
export function magneticParticleAroundPlating(
  table: Table<MagneticParticlePlatingRow>,
  thicknessMm: number,
): Verdict<{ readonly inspect: MagneticParticlePlatingRow['inspect'] }, 'thickness_not_positive'> {
  const thicknessIn = inchesFromMm(thicknessMm);
  const reached = table.rows.filter(({ fromIn }) => thicknessIn >= fromIn - TOLERANCE_IN);
  if (!(thicknessMm > 0) || reached.length === 0) return { ok: false, reason: 'thickness_not_positive' };
  const last = reached.reduce((thickest, row) => (row.fromIn > thickest.fromIn ? row : thickest));
  const isOnTheLine = Math.abs(thicknessIn - last.fromIn) <= TOLERANCE_IN;
  const both = isOnTheLine ? reached.find(({ inspect }) => inspect === 'before_and_after') : undefined;
  const row = both ?? last;
  return { ok: true, inspect: row.inspect, source: row.source, readFrom: referenceTo(table) };
}

/** Far below the printed step of 0.0001 in, far above what converting leaves. */
const TOLERANCE_IN = 1e-9;
