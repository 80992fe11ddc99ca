import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

/** Special levels for costly or destructive tests, general levels for the rest; II unless the order says otherwise. */
export const INSPECTION_LEVELS = ['S1', 'S2', 'S3', 'S4', 'I', 'II', 'III'] as const;
export type InspectionLevel = (typeof INSPECTION_LEVELS)[number];

/** Letters as the tables print them: I and O are left out. */
export const SAMPLE_LETTERS = [
  'A',
  'B',
  'C',
  'D',
  'E',
  'F',
  'G',
  'H',
  'J',
  'K',
  'L',
  'M',
  'N',
  'P',
  'Q',
  'R',
] as const;
export type SampleLetter = (typeof SAMPLE_LETTERS)[number];

export interface CodeLetterRow {
  readonly lotFrom: number;
  /** Null in the last row, which has no upper end. */
  readonly lotTo: number | null;
  readonly letters: Readonly<Record<InspectionLevel, SampleLetter>>;
}

/**
 * The code letter of a sample.
 *
 * @param table the printed table of lot sizes against inspection levels.
 * @param lotSize pieces in the lot, a whole number from the table's first row on (2).
 * @returns the letter; refused as `lot_not_whole` or `lot_smaller_than_table` (one piece is inspected, not sampled).
 * @example a lot of 60 at level II has the letter E (MIL-STD-105E Table I).
 */
export function codeLetter(
  table: Table<CodeLetterRow>,
  lotSize: number,
  level: InspectionLevel,
): Verdict<{ letter: SampleLetter }, 'lot_not_whole' | 'lot_smaller_than_table' | 'lot_larger_than_table'> {
  if (!Number.isSafeInteger(lotSize)) return { ok: false, reason: 'lot_not_whole' };
  const row = table.rows.find(({ lotFrom, lotTo }) => lotSize >= lotFrom && lotSize <= (lotTo ?? Infinity));
  if (row) return { ok: true, letter: row.letters[level], source: row.source, readFrom: referenceTo(table) };
  const smallest = Math.min(...table.rows.map(({ lotFrom }) => lotFrom));
  return { ok: false, reason: lotSize < smallest ? 'lot_smaller_than_table' : 'lot_larger_than_table' };
}
