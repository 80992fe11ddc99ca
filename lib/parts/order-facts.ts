import type { OrderFact } from '@/lib/trade/ordering/order-item';

/** What class and type make so of an order, from the words that it calls them with: `Type III Class 2`. */
export function orderFactsOf(classType: string): OrderFact[] {
  const is = (fact: OrderFact, word: RegExp): OrderFact[] => (word.test(classType) ? [fact] : []);
  return [
    ...is('class_2', /\bclass\s*2\b/i),
    ...is('class_3', /\bclass\s*3\b/i),
    ...is('type_iii', /\btype\s*(?:iii|3)\b/i),
  ];
}
