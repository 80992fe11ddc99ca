import type { Source } from '../source';
import type { Table } from '../table';
import type { AgeingRow } from './ageing-cycles';

const PRODUCER: Source = {
  document: 'aluminium producer heat-treat data page (alloys 6013/6061)',
  confidence: 'read',
  certainty: 'high',
  address: 'https://it.scribd.com/document/396525084/Tratamientos-termicos-aluminio',
};
const SECONDARY: Source = { document: 'secondary web page', confidence: 'read', certainty: 'low' };
const SECONDARY_7075: Source = {
  ...SECONDARY,
  address:
    'http://ww.substech.com/dokuwiki/doku.php?do=export_xhtml&id=wrought_aluminum-zinc-magnesium_alloy_7075',
};
const PROCESSOR: Source = {
  document: 'processor data page',
  confidence: 'read',
  certainty: 'medium',
  address: 'http://www.bodycote.com/en/services/heat-treatment/solution-and-age/aluminium-alloys.aspx',
};

/** Ageing as other publications give it; kept beside the specifications' table to compare with, not to work by. */
export const AGEING_ELSEWHERE: Table<AgeingRow> = {
  id: 'ageing-elsewhere',
  title: 'Ageing treatments in other publications',
  edition: 'Producer and processor data pages',
  rows: [
    {
      alloys: ['6061'],
      changes: [['T4', 'T6']],
      cycle: { kind: 'artificial', steps: [{ setF: [320, 320], hours: [18, 18] }] },
      source: PRODUCER,
    },
    {
      alloys: ['6061'],
      changes: [['T4', 'T6']],
      cycle: { kind: 'artificial', steps: [{ setF: [350, 350], hours: [8, 8] }] },
      source: PRODUCER,
    },
    {
      alloys: ['6013'],
      changes: [['T4', 'T6']],
      cycle: { kind: 'artificial', steps: [{ setF: [375, 375], hours: [4, 4] }] },
      source: PRODUCER,
    },
    {
      alloys: ['2024'],
      changes: [['W', 'T6']],
      cycle: { kind: 'artificial', steps: [{ setF: [375, 375], hours: [10, 10] }] },
      source: SECONDARY,
    },
    {
      alloys: ['7075'],
      changes: [['W', 'T6']],
      cycle: { kind: 'artificial', steps: [{ setF: [250, 250] }] },
      source: SECONDARY_7075,
    },
    {
      alloys: ['2014', '2017', '2024', '2117', '2219', '6013', '6061', '6063'],
      changes: [['AQ', 'T4']],
      cycle: { kind: 'natural', hours: 96 },
      source: PROCESSOR,
    },
  ],
};
