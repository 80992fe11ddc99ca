import fc from 'fast-check';
import { expect, test } from 'vitest';

import { readBenchRoute, writeBenchRoute } from '@/components/reference/bench-route';

const text = fc.string().map((typed) => typed.replace(/[~|]/g, ' '));
const step = fc.record({ process: text, specification: text, classType: text });

test('a route comes back from the address as it went in', () => {
  fc.assert(
    fc.property(fc.array(step, { minLength: 1, maxLength: 20 }), (route) => {
      expect(readBenchRoute(writeBenchRoute(route))).toEqual(route);
    }),
  );
});

test('what parts the steps cannot be typed into one', () => {
  const typed = [{ process: 'anodize', specification: 'a|b~c', classType: '' }];
  expect(readBenchRoute(writeBenchRoute(typed))).toEqual([
    { process: 'anodize', specification: 'a b c', classType: '' },
  ]);
});

test('no route, and a made-up address, are read without harm', () => {
  expect(readBenchRoute('')).toEqual([]);
  expect(readBenchRoute('x?')).toEqual([{ process: 'x?', specification: '', classType: '' }]);
  expect(readBenchRoute('~'.repeat(999))).toHaveLength(20);
});
