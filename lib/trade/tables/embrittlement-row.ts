import type { Revisions } from '../finishes/called-revision';

/** What a part is, as far as the rules make a difference. */
export type HardenedPartKind = 'through_hardened' | 'threaded_fastener' | 'case_hardened' | 'ph_stainless';

/**
 * One rule of one document at one revision. There is no threshold that holds for all, and revisions differ: the same
 * number went from 3 hours to 23.
 */
export interface EmbrittlementRow {
  readonly specifications: readonly string[];
  readonly revisions: Revisions;
  readonly treatment: 'embrittlement_relief' | 'stress_relief' | 'not_to_be_plated' | 'special_cleaning';
  /** Without it, any part. */
  readonly kinds?: readonly HardenedPartKind[];
  /** Only where the part was machined, ground, cold formed or straightened after hardening. */
  readonly onlyWorked?: true;
  /** Any of them reached is enough. Without it, whatever the strength. */
  readonly from?: {
    readonly hrc?: number;
    readonly ksi?: number;
    readonly mpa?: number;
    readonly isOver?: true;
  };
  /** As printed, in °F or °C. */
  readonly temperature?: { readonly unit: 'F' | 'C'; readonly range: readonly [number, number] };
  /** By strength: read from the bake table of the document named in `by`. */
  readonly hours?: readonly [number, number] | 'by_strength';
  /** The length is settled with the purchaser. */
  readonly isHoursAgreed?: true;
  /** Where the cycle stands in another document. */
  readonly by?: string;
  readonly startWithinHours?: number;
  readonly startWithinHoursPreferred?: number;
  /** Instead of the bake: this long at room temperature. */
  readonly orRoomTemperatureHours?: number;
  /** The class that holds when the purchaser names none. */
  readonly classWhenUnnamed?: string;
}

/** 375 °F, 25 °F to either side: what most documents bake at. */
export const FROM_350_TO_400_F = { unit: 'F', range: [350, 400] } as const;
