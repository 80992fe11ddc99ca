import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { telephone } from './house-noise';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, eachLine, SPANS, specWritten } from './notation';
import { Paper } from './sheet-of-paper';
import { DAYS, degrees } from './wording';

type Field = readonly [label: string, value: string, share?: number];

/** A form of ruled lines to write on, what belongs on each printed small below it. */
export const labelsBelow: Layout = {
  name: 'labels below',
  hand: 'american',
  states: (truth) => eachLine({ ...truth, batch: null }, (line) => ({ ...line, qty_rejected: null })),
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 10, [612, 792]);
    paper.text((truth.processor ?? '').toUpperCase(), 306, 46, { bold: true, size: 16, align: 'centre' });
    paper.text(`${story.address.join(', ')}   ${telephone(dice)}`, 306, 60, { size: 8, align: 'centre' });
    paper.text('Statement of Conformance', 306, 90, { size: 14, align: 'centre' });
    paper.y = 122;
    const row = (...fields: readonly Field[]): void => {
      const whole = fields.reduce((sum, [, , share = 1]) => sum + share, 0);
      let x = 48;
      for (const [label, value, share = 1] of fields) {
        const wide = (516 * share) / whole;
        paper.text(value, x + 4, paper.y);
        paper.rule([x, paper.y + 3], [x + wide - 12, paper.y + 3], 0.5);
        paper.text(label, x, paper.y + 11, { size: 6.5, grey: 0.25 });
        x += wide;
      }
      paper.y += 29;
    };
    row(
      ['Customer', story.customer, 1.5],
      ['Customer Purchase Order', truth.purchase_order ?? ''],
      ['Certificate Number', truth.certificate_number ?? ''],
    );
    row(
      ['Process', PROCESS_NAMES.formal[truth.process ?? '']?.replace('Ageing', 'Aging') ?? '', 1.5],
      ['Specification', specWritten(truth, 'rev')],
      ['Type, Class or Temper', truth.class_type ?? 'n/a', 1.3],
    );
    for (const line of truth.lines)
      row(
        ['Part Number', line.part_number ?? '', 1.2],
        ['Rev.', line.rev ?? '', 0.4],
        ['Material', line.material ?? '', 1.8],
        ['Heat or Lot', line.lot ?? ''],
        ['Quantity', String(line.qty_accepted), 0.6],
      );
    work(told, row);
    paper.prose(
      truth.conformance_statement
        ? 'By signing below we state that the parts described conform to the purchase order and that they were processed in accordance with the specification entered above.'
        : 'Please retain this form with your shipping papers.',
      48,
      510,
    );
    paper.y += 40;
    if (truth.signature_present) paper.sign(60, paper.y - 2, dice.whole(100, 9000));
    row(
      ['Authorized Signature', ''],
      ['Printed Name and Title', `${story.signer}, ${story.signerTitle}`],
      ['Date', DAYS.us(truth.certificate_date ?? ''), 0.6],
    );
    return paper.save();
  },
};

function work(told: Told, row: (...fields: readonly Field[]) => void): void {
  const { story, hand, dice } = told;
  const { truth } = story;
  const written = { day: DAYS.us, clock: CLOCKS.lower };
  if (truth.plating_end)
    row(['Plating Completed', dayAndTime(truth.plating_end, written)], ['Tank', `${dice.whole(1, 9)}`]);
  for (const cycle of truth.cycles) {
    const step = (STEP_NAMES.formal[cycle.step] ?? '')
      .replace('ageing', 'aging')
      .replace('tenitise', 'tenitize');
    row(
      [
        `${step} temperature`,
        cycle.set_temp === null ? 'room temperature' : degrees(hand, cycle.set_temp),
        1.1,
      ],
      [`${step} start`, dayAndTime(cycle.soak_start, written)],
      [`${step} finish`, dayAndTime(cycle.soak_end, written)],
      [`${step} time`, SPANS.words(cycle.minutes ?? 0), 0.8],
    );
  }
  const others: Field[] = [
    ...(story.work.quench ? [['Quenchant', story.work.quench, 0.6] as const] : []),
    ...(truth.quench_delay_s === null
      ? []
      : [['Quench Delay', `${truth.quench_delay_s} seconds`, 0.7] as const]),
    ...truth.readings.map(
      (reading) =>
        [
          READING_NAMES.formal[reading.kind] ?? '',
          `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
          1.3,
        ] as const,
    ),
  ];
  if (others.length > 0) row(...others);
}
