import { expect, test } from 'vitest';

import { groupsOf, type TypedLine } from '@/components/reference/load-lines';
import { APART_WORDS, unplacedWords } from '@/lib/reference/load-words';

const LINE: TypedLine = { name: 'a', alloy: '2024', thicknessMm: 1.6, clad: true, to: 'T42' };
const WORK = { form: 'sheet', medium: 'air', quench: 'cold water' } as const;

test('what is aged in an oven is planned with its ageing, what settles is not', () => {
  const [settled, aged] = groupsOf([LINE, { ...LINE, name: 'b', to: 'T62' }], WORK);
  expect(settled?.process).toBe('solution_heat_treat');
  expect(aged?.process).toBe('solution_heat_treat_and_age');
});

test('a line without a thickness is left out', () => {
  expect(groupsOf([{ ...LINE, thicknessMm: null }], WORK)).toEqual([]);
});

test('reasons are sentences', () => {
  expect(APART_WORDS.meet_only_above_melting_risk).toMatch(/melt/);
  expect(unplacedWords('thicker_than_table')).toBe('it is thicker than the soak table goes');
  expect(unplacedWords('overlap_narrower_than_furnace')).toMatch(/contradict themselves/);
});
