import { printedUnit } from './as-printed';
import { broken } from './characters';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, eachLine, SPANS, specWritten } from './notation';
import { DAYS, degrees } from './wording';

/** A mail that someone wrote by hand, with a list of what is in the box. */
export const toldByMail: Layout = {
  name: 'told by mail',
  hand: 'british',
  textOnly: true,
  states: (truth) => eachLine(truth, (line) => ({ ...line, qty_rejected: null, material: null })),
  draw: (told) => Promise.resolve(new TextEncoder().encode(mailOf(told))),
};

function mailOf(told: Told): string {
  const { story, dice } = told;
  const { truth } = story;
  const paragraphs = [
    'Hello,',
    `Please take this as our certificate of conformity no. ${truth.certificate_number ?? ''}, dated ${DAYS.named(truth.certificate_date ?? '')}, for your order ${truth.purchase_order ?? ''} (your batch ${truth.batch ?? ''}, our job ${dice.whole(3000, 9000)}). In the box are:`,
    truth.lines
      .map(
        (line) =>
          `  * ${line.qty_accepted} off ${line.part_number ?? ''} issue ${line.rev ?? ''}, lot ${line.lot ?? ''}`,
      )
      .join('\n'),
    `Process was ${(PROCESS_NAMES.formal[truth.process ?? ''] ?? '').toLowerCase()} to ${specWritten(truth, 'rev')}${truth.class_type === null ? '' : `, ${truth.class_type}`}.${done(told)}`,
    truth.conformance_statement
      ? 'We certify that these parts were processed and inspected to the specification and that they conform to your order.'
      : 'Shout if anything is missing from the box.',
    ...(truth.signature_present ? [`/s/ ${story.signer}`] : ['Kind regards,']),
    [
      `${story.signer}, ${story.signerTitle}`,
      truth.processor ?? '',
      ...story.address,
      'Tel. 01632 960550 (ext. 31)',
    ].join('\n'),
    broken(
      'This e-mail and any files with it are confidential. If you are not the addressee, delete it and tell us on 01632 960500. Registered office as above, company no. 04412876.',
      76,
    ).join('\n'),
  ];
  return `${paragraphs.map((one) => (one.includes('\n') ? one : broken(one, 76).join('\n'))).join('\n\n')}\n`;
}

function done(told: Told): string {
  const { story, hand, dice } = told;
  const { truth } = story;
  const written = { day: DAYS.shortNamed, clock: CLOCKS.plain };
  const said = [
    ...(truth.plating_end === null ? [] : [`Plating finished ${dayAndTime(truth.plating_end, written)}.`]),
    ...truth.cycles.map(
      (cycle) =>
        `${STEP_NAMES.formal[cycle.step] ?? ''} was ${SPANS.parts(cycle.minutes ?? 0)} at ${cycle.set_temp === null ? 'room temperature' : degrees(hand, cycle.set_temp)}, from ${dayAndTime(cycle.soak_start, written)} until ${dayAndTime(cycle.soak_end, written)}.`,
    ),
    ...(story.work.quench
      ? [
          `Quench was ${story.work.quench.toLowerCase()}${truth.quench_delay_s === null ? '' : `, quench delay ${truth.quench_delay_s} s`}.`,
        ]
      : []),
    ...truth.readings.map(
      (reading) =>
        `${{ hardness: 'Hardness', conductivity: 'Conductivity', thickness: 'Plating thickness' }[reading.kind] ?? ''} came out at ${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}.`,
    ),
  ];
  return said.length === 0 ? '' : ` ${said.join(' ')}`;
}
