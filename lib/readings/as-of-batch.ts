import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { plainKey } from '@/lib/evidence/certificate/match/alike';
import { namesOrder } from '@/lib/evidence/certificate/match/same-order-number';
import type { Order } from '@/lib/evidence/order';

import { rowsOn } from './rows-on';

interface Beside {
  order: Order;
  /** Other batches that the paper may speak of. */
  others: readonly Order[];
  /** As they stand on its pages. */
  words: readonly string[];
}

/**
 * A certificate for several batches as far as it speaks of one of them: without the rows that are of the others, and under
 * the order of this one where its number stands on the page beside theirs. Its facts keep their places; those of rows that are
 * left out bear another field. One that speaks of this batch alone, or not at all, is left as it is.
 */
export function asOfBatch(stated: StatedCertificate, { order, others, words }: Beside): StatedCertificate {
  const here = rowsOn(stated, order);
  const further = others
    .map((one) => ({ order: one, rows: rowsOn(stated, one).filter((at) => !here.includes(at)) }))
    .filter(({ rows }) => rows.length > 0);
  if (here.length === 0 || further.length === 0) return stated;
  const left = new Set(further.flatMap(({ rows }) => rows));
  const kept = stated.lines.flatMap((_, at) => (left.has(at) ? [] : [at]));
  const names = stated.purchase_order;
  const isUnderOther = names !== null && further.some((one) => namesOrder(names, one.order.po));
  const isBatchOfOther = further.some(
    (one) => stated.batch !== null && plainKey(one.order.batch) === plainKey(stated.batch),
  );
  const isNamed = standsThere(order.po, words) || standsThere(order.batch, words);
  return {
    ...stated,
    purchase_order: isUnderOther && isNamed ? order.po : names,
    batch: isBatchOfOther && isNamed ? null : stated.batch,
    lines: stated.lines.filter((_, at) => !left.has(at)),
    facts: stated.facts.map((fact) => ({ ...fact, field: fieldIn(fact.field, kept) })),
  };
}

const standsThere = (number: string, words: readonly string[]): boolean =>
  words.some((word) => word.split(/[,;/&]/).some((part) => plainKey(part) === plainKey(number)));

/** Rows are counted anew; sums of the whole paper are not of this batch. */
function fieldIn(field: string, kept: readonly number[]): string {
  const [, at, rest] = /^lines\[(\d+)\](.*)$/.exec(field) ?? [];
  if (at === undefined) return field.startsWith('qty_') ? `whole_paper.${field}` : field;
  const place = kept.indexOf(Number(at));
  return place < 0 ? `other_batch[${at}]${rest}` : `lines[${place}]${rest}`;
}
