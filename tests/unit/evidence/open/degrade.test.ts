import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { EASY_PHOTOGRAPH, photographPage } from '@/tests/evidence/degrade/photograph-page';
import { blank, type Raster } from '@/tests/evidence/degrade/raster';
import { CLEAN_SCAN, scanPage } from '@/tests/evidence/degrade/scan-page';
import { turn } from '@/tests/evidence/degrade/warp';

const page = () => {
  const raster = blank(255, 330, 30);
  for (let x = 40; x < 200; x++) raster.data.fill(0, (100 * 255 + x) * 4, (100 * 255 + x) * 4 + 3);
  return raster;
};

const fingerprint = (raster: Raster | undefined) =>
  createHash('sha256')
    .update(raster?.data ?? '')
    .digest('hex');

describe('degraded pages', () => {
  test('are the same for the same settings, and others for another seed', async () => {
    const settings = { ...CLEAN_SCAN, skew: 2, noise: 0.5, stamp: 'RECEIVED' };
    const [first, again, other] = await Promise.all(
      [1, 1, 2].map((seed) => scanPage(page(), { ...settings, seed, dpi: 150 })),
    );
    expect(fingerprint(again)).toBe(fingerprint(first));
    expect(fingerprint(other)).not.toBe(fingerprint(first));
    const photograph = { ...EASY_PHOTOGRAPH, longerSide: 400 };
    const twice = await Promise.all([photographPage(page(), photograph), photographPage(page(), photograph)]);
    expect(fingerprint(twice[0])).toBe(fingerprint(twice[1]));
  });

  test('keep their print: a clean scan at the same resolution is dark where the page is', async () => {
    const scan = await scanPage({ ...page(), dpi: 150 }, { ...CLEAN_SCAN, dpi: 150, noise: 0 });
    expect(scan.data[(100 * 255 + 100) * 4]).toBeLessThan(130);
    expect(scan.data[(200 * 255 + 100) * 4]).toBeGreaterThan(245);
  });

  test('four quarter turns bring a page back', () => {
    const quarter = fc.constantFrom(90, 270) as fc.Arbitrary<90 | 270>;
    fc.assert(
      fc.property(quarter, (degrees) => {
        const raster = page();
        let turned = raster;
        for (let i = 0; i < 4; i++) turned = turn(turned, degrees);
        return turned.width === raster.width && turned.data.every((value, i) => value === raster.data[i]);
      }),
      { numRuns: 2 },
    );
  });
});
