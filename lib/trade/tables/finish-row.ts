import type { Designation } from '../finishes/read-designation';

export type Finish =
  | 'cadmium'
  | 'zinc'
  | 'nickel'
  | 'electroless_nickel'
  | 'chromium'
  | 'anodize'
  | 'conversion_coating'
  | 'phosphate'
  | 'ion_vapour_aluminium';

/** What one designation of one specification stands for. */
export interface FinishRow {
  readonly finish: Finish;
  readonly specifications: readonly string[];
  /** The row holds where all of these are called. */
  readonly for: Designation;
  readonly says?: string;
  /** As printed. */
  readonly thickness?: {
    readonly unit: 'in' | 'um';
    readonly min?: number;
    readonly max?: number;
    readonly nominal?: number;
  };
  readonly saltSprayHours?: number;
  readonly saltSprayTo?: 'white_corrosion';
  /** Hours that the process itself is qualified by; lots are tested for fewer. */
  readonly qualificationHours?: number;
  readonly weight?: { readonly unit: 'mg/ft2' | 'g/m2'; readonly min: number; readonly max?: number };
  readonly mostF?: number;
  /** Baked to harden the coating. */
  readonly hardeningF?: readonly [number, number];
}
