import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { OldNameRow } from '../tables/old-names';
import type { Verdict } from '../verdict';

export interface PresentName {
  /** What it may be today. Empty: only the family is known. More than one: the old name does not say which. */
  readonly present: readonly string[];
  readonly note?: NameRow['note'];
  /** The ink mark or the trade name says that it is clad. */
  readonly clad: boolean;
  /** What the number says by the former rule of families. */
  readonly chiefElement?: string;
  readonly prefix?: 'development' | 'experimental' | 'modified';
  /** Never absent: no table can decide that a present material may stand in for an old one. */
  readonly caution: 'equivalence_is_an_engineering_decision';
}

type NameRow = Extract<OldNameRow, { kind: 'name' }>;
type RowOf<Kind extends OldNameRow['kind']> = Extract<OldNameRow, { kind: Kind }> & {
  readonly source: Source;
};

/**
 * What a former name of an aluminium alloy is called today: `24S`, `24ST ALC`, `17S-T`, `52S-1/2H`, `R301`, `X76S`.
 *
 * An alloy that the table has by name is answered with a temper only when that temper is in the table too. A number
 * that it does not have is answered with the chief alloying element alone.
 *
 * @returns refused as `not_a_former_name` when it is not written like one.
 * @example presentName(OLD_NAMES, '24S-T') is 2024-T3 or 2024-T42: ask who treated it
 */
export function presentName(
  table: Table<OldNameRow>,
  written: string,
): Verdict<PresentName, 'not_a_former_name' | 'temper_not_in_table'> {
  const mark = rowsOf(table, 'mark').find((row) => new RegExp(`\\b${row.written}\\b`, 'i').test(written));
  const clad = mark !== undefined || /\b(?:alclad|clad)\b/i.test(written);
  const plain = written.replace(/\b(?:alclad|clad|alc)\b/gi, '').replace(/\s+/g, '');
  const [, letters = '', number, temper] = /^([A-Z]?)(\d{1,2})S-?(.*)$/i.exec(plain) ?? [];
  const key = number === undefined ? plain : `${letters}${number}S${temper ? `-${temper}` : ''}`;
  const named = rowsOf(table, 'name').find(({ old }) => old.toUpperCase() === key.toUpperCase());
  if (!named && number === undefined) return { ok: false, reason: 'not_a_former_name' };
  const series = number === undefined ? undefined : seriesOf(table, Number(number));
  if (!named && temper)
    return { ok: false, reason: 'temper_not_in_table', ...(series && { source: series.source }) };
  const prefix = named ? undefined : rowsOf(table, 'prefix').find((row) => isIn(letters, row.letters));
  const grounds = mark && named ? mark : (named ?? prefix ?? series);
  if (!grounds) return { ok: false, reason: 'not_a_former_name' };
  return {
    ok: true,
    present: named?.present ?? [],
    clad: clad || (named?.present.some((present) => present.startsWith('Alclad')) ?? false),
    caution: 'equivalence_is_an_engineering_decision',
    ...(named?.note && { note: named.note }),
    ...(series && { chiefElement: series.element }),
    ...(prefix && { prefix: prefix.means }),
    source: grounds.source,
    readFrom: referenceTo(table),
  };
}

const isIn = (letter: string, letters: string) => letter !== '' && letters.includes(letter.toUpperCase());

/** The rule of families holds for numbers with two digits and for the manganese alloys below 10. */
const seriesOf = (table: Table<OldNameRow>, number: number) =>
  rowsOf(table, 'series').find(({ from, to }) => number >= from && number <= to);

const rowsOf = <Kind extends OldNameRow['kind']>(table: Table<OldNameRow>, kind: Kind): RowOf<Kind>[] =>
  table.rows.filter((row): row is RowOf<Kind> => row.kind === kind);
