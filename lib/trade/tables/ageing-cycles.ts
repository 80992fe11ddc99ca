import type { Alloy } from '../alloys/alloy';
import type { ProductForm } from '../process';
import type { Certainty, Source } from '../source';
import type { Table } from '../table';
import type { Temper } from '../tempers/temper';

/** One hold. Where a table prints one figure, both ends of the pair are that figure. */
export interface AgeingStep {
  readonly setF: readonly [number, number];
  readonly limitsF?: readonly [number, number];
  /** Nothing where the source gives the temperature alone. */
  readonly hours?: readonly [number, number];
  readonly nominalHours?: number;
}

export interface AgeingRow {
  readonly alloys: readonly Alloy[];
  readonly changes: readonly (readonly [from: Temper, to: Temper])[];
  readonly forms?: readonly ProductForm[];
  readonly cycle:
    | { readonly kind: 'natural'; readonly hours: number }
    | { readonly kind: 'artificial' | 'two_step' | 'second_step'; readonly steps: readonly AgeingStep[] };
}

const DOCUMENT = 'MIL-H-6088G table of ageing treatments / AMS 2770 / ASTM B918 practice';
const memory = (certainty: Certainty, document = DOCUMENT): Source => ({
  document,
  confidence: 'memory',
  certainty,
});
const HIGH = memory('high');
const MEDIUM = memory('medium');
const LOW = memory('low');
const TRANSITIONS = memory('high', 'AMS 2770 / MIL-H-6088G practice and ANSI H35.1 rules');
const TO_1_1A_9: Source = {
  document: 'T.O. 1-1A-9 para 3-18',
  confidence: 'read',
  certainty: 'high',
  address: 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_161.htm',
};
const PRODUCER: Source = {
  document: 'aluminium producer heat-treat data page (alloys 6013/6061)',
  confidence: 'read',
  certainty: 'high',
  address: 'https://it.scribd.com/document/396525084/Tratamientos-termicos-aluminio',
};
const ASSOCIATION = memory('medium', 'Aluminum Association typical heat treatments table');

type Pair = readonly [number, number];
const step = (setF: Pair | number, hours: Pair | number, limitsF?: Pair): AgeingStep => ({
  setF: typeof setF === 'number' ? [setF, setF] : setF,
  hours: typeof hours === 'number' ? [hours, hours] : hours,
  ...(limitsF && { limitsF }),
});
const one = (hold: AgeingStep, nominalHours?: number): AgeingRow['cycle'] => ({
  kind: 'artificial',
  steps: [nominalHours === undefined ? hold : { ...hold, nominalHours }],
});
const two = (first: AgeingStep, second: AgeingStep): AgeingRow['cycle'] => ({
  kind: 'two_step',
  steps: [first, second],
});
const second = (hold: AgeingStep): AgeingRow['cycle'] => ({ kind: 'second_step', steps: [hold] });
const FOUR_DAYS: AgeingRow['cycle'] = { kind: 'natural', hours: 96 };

const HARDEN = [
  ['T4', 'T6'],
  ['T42', 'T62'],
] as const;
const FROM_W = [
  ['W', 'T6'],
  ['W', 'T62'],
] as const;
const SETTLE = [['AQ', 'T42']] as const;
const USER = [['T42', 'T62']] as const;

/** Ageing to each condition. Where specifications differ each has its row; a shop's edition settles it. */
export const AGEING_CYCLES: Table<AgeingRow> = {
  id: 'ageing-cycles',
  title: 'Ageing treatments of wrought aluminium',
  edition: DOCUMENT,
  rows: [
    { alloys: ['2014'], changes: SETTLE, cycle: FOUR_DAYS, source: HIGH },
    {
      alloys: ['2014'],
      changes: HARDEN,
      forms: ['sheet'],
      cycle: one(step(320, 18, [310, 330])),
      source: HIGH,
    },
    {
      alloys: ['2014'],
      changes: HARDEN,
      forms: ['bar', 'forging'],
      cycle: one(step([340, 350], [8, 12], [335, 355]), 10),
      source: MEDIUM,
    },
    {
      alloys: ['2014'],
      changes: [['T3', 'T6']],
      forms: ['sheet'],
      cycle: one(step(320, 18)),
      source: ASSOCIATION,
    },
    { alloys: ['2017', '2024'], changes: SETTLE, cycle: FOUR_DAYS, source: TO_1_1A_9 },
    { alloys: ['2117'], changes: SETTLE, cycle: FOUR_DAYS, source: HIGH },
    {
      alloys: ['2024'],
      changes: USER,
      forms: ['sheet'],
      cycle: one(step(375, [9, 12], [370, 380]), 9),
      source: memory('medium', 'AMS 2770'),
    },
    {
      alloys: ['2024'],
      changes: USER,
      forms: ['sheet'],
      cycle: one(step(375, [11, 13], [370, 380])),
      source: memory('medium', 'MIL-H-6088G table of ageing treatments'),
    },
    {
      alloys: ['2024'],
      changes: USER,
      forms: ['bar', 'extrusion'],
      cycle: one(step(375, 16, [370, 380])),
      source: memory('medium', 'Older issues of the ageing tables'),
    },
    {
      alloys: ['2024'],
      changes: [['T3', 'T81']],
      cycle: one(step(375, [11, 13], [370, 380]), 12),
      source: HIGH,
    },
    {
      alloys: ['2024'],
      changes: [['T361', 'T861']],
      cycle: one(step(375, [7, 9], [370, 380]), 8),
      source: HIGH,
    },
    {
      alloys: ['2024'],
      changes: [['T351', 'T851']],
      cycle: one(step(375, [11, 13], [370, 380]), 12),
      source: HIGH,
    },
    { alloys: ['2219'], changes: SETTLE, cycle: FOUR_DAYS, source: HIGH },
    { alloys: ['2219'], changes: USER, cycle: one(step(375, [35, 37], [370, 380]), 36), source: HIGH },
    {
      alloys: ['2219'],
      changes: [
        ['T31', 'T81'],
        ['T351', 'T851'],
      ],
      cycle: one(step(350, [17, 19], [345, 355]), 18),
      source: HIGH,
    },
    {
      alloys: ['2219'],
      changes: [['T37', 'T87']],
      forms: ['sheet'],
      cycle: one(step(325, 24, [320, 330])),
      source: MEDIUM,
    },
    {
      alloys: ['2219'],
      changes: [['T37', 'T87']],
      forms: ['plate'],
      cycle: one(step(350, 18, [345, 355])),
      source: MEDIUM,
    },
    { alloys: ['6013'], changes: [['T4', 'T6']], cycle: one(step(375, 4)), source: MEDIUM },
    { alloys: ['6013'], changes: USER, cycle: one(step(375, 4)), source: TRANSITIONS },
    { alloys: ['6061'], changes: SETTLE, cycle: FOUR_DAYS, source: HIGH },
    {
      alloys: ['6013'],
      changes: [
        ['AQ', 'T4'],
        ['AQ', 'T42'],
      ],
      cycle: { kind: 'natural', hours: 336 },
      source: PRODUCER,
    },
    { alloys: ['6061'], changes: HARDEN, cycle: one(step(320, 18, [310, 330])), source: HIGH },
    { alloys: ['6061'], changes: HARDEN, cycle: one(step(350, 8, [340, 360])), source: HIGH },
    {
      alloys: ['7050'],
      changes: [['W51', 'T7451']],
      forms: ['plate'],
      cycle: two(step(250, [3, 6]), step([325, 330], [24, 30])),
      source: LOW,
    },
    {
      alloys: ['7050'],
      changes: [['W', 'T76']],
      cycle: two(step(250, [3, 6]), step(325, [12, 15])),
      source: LOW,
    },
    { alloys: ['7075'], changes: FROM_W, cycle: one(step(250, [23, 25], [240, 260]), 24), source: HIGH },
    { alloys: ['7075'], changes: [['W', 'T6']], cycle: two(step(210, 4), step(315, 8)), source: MEDIUM },
    {
      alloys: ['7075'],
      changes: [['W', 'T73']],
      forms: ['sheet', 'plate'],
      cycle: two(step(225, [6, 8]), step(325, [24, 30])),
      source: MEDIUM,
    },
    {
      alloys: ['7075'],
      changes: [['W', 'T73']],
      forms: ['bar', 'forging'],
      cycle: two(step(225, [6, 8]), step(350, [8, 10])),
      source: MEDIUM,
    },
    {
      alloys: ['7075'],
      changes: [['W', 'T76']],
      cycle: two(step(250, [3, 5]), step(325, [15, 18])),
      source: MEDIUM,
    },
    { alloys: ['7075'], changes: [['T6', 'T73']], cycle: second(step(350, [6, 10])), source: MEDIUM },
    { alloys: ['7075'], changes: [['T6', 'T73']], cycle: second(step(325, 24)), source: MEDIUM },
    {
      alloys: ['7075', '7178'],
      changes: [
        ['T6', 'T76'],
        ['T651', 'T7651'],
      ],
      cycle: second({ setF: [325, 325] }),
      source: TRANSITIONS,
    },
    { alloys: ['7178'], changes: FROM_W, cycle: one(step(250, 24, [240, 260])), source: HIGH },
    {
      alloys: ['7178'],
      changes: [['W', 'T76']],
      cycle: two(step(250, [3, 5]), step(325, [15, 18])),
      source: MEDIUM,
    },
  ],
};
