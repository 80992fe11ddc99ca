import { referenceTo, type Table } from '../table';
import type { FinishDefaultRow } from '../tables/finish-defaults';
import type { Verdict } from '../verdict';
import { calledRevision, type CalledDocument } from './called-revision';

export interface PassivationAsOrdered {
  readonly acids: readonly ('nitric' | 'citric')[];
  /** AMS 2700 method for each acid, in the same order. */
  readonly methods: readonly string[];
  /** AMS 2700 class of the acceptance test. */
  readonly testClass: string;
}

/**
 * Which acids an order to the old QQ-P-35 lets the processor use.
 *
 * Worked example: QQ-P-35 asks for nitric acid, AMS 2700 method 1, tested to class 4. Citric acid, method 2, only where
 * engineering has allowed it in writing.
 */
export function passivationAsOrdered(
  defaults: Table<FinishDefaultRow>,
  ordered: CalledDocument & { readonly engineeringAllowsCitric: boolean },
): Verdict<PassivationAsOrdered, 'specification_not_in_table'> {
  const row = defaults.rows.find(
    (candidate) =>
      candidate.rule === 'passivation_acid' &&
      candidate.specifications.some((one) => calledRevision(one, ordered) !== null),
  );
  if (row?.rule !== 'passivation_acid') return { ok: false, reason: 'specification_not_in_table' };
  return {
    ok: true,
    acids: ordered.engineeringAllowsCitric ? [row.acid, 'citric'] : [row.acid],
    methods: ordered.engineeringAllowsCitric ? [row.method, '2'] : [row.method],
    testClass: row.testClass,
    source: row.source,
    readFrom: referenceTo(defaults),
  };
}
