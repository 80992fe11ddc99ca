import { expect, test } from 'vitest';

import { conditionTree } from '@/components/reference/condition-tree';
import { temperReply } from '@/components/reference/temper-words';
import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import { TEMPER_TRANSITIONS } from '@/lib/trade/tables/temper-transitions';
import { TEMPER_DESIGNATIONS } from '@/lib/trade/tables/tempers';
import { explainCondition } from '@/lib/trade/tempers/explain-condition';
import { reachableConditions } from '@/lib/trade/tempers/reachable-conditions';

const RULES = { designations: TEMPER_DESIGNATIONS, transitions: TEMPER_TRANSITIONS, ageing: AGEING_CYCLES };
const SHEET = { alloy: '2024', form: 'sheet', clad: false } as const;

test('every condition stands once, one column after what it comes from', () => {
  const reachable = reachableConditions(RULES, SHEET, 'O');
  const nodes = conditionTree('O', reachable);
  expect(nodes.map(({ condition }) => condition).sort()).toEqual(
    ['O', ...reachable.map(({ condition }) => condition)].sort(),
  );
  for (const { depth, parent } of nodes)
    expect(depth).toBe(
      parent === null ? 0 : 1 + (nodes.find((node) => node.condition === parent)?.depth ?? NaN),
    );
});

test('why not T3: the mill’s cold work, and what trying gives', () => {
  const reply = temperReply(explainCondition(RULES, { material: SHEET, from: 'O', to: 'T3' }), {
    from: 'O',
    to: 'T3',
  });
  expect(reply).toMatchObject({ good: false, says: 'T3 can not be made of O' });
  expect('rest' in reply && reply.rest).toMatch(/cold work.*Trying gives T42/);
});
