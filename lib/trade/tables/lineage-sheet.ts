import type { LineageEvent } from '../lineage/lineage-event';
import type { Source } from '../source';
import type { Table } from '../table';

const RECALLED_WEAKLY: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'low',
};

const RECALLED: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'medium',
};

const QQ_A_250_4E_TEXT: Source = {
  document: 'QQ-A-250/4E and AMS-QQ-A-250/4',
  confidence: 'read',
  certainty: 'high',
  address: 'https://scribd.com/document/498298447/SAE-AMS-QQ-A-250-4',
};

const AMS_QQ_A_250_5B_NOTICE: Source = {
  document: 'AMS-QQ-A-250/5B stabilization notice',
  confidence: 'read',
  certainty: 'high',
  address: 'https://scribd.com/document/730461691/AMS-QQ-A-250-5',
};

const AMS4036J_PAGE: Source = {
  document: 'AMS4036J',
  confidence: 'read',
  certainty: 'high',
  address: 'https://japan-ppt.com/sae-ams-4036j-pdf-download.html',
};

const AMS_QQ_A_250_10C_COVER: Source = {
  document: 'AMS-QQ-A-250/10C',
  confidence: 'read',
  certainty: 'high',
  address: 'https://m.mydoc123.com/d-1022659.html',
};

const AMS_QQ_A_200_11A_NOTICE: Source = {
  document: 'AMS-QQ-A-200/11A',
  confidence: 'read',
  certainty: 'high',
};

/** Sheet, plate and extrusion. An alternative gives no authority to substitute. */
export const SHEET_LINEAGE: Table<LineageEvent>['rows'] = [
  {
    number: 'AN-A-12',
    event: 'superseded',
    successors: [{ number: 'QQ-A-355' }, { number: 'QQ-A-362' }],
    source: RECALLED_WEAKLY,
  },
  {
    number: 'AN-A-13',
    event: 'superseded',
    successors: [{ number: 'QQ-A-355' }, { number: 'QQ-A-362' }],
    source: RECALLED_WEAKLY,
  },
  { number: 'QQ-A-355', event: 'superseded', successors: [{ number: 'QQ-A-250/4' }], source: RECALLED },
  { number: 'QQ-A-362', event: 'superseded', successors: [{ number: 'QQ-A-250/5' }], source: RECALLED },
  {
    number: 'QQ-A-250/4',
    revision: 'E',
    event: 'superseded',
    on: '1997-08',
    successors: [{ number: 'AMS-QQ-A-250/4' }],
    source: QQ_A_250_4E_TEXT,
  },
  { number: 'QQ-A-250/5', event: 'superseded', successors: [{ number: 'AMS-QQ-A-250/5' }], source: RECALLED },
  {
    number: 'AMS-QQ-A-250/4',
    revision: 'original',
    event: 'issued',
    on: '1997-08',
    source: QQ_A_250_4E_TEXT,
  },
  { number: 'AMS-QQ-A-250/4', revision: 'A', event: 'issued', on: '1998-09', source: QQ_A_250_4E_TEXT },
  { number: 'AMS-QQ-A-250/4', revision: 'A', event: 'reaffirmed', on: '2010-05', source: QQ_A_250_4E_TEXT },
  {
    number: 'AMS-QQ-A-250/4',
    event: 'alternative',
    successors: [
      { number: 'AMS4035', conditions: 'O' },
      { number: 'AMS4037', conditions: 'T3, T351' },
    ],
    source: RECALLED,
  },
  {
    number: 'AMS-QQ-A-250/5',
    revision: 'B',
    event: 'stabilized',
    on: '2014-02',
    source: AMS_QQ_A_250_5B_NOTICE,
  },
  {
    number: 'AMS-QQ-A-250/5',
    revision: 'B',
    event: 'alternative',
    on: '2014-02',
    successors: [
      { number: 'AMS4461', conditions: 'O, F' },
      { number: 'AMS4462', conditions: 'T3, T351' },
      { number: 'AMS4475', conditions: 'T4 coil' },
      { number: 'AMS4478', conditions: 'T81, T851' },
      { number: 'AMS4466', conditions: 'T361' },
      { number: 'AMS4193' },
    ],
    source: AMS_QQ_A_250_5B_NOTICE,
  },
  {
    number: 'AMS4040',
    event: 'alternative',
    successors: [{ number: 'AMS4461', conditions: 'O' }],
    source: RECALLED,
  },
  {
    number: 'AMS4041',
    event: 'alternative',
    successors: [{ number: 'AMS4462', conditions: 'T3' }],
    source: RECALLED,
  },
  { number: 'AMS4036', revision: 'J', event: 'current', source: AMS4036J_PAGE },
  {
    number: 'AMS-QQ-A-250/10',
    revision: 'C',
    event: 'cancelled',
    on: '2012-03',
    source: AMS_QQ_A_250_10C_COVER,
  },
  {
    number: 'AMS-QQ-A-250/10',
    revision: 'C',
    event: 'revived',
    on: '2013-12',
    source: AMS_QQ_A_250_10C_COVER,
  },
  {
    number: 'AMS-QQ-A-250/10',
    revision: 'C',
    event: 'stabilized',
    on: '2013-12',
    source: AMS_QQ_A_250_10C_COVER,
  },
  {
    number: 'QQ-A-250/11',
    event: 'superseded',
    on: '1997',
    successors: [{ number: 'AMS-QQ-A-250/11' }],
    source: RECALLED,
  },
  {
    number: 'AMS-QQ-A-250/11',
    event: 'alternative',
    successors: [
      { number: 'AMS4025', conditions: 'O' },
      { number: 'AMS4026', conditions: 'T4' },
      { number: 'AMS4027', conditions: 'T6' },
    ],
    source: RECALLED,
  },
  {
    number: 'QQ-A-250/12',
    event: 'superseded',
    on: '1997',
    successors: [{ number: 'AMS-QQ-A-250/12' }],
    source: RECALLED,
  },
  {
    number: 'AMS-QQ-A-250/12',
    event: 'alternative',
    successors: [
      { number: 'AMS4044', conditions: 'O' },
      { number: 'AMS4045', conditions: 'T6' },
    ],
    source: RECALLED,
  },
  {
    number: 'QQ-A-250/13',
    event: 'superseded',
    on: '1997',
    successors: [{ number: 'AMS-QQ-A-250/13' }],
    source: RECALLED,
  },
  {
    number: 'AMS-QQ-A-250/13',
    event: 'alternative',
    successors: [
      { number: 'AMS4048', conditions: 'O' },
      { number: 'AMS4049', conditions: 'T6' },
    ],
    source: RECALLED,
  },
  {
    number: 'AMS-QQ-A-200/11',
    revision: 'A',
    event: 'stabilized',
    on: '2014-10',
    source: AMS_QQ_A_200_11A_NOTICE,
  },
  {
    number: 'AMS-QQ-A-200/11',
    revision: 'A',
    event: 'alternative',
    on: '2014-10',
    successors: [
      { number: 'AMS4154', conditions: 'T6' },
      { number: 'AMS4476', conditions: 'O' },
      { number: 'AMS4617', conditions: 'T73' },
    ],
    source: AMS_QQ_A_200_11A_NOTICE,
  },
];
