import type { PartTables } from '@/lib/reference/published-tables';
import { PROCESSES, type Process } from '@/lib/trade/process';
import { checkRoute } from '@/lib/trade/route/check-route';
import { repairRoute } from '@/lib/trade/route/repair-route';
import type { RouteFinding, RoutePart, RouteTables } from '@/lib/trade/route/route';

import type { MaterialOf } from './material-of';
import { routePartOf } from './route-part-of';

/** A step as its form holds it; the process is empty until it is chosen. */
export interface TypedStep {
  readonly process: string;
  readonly specification: string;
  readonly specificationRevision?: string | undefined;
  readonly classType?: string | undefined;
  readonly conditionBefore?: string | undefined;
  readonly targetCondition?: string | undefined;
}

/** A step of the proposal: one that was typed, by its place, or a new one. */
export type RepairedStep =
  { readonly is: 'typed'; readonly at: number } | { readonly is: 'new'; readonly process: Process };

export interface CheckedRoute {
  /** Places are those of the form, from 0. */
  readonly findings: readonly RouteFinding[];
  /** Null where there is nothing that moving or inserting steps puts right. */
  readonly repaired: readonly RepairedStep[] | null;
}

/**
 * What the rules of the trade have against a route that is being typed, and the route they propose. Steps without a
 * process are left out of the check and stay at the end of the proposal. A material that is not known checks nothing.
 */
export function checkTypedRoute(
  tables: Pick<PartTables, 'route' | 'phConditions'>,
  of: MaterialOf,
  endCondition: string,
  typed: readonly TypedStep[],
): CheckedRoute {
  if (of.known !== 'yes') return { findings: [], repaired: null };
  return checkTypedSteps(tables.route, routePartOf(tables.phConditions, of.material, endCondition), typed);
}

/** The same for a part of which everything that the rules ask for is said. */
export function checkTypedSteps(
  tables: RouteTables,
  part: RoutePart,
  typed: readonly TypedStep[],
): CheckedRoute {
  const route = typed.flatMap((step, at) => {
    const process = PROCESSES.find((one) => one === step.process);
    return process ? [{ ...step, process, revision: step.specificationRevision, at }] : [];
  });
  const found = checkRoute(tables, route, part);
  const findings = found.map((finding) => ({
    ...finding,
    steps: finding.steps.flatMap((step) => route[step]?.at ?? []),
  }));
  if (!found.some(({ repair }) => repair)) return { findings, repaired: null };
  const repair = repairRoute(tables, route, part);
  const steps = repair.route.map((step): RepairedStep => {
    const known = route.find((one) => one === step);
    return known ? { is: 'typed', at: known.at } : { is: 'new', process: step.process };
  });
  const open = typed.flatMap((_, at): RepairedStep[] =>
    route.some((step) => step.at === at) ? [] : [{ is: 'typed', at }],
  );
  return { findings, repaired: [...steps, ...open] };
}
