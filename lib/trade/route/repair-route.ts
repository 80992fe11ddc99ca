import { checkRoute } from './check-route';
import { needsOfPlating, type PlatingNeeds } from './needs-of-plating';
import { isFluorescentPenetrant, isGlued, isVisiblePenetrant, SURFACE_METHODS } from './order-reports';
import type { RouteFinding, RoutePart, RouteStep, RouteTables } from './route';
import {
  isBake,
  isCover,
  isElectroplate,
  isFinish,
  isHeatTreatment,
  isHot,
  isPeening,
  isPlating,
  isSolution,
} from './step-kinds';

export interface RepairedRoute<Step extends RouteStep> {
  readonly route: readonly (Step | RouteStep)[];
  /** Steps that were not there; people choose their specification and say what must be proved. */
  readonly inserted: readonly RouteStep[];
  /** What is left: nothing that a repair exists for. */
  readonly findings: readonly RouteFinding[];
}

/**
 * Proposes a route in which nothing is left that can be put right by moving or inserting steps. Steps keep their order
 * wherever no rule asks for another one. A route with nothing to repair comes back as it is.
 *
 * Worked example: cadmium, magnetic particle on steel of HRC 42 becomes magnetic particle, cadmium, embrittlement relief.
 */
export function repairRoute<Step extends RouteStep>(
  tables: RouteTables,
  route: readonly Step[],
  part: RoutePart,
): RepairedRoute<Step> {
  const findings = checkRoute(tables, route, part);
  if (!findings.some(({ repair }) => repair)) return { route, inserted: [], findings };
  const needs = needsOfPlating(tables, route, part);
  const items = itemsOf(route, needs);
  const repaired = inOrder(items).flatMap(({ steps }) => steps);
  return {
    route: repaired,
    inserted: repaired.filter((step) => !route.some((known) => known === step)),
    findings: checkRoute(tables, repaired, part),
  };
}

interface Item<Step> {
  /** A plated step with the bake that belongs to it, or one step. */
  readonly steps: readonly (Step | RouteStep)[];
  readonly head: RouteStep;
  /** Which inspection or ageing it is, where only one of several is bound. */
  readonly role?: 'final_inspection' | 'inspection_after_plating' | 'final_ageing';
}

function itemsOf<Step extends RouteStep>(
  route: readonly Step[],
  needs: readonly PlatingNeeds[],
): Item<Step>[] {
  const bakes = bakesByPlating(route, needs);
  const taken = new Set([...bakes.values()].filter((bake) => bake !== undefined));
  const roles = rolesOf(route, needs);
  const items = route.flatMap((step, at): Item<Step>[] => {
    if (taken.has(at)) return [];
    const role = roles.get(at);
    if (!bakes.has(at)) return [{ steps: [step], head: step, ...(role && { role }) }];
    const bake = bakes.get(at);
    return [
      {
        steps: [step, (bake === undefined ? undefined : route[bake]) ?? blank('embrittlement_relief')],
        head: step,
      },
    ];
  });
  if (
    needs.some(({ needsStressRelief }) => needsStressRelief) &&
    !route.some(({ process }) => process === 'stress_relief')
  )
    items.push(itemOf(blank('stress_relief')));
  const isMissing = ![...roles.values()].includes('inspection_after_plating');
  const inspection = route.find(({ process }) => process === 'magnetic_particle');
  if (inspection && isMissing && needs.some(({ needsBothInspections }) => needsBothInspections))
    items.push({ ...itemOf({ ...inspection }), role: 'inspection_after_plating' });
  return items;
}

const itemOf = (step: RouteStep): Item<never> => ({ steps: [step], head: step });

const blank = (process: RouteStep['process']): RouteStep => ({ process, specification: '' });

/** Which bake goes with which plated step: the next step, else one that is to spare, else a new one (undefined). */
function bakesByPlating(
  route: readonly RouteStep[],
  needs: readonly PlatingNeeds[],
): Map<number, number | undefined> {
  const spare = route.flatMap((step, at) => (isBake(step) && !isGlued(route, needs, at) ? [at] : []));
  const bakes = new Map<number, number | undefined>();
  for (const { at, needsBake } of needs) {
    if (!needsBake) continue;
    const next = route[at + 1];
    if (next && isBake(next)) {
      bakes.set(at, at + 1);
      continue;
    }
    const later = spare.findIndex((bake) => bake > at);
    bakes.set(at, spare.splice(later < 0 ? 0 : later, 1)[0]);
  }
  return bakes;
}

/** Of several steps of one kind only one is bound; the others may stay where somebody put them. */
function rolesOf(
  route: readonly RouteStep[],
  needs: readonly PlatingNeeds[],
): Map<number, Item<never>['role']> {
  const roles = new Map<number, Item<never>['role']>();
  const lastHeat = route.findLastIndex(isHeatTreatment);
  const firstCover = route.findIndex(isCover);
  for (const method of SURFACE_METHODS) {
    const made = route.flatMap(({ process }, at) => (process === method ? [at] : []));
    const before = made.filter((at) => firstCover < 0 || at < firstCover);
    const final = before.findLast((at) => at > lastHeat) ?? before.at(-1) ?? made[0];
    if (final !== undefined) roles.set(final, 'final_inspection');
    const last = made.at(-1);
    const isThick = needs.some(({ needsBothInspections }) => needsBothInspections);
    if (method === 'magnetic_particle' && isThick && last !== undefined && last !== final)
      roles.set(last, 'inspection_after_plating');
  }
  const age = route.findLastIndex(({ process }) => process === 'artificial_age');
  if (age >= 0) roles.set(age, 'final_ageing');
  return roles;
}

/** Whether one item has to stand before another. The kinds have a rank, so that no circle can come about. */
function mustPrecede(
  { head: a, role: roleA }: Item<RouteStep>,
  { head: b, role: roleB }: Item<RouteStep>,
): boolean {
  if (roleB === 'inspection_after_plating') return isPlating(a) || roleA === 'final_inspection';
  if (isSolution(a) && roleB === 'final_ageing') return true;
  if (isHot(a) && (isFinish(b) || isPeening(b))) return true;
  if (
    isHeatTreatment(a) &&
    (roleB === 'final_inspection' || (b.process === 'stress_relief' && b.specification === ''))
  )
    return true;
  if (roleA === 'final_inspection' && isCover(b)) return true;
  if (isPeening(a) && isElectroplate(b)) return true;
  return isFluorescentPenetrant(a) && isVisiblePenetrant(b);
}

/** The earliest item that nothing has to precede any more comes next, so that little moves. */
function inOrder<Step extends RouteStep>(items: readonly Item<Step>[]): Item<Step>[] {
  const left = [...items];
  const ordered: Item<Step>[] = [];
  while (left.length > 0) {
    const free = left.findIndex((item) => !left.some((other) => other !== item && mustPrecede(other, item)));
    ordered.push(...left.splice(Math.max(free, 0), 1));
  }
  return ordered;
}
