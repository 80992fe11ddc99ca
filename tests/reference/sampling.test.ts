import fc from 'fast-check';
import jstat from 'jstat';
import { describe, expect, test } from 'vitest';

import { codeLetter, INSPECTION_LEVELS, SAMPLE_LETTERS } from '@/lib/trade/sampling/code-letter';
import { binomialAtMost, hypergeometricAtMost } from '@/lib/trade/sampling/distributions';
import {
  LOT_TOLERANCE_POINT,
  operatingCharacteristic,
  operatingCharacteristicOfLot,
  PRODUCER_POINT,
  qualityAt,
} from '@/lib/trade/sampling/operating-characteristic';
import { sampleDecision, sampleForLot } from '@/lib/trade/sampling/sample-for-lot';
import { AQLS, singleSamplingPlan } from '@/lib/trade/sampling/single-sampling-plan';
import {
  nonconformingIn,
  zeroAcceptanceInstead,
  zeroAcceptanceSample,
} from '@/lib/trade/sampling/zero-acceptance-sample';
import { CODE_LETTERS } from '@/lib/trade/tables/sampling-code-letters';
import { SINGLE_SAMPLING_NORMAL } from '@/lib/trade/tables/single-sampling-normal';
import { SINGLE_SAMPLING_REDUCED } from '@/lib/trade/tables/single-sampling-reduced';
import { SINGLE_SAMPLING_TIGHTENED } from '@/lib/trade/tables/single-sampling-tightened';

import { numberOf, publishedRows, saidBy } from './values';

const letterOf = (text: string) => {
  const letter = SAMPLE_LETTERS.find((known) => known === text);
  if (!letter) throw new Error(`"${text}" is no code letter`);
  return letter;
};
const PRINTED = ['code', 'n', 'aql_pct', 'ac', 're', 'arrow'] as const;
const FOLLOWED = [...PRINTED, 'use_code', 'use_n', 'use_ac', 'use_re'] as const;
const NORMAL = { letters: CODE_LETTERS, plans: SINGLE_SAMPLING_NORMAL };

describe('code letters', () => {
  test('a lot of 60 at level II has the letter E', () => {
    expect(codeLetter(CODE_LETTERS, 60, 'II')).toMatchObject({ ok: true, letter: 'E' });
  });

  const rows = publishedRows('sampling-code-letters', ['lot_from', 'lot_to', ...INSPECTION_LEVELS]);
  test.each(rows.map((row) => [`${row.lot_from} to ${row.lot_to || 'any'} (${saidBy(row)})`, row] as const))(
    'lots of %s',
    (_name, row) => {
      const from = numberOf(row.lot_from);
      const to = row.lot_to === '' ? 10_000_000 : numberOf(row.lot_to);
      for (const level of INSPECTION_LEVELS)
        for (const lotSize of [from, to])
          expect(codeLetter(CODE_LETTERS, lotSize, level)).toMatchObject({ ok: true, letter: row[level] });
    },
  );

  test.each([
    [1, 'lot_smaller_than_table'],
    [0, 'lot_smaller_than_table'],
    [2.5, 'lot_not_whole'],
    [NaN, 'lot_not_whole'],
  ])('a lot of %f is refused: %s', (lotSize, reason) => {
    expect(codeLetter(CODE_LETTERS, lotSize, 'II')).toEqual({ ok: false, reason });
  });

  test('beyond a table that ends is refused, not extended', () => {
    const short = { ...CODE_LETTERS, rows: CODE_LETTERS.rows.slice(0, 3) };
    expect(codeLetter(short, 26, 'II')).toEqual({ ok: false, reason: 'lot_larger_than_table' });
  });
});

describe.each([
  ['normal', SINGLE_SAMPLING_NORMAL, publishedRows('sampling-normal', FOLLOWED)],
  ['tightened', SINGLE_SAMPLING_TIGHTENED, publishedRows('sampling-tightened', FOLLOWED)],
] as const)('%s inspection, every printed cell', (_inspection, table, rows) => {
  test('the file holds every letter at every level', () => {
    expect(rows).toHaveLength(SAMPLE_LETTERS.length * AQLS.length);
  });

  test.each(rows.map((row) => [row.code, row.aql_pct, saidBy(row), row] as const))(
    'letter %s at AQL %s (%s)',
    (_letter, _aql, _said, row) => {
      const plan = singleSamplingPlan(table, letterOf(row.code), numberOf(row.aql_pct));
      expect(plan).toMatchObject({
        ok: true,
        letter: row.use_code,
        sampleSize: numberOf(row.use_n),
        accept: numberOf(row.use_ac),
        reject: numberOf(row.use_re),
        arrow: row.arrow === '' ? null : row.arrow,
      });
      if (row.arrow === '') {
        expect(numberOf(row.ac)).toBe(numberOf(row.use_ac));
        expect(numberOf(row.re)).toBe(numberOf(row.use_re));
        expect(numberOf(row.n)).toBe(numberOf(row.use_n));
      }
      expect(plan.source?.confidence).toBe(row.confidence);
    },
  );
});

describe('reduced inspection, from memory', () => {
  const rows = publishedRows('sampling-reduced', PRINTED);
  const printed = rows.filter(({ arrow }) => arrow === '');
  test.each(printed.map((row) => [row.code, row.aql_pct, saidBy(row), row] as const))(
    'letter %s at AQL %s (%s)',
    (_letter, _aql, _said, row) => {
      expect(
        singleSamplingPlan(SINGLE_SAMPLING_REDUCED, letterOf(row.code), numberOf(row.aql_pct)),
      ).toMatchObject({
        ok: true,
        sampleSize: numberOf(row.n),
        accept: numberOf(row.ac),
        reject: numberOf(row.re),
        arrow: null,
      });
    },
  );

  test.each(rows.filter(({ arrow }) => arrow !== '').map((row) => [row.code, row.aql_pct, row] as const))(
    'letter %s at AQL %s is an arrow to the nearest plan in its column',
    (_letter, _aql, row) => {
      const plan = singleSamplingPlan(SINGLE_SAMPLING_REDUCED, letterOf(row.code), numberOf(row.aql_pct));
      const column = printed.filter(({ aql_pct: aql }) => aql === row.aql_pct);
      const steps = ({ code }: { code: string }) =>
        (SAMPLE_LETTERS.indexOf(letterOf(code)) - SAMPLE_LETTERS.indexOf(letterOf(row.code))) *
        (row.arrow === 'down' ? 1 : -1);
      const [nearest] = column.filter((cell) => steps(cell) > 0).toSorted((a, b) => steps(a) - steps(b));
      expect(plan).toMatchObject({ ok: true, letter: nearest?.code, arrow: row.arrow });
    },
  );

  test('a plan never asks for more pieces, nor accepts more, than normal inspection at the same letter', () => {
    for (const letter of SAMPLE_LETTERS)
      for (const aql of AQLS) {
        const reduced = singleSamplingPlan(SINGLE_SAMPLING_REDUCED, letter, aql);
        const normal = singleSamplingPlan(SINGLE_SAMPLING_NORMAL, letter, aql);
        if (!reduced.ok || !normal.ok) throw new Error('a cell without a plan');
        expect(reduced.sampleSize).toBeLessThanOrEqual(normal.sampleSize);
        expect(reduced.accept).toBeLessThanOrEqual(normal.accept);
        expect(reduced.source.confidence).toBe('memory');
      }
  });

  test('between accept and reject the lot passes and normal inspection comes back', () => {
    const plan = singleSamplingPlan(SINGLE_SAMPLING_REDUCED, 'F', 6.5);
    if (!plan.ok) throw new Error(plan.reason);
    expect([0, 1, 2, 3, 4].map((found) => sampleDecision(plan, found))).toEqual([
      'accepted',
      'accepted',
      'accepted_back_to_normal',
      'accepted_back_to_normal',
      'rejected',
    ]);
  });
});

describe('the sample of a lot', () => {
  test('60 pieces, level II, AQL 1.0: letter E, 13 pieces, accept 0, reject 1', () => {
    expect(sampleForLot(NORMAL, { lotSize: 60, level: 'II', aqlPct: 1 })).toMatchObject({
      ok: true,
      letter: 'E',
      inspect: 13,
      accept: 0,
      reject: 1,
      arrow: null,
      wholeLot: false,
    });
  });

  test('the trap of an arrow that only changes the acceptance numbers: the sample size changes too', () => {
    // Letter E prints 13 pieces; at AQL 0.65 the arrow leads to letter F and its 20.
    expect(sampleForLot(NORMAL, { lotSize: 60, level: 'II', aqlPct: 0.65 })).toMatchObject({
      ok: true,
      letter: 'F',
      inspect: 20,
      accept: 0,
      arrow: 'down',
    });
    // Upwards it asks for fewer.
    expect(sampleForLot(NORMAL, { lotSize: 100, level: 'II', aqlPct: 1 })).toMatchObject({
      ok: true,
      letter: 'E',
      inspect: 13,
      accept: 0,
      arrow: 'up',
    });
  });

  test('a plan for more pieces than there are looks at the whole lot', () => {
    expect(sampleForLot(NORMAL, { lotSize: 8, level: 'II', aqlPct: 0.65 })).toMatchObject({
      ok: true,
      sampleSize: 20,
      inspect: 8,
      wholeLot: true,
    });
  });

  test.each([
    [60, 10, 'aql_not_in_table'],
    [60, 0.5, 'aql_not_in_table'],
    [1, 1, 'lot_smaller_than_table'],
    [7.5, 1, 'lot_not_whole'],
  ])('a lot of %f at AQL %f is refused: %s', (lotSize, aqlPct, reason) => {
    expect(sampleForLot(NORMAL, { lotSize, level: 'II', aqlPct })).toEqual({ ok: false, reason });
  });

  test('an arrow that leads out of a cut table is refused', () => {
    const cut = { ...SINGLE_SAMPLING_NORMAL, rows: SINGLE_SAMPLING_NORMAL.rows.slice(0, 4) };
    expect(singleSamplingPlan(cut, 'A', 1)).toEqual({ ok: false, reason: 'letter_not_in_table' });
    expect(singleSamplingPlan(cut, 'F', 1)).toEqual({ ok: false, reason: 'letter_not_in_table' });
  });

  test('a bigger lot never gets a smaller sample, nor more care a smaller one', () => {
    const lot = fc.integer({ min: 2, max: 600_000 });
    fc.assert(
      fc.property(
        lot,
        lot,
        fc.constantFrom(...AQLS),
        fc.constantFrom(...INSPECTION_LEVELS),
        (a, b, aqlPct, level) => {
          const small = sampleForLot(NORMAL, { lotSize: Math.min(a, b), level, aqlPct });
          const large = sampleForLot(NORMAL, { lotSize: Math.max(a, b), level, aqlPct });
          return small.ok && large.ok && small.inspect <= large.inspect;
        },
      ),
    );
  });

  const SIZES = publishedRows('sampling-sizes-by-lot', ['lot_from', 'lot_to', 'sample']);
  test.each(SIZES.map((row) => [row.lot_from, row.lot_to, saidBy(row), row] as const))(
    'lots of %s to %s have the sample size of general level II (%s)',
    (_from, _to, _said, row) => {
      for (const lotSize of [numberOf(row.lot_from), numberOf(row.lot_to)]) {
        const coded = codeLetter(CODE_LETTERS, lotSize, 'II');
        const printed = SINGLE_SAMPLING_NORMAL.rows.find(({ letter }) => coded.ok && letter === coded.letter);
        expect(printed?.sampleSize).toBe(numberOf(row.sample));
      }
    },
  );
});

describe('zero acceptance', () => {
  test('90 pieces of which 9 bad, 10 % risk: 20 pieces, passed with 0.0921', () => {
    const sample = zeroAcceptanceSample({ lotSize: 90, nonconforming: 9, riskPct: 10 });
    expect(sample).toMatchObject({ ok: true, sampleSize: 20 });
    expect(sample.ok && sample.passes).toBeCloseTo(0.0921, 4);
  });

  const rows = publishedRows('sampling-zero-acceptance', [
    'lot_N',
    'rql_pct',
    'D',
    'confidence_pct',
    'n',
    'P_accept',
  ]);
  test.each(rows.map((row) => [row.lot_N, row.rql_pct, saidBy(row), row] as const))(
    'a lot of %s with a rejectable %s %% (%s)',
    (_lot, _pct, _said, row) => {
      const lotSize = numberOf(row.lot_N);
      const nonconforming = nonconformingIn(lotSize, numberOf(row.rql_pct));
      expect(nonconforming).toBe(numberOf(row.D));
      const riskPct = 100 - numberOf(row.confidence_pct);
      const sample = zeroAcceptanceSample({ lotSize, nonconforming, riskPct });
      expect(sample).toMatchObject({ ok: true, sampleSize: numberOf(row.n) });
      expect(sample.ok && sample.passes).toBeCloseTo(numberOf(row.P_accept), 4);
    },
  );

  const matched = publishedRows('sampling-zero-acceptance-matched', [
    'lot_N',
    'aql_pct',
    'letter',
    'plan_letter',
    'plan_n',
    'plan_ac',
    'plan_p10_pct',
    'D_at_p10',
    'c0_n',
    'P_accept',
  ]);
  test.each(matched.map((row) => [row.lot_N, row.aql_pct, saidBy(row), row] as const))(
    'a lot of %s at AQL %s and the zero-acceptance sample with the same protection (%s)',
    (_lot, _aql, _said, row) => {
      const lotSize = numberOf(row.lot_N);
      expect(codeLetter(CODE_LETTERS, lotSize, 'II')).toMatchObject({ letter: row.letter });
      const plan = sampleForLot(NORMAL, { lotSize, level: 'II', aqlPct: numberOf(row.aql_pct) });
      if (!plan.ok) throw new Error(plan.reason);
      expect(plan).toMatchObject({
        letter: row.plan_letter,
        inspect: numberOf(row.plan_n),
        accept: numberOf(row.plan_ac),
      });
      const tolerated = qualityAt(plan, LOT_TOLERANCE_POINT);
      expect(tolerated.ok && tolerated.nonconformingPct).toBeCloseTo(numberOf(row.plan_p10_pct), 2);
      const sample = zeroAcceptanceInstead(plan, lotSize);
      expect(sample).toMatchObject({
        ok: true,
        nonconforming: numberOf(row.D_at_p10),
        sampleSize: numberOf(row.c0_n),
      });
      expect(sample.ok && sample.passes).toBeCloseTo(numberOf(row.P_accept), 4);
    },
  );

  test('150 pieces at AQL 4.0: instead of 20 with 2 accepted, 8 with none', () => {
    const plan = sampleForLot(NORMAL, { lotSize: 150, level: 'II', aqlPct: 4 });
    expect(plan).toMatchObject({ inspect: 20, accept: 2 });
    expect(plan.ok && zeroAcceptanceInstead(plan, 150)).toMatchObject({ ok: true, sampleSize: 8 });
  });

  test('one piece fewer would miss the lot too often', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 2, max: 600 }),
        fc.nat(),
        fc.double({ min: 0.5, max: 60, noNaN: true }),
        (lotSize, any, riskPct) => {
          const nonconforming = 1 + (any % lotSize);
          const sample = zeroAcceptanceSample({ lotSize, nonconforming, riskPct });
          if (!sample.ok) return false;
          const fewer = { lotSize, nonconforming, sampleSize: sample.sampleSize - 1 };
          return sample.passes <= riskPct / 100 + 1e-9 && hypergeometricAtMost(fewer, 0) > riskPct / 100;
        },
      ),
    );
  });

  test.each([
    [{ lotSize: 0, nonconforming: 1, riskPct: 10 }, 'lot_not_whole'],
    [{ lotSize: 10, nonconforming: 0, riskPct: 10 }, 'nonconforming_not_in_lot'],
    [{ lotSize: 10, nonconforming: 11, riskPct: 10 }, 'nonconforming_not_in_lot'],
    [{ lotSize: 10, nonconforming: 1, riskPct: 0 }, 'risk_not_a_percentage'],
  ])('%o is refused: %s', (asked, reason) => {
    expect(zeroAcceptanceSample(asked)).toEqual({ ok: false, reason });
  });
});

describe('distributions against a general statistics package', () => {
  const counts = fc
    .tuple(fc.integer({ min: 1, max: 400 }), fc.nat(), fc.nat(), fc.nat())
    .map(([lotSize, bad, drawn, found]) => {
      const sampleSize = drawn % (lotSize + 1);
      return { lotSize, nonconforming: bad % (lotSize + 1), sampleSize, found: found % (sampleSize + 1) };
    });

  test('hypergeometric', () => {
    fc.assert(
      fc.property(counts, ({ found, ...drawn }) => {
        const theirs = jstat.hypgeom.cdf(found, drawn.lotSize, drawn.nonconforming, drawn.sampleSize);
        expect(hypergeometricAtMost(drawn, found)).toBeCloseTo(theirs, 9);
      }),
      { numRuns: 500 },
    );
  });

  test('binomial', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 400 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.nat(),
        (sampleSize, fraction, any) => {
          const found = any % (sampleSize + 1);
          expect(binomialAtMost(sampleSize, fraction, found)).toBeCloseTo(
            jstat.binomial.cdf(found, sampleSize, fraction),
            7,
          );
        },
      ),
      { numRuns: 500 },
    );
  });

  test('15 pieces, 2 bad, 10 drawn: none bad with 0.0952; 20 from a stream with 0.65 %: none with 0.8777', () => {
    expect(hypergeometricAtMost({ lotSize: 15, nonconforming: 2, sampleSize: 10 }, 0)).toBeCloseTo(0.0952, 4);
    expect(binomialAtMost(20, 0.0065, 0)).toBeCloseTo(0.8777, 4);
  });

  test('counts that contradict each other are no number', () => {
    expect(hypergeometricAtMost({ lotSize: 5, nonconforming: 6, sampleSize: 1 }, 0)).toBeNaN();
    expect(hypergeometricAtMost({ lotSize: 5, nonconforming: 1, sampleSize: 6 }, 0)).toBeNaN();
    expect(binomialAtMost(5, 1.2, 0)).toBeNaN();
  });
});

describe('operating characteristic', () => {
  const rows = publishedRows('sampling-oc-points', [
    'code',
    'n',
    'ac',
    'aql_pct',
    'pa_at_aql',
    'p99_pct',
    'p95_pct',
    'p50_pct',
    'p10_pct',
    'p05_pct',
  ]);
  const POINTS = [
    [0.99, 'p99_pct'],
    [PRODUCER_POINT, 'p95_pct'],
    [0.5, 'p50_pct'],
    [LOT_TOLERANCE_POINT, 'p10_pct'],
    [0.05, 'p05_pct'],
  ] as const;
  test.each(rows.map((row) => [row.code, row.aql_pct, saidBy(row), row] as const))(
    'letter %s at AQL %s (%s)',
    (_letter, _aql, _said, row) => {
      const aqlPct = numberOf(row.aql_pct);
      const plan = singleSamplingPlan(SINGLE_SAMPLING_NORMAL, letterOf(row.code), aqlPct);
      if (!plan.ok) throw new Error(plan.reason);
      expect(plan).toMatchObject({ sampleSize: numberOf(row.n), accept: numberOf(row.ac) });
      const curve = operatingCharacteristic(plan, [aqlPct]);
      expect(curve.ok && curve.points[0]?.accepted).toBeCloseTo(numberOf(row.pa_at_aql), 4);
      for (const [accepted, column] of POINTS) {
        const quality = qualityAt(plan, accepted);
        expect(quality.ok && quality.nonconformingPct).toBeCloseTo(numberOf(row[column]), 3);
      }
    },
  );

  test('worse lots never pass more easily', () => {
    const pct = fc.double({ min: 0, max: 100, noNaN: true });
    const plan = fc.record({
      sampleSize: fc.integer({ min: 1, max: 300 }),
      accept: fc.integer({ min: 0, max: 21 }),
    });
    fc.assert(
      fc.property(plan, pct, pct, (asked, a, b) => {
        const curve = operatingCharacteristic(asked, [Math.min(a, b), Math.max(a, b)]);
        const [better, worse] = curve.ok ? curve.points : [];
        return better !== undefined && worse !== undefined && worse.accepted <= better.accepted + 1e-12;
      }),
    );
  });

  test('the point that the curve is asked for lies on the curve', () => {
    const plan = fc.record({
      sampleSize: fc.integer({ min: 30, max: 300 }),
      accept: fc.integer({ min: 0, max: 21 }),
    });
    fc.assert(
      fc.property(plan, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (asked, accepted) => {
        const quality = qualityAt(asked, accepted);
        const curve = quality.ok && operatingCharacteristic(asked, [quality.nonconformingPct]);
        expect(curve && curve.ok && curve.points[0]?.accepted).toBeCloseTo(accepted, 9);
      }),
    );
  });

  test('one lot: 15 pieces, 10 looked at, with 2 bad ones passed with 0.0952, without any always', () => {
    const curve = operatingCharacteristicOfLot({ sampleSize: 10, accept: 0 }, 15, 2);
    if (!curve.ok) throw new Error(curve.reason);
    expect(curve.points.map(({ accepted }) => accepted.toFixed(4))).toEqual(['1.0000', '0.3333', '0.0952']);
  });

  test('what is no plan, no percentage or no probability is refused', () => {
    expect(operatingCharacteristic({ sampleSize: 0, accept: 0 }, [1])).toMatchObject({
      reason: 'not_a_plan',
    });
    expect(operatingCharacteristic({ sampleSize: 5, accept: 0 }, [101])).toMatchObject({
      reason: 'not_a_percentage',
    });
    expect(qualityAt({ sampleSize: 5, accept: 5 }, 0.5)).toMatchObject({ reason: 'not_a_plan' });
    expect(qualityAt({ sampleSize: 5, accept: 0 }, 1)).toMatchObject({ reason: 'not_a_probability' });
    expect(operatingCharacteristicOfLot({ sampleSize: 5, accept: 0 }, 4, 1)).toMatchObject({
      reason: 'sample_larger_than_lot',
    });
    expect(operatingCharacteristicOfLot({ sampleSize: 4, accept: 0 }, 4, 5)).toMatchObject({
      reason: 'nonconforming_not_in_lot',
    });
  });
});
