import type { Source } from '../source';
import type { Table } from '../table';

export const EXPOSURE_ITEMS = [
  'conversion_coating',
  'chromate_on_cadmium_or_zinc',
  'cadmium_service',
  'zinc_service',
  'sealed_anodize',
  'peened_steel',
  'peened_aluminium',
  'peened_titanium',
  'worked_high_strength_steel_bake',
  'hardened_steel_bake',
  'aluminium_t3_t4_bake',
  'aluminium_t6_t73_bake',
] as const;
export type ExposureItem = (typeof EXPOSURE_ITEMS)[number];

/** How hot a finished part may get, later in the shop or in service. */
export interface ExposureLimitRow {
  readonly item: ExposureItem;
  readonly limit:
    | { readonly mostF: number; readonly mostC: number }
    /** At least this far below the temperature that the part was tempered at. */
    | { readonly belowTemperF: number; readonly belowTemperC: number }
    /** Below the temperature that the part was aged at, and short. */
    | 'below_its_ageing';
  readonly because:
    | 'film_dehydrates'
    | 'cadmium_embrittles_hot_steel'
    | 'coating_fails'
    | 'film_crazes'
    | 'peening_is_relieved'
    | 'would_over_temper'
    | 'begins_to_age'
    | 'would_over_age';
}

const CADMIUM_CHROMATE: Source = {
  document: 'QQ-P-416 / B633 practice',
  confidence: 'memory',
  certainty: 'medium',
};
const PEENING: Source = { document: 'AMS-S-13165 / MIL-S-13165C', confidence: 'memory', certainty: 'medium' };
const ETCH_PAGE = 'https://nondestructivetestinginspection.emilspec.com/MIL-STD-867/page14.html';

export const EXPOSURE_LIMITS: Table<ExposureLimitRow> = {
  id: 'exposure-limits',
  title: 'Highest temperatures for finished parts',
  edition: 'The documents named in each row',
  rows: [
    {
      item: 'conversion_coating',
      limit: { mostF: 140, mostC: 60 },
      because: 'film_dehydrates',
      source: {
        document: 'MIL-DTL-5541F 6.14',
        confidence: 'read',
        certainty: 'high',
        address: 'https://metalfinishesandfinishingprocessesa.emilspec.com/MIL-DTL-5541/page11.html',
      },
    },
    {
      item: 'chromate_on_cadmium_or_zinc',
      limit: { mostF: 150, mostC: 66 },
      because: 'film_dehydrates',
      source: CADMIUM_CHROMATE,
    },
    {
      item: 'cadmium_service',
      limit: { mostF: 450, mostC: 232 },
      because: 'cadmium_embrittles_hot_steel',
      source: { document: 'QQ-P-416F 6.1', confidence: 'memory', certainty: 'high' },
    },
    {
      item: 'zinc_service',
      limit: { mostF: 500, mostC: 260 },
      because: 'coating_fails',
      source: { document: 'B633 practice', confidence: 'memory', certainty: 'low' },
    },
    {
      item: 'sealed_anodize',
      limit: { mostF: 180, mostC: 82 },
      because: 'film_crazes',
      source: { document: 'MIL-A-8625 practice', confidence: 'memory', certainty: 'medium' },
    },
    {
      item: 'peened_steel',
      limit: { mostF: 475, mostC: 246 },
      because: 'peening_is_relieved',
      source: {
        document: 'AMS-S-13165 as quoted by a user',
        confidence: 'read',
        certainty: 'high',
        address: 'https://www.shotpeener.com/forums/ubbthreads.php?ubb=showthreaded&Number=436&an=',
      },
    },
    {
      item: 'peened_aluminium',
      limit: { mostF: 200, mostC: 93 },
      because: 'peening_is_relieved',
      source: PEENING,
    },
    {
      item: 'peened_titanium',
      limit: { mostF: 600, mostC: 316 },
      because: 'peening_is_relieved',
      source: PEENING,
    },
    {
      item: 'worked_high_strength_steel_bake',
      limit: { mostF: 400, mostC: 204 },
      because: 'peening_is_relieved',
      source: { document: 'MIL-STD-867C 5.5.1', confidence: 'read', certainty: 'high', address: ETCH_PAGE },
    },
    {
      item: 'hardened_steel_bake',
      limit: { belowTemperF: 50, belowTemperC: 28 },
      because: 'would_over_temper',
      source: { document: 'MIL-STD-867C 5.5', confidence: 'read', certainty: 'high', address: ETCH_PAGE },
    },
    {
      item: 'aluminium_t3_t4_bake',
      limit: { mostF: 212, mostC: 100 },
      because: 'begins_to_age',
      source: { document: 'Trade practice, no source', confidence: 'memory', certainty: 'medium' },
    },
    {
      item: 'aluminium_t6_t73_bake',
      limit: 'below_its_ageing',
      because: 'would_over_age',
      source: { document: 'AMS 2770 practice', confidence: 'memory', certainty: 'medium' },
    },
  ],
};
