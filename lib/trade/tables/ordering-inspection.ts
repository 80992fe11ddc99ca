import type { OrderingRow } from '../ordering/ordering-checklist';
import type { Source } from '../source';
import type { Table } from '../table';

const ASTM_E1418_16_PARA_1_5: Source = {
  document: 'ASTM E1418-16 para 1.5, the sister practice',
  confidence: 'read',
  certainty: 'medium',
  address: 'https://123docz.net/document/13714741-astm-e-1418-16.htm',
};
const ASTM_E1417_RECALLED: Source = {
  document: 'ASTM E1417 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};
const ASTM_E1444: Source = {
  document: 'ASTM E1444',
  confidence: 'read',
  certainty: 'high',
  address: 'https://scribd.com/document/622396678/E1444-1734968-1',
};
const ASTM_E1444_RECALLED: Source = {
  document: 'ASTM E1444 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};
const AMS_S_13165: Source = {
  document: 'AMS-S-13165',
  confidence: 'read',
  certainty: 'high',
  address: 'https://yumpu.com/en/document/view/13851658/ams-s-13165-metal-improvement-company',
};
const AMS_S_13165_AND_FORUM: Source = {
  document: 'AMS-S-13165; shot peening forum',
  confidence: 'read',
  certainty: 'high',
  address: 'https://yumpu.com/en/document/view/13851658/ams-s-13165-metal-improvement-company',
};
const MIL_S_13165_RECALLED: Source = {
  document: 'MIL-S-13165 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};
const AMS2430_RECALLED: Source = {
  document: 'AMS2430 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};

/** Inspection and peening. */
export const INSPECTION_ORDERING: Table<OrderingRow>['rows'] = [
  {
    specifications: ['ASTM E1417'],
    paragraph: '1.5 of E1418',
    kind: 'must_be_agreed',
    asks: [
      { item: 'type' },
      { item: 'method' },
      { item: 'sensitivity' },
      { item: 'acceptance_criteria' },
      { item: 'personnel_standard' },
      { item: 'blasting' },
      { item: 'etching' },
      { item: 'indication_sizing' },
      { item: 'processing_time' },
      { item: 'marking' },
    ],
    source: ASTM_E1418_16_PARA_1_5,
  },
  {
    specifications: ['ASTM E1417'],
    kind: 'should_state',
    asks: [{ item: 'areas' }, { item: 'cleaning' }, { item: 'cleaning_after' }, { item: 'report' }],
    source: ASTM_E1417_RECALLED,
  },
  {
    specifications: ['ASTM E1444'],
    paragraph: '1.3/1.4',
    kind: 'default',
    asks: [{ item: 'variables', otherwise: 'any part may be changed by agreement with engineering' }],
    source: ASTM_E1444,
  },
  {
    specifications: ['ASTM E1444'],
    paragraph: '4.2',
    kind: 'must_be_agreed',
    asks: [{ item: 'written_procedure' }],
    source: ASTM_E1444,
  },
  {
    specifications: ['ASTM E1444'],
    kind: 'should_state',
    asks: [
      { item: 'method' },
      { item: 'areas' },
      { item: 'magnetization' },
      { item: 'acceptance_criteria' },
      { item: 'demagnetization' },
      { item: 'marking' },
      { item: 'contact_restrictions' },
    ],
    source: ASTM_E1444_RECALLED,
  },
  {
    specifications: ['MIL-S-13165', 'AMS-S-13165'],
    issue: 'C',
    paragraph: 'Table VI',
    kind: 'default',
    asks: [{ item: 'intensity', otherwise: 'by thickness and material' }],
    source: AMS_S_13165,
  },
  {
    specifications: ['MIL-S-13165', 'AMS-S-13165'],
    issue: 'C',
    paragraph: '3.2.2, 6.8',
    kind: 'state_or_default',
    asks: [{ item: 'automatic_peening', otherwise: 'not computer controlled' }],
    source: AMS_S_13165_AND_FORUM,
  },
  {
    specifications: ['MIL-S-13165', 'AMS-S-13165'],
    issue: 'C',
    paragraph: '3.3.10.3',
    kind: 'must_state',
    asks: [{ item: 'corrosion_protection' }],
    source: AMS_S_13165,
  },
  {
    specifications: ['MIL-S-13165', 'AMS-S-13165'],
    issue: 'C',
    paragraph: 'Table VI note 5',
    kind: 'should_state',
    asks: [{ item: 'decontamination' }],
    source: AMS_S_13165,
  },
  {
    specifications: ['MIL-S-13165', 'AMS-S-13165'],
    issue: 'C',
    paragraph: '4.4.1',
    kind: 'default',
    asks: [{ item: 'coverage', otherwise: '100 % by eye' }],
    source: AMS_S_13165,
  },
  {
    specifications: ['MIL-S-13165', 'AMS-S-13165'],
    issue: 'C',
    paragraph: '6.2',
    kind: 'must_state',
    asks: [
      { item: 'media' },
      { item: 'areas' },
      { item: 'intensity' },
      { item: 'coverage' },
      { item: 'fade_out' },
      { item: 'temperature_limit' },
    ],
    source: MIL_S_13165_RECALLED,
  },
  {
    specifications: ['AMS2430'],
    paragraph: 'ordering information',
    kind: 'must_state',
    asks: [
      { item: 'media' },
      { item: 'intensity' },
      { item: 'areas' },
      { item: 'coverage' },
      { item: 'verification_locations' },
      { item: 'manual_peening' },
    ],
    source: AMS2430_RECALLED,
  },
];
