import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { awayOf, takenFrom, without } from '@/lib/receipts/away';
import { faultsOfCount, type CountedAgainst, type LineCount } from '@/lib/receipts/faults-of-count';
import { readScan } from '@/lib/receipts/read-scan';

const line: CountedAgainst = {
  lineId: 'a',
  lineNo: 2,
  partNumber: 'FL-4431-07',
  serialised: false,
  away: 15,
  shortOpen: 0,
};
const count = (given: Partial<LineCount>): LineCount => ({
  lineId: 'a',
  good: 0,
  damaged: 0,
  short: 0,
  over: 0,
  goodPieceIds: [],
  damagedPieceIds: [],
  ...given,
});
const faultsOf = (given: Partial<LineCount>, of: Partial<CountedAgainst> = {}) =>
  faultsOfCount([count(given)], [{ ...line, ...of }]);

describe('a count', () => {
  test.each([
    [{ good: 15 }],
    [{ good: 14, damaged: 1 }],
    [{ good: 10, short: 5 }],
    [{ good: 15, over: 3 }],
    [{ good: 3 }],
  ])('of %j of 15 adds up', (given) => expect(faultsOf(given)).toEqual([]));

  test('of more than is away names line, numbers and the way out', () => {
    expect(faultsOf({ good: 16 })).toEqual([
      {
        field: 'lines.0.good',
        message:
          'Line 2, FL-4431-07: 15 away, 16 counted as good and damaged. Enter 15 or less, and 1 as over.',
      },
    ]);
    expect(faultsOf({ good: 14, damaged: 3 })).toMatchObject([{ field: 'lines.0.damaged' }]);
  });

  test('has nothing over while some of the line is not counted', () => {
    expect(faultsOf({ good: 14, over: 1 })).toEqual([
      {
        field: 'lines.0.over',
        message:
          'Line 2, FL-4431-07: 14 of the 15 away are counted, so 1 cannot be over. Count them as good or damaged first.',
      },
    ]);
  });

  test('reports nothing short that was reported short before', () => {
    expect(faultsOf({ good: 12, short: 3 }, { shortOpen: 2 })).toEqual([
      {
        field: 'lines.0.short',
        message:
          'Line 2, FL-4431-07: 15 away, 12 counted, 2 reported short before: 3 cannot be short. Enter 1 or less.',
      },
    ]);
  });

  test('of a line of another batch, or of a line twice, is refused', () => {
    expect(faultsOfCount([count({ lineId: 'z', good: 1 })], [line])).toMatchObject([
      { field: 'lines.0.lineId' },
    ]);
    expect(faultsOfCount([count({ good: 1 }), count({ good: 1 })], [line])).toMatchObject([
      { field: 'lines.1.lineId' },
    ]);
  });

  test('of a serialised line names each piece once', () => {
    expect(faultsOf({ good: 2, goodPieceIds: ['x'] }, { serialised: true })).toMatchObject([
      { field: 'lines.0.good' },
    ]);
    expect(
      faultsOf({ good: 1, damaged: 1, goodPieceIds: ['x'], damagedPieceIds: ['x'] }, { serialised: true }),
    ).toMatchObject([{ field: 'lines.0.damaged' }]);
    expect(
      faultsOf({ good: 1, damaged: 1, goodPieceIds: ['x'], damagedPieceIds: ['y'] }, { serialised: true }),
    ).toEqual([]);
  });

  test('never lets in more good and damaged pieces than are away', () =>
    fc.assert(
      fc.property(
        fc.record({
          away: fc.nat(30),
          good: fc.nat(30),
          damaged: fc.nat(30),
          short: fc.nat(30),
          over: fc.nat(30),
        }),
        ({ away, good, damaged, short, over }) => {
          const accepted = faultsOf({ good, damaged, short, over }, { away }).length === 0;
          if (accepted) expect(good + damaged + short).toBeLessThanOrEqual(away);
          if (good + damaged > away) expect(accepted).toBe(false);
        },
      ),
    ));
});

describe('pieces come back', () => {
  const places = fc.record({ transitOut: fc.nat(20), atProcessor: fc.nat(20), transitBack: fc.nat(20) });

  test('from the way back first, then from the processor, then from the way out', () => {
    expect(takenFrom({ transitOut: 5, atProcessor: 5, transitBack: 2 }, 9)).toEqual([
      { place: 'transit_back', pieces: 2 },
      { place: 'at_processor', pieces: 5 },
      { place: 'transit_out', pieces: 2 },
    ]);
  });

  test('exactly as many as asked, and none from where none is', () =>
    fc.assert(
      fc.property(places, fc.nat(60), (line_, asked) => {
        const taken = takenFrom(line_, asked);
        const sum = taken.reduce((all, one) => all + one.pieces, 0);
        expect(sum).toBe(Math.min(asked, awayOf(line_)));
        const left = without(line_, taken);
        expect(awayOf(left)).toBe(awayOf(line_) - sum);
        expect(Math.min(left.transitOut, left.atProcessor, left.transitBack)).toBeGreaterThanOrEqual(0);
      }),
    ));
});

test.each([
  ['B-0419', { kind: 'number', number: 'B-0419' }],
  [' b-419 ', { kind: 'number', number: 'B-0419' }],
  ['419', { kind: 'number', number: 'B-0419' }],
  ['ts-1171', { kind: 'number', number: 'TS-1171' }],
  ['http://localhost:4600/b/abcdefghijklmnop-_12', { kind: 'token', token: 'abcdefghijklmnop-_12' }],
  [
    'http://localhost:4600/batches/0190a8f0-7c1e-7000-8000-000000000001/receive',
    { kind: 'id', id: '0190a8f0-7c1e-7000-8000-000000000001' },
  ],
])('%s is read as %j', (text, scan) => expect(readScan(text)).toEqual(scan));
