import type { Verdict } from '../verdict';
import type { HardnessTable } from './hardness-table';

/**
 * The same question asked of every published list: the answers, in the order of the lists, and how far apart they
 * lie in the unit of the answer. Lists that cannot answer are left out; with no answer there is no spread.
 *
 * Worked example: the tensile strength at HRC 50 is 255 ksi by one list and 235 ksi by another.
 */
export function readEachList<Value>(
  tables: readonly HardnessTable[],
  read: (table: HardnessTable) => Verdict<Value, string>,
  numberIn: (answer: Value) => number,
): { answers: Extract<Verdict<Value, string>, { ok: true }>[]; spread: number | null } {
  const answers = tables.map(read).filter((answer) => answer.ok);
  const numbers = answers.map(numberIn);
  return { answers, spread: numbers.length === 0 ? null : Math.max(...numbers) - Math.min(...numbers) };
}
