import { printedUnit } from './as-printed';
import { cards } from './blocks';
import { readingValues, type Told } from './content';
import { approvals, formFoot } from './house-noise';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, eachCycle, SPANS, specWritten } from './notation';
import { fixedTable } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import type { Truth } from './story';
import { degrees } from './wording';

/** Furnace times are kept on the chart alone, but for a bake, which must be told; aluminium is also pulled. */
function states(truth: Truth): Truth {
  const hardness = truth.readings.find(({ kind, unit }) => kind === 'hardness' && unit === 'HRB');
  const pulled = hardness?.values.map((value) => Math.round(value * 8.7) / 10);
  return {
    ...eachCycle(truth, (cycle) =>
      cycle.step === 'embrittlement_relief' ? cycle : { ...cycle, soak_start: null, soak_end: null },
    ),
    readings: [
      ...truth.readings,
      ...(pulled ? [{ kind: 'tensile' as const, unit: 'ksi', values: pulled }] : []),
    ],
  };
}

/** Two pages: the parts run over onto the second, which repeats who it is about. */
export const continued: Layout = {
  name: 'continued',
  hand: 'american',
  states,
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 10, [612, 792]);
    const [form, approved] = [formFoot(dice), approvals(dice)];
    const foot = (page: number): void => {
      paper.rule([40, 744], [572, 744], 0.4);
      paper.text(form, 40, 754, { size: 7 });
      paper.text(`Page ${page} of 2`, 572, 754, { size: 7, align: 'right' });
      paper.text(approved, 306, 766, { size: 6, align: 'centre' });
    };
    paper.shade(40, 28, 532, 26);
    paper.text(truth.processor ?? '', 48, 46, { bold: true, size: 14 });
    paper.text('TEST REPORT / CERTIFICATE', 564, 46, { size: 11, align: 'right' });
    paper.text(story.address.join(', '), 48, 66, { size: 8 });
    paper.y = 90;
    cards(
      paper,
      [
        { label: 'Report no.', value: truth.certificate_number ?? '' },
        { label: 'Report date', value: hand.day(truth.certificate_date ?? '') },
        { label: 'Lab / shop order', value: `L26-${dice.whole(1000, 9999)}` },
        { label: 'Customer', value: story.customer },
        { label: 'Customer purchase order', value: truth.purchase_order ?? '' },
        { label: 'Customer batch', value: truth.batch ?? '' },
        { label: 'Process performed', value: PROCESS_NAMES.formal[truth.process ?? ''] ?? '' },
        { label: 'Performed to', value: specWritten(truth, 'glued') },
        ...(truth.class_type === null
          ? []
          : [{ label: 'Type, class or condition', value: truth.class_type }]),
      ],
      [40, 532],
      { columns: 3, framed: false, height: 38 },
    );
    const parts = (lines: Truth['lines'], from: number): void =>
      fixedTable(
        paper,
        44,
        {
          columns: [
            { head: 'Line', width: 32 },
            { head: 'Part number', width: 112 },
            { head: 'Rev.', width: 34 },
            { head: 'Material', width: 146 },
            { head: 'Lot', width: 80 },
            { head: 'Qty accepted', width: 62, align: 'right' },
            { head: 'Qty rejected', width: 60, align: 'right' },
          ],
          rows: lines.map((line, index) => [
            String(from + index),
            line.part_number ?? '',
            line.rev ?? '',
            line.material ?? '',
            line.lot ?? '',
            String(line.qty_accepted),
            String(line.qty_rejected),
          ]),
        },
        { rules: 'heads' },
      );
    parts(truth.lines.slice(0, 2), 1);
    paper.text('(continued on page 2)', 572, paper.y + 10, { size: 8, align: 'right' });
    foot(1);
    paper.turnPage();
    paper.text(
      `${truth.processor ?? ''}  -  Report no. ${truth.certificate_number ?? ''}, continued`,
      44,
      46,
      { bold: true },
    );
    paper.y = 70;
    if (truth.lines.length > 2) parts(truth.lines.slice(2), 3);
    work(paper, told);
    paper.prose(
      truth.conformance_statement
        ? 'It is hereby certified that the articles in this report have been processed and tested as required by the purchase order and that they meet the stated specification.'
        : 'This report relates only to the items tested. It shall not be reproduced except in full without our approval.',
      44,
      520,
    );
    paper.y += 26;
    if (truth.signature_present)
      paper.text(
        `Electronically signed by ${story.signer}, ${story.signerTitle}, ${dayAndTime(`${truth.certificate_date ?? ''}T14:22`, { day: hand.day, clock: CLOCKS.plain })}`,
        44,
        paper.y,
      );
    else paper.text(`Prepared for: ${story.signer}, ${story.signerTitle}`, 44, paper.y);
    foot(2);
    return paper.save();
  },
};

function work(paper: Paper, told: Told): void {
  const { story, hand, dice } = told;
  const { truth } = story;
  const written = { day: hand.day, clock: CLOCKS.plain };
  const say = (label: string, value: string): void => {
    paper.text(label, 190, paper.y, { align: 'right', grey: 0.3 });
    paper.text(value, 204, paper.y);
    paper.y += 15;
  };
  if (truth.plating_end) say('Plating completed', dayAndTime(truth.plating_end, written));
  for (const cycle of truth.cycles) {
    const step = STEP_NAMES.formal[cycle.step] ?? '';
    if (cycle.set_temp !== null) say(`${step} temperature`, degrees(hand, cycle.set_temp));
    say(`${step} time`, SPANS.words(cycle.minutes ?? 0));
    if (cycle.soak_start) say(`${step} start`, dayAndTime(cycle.soak_start, written));
    if (cycle.soak_end) say(`${step} end`, dayAndTime(cycle.soak_end, written));
  }
  if (story.work.quench) say('Quench', story.work.quench);
  if (truth.quench_delay_s !== null) say('Quench delay', `${truth.quench_delay_s} seconds`);
  paper.y += 10;
  if (truth.readings.length === 0) return;
  fixedTable(
    paper,
    44,
    {
      columns: [
        { head: 'Test', width: 150 },
        { head: 'Unit', width: 70 },
        { head: 'Found', width: 220 },
        { head: 'Result', width: 86 },
      ],
      rows: truth.readings.map((reading) => [
        READING_NAMES.formal[reading.kind] ?? '',
        printedUnit(reading.unit, dice),
        readingValues(told, reading),
        'Acceptable',
      ]),
    },
    { rules: 'columns' },
  );
}
