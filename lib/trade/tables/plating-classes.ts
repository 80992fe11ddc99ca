import type { Source } from '../source';
import type { Table } from '../table';
import type { FinishRow } from './finish-row';

const CADMIUM_CLASSES: Source = {
  document: 'QQ-P-416F (1 Oct 1991), carried on as AMS-QQ-P-416, 1.2.2',
  confidence: 'read',
  certainty: 'high',
  address: 'https://studylib.net/doc/18307411/ams-qq-p-416',
};
const CADMIUM_TYPES: Source = {
  document: 'QQ-P-416F 1.2.1; salt spray and temperature from memory',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'https://studylib.net/doc/18307411/ams-qq-p-416',
};
const B766: Source = {
  document: 'ASTM B766 as listed by a plater',
  confidence: 'read',
  certainty: 'high',
  address: 'http://shieldplating.com/services/cadmium-plating-services/',
};
const B633: Source = {
  document: 'ASTM B633 Tables 1 and 2 as posted',
  confidence: 'read',
  certainty: 'high',
  address: 'https://www.triangleoshkosh.com/resources/salt-spray-hour-data-sheet-on-electroplated-zinc/',
};
const NICKEL: Source = { document: 'QQ-N-290A', confidence: 'memory', certainty: 'low' };
const ELECTROLESS: Source = { document: 'MIL-C-26074E', confidence: 'memory', certainty: 'medium' };
const HARDENED_CASE: Source = {
  document: 'A case in a peening forum: 725 to 750 °F for 1 h after 350 °F for 4 h',
  confidence: 'read',
  certainty: 'high',
  address: 'https://www.shotpeener.com/forums/ubbthreads.php?ubb=showthreaded&Number=436&an=',
};
const CHROMIUM: Source = { document: 'QQ-C-320B', confidence: 'memory', certainty: 'medium' };
const IVD_HOURS: Source = {
  document: 'MIL-DTL-83488D Table 1; thickness and temperature from memory',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'https://metalfinishesandfinishingprocessesa.emilspec.com/MIL-DTL-83488/page5.html',
};

const CADMIUM = { finish: 'cadmium', specifications: ['QQ-P-416', 'AMS-QQ-P-416'] } as const;
const CADMIUM_B766 = { finish: 'cadmium', specifications: ['ASTM B766'], mostF: 450, source: B766 } as const;
const ZINC = { finish: 'zinc', specifications: ['ASTM B633'], source: B633 } as const;
const EN = {
  finish: 'electroless_nickel',
  specifications: ['MIL-C-26074', 'AMS-C-26074', 'AMS 2404'],
  source: ELECTROLESS,
} as const;
const CHROME = {
  finish: 'chromium',
  specifications: ['QQ-C-320', 'AMS-QQ-C-320'],
  mostF: 800,
  source: CHROMIUM,
} as const;
const NICKEL_290 = {
  finish: 'nickel',
  specifications: ['QQ-N-290', 'AMS-QQ-N-290'],
  mostF: 1000,
  source: NICKEL,
} as const;
const IVD = {
  finish: 'ion_vapour_aluminium',
  specifications: ['MIL-DTL-83488', 'MIL-C-83488'],
  mostF: 925,
  source: IVD_HOURS,
} as const;
const TO_WHITE = { saltSprayTo: 'white_corrosion' } as const;
/** Above this the chromate suffers. */
const CHROMATED = { mostF: 150 } as const;

const inches = (min: number) => ({ unit: 'in', min }) as const;
const microns = (min: number) => ({ unit: 'um', min }) as const;

export const PLATING_CLASSES: Table<FinishRow> = {
  id: 'plating-classes',
  title: 'Thickness and salt spray of plated coatings by class and type',
  edition: 'The documents named in each row',
  rows: [
    { ...CADMIUM, for: { class: '1' }, thickness: inches(0.0005), source: CADMIUM_CLASSES },
    { ...CADMIUM, for: { class: '2' }, thickness: inches(0.0003), source: CADMIUM_CLASSES },
    { ...CADMIUM, for: { class: '3' }, thickness: inches(0.0002), source: CADMIUM_CLASSES },
    { ...CADMIUM, for: { type: 'I' }, says: 'as plated', mostF: 450, source: CADMIUM_TYPES },
    {
      ...CADMIUM,
      for: { type: 'II' },
      says: 'chromate',
      saltSprayHours: 96,
      ...TO_WHITE,
      mostF: 450,
      source: CADMIUM_TYPES,
    },
    { ...CADMIUM, for: { type: 'III' }, says: 'phosphate', mostF: 450, source: CADMIUM_TYPES },
    { ...CADMIUM_B766, for: { class: '25' }, thickness: microns(25) },
    { ...CADMIUM_B766, for: { class: '12' }, thickness: microns(12) },
    { ...CADMIUM_B766, for: { class: '8' }, thickness: microns(8) },
    { ...CADMIUM_B766, for: { class: '5' }, thickness: microns(5) },
    { ...ZINC, for: { serviceCondition: '1', feZn: '5' }, says: 'mild', thickness: microns(5) },
    { ...ZINC, for: { serviceCondition: '2', feZn: '8' }, says: 'moderate', thickness: microns(8) },
    { ...ZINC, for: { serviceCondition: '3', feZn: '12' }, says: 'severe', thickness: microns(12) },
    { ...ZINC, for: { serviceCondition: '4', feZn: '25' }, says: 'very severe', thickness: microns(25) },
    { ...ZINC, for: { type: 'I' }, says: 'as plated' },
    {
      ...ZINC,
      for: { type: 'II' },
      says: 'coloured chromate',
      saltSprayHours: 96,
      ...TO_WHITE,
      ...CHROMATED,
    },
    {
      ...ZINC,
      for: { type: 'III' },
      says: 'colourless conversion',
      saltSprayHours: 12,
      ...TO_WHITE,
      ...CHROMATED,
    },
    { ...ZINC, for: { type: 'IV' }, says: 'phosphate' },
    {
      ...ZINC,
      for: { type: 'V' },
      says: 'colourless passivate',
      saltSprayHours: 72,
      ...TO_WHITE,
      ...CHROMATED,
    },
    {
      ...ZINC,
      for: { type: 'VI' },
      says: 'coloured passivate',
      saltSprayHours: 120,
      ...TO_WHITE,
      ...CHROMATED,
    },
    { ...NICKEL_290, for: { class: '1' }, says: 'corrosion protection' },
    { ...NICKEL_290, for: { class: '1', grade: 'A' }, thickness: inches(0.0016) },
    { ...NICKEL_290, for: { class: '2' }, says: 'engineering, thickness by the drawing' },
    { ...EN, for: { grade: 'A' }, thickness: inches(0.001) },
    { ...EN, for: { grade: 'B' }, thickness: inches(0.0005) },
    { ...EN, for: { grade: 'C' }, thickness: inches(0.0015) },
    { ...EN, for: { class: '2' }, says: 'hardened by a bake', hardeningF: [650, 750] },
    { ...EN, for: { class: '2' }, says: 'hardened by a bake', hardeningF: [725, 750], source: HARDENED_CASE },
    { ...CHROME, for: { class: '1' }, says: 'decorative', thickness: inches(0.00001) },
    {
      ...CHROME,
      for: { class: '2' },
      says: 'engineering, unless stated otherwise',
      thickness: inches(0.002),
    },
    { ...IVD, for: { class: '1' }, thickness: inches(0.001) },
    { ...IVD, for: { class: '2' }, thickness: inches(0.0005) },
    { ...IVD, for: { class: '3' }, thickness: inches(0.0003) },
    { ...IVD, for: { type: 'I', class: '1' }, saltSprayHours: 504 },
    { ...IVD, for: { type: 'I', class: '2' }, saltSprayHours: 336 },
    { ...IVD, for: { type: 'I', class: '3' }, saltSprayHours: 168 },
    { ...IVD, for: { type: 'II', class: '1' }, saltSprayHours: 672 },
    { ...IVD, for: { type: 'II', class: '2' }, saltSprayHours: 504 },
    { ...IVD, for: { type: 'II', class: '3' }, saltSprayHours: 336 },
  ],
};
