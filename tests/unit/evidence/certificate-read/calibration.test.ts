import fc from 'fast-check';
import { expect, test } from 'vitest';
import { calibrated } from '@/lib/evidence/certificate/read/calibration';

test('what is believed more is right more often, and nothing is certain', () =>
  fc.assert(
    fc.property(
      fc.double({ min: 0, max: 1, noNaN: true }),
      fc.double({ min: 0, max: 1, noNaN: true }),
      (a, b) => {
        const [low, high] = [calibrated(Math.min(a, b)), calibrated(Math.max(a, b))];
        expect(low).toBeLessThanOrEqual(high);
        expect(high).toBeLessThan(1);
      },
    ),
  ));
