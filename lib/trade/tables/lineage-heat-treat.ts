import type { LineageEvent } from '../lineage/lineage-event';
import type { Source } from '../source';
import type { Table } from '../table';

const MIL_H_6088G_COVER: Source = {
  document: 'MIL-H-6088G cover and scope',
  confidence: 'read',
  certainty: 'high',
  address: 'https://fdocuments.net/document/mil-h-6088g-heat-treatment-of-aluminum-alloys.html',
};

const AMS_H_6088C_NOTICE: Source = {
  document: 'AMS-H-6088C cancellation notice',
  confidence: 'read',
  certainty: 'high',
  address: 'https://scribd.com/document/674330861/SAE-AMS-H-6088-C',
};

const INDEX_NOTE: Source = {
  document: 'Note on the US government index of adopted documents',
  confidence: 'read',
  certainty: 'medium',
  address: 'https://data-craft.co.jp/2007/03/01/90',
};

const AMS2770_EXTRACTS: Source = {
  document: 'Extracts of AMS2770R and AMS2770P',
  confidence: 'read',
  certainty: 'high',
  address: 'https://sae.freestandardsdocuments.com/?p=14',
};

const AMS2770R_NOTICE: Source = {
  document: 'AMS2770R notice',
  confidence: 'read',
  certainty: 'high',
};

const AMS2772G_SCOPE: Source = {
  document: 'AMS2772G scope',
  confidence: 'read',
  certainty: 'high',
  address: 'https://m.777doc.com/doc-4350562.html',
};

const MIL_H_6875H_COVER: Source = {
  document: 'MIL-H-6875H cover and scope',
  confidence: 'read',
  certainty: 'high',
  address: 'https://de.scribd.com/document/416425295/Mil-h-m875',
};

const MIL_H_6875H_PARTLY: Source = {
  document: 'MIL-H-6875H cover and scope; successor for parts from memory',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'https://de.scribd.com/document/416425295/Mil-h-m875',
};

const AMS_H_6875B_SCOPE: Source = {
  document: 'AMS-H-6875B scope',
  confidence: 'read',
  certainty: 'high',
  address: 'https://webstore.ansi.org/Standards/SAE/SAEAMS6875B2010',
};

const ENCYCLOPAEDIA: Source = {
  document: 'Encyclopaedia page on AMS-H-6875, weak',
  confidence: 'read',
  certainty: 'low',
  address: 'https://grokipedia.com/page/AMS-H-6875',
};

const AMS2759D_COVER: Source = {
  document: 'AMS2759D',
  confidence: 'read',
  certainty: 'high',
  address: 'https://zh.scribd.com/document/370328189/AMS-2759D',
};

const AMS2759_5D_COVER: Source = {
  document: 'AMS2759/5D',
  confidence: 'read',
  certainty: 'high',
  address: 'https://scribd.com/document/713571141/SAE-AMS-2759-5D-2014',
};

const RECALLED: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'medium',
};

const AMS2750F_TITLE: Source = {
  document: 'AMS2750F title page',
  confidence: 'read',
  certainty: 'high',
  address: 'https://www.scribd.com/document/581872668/SAE-AMS2750F-2020',
};

const AMS2750F_ARTICLE: Source = {
  document: 'Articles on AMS2750F',
  confidence: 'read',
  certainty: 'high',
  address: 'https://thermalprocessing.com/ams2750f-contains-key-pyrometric-changes/',
};

const AMS2750G_ARTICLE: Source = {
  document: 'Article on AMS2750G',
  confidence: 'read',
  certainty: 'high',
  address:
    'https://tav-vacuumfurnaces.com/blog/70/en/what-has-changed-in-ams-aerospace-material-specifications-2750-rev-g-',
};

const AMS2750H_ENTRY: Source = {
  document: 'AMS2750H catalogue entry',
  confidence: 'read',
  certainty: 'high',
  address: 'https://saemobilus.sae.org/standards/ams2750h-pyrometry',
};

/** Heat treatment and pyrometry. */
export const HEAT_TREAT_LINEAGE: Table<LineageEvent>['rows'] = [
  { number: 'MIL-H-6088', revision: 'F', event: 'issued', on: '1981-07-21', source: MIL_H_6088G_COVER },
  {
    number: 'MIL-H-6088',
    revision: 'F',
    event: 'superseded',
    on: '1991-04-01',
    successors: [{ number: 'MIL-H-6088', revision: 'G' }],
    source: MIL_H_6088G_COVER,
  },
  { number: 'MIL-H-6088', revision: 'G', event: 'issued', on: '1991-04-01', source: MIL_H_6088G_COVER },
  {
    number: 'MIL-H-6088',
    revision: 'G',
    event: 'superseded',
    on: '1997-07',
    successors: [{ number: 'AMS-H-6088' }],
    source: AMS_H_6088C_NOTICE,
  },
  { number: 'AMS-H-6088', revision: 'original', event: 'issued', on: '1997-07', source: AMS_H_6088C_NOTICE },
  {
    number: 'AMS-H-6088',
    revision: 'C',
    event: 'cancelled',
    on: '2000-07',
    successors: [
      { number: 'AMS2770', covers: 'parts' },
      { number: 'AMS2771', covers: 'castings' },
      { number: 'AMS2772', covers: 'raw_material' },
    ],
    source: AMS_H_6088C_NOTICE,
  },
  { number: 'AMS-H-6088', event: 'listed_active', on: '2000', by: 'government_index', source: INDEX_NOTE },
  { number: 'AMS-H-6088', event: 'listed_active', on: '2007', by: 'government_index', source: INDEX_NOTE },
  { number: 'AMS2770', revision: 'P', event: 'issued', on: '2019', source: AMS2770_EXTRACTS },
  { number: 'AMS2770', revision: 'R', event: 'issued', on: '2020', source: AMS2770R_NOTICE },
  { number: 'AMS2772', revision: 'original', event: 'issued', on: '1997-01', source: AMS2772G_SCOPE },
  { number: 'AMS2772', revision: 'E', event: 'issued', on: '2008-02', source: AMS2772G_SCOPE },
  { number: 'AMS2772', revision: 'G', event: 'issued', on: '2016-04', source: AMS2772G_SCOPE },
  { number: 'MIL-H-6875', revision: 'G', event: 'issued', on: '1983-09-16', source: MIL_H_6875H_COVER },
  {
    number: 'MIL-H-6875',
    revision: 'G',
    event: 'superseded',
    on: '1989-03-01',
    successors: [{ number: 'MIL-H-6875', revision: 'H' }],
    source: MIL_H_6875H_COVER,
  },
  { number: 'MIL-H-6875', revision: 'H', event: 'issued', on: '1989-03-01', source: MIL_H_6875H_COVER },
  {
    number: 'MIL-H-6875',
    revision: 'H',
    event: 'superseded',
    successors: [
      { number: 'AMS-H-6875', covers: 'raw_material' },
      { number: 'AMS2759', covers: 'parts' },
    ],
    source: MIL_H_6875H_PARTLY,
  },
  { number: 'AMS-H-6875', revision: 'B', event: 'issued', on: '2010', source: AMS_H_6875B_SCOPE },
  { number: 'AMS-H-6875', revision: 'C', event: 'issued', on: '2020', source: ENCYCLOPAEDIA },
  {
    number: 'AMS-H-6875',
    revision: 'C',
    event: 'stabilized',
    on: '2020',
    successors: [{ number: 'AMS2761' }],
    source: ENCYCLOPAEDIA,
  },
  { number: 'AMS2759', revision: 'original', event: 'issued', on: '1984-10', source: AMS2759D_COVER },
  { number: 'AMS2759', revision: 'D', event: 'issued', on: '2006-02', source: AMS2759D_COVER },
  { number: 'AMS2759/5', revision: 'D', event: 'issued', on: '2014-04', source: AMS2759_5D_COVER },
  {
    number: 'MIL-H-81200',
    revision: 'B',
    event: 'superseded',
    on: '1999',
    successors: [{ number: 'AMS-H-81200' }],
    source: RECALLED,
  },
  {
    number: 'AMS-H-81200',
    event: 'superseded',
    successors: [{ number: 'AMS2801', covers: 'parts' }],
    source: RECALLED,
  },
  { number: 'AMS2750', revision: 'C', event: 'issued', on: '1990', source: RECALLED },
  { number: 'AMS2750', revision: 'D', event: 'issued', on: '2005-09', source: RECALLED },
  { number: 'AMS2750', revision: 'E', event: 'issued', on: '2012-07', source: AMS2750F_TITLE },
  {
    number: 'AMS2750',
    revision: 'E',
    event: 'superseded',
    on: '2020-06',
    successors: [{ number: 'AMS2750', revision: 'F' }],
    source: AMS2750F_TITLE,
  },
  { number: 'AMS2750', revision: 'F', event: 'issued', on: '2020-06', source: AMS2750F_ARTICLE },
  { number: 'AMS2750', revision: 'G', event: 'issued', on: '2022-06', source: AMS2750G_ARTICLE },
  { number: 'AMS2750', revision: 'H', event: 'issued', on: '2024-07-15', source: AMS2750H_ENTRY },
];
