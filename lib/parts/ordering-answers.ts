import { z } from 'zod';

import { ORDER_ITEM_WORDS, ORDER_ITEMS, type OrderItem } from '@/lib/trade/ordering/order-item';

/** What the order states for a step beside its fields: item of the ordering information to the words that are stated. */
export const OrderingAnswers = z.partialRecord(
  z.enum(ORDER_ITEMS),
  z.string().trim().max(200, 'Keep what the order states to 200 letters.'),
);
export type OrderingAnswers = z.infer<typeof OrderingAnswers>;

export interface StatedItem {
  readonly item: string;
  readonly says: string;
}

/** What is really stated, in the order and the words of the items: `colour: clear`. */
export const statedItems = (answers: OrderingAnswers): (StatedItem & { id: OrderItem })[] =>
  ORDER_ITEMS.flatMap((id) => {
    const says = answers[id]?.trim() ?? '';
    return says === '' ? [] : [{ id, item: ORDER_ITEM_WORDS[id], says }];
  });

/** Without what was left empty: nothing stated is nothing kept. */
export const answersKept = (answers: OrderingAnswers): OrderingAnswers =>
  Object.fromEntries(statedItems(answers).map(({ id, says }) => [id, says]));
