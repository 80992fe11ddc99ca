import type { Process } from '../process';
import { referenceTo, type Table } from '../table';
import type { CladReheatRow } from '../tables/clad-reheats';
import { isHeatTreated, type Temper } from '../tempers/temper';
import type { Verdict } from '../verdict';
import { isBelow, isUpTo, printedInches } from './thickness-row';

/** What was done to the metal since it was bought, in order; only solution treatments count. */
export interface CladHistory {
  readonly boughtAs: Temper;
  readonly done: readonly Process[];
}

export interface ReheatStanding {
  readonly solutionTreatments: number;
  readonly reheats: number;
  /** What the document counts so far, and how far it may go. */
  readonly counted: number;
  readonly max: number;
  /** Whether it may be solution treated once more. */
  readonly next: 'allowed' | 'allowed_for_the_last_time' | 'needs_engineering_approval' | 'used_up';
}

/** Solution treatments so far, the mill's included, and how many of them were re-heat-treatments. */
export function countReheats({ boughtAs, done }: CladHistory): {
  solutionTreatments: number;
  reheats: number;
} {
  const shop = done.filter(
    (process) => process === 'solution_heat_treat' || process === 'solution_heat_treat_and_age',
  ).length;
  const mill = isHeatTreated(boughtAs) ? 1 : 0;
  return { solutionTreatments: mill + shop, reheats: Math.max(0, mill + shop - 1) };
}

/**
 * How often clad sheet may still be solution treated: every treatment drives the core's copper further through the
 * cladding.
 *
 * The first treatment of sheet bought heat treated is already a re-heat-treatment. Annealing and ageing do not count,
 * and annealing does not set the count back: the copper stays where it went. Documents differ in number and in what
 * they count; the one on the order decides, and the strictest, MIL-H-6088G, where none is named.
 *
 * @param lot thickness of the sheet in mm, more than 0, and its history.
 * @example cladReheats(CLAD_REHEATS_MIL, {thicknessMm: 1.6, history: {boughtAs: 'T3', done: []}}) has 0 of 1 and may be
 *   treated for the last time
 */
export function cladReheats(
  table: Table<CladReheatRow>,
  lot: { readonly thicknessMm: number; readonly history: CladHistory },
): Verdict<ReheatStanding, 'thickness_not_positive' | 'not_in_table'> {
  const inches = printedInches(lot.thicknessMm);
  if (inches === null) return { ok: false, reason: 'thickness_not_positive' };
  const row = table.rows.find(({ limitIn, includesLimit }) => {
    if (limitIn === null) return true;
    return includesLimit ? isUpTo(inches, limitIn) : isBelow(inches, limitIn);
  });
  if (!row) return { ok: false, reason: 'not_in_table' };
  const { solutionTreatments, reheats } = countReheats(lot.history);
  const counted = row.counts === 'reheats' ? reheats : solutionTreatments;
  // The first treatment of annealed sheet is no re-heat-treatment.
  const afterNext = row.counts === 'reheats' && solutionTreatments === 0 ? 0 : counted + 1;
  return {
    ok: true,
    solutionTreatments,
    reheats,
    counted,
    max: row.max,
    next: nextOf(row, afterNext),
    source: row.source,
    readFrom: referenceTo(table),
  };
}

function nextOf({ max, maxWithApproval = max }: CladReheatRow, afterNext: number): ReheatStanding['next'] {
  if (afterNext > maxWithApproval) return 'used_up';
  if (afterNext > max) return 'needs_engineering_approval';
  return afterNext === max ? 'allowed_for_the_last_time' : 'allowed';
}
