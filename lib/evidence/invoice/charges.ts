import type { DecimalSign } from '../certificate/read/quantities';
import { sharedAcross } from '../layout/box';
import type { Line, Segment } from '../layout/lines';
import { spotIn, type Passage, type Spot } from '../layout/passage';
import { chargeKind, type ChargeKind } from './charge-kinds';
import { lastSum, moneyIn } from './money-in';
import type { FoundCharge } from './piece-lines';

export interface Charge extends FoundCharge {
  readonly kind: ChargeKind;
}

/** A currency beside a sum. */
const CODE = /\b[A-Z]{3}\b/g;

/** Words before a sum: more is a sentence. */
const LABEL_LENGTH = 60;

/** Labels of sums on the lines of a page, each with the sum behind it, to its right or under it. */
export function chargesOn(lines: readonly Line[], sign: DecimalSign): Charge[] {
  return lines.flatMap((line, index) =>
    line.segments.flatMap((segment, place): Charge[] => {
      const several = severalIn(segment, sign);
      if (several) return several;
      const [money] = moneyIn(segment.text, sign).filter(({ isSum }) => isSum);
      const words = segment.text.slice(0, money?.start).trim();
      const kind = kindOf(words);
      if (kind === null) return [];
      const found = sumOf(segment, line.segments.slice(place + 1), lines[index + 1], sign);
      return found ? [{ kind, words, ...found }] : [];
    }),
  );
}

const kindOf = (words: string): ChargeKind | null =>
  words.length <= LABEL_LENGTH && /\p{L}{2}/u.test(words) ? chargeKind(words) : null;

/** `Subtotal 112.50 Freight 14.20 Total 126.70`: each sum behind its own label; null where it is not so. */
function severalIn(segment: Segment, sign: DecimalSign): Charge[] | null {
  const sums = moneyIn(segment.text, sign).filter(({ isSum }) => isSum);
  const charges = sums.flatMap((sum, index): Charge[] => {
    const words = segment.text.slice(sums[index - 1]?.end ?? 0, sum.start).trim();
    const kind = kindOf(words);
    const spot = spotIn(segment, sum.start, sum.end);
    return kind !== null && spot ? [{ kind, words, amount: sum.value, spot }] : [];
  });
  return sums.length > 1 && charges.length === sums.length ? charges : null;
}

function sumOf(
  segment: Segment,
  right: readonly Segment[],
  next: Line | undefined,
  sign: DecimalSign,
): { amount: number; spot: Spot } | null {
  // "Minimum $100.00 - adjustment   $52.50": what stands in the column of sums goes before a sum among the words.
  for (const other of right) {
    // Another label's sum is not this one's.
    if (/\p{L}{2}/u.test(other.text.replace(CODE, ''))) break;
    const sum = sumIn(other, sign);
    if (sum) return sum;
  }
  const own = sumIn(segment, sign);
  if (own) return own;
  const height = segment.box[3] - segment.box[1];
  const under = next?.segments.find(
    ({ box }) => sharedAcross(box, segment.box) > 0 && box[1] - segment.box[3] < 2 * height,
  );
  return under && right.length === 0 && chargeKind(under.text) === null ? sumIn(under, sign) : null;
}

function sumIn(passage: Passage, sign: DecimalSign): { amount: number; spot: Spot } | null {
  const sum = lastSum(passage.text, sign) ?? wholeSum(passage, sign);
  const spot = sum && spotIn(passage, sum.start, sum.end);
  return sum && spot ? { amount: sum.value, spot } : null;
}

/** A number alone in its cell may be a sum without decimals. */
function wholeSum({ text }: Passage, sign: DecimalSign) {
  const [only, ...more] = moneyIn(text, sign);
  return only && more.length === 0 && /^[\s\d.,-]+$/.test(text) ? only : null;
}
