import type { Alloy } from '../alloys/alloy';
import type { Table } from '../table';
import type { MeltingRow } from '../tables/melting';
import type { HeatTreatForm, SolutionRow } from '../tables/solution-temperatures';
import type { Verdict } from '../verdict';
import { overheatingMargin } from './overheating-margin';
import { solutionRange } from './solution-range';

export interface UsableRange {
  readonly printedC: readonly [number, number];
  /** What is left for a load that nobody looked at piece by piece. */
  readonly usableC: readonly [number, number];
}

/**
 * The part of a printed solution range that a load plan may use, in °C.
 *
 * Printed ranges of 7075 and 7178 sheet go on above the temperature at which metal that is not homogeneous melts. That
 * part is for thin sheet which a processor knows; to plan with it would put 7075 into a furnace with 2024, since
 * 860–930 °F and 910–930 °F meet on paper.
 *
 * @example usableRange({solution: SOLUTION_TEMPERATURES, melting: MELTING}, 7075 sheet) ends at 900 °F, printed 930 °F
 */
export function usableRange(
  tables: { readonly solution: Table<SolutionRow>; readonly melting: Table<MeltingRow> },
  material: { readonly alloy: Alloy; readonly form: HeatTreatForm; readonly clad: boolean },
): Verdict<UsableRange, 'alloy_not_in_table' | 'form_not_in_table' | 'no_range_in_table'> {
  const range = solutionRange(tables.solution, material);
  if (!range.ok) return range;
  const { rangeC, meltingRiskAboveC = Infinity, cladHighC = Infinity, source, readFrom } = range;
  if (!rangeC) return { ok: false, reason: 'no_range_in_table', source };
  const [low, high] = rangeC;
  const margin = overheatingMargin(tables.melting, { alloy: material.alloy, temperatureC: high });
  const meltsC = margin.ok ? high + margin.homogeneousMarginC : Infinity;
  const usableHigh = Math.min(high, meltingRiskAboveC, material.clad ? cladHighC : Infinity, meltsC);
  return {
    ok: true,
    printedC: rangeC,
    usableC: [low, usableHigh],
    source,
    ...(readFrom && { readFrom }),
  };
}
