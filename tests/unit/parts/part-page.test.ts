import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';

import { OrderOfStep } from '@/components/parts/route-of-part';
import { Sizes } from '@/components/parts/sizes-of-part';
import type { RouteStep } from '@/lib/parts/contract';
import { PART_TABLES } from '@/lib/reference/published-tables';

const seen = (markup: string) => markup.replace(/<[^>]*>/g, ' ').replace(/\s+/g, ' ');
const computed = {
  massG: 627,
  areaMm2: 559_152.4,
  rule: 'a flat blank',
  density: '2.780 g/cm³, AA (read, high trust)',
};
const SIZES = { length: null, width: null, height: null, mass: null, area: null, computed };

test.each([
  ['inch', 'about 1.38 lb', 'about 6.02 ft²'],
  ['metric', 'about 627 g', 'about 0.559 m²'],
] as const)('mass and area that nobody typed are computed, in %s', (units, mass, area) => {
  const text = seen(renderToStaticMarkup(createElement(Sizes, { part: SIZES, units })));
  expect(text).toContain(mass);
  expect(text).toContain(area);
  expect(text).toMatch(/nothing taken off.*trust/);
});

test('what was weighed stands as it was typed', () => {
  const weighed = {
    ...SIZES,
    mass: { entered: '1.2 lb', value: 544.3 },
    area: { entered: '5 ft²', value: 464_515.2 },
  };
  const text = seen(renderToStaticMarkup(createElement(Sizes, { part: weighed, units: 'inch' })));
  expect(text).toContain('1.2 lb');
  expect(text).not.toMatch(/about|Computed/);
  expect(
    renderToStaticMarkup(createElement(Sizes, { part: { ...SIZES, computed: null }, units: 'inch' })),
  ).toBe('');
});

test('a step shows what the order states for it, and what it does not', () => {
  const step: RouteStep = {
    id: 'step-1',
    seq: 1,
    process: 'anodize',
    specification: 'MIL-PRF-8625',
    specificationRevision: 'F',
    classType: 'type II class 1',
    conditionBefore: null,
    targetCondition: null,
    toProve: [],
    ordering: { areas: 'all over, no masking', contact_marks: 'in tooling holes only' },
    note: null,
    waiting: 0,
    used: false,
  };
  const text = seen(
    renderToStaticMarkup(createElement(OrderOfStep, { step, endCondition: 'T6', tables: PART_TABLES })),
  );
  expect(text).toContain('all over, no masking');
  expect(text).toMatch(/The order does not state: .*abrasion test/);
  expect(text).not.toMatch(/not state:.*contact/);
  expect(
    renderToStaticMarkup(
      createElement(OrderOfStep, {
        step: { ...step, specification: 'House process 7', ordering: {} },
        endCondition: 'T6',
        tables: PART_TABLES,
      }),
    ),
  ).toBe('');
});
