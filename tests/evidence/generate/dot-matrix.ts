import { printedUnit } from './as-printed';
import { broken, columnsOf } from './characters';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, received, SPANS, specWritten } from './notation';
import { Paper } from './sheet-of-paper';
import { DAYS } from './wording';

const WIDE = 92;
const centred = (text: string): string =>
  `${' '.repeat(Math.max(0, Math.floor((WIDE - text.length) / 2)))}${text}`;

/** What a line printer writes: capitals, columns of letters, rules of dashes, two fields to a row. */
export const dotMatrix: Layout = {
  name: 'dot matrix',
  hand: 'american',
  async draw(told: Told) {
    const { story } = told;
    const paper = await Paper.open('Courier', 9.2, [612, 792]);
    paper.y = 40;
    for (const line of linesOf(told)) {
      // The capital of the micro sign is a Greek letter, which no printer had.
      paper.text(line.toUpperCase().replaceAll('\u039C', 'µ'), 48, paper.y);
      paper.y += 11.5;
    }
    paper.y += 26;
    if (story.truth.signature_present) paper.sign(180, paper.y - 2, told.dice.whole(100, 9000));
    paper.text(
      columnsOf([24, 32, 30], ['QUALITY CONTROL', '_'.repeat(30), story.signer.toUpperCase()]),
      48,
      paper.y,
    );
    paper.y += 30;
    paper.text(
      `FORM HT-${told.dice.whole(100, 300)}   PRINTED ${DAYS.us(story.received)} 0655   PAGE 1 OF 1`,
      48,
      paper.y,
    );
    return paper.save();
  },
};

function linesOf(told: Told): string[] {
  const { story, dice } = told;
  const { truth } = story;
  const written = { day: DAYS.usShort, clock: CLOCKS.military };
  const two = (...fields: readonly [string, string][]): string =>
    columnsOf(
      [48, 46],
      fields.map(([label, value]) => `${`${label}:`.padEnd(15)}${value}`),
    );
  return [
    centred(truth.processor ?? ''),
    centred(story.address.join('   ')),
    '',
    centred(`*** CERTIFICATION OF ${story.work.trade === 'inspection' ? 'INSPECTION' : 'PROCESS'} ***`),
    '',
    two(['CUST', story.customer], ['CERT NO', truth.certificate_number ?? '']),
    two(['CUST PO', truth.purchase_order ?? ''], ['CERT DATE', DAYS.usShort(truth.certificate_date ?? '')]),
    two(['CUST BATCH', truth.batch ?? ''], ['SHOP ORDER', `${dice.whole(40000, 90000)}-01`]),
    two(['PROCESS', PROCESS_NAMES.shop[truth.process ?? ''] ?? ''], ['SPEC', specWritten(truth, 'upper')]),
    ...(truth.class_type === null
      ? []
      : [two([/ to /.test(truth.class_type) ? 'CONDITION' : 'TYPE/CLASS', truth.class_type])]),
    '-'.repeat(WIDE),
    columnsOf([24, 5, 28, 14, 8, 7, 6], ['PART NO', 'REV', "MAT'L", 'HEAT/LOT', 'PCS IN', 'PCS OK', 'REJ']),
    '-'.repeat(WIDE),
    ...truth.lines.map((line) =>
      columnsOf(
        [24, 5, 28, 14, 8, 7, 6],
        [
          line.part_number ?? '',
          line.rev ?? '',
          line.material ?? '',
          line.lot ?? '',
          String(received(line)).padStart(5),
          String(line.qty_accepted).padStart(5),
          String(line.qty_rejected).padStart(3),
        ],
      ),
    ),
    '-'.repeat(WIDE),
    '',
    ...furnaceLines(told, written),
    ...truth.readings.map(
      (reading) =>
        `${{ hardness: 'HARDNESS', conductivity: 'CONDUCTIVITY', thickness: 'THICKNESS' }[reading.kind] ?? ''} ${printedUnit(reading.unit, dice)} . . . . ${readingValues(told, reading)}`,
    ),
    '',
    ...broken(
      truth.conformance_statement
        ? 'This is to certify that the parts listed hereon have been processed in conformance with the specification and the requirements of the purchase order. Test reports and furnace charts are on file.'
        : 'All quotations and work are subject to our standard terms. Test reports and furnace charts are on file.',
      WIDE - 4,
    ),
  ];
}

function furnaceLines({ story }: Told, written: Parameters<typeof dayAndTime>[1]): string[] {
  const { truth } = story;
  const quench = [
    ...(story.work.quench ? [`QUENCH: ${story.work.quench}`] : []),
    ...(truth.quench_delay_s === null ? [] : [`QUENCH DELAY: ${truth.quench_delay_s} SEC`]),
  ];
  return [
    ...(truth.plating_end === null
      ? []
      : [`PLATING COMPLETE: ${dayAndTime(truth.plating_end, written)}`, '']),
    ...(truth.cycles.length === 0
      ? []
      : [
          columnsOf([22, 10, 20, 20, 12], ['CYCLE', 'SET DEG F', 'DATE/TIME IN', 'DATE/TIME OUT', 'AT TEMP']),
        ]),
    ...truth.cycles.map((cycle) =>
      columnsOf(
        [22, 10, 20, 20, 12],
        [
          STEP_NAMES.shop[cycle.step] ?? '',
          cycle.set_temp === null ? 'ROOM' : String(cycle.set_temp),
          dayAndTime(cycle.soak_start, written),
          dayAndTime(cycle.soak_end, written),
          SPANS.upper(cycle.minutes ?? 0),
        ],
      ),
    ),
    ...(quench.length > 0 ? ['', quench.join('     ')] : []),
    '',
  ];
}
