import type { CertificateLine } from '../certificate';
import type { Order, OrderLine } from '../../order';
import { likeness, plainKey, type Likeness } from '../match/alike';

/** `only_one_left`: neither number resembles the other, and nothing else is left on either side. */
export type PairedBy = Likeness | 'only_one_left' | 'no_number';

export interface StatedLine {
  readonly line: CertificateLine;
  readonly by: PairedBy;
}

export interface LinePair {
  readonly ordered: OrderLine;
  readonly stated: readonly StatedLine[];
}

export interface PairedLines {
  readonly pairs: readonly LinePair[];
  /** On the certificate and not on the order. */
  readonly unknown: readonly CertificateLine[];
}

/**
 * Which line of the order each line of a certificate speaks of: by part number, then by lot and quantity where several
 * lines have one number, then by similar numbers among what is left, then because one of as many
 * pieces or of the same lot is all that is left on both sides.
 */
export function pairLines(order: Order, stated: readonly CertificateLine[]): PairedLines {
  const taken = new Map<OrderLine, StatedLine[]>();
  let left = [...stated];
  const take = (line: CertificateLine, ordered: OrderLine, by: PairedBy) => {
    taken.set(ordered, [...(taken.get(ordered) ?? []), { line, by }]);
    left = left.filter((one) => one !== line);
  };
  for (const by of ['same', 'lookalike'] as const)
    for (const line of [...left]) {
      const alike = order.lines.filter((ordered) => isAlike(line, ordered, by));
      const exact = alike.filter(({ part_number }) => isNumber(line, part_number));
      const ordered = nearestOf(line, exact.length > 0 ? exact : alike, taken);
      if (ordered) take(line, ordered, by);
    }
  const free = () => order.lines.filter((ordered) => !taken.has(ordered));
  for (const by of ['transposed', 'near'] as const)
    for (const line of [...left]) {
      const alike = free().filter((ordered) => isAlike(line, ordered, by));
      const ordered = nearestOf(line, alike, taken);
      if (ordered) take(line, ordered, by);
    }
  for (const line of left.filter(({ part_number }) => part_number === null)) {
    const byLot = free().find((ordered) => isSameLot(line, ordered));
    if (byLot) take(line, byLot, 'no_number');
  }
  const [line, ordered] = [left[0], free()[0]];
  if (line && ordered && left.length === 1 && free().length === 1 && mayBe(line, ordered))
    take(line, ordered, line.part_number === null ? 'no_number' : 'only_one_left');
  return {
    pairs: order.lines.map((one) => ({ ordered: one, stated: taken.get(one) ?? [] })),
    unknown: left,
  };
}

/** Some print a part number with its revision behind it. */
const isAlike = ({ part_number }: CertificateLine, ordered: OrderLine, by: Likeness): boolean =>
  part_number !== null &&
  (likeness(part_number, ordered.part_number) === by ||
    (by === 'same' && !!ordered.rev && likeness(part_number, ordered.part_number + ordered.rev) === by));

const isNumber = ({ part_number }: CertificateLine, number: string): boolean =>
  part_number !== null && plainKey(part_number) === plainKey(number);

const isSameLot = (line: CertificateLine, ordered: OrderLine): boolean =>
  line.lot !== null && !!ordered.lot && plainKey(line.lot) === plainKey(ordered.lot);

/** Another number altogether stands for a line only where its pieces or its lot do; else two things are wrong. */
const mayBe = (line: CertificateLine, ordered: OrderLine): boolean =>
  isSameLot(line, ordered) || piecesOf(line) === ordered.qty;

export const piecesOf = ({ qty_accepted, qty_rejected }: CertificateLine): number | null =>
  qty_accepted === null ? null : qty_accepted + (qty_rejected ?? 0);

/** Of several lines with one part number: that of its lot, then one of as many pieces, then one that is still free. */
function nearestOf(
  line: CertificateLine,
  alike: readonly OrderLine[],
  taken: ReadonlyMap<OrderLine, readonly StatedLine[]>,
): OrderLine | undefined {
  const points = (ordered: OrderLine) =>
    (isSameLot(line, ordered) ? 4 : 0) +
    (taken.has(ordered) ? 0 : 2) +
    (piecesOf(line) === ordered.qty ? 1 : 0);
  return alike.toSorted((a, b) => points(b) - points(a))[0];
}
