import type { EquipmentFields } from '@/lib/equipment/contract';

/** Inside, in inches: length × width × height. */
const room = (
  kind: EquipmentFields['kind'],
  name: string,
  inside: string,
  more: Partial<EquipmentFields> = {},
): EquipmentFields => {
  const [length = '', width = '', height = ''] = inside.split(' × ').map((inches) => `${inches} in`);
  return {
    ...{ kind, name, length, width, height },
    ...{ limit: '', temperatureMin: '', temperatureMax: '', furnaceClass: null, ...more },
  };
};

export const THERMAL_ROOMS: readonly EquipmentFields[] = [
  room('furnace', 'F-3', '120 × 44 × 40', {
    limit: '600 lb',
    temperatureMin: '300 °F',
    temperatureMax: '1100 °F',
    furnaceClass: 2,
  }),
  room('furnace', 'F-5', '60 × 36 × 30', {
    limit: '400 lb',
    temperatureMin: '900 °F',
    temperatureMax: '2000 °F',
    furnaceClass: 5,
  }),
  room('oven', 'O-1', '96 × 40 × 48', {
    limit: '500 lb',
    temperatureMin: '150 °F',
    temperatureMax: '500 °F',
    furnaceClass: 2,
  }),
  room('tank', 'Q-3', '126 × 50 × 60', { temperatureMin: '60 °F', temperatureMax: '110 °F' }),
];

export const PLATING_ROOMS: readonly EquipmentFields[] = [
  room('tank', 'Cadmium 2', '72 × 30 × 40'),
  room('tank', 'Anodize 1', '144 × 36 × 60'),
  room('oven', 'Bake 1', '60 × 40 × 40', {
    temperatureMin: '200 °F',
    temperatureMax: '500 °F',
    furnaceClass: 5,
  }),
];

export const INSPECTION_ROOMS: readonly EquipmentFields[] = [room('tank', 'Penetrant line', '96 × 30 × 30')];
