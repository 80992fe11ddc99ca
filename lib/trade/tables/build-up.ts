import type { Source } from '../source';
import type { Table } from '../table';

export type BuildUpSurface =
  | 'flat'
  | 'outside_diameter'
  | 'bore'
  | 'external_thread_pitch_diameter'
  | 'internal_thread_pitch_diameter'
  | 'external_thread_major_diameter'
  | 'external_thread_minor_diameter';

/** A dimension moves by so many times what the coating grows outward on one face. */
export interface SurfaceRow {
  readonly surface: BuildUpSurface;
  readonly timesGrowth: number;
}

const GEOMETRY: Source = {
  document: 'Thread geometry, 60° flank: 2T / sin 30° = 4T; ASME B1.1 / FED-STD-H28 practice',
  confidence: 'memory',
  certainty: 'high',
};
const FINISHER: Source = {
  document:
    'Finisher’s article on dimensions before plating; factor 4 of the pitch diameter from memory and geometry',
  confidence: 'read+memory',
  certainty: 'high',
  address:
    'https://globalmetalfinishing.com/tips-and-news/an-easier-way-to-determine-pre-plating-dimensions-for-cnc-machining/',
};

export const BUILD_UP_SURFACES: Table<SurfaceRow> = {
  id: 'build-up-surfaces',
  title: 'How a dimension follows the growth of a coating',
  edition: 'Geometry of the 60° thread',
  rows: [
    { surface: 'flat', timesGrowth: 1, source: GEOMETRY },
    { surface: 'outside_diameter', timesGrowth: 2, source: GEOMETRY },
    { surface: 'bore', timesGrowth: -2, source: GEOMETRY },
    { surface: 'external_thread_pitch_diameter', timesGrowth: 4, source: GEOMETRY },
    { surface: 'internal_thread_pitch_diameter', timesGrowth: -4, source: GEOMETRY },
    { surface: 'external_thread_major_diameter', timesGrowth: 2, source: FINISHER },
    { surface: 'external_thread_minor_diameter', timesGrowth: 2, source: FINISHER },
  ],
};

export type BuildUpTreatment =
  'plating' | 'anodize_type_i' | 'anodize_type_ii' | 'anodize_type_iii' | 'conversion_coating';

/** Plating lies on the metal; anodize grows partly into it. */
export type GrowthRow = { readonly treatment: BuildUpTreatment } & (
  | { readonly outwardShare: readonly [part: number, of: number] }
  /** Whatever the coating measures, a face does not grow more than this. */
  | { readonly growthInMax: number }
);

const PROCESSOR = 'http://chemprocessing.com/page.asp?PageID=102';
const TRADE_PAGE = 'Questions and answers of the trade, on a secondary page';

export const COATING_GROWTH: Table<GrowthRow> = {
  id: 'coating-growth',
  title: 'How much of a coating’s thickness is growth',
  edition: 'Processors’ rules',
  rows: [
    { treatment: 'plating', outwardShare: [1, 1], source: GEOMETRY },
    {
      treatment: 'anodize_type_iii',
      outwardShare: [1, 2],
      source: {
        document: 'Processor’s rule: half in, half out',
        confidence: 'read',
        certainty: 'high',
        address: PROCESSOR,
      },
    },
    {
      treatment: 'anodize_type_ii',
      outwardShare: [1, 3],
      source: {
        document: `${TRADE_PAGE}: two thirds in, one third out`,
        confidence: 'read',
        certainty: 'medium',
      },
    },
    {
      treatment: 'anodize_type_ii',
      outwardShare: [1, 2],
      source: { document: `${TRADE_PAGE}: other shops use half`, confidence: 'read', certainty: 'medium' },
    },
    {
      treatment: 'anodize_type_i',
      growthInMax: 0.0001,
      source: {
        document: 'Processor’s rule: negligible',
        confidence: 'read',
        certainty: 'medium',
        address: PROCESSOR,
      },
    },
    {
      treatment: 'conversion_coating',
      growthInMax: 0,
      source: { document: 'MIL-DTL-5541 practice', confidence: 'memory', certainty: 'high' },
    },
  ],
};
