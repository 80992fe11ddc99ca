import { hydrogenReports } from './hydrogen-reports';
import { materialReports } from './material-reports';
import { needsOfPlating } from './needs-of-plating';
import { orderReports } from './order-reports';
import type { Report, RouteFinding, RoutePart, RouteStep, RouteTables } from './route';

/**
 * What the rules of the trade have against a route of outside steps, blockers first, then by place in the route.
 *
 * Each finding names its rule, how hard it is, where it comes from, and whether `repairRoute` has an answer. An empty
 * list says that no rule here objects; the drawing and the specifications may still.
 * Worked example: cadmium to QQ-P-416 F on steel of HRC 42 with nothing after it: the bake is missing, a blocker.
 */
export function checkRoute(
  tables: RouteTables,
  route: readonly RouteStep[],
  part: RoutePart,
): RouteFinding[] {
  const needs = needsOfPlating(tables, route, part);
  const reports = [
    ...orderReports(route, part, needs),
    ...hydrogenReports(tables, route, part, needs),
    ...materialReports(tables, route, part),
  ];
  return reports
    .flatMap((report) => findingOf(tables, report))
    .sort((a, b) => RANK[a.severity] - RANK[b.severity] || (a.steps[0] ?? 0) - (b.steps[0] ?? 0));
}

const RANK = { blocker: 0, warning: 1, note: 2 } as const;

/** A shop's edition of the rules that leaves a rule out switches it off. */
function findingOf({ order }: RouteTables, report: Report): RouteFinding[] {
  const row = order.rows.find(({ rule }) => rule === report.rule);
  return row ? [{ ...report, severity: row.severity, source: row.source }] : [];
}
