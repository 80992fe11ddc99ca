import type { DimensionReason } from '@/lib/trade/finishes/dimension-change';
import type { BuildUpSurface, BuildUpTreatment } from '@/lib/trade/tables/build-up';

export const TREATMENTS: Record<BuildUpTreatment, string> = {
  plating: 'plating',
  anodize_type_i: 'anodize, type I',
  anodize_type_ii: 'anodize, type II',
  anodize_type_iii: 'anodize, type III (hard)',
  conversion_coating: 'chemical film',
};

export const SURFACES: Record<BuildUpSurface, string> = {
  outside_diameter: 'outside diameter',
  bore: 'bore',
  flat: 'one face',
  external_thread_pitch_diameter: '60° thread outside, pitch diameter',
  internal_thread_pitch_diameter: '60° thread inside, pitch diameter',
  external_thread_major_diameter: '60° thread outside, major diameter',
  external_thread_minor_diameter: '60° thread outside, minor diameter',
};

const REFUSALS: Record<DimensionReason | 'limits_upside_down' | 'coating_takes_the_tolerance', string> = {
  thickness_not_a_range: 'The thickness must be 0 or more, the least not over the most.',
  share_not_between_0_and_1: 'The share that grows outward lies between 0 and 100 %.',
  treatment_not_in_table: 'The tables say nothing about the growth of this finish. Ask your processor.',
  surface_not_in_table: 'The tables say nothing about this surface.',
  limits_upside_down: 'The least limit is over the most. Enter them the other way round.',
  coating_takes_the_tolerance:
    'The spread of the coating takes the whole tolerance: nothing is left to machine to. Ask for a narrower coating or a wider tolerance.',
};

export const buildUpRefusal = (reason: keyof typeof REFUSALS): string => REFUSALS[reason];
