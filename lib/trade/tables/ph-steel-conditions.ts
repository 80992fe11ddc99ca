import type { Source } from '../source';
import type { Table } from '../table';

const CYCLE_READ: Source = {
  document:
    'AMS 5643 type page for temperature and time; tensile and hardness AMS 5643 / AMS 2759/3 from memory',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'https://www.rockwellind.com/17-4ph-var-bar-ams-5622/',
};

/** One ageing condition of a precipitation-hardening stainless steel. */
export interface PhSteelConditionRow {
  readonly steels: readonly string[];
  readonly condition: string;
  readonly ageF: number;
  readonly toleranceF: number;
  readonly hours: number;
  /** Longer is allowed by this much, shorter not at all. */
  readonly plusMin: number;
  readonly tensileKsiMin: number;
  readonly hrc: readonly [number, number];
}

/** 15-5PH takes the same conditions by AMS 2759/3 (from memory). */
const BOTH = { steels: ['17-4PH', '15-5PH'], toleranceF: 10, source: CYCLE_READ } as const;

export const PH_STEEL_CONDITIONS: Table<PhSteelConditionRow> = {
  id: 'ph-steel-conditions',
  title: 'Ageing conditions of 17-4PH and 15-5PH',
  edition: 'AMS 5643 and AMS 2759/3',
  rows: [
    { ...BOTH, condition: 'H900', ageF: 900, hours: 1, plusMin: 15, tensileKsiMin: 190, hrc: [40, 47] },
    { ...BOTH, condition: 'H925', ageF: 925, hours: 4, plusMin: 30, tensileKsiMin: 170, hrc: [38, 45] },
    { ...BOTH, condition: 'H1025', ageF: 1025, hours: 4, plusMin: 30, tensileKsiMin: 155, hrc: [35, 42] },
    { ...BOTH, condition: 'H1075', ageF: 1075, hours: 4, plusMin: 30, tensileKsiMin: 145, hrc: [31, 39] },
    { ...BOTH, condition: 'H1100', ageF: 1100, hours: 4, plusMin: 30, tensileKsiMin: 140, hrc: [31, 38] },
    { ...BOTH, condition: 'H1150', ageF: 1150, hours: 4, plusMin: 30, tensileKsiMin: 135, hrc: [28, 37] },
  ],
};
