import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  chainProjections,
  inverseOf,
  project,
  quarterTurn,
  rotationAbout,
  squareOnto,
  type Point,
} from '@/lib/evidence/open/picture/projection';

const near = ([x, y]: Point, [u, v]: Point) => Math.hypot(x - u, y - v) < 1e-6 * (1 + Math.hypot(u, v));
const coordinate = fc.double({ min: 0, max: 1, noNaN: true });
/** Four corners that bulge outwards, as a sheet's do. */
const corners = fc
  .tuple(...Array.from({ length: 8 }, () => fc.double({ min: 0, max: 0.3, noNaN: true })))
  .map(([a, b, c, d, e, f, g, h]): readonly [Point, Point, Point, Point] => [
    [a ?? 0, b ?? 0],
    [1 - (c ?? 0), d ?? 0],
    [1 - (e ?? 0), 1 - (f ?? 0)],
    [g ?? 0, 1 - (h ?? 0)],
  ]);

describe('projections', () => {
  test('carry the corners of a square to the four points asked for', () => {
    fc.assert(
      fc.property(corners, (four) => {
        const onto = squareOnto(four);
        const square: Point[] = [
          [0, 0],
          [1, 0],
          [1, 1],
          [0, 1],
        ];
        return square.every(([x, y], i) => near(project(onto, x, y), four[i] as Point));
      }),
    );
  });

  test('there and back is the same place', () => {
    fc.assert(
      fc.property(corners, coordinate, coordinate, (four, x, y) => {
        const onto = squareOnto(four);
        const [u, v] = project(onto, x, y);
        return near(project(inverseOf(onto), u, v), [x, y]);
      }),
    );
  });

  test('a chain does one after the other', () => {
    fc.assert(
      fc.property(corners, coordinate, coordinate, coordinate, (four, angle, x, y) => {
        const [first, next] = [rotationAbout(angle, 0.5, 0.5), squareOnto(four)];
        const [u, v] = project(first, x, y);
        return near(project(chainProjections(first, next), x, y), project(next, u, v));
      }),
    );
  });

  test('four quarters make a whole turn; one brings the lower left corner to the upper left', () => {
    expect(project(quarterTurn(90, 200, 100), 0, 100)).toEqual([0, 0]);
    const twice = chainProjections(quarterTurn(90, 200, 100), quarterTurn(270, 100, 200));
    expect(project(twice, 30, 40)).toEqual([30, 40]);
  });
});
