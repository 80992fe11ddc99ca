import type { LineageEvent } from '../lineage/lineage-event';
import type { Source } from '../source';
import type { Table } from '../table';

const MIL_A_8625F_COVER: Source = {
  document: 'MIL-A-8625F cover',
  confidence: 'read',
  certainty: 'high',
  address: 'https://ru.scribd.com/document/431507752/MIL-A-8625',
};

const MIL_A_8625F_AMENDMENT: Source = {
  document: 'MIL-A-8625F amendment 1',
  confidence: 'read',
  certainty: 'high',
  address: 'https://studylib.net/doc/27527660/mil-a-8625',
};

const MIL_PRF_8625_ARTICLE: Source = {
  document: 'Finishing trade article on MIL-PRF-8625',
  confidence: 'read',
  certainty: 'high',
  address:
    'https://finishingandcoating.com/index.php/anodizingcat/570-rollout-of-mil-prf-8625-rev-f-and-implications-for-anodizers',
};

const MIL_DTL_5541F_TITLE: Source = {
  document: 'MIL-DTL-5541F title page',
  confidence: 'read',
  certainty: 'high',
  address: 'http://ishare.iask.sina.com.cn/f/37654088.html',
};

const MIL_DTL_5541_ARTICLE: Source = {
  document: 'Article comparing MIL-DTL-81706 and MIL-DTL-5541',
  confidence: 'read',
  certainty: 'high',
  address: 'https://legalclarity.org/mil-dtl-81706-vs-mil-dtl-5541-whats-the-difference/',
};

const MIL_DTL_81706_PAGE: Source = {
  document: 'MIL-DTL-81706 reference page',
  confidence: 'read',
  certainty: 'high',
  address: 'https://anoplex.com/references/MIL-DTL-81706.html',
};

const PASSIVATION_FORUM: Source = {
  document: 'Standards forum on AMS-QQ-P-35',
  confidence: 'read',
  certainty: 'high',
  address: 'https://standardsforum.com/tag/ams-qq-p-35/',
};

const AMS2700E_TEXT: Source = {
  document: 'AMS2700E classification',
  confidence: 'read',
  certainty: 'high',
  address: 'https://ptazo.com/ebooks/ams2700e-pdf-free-download/',
};

const AMS2700F_COVER: Source = {
  document: 'AMS2700F cover and notice',
  confidence: 'read',
  certainty: 'high',
};

const QQ_P_416F_TEXT: Source = {
  document: 'QQ-P-416F',
  confidence: 'read',
  certainty: 'high',
  address: 'https://docslib.org/doc/714548/ams-qq-p-416-pdf',
};

const RECALLED: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'medium',
};

const WELL_KNOWN: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'high',
};

/** Anodizing, conversion coating, passivation, phosphating. */
export const COATING_LINEAGE: Table<LineageEvent>['rows'] = [
  { number: 'MIL-A-8625', revision: 'original', event: 'issued', on: '1953', source: MIL_A_8625F_COVER },
  { number: 'MIL-A-8625', revision: 'E', event: 'issued', on: '1988-04-25', source: MIL_A_8625F_COVER },
  { number: 'MIL-A-8625', revision: 'F', event: 'issued', on: '1993-09-10', source: MIL_A_8625F_COVER },
  { number: 'MIL-A-8625', revision: 'F', event: 'amended', on: '2003-09-15', source: MIL_A_8625F_AMENDMENT },
  {
    number: 'MIL-A-8625',
    revision: 'F',
    event: 'renamed',
    on: '2020-11-23',
    successors: [{ number: 'MIL-PRF-8625', revision: 'F' }],
    source: MIL_PRF_8625_ARTICLE,
  },
  { number: 'MIL-PRF-8625', revision: 'F', event: 'issued', on: '2020-11-23', source: MIL_PRF_8625_ARTICLE },
  { number: 'MIL-C-5541', revision: 'E', event: 'issued', on: '1990-11-30', source: MIL_DTL_5541F_TITLE },
  {
    number: 'MIL-C-5541',
    revision: 'E',
    event: 'superseded',
    on: '2006-07-11',
    successors: [{ number: 'MIL-DTL-5541', revision: 'F' }],
    source: MIL_DTL_5541F_TITLE,
  },
  { number: 'MIL-DTL-5541', revision: 'F', event: 'issued', on: '2006-07-11', source: MIL_DTL_5541F_TITLE },
  { number: 'MIL-DTL-5541', revision: 'F', event: 'amended', on: '2024-02', source: MIL_DTL_5541_ARTICLE },
  {
    number: 'MIL-C-81706',
    event: 'renamed',
    on: '2004-10-25',
    successors: [{ number: 'MIL-DTL-81706', revision: 'B' }],
    source: MIL_DTL_81706_PAGE,
  },
  { number: 'MIL-DTL-81706', revision: 'B', event: 'issued', on: '2004-10-25', source: MIL_DTL_81706_PAGE },
  { number: 'MIL-DTL-81706', revision: 'B', event: 'amended', on: '2006-05-02', source: MIL_DTL_81706_PAGE },
  {
    number: 'QQ-P-35',
    revision: 'C',
    event: 'cancelled',
    successors: [{ number: 'AMS-QQ-P-35' }, { number: 'ASTM A967', covers: 'general_work' }],
    source: PASSIVATION_FORUM,
  },
  {
    number: 'AMS-QQ-P-35',
    event: 'withdrawn',
    successors: [{ number: 'AMS2700' }],
    source: PASSIVATION_FORUM,
  },
  { number: 'AMS2700', revision: 'original', event: 'issued', on: '2000-03', source: AMS2700E_TEXT },
  { number: 'AMS2700', revision: 'E', event: 'issued', on: '2011-11', source: AMS2700E_TEXT },
  { number: 'AMS2700', revision: 'F', event: 'issued', on: '2018-03', source: AMS2700F_COVER },
  { number: 'MIL-S-5002', event: 'successor_not_found', source: QQ_P_416F_TEXT },
  {
    number: 'MIL-P-16232',
    revision: 'F',
    event: 'renamed',
    on: '2000',
    successors: [{ number: 'MIL-DTL-16232' }],
    source: RECALLED,
  },
  {
    number: 'DOD-P-16232',
    revision: 'F',
    event: 'renamed',
    successors: [{ number: 'MIL-DTL-16232' }],
    source: WELL_KNOWN,
  },
  { number: 'TT-C-490', event: 'current', source: RECALLED },
];
