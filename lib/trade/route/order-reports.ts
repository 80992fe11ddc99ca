import type { PlatingNeeds } from './needs-of-plating';
import type { Report, RoutePart, RouteStep } from './route';
import {
  indexesOf,
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

/** What is in the wrong order or missing, and can be put right by moving or inserting steps. */
export function orderReports(
  route: readonly RouteStep[],
  part: RoutePart,
  needs: readonly PlatingNeeds[],
): Report[] {
  return [
    ...heatAfterFinish(route, part),
    ...wrongWayRound('peen_before_plating', route, isElectroplate, isPeening),
    ...wrongWayRound('no_heat_after_peening', route, isPeening, isHot),
    ...wrongWayRound('fluorescent_before_visible', route, isVisiblePenetrant, isFluorescentPenetrant),
    ...agedBeforeSolution(route),
    ...inspections(route),
    ...secondInspection(route, needs),
    ...missingStressRelief(route, needs),
    ...missingBakes(route, needs),
  ];
}

export const isVisiblePenetrant = ({ process, classType }: RouteStep): boolean =>
  process === 'fluorescent_penetrant' && /\bTYPE\s+(II|2)\b/i.test(classType ?? '');

export const isFluorescentPenetrant = (step: RouteStep): boolean =>
  step.process === 'fluorescent_penetrant' && !isVisiblePenetrant(step);

export const SURFACE_METHODS = ['fluorescent_penetrant', 'magnetic_particle'] as const;

/** Some step of the first kind stands before one of the second, and must not. */
function wrongWayRound(
  rule: Report['rule'],
  route: readonly RouteStep[],
  isFirst: (step: RouteStep) => boolean,
  isSecond: (step: RouteStep) => boolean,
): Report[] {
  const first = route.findIndex(isFirst);
  const second = route.findLastIndex(isSecond);
  return first >= 0 && first < second ? [{ rule, steps: [first, second], repair: 'move' }] : [];
}

function heatAfterFinish(route: readonly RouteStep[], part: RoutePart): Report[] {
  const found = wrongWayRound('heat_before_finish', route, isFinish, isHot);
  const [finish] = found[0]?.steps ?? [];
  const isPassivation = finish !== undefined && route[finish]?.process === 'passivation';
  return isPassivation && part.family === 'precipitation_hardening_steel'
    ? found.map((report) => ({ ...report, rule: 'passivate_after_age' }))
    : found;
}

function agedBeforeSolution(route: readonly RouteStep[]): Report[] {
  const age = route.findLastIndex(({ process }) => process === 'artificial_age');
  const solution = route.findLastIndex(isSolution);
  return age >= 0 && age < solution
    ? [{ rule: 'age_after_solution', steps: [age, solution], repair: 'move' }]
    : [];
}

/** Of each method that is on the route, one inspection stands after all heat treatment and before all that covers. */
function inspections(route: readonly RouteStep[]): Report[] {
  const lastHeat = route.findLastIndex(isHeatTreatment);
  const firstCover = route.findIndex(isCover);
  return SURFACE_METHODS.flatMap((method): Report[] => {
    const made = indexesOf(route, ({ process }) => process === method);
    const beforeCover = made.filter((at) => firstCover < 0 || at < firstCover);
    const last = beforeCover.at(-1) ?? made.at(-1);
    if (last === undefined || beforeCover.some((at) => at > lastHeat)) return [];
    return beforeCover.length > 0
      ? [{ rule: 'inspect_after_heat_treatment', steps: [last, lastHeat], repair: 'move' }]
      : [{ rule: 'inspect_before_coating', steps: [firstCover, last], repair: 'move' }];
  });
}

function secondInspection(route: readonly RouteStep[], needs: readonly PlatingNeeds[]): Report[] {
  const thick = needs.findLast(({ needsBothInspections }) => needsBothInspections)?.at;
  const last = route.findLastIndex(({ process }) => process === 'magnetic_particle');
  if (thick === undefined || last < 0 || last > thick) return [];
  return [{ rule: 'magnetic_particle_before_and_after_plating', steps: [last, thick], repair: 'insert' }];
}

function missingStressRelief(route: readonly RouteStep[], needs: readonly PlatingNeeds[]): Report[] {
  const plated = needs.find(({ needsStressRelief }) => needsStressRelief)?.at;
  if (plated === undefined || route.some(({ process }) => process === 'stress_relief')) return [];
  return [{ rule: 'stress_relief_before_plating', steps: [plated], repair: 'insert' }];
}

function missingBakes(route: readonly RouteStep[], needs: readonly PlatingNeeds[]): Report[] {
  return needs.flatMap(({ at, needsBake }): Report[] => {
    const next = route[at + 1];
    if (!needsBake || (next && isBake(next))) return [];
    const spare = route.some((step, other) => isBake(step) && !isGlued(route, needs, other));
    return [{ rule: 'bake_after_plating', steps: [at], repair: spare ? 'move' : 'insert' }];
  });
}

/** A bake that already follows a plated step which needs it stays with it. */
export function isGlued(
  route: readonly RouteStep[],
  needs: readonly PlatingNeeds[],
  bakeAt: number,
): boolean {
  const before = route[bakeAt - 1];
  return (
    before !== undefined &&
    isPlating(before) &&
    needs.some(({ at, needsBake }) => needsBake && at === bakeAt - 1)
  );
}
