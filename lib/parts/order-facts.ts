import type { OrderFact, OrderItem } from '@/lib/trade/ordering/order-item';

/** What class and type make so of an order, from the words that it calls them with: `Type III Class 2`. */
export function orderFactsOf(classType: string): OrderFact[] {
  const is = (fact: OrderFact, word: RegExp): OrderFact[] => (word.test(classType) ? [fact] : []);
  return [
    ...is('class_2', /\bclass\s*2\b/i),
    ...is('class_3', /\bclass\s*3\b/i),
    ...is('type_iii', /\btype\s*(?:iii|3)\b/i),
  ];
}

/** What those words state on the order: `Type III Class 2` states the type and the class. */
export function orderItemsOf(classType: string): OrderItem[] {
  const says = (item: OrderItem, word: RegExp): OrderItem[] => (word.test(classType) ? [item] : []);
  return [
    ...says('type', /\btype\b/i),
    ...says('class', /\bclass\b/i),
    ...says('grade', /\bgrade\b/i),
    ...says('method', /\bmethod\b/i),
    ...says('sensitivity', /\blevel\b/i),
  ];
}
