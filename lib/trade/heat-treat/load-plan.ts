import type { Source } from '../source';
import { fewestLoads, type Partition } from './fewest-loads';
import {
  loadNeeds,
  type LoadGroup,
  type LoadNeeds,
  type LoadTables,
  type UnplacedReason,
} from './load-needs';
import { quenchDelay } from './quench-delay';
import { sharedLoad, type ApartReason, type SharedCycle } from './shared-load';

export interface PlannedLoad extends SharedCycle {
  readonly groups: readonly string[];
  /** Thickest and thinnest section in it: the one governs the soak, the other the quench delay. */
  readonly governingMm: number;
  readonly thinnestMm: number;
  /** Null where it is not quenched, or the table has no time for it. */
  readonly maxDelayS: number | null;
  readonly sources: readonly Source[];
}

export interface KeptApart {
  /** Groups that ask the same stand together on one side. */
  readonly between: readonly [readonly string[], readonly string[]];
  /** `fits_but_planned_apart`: these two could share; with what else is there, it would take no load fewer. */
  readonly reason: ApartReason | 'fits_but_planned_apart';
  readonly sources: readonly Source[];
}

export interface LoadPlan {
  /** `exact`: no plan has fewer loads. `good`: there are too many different groups to try all ways. */
  readonly method: Partition['method'];
  readonly loads: readonly PlannedLoad[];
  readonly apart: readonly KeptApart[];
  /** Left out: what the tables lack for the group, or wherein they contradict themselves about it. */
  readonly unplaced: readonly {
    readonly group: string;
    readonly reason: UnplacedReason | ApartReason;
  }[];
}

/**
 * Splits groups of aluminium parts into the fewest furnace loads that may share a cycle: solution temperature, medium,
 * quench, ageing, and a soak by the thickest section that no clad sheet in the load may not have. Says of each pair that
 * is not together why.
 *
 * Groups that ask the same count as one; up to twelve different ones the number of loads is exact. A group that the
 * tables do not reach is left out with its reason, and no load is made for it.
 *
 * @param groups at most one of each key.
 * @param uniformityC how far the furnace may be off to either side, °C; 5.56 °C is 10 °F.
 * @example planLoads(TABLES, [2024 clad 1.6 mm to T42, 7075 bare 1.6 mm to T62], 5.56) is two loads, kept apart because
 *   meet_only_above_melting_risk
 */
export function planLoads(tables: LoadTables, groups: readonly LoadGroup[], uniformityC: number): LoadPlan {
  const kinds = new Map<string, LoadNeeds[]>();
  const unplaced: LoadPlan['unplaced'][number][] = [];
  for (const group of groups) {
    const answer = loadNeeds(tables, group);
    const alone = answer.ok ? sharedLoad([answer.needs], uniformityC) : answer;
    if (answer.ok && alone.ok) {
      const kind = kindOf(answer.needs);
      kinds.set(kind, [...(kinds.get(kind) ?? []), answer.needs]);
    } else if (!alone.ok) unplaced.push({ group: group.key, reason: alone.reason });
  }
  const byKind = [...kinds.values()];
  const firsts = byKind.flatMap(([needs]) => (needs ? [needs] : []));
  const share = (together: readonly number[]) => sharedLoad(pick(firsts, together), uniformityC);
  const { method, loads } = fewestLoads(byKind.length, (together) => share(together).ok);
  const planned = loads.flatMap((together) => {
    const shared = share(together);
    return shared.ok ? [toLoad(tables, pick(byKind, together).flat(), shared.cycle)] : [];
  });
  return { method, loads: planned, apart: pairsApart(byKind, loads, share), unplaced };
}

/** Groups of one kind ask the same of a load; only thinner sections, which the quench delay looks at, may differ. */
const kindOf = ({ group, solution, ageing }: LoadNeeds): string =>
  JSON.stringify([group.process, group.medium, group.quench, solution, [...ageing.keys()]]);

function pick<Item>(items: readonly Item[], positions: readonly number[]): Item[] {
  return positions.flatMap((at) => items[at] ?? []);
}

function toLoad(tables: LoadTables, all: readonly LoadNeeds[], cycle: SharedCycle): PlannedLoad {
  const delays = all.map(({ group }) => quenchDelay(tables.quenchDelays, group));
  const seconds = delays.map((delay) => (delay.ok ? delay.maxDelayS : Infinity));
  const shortestS = Math.min(...seconds);
  const sources = [...all.flatMap((needs) => needs.sources), ...delays.flatMap(({ source }) => source ?? [])];
  return {
    ...cycle,
    groups: all.map(({ group }) => group.key),
    governingMm: Math.max(...all.map(({ group }) => group.thicknessMm)),
    thinnestMm: Math.min(...all.map(({ group }) => group.thinnestMm)),
    maxDelayS: cycle.solution && Number.isFinite(shortestS) ? shortestS : null,
    sources: [...new Set(sources)],
  };
}

function pairsApart(
  byKind: readonly (readonly LoadNeeds[])[],
  loads: readonly (readonly number[])[],
  share: (together: readonly number[]) => ReturnType<typeof sharedLoad>,
): KeptApart[] {
  const loadOf = new Map(loads.flatMap((together, load) => together.map((at) => [at, load] as const)));
  const keysOf = (kind: readonly LoadNeeds[]) => kind.map(({ group }) => group.key);
  return byKind.flatMap((kind, at) =>
    byKind.slice(at + 1).flatMap((other, further) => {
      const beside = at + 1 + further;
      if (loadOf.get(at) === loadOf.get(beside)) return [];
      const shared = share([at, beside]);
      const sources = [...new Set([...kind, ...other].flatMap((needs) => needs.sources))];
      const reason = shared.ok ? 'fits_but_planned_apart' : shared.reason;
      return [{ between: [keysOf(kind), keysOf(other)] as const, reason, sources }];
    }),
  );
}
