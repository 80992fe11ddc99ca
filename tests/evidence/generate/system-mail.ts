import { printedUnit } from './as-printed';
import { broken, columnsOf, widthsOf } from './characters';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, eachLine, SPANS, specWritten } from './notation';
import { DAYS, degrees } from './wording';

/** What a house's system sends by itself: labels with dots, tables with bars, in the mail's own text. */
export const systemMail: Layout = {
  name: 'system mail',
  hand: 'british',
  textOnly: true,
  states: (truth) => eachLine(truth, (line) => ({ ...line, qty_rejected: null })),
  draw: (told) => Promise.resolve(new TextEncoder().encode(mailOf(told))),
};

const barred = (rows: readonly (readonly string[])[]): string[] => {
  const widths = widthsOf(rows).map((width) => width - 1);
  const line = `+${widths.map((width) => '-'.repeat(width + 1)).join('+')}+`;
  const [head = [], ...body] = rows.map(
    (row) =>
      `| ${row.map((cell, index) => columnsOf([widths[index] ?? 0], [cell]).padEnd((widths[index] ?? 0) - 1)).join(' | ')} |`,
  );
  return [line, String(head), line, ...body, line];
};

function mailOf(told: Told): string {
  const { story, hand, dice } = told;
  const { truth } = story;
  const written = { day: DAYS.shortNamed, clock: CLOCKS.plain };
  const dotted = (label: string, value: string): string => `${label.padEnd(22, '.')}: ${value}`;
  return [
    '*** This message was sent by our order system. Please do not reply. ***',
    '',
    `${truth.processor ?? ''}`,
    story.address.join(', '),
    '',
    'CERTIFICATE OF CONFORMITY',
    '',
    dotted('Certificate', truth.certificate_number ?? ''),
    dotted('Issued', DAYS.shortNamed(truth.certificate_date ?? '')),
    dotted('Customer order', truth.purchase_order ?? ''),
    dotted('Customer batch', truth.batch ?? ''),
    dotted('Works order', `W${dice.whole(10000, 99999)}`),
    dotted('Process', PROCESS_NAMES.formal[truth.process ?? ''] ?? ''),
    dotted('Process specification', specWritten(truth, 'rev')),
    ...(truth.class_type === null ? [] : [dotted('Class or condition', truth.class_type)]),
    '',
    ...barred([
      ['Part number', 'Issue', 'Material', 'Lot', 'Qty'],
      ...truth.lines.map((line) => [
        line.part_number ?? '',
        line.rev ?? '',
        line.material ?? '',
        line.lot ?? '',
        String(line.qty_accepted),
      ]),
    ]),
    '',
    ...(truth.plating_end === null
      ? []
      : [dotted('Plating completed', dayAndTime(truth.plating_end, written)), '']),
    ...(truth.cycles.length === 0
      ? []
      : [
          ...barred([
            ['Stage', 'Temp', 'On', 'Off', 'Time'],
            ...truth.cycles.map((cycle) => [
              STEP_NAMES.formal[cycle.step] ?? '',
              cycle.set_temp === null ? 'Room' : degrees(hand, cycle.set_temp),
              dayAndTime(cycle.soak_start, written),
              dayAndTime(cycle.soak_end, written),
              SPANS.parts(cycle.minutes ?? 0),
            ]),
          ]),
          '',
        ]),
    ...(story.work.quench ? [dotted('Quench', story.work.quench)] : []),
    ...(truth.quench_delay_s === null ? [] : [dotted('Quench delay', `${truth.quench_delay_s} s`)]),
    ...truth.readings.map((reading) =>
      dotted(
        READING_NAMES.formal[reading.kind] ?? '',
        `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
      ),
    ),
    '',
    ...broken(
      truth.conformance_statement
        ? 'We certify that the above goods have been processed and inspected in accordance with the order and conform to the specification stated.'
        : 'Our conditions of trade apply to all work.',
      78,
    ),
    '',
    truth.signature_present
      ? `Electronically approved by: ${story.signer} (${story.signerTitle}) ${DAYS.shortNamed(truth.certificate_date ?? '')} 16:40`
      : `Approval pending: ${story.signer} (${story.signerTitle})`,
    '',
  ].join('\r\n');
}
