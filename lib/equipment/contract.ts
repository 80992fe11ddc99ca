import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Done, Id } from '@/lib/api/shapes';
import { readMeasure, type Quantity } from '@/lib/parts/measure';

import { EQUIPMENT_KINDS } from './equipment-kind';
import { readTemperature } from './read-temperature';

const measured = (quantity: Quantity, name: string) =>
  z
    .string(`${name} is missing.`)
    .trim()
    .max(40, `${name} is longer than 40 letters.`)
    .superRefine((typed, issues) => {
      const read = typed === '' ? null : readMeasure(typed, quantity, name);
      if (read && !read.ok) issues.addIssue({ code: 'custom', message: read.message });
    });
const inside = (name: string) =>
  measured('length', name).refine((typed) => typed !== '', `${name} is missing.`);
const temperature = (name: string) =>
  z
    .string()
    .trim()
    .max(24)
    .default('')
    .superRefine((typed, issues) => {
      const read = typed === '' ? null : readTemperature(typed, name);
      if (read && !read.ok) issues.addIssue({ code: 'custom', message: read.message });
    });

/** As typed, with units; what is left empty is not known. */
export const EquipmentFields = z.object({
  kind: z.enum(EQUIPMENT_KINDS, 'Choose what it is.'),
  name: z.string().trim().min(1, 'Enter its name or number.').max(60, 'Use 60 characters or less.'),
  length: inside('The length inside'),
  width: inside('The width inside'),
  height: inside('The height inside'),
  limit: measured('mass', 'What it carries').default(''),
  temperatureMin: temperature('The lowest temperature'),
  temperatureMax: temperature('The highest temperature'),
  furnaceClass: z
    .int('Enter a class from 1 to 6.')
    .min(1, 'Enter a class from 1 to 6.')
    .max(6, 'Enter a class from 1 to 6.')
    .nullable()
    .default(null),
});
export type EquipmentFields = z.output<typeof EquipmentFields>;

const inOrder = ({ temperatureMin, temperatureMax }: EquipmentFields): boolean => {
  const [low, high] = [readTemperature(temperatureMin, ''), readTemperature(temperatureMax, '')];
  return !low.ok || !high.ok || low.celsius <= high.celsius;
};
const NOT_IN_ORDER = {
  path: ['temperatureMax'],
  message: 'The highest temperature is below the lowest.',
};

const Measure = z.object({ entered: z.string(), value: z.number() });

export const Equipment = z.object({
  id: Id,
  kind: z.enum(EQUIPMENT_KINDS),
  name: z.string(),
  /** Inside, mm. */
  length: Measure,
  width: Measure,
  height: Measure,
  /** Grams that it carries. */
  limit: Measure.nullable(),
  /** °C. */
  temperatureMin: Measure.nullable(),
  temperatureMax: Measure.nullable(),
  furnaceClass: z.int().nullable(),
  version: z.int(),
});
export type Equipment = z.output<typeof Equipment>;

export const listEquipment = declare({
  id: 'listEquipment',
  method: 'get',
  path: '/processors/{processorId}/equipment',
  summary: 'Furnaces, ovens and tanks of a processor that are in use',
  side: 'shop',
  permission: 'processor.read',
  input: z.object({ processorId: Id }),
  response: z.object({ equipment: z.array(Equipment) }),
});

export const addEquipment = declare({
  id: 'addEquipment',
  method: 'post',
  path: '/processors/{processorId}/equipment',
  summary: 'Add a furnace, oven or tank: the room inside, what it carries, how hot it gets',
  side: 'shop',
  permission: 'processor.edit',
  input: EquipmentFields.extend({ processorId: Id }).refine(inOrder, NOT_IN_ORDER),
  response: z.object({ equipmentId: Id }),
});

export const changeEquipment = declare({
  id: 'changeEquipment',
  method: 'put',
  path: '/processors/{processorId}/equipment/{equipmentId}',
  summary: 'Change what is known of a furnace, oven or tank',
  side: 'shop',
  permission: 'processor.edit',
  input: EquipmentFields.extend({ processorId: Id, equipmentId: Id, version: z.int() }).refine(
    inOrder,
    NOT_IN_ORDER,
  ),
  response: z.object({ version: z.int() }),
});

export const retireEquipment = declare({
  id: 'retireEquipment',
  method: 'post',
  path: '/processors/{processorId}/equipment/{equipmentId}/retire',
  summary: 'Take a furnace, oven or tank out of use; nothing is checked against it any more',
  side: 'shop',
  permission: 'processor.edit',
  input: z.object({ processorId: Id, equipmentId: Id }),
  response: Done,
});
