import type { Cycle, Reading } from '@/lib/evidence/certificate/certificate';
import type { Dice } from './dice';

/** What was done, as its certificate states it. */
export interface Run {
  readonly cycles: Cycle[];
  readonly quench_delay_s: number | null;
  readonly plating_end: string | null;
  readonly bake_start: string | null;
  readonly bake_end: string | null;
  readonly readings: Reading[];
}

/** A process as it is ordered, and how a run of it comes out that meets the order. */
export interface Work {
  readonly process: string;
  readonly trade: 'thermal' | 'finishing' | 'inspection';
  /** As a title says it. */
  readonly title: string;
  readonly spec: string;
  readonly revision: string;
  readonly classType: string | null;
  readonly material: string;
  readonly quench: string | null;
  readonly requirements: Record<string, unknown>;
  run(dice: Dice, day: string): Run;
}

export const minutesAfter = (moment: string, minutes: number): string =>
  new Date(Date.parse(`${moment}:00Z`) + minutes * 60_000).toISOString().slice(0, 16);

const at = (dice: Dice, day: string): string =>
  `${day}T${String(dice.whole(6, 15)).padStart(2, '0')}:${String(dice.whole(0, 59)).padStart(2, '0')}`;

function cycle(step: string, set_temp: number | null, start: string, minutes: number): Cycle {
  return {
    step,
    set_temp,
    unit: set_temp === null ? null : 'F',
    soak_start: start,
    soak_end: minutesAfter(start, minutes),
    minutes,
  };
}

const NOTHING = {
  cycles: [],
  quench_delay_s: null,
  plating_end: null,
  bake_start: null,
  bake_end: null,
  readings: [],
};

const around = (
  dice: Dice,
  [low, high]: readonly [number, number],
  { digits, count }: { readonly digits: number; readonly count: number },
): number[] =>
  Array.from(
    { length: count },
    () => Math.round((low + ((high - low) * dice.whole(0, 100)) / 100) * 10 ** digits) / 10 ** digits,
  );

interface Alloy {
  readonly alloy: string;
  readonly to: string;
  readonly set: number;
  readonly age: { readonly set: number; readonly hours: number } | null;
  readonly hardness: readonly [number, number];
  readonly iacs: readonly [number, number];
}
const ALUMINIUM: readonly Alloy[] = [
  { alloy: '2024', to: 'T42', set: 920, age: null, hardness: [69, 74], iacs: [29, 32] },
  { alloy: '6061', to: 'T62', set: 985, age: { set: 350, hours: 8 }, hardness: [50, 56], iacs: [40.5, 44] },
  { alloy: '7075', to: 'T62', set: 900, age: { set: 250, hours: 24 }, hardness: [86, 89], iacs: [31, 34] },
];

function solutionAndAge(dice: Dice): Work {
  const { alloy, to, set, age, hardness, iacs } = dice.pick(ALUMINIUM);
  return {
    process: 'solution_heat_treat_and_age',
    trade: 'thermal',
    title: 'Heat Treat',
    spec: 'AMS 2770',
    revision: 'R',
    classType: `${alloy}-O to ${alloy}-${to}`,
    material: `${alloy}-O SHEET 0.0${dice.pick(['40', '32', '50', '63'])}`,
    quench: 'Water',
    requirements: {
      alloy,
      temper_in: 'O',
      temper_out: to,
      solution: { set_f: set, tolerance_f: 10, soak_min_minutes: 30, soak_max_minutes: 60 },
      quench: { medium: 'water', max_medium_temp_f: 110, max_delay_seconds: 10 },
      age: age
        ? { kind: 'artificial', min_hours: age.hours, set_f: age.set, tolerance_f: 10 }
        : { kind: 'natural', min_hours: 96 },
      hardness: { scale: 'HRB', min: Math.floor(hardness[0] - 3), max: null },
      conductivity_pct_iacs: { min: iacs[0] - 1, max: iacs[1] + 1 },
    },
    run: (more, day) => {
      const start = at(more, day);
      const soak = more.whole(33, 55);
      const ageStart = minutesAfter(start, soak + more.whole(40, 200));
      return {
        ...NOTHING,
        cycles: [
          cycle('solution', set, start, soak),
          age
            ? cycle('artificial_age', age.set, ageStart, age.hours * 60)
            : cycle('natural_age', null, minutesAfter(start, soak), 96 * 60),
        ],
        quench_delay_s: more.whole(3, 9),
        readings: [
          {
            kind: 'hardness',
            unit: 'HRB',
            values: around(more, [hardness[0], hardness[1]], { digits: 1, count: more.whole(2, 4) }),
          },
          {
            kind: 'conductivity',
            unit: '%IACS',
            values: around(more, [iacs[0], iacs[1]], { digits: 1, count: more.whole(1, 3) }),
          },
        ],
      };
    },
  };
}

function hardenAndTemper(dice: Dice): Work {
  const temper = dice.pick([900, 950, 1000]);
  return {
    process: 'harden_and_temper',
    trade: 'thermal',
    title: 'Heat Treat',
    spec: 'AMS 2759/1',
    revision: 'H',
    classType: null,
    material: '4130 STEEL BAR 1.00 DIA',
    quench: 'Oil',
    requirements: { alloy: '4130', hardness: { scale: 'HRC', min: 26, max: 40 } },
    run: (more, day) => {
      const start = at(more, day);
      const soak = more.whole(45, 80);
      return {
        ...NOTHING,
        cycles: [
          cycle('austenitize', 1575, start, soak),
          cycle('temper', temper, minutesAfter(start, soak + 70), more.pick([120, 150])),
        ],
        readings: [
          {
            kind: 'hardness',
            unit: 'HRC',
            values: around(more, [28, 36], { digits: 1, count: more.whole(2, 5) }),
          },
        ],
      };
    },
  };
}

function stressRelief(): Work {
  return {
    process: 'stress_relief',
    trade: 'thermal',
    title: 'Stress Relief',
    spec: 'AMS 2759/11',
    revision: 'A',
    classType: null,
    material: '4130 STEEL WELDMENT',
    quench: null,
    requirements: { alloy: '4130' },
    run: (more, day) => ({
      ...NOTHING,
      cycles: [cycle('stress_relief', 1150, at(more, day), more.pick([60, 75, 90]))],
    }),
  };
}

type Ordered = Pick<Work, 'title' | 'spec' | 'revision' | 'classType'>;

function plate({
  process,
  title,
  spec,
  revision,
  classType,
}: Ordered & { readonly process: 'cadmium_plate' | 'zinc_plate' }) {
  return (): Work => ({
    process,
    trade: 'finishing',
    title,
    spec,
    revision,
    classType,
    material: '4340 STEEL',
    quench: null,
    requirements: {
      thickness: { unit: 'microinch', min: 300, max: 500 },
      bake: { set_f: 375, tolerance_f: 25, min_hours: 23, max_hours_after_plating: 4 },
    },
    run: (more, day) => {
      const plated = at(more, day);
      const baked = minutesAfter(plated, more.whole(40, 200));
      const hours = more.pick([23, 23.5, 24]);
      const bake = cycle('embrittlement_relief', 375, baked, hours * 60);
      return {
        ...NOTHING,
        cycles: [bake],
        plating_end: plated,
        bake_start: bake.soak_start,
        bake_end: bake.soak_end,
        readings: [
          {
            kind: 'thickness',
            unit: 'microinch',
            values: around(more, [320, 470], { digits: 0, count: more.whole(2, 5) }),
          },
        ],
      };
    },
  });
}

function treat({
  process,
  title,
  spec,
  revision,
  classType,
  material,
}: Ordered & Pick<Work, 'process' | 'material'>) {
  return (): Work => ({
    process,
    trade: /penetrant|particle/.test(process) ? 'inspection' : 'finishing',
    title,
    spec,
    revision,
    classType,
    material,
    quench: null,
    requirements: {},
    run: () => NOTHING,
  });
}

/** Heat treating comes more often: it has the most to read. */
export const WORKS: readonly ((dice: Dice) => Work)[] = [
  solutionAndAge,
  solutionAndAge,
  solutionAndAge,
  hardenAndTemper,
  hardenAndTemper,
  stressRelief,
  plate({
    process: 'cadmium_plate',
    title: 'Cadmium Plating',
    spec: 'AMS-QQ-P-416',
    revision: 'F',
    classType: 'Type II Class 2',
  }),
  plate({
    process: 'cadmium_plate',
    title: 'Cadmium Plating',
    spec: 'AMS-QQ-P-416',
    revision: 'F',
    classType: 'Type II Class 2',
  }),
  plate({
    process: 'zinc_plate',
    title: 'Zinc Plating',
    spec: 'ASTM B633',
    revision: '19',
    classType: 'Type II SC 3',
  }),
  treat({
    process: 'anodize',
    title: 'Anodize',
    spec: 'MIL-PRF-8625',
    revision: 'F',
    classType: 'Type II Class 1',
    material: '6061-T6 PLATE',
  }),
  treat({
    process: 'chemical_film',
    title: 'Chemical Film',
    spec: 'MIL-DTL-5541',
    revision: 'F',
    classType: 'Type I Class 1A',
    material: '2024-T3 SHEET',
  }),
  treat({
    process: 'passivation',
    title: 'Passivation',
    spec: 'AMS 2700',
    revision: 'G',
    classType: 'Method 1 Type 2 Class 1',
    material: '17-4PH BAR',
  }),
  treat({
    process: 'fluorescent_penetrant',
    title: 'Fluorescent Penetrant Inspection',
    spec: 'ASTM E1417',
    revision: '21',
    classType: 'Type I Method A Level 2',
    material: '7075-T73 FORGING',
  }),
  treat({
    process: 'magnetic_particle',
    title: 'Magnetic Particle Inspection',
    spec: 'ASTM E1444',
    revision: '22',
    classType: 'wet continuous fluorescent',
    material: '4130 STEEL',
  }),
];
