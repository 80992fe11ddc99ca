import type { LineageEvent } from '../lineage/lineage-event';
import type { Source } from '../source';
import type { Table } from '../table';

const QQ_P_416F_TEXT: Source = {
  document: 'QQ-P-416F',
  confidence: 'read',
  certainty: 'high',
  address: 'https://docslib.org/doc/714548/ams-qq-p-416-pdf',
};

const AMS_QQ_P_416C_COVER: Source = {
  document: 'AMS-QQ-P-416C cover',
  confidence: 'read',
  certainty: 'high',
  address: 'https://ishare.iask.sina.com.cn/f/25111501.html',
};

const WELL_KNOWN: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'high',
};

const RECALLED: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'medium',
};

const NAS_4160_PAGE: Source = {
  document: 'NAS 4160, 2013 edition',
  confidence: 'read',
  certainty: 'high',
  address: 'https://freestandardsdownload.com/aia-nas-4160-2013-pdf-download.html',
};

const MIL_STD_870C_CHANGE: Source = {
  document: 'MIL-STD-870C change 1',
  confidence: 'read',
  certainty: 'high',
};

const QQ_N_290A_COVER: Source = {
  document: 'QQ-N-290A',
  confidence: 'read',
  certainty: 'high',
  address: 'https://scribd.com/document/531965641/QQ-N-290A-Nickel-Plating',
};

const AMS_QQ_C_320_COVER: Source = {
  document: 'AMS-QQ-C-320 cover',
  confidence: 'read',
  certainty: 'high',
  address: 'https://kb9.cn/read/20422.html',
};

const MIL_C_26074E_TEXT: Source = {
  document: 'MIL-C-26074E',
  confidence: 'read',
  certainty: 'high',
  address: 'https://vdocuments.site/electroless-nickel-coatings.html',
};

const AMS_C_26074D_COVER: Source = {
  document: 'AMS-C-26074D cover',
  confidence: 'read',
  certainty: 'high',
  address: 'https://m.mydoc123.com/d-1022598.html',
};

const REPORTED_26074: Source = {
  document: 'Pasted text on MIL-DTL-26074F, weak',
  confidence: 'read',
  certainty: 'low',
  address: 'https://gist.github.com/3d27930bb9be21c090f8c2ae976f932c',
};

/** Cadmium, zinc, nickel and chromium, electroless nickel, aluminium from vapour. */
export const PLATING_LINEAGE: Table<LineageEvent>['rows'] = [
  { number: 'QQ-P-416', revision: 'E', event: 'issued', on: '1986-04-18', source: QQ_P_416F_TEXT },
  { number: 'QQ-P-416', revision: 'F', event: 'issued', on: '1991-10', source: QQ_P_416F_TEXT },
  {
    number: 'QQ-P-416',
    revision: 'F',
    event: 'superseded',
    on: '2000-07',
    successors: [{ number: 'AMS-QQ-P-416' }],
    source: AMS_QQ_P_416C_COVER,
  },
  { number: 'QQ-P-416', event: 'alternative', successors: [{ number: 'ASTM B766' }], source: WELL_KNOWN },
  {
    number: 'AMS-QQ-P-416',
    revision: 'original',
    event: 'issued',
    on: '2000-07',
    source: AMS_QQ_P_416C_COVER,
  },
  { number: 'AMS-QQ-P-416', revision: 'C', event: 'issued', on: '2009-09', source: AMS_QQ_P_416C_COVER },
  {
    number: 'AMS-QQ-P-416',
    event: 'alternative',
    successors: [{ number: 'AMS2400' }, { number: 'AMS2401' }],
    source: RECALLED,
  },
  { number: 'NAS 4160', revision: '2013', event: 'issued', on: '2013', source: NAS_4160_PAGE },
  { number: 'MIL-STD-870', revision: 'C', event: 'issued', on: '2007-03-01', source: MIL_STD_870C_CHANGE },
  { number: 'MIL-STD-870', revision: 'C', event: 'amended', on: '2009-04-27', source: MIL_STD_870C_CHANGE },
  {
    number: 'MIL-C-8837',
    revision: 'B',
    event: 'superseded',
    on: '1998',
    successors: [{ number: 'AMS-C-8837' }],
    source: RECALLED,
  },
  {
    number: 'MIL-C-83488',
    revision: 'D',
    event: 'renamed',
    on: '1999',
    successors: [{ number: 'MIL-DTL-83488' }],
    source: RECALLED,
  },
  {
    number: 'QQ-Z-325',
    revision: 'C',
    event: 'cancelled',
    successors: [{ number: 'ASTM B633' }],
    source: WELL_KNOWN,
  },
  { number: 'QQ-N-290', revision: 'original', event: 'issued', on: '1954-04-05', source: QQ_N_290A_COVER },
  { number: 'QQ-N-290', revision: 'A', event: 'issued', on: '1971-11-12', source: QQ_N_290A_COVER },
  {
    number: 'QQ-N-290',
    revision: 'A',
    event: 'superseded',
    successors: [{ number: 'AMS-QQ-N-290' }],
    source: RECALLED,
  },
  {
    number: 'AMS-QQ-N-290',
    event: 'superseded',
    successors: [{ number: 'AMS2403' }, { number: 'AMS2423' }, { number: 'ASTM B689' }],
    source: RECALLED,
  },
  {
    number: 'QQ-C-320',
    revision: 'B',
    event: 'superseded',
    on: '2000-07',
    successors: [{ number: 'AMS-QQ-C-320' }],
    source: AMS_QQ_C_320_COVER,
  },
  {
    number: 'AMS-QQ-C-320',
    revision: 'original',
    event: 'issued',
    on: '2000-07',
    source: AMS_QQ_C_320_COVER,
  },
  { number: 'AMS-QQ-C-320', event: 'superseded', successors: [{ number: 'AMS2460' }], source: RECALLED },
  { number: 'MIL-C-26074', revision: 'D', event: 'issued', on: '1989-02-27', source: MIL_C_26074E_TEXT },
  { number: 'MIL-C-26074', revision: 'E', event: 'issued', on: '1990-10-30', source: MIL_C_26074E_TEXT },
  {
    number: 'MIL-C-26074',
    revision: 'E',
    event: 'superseded',
    on: '1998-08',
    successors: [{ number: 'AMS-C-26074' }],
    source: AMS_C_26074D_COVER,
  },
  {
    number: 'MIL-C-26074',
    revision: 'E',
    event: 'alternative',
    successors: [{ number: 'MIL-DTL-26074', revision: 'F' }],
    source: REPORTED_26074,
  },
  {
    number: 'MIL-C-26074',
    event: 'alternative',
    successors: [{ number: 'AMS2404' }, { number: 'ASTM B733' }],
    source: RECALLED,
  },
  { number: 'AMS-C-26074', revision: 'original', event: 'issued', on: '1998-08', source: AMS_C_26074D_COVER },
  { number: 'AMS-C-26074', revision: 'D', event: 'noncurrent', on: '2005-10', source: AMS_C_26074D_COVER },
  { number: 'AMS-C-26074', revision: 'D', event: 'cancelled', on: '2011-07', source: AMS_C_26074D_COVER },
  { number: 'AMS-C-26074', revision: 'D', event: 'revived', on: '2013-06', source: AMS_C_26074D_COVER },
  { number: 'AMS-C-26074', revision: 'D', event: 'stabilized', on: '2013-06', source: AMS_C_26074D_COVER },
  { number: 'AMS-C-26074', event: 'alternative', successors: [{ number: 'AMS2404' }], source: RECALLED },
];
