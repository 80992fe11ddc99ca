import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { canonicalJson } from '@/lib/certificates/canonical-json';
import { coverableOf, faultsOfCoverage } from '@/lib/certificates/coverable';
import { readinessOf, type JudgedRequirement } from '@/lib/certificates/ready-to-sign';
import { sealOf } from '@/lib/certificates/seal';
import { isSealed } from '@/lib/certificates/sealed-requirements';
import { VERDICTS } from '@/lib/certificates/verdict';

const meets = { verdict: 'meets', overrideReason: null } as const;
const judged = (given: Partial<JudgedRequirement>): JudgedRequirement => ({
  requirementId: 'r',
  lineId: null,
  characteristic: 'Hardness',
  decision: meets,
  ...given,
});

describe('a certificate is ready to sign', () => {
  test('when all that bears on the covered lines is decided and accepted', () => {
    expect(readinessOf([judged({})], [{ lineId: 'a', pieces: 16 }])).toMatchObject({
      ready: true,
      pieces: 16,
      why: null,
    });
  });

  test('not while something is undecided, and it says what', () => {
    const { ready, why } = readinessOf(
      [judged({}), judged({ requirementId: 'q', characteristic: 'Quench delay', decision: null })],
      [{ lineId: 'a', pieces: 1 }],
    );
    expect({ ready, why }).toEqual({ ready: false, why: '1 to decide before you sign: Quench delay.' });
  });

  test('not while something is decided against, unless it is overridden with a reason', () => {
    const against = judged({ decision: { verdict: 'does_not_meet', overrideReason: null } });
    expect(readinessOf([against], [{ lineId: 'a', pieces: 1 }])).toMatchObject({
      ready: false,
      against: ['r'],
    });
    expect(
      readinessOf(
        [judged({ decision: { verdict: 'not_stated', overrideReason: 'said by phone' } })],
        [{ lineId: 'a', pieces: 1 }],
      ).ready,
    ).toBe(true);
  });

  test('whatever is undecided about a line that is not covered now', () => {
    const ofB = judged({ requirementId: 'b', lineId: 'b', decision: null });
    expect(readinessOf([judged({}), ofB], [{ lineId: 'a', pieces: 1 }]).ready).toBe(true);
    expect(readinessOf([judged({}), ofB], [{ lineId: 'b', pieces: 1 }]).ready).toBe(false);
  });

  test('not for no pieces', () =>
    expect(readinessOf([judged({})], []).why).toBe(
      'No pieces are covered yet. Enter how many on each line.',
    ));

  test('never with a verdict that nobody accepted', () => {
    const decision = fc.option(
      fc.record({
        verdict: fc.constantFrom(...VERDICTS),
        overrideReason: fc.option(fc.string({ minLength: 1 })),
      }),
    );
    fc.assert(
      fc.property(fc.array(decision, { maxLength: 6 }), (decisions) => {
        const all = decisions.map((one, at) => judged({ requirementId: String(at), decision: one }));
        const { ready } = readinessOf(all, [{ lineId: 'a', pieces: 1 }]);
        expect(ready).toBe(
          decisions.every((one) => one !== null && (one.verdict === 'meets' || one.overrideReason !== null)),
        );
      }),
    );
  });
});

describe('coverage', () => {
  const line = { lineId: 'a', lineNo: 3, partNumber: 'FL-4431-08', inQuarantine: 9, proved: 0 };

  test('is for what came back good and is uncovered', () => {
    expect(coverableOf({ inQuarantine: 9, proved: 4 })).toBe(5);
    expect(faultsOfCoverage([{ lineId: 'a', pieces: 9 }], [line])).toEqual([]);
    expect(faultsOfCoverage([{ lineId: 'a', pieces: 10 }], [line])).toEqual([
      {
        field: 'coverage.0.pieces',
        message: 'Line 3, FL-4431-08: 9 came back good and uncovered. Enter 9 or less.',
      },
    ]);
    expect(faultsOfCoverage([{ lineId: 'a', pieces: 1 }], [{ ...line, proved: 9 }])).toMatchObject([
      { message: 'Line 3, FL-4431-08: no piece in quarantine is without proof, so none can be covered.' },
    ]);
  });

  test('names each line once, and only lines of the batch', () => {
    expect(
      faultsOfCoverage(
        [
          { lineId: 'a', pieces: 1 },
          { lineId: 'a', pieces: 1 },
        ],
        [line],
      ),
    ).toMatchObject([{ field: 'coverage.1.lineId' }]);
    expect(faultsOfCoverage([{ lineId: 'z', pieces: 1 }], [line])).toMatchObject([
      { field: 'coverage.0.lineId' },
    ]);
  });

  test('signed until none is left never comes to more than is in quarantine', () =>
    fc.assert(
      fc.property(
        fc.nat(50),
        fc.array(fc.integer({ min: 1, max: 20 }), { maxLength: 8 }),
        (inQuarantine, asks) => {
          let proved = 0;
          for (const pieces of asks)
            if (faultsOfCoverage([{ lineId: 'a', pieces }], [{ ...line, inQuarantine, proved }]).length === 0)
              proved += pieces;
          expect(proved).toBeLessThanOrEqual(inQuarantine);
        },
      ),
    ));
});

describe('a seal', () => {
  test('is over the same text in whatever order it was put together', () => {
    expect(canonicalJson({ b: [1, { d: null, c: 'x' }], a: undefined })).toBe('{"b":[1,{"c":"x","d":null}]}');
    fc.assert(
      fc.property(fc.dictionary(fc.string(), fc.jsonValue()), (content) => {
        const turned = Object.fromEntries(Object.entries(content).reverse());
        expect(canonicalJson(turned)).toBe(canonicalJson(content));
        expect(JSON.parse(canonicalJson(content))).toEqual(JSON.parse(JSON.stringify(content)));
      }),
    );
  });

  test('changes with any letter of it', () =>
    expect(sealOf('{"pieces":40}')).not.toBe(sealOf('{"pieces":41}')));

  test('holds what is of the whole batch from the first signature, what is of a line from the first that covers it', () => {
    expect(isSealed({ lineId: null }, [])).toBe(false);
    expect(isSealed({ lineId: null }, [{ lineIds: ['a'] }])).toBe(true);
    expect(isSealed({ lineId: 'b' }, [{ lineIds: ['a'] }])).toBe(false);
    expect(isSealed({ lineId: 'a' }, [{ lineIds: ['a'] }])).toBe(true);
  });
});
