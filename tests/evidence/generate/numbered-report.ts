import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { formFoot } from './house-noise';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, oneRejected, received, sampled, SPANS, specWritten } from './notation';
import { Paper } from './sheet-of-paper';
import { DAYS, degrees } from './wording';

/** A laboratory's report in numbered paragraphs, serial numbers and samples told, over two pages where it must. */
export const numberedReport: Layout = {
  name: 'numbered report',
  hand: 'american',
  states: oneRejected,
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Times', 10.5, [612, 792]);
    paper.text(truth.processor ?? '', 540, 50, { bold: true, size: 14, align: 'right' });
    paper.text(story.address.join(', '), 540, 63, { size: 8.5, align: 'right' });
    paper.text('TEST REPORT', 72, 96, { bold: true, size: 16 });
    paper.text(`Report No. ${truth.certificate_number ?? ''}`, 72, 114);
    paper.text(`Report Date ${DAYS.shortNamed(truth.certificate_date ?? '')}`, 540, 114, { align: 'right' });
    paper.rule([72, 120], [540, 120]);
    paper.y = 140;
    const say = (number: string, said: string): void => {
      if (paper.y > 690) {
        paper.turnPage();
        paper.text(`Report No. ${truth.certificate_number ?? ''}, continued`, 72, 40, { size: 9 });
        paper.y = 66;
      }
      paper.text(number, number.endsWith('.0') ? 72 : 84, paper.y, { bold: number.endsWith('.0') });
      if (number.endsWith('.0')) paper.text(said.toUpperCase(), 112, paper.y, { bold: true });
      else paper.text(said, 112, paper.y);
      paper.y += 15;
    };
    paragraphs(told).forEach(({ title, lines }, section) => {
      say(`${section + 1}.0`, title);
      lines.forEach((line, turn) => say(`${section + 1}.${turn + 1}`, line));
      paper.y += 5;
    });
    paper.y += 4;
    paper.prose(
      truth.conformance_statement
        ? 'The undersigned certifies that the items identified herein were processed and inspected as stated and conform to the purchase order and specification.'
        : 'Results apply to the items as received. Uncertainties on request.',
      72,
      468,
    );
    paper.y += 30;
    if (truth.signature_present) paper.text(`/s/ ${story.signer}`, 72, paper.y);
    else paper.text('_________________________', 72, paper.y);
    paper.text(
      `${story.signerTitle}${story.work.trade === 'inspection' ? ', Level III' : ''}`,
      72,
      paper.y + 13,
    );
    paper.text(formFoot(dice), 540, 764, { size: 7, align: 'right' });
    return paper.save();
  },
};

interface Section {
  readonly title: string;
  readonly lines: readonly string[];
}

function paragraphs(told: Told): Section[] {
  const { story, dice } = told;
  const { truth } = story;
  const from = dice.whole(100, 800);
  const items = truth.lines.flatMap((line, index) => [
    `Part No. ${line.part_number ?? ''}   Rev. ${line.rev ?? ''}   Serial Nos. ${from + 200 * index} thru ${from + 200 * index + received(line) - 1}`,
    `Material: ${line.material ?? ''}   Lot: ${line.lot ?? ''}   Qty submitted: ${received(line)}   Accepted: ${line.qty_accepted}   Rejected: ${line.qty_rejected}`,
  ]);
  return [
    {
      title: 'Customer',
      lines: [
        story.customer,
        `Purchase Order: ${truth.purchase_order ?? ''}`,
        `Customer Batch: ${truth.batch ?? ''}`,
      ],
    },
    { title: 'Items', lines: items },
    {
      title: 'Process and procedure',
      lines: [
        `Process: ${PROCESS_NAMES.formal[truth.process ?? '']?.replace('Ageing', 'Aging') ?? ''}`,
        `Specification: ${specWritten(truth, 'rev')}`,
        ...(truth.class_type === null
          ? []
          : [`${/ to /.test(truth.class_type) ? 'Condition' : 'Type/Class/Technique'}: ${truth.class_type}`]),
        `Internal procedure WI-${dice.whole(100, 400)} Rev 4`,
      ],
    },
    ...thermal(told),
    ...results(told),
  ];
}

function thermal({ story, hand }: Told): Section[] {
  const { truth } = story;
  const written = { day: DAYS.shortNamed, clock: CLOCKS.plain };
  const lines = [
    ...(truth.plating_end ? [`Plating completed: ${dayAndTime(truth.plating_end, written)}`] : []),
    ...truth.cycles.map(
      (cycle) =>
        `${STEP_NAMES.short[cycle.step] ?? ''}: ${cycle.set_temp === null ? 'R.T.' : degrees(hand, cycle.set_temp)}, in ${dayAndTime(cycle.soak_start, written)}, out ${dayAndTime(cycle.soak_end, written)}, ${SPANS.words(cycle.minutes ?? 0)}`,
    ),
    ...(story.work.quench
      ? [
          `Quench: ${story.work.quench}${truth.quench_delay_s === null ? '' : `; quench delay: ${truth.quench_delay_s} sec`}`,
        ]
      : []),
  ];
  return lines.length === 0 ? [] : [{ title: 'Thermal record', lines }];
}

function results(told: Told): Section[] {
  const { story, dice } = told;
  const { truth } = story;
  const lines = truth.readings.map(
    (reading) =>
      `${READING_NAMES.formal[reading.kind] ?? ''} (${sampled(truth, reading.values.length)} tested): ${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
  );
  if (story.work.trade === 'inspection')
    lines.push('Inspected 100 %. No rejectable indications in the accepted items.');
  return lines.length === 0 ? [] : [{ title: 'Results', lines }];
}
