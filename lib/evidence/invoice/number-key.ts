/**
 * What two spellings of one invoice number have in common: capitals, letters and digits only, no leading zeros in any
 * run of digits, and none of the words that say it is an invoice.
 *
 * @example numberKey('Inv. 0088-41') === numberKey('INV8841') // both '8841'
 */
export function numberKey(number: string): string {
  const words = number
    .toUpperCase()
    .replace(/^\s*(INVOICE|INV|RECHNUNG|FACTURE)\b[\s.:#]*(NO|NR|NUMBER)?[\s.:#]*/, '')
    .replace(/^INV(?=[\s.#-]*\d)/, '');
  const key = words.replace(/[^A-Z0-9]/g, '').replace(/(^|[A-Z])0+(?=\d)/g, '$1');
  return key === '' ? number.trim().toUpperCase() : key;
}
