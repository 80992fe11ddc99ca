import type { OrderingRow } from '../ordering/ordering-checklist';
import type { Source } from '../source';
import type { Table } from '../table';

const AMS2770R_NOTICE: Source = {
  document: 'AMS2770R notice',
  confidence: 'read',
  certainty: 'high',
};
const AMS2770_RECALLED: Source = {
  document: 'AMS2770 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};
const AMS2759D: Source = {
  document: 'AMS2759D',
  confidence: 'read',
  certainty: 'high',
  address: 'https://zh.scribd.com/document/370328189/AMS-2759D',
};
const AMS2759_RECALLED: Source = {
  document: 'AMS2759 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};
const ASTM_B850_98_2009_TABLE: Source = {
  document: 'ASTM B850-98(2009) table',
  confidence: 'read',
  certainty: 'high',
  address: 'https://sonicplatinginc.com/services/baking-process/bake-chart/',
};
const ASTM_B850_RECALLED: Source = {
  document: 'ASTM B850 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};

/** Heat treatment and the bake after plating. */
export const HEAT_TREAT_ORDERING: Table<OrderingRow>['rows'] = [
  {
    specifications: ['AMS2770'],
    issue: 'R',
    paragraph: 'ordering information',
    kind: 'must_state',
    asks: [
      { item: 'specification_and_revision' },
      { item: 'quantity' },
      { item: 'part_type' },
      { item: 'variables' },
      { item: 'restrictions' },
    ],
    source: AMS2770R_NOTICE,
  },
  {
    specifications: ['AMS2770'],
    issue: 'R',
    paragraph: 'ordering information',
    kind: 'must_state',
    asks: [
      { item: 'part_number' },
      { item: 'alloy' },
      { item: 'condition_before' },
      { item: 'condition_after' },
      { item: 'product_form' },
      { item: 'hardness_or_conductivity' },
    ],
    source: AMS2770_RECALLED,
  },
  {
    specifications: ['AMS2759'],
    paragraph: '1.2',
    kind: 'default',
    asks: [{ item: 'slash_sheet', otherwise: 'the slash sheet of the alloy' }],
    source: AMS2759D,
  },
  {
    specifications: ['AMS2759'],
    paragraph: 'ordering information',
    kind: 'must_state',
    asks: [
      { item: 'slash_sheet' },
      { item: 'part_number' },
      { item: 'quantity' },
      { item: 'alloy' },
      { item: 'condition_before' },
      { item: 'hardness_or_strength' },
      { item: 'test_location' },
      { item: 'surface_limits' },
      { item: 'finish_machined' },
    ],
    source: AMS2759_RECALLED,
  },
  {
    specifications: ['ASTM B850'],
    paragraph: 'table',
    kind: 'default',
    asks: [{ item: 'embrittlement_bake', otherwise: 'by tensile strength' }],
    source: ASTM_B850_98_2009_TABLE,
  },
  {
    specifications: ['ASTM B850'],
    kind: 'must_state',
    asks: [{ item: 'embrittlement_bake' }],
    source: ASTM_B850_98_2009_TABLE,
  },
  {
    specifications: ['ASTM B850'],
    kind: 'must_state',
    asks: [
      { item: 'steel_strength' },
      { item: 'embrittlement_class' },
      { item: 'peened' },
      { item: 'temperature_limit' },
      { item: 'bake_start' },
    ],
    source: ASTM_B850_RECALLED,
  },
];
