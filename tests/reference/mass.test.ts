import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { massAndArea } from '@/lib/trade/mass/mass-and-area';

const found = (...asked: Parameters<typeof massAndArea>) => {
  const answer = massAndArea(...asked);
  if (!answer.ok) throw new Error(answer.reason);
  return answer;
};

describe('mass and area', () => {
  test('a 2024 sheet of 1000 × 500 × 2 mm at 2.78 g/cm³: 2.78 kg and 1.006 m²', () => {
    const sheet = found({ form: 'sheet', lengthMm: 1000, widthMm: 500, thicknessMm: 2 }, 2.78);
    expect(sheet.massKg).toBeCloseTo(2.78, 9);
    expect(sheet.areaM2).toBeCloseTo(1.006, 9);
  });

  test.each([
    [
      'a round bar of 20 × 1000 mm',
      { form: 'round_bar', lengthMm: 1000, diameterMm: 20 },
      314_159.265,
      0.0634602,
    ],
    [
      'a square bar of 20 × 1000 mm',
      { form: 'square_bar', lengthMm: 1000, acrossFlatsMm: 20 },
      400_000,
      0.0808,
    ],
    [
      'a hexagon bar of 20 × 1000 mm',
      { form: 'hex_bar', lengthMm: 1000, acrossFlatsMm: 20 },
      346_410.162,
      0.0699749,
    ],
    [
      'a tube of 20 × 2 × 1000 mm',
      { form: 'tube', lengthMm: 1000, outsideDiameterMm: 20, wallMm: 2 },
      113_097.336,
      0.1133235,
    ],
  ] as const)('by geometry: %s', (_name, shape, volumeMm3, areaM2) => {
    const answer = found(shape, 7.85);
    expect(answer.volumeMm3).toBeCloseTo(volumeMm3, 2);
    expect(answer.areaM2).toBeCloseTo(areaM2, 7);
    expect(answer.massKg).toBeCloseTo(volumeMm3 * 7.85e-6, 6);
  });

  const size = fc.double({ min: 0.1, max: 5000, noNaN: true });
  test('a hexagon lies between the round inside it and the square around it', () => {
    fc.assert(
      fc.property(size, size, (lengthMm, across) => {
        const round = found({ form: 'round_bar', lengthMm, diameterMm: across }, 1);
        const hex = found({ form: 'hex_bar', lengthMm, acrossFlatsMm: across }, 1);
        const square = found({ form: 'square_bar', lengthMm, acrossFlatsMm: across }, 1);
        return (
          round.massKg < hex.massKg &&
          hex.massKg < square.massKg &&
          round.areaM2 < hex.areaM2 &&
          hex.areaM2 < square.areaM2
        );
      }),
    );
  });

  test('a tube and the bar that fills its bore weigh as much as the solid bar', () => {
    fc.assert(
      fc.property(
        size,
        fc.double({ min: 1, max: 500, noNaN: true }),
        fc.double({ min: 0.01, max: 0.49, noNaN: true }),
        (lengthMm, outsideDiameterMm, share) => {
          const wallMm = outsideDiameterMm * share;
          const tube = found({ form: 'tube', lengthMm, outsideDiameterMm, wallMm }, 8);
          const core = found({ form: 'round_bar', lengthMm, diameterMm: outsideDiameterMm - 2 * wallMm }, 8);
          const solid = found({ form: 'round_bar', lengthMm, diameterMm: outsideDiameterMm }, 8);
          expect((tube.massKg + core.massKg) / solid.massKg).toBeCloseTo(1, 9);
        },
      ),
    );
  });

  test('refusals', () => {
    const bar = { form: 'round_bar', lengthMm: 100, diameterMm: 10 } as const;
    expect(massAndArea(bar, 0)).toEqual({ ok: false, reason: 'density_not_positive' });
    expect(massAndArea({ ...bar, diameterMm: -1 }, 1)).toEqual({ ok: false, reason: 'size_not_positive' });
    expect(massAndArea({ ...bar, lengthMm: NaN }, 1)).toEqual({ ok: false, reason: 'size_not_positive' });
    expect(massAndArea({ form: 'tube', lengthMm: 1, outsideDiameterMm: 10, wallMm: 5 }, 1)).toEqual({
      ok: false,
      reason: 'wall_closes_bore',
    });
  });
});
