import type { PartInput } from '@/lib/parts/contract';
import type { ToProve } from '@/lib/parts/to-prove';

const prove = (
  characteristic: string,
  limit: string,
  unit = '',
  source: ToProve['source'] = 'specification',
): ToProve => ({ characteristic, limit, unit, source, sourceText: '' });
const PAPERS = [
  prove('Order and revision', 'as ordered', '', 'shop'),
  prove('Signature, name, date', 'on the certificate', '', 'shop'),
];

interface Step {
  process: PartInput['route'][number]['process'];
  /** Specification, its revision, and class, type or grade. */
  to: readonly [specification: string, revision: string, classType: string];
  conditions?: readonly [before: string, after: string];
  toProve: readonly ToProve[];
  /** What the order states beside the fields above. */
  ordering?: PartInput['route'][number]['ordering'];
}

const step = ({
  process,
  to: [specification, specificationRevision, classType],
  conditions: [conditionBefore, targetCondition] = ['', ''],
  toProve,
  ordering = {},
}: Step): PartInput['route'][number] => ({
  process,
  specification,
  specificationRevision,
  classType,
  conditionBefore,
  targetCondition,
  toProve: [...toProve, ...PAPERS],
  ordering,
  note: '',
});

// Limits below are the demonstration's own; they illustrate an order and are no reference values.
const SOLUTION_2024 = step({
  process: 'solution_heat_treat_and_age',
  to: ['AMS 2770', 'R', 'natural age'],
  conditions: ['O', 'T42'],
  toProve: [
    prove('Solution temperature', '910 to 930', '°F'),
    prove('Quench delay', '10 or less', 's'),
    prove('Hardness', 'HRB 63 or more'),
    prove('Conductivity', '28.5 to 32.5', '% IACS'),
  ],
});
const SOLUTION_6061 = step({
  process: 'solution_heat_treat_and_age',
  to: ['AMS 2770', 'R', 'artificial age'],
  conditions: ['O', 'T62'],
  toProve: [
    prove('Solution temperature', '980 to 1000', '°F'),
    prove('Age', '345 to 355 °F, 8 h'),
    prove('Hardness', 'HRE 85 or more'),
  ],
});
const SOLUTION_7075 = step({
  process: 'solution_heat_treat_and_age',
  to: ['AMS 2770', 'R', 'artificial age'],
  conditions: ['O', 'T62'],
  toProve: [
    prove('Solution temperature', '870 to 880', '°F'),
    prove('Quench delay', '10 or less', 's'),
    prove('Hardness', 'HRB 84 or more'),
    prove('Conductivity', '30.5 to 36.0', '% IACS'),
  ],
});
const HARDEN_4340 = step({
  process: 'harden_and_temper',
  to: ['AMS 2759/1', 'H', '160 to 180 ksi'],
  conditions: ['annealed', '160 to 180 ksi'],
  toProve: [prove('Hardness', 'HRC 36 to 40'), prove('Tempering temperature', 'on the chart', '°F')],
});
const AGE_174 = step({
  process: 'artificial_age',
  to: ['AMS 2759/3', 'K', 'H1025'],
  conditions: ['A', 'H1025'],
  toProve: [prove('Hardness', 'HRC 35 to 42')],
});
const NORMALIZE_RELIEF = step({
  process: 'stress_relief',
  to: ['AMS 2759/11', 'B', 'welded'],
  conditions: ['N', 'N'],
  toProve: [prove('Temperature and time', 'on the chart')],
});
const ANODIZE = step({
  process: 'anodize',
  to: ['MIL-PRF-8625', 'F', 'type II class 1'],
  toProve: [
    prove('Coating weight', '600 or more', 'mg/ft²'),
    prove('Salt spray', 'panel of this month', '', 'specification'),
  ],
  ordering: {
    coating_thickness: 'by the coating weight',
    areas: 'all over, no masking',
    contact_marks: 'in tooling holes only',
    build_up: 'before coating; sizes on the drawing are bare',
    sampling_plan: 'by the specification',
    abrasion_test: 'none',
  },
});
const FILM = step({
  process: 'chemical_film',
  to: ['MIL-DTL-5541', 'F', 'type II class 1A'],
  toProve: [prove('Appearance', 'continuous, no powder'), prove('Salt spray', 'panel of this month')],
  ordering: {
    method: 'immersion',
    colour: 'as it comes out',
    touch_up_damage: 'allowed, as the specification says',
    touch_up_contact_marks: 'allowed',
    paint_adhesion_test: 'may be left out',
    test_specimens: 'of this month',
    next_step: 'epoxy primer, in the shop',
    sampling_plan: 'by the specification',
    lot_size: 'one line of the order',
  },
});
const CADMIUM = step({
  process: 'cadmium_plate',
  to: ['AMS-QQ-P-416', 'F', 'type II class 2'],
  toProve: [
    prove('Thickness', '0.0003 to 0.0005', 'in'),
    prove('Bake start', '4 or less after plating', 'h'),
    prove('Bake', '375 ± 25 °F, 23 h'),
  ],
});
const PASSIVATE = step({
  process: 'passivation',
  to: ['AMS 2700', 'F', 'method 1'],
  toProve: [prove('Copper sulfate test', 'passed')],
});
const PENETRANT = step({
  process: 'fluorescent_penetrant',
  to: ['ASTM E1417', '21', 'type I, level 3'],
  toProve: [prove('Result', 'no relevant indications'), prove('Inspector', 'level 2 or 3, named')],
});
const MAGNETIC = step({
  process: 'magnetic_particle',
  to: ['ASTM E1444', '22', 'wet fluorescent'],
  toProve: [prove('Result', 'no relevant indications'), prove('Inspector', 'level 2 or 3, named')],
});
const PEEN = step({
  process: 'shot_peen',
  to: ['AMS 2430', 'U', '0.006 to 0.010 A'],
  toProve: [prove('Intensity', '0.006 to 0.010', 'A'), prove('Coverage', '100', '%')],
});

export const ROUTES = {
  t42: { steps: [SOLUTION_2024], end: 'T42' },
  't42 film': { steps: [SOLUTION_2024, FILM], end: 'T42' },
  't42 anodize': { steps: [SOLUTION_2024, ANODIZE], end: 'T42' },
  't62 6061': { steps: [SOLUTION_6061], end: 'T62' },
  't62 6061 film': { steps: [SOLUTION_6061, FILM], end: 'T62' },
  't62 7075 anodize': { steps: [SOLUTION_7075, ANODIZE], end: 'T62' },
  anodize: { steps: [ANODIZE], end: 'T651' },
  'penetrant anodize': { steps: [PENETRANT, ANODIZE], end: 'T651' },
  'harden magnetic cadmium': { steps: [HARDEN_4340, MAGNETIC, CADMIUM], end: '160 to 180 ksi' },
  'age penetrant passivate': { steps: [AGE_174, PENETRANT, PASSIVATE], end: 'H1025' },
  'relief magnetic': { steps: [NORMALIZE_RELIEF, MAGNETIC], end: 'N' },
  cadmium: { steps: [CADMIUM], end: 'N' },
  passivate: { steps: [PASSIVATE], end: 'annealed' },
  'harden magnetic peen cadmium': { steps: [HARDEN_4340, MAGNETIC, PEEN, CADMIUM], end: '160 to 180 ksi' },
} satisfies Record<string, { steps: PartInput['route']; end: string }>;
export type RouteName = keyof typeof ROUTES;
