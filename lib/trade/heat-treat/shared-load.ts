import type { AgeingCycle } from './ageing-cycle';
import type { LoadNeeds } from './load-needs';

type Span = readonly [number, number];

/** What a load is run at so that it suits all in it; nothing of the solution treatment where it is aged only. */
export interface SharedCycle {
  readonly solution: {
    readonly temperatureC: Span;
    readonly soakMin: number;
    readonly longestMin: number | null;
  } | null;
  readonly ageing: readonly AgeingCycle[];
}

export type ApartReason =
  | 'process_differs'
  | 'medium_differs'
  | 'quench_differs'
  | 'temperatures_do_not_meet'
  /** On paper they meet, in a part of a range where one of them may melt. */
  | 'meet_only_above_melting_risk'
  /** They meet, but in less than the furnace keeps to. */
  | 'overlap_narrower_than_furnace'
  | 'ageing_differs'
  | 'clad_would_soak_too_long';

export type Shared =
  { readonly ok: true; readonly cycle: SharedCycle } | { readonly ok: false; readonly reason: ApartReason };

/** What is left of binary fractions when °F become °C. */
const NOTHING_C = 1e-9;

/**
 * Whether groups may share a load, and how it is run then.
 *
 * A range is met when the furnace, with its uniformity both ways, stays inside all ranges; of a range that is narrower
 * than that by itself no more than itself is asked. The thickest section governs the soak, and no clad metal may soak
 * longer than its own longest time.
 *
 * @param uniformityC how far the furnace may be off to either side, °C; 5.56 °C is 10 °F.
 */
export function sharedLoad(all: readonly LoadNeeds[], uniformityC: number): Shared {
  const apart = (reason: ApartReason) => ({ ok: false, reason }) as const;
  if (differ(all, ({ solution }) => solution === null)) return apart('process_differs');
  const treated = all.flatMap(({ solution }) => (solution ? [solution] : []));
  const isTreated = treated.length > 0;
  if (isTreated && differ(all, ({ group }) => group.medium)) return apart('medium_differs');
  if (isTreated && differ(all, ({ group }) => group.quench)) return apart('quench_differs');

  const usable = treated.map(({ usableC }) => usableC);
  const needsC = Math.max(0, Math.min(2 * uniformityC, ...usable.map(widthOf)));
  if (isTreated && widthOf(common(usable)) < needsC - NOTHING_C)
    return apart(
      whyNotMet(
        treated.map(({ printedC }) => printedC),
        needsC,
      ),
    );

  const keys = [...(all[0]?.ageing.keys() ?? [])].filter((key) => all.every(({ ageing }) => ageing.has(key)));
  if (keys.length === 0) return apart('ageing_differs');

  const soakMin = Math.max(...treated.map((solution) => solution.soakMin));
  const longest = Math.min(...treated.map(({ longestMin }) => longestMin ?? Infinity));
  if (soakMin > longest) return apart('clad_would_soak_too_long');
  const longestMin = Number.isFinite(longest) ? longest : null;
  const solution = isTreated ? { temperatureC: common(usable), soakMin, longestMin } : null;
  const ageing = keys.flatMap((key) => all[0]?.ageing.get(key) ?? []);
  return { ok: true, cycle: { solution, ageing } };
}

const differ = (all: readonly LoadNeeds[], ask: (needs: LoadNeeds) => unknown): boolean =>
  new Set(all.map(ask)).size > 1;

const widthOf = ([low, high]: Span): number => high - low;

const common = (spans: readonly Span[]): Span => [
  Math.max(...spans.map(([low]) => low)),
  Math.min(...spans.map(([, high]) => high)),
];

function whyNotMet(printed: readonly Span[], needsC: number): ApartReason {
  const overlapC = widthOf(common(printed));
  if (overlapC >= needsC - NOTHING_C) return 'meet_only_above_melting_risk';
  return overlapC > NOTHING_C ? 'overlap_narrower_than_furnace' : 'temperatures_do_not_meet';
}
