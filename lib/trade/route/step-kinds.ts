import type { Process } from '../process';
import type { RouteStep } from './route';

const kind = (...processes: readonly Process[]) => {
  const set: ReadonlySet<Process> = new Set(processes);
  return ({ process }: RouteStep): boolean => set.has(process);
};

export const isSolution = kind('solution_heat_treat', 'solution_heat_treat_and_age');
/** Changes the condition of the metal; quenching makes the cracks that are looked for. */
export const isHeatTreatment = kind(
  'solution_heat_treat_and_age',
  'solution_heat_treat',
  'artificial_age',
  'anneal',
  'harden_and_temper',
);
/** Hot enough to spoil what was done before: also the relief of stress, but not the bake, which has its own rules. */
export const isHot = kind(
  'solution_heat_treat_and_age',
  'solution_heat_treat',
  'artificial_age',
  'anneal',
  'harden_and_temper',
  'stress_relief',
);
/** Brings hydrogen into steel. */
export const isPlating = kind('cadmium_plate', 'zinc_plate', 'nickel_plate', 'chromium_plate', 'phosphate');
export const isElectroplate = kind('cadmium_plate', 'zinc_plate', 'nickel_plate', 'chromium_plate');
export const isFinish = kind(
  'cadmium_plate',
  'zinc_plate',
  'nickel_plate',
  'chromium_plate',
  'phosphate',
  'anodize',
  'chemical_film',
  'passivation',
);
/** Fills, closes or covers a crack. */
export const isCover = kind(
  'cadmium_plate',
  'zinc_plate',
  'nickel_plate',
  'chromium_plate',
  'phosphate',
  'anodize',
  'chemical_film',
  'shot_peen',
);
export const isPeening = kind('shot_peen');
export const isBake = kind('embrittlement_relief');

/** The bath is named on the order, if it is salt. */
export const isInSalt = (step: RouteStep): boolean =>
  isHeatTreatment(step) && /\bSALT\b|\bNITRATE\b/i.test(`${step.classType ?? ''} ${step.specification}`);

export const indexesOf = (route: readonly RouteStep[], is: (step: RouteStep) => boolean): number[] =>
  route.flatMap((step, at) => (is(step) ? [at] : []));
