import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { commonlyMissing, missingItems } from '@/lib/trade/ordering/missing-items';
import { ORDER_FACTS, ORDER_ITEM_WORDS, ORDER_ITEMS, type OrderItem } from '@/lib/trade/ordering/order-item';
import { factsAskedFor, orderingChecklist } from '@/lib/trade/ordering/ordering-checklist';
import { promisedOn, workDaysTogether } from '@/lib/trade/ordering/promised-on';
import { MISSING_ITEMS } from '@/lib/trade/tables/missing-items';
import { ORDERING_INFORMATION } from '@/lib/trade/tables/ordering-information';

import { numberOf, publishedRows, saidBy } from './values';

const TABLES = { ordering: ORDERING_INFORMATION, commonest: MISSING_ITEMS };
const KINDS = ['must_state', 'must_be_agreed', 'should_state', 'state_or_default', 'default'];
const itemOf = (text: string): OrderItem => {
  const item = ORDER_ITEMS.find((one) => one === text);
  if (!item) throw new Error(`"${text}" is no item`);
  return item;
};

describe('what a specification asks the purchaser to state', () => {
  const rows = publishedRows('ordering-information', ['specifications', 'item', 'kind', 'when', 'otherwise']);
  test.each(rows.map((row) => [row.specifications, row.item, saidBy(row), row] as const))(
    '%s: %s (%s)',
    (_number, _item, _said, row) => {
      for (const number of row.specifications.split('; ')) {
        const facts = ORDER_FACTS.filter((fact) => fact === row.when);
        const checklist = orderingChecklist(ORDERING_INFORMATION, number, facts);
        if (!checklist.ok) throw new Error(checklist.reason);
        const found = checklist.items.filter(({ item }) => item === row.item);
        expect(found).toHaveLength(1);
        // It is asked at least so firmly, and what applies without it is told.
        expect(KINDS.indexOf(found[0]?.kind ?? '')).toBeLessThanOrEqual(KINDS.indexOf(row.kind));
        if (row.otherwise !== '') expect(found[0]?.otherwise).toBe(row.otherwise);
        const without = orderingChecklist(ORDERING_INFORMATION, number, []);
        const always = rows.some(
          (one) => one.specifications === row.specifications && one.item === row.item && one.when === '',
        );
        expect(without.ok && without.items.some(({ item }) => item === row.item)).toBe(always);
      }
    },
  );

  test('a slash sheet asks what its family asks', () => {
    const family = orderingChecklist(ORDERING_INFORMATION, 'AMS2759', []);
    expect(orderingChecklist(ORDERING_INFORMATION, 'AMS2759/5', [])).toEqual(family);
    expect(orderingChecklist(ORDERING_INFORMATION, 'AMS9999', [])).toEqual({
      ok: false,
      reason: 'not_known',
    });
  });

  test('MIL-DTL-5541 must have a type, and without one Type I applies; read, not recalled', () => {
    const checklist = orderingChecklist(ORDERING_INFORMATION, 'MIL-DTL-5541', []);
    expect(checklist.ok && checklist.items.find(({ item }) => item === 'type')).toMatchObject({
      kind: 'must_state',
      otherwise: 'Type I, hexavalent',
      issue: 'F',
      source: { confidence: 'read' },
    });
  });

  test('QQ-P-35 on the drawing turns the default class of AMS2700 into 4', () => {
    const otherwise = (facts: Parameters<typeof orderingChecklist>[2]) => {
      const checklist = orderingChecklist(ORDERING_INFORMATION, 'AMS2700', facts);
      return checklist.ok && checklist.items.find(({ item }) => item === 'class')?.otherwise;
    };
    expect(otherwise([])).toBe('class 2, one part per lot');
    expect(otherwise(['qq_p_35_on_drawing'])).toBe('class 4');
  });

  test('every item has its words', () => {
    expect(new Set(Object.values(ORDER_ITEM_WORDS)).size).toBe(ORDER_ITEMS.length);
  });
});

describe('what an order leaves out', () => {
  test('an order to MIL-DTL-5541 that states only specification and quantity misses type and class first', () => {
    const found = missingItems(TABLES, 'MIL-DTL-5541', {
      stated: ['specification_and_revision', 'quantity'],
      facts: [],
    });
    if (!found.ok) throw new Error(found.reason);
    expect(found.missing.slice(0, 3).map(({ item }) => item)).toEqual(['type', 'class', 'next_step']);
    expect(found.missing.map(({ item }) => item)).not.toContain('electrical_resistance_limit');
  });

  test('class 3 asks for more', () => {
    const found = missingItems(TABLES, 'MIL-DTL-5541', { stated: [], facts: ['class_3'] });
    expect(found.ok && found.missing.map(({ item }) => item)).toContain('electrical_resistance_limit');
  });

  test('what has a default is not missing, and the default is told', () => {
    const found = missingItems(TABLES, 'QQ-P-416', { stated: ['type', 'class'], facts: [] });
    if (!found.ok) throw new Error(found.reason);
    expect(found.defaulted.map(({ item, otherwise }) => [item, otherwise])).toContainEqual([
      'coverage',
      'all surfaces, thread roots included',
    ]);
    expect(found.missing.map(({ item }) => item)).not.toContain('coverage');
    expect(found.missing.map(({ item }) => item)).toContain('embrittlement_bake');
  });

  test('whoever states more misses less, and whoever states all misses nothing', () => {
    const items = fc.subarray([...ORDER_ITEMS]);
    const number = fc.constantFrom(
      ...ORDERING_INFORMATION.rows.flatMap(({ specifications }) => specifications),
    );
    fc.assert(
      fc.property(number, items, items, fc.subarray([...ORDER_FACTS]), (asked, some, more, facts) => {
        const few = missingItems(TABLES, asked, { stated: some, facts });
        const many = missingItems(TABLES, asked, { stated: [...some, ...more], facts });
        const all = missingItems(TABLES, asked, { stated: ORDER_ITEMS, facts });
        return (
          few.ok &&
          many.ok &&
          all.ok &&
          many.missing.length <= few.missing.length &&
          all.missing.length + all.defaulted.length === 0
        );
      }),
    );
  });

  const ranks = publishedRows('ordering-missing-items', ['rank', 'items', 'sources']);
  test.each(ranks.map((row) => [row.rank, saidBy(row), row] as const))(
    'rank %s (%s)',
    (_rank, _said, row) => {
      const items = row.items.split(';').map(itemOf);
      const others = ORDER_ITEMS.filter((item) => !items.includes(item));
      expect(commonlyMissing(MISSING_ITEMS, others)).toMatchObject([
        { rank: numberOf(row.rank), items, saidBy: numberOf(row.sources) },
      ]);
    },
  );
});

describe('when work is due', () => {
  const asked = { receivedOn: '2026-03-02', completeOn: '2026-03-02', workDays: 3, closed: [] };

  const rows = publishedRows('ordering-lead-times', ['received_on', 'complete_on', 'work_days', 'due_on']);
  test.each(rows.map((row) => [row.received_on, row.work_days, saidBy(row), row] as const))(
    'received %s, %s work days (%s)',
    (_on, _days, _said, row) => {
      expect(
        promisedOn({
          receivedOn: row.received_on,
          completeOn: row.complete_on,
          workDays: numberOf(row.work_days),
          closed: [],
        }),
      ).toMatchObject({ ok: true, dueOn: row.due_on });
    },
  );

  test('received on a Monday, three work days: Thursday; a closed day does not count', () => {
    expect(promisedOn(asked)).toMatchObject({ ok: true, dueOn: '2026-03-05' });
    expect(promisedOn({ ...asked, closed: ['2026-03-04'] })).toMatchObject({ dueOn: '2026-03-06' });
  });

  test('the clock starts only when the last paper is there, and stands still on a weekend', () => {
    expect(promisedOn({ ...asked, completeOn: '2026-03-05' })).toMatchObject({ dueOn: '2026-03-10' });
  });

  const together = publishedRows('ordering-processes-together', ['processes', 'days_each', 'work_days']);
  test.each(together.map((row) => [row.processes, saidBy(row), row] as const))(
    '%s processes (%s)',
    (_processes, _said, row) => {
      const each = Array.from({ length: numberOf(row.processes) }, () => numberOf(row.days_each));
      expect(workDaysTogether(each)).toMatchObject({ ok: true, workDays: numberOf(row.work_days) });
    },
  );

  test('refusals', () => {
    expect(promisedOn({ ...asked, receivedOn: '2026-02-30' })).toEqual({ ok: false, reason: 'not_a_date' });
    expect(promisedOn({ ...asked, workDays: 0 })).toEqual({ ok: false, reason: 'days_not_whole' });
    expect(workDaysTogether([1.5])).toEqual({ ok: false, reason: 'days_not_whole' });
  });
});

describe('what has to be known of an order before its list is whole', () => {
  test('of MIL-DTL-5541: whether it is Class 3; of AMS2700: fasteners, and a drawing that says QQ-P-35', () => {
    expect(factsAskedFor(ORDERING_INFORMATION, 'MIL-DTL-5541')).toEqual(['class_3']);
    expect(factsAskedFor(ORDERING_INFORMATION, 'AMS2700')).toEqual(['fasteners', 'qq_p_35_on_drawing']);
  });

  test('nothing of a specification that asks the same of every order, and of one that is not recorded', () => {
    expect(factsAskedFor(ORDERING_INFORMATION, 'AMS2770')).toEqual([]);
    expect(factsAskedFor(ORDERING_INFORMATION, 'AMS9999')).toEqual([]);
  });
});
