import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { convertHardness } from '@/lib/trade/hardness/convert-hardness';
import { hardnessTestRoom } from '@/lib/trade/hardness/hardness-test-room';
import type { HardnessRow, HardnessScale, HardnessTable } from '@/lib/trade/hardness/hardness-table';
import { readEachList } from '@/lib/trade/hardness/read-each-list';
import { rowsOutOfOrder } from '@/lib/trade/hardness/rows-out-of-order';
import { hardnessFromTensile, tensileFromHardness } from '@/lib/trade/hardness/tensile-from-hardness';
import { writeConverted } from '@/lib/trade/hardness/write-converted';
import { HARDNESS_ALUMINIUM } from '@/lib/trade/tables/hardness-aluminium';
import { HARDNESS_STEEL_BRINELL } from '@/lib/trade/tables/hardness-steel-brinell';
import { HARDNESS_STEEL_HRB } from '@/lib/trade/tables/hardness-steel-hrb';
import { HARDNESS_STEEL_HRC } from '@/lib/trade/tables/hardness-steel-hrc';
import { HARDNESS_STEEL_OTHER_LIST } from '@/lib/trade/tables/hardness-steel-other-list';
import { HARDNESS_TEST_ROOM } from '@/lib/trade/tables/hardness-test-room';
import { ksiFromMpa, mpaFromKsi } from '@/lib/trade/units/stress';

import { numberOf, publishedRows, saidBy, type PublishedRow } from './values';

const STEEL = 'non_austenitic_steel' as const;

test('HRC 40 in steel is HV 392, HBW 371 and 182 ksi', () => {
  const ask = { material: STEEL, from: 'HRC', value: 40 } as const;
  expect(convertHardness(HARDNESS_STEEL_HRC, { ...ask, to: 'HV' })).toMatchObject({
    ok: true,
    value: 392,
    isBetweenRows: false,
    isApproximate: true,
    readFrom: { table: 'hardness-steel-hrc' },
    source: { confidence: 'read' },
  });
  expect(convertHardness(HARDNESS_STEEL_HRC, { ...ask, to: 'HBW' })).toMatchObject({ value: 371 });
  const tensile = tensileFromHardness(HARDNESS_STEEL_HRC, ask);
  expect(tensile).toMatchObject({ ok: true, source: { confidence: 'read' } });
  expect(tensile.ok && tensile.tensileMpa).toBeCloseTo(mpaFromKsi(182), 9);
  const back = hardnessFromTensile(HARDNESS_STEEL_HRC, {
    material: STEEL,
    tensileMpa: mpaFromKsi(182),
    to: 'HRC',
  });
  expect(back.ok && back.value).toBeCloseTo(40, 9);
});

interface Published {
  readonly table: HardnessTable;
  readonly said: string;
  readonly from: HardnessScale;
  readonly at: number;
  readonly to: HardnessScale | 'tensile';
  readonly value: number;
}

/** Every printed pair of the first scale with each other column of a file. */
function pairs<Column extends string>(
  table: HardnessTable,
  rows: readonly PublishedRow<Column>[],
  [first, ...others]: readonly [Column, HardnessScale | 'tensile'][],
): Published[] {
  if (!first || first[1] === 'tensile') throw new Error('The first column is a scale');
  const [column, from] = [first[0], first[1]];
  return rows.flatMap((row) =>
    others.flatMap(([other, to]) =>
      row[other] === ''
        ? []
        : [
            {
              table,
              said: saidBy(row),
              from,
              to,
              // Read by the test itself, so that the row counts as checked.
              get at() {
                return numberOf(row[column]);
              },
              get value() {
                return numberOf(row[other]);
              },
            },
          ],
    ),
  );
}

const BRINELL_ROWS = publishedRows('hardness-steel-brinell', [
  'HB_3000',
  'HRC',
  'HRB',
  'HRB_in_brackets',
  'tensile_ksi',
]);
const PUBLISHED = [
  ...pairs(
    HARDNESS_STEEL_HRC,
    publishedRows('hardness-steel-hrc', ['HRC', 'HV', 'HBW_3000', 'HRA', 'HR15N', 'tensile_ksi_approx']),
    [
      ['HRC', 'HRC'],
      ['HV', 'HV'],
      ['HBW_3000', 'HBW'],
      ['HRA', 'HRA'],
      ['HR15N', 'HR15N'],
      ['tensile_ksi_approx', 'tensile'],
    ],
  ),
  ...pairs(
    HARDNESS_STEEL_HRB,
    publishedRows('hardness-steel-hrb', ['HRB', 'HV', 'HBW_3000', 'tensile_ksi_approx']),
    [
      ['HRB', 'HRB'],
      ['HV', 'HV'],
      ['HBW_3000', 'HBW'],
      ['tensile_ksi_approx', 'tensile'],
    ],
  ),
  ...pairs(HARDNESS_STEEL_BRINELL, BRINELL_ROWS, [
    ['HB_3000', 'HBW'],
    ['HRC', 'HRC'],
    ['HRB', 'HRB'],
    ['tensile_ksi', 'tensile'],
  ]),
  ...pairs(HARDNESS_ALUMINIUM, publishedRows('hardness-aluminium', ['HB_500', 'HV', 'HRB', 'HRE']), [
    ['HB_500', 'HB500'],
    ['HV', 'HV'],
    ['HRB', 'HRB'],
    ['HRE', 'HRE'],
  ]),
];

test.each(PUBLISHED)('$said: $from $at is $to $value, and back', ({ table, from, at, to, value }) => {
  const material = table.material;
  if (to === 'tensile') {
    const there = tensileFromHardness(table, { material, from, value: at });
    expect(there.ok && ksiFromMpa(there.tensileMpa)).toBeCloseTo(value, 9);
    const back = hardnessFromTensile(table, { material, tensileMpa: mpaFromKsi(value), to: from });
    expect(back.ok && back.value).toBeCloseTo(at, 6);
    return;
  }
  expect(convertHardness(table, { material, from, value: at, to })).toMatchObject({ ok: true, value });
  expect(convertHardness(table, { material, from: to, value, to: from })).toMatchObject({
    ok: true,
    value: at,
  });
});

test.each(BRINELL_ROWS)('$source: HRB stands in brackets beside HBW $HB_3000: "$HRB_in_brackets"', (row) => {
  const found = convertHardness(HARDNESS_STEEL_BRINELL, {
    material: STEEL,
    from: 'HBW',
    value: numberOf(row.HB_3000),
    to: 'HRB',
  });
  if (row.HRB === '') expect(found).toMatchObject({ ok: false, reason: 'above_table' });
  else expect(found).toMatchObject({ ok: true, isInBrackets: row.HRB_in_brackets === 'yes' });
});

test.each([
  [65, true],
  [59, true],
  [58, false],
])('ASTM E140 Table 1 as reprinted: Brinell beside HRC %i stands in brackets: %s', (value, isInBrackets) => {
  const found = convertHardness(HARDNESS_STEEL_HRC, { material: STEEL, from: 'HRC', value, to: 'HBW' });
  expect(found).toMatchObject({ ok: true, isInBrackets });
});

describe('against fits worked out apart from the table', () => {
  const hrcFromHv = (ln: number) => 280.605 - 223.661 * ln + 48.2972 * ln ** 2 - 2.94507 * ln ** 3;
  const lnHvFromHrc = (h: number) =>
    5.1973872 - 0.00030113914 * h + 0.00098625991 * h ** 2 - 1.6969622e-5 * h ** 3 + 1.142739e-7 * h ** 4;
  const ksiFromHrc = (h: number) => 68.7832 + 2.57384 * h - 0.0574124 * h ** 2 + 0.00160169 * h ** 3;
  const fits = new Map(
    publishedRows('hardness-fits', ['fit', 'max_error', 'unit']).map((row) => [row.fit, row]),
  );
  // Read inside of the test, so that the row counts as checked.
  const largest = (fit: string) => numberOf(fits.get(fit)?.max_error ?? '');
  const read = (from: HardnessScale, value: number, to: HardnessScale) => {
    const found = convertHardness(HARDNESS_STEEL_HRC, { material: STEEL, from, value, to });
    return found.ok ? found.value : NaN;
  };
  const from = (low: number, high: number) => Array.from({ length: high - low + 1 }, (_, at) => low + at);

  test('computed: HRC from HV 238 to 940 stays within the fit', () => {
    const off = from(20, 68).map((hrc) => Math.abs(hrcFromHv(Math.log(read('HRC', hrc, 'HV'))) - hrc));
    expect(Math.max(...off)).toBeLessThan(largest('hrc_from_hv') + 0.005);
  });
  test('computed: HV from HRC 20 to 68 stays within the fit', () => {
    const off = from(20, 68).map(
      (hrc) => Math.abs(Math.exp(lnHvFromHrc(hrc)) / read('HRC', hrc, 'HV') - 1) * 100,
    );
    expect(Math.max(...off)).toBeLessThan(largest('hv_from_hrc') + 0.005);
  });
  test('computed: ksi from HRC 20 to 59 stays within the fit', () => {
    const off = from(20, 59).map((hrc) => {
      const tensile = tensileFromHardness(HARDNESS_STEEL_HRC, { material: STEEL, from: 'HRC', value: hrc });
      return Math.abs(ksiFromHrc(hrc) - (tensile.ok ? ksiFromMpa(tensile.tensileMpa) : NaN));
    });
    expect(Math.max(...off)).toBeLessThan(largest('ksi_from_hrc') + 0.05);
  });
});

describe('limits', () => {
  const ask = { material: STEEL, from: 'HRC', value: 40, to: 'HV' } as const;
  test.each([
    ['below HRC 20', { ...ask, value: 19.9 }, 'below_table'],
    ['above HRC 68', { ...ask, value: 68.1 }, 'above_table'],
    ['no number', { ...ask, value: NaN }, 'value_not_a_number'],
    ['a scale the table has not', { ...ask, to: 'HRE' }, 'scale_not_in_table'],
    [
      'another material: ASTM E140 scope, from memory',
      { ...ask, material: 'other' },
      'no_table_for_material',
    ],
    [
      'aluminium by a steel table',
      { ...ask, material: 'wrought_aluminium', from: 'HV' },
      'no_table_for_material',
    ],
    [
      'Rockwell C on aluminium: T.O. 1-1A-9 para 3-225',
      { ...ask, material: 'wrought_aluminium' },
      'scale_means_nothing_on_aluminium',
    ],
  ] as const)('%s is refused', (_name, question, reason) => {
    expect(convertHardness(HARDNESS_STEEL_HRC, question)).toMatchObject({ ok: false, reason });
  });
  test('tensile strength ends where the list ends', () => {
    expect(tensileFromHardness(HARDNESS_STEEL_HRC, { ...ask, value: 60 })).toMatchObject({
      ok: false,
      reason: 'above_table',
    });
    expect(tensileFromHardness(HARDNESS_ALUMINIUM, { ...ask, material: 'other' }).ok).toBe(false);
    expect(
      hardnessFromTensile(HARDNESS_STEEL_HRC, { material: 'other', tensileMpa: 1000, to: 'HRC' }).ok,
    ).toBe(false);
  });
  test('between a row that was read and one from memory the answer is from memory', () => {
    const found = convertHardness(HARDNESS_STEEL_HRC, { ...ask, value: 34.5 });
    expect(found).toMatchObject({ ok: true, isBetweenRows: true, source: { confidence: 'memory' } });
  });
  test('ASTM E18, from memory: metal around an indentation 0.1 mm deep and 0.5 mm across', () => {
    const room = hardnessTestRoom(HARDNESS_TEST_ROOM, { depthMm: 0.1, diameterMm: 0.5 });
    expect(room).toMatchObject({ ok: true, thicknessMm: 1, fromEdgeMm: 1.25, betweenMm: 1.5 });
    expect(hardnessTestRoom(HARDNESS_TEST_ROOM, { depthMm: 0, diameterMm: 1 }).ok).toBe(false);
  });
  test('ASTM E140, from memory: reported as measured with the converted number in brackets', () => {
    const written = writeConverted({ value: 353, scale: 'HBW' }, { value: 38.04, scale: 'HRC' });
    expect(written).toBe('353 HBW (38 HRC)');
  });
});

describe('the trap of one conversion list', () => {
  const STEEL_LISTS = [HARDNESS_STEEL_HRC, HARDNESS_STEEL_BRINELL, HARDNESS_STEEL_OTHER_LIST];
  const spreadKsi = (value: number, lists: readonly HardnessTable[]) =>
    readEachList(
      lists,
      (table) => tensileFromHardness(table, { material: STEEL, from: 'HRC', value }),
      ({ tensileMpa }) => ksiFromMpa(tensileMpa),
    );
  test.each([
    [50, 255, 235],
    [40, 182, 181],
  ])('two posted lists: tensile at HRC %i is %i ksi by one and %i ksi by the other', (hrc, one, other) => {
    const { answers, spread } = spreadKsi(hrc, [HARDNESS_STEEL_HRC, HARDNESS_STEEL_OTHER_LIST]);
    expect(answers.map(({ tensileMpa }) => Math.round(ksiFromMpa(tensileMpa)))).toEqual([one, other]);
    expect(spread).toBeCloseTo(one - other, 9);
  });
  test.each([
    [20, 228, 238],
    [21, 238, 243],
  ])('a posted list against ASTM E140: HRC %i is HV %i or HV %i', (value, other, e140) => {
    const { answers } = readEachList(
      STEEL_LISTS,
      (table) => convertHardness(table, { material: STEEL, from: 'HRC', value, to: 'HV' }),
      ({ value: hv }) => hv,
    );
    expect(answers.map((answer) => answer.value)).toEqual([e140, other]);
  });
  test('between the single values of the other list nothing is read', () => {
    const found = tensileFromHardness(HARDNESS_STEEL_OTHER_LIST, { material: STEEL, from: 'HRC', value: 45 });
    expect(found).toMatchObject({ ok: false, reason: 'not_printed_in_list' });
  });
  test('no list that answers, no spread', () => {
    expect(spreadKsi(67, STEEL_LISTS)).toEqual({ answers: [], spread: null });
  });
});

describe('the trap of a misprint copied from a reprint', () => {
  const MISPRINTS = [
    { HRC: 37, scale: 'HRA', printed: 58.9, is: 68.9 },
    { HRC: 52, scale: 'HR15N', printed: 84.4, is: 86.4 },
  ] as const;
  const copied = (hrc: number, change: Partial<HardnessRow>): HardnessTable => ({
    ...HARDNESS_STEEL_HRC,
    edition: 'as copied by a shop',
    rows: HARDNESS_STEEL_HRC.rows.map((row) => (row.HRC === hrc ? { ...row, ...change } : row)),
  });
  test.each(MISPRINTS)('a widely copied reprint: HRC $HRC beside $scale $printed is not read', (misprint) => {
    const { HRC: value, scale: to, printed, is } = misprint;
    const ask = { material: STEEL, from: 'HRC', value, to } as const;
    expect(convertHardness(HARDNESS_STEEL_HRC, ask)).toMatchObject({ ok: true, value: is });

    const table = copied(value, { [to]: printed });
    expect(rowsOutOfOrder(table, to)).toMatchObject([{ row: { HRC: value }, printed }]);
    expect(convertHardness(table, ask)).toMatchObject({ ok: false, reason: 'row_out_of_order' });
    expect(convertHardness(table, { ...ask, value: value + 0.5 })).toMatchObject({
      reason: 'row_out_of_order',
    });
    expect(convertHardness(table, { ...ask, value: value + 2 })).toMatchObject({ ok: true });
  });
  test('a widely copied reprint: 56.6 for HR30N at HRC 59 breaks the order of its column', () => {
    // The column itself was not read; 76.6 fits between what its neighbours hold, 56.6 does not.
    const column = [77.5, 56.6, 75.7].map((HRA, at) => ({ HRC: 60 - at, HRA }));
    const [source] = HARDNESS_STEEL_HRC.rows.map((row) => row.source);
    if (!source) throw new Error('The table has rows');
    const table = { ...HARDNESS_STEEL_HRC, rows: column.map((row) => ({ ...row, source })) };
    expect(rowsOutOfOrder(table, 'HRA')).toMatchObject([{ row: { HRC: 59 }, printed: 56.6 }]);
  });
  test('none of the tables here has a row out of order', () => {
    const tables = [HARDNESS_STEEL_HRC, HARDNESS_STEEL_HRB, HARDNESS_STEEL_BRINELL, HARDNESS_ALUMINIUM];
    const scales = ['HRC', 'HRB', 'HRE', 'HRA', 'HR15N', 'HV', 'HBW', 'HB500', 'tensileKsi'] as const;
    expect(tables.flatMap((table) => scales.flatMap((scale) => rowsOutOfOrder(table, scale)))).toEqual([]);
  });
});

describe('laws of conversion', () => {
  const hrc = fc.double({ min: 20, max: 68, noNaN: true });
  const hvOf = (value: number) => {
    const found = convertHardness(HARDNESS_STEEL_HRC, { material: STEEL, from: 'HRC', value, to: 'HV' });
    return found.ok ? found.value : NaN;
  };
  test('there and back is the same number, far below the step of the table', () => {
    fc.assert(
      fc.property(hrc, (value) => {
        const back = convertHardness(HARDNESS_STEEL_HRC, {
          material: STEEL,
          from: 'HV',
          value: hvOf(value),
          to: 'HRC',
        });
        expect(back.ok && Math.abs(back.value - value)).toBeLessThan(1e-5);
      }),
    );
  });
  test('harder by one scale is never softer by another', () => {
    fc.assert(fc.property(hrc, hrc, (a, b) => hvOf(Math.min(a, b)) <= hvOf(Math.max(a, b))));
  });
});
