import type { equipment } from '@/db/schema/equipment';
import { readMeasure, type Quantity } from '@/lib/parts/measure';

import type { EquipmentFields } from './contract';
import { readTemperature } from './read-temperature';

type Columns = Omit<
  typeof equipment.$inferInsert,
  'id' | 'shopId' | 'processorId' | 'retiredAt' | 'version' | 'createdAt'
>;

/** What a person typed as the columns keep it: SI beside the words. The contract has read it before. */
export function equipmentColumns(input: EquipmentFields): Columns {
  const [lengthMm, lengthEntered] = inside(input.length);
  const [widthMm, widthEntered] = inside(input.width);
  const [heightMm, heightEntered] = inside(input.height);
  const [limitG, limitEntered] = measured(input.limit, 'mass');
  const [temperatureCMin, temperatureMinEntered] = temperature(input.temperatureMin);
  const [temperatureCMax, temperatureMaxEntered] = temperature(input.temperatureMax);
  return {
    kind: input.kind,
    name: input.name,
    furnaceClass: input.furnaceClass,
    ...{ lengthMm, lengthEntered, widthMm, widthEntered, heightMm, heightEntered, limitG, limitEntered },
    ...{ temperatureCMin, temperatureMinEntered, temperatureCMax, temperatureMaxEntered },
  };
}

function measured(typed: string, quantity: Quantity): [number | null, string | null] {
  const read = typed === '' ? null : readMeasure(typed, quantity, 'It');
  return read?.ok ? [read.value, read.entered] : [null, null];
}

function inside(typed: string): [number, string] {
  const [value, entered] = measured(typed, 'length');
  if (value === null || entered === null) throw new Error('a size came through that the contract refuses');
  return [value, entered];
}

function temperature(typed: string): [number | null, string | null] {
  const read = typed === '' ? null : readTemperature(typed, 'It');
  return read?.ok ? [read.celsius, read.entered] : [null, null];
}
