import { expect, test } from 'vitest';

import { benchText, readBench } from '@/components/reference/bench-units';

test('reads inches, fractions, °F and ksi as mm, °C and MPa', () => {
  expect(readBench('1 1/4', 'length', 'inch')).toBeCloseTo(31.75);
  expect(readBench('375', 'temperature', 'inch')).toBeCloseTo(190.56, 2);
  expect(readBench('150', 'stress', 'inch')).toBeCloseTo(1034.2, 1);
  expect(readBench('150', 'number', 'inch')).toBe(150);
  expect(readBench('thick', 'length', 'inch')).toBeNull();
});

test('writes a coating back as it was typed', () => {
  expect(benchText(readBench('0.0003', 'fine', 'inch') ?? NaN, 'fine', 'inch')).toBe('0.0003');
  expect(benchText(readBench('180', 'stress', 'inch') ?? NaN, 'stress', 'metric')).toBe('1241');
});
