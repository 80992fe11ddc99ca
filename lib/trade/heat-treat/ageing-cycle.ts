import type { Alloy } from '../alloys/alloy';
import type { ProductForm } from '../process';
import type { Source } from '../source';
import { referenceTo, type Table, type TableReference } from '../table';
import type { AgeingRow, AgeingStep } from '../tables/ageing-cycles';
import { isSameState } from '../tempers/condition-graph';
import type { Temper } from '../tempers/temper';
import { celsiusFromFahrenheit } from '../units/temperature';
import { minFromHours } from '../units/time';

type Span = readonly [number, number];

export interface AgeingHold {
  readonly setC: Span;
  readonly limitsC?: Span;
  /** Absent where the source gives the temperature alone. */
  readonly holdMin?: Span;
  readonly nominalMin?: number;
}

export interface AgeingCycle {
  readonly kind: 'natural' | 'artificial' | 'two_step' | 'second_step';
  /** One or two holds in an oven; none for natural ageing. */
  readonly holds: readonly AgeingHold[];
  /** Natural ageing: time at room temperature before the metal is tested. */
  readonly naturalMin?: number;
  readonly source: Source;
  readonly readFrom: TableReference;
}

export type AgeingCycles =
  | { readonly ok: true; readonly cycles: readonly AgeingCycle[] }
  | { readonly ok: false; readonly reason: 'not_in_table' | 'form_not_in_table'; readonly source?: Source };

/**
 * The ageing treatments that bring an alloy from one condition into another: more than one where the table offers a
 * choice, or where specifications differ; each says which it is from.
 *
 * @returns refused as `form_not_in_table` where the table ages other product forms of the alloy so, but not this one.
 * @example ageingCycles(AGEING_CYCLES, {alloy: '6061', form: 'sheet', from: 'T4', to: 'T6'}) is 18 h at 320 °F or 8 h at
 *   350 °F, in °C and minutes
 */
export function ageingCycles(
  table: Table<AgeingRow>,
  asked: { readonly alloy: Alloy; readonly form: ProductForm; readonly from: Temper; readonly to: Temper },
): AgeingCycles {
  const rows = table.rows.filter(
    ({ alloys, changes }) =>
      alloys.includes(asked.alloy) &&
      changes.some(([from, to]) => isSameState(from, asked.from) && to === asked.to),
  );
  const ofForm = rows.filter(({ forms }) => forms?.includes(asked.form) ?? true);
  if (ofForm.length > 0) return { ok: true, cycles: ofForm.map((row) => toCycle(row, referenceTo(table))) };
  const other = rows[0];
  return other
    ? { ok: false, reason: 'form_not_in_table', source: other.source }
    : { ok: false, reason: 'not_in_table' };
}

function toCycle(
  { cycle, source }: AgeingRow & { readonly source: Source },
  readFrom: TableReference,
): AgeingCycle {
  if (cycle.kind === 'natural')
    return { kind: 'natural', holds: [], naturalMin: minFromHours(cycle.hours), source, readFrom };
  return { kind: cycle.kind, holds: cycle.steps.map(toHold), source, readFrom };
}

const toHold = ({ setF, limitsF, hours, nominalHours }: AgeingStep): AgeingHold => ({
  setC: inCelsius(setF),
  ...(limitsF && { limitsC: inCelsius(limitsF) }),
  ...(hours && { holdMin: [minFromHours(hours[0]), minFromHours(hours[1])] }),
  ...(nominalHours !== undefined && { nominalMin: minFromHours(nominalHours) }),
});

const inCelsius = ([from, to]: Span): Span => [celsiusFromFahrenheit(from), celsiusFromFahrenheit(to)];
