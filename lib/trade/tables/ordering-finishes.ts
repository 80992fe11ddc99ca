import type { OrderingRow } from '../ordering/ordering-checklist';
import type { Source } from '../source';
import type { Table } from '../table';

const AMS2700E_AND_F: Source = {
  document: 'AMS2700E classification; AMS2700F cover and notice',
  confidence: 'read',
  certainty: 'high',
  address: 'https://ptazo.com/ebooks/ams2700e-pdf-free-download/',
};
const MIL_DTL_5541F_PARA_6_4: Source = {
  document: 'MIL-DTL-5541F para 6.4 and technical notes',
  confidence: 'read',
  certainty: 'high',
  address: 'https://aotco.com/mil-dtl-5541f-technical-notes',
};
const MIL_DTL_5541F_TECHNICAL_NOTES: Source = {
  document: 'MIL-DTL-5541F technical notes',
  confidence: 'read',
  certainty: 'high',
  address: 'https://aotco.com/mil-dtl-5541f-technical-notes',
};
const MIL_A_8625F_COVER: Source = {
  document: 'MIL-A-8625F cover',
  confidence: 'read',
  certainty: 'high',
  address: 'https://ru.scribd.com/document/431507752/MIL-A-8625',
};
const MIL_A_8625F_PARAS_3_1_TO_3_4: Source = {
  document: 'MIL-A-8625F paras 3.1 to 3.4',
  confidence: 'read',
  certainty: 'high',
};
const MIL_A_8625_RECALLED: Source = {
  document: 'MIL-A-8625 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};
const QQ_P_416F: Source = {
  document: 'QQ-P-416F',
  confidence: 'read',
  certainty: 'high',
  address: 'https://docslib.org/doc/714548/ams-qq-p-416-pdf',
};
const QQ_P_416_RECALLED: Source = {
  document: 'QQ-P-416 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};
const ASTM_B633_RECALLED: Source = {
  document: 'ASTM B633 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};
const ASTM_A967_RECALLED: Source = {
  document: 'ASTM A967 ordering information',
  confidence: 'memory',
  certainty: 'medium',
};
const MIL_STD_171F_4_1: Source = {
  document: 'MIL-STD-171F 4.1',
  confidence: 'read',
  certainty: 'high',
  address: 'https://metalfinishesandfinishingprocessesa.emilspec.com/MIL-STD-171/page15.html',
};

/** Plating, anodizing, conversion coating, passivation. */
export const FINISH_ORDERING: Table<OrderingRow>['rows'] = [
  {
    specifications: ['AMS2700'],
    issue: 'F',
    paragraph: '1.3',
    kind: 'state_or_default',
    asks: [
      { item: 'alloy' },
      { item: 'method' },
      { item: 'type' },
      { item: 'class', otherwise: 'class 2, one part per lot' },
      { item: 'class', when: 'fasteners', otherwise: 'class 1 where no frequency is stated' },
      { item: 'class', when: 'qq_p_35_on_drawing', otherwise: 'class 4' },
      { item: 'sequence' },
    ],
    source: AMS2700E_AND_F,
  },
  {
    specifications: ['MIL-DTL-5541'],
    issue: 'F',
    paragraph: '6.4',
    kind: 'must_state',
    asks: [
      { item: 'specification_and_revision' },
      { item: 'type' },
      { item: 'class' },
      { item: 'method' },
      { item: 'touch_up_damage' },
      { item: 'colour' },
      { item: 'touch_up_contact_marks' },
      { item: 'paint_adhesion_test' },
      { item: 'electrical_resistance_test', when: 'class_3' },
      { item: 'electrical_resistance_limit', when: 'class_3' },
      { item: 'test_specimens' },
      { item: 'next_step' },
      { item: 'quantity' },
      { item: 'sampling_plan' },
      { item: 'lot_size' },
    ],
    source: MIL_DTL_5541F_PARA_6_4,
  },
  {
    specifications: ['MIL-DTL-5541'],
    issue: 'F',
    paragraph: 'classification',
    kind: 'default',
    asks: [{ item: 'type', otherwise: 'Type I, hexavalent' }],
    source: MIL_DTL_5541F_TECHNICAL_NOTES,
  },
  {
    specifications: ['MIL-A-8625', 'MIL-PRF-8625'],
    issue: 'F',
    paragraph: '1.2',
    kind: 'must_state',
    asks: [{ item: 'type' }, { item: 'class' }],
    source: MIL_A_8625F_COVER,
  },
  {
    specifications: ['MIL-A-8625', 'MIL-PRF-8625'],
    issue: 'F',
    paragraph: '3.2',
    kind: 'default',
    asks: [{ item: 'process_conditions', otherwise: "the processor's choice" }],
    source: MIL_A_8625F_PARAS_3_1_TO_3_4,
  },
  {
    specifications: ['MIL-A-8625', 'MIL-PRF-8625'],
    issue: 'F',
    paragraph: '6.2',
    kind: 'must_state',
    asks: [
      { item: 'specification_and_revision' },
      { item: 'type' },
      { item: 'class' },
      { item: 'coating_thickness', otherwise: '0.002 in nominal for Type III' },
      { item: 'seal', when: 'type_iii', otherwise: 'not sealed' },
      { item: 'colour', when: 'class_2' },
      { item: 'abrasion_test' },
      { item: 'areas' },
      { item: 'build_up' },
      { item: 'alloy' },
      { item: 'contact_marks' },
      { item: 'sampling_plan' },
    ],
    source: MIL_A_8625_RECALLED,
  },
  {
    specifications: ['QQ-P-416', 'AMS-QQ-P-416'],
    issue: 'F',
    paragraph: '1.2, 3.2',
    kind: 'state_or_default',
    asks: [
      { item: 'type' },
      { item: 'class' },
      { item: 'permission_high_strength', when: 'steel_over_200_ksi', otherwise: 'barred' },
      { item: 'cleaning', otherwise: 'MIL-S-5002' },
      { item: 'coverage', otherwise: 'all surfaces, thread roots included' },
      { item: 'cleaning', when: 'fasteners_from_160_ksi' },
    ],
    source: QQ_P_416F,
  },
  {
    specifications: ['QQ-P-416', 'AMS-QQ-P-416'],
    issue: 'F',
    paragraph: '6.2',
    kind: 'must_state',
    asks: [
      { item: 'steel_strength' },
      { item: 'stress_relief' },
      { item: 'embrittlement_bake' },
      { item: 'colour' },
      { item: 'test_specimens' },
      { item: 'control_samples' },
    ],
    source: QQ_P_416_RECALLED,
  },
  {
    specifications: ['ASTM B633'],
    paragraph: 'ordering information',
    kind: 'must_state',
    asks: [
      { item: 'specification_and_revision' },
      { item: 'type' },
      { item: 'colour' },
      { item: 'coating_thickness' },
      { item: 'steel_strength' },
      { item: 'stress_relief' },
      { item: 'embrittlement_bake' },
      { item: 'contact_marks' },
      { item: 'sampling_plan' },
      { item: 'corrosion_hours' },
    ],
    source: ASTM_B633_RECALLED,
  },
  {
    specifications: ['ASTM A967'],
    paragraph: 'ordering information',
    kind: 'must_state',
    asks: [
      { item: 'alloy' },
      { item: 'method' },
      { item: 'sampling_plan' },
      { item: 'surface_before' },
      { item: 'certification' },
    ],
    source: ASTM_A967_RECALLED,
  },
  {
    specifications: ['MIL-STD-171'],
    issue: 'F',
    paragraph: '4.1',
    kind: 'must_state',
    asks: [{ item: 'type' }, { item: 'class' }, { item: 'grade' }],
    source: MIL_STD_171F_4_1,
  },
];
