import type { Source } from '../source';
import type { Table } from '../table';
import { FROM_350_TO_400_F, type EmbrittlementRow } from './embrittlement-row';

const SECONDARY = 'on a secondary page';
const B633: Source = {
  document: 'ASTM B633-19, introduction',
  confidence: 'read',
  certainty: 'high',
  address: 'https://www.scribd.com/document/725741269/ASTM-B633-19',
};
const B850: Source = {
  document: 'ASTM B850-98; start of the bake from memory',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'http://sonicplatinginc.com/services/baking-process/bake-chart/',
};
const AMS_2759_9: Source = {
  document: `AMS 2759/9D (2009-05) 1.2 and rationale, ${SECONDARY}; hours and start from memory`,
  confidence: 'read+memory',
  certainty: 'high',
};
const F1941: Source = {
  document: 'ASTM F1941 as restated by a plater (HRC 40 and 4 h read, HRC 39 from memory)',
  confidence: 'read+memory',
  certainty: 'medium',
  address: 'http://swplating.com/platings/baking/',
};
const USCAR: Source = {
  document: 'USCAR-5 / GMW3044 as quoted in a forum',
  confidence: 'read',
  certainty: 'medium',
  address: 'https://www.finishing.com/579/71.shtml',
};
const MIL_STD_867: Source = {
  document: 'MIL-STD-867C 5.5, 5.6.3',
  confidence: 'read',
  certainty: 'high',
  address: 'https://nondestructivetestinginspection.emilspec.com/MIL-STD-867/page14.html',
};
const USCAR_5 = { specifications: ['USCAR-5'], revisions: 'any', treatment: 'embrittlement_relief' } as const;
const AMS_9D = {
  specifications: ['AMS 2759/9'],
  revisions: { letters: ['D'] },
  treatment: 'embrittlement_relief',
  temperature: FROM_350_TO_400_F,
  // One paragraph was corrected back to 24.
  hours: [23, 24],
  startWithinHours: 4,
  source: AMS_2759_9,
} as const;

/** Zinc plating, fasteners, and practices that other documents lean on. */
export const PRACTICES_OF_EMBRITTLEMENT: Table<EmbrittlementRow>['rows'] = [
  {
    specifications: ['ASTM B633'],
    revisions: { fromYear: 2007 },
    treatment: 'embrittlement_relief',
    from: { mpa: 1200, hrc: 39 },
    hours: 'by_strength',
    by: 'ASTM B850',
    startWithinHours: 4,
    source: B633,
  },
  {
    specifications: ['ASTM B633'],
    revisions: { fromYear: 2007 },
    treatment: 'stress_relief',
    onlyWorked: true,
    from: { mpa: 1000, hrc: 31 },
    by: 'ASTM B849',
    source: { document: 'ASTM B633-07 6.4', confidence: 'memory', certainty: 'high' },
  },
  {
    specifications: ['ASTM B849', 'ISO 9587'],
    revisions: 'any',
    treatment: 'stress_relief',
    kinds: ['case_hardened'],
    temperature: { unit: 'C', range: [130, 160] },
    hours: [8, 8],
    source: {
      document: 'ASTM B849 table',
      confidence: 'memory',
      certainty: 'medium',
      address: 'https://www.ulstandardspdf.com/iso-9587-2007-pdf-free.html',
    },
  },
  {
    specifications: ['ISO 9587'],
    revisions: 'any',
    treatment: 'stress_relief',
    from: { mpa: 1000, hrc: 31 },
    temperature: { unit: 'C', range: [190, 230] },
    classWhenUnnamed: 'SR-1',
    source: {
      document: 'ISO 9587:2007; temperature ASTM B849 scope',
      confidence: 'read',
      certainty: 'high',
      address: 'https://www.ulstandardspdf.com/iso-9587-2007-pdf-free.html',
    },
  },
  {
    specifications: ['ASTM B849'],
    revisions: 'any',
    treatment: 'stress_relief',
    onlyWorked: true,
    from: { mpa: 1000 },
    temperature: { unit: 'C', range: [190, 230] },
    source: {
      document: 'ASTM B849 scope',
      confidence: 'read',
      certainty: 'high',
      address: 'https://ndls.org.cn/standard/detail/fb39d8766cf93078e63b336ab359a3f7',
    },
  },
  {
    specifications: ['ISO 9588', 'ASTM B850'],
    revisions: 'any',
    treatment: 'embrittlement_relief',
    from: { mpa: 1000 },
    temperature: { unit: 'C', range: [190, 220] },
    hours: 'by_strength',
    startWithinHours: 4,
    startWithinHoursPreferred: 1,
    source: B850,
  },
  { ...AMS_9D, kinds: ['threaded_fastener'], from: { ksi: 150, hrc: 34 } },
  { ...AMS_9D, kinds: ['case_hardened', 'ph_stainless'] },
  { ...AMS_9D, from: { ksi: 180, hrc: 40 } },
  {
    specifications: ['ASTM F1941'],
    revisions: { fromYear: 2010 },
    treatment: 'embrittlement_relief',
    from: { hrc: 39, isOver: true },
    temperature: { unit: 'F', range: [350, 450] },
    hours: [2, 24],
    isHoursAgreed: true,
    startWithinHours: 4,
    source: F1941,
  },
  {
    specifications: ['ASTM F1941'],
    revisions: { toYear: 2009 },
    treatment: 'embrittlement_relief',
    from: { hrc: 40 },
    temperature: { unit: 'F', range: [350, 450] },
    hours: [2, 24],
    isHoursAgreed: true,
    startWithinHours: 4,
    source: F1941,
  },
  // Automotive, for contrast; 8 h stands for what is over 390 HV.
  {
    ...USCAR_5,
    kinds: ['case_hardened'],
    from: { hrc: 35, isOver: true },
    temperature: { unit: 'C', range: [200, 200] },
    hours: [4, 8],
    source: USCAR,
  },
  {
    ...USCAR_5,
    kinds: ['through_hardened', 'threaded_fastener'],
    from: { hrc: 32, isOver: true },
    temperature: { unit: 'C', range: [200, 200] },
    hours: [4, 8],
    source: USCAR,
  },
  {
    specifications: ['MIL-STD-867'],
    revisions: { letters: ['C'] },
    treatment: 'embrittlement_relief',
    temperature: FROM_350_TO_400_F,
    hours: [4, 4],
    startWithinHours: 8,
    source: MIL_STD_867,
  },
  {
    specifications: ['Processor’s rule beside AMS 2759'],
    revisions: 'any',
    treatment: 'embrittlement_relief',
    from: { hrc: 30 },
    temperature: FROM_350_TO_400_F,
    hours: [3, 23],
    startWithinHours: 1,
    source: {
      document: 'A plater’s own rule, tighter than AMS 2759',
      confidence: 'read',
      certainty: 'low',
      address: 'http://www.smfi.net/portfolio/hydrogen-embrittlement-relief/',
    },
  },
];
