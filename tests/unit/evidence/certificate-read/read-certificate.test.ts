import { expect, test } from 'vitest';
import { statedIn } from '@/lib/evidence/certificate/read/read-certificate';
import { fileOf, pageOf } from './page-of-text';

const read = (lines: readonly string[]) => {
  const [stated] = statedIn(fileOf(pageOf(lines)));
  if (!stated) throw new Error('nothing was read');
  return stated;
};

const HEAD = [
  'Example Thermal Processing, Inc.',
  '1 Kiln Road, Dayton, OH 45402',
  '',
  'CERTIFICATE OF CONFORMANCE',
  '',
  'Customer:        Wren Aircraft Parts LLC',
  'Certificate No.: C-881                Date: 03/10/2026',
  'Purchase Order:  PO-5001              Batch: B-0001',
  'Specification:   AMS2770R             Condition: 2024-O to 2024-T42',
  '',
];
const PARTS = [
  'Part No.      Rev    Material              Lot     Qty Acc   Qty Rej',
  '10-200        A      2024-O SHEET 0.040    L1      12        0',
  '10-311        C      2024-O SHEET 0.063    L7      8         1',
  'TOTAL                                              20        1',
  '',
];
const CYCLES = [
  'Operation        Set Temp    Time In             Time Out            Soak Time',
  'Solution treat   920 °F      03/05/2026 09:12    03/05/2026 09:50    38 min',
  'Natural age      RT          03/05/2026 09:50    03/09/2026 09:50    96 hours',
  '',
  'Quench medium: Water      Quench delay: 7 s (max 10 s)',
  '',
  'Test            Required         Actual',
  'Hardness        63 min           69.0, 70.5 HRB',
  'Conductivity    28.5 - 32.5      30.1 % IACS',
  '',
];
const FOOT = [
  'We certify that the parts listed above conform to all requirements of the order.',
  '',
  'Signature: ______________',
  'Name: R. Marlow',
];

test('a form with tables is read whole', () => {
  const stated = read([...HEAD, ...PARTS, ...CYCLES, ...FOOT]);
  expect(stated).toMatchObject({
    processor: 'Example Thermal Processing, Inc.',
    certificate_number: 'C-881',
    certificate_date: '2026-03-10',
    purchase_order: 'PO-5001',
    batch: 'B-0001',
    process: 'solution_heat_treat_and_age',
    specification: 'AMS 2770',
    specification_revision: 'R',
    class_type: '2024-O to 2024-T42',
    condition: 'T42',
    lines: [
      {
        part_number: '10-200',
        rev: 'A',
        qty_accepted: 12,
        qty_rejected: 0,
        material: '2024-O SHEET 0.040',
        lot: 'L1',
      },
      {
        part_number: '10-311',
        rev: 'C',
        qty_accepted: 8,
        qty_rejected: 1,
        material: '2024-O SHEET 0.063',
        lot: 'L7',
      },
    ],
    cycles: [
      {
        step: 'solution',
        set_temp: 920,
        unit: 'F',
        soak_start: '2026-03-05T09:12',
        soak_end: '2026-03-05T09:50',
        minutes: 38,
      },
      { step: 'natural_age', set_temp: null, minutes: 5760 },
    ],
    quench_medium: 'water',
    quench_delay_s: 7,
    readings: [
      { kind: 'hardness', unit: 'HRB', values: [69, 70.5] },
      { kind: 'conductivity', unit: '%IACS', values: [30.1] },
    ],
    conformance_statement: true,
  });
  const fact = stated.facts.find(({ field }) => field === 'certificate_number');
  expect(fact).toMatchObject({ raw: 'C-881', page: 1, box: [142, 124, 172, 134] });
});

test('a printed name and an empty line sign nothing; a stroke on the line does', () => {
  const lines = [...HEAD, ...PARTS, ...FOOT];
  expect(read(lines).signature_present).toBe(false);
  const row = lines.indexOf('Signature: ______________');
  const stroke = { kind: 'stroke', box: [110, 28 + row * 14, 190, 50 + row * 14] } as const;
  const [signed] = statedIn(fileOf(pageOf(lines, { marks: [stroke] })));
  expect(signed).toMatchObject({ signature_present: true, signed_by: 'R. Marlow' });
});

test('a title certifies nothing', () => {
  expect(
    read([...HEAD, ...PARTS, 'This document shall not be reproduced except in full.']).conformance_statement,
  ).toBe(false);
});

test("the customer's receiving stamp is not the certificate's date", () => {
  const lines = HEAD.map((line) => line.replace('Date: 03/10/2026', 'Issued: 03/10/2026'));
  expect(read([...lines, 'RECEIVED 12 MAR 2026', ...PARTS]).certificate_date).toBe('2026-03-10');
});

test('a day that can be two is none, and its words are kept', () => {
  const stated = read([
    'Example Plating',
    'Certificate No. 77',
    'Date: 03/04/2026',
    'P.O. No. 5001',
    'Part No. 10-200  Qty 4',
  ]);
  expect(stated.certificate_date).toBeNull();
  expect(stated.facts.find(({ field }) => field === 'certificate_date')).toMatchObject({
    value: null,
    raw: '03/04/2026',
  });
});

test('sentences of a mail give lines, cycles and readings', () => {
  const stated = read([
    'Example Plating Works',
    'Certificate number: 4471',
    'Your PO: PO-5002',
    '',
    'The following parts received cadmium plating per AMS-QQ-P-416 Rev F, Type II Class 2:',
    '',
    '- P/N 20-777 Rev B, lot H12, material 4340 STEEL: 40 pcs accepted, 0 rejected',
    '',
    'Plating completed 6 March 2026 14:10. The parts were baked at 375 °F for 23.5 hours,',
    'from 6 March 2026 16:00 to 7 March 2026 15:30. Thickness measured 430, 445 µin.',
    '',
    'We certify that the parts conform to the requirements of the order.',
    '/s/ Ines Calder',
  ]);
  expect(stated).toMatchObject({
    process: 'cadmium_plate',
    specification: 'AMS-QQ-P-416',
    specification_revision: 'F',
    class_type: 'Type II Class 2',
    lines: [
      {
        part_number: '20-777',
        rev: 'B',
        qty_accepted: 40,
        qty_rejected: 0,
        material: '4340 STEEL',
        lot: 'H12',
      },
    ],
    plating_end: '2026-03-06T14:10',
    bake_start: '2026-03-06T16:00',
    bake_end: '2026-03-07T15:30',
    cycles: [{ step: 'embrittlement_relief', set_temp: 375, unit: 'F', minutes: 1410 }],
    readings: [{ kind: 'thickness', unit: 'microinch', values: [430, 445] }],
    signature_present: true,
    conformance_statement: true,
  });
});

test('rows may begin with their step, beside what was required', () => {
  const stated = read([
    'OXBOW HEAT TREATING CO.',
    'CERTIFICATION OF HEAT TREATMENT                         No. 55210',
    'Sold to: Lowell Rotor Works           Date: Mar 12, 2026',
    '',
    'HEAT TREATED TO T62 PER AMS 2770 REV. R',
    "                     TEMP       IN                 OUT              REQ'D      ACTUAL",
    'SOLUTION             900F       3/5/26 0910        3/5/26 0952      35 MIN     42 MIN',
    'AGE                  250F       3/5/26 1400        3/6/26 1400      23 HR      24 HR',
    '',
    "HARDNESS REQ'D: 84 HRB MIN     HARDNESS FOUND: 86, 87, 88 HRB",
  ]);
  expect(stated).toMatchObject({
    processor: 'OXBOW HEAT TREATING CO.',
    certificate_number: '55210',
    certificate_date: '2026-03-12',
    cycles: [
      {
        step: 'solution',
        set_temp: 900,
        soak_start: '2026-03-05T09:10',
        soak_end: '2026-03-05T09:52',
        minutes: 42,
      },
      {
        step: 'artificial_age',
        set_temp: 250,
        soak_start: '2026-03-05T14:00',
        soak_end: '2026-03-06T14:00',
        minutes: 1440,
      },
    ],
    readings: [{ kind: 'hardness', unit: 'HRB', values: [86, 87, 88] }],
  });
});

test('the times of a bake are not those of the plating before it', () => {
  const stated = read([
    'Process: Zinc plate per ASTM B633-19 Type II, SC 3',
    'Bake: 375 F for 23 hours. Out of plating 3/6/26 2:10 PM, in oven 3/6/26 4:00 PM, out of oven 3/7/26 3:30 PM.',
  ]);
  expect(stated).toMatchObject({
    class_type: 'Type II SC 3',
    plating_end: '2026-03-06T14:10',
    bake_start: '2026-03-06T16:00',
    bake_end: '2026-03-07T15:30',
  });
});

test('a page with a number of its own is another certificate, one without goes with the page before', () => {
  const second = HEAD.map((line) => line.replace('C-881', 'C-882'));
  const file = fileOf(
    pageOf([...HEAD, ...PARTS], { number: 1 }),
    pageOf(CYCLES, { number: 2 }),
    pageOf([...second, ...PARTS], { number: 3 }),
  );
  expect(statedIn(file).map(({ certificate_number, cycles }) => [certificate_number, cycles.length])).toEqual(
    [
      ['C-881', 2],
      ['C-882', 0],
    ],
  );
});

test('a file without words states nothing and breaks nothing', () => {
  expect(read([])).toMatchObject({
    certificate_number: null,
    lines: [],
    signature_present: false,
    facts: [],
  });
});
