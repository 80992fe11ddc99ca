import { describe, expect, test } from 'vitest';

import type { CertificateLine, StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { DISCREPANCY_CODES } from '@/lib/evidence/certificate/compare/outcome';
import type { ComparisonInput } from '@/lib/evidence/certificate/compare/compare';
import { type Order, Requirements } from '@/lib/evidence/order';
import type { Page } from '@/lib/evidence/page';

import { agreeing, codesOf, compared, FILE, heatTreat, penetrant, plating } from './agreeing-certificate';

const HEAT = heatTreat();
const PLATE = plating();
const NDT = penetrant();

const lines = (
  order: Order,
  changes: Partial<CertificateLine>,
  at = 0,
): Pick<StatedCertificate, 'lines'> => ({
  lines: agreeing(order).lines.map((line, index) => (index === at ? { ...line, ...changes } : line)),
});
const cycles = (order: Order, step: string, changes: object): Pick<StatedCertificate, 'cycles'> => ({
  cycles: agreeing(order).cycles.map((cycle) => (cycle.step === step ? { ...cycle, ...changes } : cycle)),
});
const reading = (kind: string, unit: string | null, ...values: number[]) => ({ kind, unit, values });
const asking = (order: Order, requirements: object): Order => ({
  ...order,
  requirements: Requirements.parse({ ...order.requirements, ...requirements }),
});
const fact = (field: string, value: string | number, unit?: string) => ({
  field,
  value,
  raw: String(value),
  page: 1,
  box: [0, 0, 1, 1] as [number, number, number, number],
  confidence: 1,
  ...(unit && { unit }),
});
const page = (hidden: Page['hidden'], origin: Page['origin'] = 'text_layer'): Page => ({
  number: 1,
  width: 612,
  height: 792,
  turned: 0,
  origin,
  words: [],
  marks: [],
  hidden,
});
const withWords = (...lines: string[]): Page => ({
  ...page([]),
  words: lines.flatMap((line) =>
    line.split(' ').map((text) => ({ text, box: [0, 0, 1, 1] as const, confidence: 1 })),
  ),
});
const HIDDEN = { text: 'Revision R', box: [0, 0, 1, 1] as const, why: 'colour' as const };

type Case = [
  what: string,
  order: Order,
  changes: Partial<StatedCertificate>,
  input?: Partial<ComparisonInput>,
];

const noTimes = { soak_start: null, soak_end: null };
const ndt = (changes: object) => ({
  ndt: { method: null, type: null, sensitivity: null, result: null, personnel_level: null, ...changes },
  class_type: null,
});

/** Each is a certificate with one thing wrong. */
const PLANTED: Record<string, Case[]> = {
  wrong_po: [
    ['another number', HEAT, { purchase_order: 'PO-5010' }],
    ['another prefix', HEAT, { purchase_order: 'WO-5001' }],
    [
      'a certificate for another order altogether',
      HEAT,
      {
        purchase_order: '4711',
        specification: 'AMS 2759',
        certificate_date: '2026-02-01',
        cycles: [],
        lines: [{ ...lineOf(PLATE), part_number: '99-100' }],
      },
    ],
  ],
  part_number_missing: [
    ['a line left out', HEAT, { lines: agreeing(HEAT).lines.slice(0, 1) }],
    ['no lines', HEAT, { lines: [] }],
    [
      'a line left out of the page',
      HEAT,
      { lines: agreeing(HEAT).lines.slice(0, 1) },
      { file: { ...FILE, pages: [withWords('10-200 10-3115')] } },
    ],
    ['a line without its number', HEAT, lines(HEAT, { part_number: null })],
  ],
  part_number_unknown: [
    [
      'a part too many',
      HEAT,
      { lines: [...agreeing(HEAT).lines, { ...lineOf(HEAT), part_number: '88-123', lot: null }] },
    ],
    ['another number for a line', HEAT, lines(HEAT, { part_number: '77-901' })],
    ['one digit wrong', HEAT, lines(HEAT, { part_number: '10-208' })],
  ],
  part_number_transposed: [
    ['two digits', HEAT, lines(HEAT, { part_number: '10-020' })],
    [
      'on the page, its line not read',
      HEAT,
      { lines: agreeing(HEAT).lines.slice(0, 1) },
      { file: { ...FILE, pages: [withWords('10-200 10-131,')] } },
    ],
    ['over the dash', HEAT, lines(HEAT, { part_number: '12-000' })],
    ['in one that is not alone', HEAT, lines(HEAT, { part_number: '10-131' }, 1)],
  ],
  revision_mismatch: [
    ['another letter', HEAT, lines(HEAT, { rev: 'B' })],
    ['none where there is one', HEAT, lines(HEAT, { rev: 'N/C' })],
  ],
  quantity_mismatch: [
    ['too few', HEAT, lines(HEAT, { qty_accepted: 11 })],
    ['too many', HEAT, lines(HEAT, { qty_accepted: 13 })],
    [
      'a part of what was ordered',
      HEAT,
      { ...lines(HEAT, { qty_accepted: 7 }), facts: [fact('lines[0].qty_received', 12)] },
    ],
    ['too few with rejects', HEAT, lines(HEAT, { qty_accepted: 9, qty_rejected: 2 })],
  ],
  quantity_arithmetic: [
    ['more with the rejects than were sent', HEAT, lines(HEAT, { qty_accepted: 12, qty_rejected: 1 })],
    [
      'another total on the line',
      HEAT,
      {
        ...lines(HEAT, { qty_accepted: 10, qty_rejected: 1 }),
        facts: [fact('lines[0].qty_received', 12)],
      },
    ],
    ['another total of all lines', HEAT, { facts: [fact('qty_total', 21)] }],
  ],
  old_spec_revision: [
    ['a letter before', HEAT, { specification_revision: 'P' }],
    ['behind the number', HEAT, { specification: 'AMS2770P', specification_revision: null }],
    ['an earlier year', NDT, { specification_revision: '16' }],
    ['a year of the last century', NDT, { specification: 'ASTM E1417-99', specification_revision: null }],
  ],
  spec_revision_mismatch: [['a letter behind', HEAT, { specification_revision: 'S' }]],
  wrong_specification: [
    ['another number', HEAT, { specification: 'AMS 2771' }],
    ['a later one', { ...PLATE, spec: 'QQ-P-416', spec_rev: 'F' }, { specification: 'AMS-QQ-P-416' }],
    ['of a company', { ...HEAT, spec: 'XPS 100' }, { specification: 'XPS 101' }],
  ],
  superseded_specification: [
    ['a predecessor', HEAT, { specification: 'MIL-H-6088', specification_revision: 'G' }],
    ['one before that', HEAT, { specification: 'AMS-H-6088', specification_revision: null }],
  ],
  wrong_class_type: [
    ['another class', PLATE, { class_type: 'Type II, Class 3' }],
    ['another type', PLATE, { class_type: 'TYPE I CLASS 2' }],
    ['another strength', { ...PLATE, class_type: '160-180 ksi' }, { class_type: '180-200 KSI' }],
  ],
  wrong_temper: [
    ['another that is made of it', HEAT, { condition: 'T62', class_type: '2024-O to 2024-T62' }],
    ["the mill's name", HEAT, { condition: 'T4', class_type: null }],
    [
      'on a line alone',
      HEAT,
      { condition: null, class_type: null, ...lines(HEAT, { material: '2024-T62 SHEET' }) },
    ],
    [
      'of a steel',
      asking(heatTreat({ class_type: null, requirements: {} }), { temper_out: 'H1025' }),
      { condition: 'H900' },
    ],
  ],
  impossible_temper: [
    ['cold worked', HEAT, { condition: 'T3', class_type: '2024-O to 2024-T3' }],
    ['stretched', HEAT, { condition: null, class_type: '2024-O to 2024-T351' }],
    ['on a line', HEAT, lines(HEAT, { material: '2024-T3 SHEET 0.040' })],
  ],
  wrong_alloy: [
    ['on a line', HEAT, lines(HEAT, { material: '7075-O SHEET' })],
    [
      'on the whole',
      HEAT,
      { alloy: '6061', lines: agreeing(HEAT).lines.map((line) => ({ ...line, material: null })) },
    ],
    ['of a number that no table has', HEAT, lines(HEAT, { material: '2042-O SHEET' })],
  ],
  lot_mismatch: [['another lot', HEAT, lines(HEAT, { lot: 'L2' })]],
  serial_mismatch: [
    [
      'one that was not sent',
      heatTreat({ lines: [{ line: 1, part_number: '10-200', qty: 2, serials: ['S1', 'S2'] }] }),
      { lines: [{ ...lineOf(HEAT), rev: null, lot: null, qty_accepted: 2, serials: ['S1', 'S3'] }] },
    ],
  ],
  soak_too_short: [
    ['by its minutes', HEAT, cycles(HEAT, 'solution', { ...noTimes, minutes: 29 })],
    ['by its times', HEAT, cycles(HEAT, 'solution', { soak_end: '2026-03-05T09:30', minutes: null })],
    ['by its times against its minutes', HEAT, cycles(HEAT, 'solution', { soak_end: '2026-03-05T09:30' })],
  ],
  soak_too_long: [['', HEAT, cycles(HEAT, 'solution', { ...noTimes, minutes: 61 })]],
  time_arithmetic: [
    ['minutes and times', HEAT, cycles(HEAT, 'solution', { minutes: 41 })],
    [
      'an end before the start',
      HEAT,
      cycles(HEAT, 'solution', { soak_end: '2026-03-05T08:00', minutes: null }),
    ],
    ['a bake before plating ended', PLATE, { plating_end: '2026-03-06T16:30' }],
  ],
  temperature_out_of_range: [
    ['too hot', HEAT, cycles(HEAT, 'solution', { set_temp: 931 })],
    ['in °C', HEAT, cycles(HEAT, 'solution', { set_temp: 487, unit: 'C' })],
    ['without a unit, in neither', HEAT, cycles(HEAT, 'solution', { set_temp: 700, unit: null })],
    ['a bake', PLATE, cycles(PLATE, 'embrittlement_relief', { set_temp: 340 })],
  ],
  quench_delay_exceeded: [['', HEAT, { quench_delay_s: 10.5 }]],
  quench_medium_mismatch: [['', HEAT, { quench_medium: '18 % polymer in water' }]],
  quench_medium_too_warm: [
    ['in °F', HEAT, { facts: [fact('quench_medium_temp', 112, 'F')] }],
    ['in °C', HEAT, { facts: [fact('quench_medium_temp', 45, 'C')] }],
  ],
  age_missing: [['', HEAT, { cycles: agreeing(HEAT).cycles.slice(0, 1) }]],
  age_too_short: [['', HEAT, cycles(HEAT, 'natural_age', { minutes: 90 * 60 })]],
  age_too_long: [
    [
      '',
      asking(HEAT, { age: { kind: 'natural', min_hours: 96, max_hours: 200 } }),
      cycles(HEAT, 'natural_age', { minutes: 201 * 60 }),
    ],
  ],
  age_kind_mismatch: [['', HEAT, cycles(HEAT, 'natural_age', { step: 'artificial_age' })]],
  hardness_out_of_range: [
    ['one reading', HEAT, { readings: [reading('hardness', 'HRB', 70, 62.5)] }],
    ['in words', HEAT, { readings: [reading('hardness', 'Rockwell B', 50)] }],
    ['without a scale', HEAT, { readings: [reading('hardness', null, 50)] }],
    [
      'converted',
      asking(PLATE, { hardness: { scale: 'HRC', min: 36, max: 40 } }),
      { readings: [...agreeing(PLATE).readings, reading('hardness', 'HV', 500)] },
    ],
  ],
  conductivity_out_of_range: [
    ['in % IACS', HEAT, { readings: [reading('conductivity', '%IACS', 33)] }],
    ['in MS/m', HEAT, { readings: [reading('conductivity', 'MS/m', 19.1)] }],
    ['ten times too much, in print', HEAT, { readings: [reading('conductivity', '% IACS', 30.1, 325)] }],
    ['without a unit', HEAT, { readings: [reading('conductivity', null, 40)] }],
  ],
  readings_impossible_together: [
    [
      '',
      heatTreat({
        requirements: { alloy: '7075', temper_in: 'O', temper_out: 'T6' },
        class_type: null,
        lines: [{ line: 1, part_number: '10-200', qty: 12, material: '7075-O' }],
      }),
      {
        readings: [reading('hardness', 'HRB', 88), reading('conductivity', '% IACS', 40.5)],
      },
    ],
  ],
  tensile_out_of_range: [
    [
      'in MPa',
      asking(PLATE, { tensile_ksi: { min: 160, max: 180 } }),
      { readings: [...agreeing(PLATE).readings, reading('tensile', 'MPa', 1050)] },
    ],
  ],
  thickness_out_of_range: [
    ['thin', PLATE, { readings: [reading('thickness', 'µin', 310, 295)] }],
    ['thick', PLATE, { readings: [reading('thickness', 'mil', 0.6)] }],
    ['metric', PLATE, { readings: [reading('thickness', 'µm', 7.4)] }],
    ['in inches', PLATE, { readings: [reading('thickness', 'in', 0.0002)] }],
  ],
  bake_missing: [
    ['', PLATE, { cycles: [], bake_start: null, bake_end: null }],
    [
      'said not to be done',
      PLATE,
      { cycles: [], bake_start: null, bake_end: null },
      { file: { ...FILE, pages: [withWords('Bake: N/A')] } },
    ],
  ],
  bake_started_late: [['', PLATE, { bake_start: '2026-03-06T18:11', bake_end: '2026-03-08T18:11' }]],
  bake_too_short: [
    ['by its times', PLATE, { bake_end: '2026-03-07T14:00' }],
    [
      'by its minutes',
      PLATE,
      { ...cycles(PLATE, 'embrittlement_relief', { minutes: 22 * 60 }), bake_end: null },
    ],
  ],
  ndt_type_mismatch: [
    ['type', NDT, ndt({ type: 'Type II' })],
    ['level', NDT, ndt({ type: 'I', method: 'A', sensitivity: 'Level 3' })],
    [
      'visible for fluorescent particles',
      penetrant({ process: 'magnetic_particle', spec: 'ASTM E1444', class_type: 'wet fluorescent' }),
      { ...ndt({ method: 'Wet visible' }) },
    ],
    ['in its words', NDT, { class_type: 'Type 1 Method C, Sensitivity Level 2' }],
  ],
  personnel_level_too_low: [
    [
      '',
      asking(NDT, { personnel_level: 2 }),
      { ...ndt({ personnel_level: 'Level I' }), class_type: NDT.class_type ?? null },
    ],
  ],
  signature_missing: [['', HEAT, { signature_present: false }]],
  statement_missing: [['', HEAT, { conformance_statement: false }]],
  dated_before_dispatch: [
    ['the certificate', HEAT, { certificate_date: '2026-03-01' }],
    [
      'the work',
      HEAT,
      cycles(HEAT, 'solution', { soak_start: '2026-02-05T09:12', soak_end: '2026-02-05T09:50' }),
    ],
  ],
  dated_in_future: [['', HEAT, { certificate_date: '2026-03-21' }]],
  dated_before_work: [['', HEAT, { certificate_date: '2026-03-04' }]],
  certificate_reused: [
    ['its number', HEAT, {}, { seen: [{ certificate_number: 'C 881', purchase_order: 'PO-4000' }] }],
    ['its file', HEAT, {}, { seen: [{ sha256: FILE.sha256.toUpperCase(), purchase_order: '4000' }] }],
  ],
  approval_not_valid: [
    [
      'ended',
      heatTreat({ processor: { name: 'Example Thermal', approvals: [{ valid_to: '2026-03-04' }] } }),
      {},
    ],
    [
      'for another process',
      heatTreat({ processor: { name: 'Example Thermal', approval: { processes: ['anodize'] } } }),
      {},
    ],
  ],
  hidden_text: [['', HEAT, {}, { file: { ...FILE, pages: [page([HIDDEN, HIDDEN])] } }]],
  wrong_batch: [['', HEAT, { batch: 'B-0002' }, { orders: [HEAT, PLATE] }]],
  wrong_process: [['', { ...HEAT, spec: null }, { process: 'anodize' }]],
};

function lineOf(order: Order): CertificateLine {
  const [line] = agreeing(order).lines;
  if (!line) throw new Error('An order without lines.');
  return line;
}

describe.each(Object.entries(PLANTED))('%s', (code, cases) => {
  test.each(cases)('%s is found, once and alone', (_, order, changes, input) => {
    expect(codesOf(compared(order, changes, input))).toEqual([code]);
  });
});

test('each code has a case', () => {
  expect(Object.keys(PLANTED).toSorted()).toEqual([...DISCREPANCY_CODES].toSorted());
});

/** Each is right, and was near to a false alarm. */
const RIGHT: Case[] = [
  ['a heat treatment as ordered', HEAT, {}],
  ['a plating as ordered', PLATE, {}],
  ['an inspection as ordered', NDT, {}],
  ['an order number without prefix', HEAT, { purchase_order: '5001' }],
  ['an order number in words', HEAT, { purchase_order: 'P.O. No: 5001 Rev 2' }],
  ['two order numbers', HEAT, { purchase_order: 'PO-5001 and PO-5002' }],
  ['an order number misread', HEAT, { purchase_order: 'PO-S0O1' }, { file: { ...FILE, recognised: true } }],
  ['a number with its revision behind', HEAT, lines(HEAT, { part_number: '10-200-A', rev: null })],
  [
    'wet fluorescent particles',
    penetrant({ process: 'magnetic_particle', spec: 'ASTM E1444', class_type: 'wet fluorescent' }),
    ndt({ method: 'Magnetic particle, fluorescent, wet' }),
  ],
  ['a number without its dash', HEAT, lines(HEAT, { part_number: '10200' })],
  ['letters for digits', HEAT, lines(HEAT, { part_number: '1O-2OO' })],
  ['a revision recognised twice', HEAT, lines(HEAT, { rev: 'AA' }), { file: { ...FILE, recognised: true } }],
  ['a revision in words', HEAT, lines(HEAT, { rev: 'Rev. A' })],
  ['a revision that is not stated', HEAT, lines(HEAT, { rev: null })],
  ['honest rejects', HEAT, lines(HEAT, { qty_accepted: 10, qty_rejected: 2 })],
  ['a total that is right', HEAT, { facts: [fact('lines[0].qty_received', 12), fact('qty_total', 20)] }],
  ['a specification written together', HEAT, { specification: 'AMS2770R', specification_revision: null }],
  [
    'a specification with Revision',
    HEAT,
    { specification: 'AMS 2770, Revision R', specification_revision: null },
  ],
  ['a year in full', NDT, { specification: 'ASTM E1417/E1417M', specification_revision: '2021' }],
  ['a reapproved year', NDT, { specification: 'ASTM E1417-21(2025)', specification_revision: null }],
  ['no revision', HEAT, { specification_revision: null }],
  [
    'a part on the page whose line was not read',
    HEAT,
    { lines: agreeing(HEAT).lines.slice(0, 1) },
    { file: { ...FILE, pages: [withWords('Lot L1 10-200 Clip', '10 - 311 Bracket')] } },
  ],
  [
    'another number read for a part on the page',
    HEAT,
    lines(HEAT, { part_number: 'J54958', lot: null }),
    { file: { ...FILE, pages: [withWords('10-200')] } },
  ],
  [
    'parts on the page and no lines',
    HEAT,
    { lines: [] },
    { file: { ...FILE, pages: [withWords('10-200 and 10-311')] } },
  ],
  [
    'a bake on the page that was not read',
    PLATE,
    { cycles: [], bake_start: null, bake_end: null },
    { file: { ...FILE, pages: [withWords('Baked: 375F for 23.5 hours')] } },
  ],
  [
    'ageing on the page that was not read',
    HEAT,
    { cycles: agreeing(HEAT).cycles.slice(0, 1) },
    { file: { ...FILE, pages: [withWords('Aged naturally 96 hours')] } },
  ],
  [
    'a number without pieces',
    HEAT,
    {
      lines: [
        ...agreeing(HEAT).lines,
        {
          ...lineOf(HEAT),
          part_number: 'TEMP 900',
          rev: null,
          lot: null,
          qty_accepted: null,
          qty_rejected: null,
        },
      ],
    },
  ],
  ['minutes misread as hours', HEAT, cycles(HEAT, 'solution', { minutes: 38 * 60 })],
  ['one time for start and end', HEAT, cycles(HEAT, 'solution', { soak_end: '2026-03-05T09:12' })],
  ['two specifications', HEAT, { specification: 'AMS2750, AMS2770R', specification_revision: null }],
  ['arabic types', PLATE, { class_type: 'Ty. 2 Cl. 2' }],
  ['a class in other words', PLATE, { class_type: 'golden chromate' }],
  ['the old condition as material', HEAT, { condition: null, class_type: null }],
  ['the new condition as material', HEAT, lines(HEAT, { material: '2024-T42' })],
  ['a soak of exactly the least', HEAT, cycles(HEAT, 'solution', { ...noTimes, minutes: 30 })],
  [
    'a soak over midnight',
    HEAT,
    cycles(HEAT, 'solution', { soak_start: '2026-03-05T23:40', soak_end: '2026-03-06T00:18' }),
  ],
  ['a minute of rounding', HEAT, cycles(HEAT, 'solution', { minutes: 39 })],
  [
    'half an hour in days',
    HEAT,
    cycles(HEAT, 'natural_age', {
      minutes: 5760,
      soak_start: '2026-03-05T10:00',
      soak_end: '2026-03-09T10:20',
    }),
  ],
  ['°C', HEAT, cycles(HEAT, 'solution', { set_temp: 493, unit: 'C' })],
  ['°C at its rounded end', HEAT, cycles(HEAT, 'solution', { set_temp: 499, unit: 'C' })],
  ['a temperature without unit', HEAT, cycles(HEAT, 'solution', { set_temp: 920, unit: null })],
  ['no furnace steps at all', HEAT, { cycles: [] }],
  ['warm water', HEAT, { quench_medium: 'WATER 72 F', facts: [fact('quench_medium_temp', 72, 'F')] }],
  ['MS/m', HEAT, { readings: [reading('conductivity', 'MS/m', 16.6, 18.8)] }],
  ['MS/m at its rounded end', HEAT, { readings: [reading('conductivity', 'MS/m', 16.5)] }],
  ['another scale of hardness', HEAT, { readings: [reading('hardness', 'HR15T', 80)] }],
  [
    'two scales of hardness',
    HEAT,
    { readings: [reading('hardness', 'HRB', 70), reading('hardness', 'HB', 110)] },
  ],
  [
    'a reading whose point was not recognised',
    HEAT,
    { readings: [reading('conductivity', '% IACS', 30.1, 325), reading('hardness', 'HRB', 70.5, 71, 690)] },
    { file: { ...FILE, recognised: true } },
  ],
  ['micrometres', PLATE, { readings: [reading('thickness', 'µm', 7.62, 12.7)] }],
  ['micrometres at their rounded end', PLATE, { readings: [reading('thickness', 'microns', 7.6)] }],
  ['mils', PLATE, { readings: [reading('thickness', 'mils', 0.3, 0.5)] }],
  ['inches', PLATE, { readings: [reading('thickness', 'in', 0.0003, 0.0005)] }],
  ['a thickness without unit', PLATE, { readings: [reading('thickness', null, 0.0004)] }],
  ['a bake at the last minute', PLATE, { bake_start: '2026-03-06T18:10', bake_end: '2026-03-08T18:11' }],
  ['an inspection read apart', NDT, ndt({ method: 'Method A', type: '1', sensitivity: '2' })],
  ['the method by its name', NDT, ndt({ method: 'fluorescent penetrant', type: 'I' })],
  ['the day it left', HEAT, { certificate_date: '2026-03-02', cycles: [] }],
  ['the day of today', HEAT, { certificate_date: '2026-03-20' }],
  ['no date', HEAT, { certificate_date: null }],
  [
    'the same certificate again',
    HEAT,
    {},
    { seen: [{ certificate_number: 'C-881', purchase_order: '5001' }] },
  ],
  [
    "another processor's number",
    HEAT,
    {},
    { seen: [{ certificate_number: 'C-881', processor: 'Other Works', purchase_order: 'PO-1' }] },
  ],
  [
    'another certificate of one file',
    HEAT,
    {},
    { seen: [{ sha256: FILE.sha256, certificate_number: 'C-880', purchase_order: 'PO-1' }] },
  ],
  [
    'a valid approval',
    heatTreat({
      processor: {
        name: 'Example Thermal',
        approvals: [{ valid_to: '2026-03-04' }, { valid_to: '2026-12-31' }],
      },
    }),
    {},
  ],
  [
    'letters behind a scan',
    HEAT,
    {},
    { file: { ...FILE, pages: [page([{ ...HIDDEN, why: 'invisible' }], 'recognised')] } },
  ],
  ['hidden specks', HEAT, {}, { file: { ...FILE, pages: [page([{ ...HIDDEN, text: ' . ' }])] } }],
  ['a requirement that nobody knows', asking(HEAT, { grain_size: '5 or finer' }), {}],
  ['a processor in other words', HEAT, { processor: 'EXAMPLE THERMAL, INC.' }],
  [
    'a doubtful order that is kept to',
    asking(HEAT, { temper_out: 'T6' }),
    { condition: 'T6', class_type: '2024-O to 2024-T6' },
  ],
  [
    'an impossible order that is kept to',
    asking({ ...HEAT, class_type: null }, { temper_out: 'T3' }),
    { condition: 'T3' },
  ],
];

test.each(RIGHT)('%s is no discrepancy', (_, order, changes, input) => {
  expect(codesOf(compared(order, changes, input))).toEqual([]);
});
