import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, specWritten } from './notation';
import { cellRow, type Cell } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import { DAYS, degrees } from './wording';

/** Half a sheet full of cells, one for everything that is said, line by line. */
export const halfSheet: Layout = {
  name: 'half sheet',
  hand: 'british',
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 8.5, [595, 421]);
    paper.text(truth.processor ?? '', 24, 32, { bold: true, size: 12 });
    paper.text(story.address.join(', '), 24, 42, { size: 6.5 });
    paper.text('RELEASE NOTE & CERTIFICATE OF CONFORMITY', 571, 32, { bold: true, size: 10, align: 'right' });
    paper.y = 50;
    const row = (...cells: Cell[]): void => cellRow(paper, [24, 547], cells);
    row(
      { label: 'CERTIFICATE NO.', value: truth.certificate_number ?? '' },
      { label: 'DATE', value: DAYS.british(truth.certificate_date ?? '') },
      { label: 'ORDER NO.', value: truth.purchase_order ?? '' },
      { label: 'CUSTOMER BATCH', value: truth.batch ?? '' },
      { label: 'W/O', value: `${dice.whole(1000, 9999)}` },
    );
    row(
      { label: 'CUSTOMER', value: story.customer },
      { label: 'PROCESS', value: PROCESS_NAMES.formal[truth.process ?? ''] ?? '' },
      { label: 'SPECIFICATION', value: specWritten(truth, 'issue') },
      { label: 'CLASS / CONDITION', value: truth.class_type ?? '-' },
    );
    for (const line of truth.lines)
      row(
        { label: 'PART NO.', value: line.part_number ?? '', share: 1.4 },
        { label: 'ISS.', value: line.rev ?? '', share: 0.4 },
        { label: 'MATERIAL', value: line.material ?? '', share: 2 },
        { label: 'LOT', value: line.lot ?? '' },
        { label: 'QTY ACC.', value: String(line.qty_accepted), share: 0.6 },
        { label: 'QTY REJ.', value: String(line.qty_rejected), share: 0.6 },
      );
    furnace(told, row);
    paper.y += 12;
    paper.prose(
      truth.conformance_statement
        ? 'The parts above have been processed and inspected to the specification shown and conform to the order.'
        : 'E. & O. E. Our conditions of sale apply.',
      26,
      540,
      { size: 7.5 },
    );
    paper.y = Math.max(paper.y + 20, 388);
    paper.text('For the company', 26, paper.y, { size: 7 });
    if (truth.signature_present) paper.sign(100, paper.y - 2, dice.whole(100, 9000));
    paper.rule([92, paper.y + 1], [250, paper.y + 1], 0.4);
    paper.text(story.signer, 270, paper.y);
    paper.text(story.signerTitle, 400, paper.y);
    return paper.save();
  },
};

function furnace({ story, hand, dice }: Told, row: (...cells: Cell[]) => void): void {
  const { truth } = story;
  const written = { day: DAYS.british, clock: CLOCKS.plain };
  for (const cycle of truth.cycles)
    row(
      { label: 'OPERATION', value: STEP_NAMES.formal[cycle.step] ?? '', share: 1.4 },
      {
        label: 'TEMP.',
        value: cycle.set_temp === null ? 'Ambient' : degrees(hand, cycle.set_temp),
        share: 0.6,
      },
      { label: 'SOAK START', value: dayAndTime(cycle.soak_start, written) },
      { label: 'SOAK END', value: dayAndTime(cycle.soak_end, written) },
      { label: 'MINUTES', value: String(cycle.minutes), share: 0.6 },
    );
  const others: Cell[] = [
    ...(truth.plating_end
      ? [{ label: 'PLATING COMPLETED', value: dayAndTime(truth.plating_end, written) }]
      : []),
    ...(story.work.quench ? [{ label: 'QUENCH', value: story.work.quench, share: 0.6 }] : []),
    ...(truth.quench_delay_s === null
      ? []
      : [{ label: 'QUENCH DELAY', value: `${truth.quench_delay_s} s`, share: 0.7 }]),
    ...truth.readings.map((reading) => ({
      label: `${reading.kind.toUpperCase()} ${printedUnit(reading.unit, dice)}`,
      value: readingValues({ story, hand, dice }, reading),
    })),
  ];
  if (others.length > 0) row(...others);
}
