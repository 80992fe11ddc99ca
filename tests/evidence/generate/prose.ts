import { printedUnit } from './as-printed';
import { readingValues, specification, statement, type Told } from './content';
import { degrees, lasting, moment } from './wording';

const classWords = ({ story }: Told): string => {
  const { class_type: value } = story.truth;
  if (value === null) return '';
  return / to /.test(value) ? `, from ${value}` : `, ${value}`;
};

const STEPS: Readonly<Record<string, string>> = {
  solution: 'solution heat treated',
  natural_age: 'naturally aged',
  artificial_age: 'artificially aged',
  austenitize: 'austenitized',
  temper: 'tempered',
  stress_relief: 'stress relieved',
  embrittlement_relief: 'baked for hydrogen embrittlement relief',
};

/** What was done, in sentences. */
function done(told: Told): string {
  const { story, hand } = told;
  const { truth } = story;
  const cycles = truth.cycles.map((cycle) => {
    const heat = cycle.set_temp === null ? 'at room temperature' : `at ${degrees(hand, cycle.set_temp)}`;
    return `The parts were ${STEPS[cycle.step] ?? cycle.step} ${heat} for ${lasting(hand, cycle.minutes ?? 0)}, from ${moment(hand, cycle.soak_start ?? '')} to ${moment(hand, cycle.soak_end ?? '')}.`;
  });
  const quench =
    story.work.quench && truth.quench_delay_s !== null
      ? [
          `They were quenched in ${story.work.quench.toLowerCase()}; quench delay ${truth.quench_delay_s} seconds.`,
        ]
      : [];
  const plated = truth.plating_end === null ? [] : [`Plating completed ${moment(hand, truth.plating_end)}.`];
  const readings = truth.readings.map(
    (reading) =>
      `${{ hardness: 'Hardness', conductivity: 'Conductivity', thickness: 'Coating thickness' }[reading.kind] ?? reading.kind} measured ${readingValues(told, reading)} ${printedUnit(reading.unit, told.dice)}.`,
  );
  return [...plated, ...cycles, ...quench, ...readings].join(' ');
}

const WORK: Readonly<Record<string, string>> = {
  solution_heat_treat_and_age: 'solution heat treat and age',
  harden_and_temper: 'harden and temper',
  stress_relief: 'stress relief',
  cadmium_plate: 'cadmium plating',
  zinc_plate: 'zinc plating',
  anodize: 'anodizing',
  chemical_film: 'chemical film treatment',
  passivation: 'passivation',
  fluorescent_penetrant: 'fluorescent penetrant inspection',
  magnetic_particle: 'magnetic particle inspection',
};

export function letterProse(told: Told): string[] {
  const { story, dice } = told;
  const { truth } = story;
  return [
    `${dice.pick(['Re:', 'Subject:', 'Reference:'])} Purchase Order ${truth.purchase_order ?? ''}, Certificate No. ${truth.certificate_number ?? ''}, Batch ${truth.batch ?? ''}`,
    `${dice.pick(['Dear Customer,', 'To whom it may concern:'])}`,
    `The parts listed below received ${WORK[truth.process ?? ''] ?? ''} per ${specification(told)}${classWords(told)}. ${done(told)}`,
  ];
}

/** A mail whose text is the certificate. */
export function emailText(told: Told): string {
  const { story, hand, dice } = told;
  const { truth } = story;
  const lines = truth.lines.map((line) =>
    dice.pick([
      `- P/N ${line.part_number ?? ''} Rev ${line.rev ?? ''}, lot ${line.lot ?? ''}, material ${line.material ?? ''}: ${line.qty_accepted ?? ''} pcs accepted, ${line.qty_rejected ?? ''} rejected`,
      `- Part No. ${line.part_number ?? ''} Rev. ${line.rev ?? ''}, material ${line.material ?? ''}, lot ${line.lot ?? ''}, accepted ${line.qty_accepted ?? ''}, rejected ${line.qty_rejected ?? ''}`,
    ]),
  );
  return [
    `${truth.processor ?? ''}`,
    ...story.address,
    '',
    'Certificate of Conformance',
    '',
    `Certificate number: ${truth.certificate_number ?? ''}`,
    `Date: ${hand.day(truth.certificate_date ?? '')}`,
    `Your PO: ${truth.purchase_order ?? ''}`,
    `Batch: ${truth.batch ?? ''}`,
    '',
    `The following parts received ${WORK[truth.process ?? ''] ?? ''} per ${specification(told)}${classWords(told)}:`,
    '',
    ...lines,
    '',
    done(told),
    '',
    statement(told),
    '',
    truth.signature_present
      ? `Electronically signed by ${story.signer}, ${story.signerTitle}`
      : `${story.signer}, ${story.signerTitle}`,
  ].join('\n');
}
