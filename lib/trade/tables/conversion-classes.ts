import type { Certainty, Source } from '../source';
import type { Table } from '../table';
import type { FinishRow } from './finish-row';

const FILM_PAGE = 'https://metalfinishesandfinishingprocessesa.emilspec.com/MIL-DTL-81706/page5.html';
const anodizeTypes = (certainty: Certainty): Source => ({
  document: 'MIL-A-8625F Table IV (6.10.5), typical thickness from memory; types read',
  confidence: 'read+memory',
  certainty,
  address: 'https://ru.scribd.com/document/431507752/MIL-A-8625',
});
const ANODIZE_CLASSES: Source = {
  document: 'MIL-A-8625F 1.2.2',
  confidence: 'read',
  certainty: 'high',
  address: 'https://ru.scribd.com/document/431507752/MIL-A-8625',
};
const ANODIZE_CORROSION: Source = {
  document: 'MIL-A-8625F, performance requirement as tabled',
  confidence: 'read',
  certainty: 'high',
  address: 'https://metalfinishing.epubxp.com/i/49721-2011-2012-surface-finishing-guidebook/277',
};
const ANODIZE_WEIGHTS: Source = {
  document: 'MIL-A-8625F Table I',
  confidence: 'memory',
  certainty: 'medium',
};
const FILM_TYPES: Source = {
  document: 'MIL-DTL-5541F 1.2.1',
  confidence: 'read',
  certainty: 'high',
  address: 'http://ishare.iask.sina.com.cn/f/37654088.html',
};
const FILM_CLASSES: Source = {
  document: 'MIL-DTL-5541F 1.2.2; hours: MIL-DTL-81706B Table I',
  confidence: 'read',
  certainty: 'high',
  address: FILM_PAGE,
};
const FILM_HOURS: Source = { ...FILM_CLASSES, document: 'MIL-DTL-81706B Table I' };
const FILM_WEIGHT: Source = { ...FILM_CLASSES, document: 'MIL-DTL-81706B 3.6' };
const PHOSPHATE: Source = { document: 'DOD-P-16232F', confidence: 'memory', certainty: 'medium' };

const ANODIZE = { finish: 'anodize', specifications: ['MIL-A-8625', 'MIL-PRF-8625'] } as const;
/** Sealed: 336 h of salt spray, and the oxide begins to craze at about 180 °F. */
const SEALED = { ...ANODIZE, saltSprayHours: 336, mostF: 180 } as const;
const THIN = { unit: 'in', min: 0.00002, max: 0.0007 } as const;
const FILM = {
  finish: 'conversion_coating',
  specifications: ['MIL-DTL-5541', 'MIL-C-5541'],
  mostF: 140,
} as const;
const FILM_MATERIAL = { finish: 'conversion_coating', specifications: ['MIL-DTL-81706'] } as const;
const PHOSPHATES = {
  finish: 'phosphate',
  specifications: ['DOD-P-16232', 'MIL-DTL-16232'],
  source: PHOSPHATE,
} as const;

const weighing = (min: number, max?: number) =>
  ({ unit: 'mg/ft2', min, ...(max !== undefined && { max }) }) as const;

export const CONVERSION_CLASSES: Table<FinishRow> = {
  id: 'conversion-classes',
  title: 'Anodic, chemical and phosphate coatings by type and class',
  edition: 'MIL-A-8625F, MIL-DTL-5541F, MIL-DTL-81706B, DOD-P-16232F',
  rows: [
    { ...SEALED, for: { type: 'I' }, says: 'chromic acid', thickness: THIN, source: anodizeTypes('high') },
    {
      ...SEALED,
      for: { type: 'IB' },
      says: 'chromic acid, 22 ± 2 V',
      thickness: THIN,
      source: anodizeTypes('high'),
    },
    {
      ...SEALED,
      for: { type: 'IC' },
      says: 'without chromium',
      thickness: THIN,
      source: anodizeTypes('medium'),
    },
    {
      ...SEALED,
      for: { type: 'IIB' },
      says: 'thin sulfuric',
      thickness: THIN,
      source: anodizeTypes('medium'),
    },
    {
      ...SEALED,
      for: { type: 'II' },
      says: 'sulfuric',
      thickness: { unit: 'in', min: 0.00007, max: 0.001 },
      source: anodizeTypes('high'),
    },
    {
      ...SEALED,
      for: { type: 'III' },
      says: 'hard',
      thickness: { unit: 'in', min: 0.0005, max: 0.0045, nominal: 0.002 },
      source: anodizeTypes('high'),
    },
    { ...ANODIZE, for: { class: '1' }, says: 'undyed', source: ANODIZE_CLASSES },
    { ...ANODIZE, for: { class: '2' }, says: 'dyed', source: ANODIZE_CLASSES },
    { ...ANODIZE, for: {}, says: '5 % salt spray', saltSprayHours: 336, source: ANODIZE_CORROSION },
    { ...ANODIZE, for: { type: 'I', class: '1' }, weight: weighing(200), source: ANODIZE_WEIGHTS },
    { ...ANODIZE, for: { type: 'IB', class: '1' }, weight: weighing(200), source: ANODIZE_WEIGHTS },
    { ...ANODIZE, for: { type: 'IC' }, weight: weighing(200, 700), source: ANODIZE_WEIGHTS },
    { ...ANODIZE, for: { type: 'IIB' }, weight: weighing(200, 1000), source: ANODIZE_WEIGHTS },
    { ...ANODIZE, for: { type: 'II', class: '1' }, weight: weighing(1000), source: ANODIZE_WEIGHTS },
    { ...ANODIZE, for: { type: 'I', class: '2' }, weight: weighing(500), source: ANODIZE_WEIGHTS },
    { ...ANODIZE, for: { type: 'IB', class: '2' }, weight: weighing(500), source: ANODIZE_WEIGHTS },
    { ...ANODIZE, for: { type: 'II', class: '2' }, weight: weighing(2500), source: ANODIZE_WEIGHTS },
    { ...FILM, for: { type: 'I' }, says: 'with hexavalent chromium', source: FILM_TYPES },
    { ...FILM, for: { type: 'II' }, says: 'without hexavalent chromium', source: FILM_TYPES },
    {
      ...FILM,
      for: { class: '1A' },
      says: 'most corrosion protection',
      saltSprayHours: 168,
      source: FILM_CLASSES,
    },
    {
      ...FILM,
      for: { class: '3' },
      says: 'low electrical resistance',
      saltSprayHours: 168,
      source: FILM_CLASSES,
    },
    {
      ...FILM_MATERIAL,
      for: { class: '1A' },
      says: 'on 2024-T3 and 7075-T6',
      saltSprayHours: 168,
      qualificationHours: 336,
      source: FILM_HOURS,
    },
    {
      ...FILM_MATERIAL,
      for: { class: '3' },
      says: 'on 6061-T6',
      saltSprayHours: 168,
      qualificationHours: 168,
      source: FILM_HOURS,
    },
    { ...FILM_MATERIAL, for: { type: 'I', class: '1A' }, weight: weighing(40), source: FILM_WEIGHT },
    {
      ...PHOSPHATES,
      for: { type: 'M' },
      says: 'manganese',
      weight: { unit: 'g/m2', min: 16 },
      saltSprayHours: 1.5,
    },
    { ...PHOSPHATES, for: { type: 'Z' }, says: 'zinc', weight: { unit: 'g/m2', min: 11 }, saltSprayHours: 2 },
  ],
};
