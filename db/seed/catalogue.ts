import type { PartInput } from '@/lib/parts/contract';

import { ROUTES, type RouteName } from './routes';

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
