import { finishAsOrdered } from '../finishes/finish-as-ordered';
import { magneticParticleAroundPlating } from '../ndt/magnetic-particle-around-plating';
import { relief, type ReliefVerdict } from '../steel/relief';
import type { RoutePart, RouteStep, RouteTables } from './route';
import { isElectroplate, isPlating } from './step-kinds';

/** What one plated step asks of the steps around it. */
export interface PlatingNeeds {
  readonly at: number;
  readonly bake: ReliefVerdict;
  readonly stressRelief: ReliefVerdict;
  readonly needsBake: boolean;
  readonly needsStressRelief: boolean;
  /** Thick enough to be inspected by magnetic particle on both sides of it. */
  readonly needsBothInspections: boolean;
}

const HARDENABLE: readonly RoutePart['family'][] = ['low_alloy_steel', 'precipitation_hardening_steel'];

export const isHardenable = ({ family }: RoutePart): boolean => HARDENABLE.includes(family);

/** Empty for a metal that hydrogen does not embrittle. */
export function needsOfPlating(
  tables: RouteTables,
  route: readonly RouteStep[],
  part: RoutePart,
): PlatingNeeds[] {
  if (!isHardenable(part)) return [];
  return route.flatMap((step, at): PlatingNeeds[] => {
    if (!isPlating(step)) return [];
    const bake = relief(tables, 'embrittlement_relief', step, part);
    const stressRelief = relief(tables, 'stress_relief', step, part);
    const needsBake = (bake.ok && bake.isRequired) || (!bake.ok && bake.reason === 'bake_too_near_tempering');
    const needsStressRelief = stressRelief.ok && stressRelief.isRequired;
    return [
      { at, bake, stressRelief, needsBake, needsStressRelief, needsBothInspections: isThick(tables, step) },
    ];
  });
}

function isThick(tables: RouteTables, step: RouteStep): boolean {
  if (!isElectroplate(step)) return false;
  const ordered = finishAsOrdered(tables, { ...step, classType: step.classType ?? '' });
  const thicknessMm = ordered.ok ? ordered.thickness?.minMm : undefined;
  if (thicknessMm === undefined) return false;
  const around = magneticParticleAroundPlating(tables.magneticParticle, thicknessMm);
  return around.ok && around.inspect === 'before_and_after';
}
