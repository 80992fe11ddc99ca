import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { allowedDispositions, ruleOf } from '@/lib/nonconformances/allowed-dispositions';
import { coveredPiecesOf } from '@/lib/nonconformances/covered-pieces';
import { DISPOSITIONS } from '@/lib/nonconformances/disposition';
import { faultsOfDisposition } from '@/lib/nonconformances/faults-of-disposition';
import { NONCONFORMANCE_KINDS, RAISED_KINDS } from '@/lib/nonconformances/kind';

const about = { kind: 'requirement', left: 5, away: 0, serialised: false } as const;
const asked = { disposition: 'scrap', pieces: 5, authority: '', fileId: null, pieceIds: [] } as const;

describe('dispositions', () => {
  test('of pieces on hold are all five; short pieces are to come or written off; what is over goes back', () => {
    expect(allowedDispositions('damaged')).toEqual([...DISPOSITIONS]);
    expect(allowedDispositions('short')).toEqual(['return_to_processor', 'scrap']);
    expect(allowedDispositions('over')).toEqual(['return_to_processor']);
  });

  test('that put pieces back among the good ones always ask for an authority', () => {
    for (const kind of NONCONFORMANCE_KINDS)
      for (const one of DISPOSITIONS)
        if (ruleOf(kind, one)?.to === 'quarantine') expect(ruleOf(kind, one)?.authority).toBe(true);
  });

  test('say what they lack', () => {
    expect(faultsOfDisposition(asked, about)).toEqual([]);
    expect(faultsOfDisposition({ ...asked, pieces: 6 }, about)).toEqual([
      { field: 'pieces', message: '5 left to decide. Enter 5 or less.' },
    ]);
    expect(
      faultsOfDisposition({ ...asked, disposition: 'concession' }, about).map((fault) => fault.field),
    ).toEqual(['authority', 'fileId']);
    expect(faultsOfDisposition({ ...asked, disposition: 'reprocess' }, { ...about, kind: 'short' })).toEqual([
      { field: 'disposition', message: 'What is short cannot be decided as reprocess.' },
    ]);
    expect(faultsOfDisposition(asked, { ...about, serialised: true })).toMatchObject([{ field: 'pieceIds' }]);
  });

  test('write off as short only what did not come back since', () => {
    expect(faultsOfDisposition({ ...asked, pieces: 3 }, { ...about, kind: 'short', away: 2 })).toEqual([
      {
        field: 'pieces',
        message: '2 of the line still away; the rest came back since. Write off 2 or less.',
      },
    ]);
  });
});

describe('proof that a hold takes away', () => {
  test.each([
    ['papers', 5, { inQuarantine: 10, proved: 6 }, 1],
    ['requirement', 4, { inQuarantine: 10, proved: 6 }, 0],
    ['damaged', 4, { inQuarantine: 10, proved: 6 }, 4],
    ['damaged', 8, { inQuarantine: 10, proved: 6 }, 6],
  ] as const)('%s, %i pieces of %j: %i', (kind, pieces, standing, covered) =>
    expect(coveredPiecesOf(kind, pieces, standing)).toBe(covered),
  );

  test('leaves as many proved pieces as quarantine has at most, and never takes more than is held', () =>
    fc.assert(
      fc.property(
        fc.constantFrom(...RAISED_KINDS),
        fc.nat(40),
        fc.nat(40),
        fc.nat(40),
        (kind, inQuarantine, some, proof) => {
          const pieces = Math.min(inQuarantine, some);
          const proved = Math.min(inQuarantine, proof);
          const covered = coveredPiecesOf(kind, pieces, { inQuarantine, proved });
          expect(covered).toBeGreaterThanOrEqual(0);
          expect(covered).toBeLessThanOrEqual(Math.min(pieces, proved));
          expect(proved - covered).toBeLessThanOrEqual(inQuarantine - pieces);
        },
      ),
    ));
});
