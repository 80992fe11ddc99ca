import type { EquipmentKind } from '@/lib/equipment/equipment-kind';
import { linesWords } from '@/lib/parts/lines-words';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { fitsEquipment, type Box, type EquipmentFit } from '@/lib/trade/envelope/fits-equipment';
import { massOnHearth } from '@/lib/trade/envelope/mass-on-hearth';
import { poundsFromKg } from '@/lib/trade/units/mass';
import type { Process } from '@/lib/trade/process';

import type { Check, CheckedEquipment, CheckedLine, CheckFacts } from './check';
import { OVERRIDE, type Finding, type WayOut } from './finding';
import { loadsAsSet, type NumberedLoad } from './loads-as-set';
import { massOf } from './load-plan';
import { oncePerStep } from './once-per-step';
import { citing } from './source-words';

/**
 * Whether parts go into what the processor has: each into a furnace or tank of the kinds that its process needs,
 * straight or laid diagonally, and each load onto a hearth. Nothing is said of a processor whose equipment nobody
 * entered. The room is counted from edge to edge: racks and clearance are the processor's.
 */
export const fitsIn: Check = {
  met: 'nothing is too large for the equipment that is entered',
  look(facts) {
    const needed = NEEDED[facts.batch.process]
      .map((kinds) => facts.processor.equipment.filter(({ kind }) => kinds.includes(kind)))
      .filter((rooms) => rooms.length > 0);
    if (needed.length === 0) return [];
    const answer = oncePerStep((line) => needed.map((rooms) => fitOf(line, rooms)));
    return [
      ...facts.lines.flatMap((line) => answer(line).flatMap((fit) => findingOf(facts, line, fit))),
      ...sizeNotStated(facts.lines),
      ...heavyLoads(facts),
    ];
  },
};

/** A solution treatment needs a furnace, and a tank to quench in where tanks are entered. */
const HOT: readonly (readonly EquipmentKind[])[] = [['furnace'], ['tank']];
const WARM: readonly (readonly EquipmentKind[])[] = [['furnace', 'oven']];
const WET: readonly (readonly EquipmentKind[])[] = [['tank']];
const NEEDED: Readonly<Record<Process, readonly (readonly EquipmentKind[])[]>> = {
  solution_heat_treat_and_age: HOT,
  solution_heat_treat: HOT,
  harden_and_temper: HOT,
  artificial_age: WARM,
  anneal: WARM,
  stress_relief: WARM,
  embrittlement_relief: WARM,
  cadmium_plate: WET,
  zinc_plate: WET,
  nickel_plate: WET,
  chromium_plate: WET,
  anodize: WET,
  chemical_film: WET,
  passivation: WET,
  phosphate: WET,
  fluorescent_penetrant: WET,
  magnetic_particle: [],
  shot_peen: [],
  radiography: [],
  ultrasonic: [],
};

/** Null where the part does not say its size. A flat blank is as high as it is thick. */
function boxOf({ part }: CheckedLine): Box | null {
  const { lengthMm, widthMm, thicknessMm } = part;
  const heightMm = part.heightMm ?? thicknessMm;
  return lengthMm === null || widthMm === null || heightMm === null ? null : { lengthMm, widthMm, heightMm };
}

interface Fit {
  readonly room: CheckedEquipment;
  readonly fit: EquipmentFit;
}

/** The first that it lies straight in, else the first that it fits at all, else the largest; null without a size. */
function fitOf(line: CheckedLine, rooms: readonly CheckedEquipment[]): Fit | null {
  const box = boxOf(line);
  if (!box) return null;
  const tried = [...rooms]
    .sort((one, other) => volumeOf(other) - volumeOf(one))
    .flatMap((room): Fit[] => {
      const fit = fitsEquipment(box, room, { clearanceMm: 0, turning: 'any' });
      return fit.ok ? [{ room, fit }] : [];
    });
  return (
    tried.find(({ fit }) => fit.lies === 'straight') ?? tried.find(({ fit }) => fit.fits) ?? tried[0] ?? null
  );
}

const volumeOf = ({ lengthMm, widthMm, heightMm }: Box): number => lengthMm * widthMm * heightMm;

function findingOf({ processor }: CheckFacts, line: CheckedLine, found: Fit | null): Finding[] {
  if (!found || found.fit.lies === 'straight') return [];
  const { room, fit } = found;
  const size = `It is ${sizeOf(line)}; ${room.name} takes ${room.sizeWords}`;
  const source = `${processor.name}’s equipment as entered; laid diagonally by ${PROOF}`;
  if (fit.fits)
    return [
      {
        code: 'part_lies_diagonally',
        level: 'note',
        subject: `${line.id} ${room.id}`,
        sentence: `Line ${line.lineNo} fits ${room.name} only laid diagonally.`,
        rest: `${size}. Fewer lie side by side.`,
        source,
        waysOut: [],
      },
    ];
  return [
    {
      code: 'part_fits_nowhere',
      level: 'stop',
      subject: line.id,
      sentence: `Line ${line.lineNo} fits no ${room.kind} of ${processor.name}.`,
      rest: `${size}, the largest entered: ${WHY[fit.because ?? 'too_large_in_plan']}, however it is turned.`,
      source,
      waysOut: [
        { way: 'take_out_line', says: `Take line ${line.lineNo} out`, lineId: line.id },
        SEE_EQUIPMENT,
        OVERRIDE,
      ],
    },
  ];
}

const PROOF = 'Carver’s condition';
const SEE_EQUIPMENT: WayOut = { way: 'see_processor', says: 'See its equipment' };
const WHY: Record<NonNullable<EquipmentFit['because']>, string> = {
  too_high: 'too high',
  too_large_in_plan: 'too large in plan, also diagonally',
};

const sizeOf = ({ part }: CheckedLine): string =>
  part.sizeWords ?? [part.lengthMm, part.widthMm, part.heightMm ?? part.thicknessMm].join(' × ');

function sizeNotStated(lines: readonly CheckedLine[]): Finding[] {
  const silent = lines.filter((line) => boxOf(line) === null);
  const [first] = silent;
  if (!first) return [];
  const which = linesWords(silent.map(({ lineNo }) => lineNo));
  return [
    {
      code: 'part_size_not_stated',
      level: 'note',
      subject: '',
      sentence: `Whether ${which} ${silent.length === 1 ? 'fits' : 'fit'} the equipment is not checked.`,
      rest: 'Their parts do not say length, width and height; nothing is concluded.',
      waysOut: [{ way: 'state_order', says: `State it for ${first.partNumber}`, partId: first.part.id }],
    },
  ];
}

/** A load heavier than any hearth can be split; so it warns. */
function heavyLoads({ tables, lines, processor }: CheckFacts): Finding[] {
  const hearths = processor.equipment.filter(({ kind }) => kind !== 'tank');
  const strongest = hearths.reduce<CheckedEquipment | null>(
    (best, one) => ((one.limitG ?? 0) > (best?.limitG ?? 0) ? one : best),
    null,
  );
  // One hearth of unknown strength may carry it.
  if (!strongest || strongest.limitG === null || hearths.some(({ limitG }) => limitG === null)) return [];
  const loads = loadsAsSet(tables, lines);
  return loads.flatMap((load) => heavyLoad(tables, load, { strongest, isOnly: loads.length === 1 }));
}

function heavyLoad(
  tables: BatchTables,
  load: NumberedLoad<CheckedLine>,
  { strongest, isOnly }: { strongest: CheckedEquipment; isOnly: boolean },
): Finding[] {
  const mass = massOf(tables, load.lines);
  if (!mass || mass.massG === 0) return [];
  const stands = massOnHearth([{ massKg: mass.massG / 1000, pieces: 1 }], (strongest.limitG ?? 0) / 1000);
  if (!stands.ok || stands.within) return [];
  return [
    {
      code: 'load_over_hearth',
      level: 'warn',
      subject: `load ${load.number}`,
      sentence: `${isOnly ? 'The load' : `Load ${load.number}`} is heavier than any hearth carries.`,
      rest: `${mass.isComputed ? 'About ' : ''}${massBeside(stands.totalKg, strongest.limitWords)}; ${strongest.name} carries ${strongest.limitWords ?? ''}. Split it, or ask how it is run.`,
      ...citing(stands.source),
      waysOut: [{ way: 'set_loads', says: 'Set the loads' }, SEE_EQUIPMENT],
    },
  ];
}

/** In the unit of what it is compared with. */
const massBeside = (kg: number, words: string | null): string =>
  words?.endsWith('lb') ? `${poundsFromKg(kg).toFixed(0)} lb` : `${kg.toFixed(1)} kg`;
