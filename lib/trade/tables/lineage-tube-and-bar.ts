import type { LineageEvent } from '../lineage/lineage-event';
import type { Source } from '../source';
import type { Table } from '../table';

const TUBE_TABLE: Source = {
  document: 'TM 1-1500-204-23-6 Table 4-6',
  confidence: 'read',
  certainty: 'high',
  address: 'https://aviationmiscmanuals.tpub.com/TM-1-1500-204-23-6/css/TM-1-1500-204-23-6_124.htm',
};

const AMS_S_6758_NOTICE: Source = {
  document: 'AMS-S-6758 noncurrency notice',
  confidence: 'read',
  certainty: 'high',
  address: 'https://ar.scribd.com/document/414508518/AMS-S-6758-4130-Steel',
};

const RECALLED: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'medium',
};

const MIL_T_6736B_TEXT: Source = {
  document: 'MIL-T-6736B',
  confidence: 'read',
  certainty: 'high',
  address: 'https://scribd.com/document/574005729/MIL-T-6736B',
};

const TUBE_FORUM: Source = {
  document: 'Builders on current 4130 tube specifications',
  confidence: 'read',
  certainty: 'high',
  address:
    'https://bearhawkforums.com/forum/tools-technics-and-best-practices/7708-current-4130-tubing-specifications',
};

const AMS_T_6735B_COVER: Source = {
  document: 'AMS-T-6735B',
  confidence: 'read',
  certainty: 'high',
  address: 'https://documentspdfs.org/102793-SAEAMST6735B.html',
};

/** Tube, bar and steel sheet. An alternative gives no authority to substitute. */
export const TUBE_AND_BAR_LINEAGE: Table<LineageEvent>['rows'] = [
  { number: 'WW-T-700/2', event: 'current', source: TUBE_TABLE },
  { number: 'WW-T-700/4', event: 'current', source: TUBE_TABLE },
  { number: 'WW-T-700/6', event: 'current', source: TUBE_TABLE },
  { number: 'MIL-T-7081', event: 'alternative', successors: [{ number: 'WW-T-700/6' }], source: TUBE_TABLE },
  {
    number: 'MIL-S-6758',
    event: 'superseded',
    on: '1998-07',
    successors: [{ number: 'AMS-S-6758' }],
    source: AMS_S_6758_NOTICE,
  },
  { number: 'AMS-S-6758', event: 'noncurrent', on: '2003-09', source: AMS_S_6758_NOTICE },
  {
    number: 'AMS-S-6758',
    event: 'alternative',
    successors: [{ number: 'AMS6346' }, { number: 'AMS6348' }, { number: 'AMS6370' }, { number: 'AMS6528' }],
    source: AMS_S_6758_NOTICE,
  },
  { number: 'AN-QQ-S-685', event: 'superseded', successors: [{ number: 'MIL-S-18729' }], source: RECALLED },
  { number: 'MIL-S-18729', event: 'superseded', successors: [{ number: 'AMS-S-18729' }], source: RECALLED },
  {
    number: 'AMS-S-18729',
    event: 'alternative',
    successors: [{ number: 'AMS6345' }, { number: 'AMS6350' }, { number: 'AMS6351' }],
    source: RECALLED,
  },
  { number: 'MIL-T-6731', event: 'issued', on: '1950-06-12', source: MIL_T_6736B_TEXT },
  {
    number: 'MIL-T-6731',
    event: 'superseded',
    successors: [{ number: 'MIL-T-6736' }],
    source: MIL_T_6736B_TEXT,
  },
  {
    number: 'MIL-T-6736',
    revision: 'B',
    event: 'cancelled',
    on: '1998',
    successors: [{ number: 'AMS-T-6736' }],
    source: TUBE_FORUM,
  },
  {
    number: 'AMS-T-6736',
    event: 'alternative',
    successors: [
      { number: 'AMS6360' },
      { number: 'AMS6361' },
      { number: 'AMS6362' },
      { number: 'AMS6371' },
      { number: 'AMS6373' },
    ],
    source: TUBE_FORUM,
  },
  {
    number: 'MIL-T-6735',
    event: 'superseded',
    on: '2007-12',
    successors: [{ number: 'AMS-T-6735', revision: 'B' }],
    source: AMS_T_6735B_COVER,
  },
  { number: 'AMS-T-6735', revision: 'B', event: 'issued', on: '2007-12', source: AMS_T_6735B_COVER },
];
