import type { Source } from '../source';
import type { Table } from '../table';

export type NdtMethod = 'penetrant' | 'magnetic_particle' | 'temper_etch';

/** As printed. */
export type NdtUnit =
  'min' | 'h' | 's' | 'F' | 'lux' | 'uW/cm2' | 'ml/100 ml' | 'gauss' | '%' | 'in' | 'ksi' | 'count';

export const NDT_ITEMS = [
  'penetrant_dwell',
  'penetrant_temperature',
  'reapply_penetrant',
  'longest_dwell',
  'emulsifier_immersion',
  'emulsifier_spray',
  'drying_temperature',
  'dry_developer',
  'non_aqueous_developer',
  'aqueous_developer',
  'visible_light',
  'uva_irradiance',
  'ambient_light',
  'wet_fluorescent_bath',
  'wet_visible_bath',
  'shots',
  'shot_time',
  'field',
  'residual_field',
  'etch_inspection_light',
  'etch_bake_start',
  'etch_bake_temperature',
  'etch_bake_time',
  'etch_from_strength',
  'etch_removal',
] as const;
export type NdtItem = (typeof NDT_ITEMS)[number];

export interface NdtFigureRow {
  readonly method: NdtMethod;
  readonly item: NdtItem;
  readonly unit: NdtUnit;
  readonly min?: number;
  readonly max?: number;
  readonly isAbout?: true;
}

const E1417: Source = { document: 'ASTM E1417/E1417M', confidence: 'memory', certainty: 'high' };
const E1444: Source = { document: 'ASTM E1444/E1444M', confidence: 'memory', certainty: 'medium' };
const ETCH: Source = {
  document: 'MIL-STD-867C 5.4-5.5',
  confidence: 'read',
  certainty: 'high',
  address: 'https://nondestructivetestinginspection.emilspec.com/MIL-STD-867/page14.html',
};
const ETCH_SCOPE: Source = {
  document: 'AMS 2649C, on a secondary page',
  confidence: 'read',
  certainty: 'high',
};

const PT = { method: 'penetrant', source: E1417 } as const;
const MT = { method: 'magnetic_particle', source: E1444 } as const;
const TE = { method: 'temper_etch', source: ETCH } as const;

export const NDT_FIGURES: Table<NdtFigureRow> = {
  id: 'ndt-figures',
  title: 'Times, temperatures, light and fields of non-destructive testing',
  edition: 'ASTM E1417, ASTM E1444, MIL-STD-867C',
  rows: [
    { ...PT, item: 'penetrant_dwell', unit: 'min', min: 10 },
    { ...PT, item: 'penetrant_temperature', unit: 'F', min: 40, max: 125 },
    { ...PT, item: 'reapply_penetrant', unit: 'min', max: 60 },
    { ...PT, item: 'longest_dwell', unit: 'min', max: 240 },
    { ...PT, item: 'emulsifier_immersion', unit: 'min', max: 2 },
    { ...PT, item: 'emulsifier_spray', unit: '%', max: 5 },
    { ...PT, item: 'drying_temperature', unit: 'F', max: 160 },
    { ...PT, item: 'dry_developer', unit: 'min', min: 10, max: 240 },
    { ...PT, item: 'non_aqueous_developer', unit: 'min', min: 10, max: 60 },
    { ...PT, item: 'aqueous_developer', unit: 'min', min: 10, max: 120 },
    { ...PT, item: 'visible_light', unit: 'lux', min: 1076 },
    { ...PT, item: 'uva_irradiance', unit: 'uW/cm2', min: 1000 },
    { ...PT, item: 'ambient_light', unit: 'lux', max: 20 },
    { ...MT, item: 'uva_irradiance', unit: 'uW/cm2', min: 1000 },
    { ...MT, item: 'ambient_light', unit: 'lux', max: 20 },
    { ...MT, item: 'wet_fluorescent_bath', unit: 'ml/100 ml', min: 0.1, max: 0.4 },
    { ...MT, item: 'wet_visible_bath', unit: 'ml/100 ml', min: 1.2, max: 2.4 },
    { ...MT, item: 'shots', unit: 'count', min: 2 },
    { ...MT, item: 'shot_time', unit: 's', min: 0.5, isAbout: true },
    { ...MT, item: 'field', unit: 'gauss', min: 30, max: 60 },
    { ...MT, item: 'residual_field', unit: 'gauss', max: 3 },
    { ...TE, item: 'etch_inspection_light', unit: 'lux', min: 2153 },
    { ...TE, item: 'etch_bake_start', unit: 'h', max: 8 },
    { ...TE, item: 'etch_bake_temperature', unit: 'F', min: 350, max: 400 },
    { ...TE, item: 'etch_bake_time', unit: 'h', min: 4 },
    { ...TE, item: 'etch_from_strength', unit: 'ksi', min: 180, source: ETCH_SCOPE },
    { ...TE, item: 'etch_removal', unit: 'in', min: 0.0001, max: 0.0005, source: ETCH_SCOPE },
  ],
};
