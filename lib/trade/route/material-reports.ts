import { exposureLimit } from '../finishes/exposure-limit';
import type { Report, RoutePart, RouteStep, RouteTables } from './route';
import {
  indexesOf,
  isBake,
  isCover,
  isFinish,
  isInSalt,
  isPeening,
  isPlating,
  isSolution,
} from './step-kinds';

/** What metal, shape and use of a part forbid or ask for, whatever the order of the steps. */
export function materialReports(tables: RouteTables, route: readonly RouteStep[], part: RoutePart): Report[] {
  return [
    ...ofSalt(route, part),
    ...ofCadmium(tables, route, part),
    ...ofAnodize(route, part),
    ...ofFilm(route),
    ...ofAluminium(route, part),
    ...ofPeening(route, part),
    ...ofStainless(route, part),
    ...ofInspection(route),
    ...ofCasting(route, part),
  ];
}

const when = (applies: boolean | undefined, rule: Report['rule'], steps: readonly number[]): Report[] =>
  applies && steps.length > 0 ? [{ rule, steps }] : [];

/** Attacked by the bath itself (T.O. 1-1A-9 para 3-62). */
const ATTACKED_BY_NITRATE = ['5056', '220'];

function ofSalt(route: readonly RouteStep[], part: RoutePart): Report[] {
  const salt = indexesOf(route, isInSalt);
  return [
    ...when(part.family === 'magnesium', 'no_nitrate_for_magnesium', salt),
    ...when(ATTACKED_BY_NITRATE.includes(part.alloy), 'nitrate_attacks_alloy', salt),
    ...when(part.trapsLiquid, 'salt_trapped', salt),
    ...when(true, 'dry_before_salt', salt),
  ];
}

function ofCadmium(tables: RouteTables, route: readonly RouteStep[], part: RoutePart): Report[] {
  const cadmium = indexesOf(route, ({ process }) => process === 'cadmium_plate');
  const limit = exposureLimit(tables.exposure, { item: 'cadmium_service' });
  const isHotter = limit.ok && part.serviceCMax !== undefined && part.serviceCMax > limit.temperatureCMax;
  return [
    ...when(part.family === 'titanium' || part.touchesTitanium, 'no_cadmium_on_titanium', cadmium),
    ...when(isHotter, 'no_cadmium_in_heat', cadmium),
    ...when(part.touchesFuelOrVacuum, 'no_cadmium_in_fuel', cadmium),
  ];
}

function ofAnodize(route: readonly RouteStep[], part: RoutePart): Report[] {
  const anodize = indexesOf(route, ({ process }) => process === 'anodize');
  const first = anodize[0] ?? Infinity;
  return [
    ...when(part.hasInserts, 'no_anodize_with_inserts', anodize),
    ...when(part.trapsLiquid, 'no_anodize_that_traps', anodize),
    ...when(
      true,
      'no_bake_on_anodize',
      indexesOf(route, isBake).filter((at) => at > first),
    ),
  ];
}

function ofFilm(route: readonly RouteStep[]): Report[] {
  const film = indexesOf(route, ({ process }) => process === 'chemical_film');
  const first = film[0] ?? Infinity;
  return [
    ...when(true, 'prime_film_soon', film),
    ...when(
      true,
      'no_oven_on_film',
      indexesOf(route, isBake).filter((at) => at > first),
    ),
  ];
}

function ofAluminium(route: readonly RouteStep[], part: RoutePart): Report[] {
  if (part.family !== 'wrought_aluminium') return [];
  const quenched = indexesOf(route, ({ process }) => process === 'solution_heat_treat');
  const aged = indexesOf(route, ({ process }) => process === 'artificial_age').filter(
    (at) => at > (quenched[0] ?? Infinity),
  );
  return [
    ...when(true, 'straighten_before_age', quenched),
    ...when(true, 'age_after_straightening', aged),
    ...when(part.isClad, 'count_clad_solution', indexesOf(route, isSolution)),
  ];
}

function ofPeening(route: readonly RouteStep[], part: RoutePart): Report[] {
  const peened = indexesOf(route, isPeening);
  return [
    ...when(
      part.family === 'wrought_aluminium' || part.family === 'cast_aluminium',
      'decontaminate_peened_aluminium',
      peened,
    ),
    ...when(true, 'protect_peened', peened),
  ];
}

/** Sulfur or selenium in them is attacked at once by plain nitric acid (ASTM A967, appendix). */
const FREE_MACHINING = ['303', '303Se', '416', '430F', '440F'];

function ofStainless(route: readonly RouteStep[], part: RoutePart): Report[] {
  const passivated = indexesOf(route, ({ process }) => process === 'passivation');
  return when(FREE_MACHINING.includes(part.alloy), 'passivate_free_machining', passivated);
}

function ofInspection(route: readonly RouteStep[]): Report[] {
  const plated = route.findLastIndex(isPlating);
  const inspected = indexesOf(route, ({ process }) => process === 'magnetic_particle').filter(
    (at) => at < plated,
  );
  return when(true, 'demagnetise_before_plating', inspected);
}

function ofCasting(route: readonly RouteStep[], part: RoutePart): Report[] {
  const covered = indexesOf(route, (step) => isCover(step) && isFinish(step));
  return when(part.form === 'casting', 'impregnate_before_finish', covered);
}
