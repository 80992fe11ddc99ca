import { printedUnit } from './as-printed';
import { columnsOf, broken, widthsOf } from './characters';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, received, SPANS, specWritten } from './notation';
import { DAYS, degrees } from './wording';

/** An answer by mail: the certificate typed into it in columns, the question quoted below. */
export const mailReply: Layout = {
  name: 'mail reply',
  hand: 'american',
  textOnly: true,
  draw: (told) => Promise.resolve(new TextEncoder().encode(mailOf(told))),
};

function mailOf(told: Told): string {
  const { story, dice } = told;
  const { truth } = story;
  const name = story.signer.split(' ').at(-1)?.toLowerCase() ?? 'quality';
  const house = (truth.processor ?? '').split(' ')[0]?.toLowerCase() ?? 'house';
  return [
    `From: ${story.signer} <${name}@${house}.example>`,
    'To: receiving@wrenaircraft.example',
    `Date: ${DAYS.shortNamed(truth.certificate_date ?? '')} 16:${dice.whole(10, 59)}:07 -0500`,
    `Subject: RE: cert for ${truth.purchase_order ?? ''}`,
    '',
    'Good afternoon,',
    '',
    ...broken(
      'The truck left here at 3:15. Your cert is below, the signed original goes in the box with the parts.',
      76,
    ),
    '',
    '='.repeat(76),
    `CERTIFICATE OF COMPLIANCE    ${truth.processor ?? ''}`,
    `${story.address.join(', ')}`,
    '='.repeat(76),
    ...headOf(told),
    '',
    ...partsOf(told),
    '',
    ...workOf(told),
    ...broken(
      truth.conformance_statement
        ? 'We certify that the parts above were processed per the specification and purchase order and conform to them.'
        : 'Let me know if you need the furnace charts too.',
      76,
    ),
    '',
    ...(truth.signature_present ? [`/s/ ${story.signer}`] : [story.signer]),
    `${story.signerTitle}, ${truth.processor ?? ''}`,
    '',
    `On ${DAYS.shortNamed(truth.certificate_date ?? '')}, Receiving wrote:`,
    '> Hi, we got the traveler back but there is no certificate with it. Can you send',
    '> it over? I have 3 more jobs waiting on it. Thanks! Ext. 214',
    '',
  ].join('\n');
}

function headOf({ story, hand }: Told): string[] {
  const { truth } = story;
  const rows = [
    ['Cert #', truth.certificate_number ?? ''],
    ['Cert date', hand.day(truth.certificate_date ?? '')],
    ['Your PO', truth.purchase_order ?? ''],
    ['Your batch', truth.batch ?? ''],
    ['Process', PROCESS_NAMES.plain[truth.process ?? ''] ?? ''],
    ['Spec', specWritten(truth, 'rev')],
    ...(truth.class_type === null ? [] : [['Type/class/cond', truth.class_type]]),
  ];
  return rows.map(([label = '', value = '']) => `${label.padEnd(18)}${value}`);
}

function partsOf({ story }: Told): string[] {
  const rows = [
    ['Part no', 'Rev', 'Material', 'Lot', 'Recd', 'Acc', 'Rej'],
    ...story.truth.lines.map((line) => [
      line.part_number ?? '',
      line.rev ?? '',
      line.material ?? '',
      line.lot ?? '',
      String(received(line)),
      String(line.qty_accepted),
      String(line.qty_rejected),
    ]),
  ];
  const widths = widthsOf(rows);
  const [head = [], ...body] = rows;
  return [
    columnsOf(widths, head),
    columnsOf(
      widths,
      widths.map((width) => '-'.repeat(width - 2)),
    ),
    ...body.map((row) => columnsOf(widths, row)),
  ];
}

function workOf(told: Told): string[] {
  const { story, hand, dice } = told;
  const { truth } = story;
  const written = { day: hand.day, clock: CLOCKS.lower };
  const cycles = [
    ['Step', 'Temp', 'Start', 'Finish', 'Soak'],
    ...truth.cycles.map((cycle) => [
      STEP_NAMES.shop[cycle.step]?.toLowerCase() ?? '',
      cycle.set_temp === null ? 'ambient' : degrees(hand, cycle.set_temp),
      dayAndTime(cycle.soak_start, written),
      dayAndTime(cycle.soak_end, written),
      SPANS.words(cycle.minutes ?? 0),
    ]),
  ];
  const widths = widthsOf(cycles);
  const quenched = story.work.quench
    ? [
        `Quenched in ${story.work.quench.toLowerCase()}${truth.quench_delay_s === null ? '' : `, ${truth.quench_delay_s} seconds door to quench`}.`,
        '',
      ]
    : [];
  const plated =
    truth.plating_end === null
      ? []
      : [`Out of the plating tank ${dayAndTime(truth.plating_end, written)}`, ''];
  const readings = truth.readings.map(
    (reading) =>
      `${(READING_NAMES.shop[reading.kind] ?? '').toLowerCase()}: ${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
  );
  return [
    ...plated,
    ...(truth.cycles.length === 0 ? [] : [...cycles.map((row) => columnsOf(widths, row)), '']),
    ...quenched,
    ...(readings.length === 0 ? [] : [...readings, '']),
  ];
}
