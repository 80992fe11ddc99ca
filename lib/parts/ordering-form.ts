import type { PartTables } from '@/lib/reference/published-tables';
import { recogniseSpecification } from '@/lib/trade/lineage/recognise-specification';
import { missingItems } from '@/lib/trade/ordering/missing-items';
import type { OrderItem } from '@/lib/trade/ordering/order-item';
import { orderingChecklist, type ChecklistItem } from '@/lib/trade/ordering/ordering-checklist';

import { orderFactsOf, orderItemsOf } from './order-facts';
import { statedItems, type OrderingAnswers } from './ordering-answers';
import { statedByRequirements } from './stated-by-requirements';
import { strengthRangeOf } from './strength-of';

/** What the part, the batch and the step itself put on every order; nobody types it twice. */
const STATED_ELSEWHERE: readonly OrderItem[] = [
  'specification_and_revision',
  'quantity',
  'part_number',
  'alloy',
  'product_form',
];

export interface OrderedStep {
  readonly specification: string;
  readonly specificationRevision: string;
  readonly classType: string;
  readonly conditionBefore: string;
  readonly targetCondition: string;
  readonly ordering: OrderingAnswers;
  /** What its requirements name, and the condition that the part ends in: both state things on the order too. */
  readonly characteristics?: readonly string[];
  readonly endCondition?: string;
}

export interface OrderingForm {
  /** What is asked beside the fields of the step. */
  readonly asked: readonly ChecklistItem[];
  /** Has to be asked for before the work starts; commonest first. */
  readonly missing: readonly ChecklistItem[];
}

/** What an order of a step must state, and what it still leaves out. Null where nothing is recorded for its specification. */
export function orderingForm(
  { ordering, commonlyMissing }: Pick<PartTables, 'ordering' | 'commonlyMissing'>,
  step: OrderedStep,
): OrderingForm | null {
  const read = recogniseSpecification(step.specification);
  if (!read) return null;
  const facts = orderFactsOf(step.classType);
  const checklist = orderingChecklist(ordering, read.number, facts);
  if (!checklist.ok) return null;
  const elsewhere = new Set([...STATED_ELSEWHERE, ...saidByFields(step)]);
  const stated = [
    ...elsewhere,
    ...statedItems(step.ordering).map(({ id }) => id),
    ...statedByRequirements(step.characteristics ?? []),
    ...saidByStrength(`${step.targetCondition} ${step.endCondition ?? ''}`),
  ];
  const open = missingItems({ ordering, commonest: commonlyMissing }, read.number, { stated, facts });
  return {
    asked: checklist.items.filter(({ item }) => !elsewhere.has(item)),
    missing: open.ok ? open.missing : [],
  };
}

/** A condition that names a strength or hardness states it. */
function saidByStrength(condition: string): OrderItem[] {
  const { tensileMpa, hrc } = strengthRangeOf(condition);
  return tensileMpa || hrc ? ['steel_strength', 'hardness_or_strength'] : [];
}

function saidByFields({
  specification,
  classType,
  conditionBefore,
  targetCondition,
}: OrderedStep): OrderItem[] {
  return [
    ...orderItemsOf(classType),
    ...(/\d\/\d/.test(specification) ? (['slash_sheet'] as const) : []),
    ...(conditionBefore === '' ? [] : (['condition_before'] as const)),
    ...(targetCondition === '' ? [] : (['condition_after'] as const)),
  ];
}
