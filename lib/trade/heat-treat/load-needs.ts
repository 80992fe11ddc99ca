import type { Alloy } from '../alloys/alloy';
import type { Process, ProductForm } from '../process';
import type { Source } from '../source';
import type { Table } from '../table';
import type { AgeingRow } from '../tables/ageing-cycles';
import type { MeltingRow } from '../tables/melting';
import type { QuenchDelayRow } from '../tables/quench-delays';
import type { QuenchMedium } from '../tables/quench-media';
import type { FurnaceMedium, SoakRow } from '../tables/soak-times';
import type { SolutionRow } from '../tables/solution-temperatures';
import type { Temper } from '../tempers/temper';
import { ageingCycles, type AgeingCycle, type AgeingCycles } from './ageing-cycle';
import { requiredSoak } from './required-soak';
import { usableRange, type UsableRange } from './usable-range';

/** The tables that loads are planned from; a shop's own edition of any of them may stand in. */
export interface LoadTables {
  readonly solution: Table<SolutionRow>;
  readonly melting: Table<MeltingRow>;
  readonly soak: Table<SoakRow>;
  readonly quenchDelays: Table<QuenchDelayRow>;
  readonly ageing: Table<AgeingRow>;
}

export type LoadProcess = Extract<
  Process,
  'solution_heat_treat' | 'solution_heat_treat_and_age' | 'artificial_age'
>;

/** Pieces that stay together, such as a line of a batch. */
export interface LoadGroup {
  readonly key: string;
  readonly alloy: Alloy;
  readonly form: ProductForm;
  readonly clad: boolean;
  /** Thickest section: it governs the soak. */
  readonly thicknessMm: number;
  /** Thinnest section: it governs the quench delay. */
  readonly thinnestMm: number;
  readonly from: Temper;
  readonly to: Temper;
  readonly process: LoadProcess;
  readonly medium: FurnaceMedium;
  readonly quench: QuenchMedium;
}

/** What a group asks of a load. Nothing of the solution treatment where it is aged only. */
export interface LoadNeeds {
  readonly group: LoadGroup;
  readonly solution: (UsableRange & { readonly soakMin: number; readonly longestMin: number | null }) | null;
  /** Cycles that would do, by what distinguishes them; one entry without a cycle where no oven is needed. */
  readonly ageing: ReadonlyMap<string, AgeingCycle | null>;
  readonly sources: readonly Source[];
}

export type UnplacedReason =
  | 'alloy_not_in_table'
  | 'form_not_in_table'
  | 'no_range_in_table'
  | 'thickness_not_positive'
  | 'thicker_than_table'
  | 'no_ageing_cycle_in_table';

export type NeedsVerdict =
  | { readonly ok: true; readonly needs: LoadNeeds }
  | { readonly ok: false; readonly reason: UnplacedReason; readonly source?: Source };

const NO_OVEN = 'no oven';

/** What a group asks of a load, or why it cannot be planned at all. */
export function loadNeeds(tables: LoadTables, group: LoadGroup): NeedsVerdict {
  const ageing = ageingOf(tables, group);
  if (!ageing.ok) return ageing;
  const rests = ageing.cycles.map(({ source }) => source);
  const byKey = new Map<string, AgeingCycle | null>(ageing.cycles.map((cycle) => [keyOf(cycle), cycle]));
  if (byKey.size === 0) byKey.set(NO_OVEN, null);
  if (group.process === 'artificial_age')
    return { ok: true, needs: { group, solution: null, ageing: byKey, sources: rests } };

  const { form } = group;
  if (form === 'casting') return { ok: false, reason: 'form_not_in_table' };
  const range = usableRange(tables, { ...group, form });
  if (!range.ok) return range;
  const soak = requiredSoak(tables.soak, group);
  if (!soak.ok) return soak;
  const { printedC, usableC } = range;
  const solution = { printedC, usableC, soakMin: soak.soakMin, longestMin: soak.longestMin };
  return {
    ok: true,
    needs: { group, solution, ageing: byKey, sources: [range.source, soak.source, ...rests] },
  };
}

type AgeingOfGroup =
  | Extract<AgeingCycles, { ok: true }>
  | { readonly ok: false; readonly reason: 'no_ageing_cycle_in_table'; readonly source?: Source };

/** Quenched metal is aged as it is, or after it has settled to T42. */
function ageingOf({ ageing }: LoadTables, group: LoadGroup): AgeingOfGroup {
  if (group.process === 'solution_heat_treat') return { ok: true, cycles: [] };
  const starts: readonly Temper[] = group.process === 'artificial_age' ? [group.from] : ['AQ', 'T42'];
  const found = starts.map((from) => ageingCycles(ageing, { ...group, from }));
  const cycles = found.flatMap((answer) => (answer.ok ? answer.cycles : []));
  if (cycles.length > 0) return { ok: true, cycles: cycles.filter(({ kind }) => kind !== 'natural') };
  const [source] = found.flatMap((answer) => (answer.ok ? [] : (answer.source ?? [])));
  return { ok: false, reason: 'no_ageing_cycle_in_table', ...(source && { source }) };
}

/** Two cycles are one when an oven cannot tell them apart: set points and holds as they are nominally run. */
const keyOf = ({ holds }: AgeingCycle): string =>
  holds
    .map(({ setC, holdMin, nominalMin }) => {
      const hold = nominalMin === undefined ? holdMin?.join('-') : `${nominalMin}-${nominalMin}`;
      return `${setC.map((setPoint) => setPoint.toFixed(1)).join('-')} °C ${hold ?? '?'} min`;
    })
    .join(', then ');
