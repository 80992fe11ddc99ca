import type { HardnessScale } from '../hardness/hardness-table';
import type { Table } from '../table';
import type { AcceptanceRow } from '../tables/acceptance';
import type { Verdict } from '../verdict';
import { acceptanceOf, type Acceptance, type AcceptanceBand, type AcceptanceReason } from './acceptance-of';

type Judgement = 'meets' | 'does_not_meet' | 'not_measured' | 'no_limit_in_this_scale';

export interface ConditionJudgement extends Acceptance {
  readonly hardness: Judgement;
  readonly conductivity: Judgement;
  /** Only the pair speaks: one alone never shows a condition. */
  readonly pair: 'meets' | 'does_not_meet' | 'not_shown';
  /** Another published band judges the same readings otherwise. */
  readonly sourcesDisagree: boolean;
  /** Always: a pair that meets does not prove tensile properties; papers of the heat treatment do. */
  readonly provesTensile: false;
}

export interface ConditionReadings {
  readonly hardness?: { readonly scale: HardnessScale; readonly value: number };
  readonly percentIacs?: number;
}

/**
 * Whether readings of hardness and conductivity (% IACS) show the condition that a bare aluminium part should have.
 *
 * MIL-STD-1537C para 5.1.2.1: both decide together, and even both do not prove tensile properties.
 * Worked example: 7075-T6 with HRB 88 and 33.0 % IACS meets; with HRB 88 and 38.5 % IACS it does not.
 */
export function judgeCondition(
  table: Table<AcceptanceRow>,
  asked: { readonly alloy: string; readonly condition: string; readonly isClad: boolean },
  readings: ConditionReadings,
): Verdict<ConditionJudgement, AcceptanceReason> {
  const found = acceptanceOf(table, asked);
  if (!found.ok) return found;
  const { hardness, conductivity } = judgeBand(found.band, readings);
  const others = found.alsoPublished.map((band) => judgeBand(band, readings));
  return {
    ...found,
    hardness,
    conductivity,
    pair: pairOf(hardness, conductivity),
    sourcesDisagree: others.some(
      (other) => areOpposed(other.hardness, hardness) || areOpposed(other.conductivity, conductivity),
    ),
    provesTensile: false,
  };
}

function judgeBand(band: AcceptanceBand, { hardness, percentIacs }: ConditionReadings) {
  const limits = band.hardness.find(({ scale }) => scale === hardness?.scale);
  return {
    hardness: judge(hardness?.value, limits && [limits.min ?? -Infinity, limits.max ?? Infinity]),
    conductivity: judge(percentIacs, band.iacs),
  };
}

function judge(value: number | undefined, limits: readonly [number, number] | undefined): Judgement {
  if (value === undefined || !Number.isFinite(value)) return 'not_measured';
  if (!limits) return 'no_limit_in_this_scale';
  return value >= limits[0] - TOLERANCE && value <= limits[1] + TOLERANCE ? 'meets' : 'does_not_meet';
}

/** Far below the printed tenth, far above what converting from MS/m leaves. */
const TOLERANCE = 1e-6;

function pairOf(hardness: Judgement, conductivity: Judgement): ConditionJudgement['pair'] {
  if (hardness === 'does_not_meet' || conductivity === 'does_not_meet') return 'does_not_meet';
  return hardness === 'meets' && conductivity === 'meets' ? 'meets' : 'not_shown';
}

const areOpposed = (a: Judgement, b: Judgement): boolean =>
  (a === 'meets' && b === 'does_not_meet') || (a === 'does_not_meet' && b === 'meets');
