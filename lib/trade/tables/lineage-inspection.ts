import type { LineageEvent } from '../lineage/lineage-event';
import type { Source } from '../source';
import type { Table } from '../table';

const RECALLED: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'medium',
};

const ASTM_E1417_NOTE: Source = {
  document: 'ASTM E1417-13 note 1',
  confidence: 'read',
  certainty: 'high',
  address: 'https://www.scribd.com/document/435353676/ASTM-E1417-13-pdf',
};

const PENETRANT_HISTORY: Source = {
  document: 'History of the penetrant material specification',
  confidence: 'read',
  certainty: 'high',
  address: 'https://ndtlibrary.asnt.org/2015/HistoricalDevelopmentoftheSpecificationthatQualifiesPenetrants',
};

const ASTM_E1444_TEXT: Source = {
  document: 'ASTM E1444',
  confidence: 'read',
  certainty: 'high',
  address: 'https://scribd.com/document/622396678/E1444-1734968-1',
};

const MIL_STD_410_ENTRY: Source = {
  document: 'Catalogue entry of MIL-STD-410E; successor from memory',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'https://infostore.saiglobal.com/en-us/standards/mil-std-410-e-731261_saig_mil_mil_1697139/',
};

const MIL_S_13165B_AMENDMENT: Source = {
  document: 'MIL-S-13165B amendment 2',
  confidence: 'read',
  certainty: 'high',
  address: 'https://kanterella.com/ML20100B510',
};

const MIL_S_13165C_NOTICE: Source = {
  document: 'MIL-S-13165C notice of cancellation',
  confidence: 'read',
  certainty: 'high',
  address:
    'https://pdfslide.us/documents/notice-of-cancellation-19-february-1998-shot-peening-of-shot-peening-of-metal.html',
};

const PEENING_FORUM: Source = {
  document: 'Shot peening forum; date from memory',
  confidence: 'read+memory',
  certainty: 'medium',
  address: 'https://shotpeener.com/forums/ubbthreads.php?ubb=showthreaded&Number=458',
};

const MIL_STD_105_HISTORY: Source = {
  document: 'Teaching texts on sampling standards',
  confidence: 'read',
  certainty: 'high',
  address: 'https://smbvalidation.com/faq-ANSI.html',
};

const MIL_HDBK_5J_FOREWORD: Source = {
  document: 'MIL-HDBK-5J foreword',
  confidence: 'read',
  certainty: 'high',
  address: 'https://www.scribd.com/document/18751239/MILHBK5J-Metallic-Materials-for-Aerospace-Apps',
};

/** Inspection, peening, sampling, calibration, design values. */
export const INSPECTION_LINEAGE: Table<LineageEvent>['rows'] = [
  {
    number: 'MIL-I-6866',
    revision: 'B',
    event: 'superseded',
    successors: [{ number: 'MIL-STD-6866' }],
    source: RECALLED,
  },
  {
    number: 'MIL-STD-6866',
    event: 'superseded',
    successors: [{ number: 'ASTM E1417' }],
    source: ASTM_E1417_NOTE,
  },
  {
    number: 'MIL-I-25135',
    revision: 'original',
    event: 'issued',
    on: '1956-08-06',
    source: PENETRANT_HISTORY,
  },
  {
    number: 'MIL-I-25135',
    revision: 'E',
    event: 'superseded',
    successors: [{ number: 'AMS2644' }],
    source: PENETRANT_HISTORY,
  },
  {
    number: 'MIL-I-6868',
    revision: 'E',
    event: 'superseded',
    successors: [{ number: 'MIL-STD-1949' }],
    source: RECALLED,
  },
  {
    number: 'MIL-STD-1949',
    revision: 'A',
    event: 'superseded',
    successors: [{ number: 'ASTM E1444' }],
    source: ASTM_E1444_TEXT,
  },
  { number: 'ASTM E1444', revision: '22a', event: 'issued', on: '2022', source: ASTM_E1444_TEXT },
  {
    number: 'ASTM E1444',
    revision: '22a',
    event: 'alternative',
    successors: [{ number: 'ASTM E3024', covers: 'industrial_work' }],
    source: ASTM_E1444_TEXT,
  },
  {
    number: 'MIL-STD-453',
    revision: 'C',
    event: 'superseded',
    successors: [{ number: 'ASTM E1742' }],
    source: RECALLED,
  },
  { number: 'MIL-STD-410', revision: 'E', event: 'issued', on: '1991', source: MIL_STD_410_ENTRY },
  {
    number: 'MIL-STD-410',
    revision: 'E',
    event: 'superseded',
    on: '1997-12-31',
    successors: [{ number: 'NAS 410' }, { number: 'EN 4179' }],
    source: MIL_STD_410_ENTRY,
  },
  {
    number: 'MIL-STD-1537',
    revision: 'C',
    event: 'alternative',
    successors: [{ number: 'AMS2658' }, { number: 'ASTM E1004' }],
    source: RECALLED,
  },
  {
    number: 'MIL-STD-2154',
    event: 'superseded',
    on: '1998',
    successors: [{ number: 'AMS-STD-2154' }],
    source: RECALLED,
  },
  { number: 'MIL-S-13165', revision: 'A', event: 'issued', on: '1956-03-26', source: MIL_S_13165B_AMENDMENT },
  { number: 'MIL-S-13165', revision: 'B', event: 'issued', on: '1966-12-31', source: MIL_S_13165B_AMENDMENT },
  {
    number: 'MIL-S-13165',
    revision: 'B',
    event: 'amended',
    on: '1979-06-25',
    source: MIL_S_13165B_AMENDMENT,
  },
  { number: 'MIL-S-13165', revision: 'C', event: 'issued', on: '1989-06-07', source: MIL_S_13165C_NOTICE },
  { number: 'MIL-S-13165', revision: 'C', event: 'amended', on: '1991-11-27', source: MIL_S_13165C_NOTICE },
  {
    number: 'MIL-S-13165',
    revision: 'C',
    event: 'cancelled',
    on: '1998-02-19',
    successors: [{ number: 'AMS-S-13165' }],
    source: MIL_S_13165C_NOTICE,
  },
  {
    number: 'AMS-S-13165',
    revision: 'original',
    event: 'issued',
    on: '1997-11',
    source: MIL_S_13165C_NOTICE,
  },
  {
    number: 'AMS-S-13165',
    event: 'adopted',
    on: '1998-02-19',
    by: 'government_index',
    source: MIL_S_13165C_NOTICE,
  },
  {
    number: 'AMS-S-13165',
    event: 'superseded',
    on: '2007',
    successors: [{ number: 'AMS2430' }],
    source: PEENING_FORUM,
  },
  { number: 'MIL-STD-105', revision: 'E', event: 'issued', on: '1989-05-10', source: MIL_STD_105_HISTORY },
  {
    number: 'MIL-STD-105',
    revision: 'E',
    event: 'cancelled',
    on: '1995-02-27',
    successors: [{ number: 'ANSI/ASQ Z1.4' }, { number: 'ISO 2859-1' }],
    source: MIL_STD_105_HISTORY,
  },
  {
    number: 'MIL-STD-105',
    event: 'alternative',
    successors: [{ number: 'ASTM E2234' }],
    source: MIL_STD_105_HISTORY,
  },
  {
    number: 'MIL-STD-45662',
    revision: 'A',
    event: 'cancelled',
    on: '1995',
    successors: [{ number: 'ISO 10012' }, { number: 'ANSI/NCSL Z540-1' }, { number: 'ISO 17025' }],
    source: RECALLED,
  },
  { number: 'MIL-HDBK-5', revision: 'J', event: 'issued', on: '2003-01-31', source: MIL_HDBK_5J_FOREWORD },
  {
    number: 'MIL-HDBK-5',
    revision: 'J',
    event: 'superseded',
    successors: [{ number: 'MMPDS-01' }],
    source: MIL_HDBK_5J_FOREWORD,
  },
];
