import type { BatchTables } from '@/lib/reference/batch-tables';
import { classNeeded } from '@/lib/trade/pyrometry/class-needed';

import type { Check, CheckedEquipment, CheckedLine, CheckFacts } from './check';
import type { Finding, WayOut } from './finding';
import { loadsAsSet, type NumberedLoad } from './loads-as-set';
import { citing } from './source-words';

const SEE_EQUIPMENT: WayOut = { way: 'see_processor', says: 'See its equipment' };

/** Whether a furnace that is entered gets as hot as a solution treatment asks, and is as uniform. */
export const isHotEnough: Check = {
  met: 'the furnaces that are entered get hot enough',
  look(facts) {
    const furnaces = facts.processor.equipment.filter(({ kind }) => kind === 'furnace');
    if (furnaces.length === 0) return [];
    const loads = loadsAsSet(facts.tables, facts.lines).filter(({ solution }) => solution !== null);
    return [
      ...loads.flatMap((load) => tooCold(facts, load, furnaces)),
      ...(loads.length > 0 ? tooLoose(facts.tables, furnaces) : []),
    ];
  },
};

function tooCold(
  { processor }: CheckFacts,
  { number, solution, governing, sources }: NumberedLoad<CheckedLine>,
  furnaces: readonly CheckedEquipment[],
): Finding[] {
  const lowestC = solution?.temperatureC[0] ?? -Infinity;
  const reaches = ({ temperatureCMin, temperatureCMax }: CheckedEquipment) =>
    (temperatureCMax ?? Infinity) >= lowestC && (temperatureCMin ?? -Infinity) <= lowestC;
  if (furnaces.some(reaches)) return [];
  const [source] = sources;
  const known = furnaces.map(({ name, temperatureWords }) => `${name} ${temperatureWords}`).join(', ');
  return [
    {
      code: 'no_furnace_for_temperature',
      level: 'warn',
      subject: `load ${number} ${governing.id}`,
      sentence: `No furnace of ${processor.name} is entered for the temperature of load ${number}.`,
      rest: `It asks for ${Math.round(lowestC)} °C or more; entered are ${known}.`,
      ...(source && citing(source)),
      waysOut: [SEE_EQUIPMENT],
    },
  ];
}

function tooLoose({ requirements }: BatchTables, furnaces: readonly CheckedEquipment[]): Finding[] {
  const needed = classNeeded(requirements.furnaceClasses, 'aluminium_solution');
  if (!needed.ok || furnaces.some(({ furnaceClass }) => (furnaceClass ?? 0) <= needed.loosest)) return [];
  const known = furnaces.map(({ name, furnaceClass }) => `${name} class ${furnaceClass}`).join(', ');
  return [
    {
      code: 'furnace_class_too_loose',
      level: 'warn',
      subject: '',
      sentence: `Solution treatment of aluminium takes a furnace of class ${needed.loosest}.`,
      rest: `Entered are ${known}.`,
      ...citing(needed.source),
      waysOut: [SEE_EQUIPMENT],
    },
  ];
}
