import { lookalikeKey, plainKey } from './alike';

const WORDS =
  /^[\s#:.]*(?:customer'?s?|cust\.?|your|our)?\s*(?:purchase\s*order|order|p\s*[./]?\s*o)\s*\.?(?![a-z])[\s:.#-]*(?:(?:number|num|no|nr)(?![a-z]))?[\s:.#-]*/i;
const AMENDMENT = /[\s,/-]*\b(?:rev(?:ision)?|amd|amendment|line|item|release)\b[\s.:#-]*\w*$/i;

/** The one number in a text, without the words that say it is an order's, and without a line or amendment behind it. */
const bare = (written: string): string => written.trim().replace(WORDS, '').replace(AMENDMENT, '');

const split = (key: string): { prefix: string; rest: string } => {
  const [, prefix = '', rest = ''] = /^([A-Z]*)(.*)$/.exec(key) ?? [];
  return { prefix, rest };
};

/** Printed with its prefix, without it, or with the words of an order in its place; two different prefixes are two numbers. */
function isSame(written: string, order: string): boolean {
  if (written === '') return false;
  if (written === order) return true;
  const [a, b] = [split(written), split(order)];
  return a.rest !== '' && a.rest === b.rest && (a.prefix === '' || b.prefix === '');
}

/**
 * Whether a certificate's or invoice's words name an order, with or without its prefix; several numbers with commas or
 * "and" between them are looked at one by one.
 *
 * @param isRecognised the words come from optical recognition: O and 0, I and 1, S and 5, B and 8 are one.
 * @example namesOrder('P.O. No. 5001', 'PO-5001') is true, namesOrder('PO-5010', 'PO-5001') false
 */
export function namesOrder(written: string, order: string, isRecognised = false): boolean {
  const own = lookalikeKey(bare(order));
  const parts = [written, ...written.split(/[,;&\n]|\band\b/i)].map(bare);
  return parts.some(
    (part) =>
      isSame(plainKey(part), plainKey(order)) || (isRecognised && own !== '' && lookalikeKey(part) === own),
  );
}
