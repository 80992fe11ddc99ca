import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { chartSvg } from '@/lib/evidence/chart/chart-svg';
import { drawingOf } from '@/lib/evidence/chart/drawing-of';
import { extremesBetween, extremesOf } from '@/lib/evidence/chart/extremes';
import { seenIn } from '@/lib/evidence/chart/judge';
import { lineLooks } from '@/lib/evidence/chart/line-look';
import { chartPaths } from '@/lib/evidence/chart/paths';
import { recordingOf } from '@/lib/evidence/chart/recording';
import { reduced } from '@/lib/evidence/chart/reduced';

import { DIALECTS } from '../../../evidence/charts/dialects';
import { ASKED, runs } from '../../../evidence/charts/stories';

const reading = fc.oneof(
  { weight: 8, arbitrary: fc.integer({ min: -50, max: 2000 }) },
  { weight: 1, arbitrary: fc.constantFrom(Number.NaN, Number.POSITIVE_INFINITY) },
);
const readings = fc
  .array(reading, { minLength: 1, maxLength: 3000, size: 'max' })
  .map((values) => Float64Array.from(values));

describe('drawing fewer points', () => {
  test('the extremes of any rows are those of the readings in them', () => {
    fc.assert(
      fc.property(
        readings,
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (values, a, b) => {
          const [from, to] = [
            Math.floor(Math.min(a, b) * values.length),
            Math.ceil(Math.max(a, b) * values.length),
          ];
          const range = { low: 0, high: 0 };
          extremesBetween(extremesOf(values), from, to, range);
          const plain = [...values.subarray(from, to)].filter(Number.isFinite);
          expect(range).toEqual(
            plain.length === 0
              ? { low: Number.POSITIVE_INFINITY, high: Number.NEGATIVE_INFINITY }
              : { low: Math.min(...plain), high: Math.max(...plain) },
          );
        },
      ),
    );
  });

  test('no peak in view is lost, however narrow the picture', () => {
    fc.assert(
      fc.property(readings, fc.integer({ min: 1, max: 200 }), (values, columns) => {
        const seconds = Float64Array.from(values, (_, row) => row * 2);
        const span = { from: 0, to: (seconds[seconds.length - 1] ?? 0) || 1, columns };
        const drawn = reduced(seconds, [extremesOf(values)], span);
        const shown = (drawn.channels[0] ?? []).filter((value) => value !== null);
        const plain = [...values].filter(Number.isFinite);
        expect(shown.length).toBeLessThanOrEqual(Math.max(2 * columns, 2));
        if (plain.length > 0) {
          expect([Math.min(...shown), Math.max(...shown)]).toEqual([Math.min(...plain), Math.max(...plain)]);
        }
      }),
    );
  });

  test('zoomed in, the rows are given as they are', () => {
    const seconds = Float64Array.from({ length: 5000 }, (_, row) => row);
    const drawn = reduced(seconds, [extremesOf(seconds)], { from: 1000.5, to: 1010, columns: 300 });
    expect(drawn.seconds).toEqual([1000, 1001, 1002, 1003, 1004, 1005, 1006, 1007, 1008, 1009, 1010]);
    expect(drawn.channels[0]).toEqual(drawn.seconds);
  });
});

const [dialect] = DIALECTS;
const drawn = (name: string) => {
  const run = runs(20).find((one) => one.name === name);
  if (!run || !dialect) throw new Error(`There is no run ${name}.`);
  return drawingOf(seenIn(recordingOf(dialect.write(run), ASKED), ASKED));
};

describe('the picture of a chart', () => {
  test('names every line and the one that decided, and numbers what happened in the order of time', () => {
    const drawing = drawn('overshoot');
    expect(drawing.channels.filter(({ matters }) => matters).map(({ name }) => name)).toEqual(['TC1']);
    expect(drawing.events.map(({ number, code }) => [number, code])).toEqual([
      [1, 'overshoot'],
      [2, 'quench'],
    ]);
    const svg = chartSvg(chartPaths(drawing));
    for (const words of ['TC1', 'TC4', 'band 910 to 930 °F', 'asked 30', 'in the band'])
      expect(svg).toContain(words);
  });

  test('lines that are counted differ in more than colour', () => {
    const looks = lineLooks(drawn('twelve thermocouples').channels.slice(0, 7));
    expect(new Set(looks.map(({ dash, width }) => `${dash.join(' ')} ${width}`)).size).toBe(looks.length);
  });

  test('every line stays inside its panel', () => {
    for (const name of ['overshoot', 'open circuit from the start', 'a spike in the soak']) {
      const paths = chartPaths(drawn(name));
      for (const { top, bottom, lines } of paths.panels) {
        for (const { d } of lines) {
          for (const [, x, y] of d.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g)) {
            expect(Number(y)).toBeGreaterThanOrEqual(top - 0.1);
            expect(Number(y)).toBeLessThanOrEqual(bottom + 0.1);
            expect(Number(x)).toBeGreaterThanOrEqual(paths.left);
            expect(Number(x)).toBeLessThanOrEqual(paths.right);
          }
        }
      }
    }
  });

  test('names out of the file are text in the picture and nothing else', () => {
    const file = new TextEncoder().encode(
      [
        'Time,<script>x</script> & "TC1"',
        ...Array.from({ length: 9 }, (_, at) => `2026-03-05 08:0${at}:00,${900 + at}`),
      ].join('\n'),
    );
    expect(chartSvg(chartPaths(drawingOf(seenIn(recordingOf(file, ASKED), ASKED))))).not.toContain('<script');
  });
});
