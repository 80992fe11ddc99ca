import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { loadsOfBatch } from '@/lib/batches/loads-of-batch';
import { loadsToJoin, loadToJoinWords } from '@/lib/batches/load-to-join';
import { BATCH_TABLES } from '@/lib/reference/batch-tables';

import { lineOf, type PartChange } from './facts-of-batch';

const STEP = {
  process: 'solution_heat_treat',
  specification: 'AMS 2770',
  specificationRevision: 'R',
  classType: null,
  conditionBefore: 'O',
  targetCondition: 'T42',
} as const;
const sheet = (more: PartChange = {}): PartChange => ({
  alloy: '2024',
  madeCondition: 'O',
  endCondition: 'T42',
  thicknessMm: 1.6,
  ...more,
});
const lines = (parts: readonly PartChange[]) => parts.map((part, at) => lineOf(at + 1, part, [STEP]));
const joins = (parts: readonly PartChange[], waiting: PartChange, step: object = STEP) => {
  const found = loadsToJoin(BATCH_TABLES, lines(parts))(lineOf(9, waiting, [step]));
  return found && loadToJoinWords(found);
};

describe('the load that a waiting lot could join', () => {
  // Clad 0.032 in may not soak as long as bare 1/4 in has to.
  const TWO_LOADS = [sheet({ clad: true, thicknessMm: 0.8 }), sheet({ thicknessMm: 6.3 })];

  test('is the first that it may share a cycle with', () => {
    expect(joins(TWO_LOADS, sheet({ clad: true, thicknessMm: 0.8 }))).toBe('load 1');
    expect(joins(TWO_LOADS, sheet({ thicknessMm: 6.3 }))).toBe('load 2');
  });

  test('is one of its own, with the reason, where it may share with none', () =>
    expect(joins([sheet()], sheet({ alloy: '7075', endCondition: 'T62' }))).toMatch(
      /^a load of its own: their solution temperatures meet/,
    ));

  test('the reason is that of the line it cannot share with, not of the one it could', () =>
    expect(
      joins(
        [sheet({ thicknessMm: 3.175 }), sheet({ clad: true, thicknessMm: 1.27 })],
        sheet({ thicknessMm: 6.3 }),
      ),
    ).toBe('a load of its own: clad sheet would soak longer than it may beside the thicker section'));

  test('is one of its own on a batch that has no line yet', () =>
    expect(joins([], sheet())).toBe('a load of its own'));

  test('is not planned for what the tables do not have', () =>
    expect(joins([sheet()], sheet({ thicknessMm: null }))).toBe('not planned: its part says no thickness'));

  test('is none where the process is not planned in loads', () =>
    expect(joins([sheet()], sheet(), { process: 'anodize' })).toBeNull());

  test('a lot that joins one adds none to the plan', () => {
    const part = fc.record({
      alloy: fc.constantFrom('2024', '7075', '6061'),
      clad: fc.boolean(),
      thicknessMm: fc.constantFrom(0.5, 0.8, 1.6, 3.2, 6.3, 12.7),
    });
    fc.assert(
      fc.property(fc.array(part, { minLength: 1, maxLength: 5 }), part, (on, waiting) => {
        const [batch, lot] = [lines(on.map(sheet)), lineOf(9, sheet(waiting), [STEP])];
        const found = loadsToJoin(BATCH_TABLES, batch)(lot);
        const count = (of: typeof batch) => loadsOfBatch(BATCH_TABLES, of)?.loads.length ?? 0;
        fc.pre(found?.number != null);
        expect(count([...batch, lot])).toBeLessThanOrEqual(count(batch));
      }),
    );
  });
});
