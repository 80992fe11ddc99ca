import type { PartInput } from '@/lib/parts/contract';
import type { ToProve } from '@/lib/parts/to-prove';

/** One line of the yard's drawing list. Sizes in inches as on the drawing: length × width × height. */
type Line = readonly [
  number: string,
  revision: string,
  name: string,
  material: Material,
  thickness: string,
  size: string,
  route: RouteName,
];

type Material =
  | '2024 clad sheet'
  | '2024 bare sheet'
  | '2024 bar'
  | '2024 extrusion'
  | '6061 sheet'
  | '6061 tube'
  | '6061 bar'
  | '7075 bare sheet'
  | '7075 bar'
  | '4130 tube'
  | '4130 sheet'
  | '4340 bar'
  | '17-4PH bar'
  | '304 sheet';
export type RouteName = keyof typeof ROUTES;

const MATERIALS: Record<Material, Pick<PartInput, 'alloy' | 'form' | 'clad' | 'madeCondition'>> = {
  '2024 clad sheet': { alloy: '2024', form: 'sheet', clad: true, madeCondition: 'O' },
  '2024 bare sheet': { alloy: '2024', form: 'sheet', clad: false, madeCondition: 'O' },
  '2024 bar': { alloy: '2024', form: 'bar', clad: false, madeCondition: 'O' },
  '2024 extrusion': { alloy: '2024', form: 'extrusion', clad: false, madeCondition: 'O' },
  '6061 sheet': { alloy: '6061', form: 'sheet', clad: false, madeCondition: 'O' },
  '6061 tube': { alloy: '6061', form: 'tube', clad: false, madeCondition: 'O' },
  '6061 bar': { alloy: '6061', form: 'bar', clad: false, madeCondition: 'T651' },
  '7075 bare sheet': { alloy: '7075', form: 'sheet', clad: false, madeCondition: 'O' },
  '7075 bar': { alloy: '7075', form: 'bar', clad: false, madeCondition: 'T651' },
  '4130 tube': { alloy: '4130', form: 'tube', clad: false, madeCondition: 'N' },
  '4130 sheet': { alloy: '4130', form: 'sheet', clad: false, madeCondition: 'N' },
  '4340 bar': { alloy: '4340', form: 'bar', clad: false, madeCondition: 'annealed' },
  '17-4PH bar': { alloy: '17-4PH', form: 'bar', clad: false, madeCondition: 'A' },
  '304 sheet': { alloy: '304', form: 'sheet', clad: false, madeCondition: 'annealed' },
};

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
}

const step = ({
  process,
  to: [specification, specificationRevision, classType],
  conditions: [conditionBefore, targetCondition] = ['', ''],
  toProve,
}: Step): PartInput['route'][number] => ({
  process,
  specification,
  specificationRevision,
  classType,
  conditionBefore,
  targetCondition,
  toProve: [...toProve, ...PAPERS],
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
});
const FILM = step({
  process: 'chemical_film',
  to: ['MIL-DTL-5541', 'F', 'type II class 1A'],
  toProve: [prove('Appearance', 'continuous, no powder'), prove('Salt spray', 'panel of this month')],
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

const LINES: readonly Line[] = [
  [
    'MC-1102-01',
    'C',
    'Float bulkhead web, station 40',
    '2024 clad sheet',
    '0.032 in',
    '24 × 18 × 1',
    't42 film',
  ],
  [
    'MC-1102-02',
    'C',
    'Float bulkhead web, station 72',
    '2024 clad sheet',
    '0.032 in',
    '26 × 18 × 1',
    't42 film',
  ],
  [
    'MC-1102-03',
    'B',
    'Float bulkhead web, station 104',
    '2024 clad sheet',
    '0.040 in',
    '26 × 19 × 1',
    't42 film',
  ],
  [
    'MC-1102-04',
    'B',
    'Float bulkhead web, station 138',
    '2024 clad sheet',
    '0.040 in',
    '24 × 18 × 1',
    't42 film',
  ],
  ['MC-1106-11', 'A', 'Chine stiffener, forward', '2024 clad sheet', '0.040 in', '31 × 2 × 1', 't42'],
  ['MC-1106-12', 'A', 'Chine stiffener, middle', '2024 clad sheet', '0.040 in', '33 × 2 × 1', 't42'],
  ['MC-1106-13', 'D', 'Chine stiffener, aft', '2024 clad sheet', '0.040 in', '28 × 2 × 1', 't42'],
  [
    'MC-1110-01',
    'E',
    'Keel doubler, forward',
    '2024 bare sheet',
    '0.125 in',
    '48 × 4 × 0.125',
    't42 anodize',
  ],
  ['MC-1110-02', 'E', 'Keel doubler, step', '2024 bare sheet', '0.125 in', '36 × 4 × 0.125', 't42 anodize'],
  ['MC-1114-21', 'B', 'Step frame angle', '2024 extrusion', '0.188 in', '22 × 2 × 2', 't42'],
  ['MC-1114-22', 'B', 'Step frame gusset', '2024 bare sheet', '0.063 in', '6 × 5 × 0.063', 't42'],
  ['MC-1118-05', 'A', 'Deck beam', '2024 extrusion', '0.125 in', '30 × 2 × 1.5', 't42 film'],
  ['MC-1118-06', 'A', 'Deck beam clip', '2024 clad sheet', '0.050 in', '2 × 1.5 × 1', 't42'],
  ['MC-1120-01', 'C', 'Hatch frame', '6061 sheet', '0.063 in', '14 × 10 × 1', 't62 6061 film'],
  ['MC-1120-02', 'C', 'Hatch lid', '6061 sheet', '0.050 in', '14 × 10 × 0.5', 't62 6061 film'],
  ['MC-1120-07', 'A', 'Hatch retainer', '6061 sheet', '0.063 in', '3 × 1 × 0.5', 't62 6061 film'],
  ['MC-1124-03', 'B', 'Bow bumper backing plate', '6061 sheet', '0.125 in', '9 × 8 × 0.125', 't62 6061'],
  ['MC-1130-10', 'F', 'Spreader bar end fitting', '7075 bar', '2.5 in', '6 × 2.5 × 2.5', 'penetrant anodize'],
  ['MC-1130-11', 'F', 'Spreader bar clevis', '7075 bar', '1.5 in', '4 × 1.5 × 1.5', 'penetrant anodize'],
  ['MC-1130-14', 'A', 'Spreader bar tube plug', '6061 bar', '2 in', '2 × 2 × 2', 'anodize'],
  [
    'MC-1134-01',
    'D',
    'Front strut lower fitting',
    '4340 bar',
    '2 in',
    '5 × 2 × 2',
    'harden magnetic peen cadmium',
  ],
  [
    'MC-1134-02',
    'D',
    'Rear strut lower fitting',
    '4340 bar',
    '2 in',
    '5 × 2 × 2',
    'harden magnetic peen cadmium',
  ],
  [
    'MC-1134-05',
    'B',
    'Strut bolt, 1/2 inch',
    '4340 bar',
    '0.5 in',
    '3 × 0.75 × 0.75',
    'harden magnetic cadmium',
  ],
  [
    'MC-1134-06',
    'B',
    'Strut bolt, 5/8 inch',
    '4340 bar',
    '0.625 in',
    '3.5 × 1 × 1',
    'harden magnetic cadmium',
  ],
  ['MC-1134-09', 'A', 'Strut bushing', '4130 tube', '0.095 in', '1.5 × 0.75 × 0.75', 'cadmium'],
  ['MC-1140-01', 'B', 'Front strut weldment', '4130 tube', '0.065 in', '46 × 5 × 3', 'relief magnetic'],
  ['MC-1140-02', 'B', 'Rear strut weldment', '4130 tube', '0.065 in', '44 × 5 × 3', 'relief magnetic'],
  ['MC-1140-08', 'A', 'Drag wire lug', '4130 sheet', '0.125 in', '3 × 2 × 0.125', 'cadmium'],
  ['MC-1144-01', 'C', 'Water rudder blade', '6061 sheet', '0.090 in', '15 × 8 × 0.09', 't62 6061'],
  ['MC-1144-02', 'C', 'Water rudder horn', '4130 sheet', '0.090 in', '5 × 3 × 1', 'cadmium'],
  [
    'MC-1144-05',
    'A',
    'Water rudder hinge pin',
    '17-4PH bar',
    '0.313 in',
    '8 × 0.313 × 0.313',
    'age penetrant passivate',
  ],
  [
    'MC-1144-06',
    'A',
    'Water rudder hinge half',
    '17-4PH bar',
    '1.25 in',
    '3 × 1.25 × 1',
    'age penetrant passivate',
  ],
  ['MC-1148-01', 'A', 'Mooring cleat', '17-4PH bar', '1.5 in', '6 × 1.5 × 1.5', 'age penetrant passivate'],
  ['MC-1148-03', 'B', 'Cleat backing plate', '304 sheet', '0.063 in', '5 × 3 × 0.063', 'passivate'],
  ['MC-1150-01', 'A', 'Pump-out cup', '304 sheet', '0.050 in', '3 × 3 × 1', 'passivate'],
  ['MC-1150-02', 'A', 'Pump-out tube bracket', '6061 sheet', '0.050 in', '2 × 1 × 1', 't62 6061 film'],
  ['MC-2201-01', 'B', 'Wing rib, station 31', '2024 clad sheet', '0.025 in', '52 × 8 × 1', 't42 film'],
  ['MC-2201-02', 'B', 'Wing rib, station 46', '2024 clad sheet', '0.025 in', '52 × 8 × 1', 't42 film'],
  ['MC-2201-03', 'B', 'Wing rib, station 61', '2024 clad sheet', '0.025 in', '51 × 8 × 1', 't42 film'],
  ['MC-2201-09', 'A', 'Wing rib, tip', '2024 clad sheet', '0.020 in', '38 × 6 × 1', 't42 film'],
  [
    'MC-2204-01',
    'C',
    'Rear spar splice plate',
    '7075 bare sheet',
    '0.125 in',
    '18 × 4 × 0.125',
    't62 7075 anodize',
  ],
  [
    'MC-2204-02',
    'C',
    'Front spar cap doubler',
    '7075 bare sheet',
    '0.090 in',
    '36 × 2 × 0.09',
    't62 7075 anodize',
  ],
  ['MC-2208-11', 'A', 'Flap track rib', '2024 bare sheet', '0.063 in', '16 × 6 × 1', 't42 anodize'],
  ['MC-2208-12', 'D', 'Flap hinge bracket', '7075 bar', '1 in', '5 × 3 × 1', 'penetrant anodize'],
  ['MC-2212-01', 'A', 'Aileron hinge bracket', '7075 bar', '1 in', '4 × 2.5 × 1', 'penetrant anodize'],
  ['MC-2212-04', 'A', 'Aileron bellcrank', '6061 bar', '0.5 in', '7 × 4 × 0.5', 'anodize'],
  ['MC-2216-01', 'B', 'Lift strut fork', '4340 bar', '1.5 in', '6 × 2 × 1.5', 'harden magnetic cadmium'],
  ['MC-2216-02', 'B', 'Lift strut attach pin', '4340 bar', '0.75 in', '4 × 1 × 1', 'harden magnetic cadmium'],
  ['MC-2220-03', 'A', 'Leading edge nose rib', '2024 clad sheet', '0.025 in', '12 × 7 × 1', 't42'],
  ['MC-3301-01', 'A', 'Cabin floor beam', '2024 extrusion', '0.125 in', '40 × 2 × 2', 't42 film'],
  ['MC-3301-02', 'A', 'Cabin floor bracket', '2024 clad sheet', '0.050 in', '3 × 2 × 1', 't42 film'],
  ['MC-3301-08', 'B', 'Seat rail anchor', '7075 bar', '1 in', '3 × 1 × 1', 'anodize'],
  ['MC-3304-01', 'C', 'Door sill doubler', '2024 bare sheet', '0.063 in', '34 × 5 × 0.063', 't42 anodize'],
  [
    'MC-3304-02',
    'C',
    'Door post reinforcement with inboard hinge lands, left and right hand common',
    '2024 bare sheet',
    '0.090 in',
    '38 × 4 × 2',
    't42 anodize',
  ],
  ['MC-3308-01', 'A', 'Engine mount lug', '4130 sheet', '0.190 in', '3 × 3 × 0.19', 'cadmium'],
  ['MC-3308-02', 'A', 'Engine mount spacer', '4130 tube', '0.120 in', '2 × 1 × 1', 'cadmium'],
  ['MC-3312-05', 'A', 'Firewall stiffener', '304 sheet', '0.025 in', '22 × 2 × 1', 'passivate'],
  ['MC-4401-01', 'B', 'Tail post fitting', '7075 bar', '2 in', '6 × 2 × 2', 'penetrant anodize'],
  ['MC-4401-02', 'B', 'Stabilizer spar web', '2024 clad sheet', '0.040 in', '54 × 5 × 1', 't42 film'],
  ['MC-4404-01', 'A', 'Elevator horn', '4130 sheet', '0.125 in', '6 × 4 × 2', 'relief magnetic'],
  [
    'MC-4404-03',
    'A',
    'Rudder hinge pin',
    '17-4PH bar',
    '0.25 in',
    '6 × 0.25 × 0.25',
    'age penetrant passivate',
  ],
];

/** Drawing numbers whose pieces are numbered one by one. */
const SERIALISED = ['MC-1134-01', 'MC-1134-02', 'MC-2216-01', 'MC-4401-01'];

export const catalogue = (): PartInput[] => LINES.map(toPart);

function toPart([number, revision, name, material, thickness, size, route]: Line): PartInput {
  const [length = '', width = '', height = ''] = size.split(' × ').map((inches) => `${inches} in`);
  return {
    number,
    revision,
    name,
    ...MATERIALS[material],
    thickness,
    length,
    width,
    height,
    mass: '',
    area: '',
    endCondition: ROUTES[route].end,
    serialised: SERIALISED.includes(number),
    note: '',
    drawingFileId: null,
    route: ROUTES[route].steps.map((one) => ({ ...one })),
  };
}

/** What each airframe on the yard's slips still needs, by the day it is needed (days from today). */
export const ASSEMBLIES: readonly {
  name: string;
  neededInDays: number;
  needs: readonly (readonly [partNumber: string, pieces: number])[];
}[] = [
  {
    name: 'Spreader bars 31',
    neededInDays: -4,
    needs: [
      ['MC-1130-10', 4],
      ['MC-1130-11', 8],
      ['MC-1130-14', 4],
    ],
  },
  {
    name: 'Left float 31',
    neededInDays: 6,
    needs: [
      ['MC-1102-01', 2],
      ['MC-1102-02', 2],
      ['MC-1102-03', 2],
      ['MC-1106-11', 12],
      ['MC-1106-12', 12],
      ['MC-1106-13', 12],
      ['MC-1118-06', 40],
    ],
  },
  {
    name: 'Right float 31',
    neededInDays: 12,
    needs: [
      ['MC-1102-01', 2],
      ['MC-1102-02', 2],
      ['MC-1102-04', 2],
      ['MC-1110-01', 2],
      ['MC-1110-02', 2],
      ['MC-1114-21', 8],
    ],
  },
  {
    name: 'Float struts 31',
    neededInDays: 15,
    needs: [
      ['MC-1134-01', 4],
      ['MC-1134-02', 4],
      ['MC-1134-05', 16],
      ['MC-1134-09', 24],
      ['MC-1140-01', 2],
      ['MC-1140-02', 2],
    ],
  },
  {
    name: 'Water rudders 31',
    neededInDays: 20,
    needs: [
      ['MC-1144-01', 2],
      ['MC-1144-02', 2],
      ['MC-1144-05', 4],
      ['MC-1144-06', 8],
    ],
  },
  {
    name: 'Left wing 32',
    neededInDays: 27,
    needs: [
      ['MC-2201-01', 4],
      ['MC-2201-02', 4],
      ['MC-2201-03', 4],
      ['MC-2204-01', 2],
      ['MC-2208-12', 6],
      ['MC-2220-03', 18],
    ],
  },
  {
    name: 'Hatches 31 and 32',
    neededInDays: 34,
    needs: [
      ['MC-1120-01', 8],
      ['MC-1120-02', 8],
      ['MC-1120-07', 32],
    ],
  },
  {
    name: 'Cabin floor 32',
    neededInDays: 41,
    needs: [
      ['MC-3301-01', 6],
      ['MC-3301-02', 48],
      ['MC-3301-08', 20],
    ],
  },
];
