import type { Source } from '../source';
import { rowsOutOfOrder } from './rows-out-of-order';
import type { HardnessScale, HardnessTable } from './hardness-table';

/** A value that a table was asked for stands on a row when it is this near; printed steps are ten thousand times wider. */
const ON_A_ROW = 1e-6;

export type Column = HardnessScale | 'tensileKsi';

export type ReadReason =
  | 'value_not_a_number'
  | 'scale_not_in_table'
  | 'below_table'
  | 'above_table'
  | 'not_printed_in_list'
  | 'row_out_of_order';

export type Reading =
  | {
      readonly ok: true;
      readonly value: number;
      readonly isBetweenRows: boolean;
      readonly isInBrackets: boolean;
      readonly source: Source;
    }
  | { readonly ok: false; readonly reason: ReadReason; readonly source?: Source };

interface Point {
  readonly row: HardnessTable['rows'][number];
  readonly at: number;
  readonly value: number;
  readonly isInBrackets: boolean;
  readonly source: Source;
}

/**
 * Reads one column of a conversion table by another, on a straight line between neighbouring rows.
 *
 * Rows that break the order of a column are misprints until somebody has looked; they are not read.
 */
export function readBetween(table: HardnessTable, from: Column, value: number, to: Column): Reading {
  if (!Number.isFinite(value)) return { ok: false, reason: 'value_not_a_number' };
  const { points, misprints } = columnsOf(table, from, to);
  const [softest] = points;
  const hardest = points.at(-1);
  if (!softest || !hardest) return { ok: false, reason: 'scale_not_in_table' };
  if (value < softest.at - ON_A_ROW) return { ok: false, reason: 'below_table', source: softest.source };
  if (value > hardest.at + ON_A_ROW) return { ok: false, reason: 'above_table', source: hardest.source };

  const above = points.find((point) => point.at >= value - ON_A_ROW) ?? hardest;
  const isBetweenRows = Math.abs(above.at - value) > ON_A_ROW;
  const below = isBetweenRows ? (points[points.indexOf(above) - 1] ?? above) : above;
  if (misprints.has(above.row) || misprints.has(below.row))
    return { ok: false, reason: 'row_out_of_order', source: above.source };
  if (!isBetweenRows)
    return {
      ok: true,
      value: above.value,
      isBetweenRows,
      isInBrackets: above.isInBrackets,
      source: above.source,
    };
  if (!table.readsBetweenRows) return { ok: false, reason: 'not_printed_in_list', source: above.source };

  const share = (value - below.at) / (above.at - below.at);
  return {
    ok: true,
    value: below.value + share * (above.value - below.value),
    isBetweenRows,
    isInBrackets: below.isInBrackets || above.isInBrackets,
    source: lessSure(below.source, above.source),
  };
}

interface Columns {
  readonly points: readonly Point[];
  readonly misprints: ReadonlySet<Point['row']>;
}

/** A route asks the same columns of the same table for every rule of every plated step. */
const KNOWN = new WeakMap<HardnessTable, Map<string, Columns>>();

function columnsOf(table: HardnessTable, from: Column, to: Column): Columns {
  const known = KNOWN.get(table) ?? new Map<string, Columns>();
  KNOWN.set(table, known);
  const found = known.get(`${from} ${to}`);
  if (found) return found;
  const misprints = [...rowsOutOfOrder(table, from), ...rowsOutOfOrder(table, to)];
  const columns = { points: pointsOf(table, from, to), misprints: new Set(misprints.map(({ row }) => row)) };
  known.set(`${from} ${to}`, columns);
  return columns;
}

/** Softest first. */
function pointsOf({ rows }: HardnessTable, from: Column, to: Column): Point[] {
  return rows
    .flatMap((row): Point[] => {
      const at = row[from];
      const value = row[to];
      if (at === undefined || value === undefined) return [];
      const bracketed: readonly Column[] = row.inBrackets ?? [];
      return [
        {
          row,
          at,
          value,
          isInBrackets: bracketed.includes(from) || bracketed.includes(to),
          source: row.source,
        },
      ];
    })
    .sort((a, b) => a.at - b.at);
}

const lessSure = (a: Source, b: Source): Source => (b.confidence === 'memory' ? b : a);
