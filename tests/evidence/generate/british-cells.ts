import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, SPANS, specWritten } from './notation';
import { cellRow, fixedTable } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import { pastedSignature } from './signing';
import { DAYS, degrees } from './wording';

/** A British house: cells above a table, the process as run-in lines, much about the company at the foot. */
export const britishCells: Layout = {
  name: 'British cells',
  hand: 'british',
  states: (truth) => ({ ...truth, batch: null }),
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Times', 10, [595, 842]);
    paper.text(truth.processor ?? '', 555, 46, { bold: true, size: 17, align: 'right' });
    paper.text(story.address.join(', '), 555, 59, { size: 8.5, align: 'right' });
    paper.text(`Telephone 01632 960${dice.whole(100, 999)}`, 555, 70, { size: 8.5, align: 'right' });
    paper.text('CERTIFICATE OF CONFORMITY', 40, 98, { bold: true, size: 14 });
    paper.y = 110;
    cellRow(
      paper,
      [40, 515],
      [
        { label: 'C of C No.', value: truth.certificate_number ?? '' },
        { label: 'Customer Order No.', value: truth.purchase_order ?? '' },
        { label: 'Our Job No.', value: `J${dice.whole(10000, 99999)}` },
        { label: 'Date', value: DAYS.militaryLong(truth.certificate_date ?? '') },
      ],
    );
    cellRow(
      paper,
      [40, 515],
      [
        { label: 'Customer', value: `${story.customer}\nUnit 4, Old Aerodrome Road` },
        { label: 'Delivery Note', value: `DN${dice.whole(2000, 9000)}` },
        { label: 'Material', value: truth.lines[0]?.material ?? '', share: 1.4 },
      ],
    );
    cellRow(
      paper,
      [40, 515],
      [
        { label: 'Process', value: PROCESS_NAMES.formal[truth.process ?? ''] ?? '', share: 1.3 },
        { label: 'Process Specification', value: specWritten(truth, 'revision') },
        ...(truth.class_type === null
          ? []
          : [
              {
                label: / to /.test(truth.class_type) ? 'Condition' : 'Class',
                value: truth.class_type,
                share: 1.3,
              },
            ]),
      ],
    );
    paper.y += 12;
    fixedTable(
      paper,
      40,
      {
        columns: [
          { head: 'Item', width: 34, align: 'centre' },
          { head: 'Part No.', width: 130 },
          { head: 'Issue', width: 40, align: 'centre' },
          { head: 'Description', width: 111 },
          { head: 'Cast / Lot No.', width: 90 },
          { head: 'Qty Despatched', width: 60, align: 'right' },
          { head: 'Qty Rejected', width: 50, align: 'right' },
        ],
        rows: truth.lines.map((line, index) => [
          String(index + 1),
          line.part_number ?? '',
          line.rev ?? '',
          story.order.lines[index]?.description ?? '',
          line.lot ?? '',
          String(line.qty_accepted),
          String(line.qty_rejected),
        ]),
      },
      { rules: 'all' },
    );
    paper.y += 4;
    for (const [label, said] of processLines(told)) {
      paper.text(label, 44, paper.y, { bold: true });
      paper.text(said, 48 + paper.widthOf(label, { bold: true }), paper.y);
      paper.y += 15;
    }
    paper.y += 8;
    paper.prose(
      truth.conformance_statement
        ? 'Certified that the whole of the supplies detailed hereon have been processed, inspected and tested and, unless otherwise stated, conform in all respects to the specification(s), drawing(s) and order relative thereto.'
        : 'All work is undertaken subject to our Conditions of Contract, a copy of which may be had on request. Goods are held at the risk of the customer.',
      44,
      505,
    );
    paper.y += 44;
    paper.text('Signed for and on behalf of the Company', 44, paper.y);
    await pastedSignature(paper, story, dice, 230);
    paper.y += 14;
    paper.text(`${story.signer}, ${story.signerTitle}`, 230, paper.y);
    if (truth.signature_present) {
      paper.circle(450, paper.y - 18, 21);
      paper.text('QA', 450, paper.y - 20, { align: 'centre', size: 9, bold: true });
      paper.text(String(dice.whole(2, 19)), 450, paper.y - 9, { align: 'centre', size: 9, bold: true });
    }
    paper.text(
      `Registered in England No. 0${dice.whole(1000000, 9999999)}   VAT Reg. No. GB ${dice.whole(100, 999)} ${dice.whole(1000, 9999)} ${dice.whole(10, 99)}   Approved to BS EN 9100:2018 and ISO 14001`,
      297,
      816,
      { size: 7, align: 'centre' },
    );
    return paper.save();
  },
};

function processLines(told: Told): (readonly [string, string])[] {
  const { story, hand, dice } = told;
  const { truth } = story;
  const written = { day: DAYS.militaryLong, clock: CLOCKS.plain, between: ' at ' };
  return [
    ...(truth.plating_end === null
      ? []
      : [['Plating completed:', dayAndTime(truth.plating_end, written)] as const]),
    ...truth.cycles.map(
      (cycle) =>
        [
          `${STEP_NAMES.formal[cycle.step] ?? ''}:`,
          `${cycle.set_temp === null ? 'room temperature' : `${degrees(hand, cycle.set_temp)}`}, from ${dayAndTime(cycle.soak_start, written)} to ${dayAndTime(cycle.soak_end, written)} (${SPANS.parts(cycle.minutes ?? 0)})`,
        ] as const,
    ),
    ...(story.work.quench
      ? [
          [
            'Quenching:',
            `${story.work.quench.toLowerCase()}${truth.quench_delay_s === null ? '' : `; quench delay ${truth.quench_delay_s} s`}`,
          ] as const,
        ]
      : []),
    ...truth.readings.map(
      (reading) =>
        [
          `${READING_NAMES.formal[reading.kind] ?? ''}:`,
          `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
        ] as const,
    ),
    ...(story.work.trade === 'inspection' ? [['Result:', 'No relevant indications found.'] as const] : []),
  ];
}
