import { printedUnit } from './as-printed';
import { twoColumns } from './blocks';
import { readingValues, type Told } from './content';
import { approvals, formFoot } from './house-noise';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import { signatureBlock, type Layout } from './layout';
import { CLOCKS, dayAndTime, oneRejected, received, SPANS, specWritten } from './notation';
import { fixedTable } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import type { Truth } from './story';
import { DAYS } from './wording';

/** Turned tables: each part is a column and each step is a column, with what is said of it in rows. */
export const parameterMatrix: Layout = {
  name: 'parameter matrix',
  hand: 'american',
  states: oneRejected,
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 9.5, [612, 792]);
    paper.text('CERTIFICATE OF CONFORMANCE', 40, 44, { bold: true, size: 13 });
    paper.text(truth.processor ?? '', 40, 60, { size: 11 });
    paper.text(story.address.join(', '), 40, 72, { size: 8 });
    paper.y = 96;
    twoColumns(
      paper,
      [
        { label: 'Certificate', value: truth.certificate_number ?? '' },
        { label: 'Cert. date', value: DAYS.militaryLong(truth.certificate_date ?? '') },
        { label: 'Customer', value: story.customer },
        { label: 'Cust. P.O.', value: truth.purchase_order ?? '' },
        { label: 'Batch', value: truth.batch ?? '' },
        { label: 'Process', value: PROCESS_NAMES.plain[truth.process ?? ''] ?? '' },
        { label: 'Spec.', value: specWritten(truth, 'glued') },
        { label: 'Class / Temper', value: truth.class_type ?? 'N/A' },
      ],
      40,
      { columnWidth: 280, labelWidth: 90, mark: '....' },
    );
    paper.y += 8;
    turned(
      paper,
      ['', ...truth.lines.map((_, index) => `Item ${index + 1}`)],
      (
        [
          ['Part number', ({ part_number: said }) => said ?? ''],
          ['Revision', ({ rev }) => rev ?? ''],
          ['Material', ({ material }) => material ?? ''],
          ['Lot', ({ lot }) => lot ?? ''],
          ['Pcs received', (line) => String(received(line))],
          ['Pcs accepted', ({ qty_accepted: count }) => String(count)],
          ['Pcs rejected', ({ qty_rejected: count }) => String(count)],
        ] as readonly (readonly [string, (line: Truth['lines'][number]) => string])[]
      ).map(([label, said]) => [label, ...truth.lines.map(said)]),
    );
    steps(paper, told);
    for (const reading of truth.readings) {
      paper.text(
        `${READING_NAMES.formal[reading.kind] ?? ''}, ${printedUnit(reading.unit, dice)}`,
        40,
        paper.y,
      );
      paper.text(readingValues(told, reading).replaceAll(', ', '     '), 190, paper.y);
      paper.y += 15;
    }
    paper.y += 8;
    paper.prose(
      truth.conformance_statement
        ? 'The processor certifies that the parts listed were processed to the specification above and that they conform to all of its requirements and those of the purchase order.'
        : 'For the meaning of abbreviations see our website. All times are local.',
      40,
      530,
    );
    paper.y += 40;
    signatureBlock(paper, told, 40);
    paper.text(formFoot(dice), 40, 756, { size: 6.5 });
    paper.text(approvals(dice), 40, 766, { size: 6.5 });
    return paper.save();
  },
};

function turned(paper: Paper, heads: readonly string[], rows: readonly (readonly string[])[]): void {
  const wide = Math.min(150, 412 / Math.max(1, heads.length - 1));
  fixedTable(
    paper,
    40,
    {
      columns: heads.map((head, index) => ({ head, width: index === 0 ? 120 : wide })),
      rows,
    },
    { rules: 'all' },
  );
}

function steps(paper: Paper, { story, hand, dice }: Told): void {
  const { truth } = story;
  const written = { day: DAYS.militaryLong, clock: CLOCKS.plain };
  const loads = truth.cycles.map(() => [dice.whole(1, 9), dice.whole(1000, 9000)] as const);
  if (truth.cycles.length > 0)
    turned(
      paper,
      ['Parameter', ...truth.cycles.map(({ step }) => STEP_NAMES.shop[step] ?? '')],
      [
        ['Furnace / load', ...loads.map(([furnace, load]) => `${furnace} / ${load}`)],
        [
          `Set temp. (°${hand.unit})`,
          ...truth.cycles.map(({ set_temp }) => (set_temp === null ? 'RT' : String(set_temp))),
        ],
        ['Soak start', ...truth.cycles.map(({ soak_start }) => dayAndTime(soak_start, written))],
        ['Soak end', ...truth.cycles.map(({ soak_end }) => dayAndTime(soak_end, written))],
        ['Soak time', ...truth.cycles.map(({ minutes }) => SPANS.words(minutes ?? 0))],
      ],
    );
  for (const [label, said] of [
    ['Quenchant', story.work.quench ?? ''],
    ['Quench delay', truth.quench_delay_s === null ? '' : `${truth.quench_delay_s} sec.`],
    ['Plating complete', dayAndTime(truth.plating_end, written)],
  ] as const) {
    if (said === '') continue;
    paper.text(label, 40, paper.y);
    paper.text(said, 190, paper.y);
    paper.y += 15;
  }
}
