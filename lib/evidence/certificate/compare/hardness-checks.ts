import { familyOf, type AlloyFamily } from '@/lib/trade/alloys/alloy';
import { acceptanceOf } from '@/lib/trade/acceptance/acceptance-of';
import { iacsFromMsPerM } from '@/lib/trade/acceptance/conductivity';
import { judgeCondition } from '@/lib/trade/acceptance/judge-condition';
import { convertHardness, type HardnessQuestion } from '@/lib/trade/hardness/convert-hardness';
import { readEachList } from '@/lib/trade/hardness/read-each-list';

import type { Order } from '../../order';
import type { Reading } from '../certificate';
import type { Check, Compared } from './compared';
import { cannotTell, doubtful, meets, notStated, wrong, type Outcome } from './outcome';
import { sideOf } from './range';
import { conductivityUnit, hardnessName, hardnessScale } from './reading-units';
import { readingsOf } from './readings-of';
import { sayList, sayNumber, sayRange } from './say';
import { alloyIn, saysClad, tempersIn } from './tempers-in';

const HARDNESS = /^hardness/;

/** Hardness within its limits; another scale is converted where a table allows, and proves nothing. */
export const isHardEnough: Check = (compared) => {
  const { order } = compared;
  const { hardness } = order.requirements;
  if (!hardness) return [];
  const scale = hardnessName(hardness.scale);
  const ordered = `${sayRange(hardness, sayNumber)} ${scale}`;
  const asked = { requirement: `hardness ${ordered}`, ordered };
  const readings = readingsOf(compared, HARDNESS);
  if (readings.length === 0) return [notStated(asked)];
  const own = readings.filter(({ unit }) => unit !== null && hardnessName(unit) === scale);
  // Where it was read in the scale asked for, that decides.
  return (own.length > 0 ? own : readings).map((reading) => hardnessOutcome(reading, compared, asked));
};

function hardnessOutcome(
  { values, unit }: Reading,
  { order, tables }: Compared,
  asked: { requirement: string; ordered: string },
): Outcome {
  const range = order.requirements.hardness ?? { scale: '' };
  const scale = hardnessName(range.scale);
  const says = { ...asked, stated: `${sayList(values)}${unit === null ? '' : ` ${hardnessName(unit)}`}` };
  const out = values.find((value) => sideOf(value, range) !== 'within');
  if (unit === null)
    return out === undefined
      ? cannotTell(says, `${says.stated} is printed without a scale.`)
      : doubtful(
          'hardness_out_of_range',
          says,
          `The hardness is stated as ${says.stated} without a scale; in ${scale} it is out of ${asked.ordered}.`,
        );
  if (hardnessName(unit) !== scale) return convertedOutcome({ values, unit }, { order, tables }, says);
  return out === undefined
    ? meets(says, `${says.stated} lies within ${asked.ordered}.`)
    : wrong(
        'hardness_out_of_range',
        says,
        `The hardness ${sayNumber(out)} ${scale} is ${sideOf(out, range)} ${asked.ordered}.`,
      );
}

const CONVERTED_AS: Partial<Record<AlloyFamily, HardnessQuestion['material']>> = {
  low_alloy_steel: 'non_austenitic_steel',
  wrought_aluminium: 'wrought_aluminium',
};

const alloyOf = ({ requirements, lines }: Order) =>
  alloyIn(requirements.alloy ?? '') ?? alloyIn(lines[0]?.material ?? '');

function convertedOutcome(
  { values, unit }: { values: readonly number[]; unit: string },
  { order, tables }: Pick<Compared, 'order' | 'tables'>,
  says: { requirement: string; ordered: string; stated: string },
): Outcome {
  const range = order.requirements.hardness ?? { scale: '' };
  const [from, to] = [hardnessScale(unit), hardnessScale(range.scale)];
  const alloy = alloyOf(order);
  const material = (alloy && CONVERTED_AS[familyOf(alloy)]) ?? 'other';
  const converted = values.map((value) => {
    if (from === null || to === null) return null;
    const read = readEachList(
      tables.hardness,
      (table) => convertHardness(table, { material, from, value, to }),
      (answer) => answer.value,
    );
    return read.answers[0] ?? null;
  });
  const [first] = converted;
  if (!first || converted.includes(null))
    return cannotTell(says, `No table here converts ${hardnessName(unit)} to ${range.scale} for this metal.`);
  const numbers = converted.flatMap((answer) => answer?.value ?? []);
  const words = `about ${sayList(numbers)} ${range.scale} by ${first.source.document}`;
  return numbers.every((value) => sideOf(value, range) === 'within')
    ? cannotTell(
        says,
        `${says.stated} is ${words}; a converted number never proves a limit in another scale.`,
      )
    : doubtful(
        'hardness_out_of_range',
        says,
        `The hardness ${says.stated} is ${words}, out of ${says.ordered}; a converted number is only near.`,
      );
}

/**
 * Hardness and conductivity together are those of the condition ordered, by the published pair. What the order limits
 * itself is judged by the order; clad metal has no published pair.
 */
export const readsAsItsCondition: Check = (compared) => {
  const { order, tables } = compared;
  const { requirements, lines } = order;
  const alloy = alloyOf(order);
  const condition = tempersIn(requirements.temper_out ?? '').at(-1);
  const isClad = saysClad(
    `${requirements.alloy ?? ''} ${lines.map(({ material }) => material ?? '').join(' ')}`,
  );
  if (!alloy || !condition || (requirements.hardness && requirements.conductivity_pct_iacs)) return [];
  const asked = { alloy, condition, isClad };
  const band = acceptanceOf(tables.acceptance, asked);
  const hardnesses = hardnessesOf(compared);
  const conductivities = conductivitiesOf(compared);
  // Only the pair speaks.
  if (!band.ok || hardnesses.length === 0 || conductivities.length === 0) return [];
  const judged = hardnesses.flatMap((hardness) =>
    conductivities.map((percentIacs) => {
      const verdict = judgeCondition(tables.acceptance, asked, { hardness, percentIacs });
      return verdict.ok ? { ...verdict, hardnessRead: hardness, percentIacs } : null;
    }),
  );
  const bad = judged.find(
    (one) =>
      one !== null &&
      !one.sourcesDisagree &&
      ((one.hardness === 'does_not_meet' && !requirements.hardness) ||
        (one.conductivity === 'does_not_meet' && !requirements.conductivity_pct_iacs)),
  );
  if (!bad) return [];
  return [
    doubtful(
      'readings_impossible_together',
      {
        requirement: null,
        ordered: `${alloy}-${condition}`,
        stated: `${bad.hardnessRead.value} ${bad.hardnessRead.scale}, ${sayNumber(bad.percentIacs)} % IACS`,
      },
      `${bad.hardnessRead.value} ${bad.hardnessRead.scale} with ${sayNumber(bad.percentIacs)} % IACS is not ${alloy}-${condition} (${band.source.document}).`,
    ),
  ];
};

const hardnessesOf = (compared: Compared) =>
  readingsOf(compared, HARDNESS).flatMap(({ unit, values }) => {
    const scale = unit === null ? null : hardnessScale(unit);
    return scale === null ? [] : values.map((value) => ({ scale, value }));
  });

const conductivitiesOf = (compared: Compared): number[] =>
  readingsOf(compared, /^conductivity/).flatMap(({ unit, values }) => {
    const known = unit === null ? null : conductivityUnit(unit);
    if (known === null) return [];
    return known === 'MS/m' ? values.map(iacsFromMsPerM) : values;
  });
