import { readdirSync, readFileSync } from 'node:fs';

import { describe, expect, test } from 'vitest';

import { checkBatch } from '@/lib/batches/checks';
import { ROUTE_RULE_WORDS } from '@/lib/batches/route-rule-words';
import { orderingForm, type OrderedStep } from '@/lib/parts/ordering-form';
import { PART_TABLES } from '@/lib/reference/published-tables';
import { ORDER_RULES } from '@/lib/trade/tables/order-rules';
import { OVERRIDDEN_WORDS } from '@/lib/travellers/overridden-words';

import { factsOf, lineOf, STEP } from './facts-of-batch';

const leftOut = (...of: Parameters<typeof factsOf>) =>
  checkBatch(factsOf(...of)).findings.filter(({ code }) => code === 'order_leaves_out');

describe('what the order leaves out', () => {
  const { abrasion_test: _, ...ordering } = STEP.ordering;

  test('is named, with the paragraph that asks for it and where to state it', () => {
    const [warning, ...more] = leftOut([lineOf(1, {}, [{ ordering }])]);
    expect(more).toEqual([]);
    expect(warning).toMatchObject({
      level: 'warn',
      sentence: 'The order for line 1 leaves out one thing that MIL-PRF-8625 wants stated.',
      waysOut: [{ way: 'state_order', partId: 'part-1' }],
    });
    expect(warning?.rest).toMatch(/^Abrasion test/);
    expect(warning?.source).toMatch(/trust/);
  });

  test('lines that leave out the same are one warning, others their own', () => {
    const { areas: __, ...less } = ordering;
    const found = leftOut([
      lineOf(1, {}, [{ ordering }]),
      lineOf(2, {}, [{ ordering: less }]),
      lineOf(3, {}, [{ ordering }]),
    ]);
    expect(found.map(({ sentence }) => sentence.slice(0, 30))).toEqual([
      'The order for lines 1, 3 leave',
      'The order for line 2 leaves ou',
    ]);
  });

  test('what must be proved states it too, for the line or for all', () => {
    const { coating_thickness: __, ...thin } = STEP.ordering;
    const line = lineOf(1, {}, [{ ordering: thin }], { characteristics: [] });
    expect(leftOut([line])).toHaveLength(1);
    expect(leftOut([{ ...line, characteristics: ['Coating weight'] }])).toEqual([]);
    expect(leftOut([line], { batch: { characteristics: ['Thickness'] } })).toEqual([]);
  });

  test('nothing is said of a specification that nothing is recorded of', () =>
    expect(leftOut([lineOf(1, {}, [{ specification: 'House process 7', ordering: {} }])])).toEqual([]));
});

test('a strength in the condition, and a sheet in the number, are stated', () => {
  const step: OrderedStep = {
    specification: 'AMS 2759/1',
    specificationRevision: 'H',
    classType: '',
    conditionBefore: 'annealed',
    targetCondition: '160 to 180 ksi',
    ordering: {},
  };
  const missing = (of: OrderedStep) => orderingForm(PART_TABLES, of)?.missing.map(({ item }) => item) ?? [];
  expect(missing(step)).not.toContain('hardness_or_strength');
  expect(missing(step)).not.toContain('slash_sheet');
  expect(missing({ ...step, targetCondition: 'hardened' })).toContain('hardness_or_strength');
});

describe('a blocker that was let pass is said in words on paper', () => {
  test('each rule of a route', () => {
    const shown = ORDER_RULES.rows.filter(({ severity }) => severity !== 'note').map(({ rule }) => rule);
    const all = [...new Set([...shown, ...Object.keys(ROUTE_RULE_WORDS)])];
    expect(all.filter((rule) => !OVERRIDDEN_WORDS[`route_${rule}`])).toEqual([]);
  });

  test('each check that offers it', () => {
    const folder = 'lib/batches';
    const codes = readdirSync(folder)
      .filter((file) => file.endsWith('-checks.ts'))
      .flatMap((file) => {
        const [, ...findings] = readFileSync(`${folder}/${file}`, 'utf8').split(/code: '/);
        return findings.filter((one) => one.includes('OVERRIDE')).map((one) => /^\w+/.exec(one)?.[0] ?? '');
      });
    expect(codes.length).toBeGreaterThan(3);
    expect(codes.filter((code) => !OVERRIDDEN_WORDS[code])).toEqual([]);
  });
});
