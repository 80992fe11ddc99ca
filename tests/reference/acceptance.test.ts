import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { acceptanceOf } from '@/lib/trade/acceptance/acceptance-of';
import { iacsFromMsPerM, msPerMFromIacs } from '@/lib/trade/acceptance/conductivity';
import { judgeCondition } from '@/lib/trade/acceptance/judge-condition';
import { judgeT73Lot } from '@/lib/trade/acceptance/judge-t73-lot';
import { measuringCautions, type Measurement } from '@/lib/trade/acceptance/measuring-cautions';
import { roughTensileOfAluminium } from '@/lib/trade/acceptance/rough-tensile-of-aluminium';
import { typicalPropertiesOf } from '@/lib/trade/acceptance/typical-properties-of';
import type { HardnessScale } from '@/lib/trade/hardness/hardness-table';
import { ACCEPTANCE } from '@/lib/trade/tables/acceptance';
import { MEASURING_RULES } from '@/lib/trade/tables/measuring-rules';
import { T73_LOT_RULE } from '@/lib/trade/tables/t73-lot-rule';
import { TYPICAL_PROPERTIES } from '@/lib/trade/tables/typical-properties';
import { mmFromInches } from '@/lib/trade/units/length';
import { ksiFromMpa, mpaFromKsi } from '@/lib/trade/units/stress';
import { fahrenheitDifferenceFromCelsius } from '@/lib/trade/units/temperature';

import { named, numberOf, publishedRows } from './values';

const bare = (alloy: string, condition: string) => ({ alloy, condition, isClad: false });

test('2024-T42 bare shows HRB 63 to 83 and 28.5 to 34.0 % IACS, 16.5 to 19.7 MS/m', () => {
  const found = acceptanceOf(ACCEPTANCE, bare('2024', 'T42'));
  expect(found).toMatchObject({
    ok: true,
    band: { iacs: [28.5, 34], hardness: [{ scale: 'HRB', min: 63, max: 83 }] },
    source: { confidence: 'memory', certainty: 'high' },
    readFrom: { table: 'acceptance' },
  });
  const [low, high] = (found.ok && found.band.msPerM) || [NaN, NaN];
  expect(low).toBeCloseTo(16.53, 9);
  expect(high).toBeCloseTo(19.72, 9);
});

describe('published bands, at their ends and just outside', () => {
  const rows = publishedRows('acceptance', [
    'alloy',
    'condition',
    'iacs_low',
    'iacs_high',
    'scale',
    'hardness_low',
    'hardness_high',
    'kind',
  ]);
  test.each(named(rows))(
    '$said: $alloy-$condition $iacs_low to $iacs_high % IACS, $scale $hardness_low to $hardness_high, $kind',
    (row) => {
      const found = acceptanceOf(ACCEPTANCE, bare(row.alloy, row.condition));
      const bands = found.ok ? [found.band, ...found.alsoPublished] : [];
      expect(bands).toContainEqual(
        expect.objectContaining({
          kind: row.kind,
          iacs: [numberOf(row.iacs_low), numberOf(row.iacs_high)],
          source: expect.objectContaining({
            confidence: row.confidence,
            certainty: row.certainty,
          }) as unknown,
        }),
      );
      if (row.scale === '') return;
      const scale = row.scale as HardnessScale;
      const judged = (value: number, percentIacs: number) => {
        const judgement = judgeCondition(ACCEPTANCE, bare(row.alloy, row.condition), {
          hardness: { scale, value },
          percentIacs,
        });
        return judgement.ok ? [judgement.hardness, judgement.conductivity, judgement.pair] : [];
      };
      const low = row.hardness_low === '' ? numberOf(row.hardness_high) : numberOf(row.hardness_low);
      const high = row.hardness_high === '' ? low : numberOf(row.hardness_high);
      expect(judged(low, numberOf(row.iacs_low))).toEqual(['meets', 'meets', 'meets']);
      expect(judged(high, numberOf(row.iacs_high))).toEqual(['meets', 'meets', 'meets']);
      expect(judged(low, numberOf(row.iacs_low) - 0.1)).toEqual(['meets', 'does_not_meet', 'does_not_meet']);
      expect(judged(high, numberOf(row.iacs_high) + 0.1)).toEqual([
        'meets',
        'does_not_meet',
        'does_not_meet',
      ]);
      if (row.hardness_low !== '') expect(judged(low - 0.1, numberOf(row.iacs_low))[2]).toBe('does_not_meet');
      if (row.hardness_high !== '')
        expect(judged(high + 0.1, numberOf(row.iacs_low))[2]).toBe('does_not_meet');
    },
  );
  test('what stands with "about" in the source says so', () => {
    const found = acceptanceOf(ACCEPTANCE, bare('6013', 'T4'));
    expect(found.ok && found.band.hardness).toEqual([{ scale: 'HRE', min: 75, max: 90, isAbout: true }]);
  });
  test.each([
    [bare('5083', 'H32'), 'alloy_not_in_table'],
    [bare('2024', 'T361'), 'condition_not_in_table'],
  ] as const)('%o is refused: %s', (asked, reason) => {
    expect(acceptanceOf(ACCEPTANCE, asked)).toMatchObject({ ok: false, reason });
  });
});

describe('the trap of hardness or conductivity alone', () => {
  const T6 = bare('7075', 'T6');
  test('7075-T6 with HRB 88 and 33.0 % IACS meets; with 38.5 % IACS, as T73 has, it does not', () => {
    const hardness = { scale: 'HRB', value: 88 } as const;
    expect(judgeCondition(ACCEPTANCE, T6, { hardness, percentIacs: 33 })).toMatchObject({ pair: 'meets' });
    expect(judgeCondition(ACCEPTANCE, T6, { hardness, percentIacs: 38.5 })).toMatchObject({
      hardness: 'meets',
      conductivity: 'does_not_meet',
      pair: 'does_not_meet',
    });
  });
  test('one reading of the two shows nothing', () => {
    expect(judgeCondition(ACCEPTANCE, T6, { hardness: { scale: 'HRB', value: 88 } })).toMatchObject({
      hardness: 'meets',
      conductivity: 'not_measured',
      pair: 'not_shown',
    });
    expect(judgeCondition(ACCEPTANCE, T6, { percentIacs: 33 })).toMatchObject({
      hardness: 'not_measured',
      pair: 'not_shown',
    });
    expect(
      judgeCondition(ACCEPTANCE, T6, { hardness: { scale: 'HRE', value: 95 }, percentIacs: 33 }),
    ).toMatchObject({
      hardness: 'no_limit_in_this_scale',
      pair: 'not_shown',
    });
    expect(judgeCondition(ACCEPTANCE, T6, { percentIacs: NaN })).toMatchObject({
      conductivity: 'not_measured',
    });
  });
  test('MIL-STD-1537C para 5.1.2.1: both that meet still do not prove tensile properties', () => {
    const judged = judgeCondition(ACCEPTANCE, T6, { hardness: { scale: 'HRB', value: 88 }, percentIacs: 33 });
    expect(judged).toMatchObject({ pair: 'meets', provesTensile: false });
    const cautions = measuringCautions(MEASURING_RULES, { ...T6 });
    expect(cautions).toMatchObject([
      {
        rule: { rule: 'pair_decides' },
        source: { document: 'MIL-STD-1537C para 5.1.2.1', confidence: 'read' },
      },
    ]);
  });
});

describe('the trap of clad judged by the band of bare metal', () => {
  test('MIL-STD-1537C paras 4.4.3-4.4.4: clad is refused until a correlation is proven', () => {
    const clad = { alloy: '2024', condition: 'T3', isClad: true };
    expect(acceptanceOf(ACCEPTANCE, clad)).toMatchObject({ ok: false, reason: 'clad_needs_correlation' });
    expect(judgeCondition(ACCEPTANCE, clad, { percentIacs: 30 })).toMatchObject({
      reason: 'clad_needs_correlation',
    });
    const rules = measuringCautions(MEASURING_RULES, clad).map(({ rule }) => rule.rule);
    expect(rules).toContain('clad_needs_correlation');
  });
});

describe('the trap of one published band for 7075', () => {
  test('two sources give 7075-T6 different bands; both are kept and a reading between them is told', () => {
    const found = acceptanceOf(ACCEPTANCE, bare('7075', 'T6'));
    expect(found).toMatchObject({
      band: { iacs: [30.5, 36], kind: 'acceptance' },
      alsoPublished: [{ iacs: [30, 34.5], kind: 'worked_example' }],
    });
    const judged = (percentIacs: number) => judgeCondition(ACCEPTANCE, bare('7075', 'T6'), { percentIacs });
    expect(judged(35.5)).toMatchObject({ conductivity: 'meets', sourcesDisagree: true });
    expect(judged(30.2)).toMatchObject({ conductivity: 'does_not_meet', sourcesDisagree: true });
    expect(judged(33)).toMatchObject({ conductivity: 'meets', sourcesDisagree: false });
  });
  test('for 7075-T73 the whole pair is used, and the band that was read stands beside it', () => {
    const found = acceptanceOf(ACCEPTANCE, bare('7075', 'T73'));
    expect(found).toMatchObject({
      band: { hardness: [{ scale: 'HRB' }] },
      alsoPublished: [{ source: { confidence: 'read' } }],
    });
  });
});

describe('MIL-H-6088G / AMS QQ-A-250, T73 lot rule, from memory', () => {
  const yields = (overKsi: number) => ({ yieldMpa: mpaFromKsi(56 + overKsi), yieldMpaMin: mpaFromKsi(56) });
  test.each([
    [40, {}, true],
    [37.9, {}, false],
    [38, yields(12), true],
    [39.9, yields(12), true],
    [39, yields(10), true],
    [39, yields(13), false],
  ])('%d %% IACS with %o: accepted %s', (percentIacs, lot, isAccepted) => {
    expect(judgeT73Lot(T73_LOT_RULE, { percentIacs, ...lot })).toMatchObject({ ok: true, isAccepted });
  });
  test('between the limits the yield strength has to be stated', () => {
    expect(judgeT73Lot(T73_LOT_RULE, { percentIacs: 39 })).toMatchObject({ reason: 'yield_not_stated' });
    expect(judgeT73Lot(T73_LOT_RULE, { percentIacs: NaN })).toMatchObject({ reason: 'value_not_a_number' });
  });
});

describe('typical values, no acceptance', () => {
  const rows = publishedRows('typical-properties', ['alloy', 'condition', 'iacs', 'hb500']);
  test.each(named(rows))('$said: $alloy-$condition $iacs % IACS, HB $hb500', (row) => {
    const found = typicalPropertiesOf(TYPICAL_PROPERTIES, { alloy: row.alloy, condition: row.condition });
    expect(found.ok && found.values).toContainEqual({
      ...(row.iacs !== '' && { percentIacs: numberOf(row.iacs) }),
      ...(row.hb500 !== '' && { hb500: numberOf(row.hb500) }),
      source: expect.objectContaining({ confidence: row.confidence, certainty: row.certainty }) as unknown,
    });
  });
  test('2024-T3 has 30 % IACS by one source and HB 120 by another', () => {
    const found = typicalPropertiesOf(TYPICAL_PROPERTIES, { alloy: '2024', condition: 'T3' });
    expect(found).toMatchObject({ values: [{ percentIacs: 30 }, { hb500: 120 }] });
    expect(typicalPropertiesOf(TYPICAL_PROPERTIES, { alloy: '2024', condition: 'T99' })).toMatchObject({
      reason: 'not_in_table',
    });
  });
});

describe('measuring', () => {
  const made = (more: Partial<Measurement>) =>
    measuringCautions(MEASURING_RULES, { ...bare('7075', 'T6'), ...more })
      .map(({ rule }) => rule.rule)
      .filter((rule) => rule !== 'pair_decides');
  test.each([
    ['MIL-STD-1537C para 5.1.2: within 3 °C', { temperatureDifferenceC: 3 }, []],
    ['MIL-STD-1537C para 5.1.2: over 3 °C', { temperatureDifferenceC: 3.1 }, ['temperature_difference']],
    ['MIL-STD-1537C para 5.1.4: coating of 0.003 in', { coatingMm: mmFromInches(0.003) }, []],
    [
      'MIL-STD-1537C para 5.1.4: coating over 0.003 in',
      { coatingMm: mmFromInches(0.0031) },
      ['lift_off_correction'],
    ],
    ['MIL-STD-1537C para 4.4.4: bare 7075-T6 of 0.050 in', { thicknessMm: mmFromInches(0.05) }, []],
    [
      'MIL-STD-1537C para 4.4.4: bare 7075-T6 under 0.050 in is stacked',
      { thicknessMm: mmFromInches(0.049) },
      ['stack_thin_sheet'],
    ],
    ['MIL-STD-1537C para 4.5: who may read the instrument', { instrument: 'indirect' }, ['operator']],
    ['T.O. 1-1A-9 para 3-225: Brinell', { isBrinell: true }, ['brinell']],
  ] as const)('%s', (_name, more, expected) => {
    expect(made(more)).toEqual(expected);
  });
  test('MIL-STD-1537C para 5.1.2 prints 3 °C and 5.4 °F for the same difference', () => {
    const [caution] = measuringCautions(MEASURING_RULES, {
      ...bare('7075', 'T6'),
      temperatureDifferenceC: 4,
    }).filter(({ rule }) => rule.rule === 'temperature_difference');
    const rule = caution?.rule;
    if (rule?.rule !== 'temperature_difference') throw new Error('No such caution');
    expect(fahrenheitDifferenceFromCelsius(rule.mostC)).toBeCloseTo(rule.mostF, 9);
  });
  test('T.O. 1-1A-9 para 3-225: 500 kgf, ball of 10 mm, 30 s; MIL-STD-1537C para 4.5: level II for indirect reading', () => {
    const cautions = measuringCautions(MEASURING_RULES, {
      ...bare('7075', 'T6'),
      isBrinell: true,
      instrument: 'indirect',
    });
    expect(cautions).toMatchObject([
      {},
      { rule: { indirect: 'nas_410_level_2', direct: 'trained' } },
      { rule: { kgf: 500, ballMm: 10, holdS: 30 } },
    ]);
  });
  test('a design text: HB 135 is about 75.6 ksi, for rough identification only', () => {
    const found = roughTensileOfAluminium(MEASURING_RULES, 135);
    expect(found.ok && ksiFromMpa(found.tensileMpa)).toBeCloseTo(75.6, 9);
    expect(found).toMatchObject({ isRough: true, source: { certainty: 'medium' } });
    expect(roughTensileOfAluminium(MEASURING_RULES, 161)).toMatchObject({ reason: 'outside_brinell_range' });
    expect(roughTensileOfAluminium(MEASURING_RULES, NaN)).toMatchObject({ reason: 'outside_brinell_range' });
  });
});

describe('conductivity', () => {
  test('by definition: 100 % IACS is 58 MS/m', () => {
    expect(msPerMFromIacs(100)).toBe(58);
    expect(msPerMFromIacs(30)).toBeCloseTo(17.4, 12);
    expect(iacsFromMsPerM(17.4)).toBeCloseTo(30, 12);
  });
  test('law: there and back is the same value', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 110, noNaN: true }), (iacs) => {
        expect(iacsFromMsPerM(msPerMFromIacs(iacs))).toBeCloseTo(iacs, 9);
      }),
    );
  });
});
