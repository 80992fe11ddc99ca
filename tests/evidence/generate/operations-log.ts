import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { approvals, formFoot, telephone } from './house-noise';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import {
  CLOCKS,
  dayAndTime,
  demanded,
  oneRejected,
  received,
  sampled,
  SPANS,
  specWritten,
  tempers,
} from './notation';
import { cellRow, fixedTable } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import { scriptSignature } from './signing';
import { DAYS, degrees } from './wording';

const LETTER = [612, 792] as const;

/** A job shop's form: cells, a log of numbered operations, what was asked beside what was found. */
export const operationsLog: Layout = {
  name: 'operations log',
  hand: 'american',
  states: oneRejected,
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 9, LETTER);
    paper.text(truth.processor ?? '', 36, 46, { bold: true, size: 15 });
    const [street, town] = story.address;
    [street ?? '', town ?? '', `PH ${telephone(dice)}  FAX ${telephone(dice)}`].forEach((line, turn) =>
      paper.text(line, 576, 36 + 10 * turn, { size: 8, align: 'right' }),
    );
    paper.spaced('CERTIFICATION OF PROCESSING', 306, 82, { size: 12, bold: true, gap: 2.2, align: 'centre' });
    paper.y = 96;
    cellRow(
      paper,
      [36, 540],
      [
        { label: 'SOLD TO', value: story.customer.toUpperCase(), share: 2 },
        { label: 'CUST. P.O.', value: truth.purchase_order ?? '' },
        { label: 'OUR W/O', value: `${dice.whole(100000, 999999)}` },
      ],
    );
    cellRow(
      paper,
      [36, 540],
      [
        { label: 'CERT. NO.', value: truth.certificate_number ?? '' },
        { label: 'CERT. DATE', value: hand.day(truth.certificate_date ?? '') },
        { label: "DATE REC'D", value: hand.day(story.order.dispatched ?? '') },
        { label: 'CUST. BATCH', value: truth.batch ?? '' },
      ],
    );
    const change = tempers(truth);
    cellRow(
      paper,
      [36, 540],
      [
        { label: 'PROCESS PERFORMED', value: PROCESS_NAMES.shop[truth.process ?? ''] ?? '', share: 1.4 },
        { label: 'SPEC. CALLOUT', value: specWritten(truth, 'glued') },
        ...(change
          ? [
              { label: "COND. AS REC'D", value: change.from },
              { label: 'COND. AS SHIPPED', value: change.to },
            ]
          : [{ label: 'TYPE / CLASS', value: truth.class_type?.toUpperCase() ?? '', share: 1.6 }]),
      ],
    );
    paper.y += 8;
    fixedTable(
      paper,
      36,
      {
        columns: [
          { head: 'QTY RECD', width: 44, align: 'centre' },
          { head: 'QTY SHPD', width: 44, align: 'centre' },
          { head: 'QTY REJ', width: 40, align: 'centre' },
          { head: 'PART NO. / DESCRIPTION', width: 160 },
          { head: 'MATL', width: 152 },
          { head: 'HT / LOT NO.', width: 100 },
        ],
        rows: truth.lines.map((line, index) => [
          String(received(line)),
          String(line.qty_accepted),
          String(line.qty_rejected),
          `${line.part_number ?? ''} REV ${line.rev ?? ''}\n${story.order.lines[index]?.description ?? ''}`,
          line.material ?? '',
          line.lot ?? '',
        ]),
      },
      { rules: 'all' },
    );
    logOf(paper, told);
    if (truth.readings.length > 0)
      fixedTable(
        paper,
        36,
        {
          columns: [
            { head: 'INSPECTION', width: 120 },
            { head: "REQ'D", width: 110 },
            { head: 'ACTUAL', width: 220 },
            { head: 'TESTED', width: 90 },
          ],
          rows: truth.readings.map((reading) => [
            READING_NAMES.shop[reading.kind] ?? '',
            demanded(told, reading.kind),
            `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
            sampled(truth, reading.values.length),
          ]),
        },
        { rules: 'all' },
      );
    paper.y += 8;
    paper.prose(
      truth.conformance_statement
        ? 'WE CERTIFY THAT THE ABOVE LISTED PARTS WERE PROCESSED AND INSPECTED IN ACCORDANCE WITH THE SPECIFICATION AND PURCHASE ORDER NOTED AND WERE FOUND TO CONFORM. RECORDS ARE ON FILE FOR REVIEW.'
        : 'OUR LIABILITY IS LIMITED TO TWICE THE CHARGE FOR PROCESSING. CLAIMS MUST BE MADE WITHIN 10 DAYS. RECORDS ARE ON FILE FOR REVIEW.',
      38,
      530,
      { size: 8 },
    );
    paper.y += 34;
    paper.text('INSPECTED BY', 38, paper.y, { size: 8 });
    scriptSignature(paper, story, 108);
    paper.rule([104, paper.y], [290, paper.y]);
    paper.text(`${story.signer.toUpperCase()} - ${story.signerTitle.toUpperCase()}`, 300, paper.y, {
      size: 8,
    });
    paper.text(formFoot(dice), 36, 762, { size: 6.5 });
    paper.text(approvals(dice), 576, 762, { size: 6.5, align: 'right' });
    return paper.save();
  },
};

function logOf(paper: Paper, { story, hand, dice }: Told): void {
  const { truth } = story;
  const written = { day: DAYS.us, clock: CLOCKS.military };
  const steps = truth.cycles.map((cycle) => [
    STEP_NAMES.shop[cycle.step] ?? '',
    cycle.set_temp === null ? '' : `FCE ${dice.whole(1, 12)}`,
    cycle.set_temp === null ? 'R.T.' : degrees(hand, cycle.set_temp),
    dayAndTime(cycle.soak_start, written),
    dayAndTime(cycle.soak_end, written),
    SPANS.upper(cycle.minutes ?? 0),
  ]);
  const quench = story.work.quench
    ? [
        [
          `${story.work.quench.toUpperCase()} QUENCH${truth.quench_delay_s === null ? '' : `, DELAY ${truth.quench_delay_s} SEC`}`,
        ],
      ]
    : [];
  const plate =
    truth.plating_end === null
      ? []
      : [['PLATE', `TANK ${dice.whole(2, 9)}`, '', '', dayAndTime(truth.plating_end, written), '']];
  const done = PROCESS_NAMES.shop[truth.process ?? ''] ?? '';
  const other = steps.length === 0 ? [[done]] : [];
  const rows = [
    ['RECEIVE, COUNT AND VERIFY'],
    ['CLEAN'],
    ...plate,
    ...steps.slice(0, 1),
    ...quench,
    ...steps.slice(1),
    ...other,
    ['FINAL INSPECT AND PACK'],
  ].map((row, index) => [String(10 * (index + 1)).padStart(3, '0'), ...row]);
  fixedTable(
    paper,
    36,
    {
      columns: [
        { head: 'OP', width: 30 },
        { head: 'OPERATION', width: 150 },
        { head: 'FCE / TANK', width: 62 },
        { head: 'TEMP', width: 48 },
        { head: 'IN', width: 94 },
        { head: 'OUT', width: 94 },
        { head: 'TIME', width: 62 },
      ],
      rows,
    },
    { rules: 'columns' },
  );
}
