import { expect, test } from 'vitest';

import { PUBLISHED } from '@/lib/evidence/certificate/compare/tables';
import { Requirements, type Order } from '@/lib/evidence/order';
import { inForce } from '@/lib/reference/in-force';
import { ownTables } from '@/lib/reference/own-table';

import { agreeing, compared, heatTreat, penetrant, plating } from './agreeing-certificate';

const HEAT = heatTreat();
const PLATE = plating();

const verdictOf = (result: ReturnType<typeof compared>, requirement: string, line: number | null = null) =>
  result.verdicts.find((one) => one.requirement.startsWith(requirement) && one.line === line);
const asking = (order: Order, requirements: object): Order => ({
  ...order,
  requirements: Requirements.parse({ ...order.requirements, ...requirements }),
});

test('a shop’s own table stands in for the published one, and is what is cited', () => {
  const order = heatTreat({
    requirements: { alloy: '7075', temper_in: 'O', temper_out: 'T6' },
    class_type: null,
    lines: [{ line: 1, part_number: '10-200', qty: 12, material: '7075-O' }],
  });
  const readings = [
    { kind: 'hardness', unit: 'HRB', values: [88] },
    { kind: 'conductivity', unit: '% IACS', values: [40.5] },
  ];
  const saidBy = (iacs: readonly [number, number]) => {
    const own = ownTables([
      {
        ...{ id: 'entry', tableId: 'acceptance', enteredByName: 'Test Person' },
        ...{ title: 'Own procedure', edition: 'issue 2', clause: '4.1' },
        rows: [
          {
            ...{ alloy: '7075', conditions: ['T6'], kind: 'acceptance' },
            ...{ iacs, hardness: [{ scale: 'HRB', min: 84 }] },
          },
        ],
      },
    ]);
    const { discrepancies } = compared(order, { readings }, { tables: inForce(PUBLISHED, own) });
    return discrepancies.find(({ code }) => code === 'readings_impossible_together')?.message ?? null;
  };
  expect(saidBy([30, 36])).toContain('Own procedure, issue 2, 4.1');
  expect(saidBy([30, 42])).toBeNull();
});

test('every requirement of an order has its verdict, each line its own', () => {
  const { verdicts } = compared(HEAT);
  expect(verdicts.map(({ requirement, line }) => [requirement, line])).toEqual([
    ['order PO-5001', null],
    ['part number 10-200', 1],
    ['part number 10-311', 2],
    ['revision A', 1],
    ['lot L1', 1],
    ['revision C', 2],
    ['lot L7', 2],
    ['quantity 12', 1],
    ['quantity 8', 2],
    ['specification AMS2770', null],
    ['AMS2770 revision R', null],
    ['process solution heat treat and age', null],
    ['alloy 2024', 1],
    ['alloy 2024', 2],
    ['condition T42', null],
    ['solution at 920 ± 10 °F (488 to 499 °C)', null],
    ['solution 30 min to 60 min', null],
    ['quench delay ≤ 10 s', null],
    ['quench in water', null],
    ['quench medium ≤ 110 °F', null],
    ['natural ageing ≥ 96 h', null],
    ['hardness ≥ 63 HRB', null],
    ['conductivity 28.5 to 32.5 % IACS', null],
    ['signature', null],
    ['statement of conformance', null],
    ['dated from 2026-03-02 to 2026-03-20', null],
  ]);
});

test('what a certificate does not say is not stated, and no discrepancy', () => {
  const result = compared(HEAT, {
    purchase_order: null,
    specification_revision: null,
    quench_delay_s: null,
    quench_medium: null,
    readings: [],
    cycles: [],
    certificate_date: null,
  });
  expect(result.discrepancies).toEqual([]);
  const open = result.verdicts.filter(({ verdict }) => verdict === 'not_stated');
  expect(open.map(({ requirement }) => requirement)).toEqual([
    'order PO-5001',
    'AMS2770 revision R',
    'solution at 920 ± 10 °F (488 to 499 °C)',
    'solution 30 min to 60 min',
    'quench delay ≤ 10 s',
    'quench in water',
    'quench medium ≤ 110 °F',
    'natural ageing ≥ 96 h',
    'hardness ≥ 63 HRB',
    'conductivity 28.5 to 32.5 % IACS',
    'dated from 2026-03-02 to 2026-03-20',
  ]);
});

test('a converted value says what it is in the unit of the order, and that it was rounded', () => {
  const result = compared(HEAT, { readings: [{ kind: 'conductivity', unit: 'MS/m', values: [17.4] }] });
  expect(verdictOf(result, 'conductivity')).toMatchObject({
    verdict: 'meets',
    why: '17.4 MS/m (30 % IACS, give or take the rounding of what is printed) lies within 28.5 to 32.5 % IACS.',
  });
});

test('a value only excused by its rounding is excused to half of its last place and no further', () => {
  const thin = (value: number) =>
    verdictOf(compared(PLATE, { readings: [{ kind: 'thickness', unit: 'µm', values: [value] }] }), 'coating');
  // 300 µin are 7.62 µm: 7.6 may have been 7.64, 7.5 was at most 7.549.
  expect(thin(7.6)?.verdict).toBe('meets');
  expect(thin(7.5)?.verdict).toBe('fails');
});

test('mils and inches are moved points, so that nothing is excused', () => {
  const at = (value: number, unit: string) =>
    verdictOf(compared(PLATE, { readings: [{ kind: 'thickness', unit, values: [value] }] }), 'coating')
      ?.verdict;
  expect(at(0.3, 'mil')).toBe('meets');
  expect(at(0.29, 'mil')).toBe('fails');
  expect(at(0.0003, 'in')).toBe('meets');
});

test('small numbers keep their figures', () => {
  const { verdicts } = compared(PLATE, { readings: [{ kind: 'thickness', unit: 'in', values: [0.00035] }] });
  expect(verdicts.find(({ requirement }) => requirement.startsWith('coating'))?.stated).toBe('0.00035 in');
});

test('a hardness in another scale is converted, and proves nothing', () => {
  const order = asking(PLATE, { hardness: { scale: 'HRC', min: 36, max: 42 } });
  const result = compared(order, { readings: [{ kind: 'hardness', unit: 'HV', values: [392] }] });
  const verdict = verdictOf(result, 'hardness');
  expect(verdict?.verdict).toBe('cannot_tell');
  expect(verdict?.why).toContain('about 40 HRC');
  expect(result.discrepancies).toEqual([]);
});

test('no table converts hardness of stainless steel', () => {
  const order = asking(PLATE, { alloy: '304', hardness: { scale: 'HRC', min: 36, max: 42 } });
  const material = agreeing(PLATE).lines.map((line) => ({ ...line, material: '304 SHEET' }));
  const result = compared(
    { ...order, lines: order.lines.map((line) => ({ ...line, material: '304 SHEET' })) },
    { lines: material, readings: [{ kind: 'hardness', unit: 'HV', values: [500] }] },
  );
  expect(verdictOf(result, 'hardness')?.verdict).toBe('cannot_tell');
  expect(result.discrepancies).toEqual([]);
});

test('each furnace load has its own verdict', () => {
  const [solution, age] = agreeing(HEAT).cycles;
  if (!solution || !age) throw new Error('Without cycles.');
  const result = compared(HEAT, {
    cycles: [solution, { ...solution, soak_start: null, soak_end: null, minutes: 25 }, age],
  });
  const soaks = result.verdicts.filter(({ requirement }) => requirement.startsWith('solution 30'));
  expect(soaks.map(({ verdict }) => verdict)).toEqual(['meets', 'fails']);
  expect(result.discrepancies.map(({ message }) => message)).toEqual([
    'The solution took 25 min; the order asks for 30 min to 60 min.',
  ]);
});

test('a message has both numbers in it', () => {
  const [one] = compared(HEAT, { quench_delay_s: 14 }).discrepancies;
  expect(one).toEqual({
    code: 'quench_delay_exceeded',
    line: null,
    ordered: '≤ 10 s',
    stated: '14 s',
    message: 'The quench came after 14 s; the order allows 10 s.',
    severity: 'blocks',
  });
});

test('a discrepancy of a line names the line of the order', () => {
  const lines = agreeing(HEAT).lines.map((line, at) => (at === 1 ? { ...line, rev: 'B' } : line));
  expect(compared(HEAT, { lines }).discrepancies.map(({ line }) => line)).toEqual([2]);
});

test('honest rejects are told', () => {
  const lines = agreeing(HEAT).lines.map((line, at) =>
    at === 0 ? { ...line, qty_accepted: 10, qty_rejected: 2 } : line,
  );
  expect(compared(HEAT, { lines }).observations).toEqual([
    'Line 1, 10-200: 2 of 12 pieces were rejected; with the 10 accepted all are accounted for.',
  ]);
});

test('a requirement that nobody knows is told', () => {
  expect(compared(asking(HEAT, { grain_size: '5 or finer' })).observations).toEqual([
    'The order also asks for grain size: 5 or finer. Compare it by eye.',
  ]);
});

test('two lines of one part number are told apart by their lots, and else by their pieces', () => {
  const order = heatTreat({
    lines: [
      { line: 1, part_number: '10-200', qty: 12, lot: 'L1' },
      { line: 2, part_number: '10-200', qty: 8, lot: 'L2' },
    ],
  });
  const swapped = agreeing(order).lines.toReversed();
  expect(compared(order, { lines: swapped }).discrepancies).toEqual([]);
  expect(compared(order, { lines: swapped.map((line) => ({ ...line, lot: null })) }).discrepancies).toEqual(
    [],
  );
});

test('a line told on two rows is added up', () => {
  const [first, second] = agreeing(HEAT).lines;
  if (!first || !second) throw new Error('Without lines.');
  const lines = [{ ...first, qty_accepted: 7 }, { ...first, qty_accepted: 5 }, second];
  expect(compared(HEAT, { lines }).discrepancies).toEqual([]);
});

test('without an order only what every certificate must have is asked', () => {
  const result = compared(null, { signature_present: false, certificate_date: '2027-01-01' });
  expect(result.discrepancies.map(({ code }) => code)).toEqual(['signature_missing', 'dated_in_future']);
  expect(result.matches_batch).toBeNull();
  expect(result.observations).toHaveLength(1);
});

test('of the open orders it is compared with the one that it belongs to', () => {
  const result = compared(null, { quench_delay_s: 14 }, { orders: [PLATE, HEAT, penetrant()] });
  expect(result.matches_batch).toBe('B-0001');
  expect(result.discrepancies.map(({ code }) => code)).toEqual(['quench_delay_exceeded']);
});

test('one certificate for two batches is right for each', () => {
  const both = {
    purchase_order: 'PO-5001, PO-5002',
    lines: [...agreeing(HEAT).lines, ...agreeing(PLATE).lines],
  };
  const result = compared(HEAT, both, { orders: [HEAT, PLATE] });
  expect(result.discrepancies).toEqual([]);
  expect(result.observations).toEqual(['The certificate also covers 20-777 of batch B-0002, order PO-5002.']);
});
