import { referenceTo, type Table } from '../table';
import type { PassivationTestRow } from '../tables/passivation-tests';
import type { Verdict } from '../verdict';

/**
 * The test of a passivated lot that the words of an order name, by the letter of the practice or by what it is.
 *
 * @param typed what the order says behind the specification's number.
 * @returns refused as `test_not_stated`: then the order has to name one, it is not guessed.
 * @example `nitric 2, practice A` is the water immersion test; `nitric 2` names none
 */
export function passivationTest(
  table: Table<PassivationTestRow>,
  typed: string,
): Verdict<PassivationTestRow, 'test_not_stated'> {
  const [, letter] = /\bpractice\s*([A-D])\b/i.exec(typed) ?? [];
  const text = typed.toLowerCase().replace('sulphate', 'sulfate');
  const row = table.rows.find(({ practice, says }) =>
    letter === undefined ? text.includes(says) : practice === letter.toUpperCase(),
  );
  if (!row) return { ok: false, reason: 'test_not_stated' };
  const { practice, says, source } = row;
  return { ok: true, practice, says, source, readFrom: referenceTo(table) };
}
