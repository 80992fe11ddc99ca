import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { findComponents } from '@/lib/evidence/open/picture/find-components';
import { findSheet } from '@/lib/evidence/open/picture/find-sheet';
import { findStamps } from '@/lib/evidence/open/picture/find-stamps';
import { findStrokes } from '@/lib/evidence/open/picture/find-strokes';
import { toGrey, type Coloured } from '@/lib/evidence/open/picture/colours';
import { lookAgain } from '@/lib/evidence/open/picture/second-look';
import {
  inverseOf,
  scaling,
  chainProjections,
  squareOnto,
  type Point,
} from '@/lib/evidence/open/picture/projection';
import { warp } from '@/lib/evidence/open/picture/warp';
import { drawText, fill, inkOf, paper } from './draw-ink';

describe('a sheet on a desk', () => {
  const sheet = paper(280, 360, 235);
  drawText(sheet, { lines: 20, size: 8 });
  fill(sheet, [20, 120, 260, 123], 20);
  const offset = fc.double({ min: 0.04, max: 0.09, noNaN: true });

  test('is found to a fiftieth of the picture, whatever the slant', () => {
    fc.assert(
      fc.property(fc.tuple(...Array.from({ length: 8 }, () => offset)), ([a, b, c, d, e, f, g, h]) => {
        const [w, h2] = [320, 420];
        const four: readonly [Point, Point, Point, Point] = [
          [(a ?? 0) * w, (b ?? 0) * h2],
          [(1 - (c ?? 0)) * w, (d ?? 0) * h2],
          [(1 - (e ?? 0)) * w, (1 - (f ?? 0)) * h2],
          [(g ?? 0) * w, (1 - (h ?? 0)) * h2],
        ];
        const toSheet = chainProjections(inverseOf(squareOnto(four)), scaling(280, 360));
        const photograph = warp(sheet, toSheet, { width: w, height: h2 });
        const darker = { ...photograph, data: photograph.data.map((value) => (value === 255 ? 70 : value)) };
        const corners = findSheet(darker);
        return (
          corners !== null &&
          corners.every(([x, y], i) => Math.hypot(x - (four[i]?.[0] ?? 0), y - (four[i]?.[1] ?? 0)) < 8)
        );
      }),
      { numRuns: 15, endOnFailure: true },
    );
  });

  test('is not seen in a scan, not even in one with a dark band across it', () => {
    const scan = paper(320, 420, 240);
    drawText(scan, { lines: 24, size: 8 });
    fill(scan, [30, 130, 290, 140], 30);
    fill(scan, [30, 300, 290, 301], 0);
    expect(findSheet(scan)).toBeNull();
  });
});

describe('ink by hand', () => {
  const signed = paper(900, 300);
  for (let x = 0; x < 300; x++) {
    const y = Math.round(150 + 35 * Math.sin(x / 14) + 12 * Math.sin(x / 5));
    fill(signed, [200 + x, y, 203 + x, y + 4], 0);
    fill(signed, [200 + x, Math.min(y, 150), 201 + x, Math.min(y, 150) + 1], 0);
  }
  drawText(signed, { lines: 1, size: 20 });
  const components = findComponents(inkOf(signed));

  test('is found and letters are not', () => {
    const [stroke, ...others] = findStrokes(components, [], 200);
    expect(others).toEqual([]);
    expect(stroke?.[0]).toBeGreaterThanOrEqual(195);
    expect(stroke?.[2]).toBeLessThanOrEqual(510);
  });

  test('is none where something else explains it', () => {
    expect(findStrokes(components, [[190, 90, 520, 210]], 200)).toEqual([]);
  });
});

describe('stamps', () => {
  const picture = (): Coloured => ({
    width: 600,
    height: 400,
    data: new Uint8Array(600 * 400 * 3).fill(255),
  });
  const paint = (on: Coloured, [left, top, right, bottom]: readonly number[], colour: readonly number[]) => {
    for (let y = top ?? 0; y < (bottom ?? 0); y++) {
      for (let x = left ?? 0; x < (right ?? 0); x++) on.data.set(colour, (y * 600 + x) * 3);
    }
  };
  const red = [205, 90, 95];

  test('over black print are found and taken off, and the print stays', () => {
    const page = picture();
    for (let i = 0; i < 10; i++) paint(page, [120 + i * 24, 140, 136 + i * 24, 230], red);
    for (let i = 0; i < 30; i++) paint(page, [100 + i * 12, 180, 106 + i * 12, 196], [25, 20, 20]);
    const found = findStamps(page, toGrey(page), 200);
    expect(found?.boxes).toHaveLength(1);
    expect(found?.without.data[150 * 600 + 125]).toBeGreaterThan(235);
    expect(found?.without.data[188 * 600 + 126]).toBeLessThan(80);
  });

  test('are not words printed in colour: those keep their ink', () => {
    const page = picture();
    for (let i = 0; i < 20; i++) paint(page, [100 + i * 14, 140, 108 + i * 14, 160], red);
    const found = findStamps(page, toGrey(page), 200);
    expect(found?.boxes ?? []).toEqual([]);
    expect((found?.without ?? toGrey(page)).data[150 * 600 + 104]).toBeLessThan(160);
  });
});

describe('a second look at signs that are mixed up', () => {
  /** Draws an L, then figures as solid boxes. */
  const draw = (first: 'L' | '1', figures: number) => {
    const page = paper(300, 60);
    if (first === 'L') {
      fill(page, [10, 10, 15, 40], 0);
      fill(page, [10, 36, 27, 40], 0);
    } else {
      fill(page, [17, 10, 22, 40], 0);
      fill(page, [11, 12, 17, 16], 0);
    }
    for (let i = 0; i < figures; i++) fill(page, [35 + i * 22, 10, 51 + i * 22, 40], 0);
    const ink = inkOf(page);
    return (text: string) => lookAgain(text, [5, 5, 295, 55], findComponents(ink), ink);
  };

  test('an L read as 1 is an L, a 1 stays a 1', () => {
    expect(draw('L', 4)('14382')).toBe('L4382');
    expect(draw('1', 4)('14382')).toBe('14382');
    expect(draw('1', 4)('L4382')).toBe('14382');
  });

  test('words whose signs do not match their pieces of ink stay as they are', () => {
    expect(draw('L', 3)('14382')).toBe('14382');
  });

  test('one letter read twice is one', () => {
    const page = paper(60, 60);
    fill(page, [10, 10, 34, 40], 0);
    const ink = inkOf(page);
    expect(lookAgain('Cc', [8, 8, 40, 44], findComponents(ink), ink)).toBe('C');
  });
});
