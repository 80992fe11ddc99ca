import type { ToProve } from '@/lib/parts/to-prove';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { recogniseSpecification } from '@/lib/trade/lineage/recognise-specification';
import type { OrderItem } from '@/lib/trade/ordering/order-item';
import { orderingChecklist } from '@/lib/trade/ordering/ordering-checklist';
import { COMMON_PRACTICE } from '@/lib/trade/source';

import { proposalInWords, type AskedLine } from './proposal';
import { question } from './question';

const NAMES = {
  intensity: 'Peening intensity',
  coverage: 'Coverage',
  media: 'Shot',
} as const satisfies Partial<Record<OrderItem, string>>;
/** Whatever document is called: a peened surface is proved by no other figures. */
const ALWAYS: readonly OrderItem[] = ['intensity', 'coverage'];

/**
 * What papers of shot peening state. No table here has an intensity: it goes with the drawing. What the step states of
 * it is proposed as it stands; the rest as the question that the drawing answers.
 */
export function peeningProposals(tables: BatchTables, { step, ordering }: AskedLine): ToProve[] {
  const read = recogniseSpecification(step.specification);
  const list = read && orderingChecklist(tables.ordering, read.number, []);
  const items = list?.ok ? list.items : [];
  return (Object.keys(NAMES) as (keyof typeof NAMES)[]).flatMap((item) => {
    const asked = items.find((one) => one.item === item);
    if (!asked && !ALWAYS.includes(item)) return [];
    const source = asked?.source ?? COMMON_PRACTICE;
    const stated = ordering[item]?.trim() ?? '';
    if (stated !== '') return proposalInWords(NAMES[item], stated, source);
    return question(NAMES[item], source, asked?.otherwise && `otherwise ${asked.otherwise}`);
  });
}
