import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, oneRejected, received, SPANS, specWritten } from './notation';
import { fixedTable, type Column } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import { pastedSignature } from './signing';
import { DAYS } from './wording';

interface Group {
  readonly said: string;
  readonly columns: readonly Column[];
}

/** Headings of two storeys: a word over several columns, which have their own below it; day and time apart. */
export const spanningHeads: Layout = {
  name: 'spanning heads',
  hand: 'american',
  states: (truth) => ({ ...oneRejected(truth), batch: null }),
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 8.5, [792, 612]);
    paper.text(truth.processor ?? '', 40, 42, { bold: true, size: 15 });
    paper.text(story.address.join(', '), 40, 54, { size: 8 });
    paper.text('PROCESS CERTIFICATION REPORT', 752, 42, { size: 12, align: 'right' });
    paper.text(`Run ${DAYS.us(story.received)} 06:12 AM   User QA2   Page 1 of 1`, 752, 54, {
      size: 7,
      align: 'right',
    });
    paper.y = 78;
    for (const fields of [
      [
        ['Certificate', truth.certificate_number ?? ''],
        ['Certificate date', DAYS.us(truth.certificate_date ?? '')],
        ['Order', truth.purchase_order ?? ''],
        ['Shop order', `${dice.whole(200000, 400000)}`],
      ],
      [
        ['Customer', story.customer],
        ['Process', PROCESS_NAMES.shop[truth.process ?? ''] ?? ''],
        ['Specification', specWritten(truth, 'rev')],
        ['Class/Cond', truth.class_type ?? ''],
      ],
    ]) {
      fields.forEach(([label = '', value = ''], column) => {
        paper.text(`${label}: ${value}`, 40 + 178 * column, paper.y);
      });
      paper.y += 14;
    }
    paper.y += 4;
    grouped(
      paper,
      [
        { said: '', columns: [{ head: 'Ln', width: 24 }] },
        {
          said: 'PART',
          columns: [
            { head: 'Number', width: 120 },
            { head: 'Rev', width: 34 },
            { head: 'Name', width: 90 },
          ],
        },
        {
          said: 'MATERIAL',
          columns: [
            { head: 'Description', width: 164 },
            { head: 'Lot', width: 100 },
          ],
        },
        {
          said: 'QUANTITY',
          columns: [
            { head: 'Received', width: 60, align: 'right' },
            { head: 'Accepted', width: 60, align: 'right' },
            { head: 'Rejected', width: 60, align: 'right' },
          ],
        },
      ],
      truth.lines.map((line, index) => [
        String(index + 1),
        line.part_number ?? '',
        line.rev ?? '',
        story.order.lines[index]?.description ?? '',
        line.material ?? '',
        line.lot ?? '',
        String(received(line)),
        String(line.qty_accepted),
        String(line.qty_rejected),
      ]),
    );
    work(paper, told);
    paper.y += 4;
    paper.prose(
      truth.conformance_statement
        ? 'The articles of this report are certified to have been processed in accordance with, and to conform to, the specification and the purchase order.'
        : 'End of report. Printed from the record of the shop order.',
      40,
      700,
    );
    paper.y += 40;
    await pastedSignature(paper, story, dice, 110);
    paper.text('Approved by', 40, paper.y);
    paper.rule([100, paper.y + 2], [280, paper.y + 2]);
    paper.text(`${story.signer}, ${story.signerTitle}`, 104, paper.y + 13, { size: 8 });
    return paper.save();
  },
};

function grouped(paper: Paper, groups: readonly Group[], rows: readonly (readonly string[])[]): void {
  const top = paper.y;
  let left = 40;
  for (const { said, columns } of groups) {
    const wide = columns.reduce((sum, { width }) => sum + width, 0);
    paper.frame(left, top, wide, 13);
    paper.text(said, left + wide / 2, top + 9.5, { size: 7, bold: true, align: 'centre' });
    left += wide;
  }
  paper.y = top + 13;
  fixedTable(
    paper,
    40,
    { columns: groups.flatMap(({ columns }) => columns), rows },
    { rules: 'all', headSize: 7 },
  );
}

function work(paper: Paper, told: Told): void {
  const { story, hand, dice } = told;
  const { truth } = story;
  const day = (moment: string | null): string => DAYS.us(moment?.slice(0, 10) ?? '');
  const clock = (moment: string | null): string => CLOCKS.plain(moment?.slice(11) ?? '');
  if (truth.cycles.length > 0)
    grouped(
      paper,
      [
        {
          said: 'CYCLE',
          columns: [
            { head: 'Operation', width: 150 },
            { head: 'Equip.', width: 60 },
            { head: `Set °${hand.unit}`, width: 60, align: 'right' },
          ],
        },
        {
          said: 'SOAK START',
          columns: [
            { head: 'Date', width: 100, align: 'centre' },
            { head: 'Time', width: 70, align: 'centre' },
          ],
        },
        {
          said: 'SOAK END',
          columns: [
            { head: 'Date', width: 100, align: 'centre' },
            { head: 'Time', width: 70, align: 'centre' },
          ],
        },
        { said: 'TOTAL', columns: [{ head: 'Time', width: 102, align: 'right' }] },
      ],
      truth.cycles.map((cycle) => [
        STEP_NAMES.shop[cycle.step] ?? '',
        cycle.set_temp === null ? '' : `F${dice.whole(1, 9)}`,
        cycle.set_temp === null ? 'AMB' : String(cycle.set_temp),
        day(cycle.soak_start),
        clock(cycle.soak_start),
        day(cycle.soak_end),
        clock(cycle.soak_end),
        SPANS.upper(cycle.minutes ?? 0),
      ]),
    );
  for (const [label, said] of [
    ['Quench', story.work.quench ?? ''],
    ['Quench delay', truth.quench_delay_s === null ? '' : `${truth.quench_delay_s} SEC`],
    ['Plating completed', dayAndTime(truth.plating_end, { day: DAYS.us, clock: CLOCKS.plain })],
    ...truth.readings.map(
      (reading) =>
        [
          READING_NAMES.formal[reading.kind] ?? '',
          `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
        ] as const,
    ),
  ] as const)
    if (said !== '') {
      paper.text(`${label}: ${said}`, 40, paper.y);
      paper.y += 13;
    }
}
