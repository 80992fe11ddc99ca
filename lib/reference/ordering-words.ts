import type { OrderFact } from '@/lib/trade/ordering/order-item';
import type { OrderingKind } from '@/lib/trade/ordering/ordering-checklist';

/** How firmly a specification asks the order to state something; the same on the bench and in the editor. */
export const ORDERING_KIND_WORDS: Record<OrderingKind, string> = {
  must_state: 'must be stated',
  must_be_agreed: 'must be agreed',
  should_state: 'should be stated',
  state_or_default: 'may be stated',
  default: 'may be stated',
};

/** What is so of an order, to be ticked. */
export const ORDER_FACT_WORDS: Record<OrderFact, string> = {
  fasteners: 'the parts are fasteners',
  qq_p_35_on_drawing: 'the drawing says QQ-P-35',
  class_3: 'it is Class 3',
  type_iii: 'it is Type III',
  class_2: 'it is Class 2',
  steel_over_200_ksi: 'the steel is over 200 ksi',
  fasteners_from_160_ksi: 'they are fasteners of 160 ksi or more',
};
