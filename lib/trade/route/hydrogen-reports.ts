import { exposureLimit } from '../finishes/exposure-limit';
import { finishAsOrdered } from '../finishes/finish-as-ordered';
import { platingLimit } from '../steel/plating-limit';
import { fahrenheitFromCelsius } from '../units/temperature';
import { isHardenable, type PlatingNeeds } from './needs-of-plating';
import type { Report, RoutePart, RouteStep, RouteTables } from './route';
import { indexesOf, isBake, isElectroplate, isPeening } from './step-kinds';

/** What strong steel asks for besides the order of its steps. */
export function hydrogenReports(
  tables: RouteTables,
  route: readonly RouteStep[],
  part: RoutePart,
  needs: readonly PlatingNeeds[],
): Report[] {
  if (!isHardenable(part)) return [];
  return [
    ...needs.flatMap((need) => ofPlating(tables, route, part, need)),
    ...ofPeenedSteel(tables, route),
    ...ofTempering(tables, route, part),
  ];
}

function ofPlating(
  tables: RouteTables,
  route: readonly RouteStep[],
  part: RoutePart,
  { at, bake, needsBake }: PlatingNeeds,
): Report[] {
  const step = route[at];
  if (!step) return [];
  const says = (rule: Report['rule']): Report => ({ rule, steps: [at] });
  const applies = (limit: 'not_to_be_plated' | 'special_cleaning'): boolean => {
    const found = platingLimit(tables, limit, step, part);
    return found.ok && found.applies;
  };
  return [
    ...(applies('not_to_be_plated') ? [says('not_to_be_plated')] : []),
    ...(applies('special_cleaning') ? [says('special_cleaning')] : []),
    ...(bake.ok
      ? []
      : [says(BECAUSE[bake.reason] ?? 'no_bake_rule_known')].filter((one) => matters(one, part))),
    ...(needsBake ? [says('limit_acid')] : []),
    ...(needsBake && isChromated(tables, step) ? [says('bake_before_chromate')] : []),
    ...(part.kind === 'case_hardened' ? [says('case_before_plating')] : []),
  ];
}

const BECAUSE: Readonly<Record<string, Report['rule']>> = {
  strength_not_stated: 'strength_not_stated',
  working_not_stated: 'strength_not_stated',
  revision_not_stated: 'revision_decides_bake',
  revision_not_in_table: 'revision_decides_bake',
  bake_too_near_tempering: 'bake_below_temper',
};

/** From here on relief of hydrogen is usual (ASTM B850), whatever the called document says. */
const STRONG = { hrc: 31, mpa: 1000 } as const;

/** A document without a rule is worth a word for strong steel, and for steel of unknown strength. */
function matters({ rule }: Report, { hrc, tensileMpa }: RoutePart): boolean {
  if (rule === 'bake_below_temper') return true;
  const isKnown = hrc !== undefined || tensileMpa !== undefined;
  return !isKnown || (hrc ?? 0) >= STRONG.hrc || (tensileMpa ?? 0) >= STRONG.mpa;
}

function isChromated(tables: RouteTables, step: RouteStep): boolean {
  const ordered = finishAsOrdered(tables, { ...step, classType: step.classType ?? '' });
  return ordered.ok && ordered.facts.some(({ says }) => /chromate|conversion|passivate/.test(says ?? ''));
}

function ofPeenedSteel(tables: RouteTables, route: readonly RouteStep[]): Report[] {
  const peened = route.findIndex(isPeening);
  if (peened < 0) return [];
  const limit = exposureLimit(tables.exposure, { item: 'peened_steel' });
  const hardened = indexesOf(
    route,
    (step) => isElectroplate(step) && limit.ok && hardensAbove(tables, step, limit.temperatureCMax),
  );
  const bakes = indexesOf(route, isBake).filter((at) => at > peened);
  return [
    ...hardened.map((at): Report => ({
      rule: 'no_hardening_of_peened',
      steps: [peened, at].sort((a, b) => a - b),
    })),
    ...bakes.map((at): Report => ({ rule: 'bake_limit_of_peened_steel', steps: [peened, at] })),
  ];
}

function hardensAbove(tables: RouteTables, step: RouteStep, limitC: number): boolean {
  const ordered = finishAsOrdered(tables, { ...step, classType: step.classType ?? '' });
  return (
    ordered.ok && ordered.facts.some(({ hardeningC }) => hardeningC !== undefined && hardeningC[0] > limitC)
  );
}

function ofTempering(tables: RouteTables, route: readonly RouteStep[], part: RoutePart): Report[] {
  const { temperedAtC } = part;
  const hardened = indexesOf(route, ({ process }) => process === 'harden_and_temper');
  const isInBand = tables.temperBands.rows.some(({ steel, bandF }) => {
    const temperedAtF = temperedAtC === undefined ? NaN : fahrenheitFromCelsius(temperedAtC);
    return (
      (steel === undefined || steel === part.alloy) && temperedAtF >= bandF[0] && temperedAtF <= bandF[1]
    );
  });
  const etched = [
    'magnetic_particle',
    'embrittlement_relief',
    'cadmium_plate',
    'chromium_plate',
    'nickel_plate',
  ];
  const isStrong = (part.hrc ?? 0) >= ETCHED_FROM.hrc || (part.tensileMpa ?? 0) >= ETCHED_FROM.mpa;
  const ground =
    part.isGroundHard && isStrong
      ? indexesOf(route, ({ process }) => etched.includes(process)).slice(0, 1)
      : [];
  return [
    ...(isInBand ? hardened.map((at): Report => ({ rule: 'temper_band', steps: [at] })) : []),
    ...ground.map((at): Report => ({ rule: 'temper_etch_after_grinding', steps: [at] })),
  ];
}

/** 180 ksi, and the hardness that goes with it (AMS 2649C). */
const ETCHED_FROM = { hrc: 40, mpa: 1241 } as const;
