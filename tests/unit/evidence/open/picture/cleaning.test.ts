import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { findComponents } from '@/lib/evidence/open/picture/find-components';
import { findInk, inkThreshold } from '@/lib/evidence/open/picture/find-ink';
import { findRules } from '@/lib/evidence/open/picture/find-rules';
import { findLie } from '@/lib/evidence/open/picture/find-skew';
import { findSpecks } from '@/lib/evidence/open/picture/find-specks';
import { guessUpsideDown } from '@/lib/evidence/open/picture/guess-upside-down';
import { levelLight } from '@/lib/evidence/open/picture/level-light';
import { project, rotationAbout } from '@/lib/evidence/open/picture/projection';
import { shrink } from '@/lib/evidence/open/picture/shrink';
import { straighten, turnFurther } from '@/lib/evidence/open/picture/straighten';
import { warp } from '@/lib/evidence/open/picture/warp';
import { invertBox } from '@/lib/evidence/open/picture/wipe';
import { drawText, fill, inkOf, paper } from './draw-ink';

describe('pieces of ink', () => {
  test('hold every pixel of ink once, each within its box', () => {
    const picture = fc
      .tuple(fc.integer({ min: 1, max: 24 }), fc.integer({ min: 1, max: 24 }))
      .chain(([width, height]) =>
        fc
          .array(fc.integer({ min: 0, max: 1 }), { minLength: width * height, maxLength: width * height })
          .map((data) => ({
            width,
            height,
            data: Uint8Array.from(data),
          })),
      );
    fc.assert(
      fc.property(picture, (ink) => {
        const pieces = findComponents(ink);
        const all = ink.data.reduce((sum, pixel) => sum + pixel, 0);
        const fits = pieces.every(({ box, area }) => area <= (box[2] - box[0]) * (box[3] - box[1]));
        return fits && pieces.reduce((sum, { area }) => sum + area, 0) === all;
      }),
    );
  });

  test('touch by corners too, and a ring is one', () => {
    const page = paper(20, 20);
    fill(page, [2, 2, 12, 12], 0);
    fill(page, [4, 4, 10, 10], 255);
    fill(page, [12, 12, 14, 14], 0);
    fill(page, [17, 2, 18, 3], 0);
    expect(findComponents(inkOf(page)).map(({ box }) => box)).toEqual([
      [2, 2, 14, 14],
      [17, 2, 18, 3],
    ]);
  });
});

describe('light', () => {
  test('a shadow across the page goes, the print in it stays', () => {
    const page = paper(400, 300);
    drawText(page, { lines: 6, size: 16 });
    const shaded = { ...page, data: page.data.map((value, i) => value * (1 - (0.6 * (i % 400)) / 400)) };
    const level = levelLight(shaded, 50);
    const threshold = inkThreshold(level);
    const [want, got] = [inkOf(page), findInk(level, threshold)];
    const wrong = want.data.reduce((sum, pixel, i) => sum + Math.abs(pixel - (got.data[i] ?? 0)), 0);
    expect(wrong / want.data.length).toBeLessThan(0.01);
  });

  test('shrinking keeps the mean', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 255 }), { minLength: 36, maxLength: 36 }), (values) => {
        const small = shrink({ width: 6, height: 6, data: Uint8Array.from(values) }, 3);
        const mean = (data: ArrayLike<number>) => Array.from(data).reduce((a, b) => a + b, 0) / data.length;
        return Math.abs(mean(small.data) - mean(values)) <= 1;
      }),
    );
  });
});

describe('how a page lies', () => {
  const page = paper(700, 900);
  drawText(page, { lines: 34, size: 12 });

  test('skew is found to a tenth of a degree, whichever way', () => {
    fc.assert(
      fc.property(fc.double({ min: -5, max: 5, noNaN: true }), (degrees) => {
        const askew = warp(page, rotationAbout((-degrees * Math.PI) / 180, 350, 450), page);
        const lie = findLie(inkOf(askew));
        return !lie.sideways && Math.abs(lie.skew - degrees) <= 0.12;
      }),
      { numRuns: 12 },
    );
  });

  test.each([0, 90, 180, 270] as const)(
    'a page turned by %i degrees is turned back to its feet or its head',
    (degrees) => {
      const turned = degrees % 180 === 0 ? { width: 700, height: 900 } : { width: 900, height: 700 };
      const back = {
        0: [1, 0, 0, 0, 1, 0],
        90: [0, 1, 0, -1, 0, 900],
        180: [-1, 0, 700, 0, -1, 900],
        270: [0, -1, 700, 1, 0, 0],
      }[degrees];
      const lying = warp(page, [...back, 0, 0, 1] as never, turned);
      const straight = straighten(lying, 90);
      const headOver = guessUpsideDown(findComponents(inkOf(straight.picture)), 90);
      expect((straight.turned + (headOver ? 180 : 0)) % 360).toBe((360 - degrees) % 360);
      expect(straight.picture.width).toBe(700);
    },
  );
});

test('two quarters are a half, two halves nothing', () => {
  const page = paper(30, 20);
  fill(page, [2, 3, 9, 5], 0);
  const start = { picture: page, turned: 0 as const, projection: rotationAbout(0, 0, 0) };
  const half = turnFurther(start, 180);
  const quarters = turnFurther(turnFurther(start, 90), 90);
  expect(quarters.picture).toEqual(half.picture);
  expect(quarters.turned).toBe(180);
  expect(project(quarters.projection, 2, 3)).toEqual(project(half.projection, 2, 3));
  expect(turnFurther(half, 180).picture).toEqual(page);
});

describe('rules', () => {
  const dpi = 200;
  const form = () => {
    const page = paper(900, 500);
    for (const y of [50, 100, 150]) fill(page, [50, y, 850, y + 3], 0);
    for (const x of [50, 400, 847]) fill(page, [x, 50, x + 3, 153], 0);
    return page;
  };

  test('lines of a table are found whole, and nothing of them is left', () => {
    const ink = inkOf(form());
    const rules = findRules(ink, dpi);
    expect(rules.lines).toHaveLength(6);
    expect(rules.ink.data).toEqual(ink.data);
  });

  test('a letter that crosses a line keeps its ink, a word in large type is no line', () => {
    const page = form();
    fill(page, [500, 80, 508, 120], 0);
    drawText(page, { lines: 0, size: 20 });
    for (let i = 0; i < 6; i++) {
      fill(page, [100 + i * 34, 300, 130 + i * 34, 306], 0);
      fill(page, [112 + i * 34, 300, 118 + i * 34, 340], 0);
    }
    const { ink } = findRules(inkOf(page), dpi);
    expect(ink.data[90 * 900 + 504]).toBe(0);
    expect(ink.data[101 * 900 + 504]).toBe(0);
    expect(ink.data[303 * 900 + 110]).toBe(0);
  });

  test('a dark band is an area; turned round, its white letters are dark on paper', () => {
    const page = paper(900, 300);
    fill(page, [50, 100, 850, 140], 30);
    fill(page, [100, 110, 106, 130], 255);
    const { areas } = findRules(inkOf(page), dpi);
    expect(areas).toHaveLength(1);
    areas.forEach((area) => invertBox(page, area));
    expect(page.data[120 * 900 + 103]).toBeLessThan(60);
    expect(page.data[120 * 900 + 300]).toBe(255);
  });
});

test('dust goes, the point of a decimal stays', () => {
  const page = paper(400, 200);
  fill(page, [100, 80, 112, 100], 0);
  fill(page, [115, 97, 118, 100], 0);
  fill(page, [300, 50, 303, 53], 0);
  expect(findSpecks(findComponents(inkOf(page)), 200).map(({ box }) => box)).toEqual([[300, 50, 303, 53]]);
});
