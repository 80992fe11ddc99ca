import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { formFoot, telephone } from './house-noise';
import { PROCESS_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { dayAndTime, eachLine, received, SPANS, specWritten } from './notation';
import { fixedTable, tickBox } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import { degrees } from './wording';

const LETTER = [612, 792] as const;

const firstWord = (said: string | null): string | null => said?.split(' ')[0] ?? null;

/** A form with the processes to tick, and shaded labels beside their values, two to a row. */
export const tickedForm: Layout = {
  name: 'ticked form',
  hand: 'american',
  states: (truth) => ({
    ...eachLine(truth, (line) => ({ ...line, material: firstWord(line.material) })),
    batch: null,
  }),
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 9, LETTER);
    paper.text('Certificate of Compliance', 40, 44, { bold: true, size: 16 });
    paper.text(truth.processor ?? '', 572, 38, { bold: true, size: 12, align: 'right' });
    paper.text(story.address.join(', '), 572, 50, { size: 8, align: 'right' });
    paper.y = 66;
    const row = (...fields: (readonly [string, string])[]): void => {
      const wide = 532 / fields.length;
      fields.forEach(([label, value], index) => {
        const x = 40 + index * wide;
        paper.shade(x, paper.y, 88, 18);
        paper.frame(x, paper.y, wide, 18);
        paper.text(label, x + 4, paper.y + 12, { size: 8 });
        paper.text(value, x + 94, paper.y + 12);
      });
      paper.y += 18;
    };
    row(['Customer', story.customer], ['Certificate #', truth.certificate_number ?? '']);
    row(['Cust. Order #', truth.purchase_order ?? ''], ['Issued', hand.day(truth.certificate_date ?? '')]);
    row(
      ['Our Job #', `${dice.whole(20000, 79999)}-${dice.whole(1, 4)}`],
      ['Packing Slip', `PS${dice.whole(1000, 9999)}`],
    );
    row(['Specification', specWritten(truth, 'rev')], ['Class / Cond.', truth.class_type ?? 'N/A']);
    paper.y += 16;
    paper.text('Service performed:', 40, paper.y, { bold: true });
    let at = 140;
    for (const [process, said] of Object.entries(PROCESS_NAMES.plain)) {
      if (at + paper.widthOf(said) > 560) {
        at = 140;
        paper.y += 15;
      }
      at = tickBox(paper, [at, paper.y], { said, ticked: process === truth.process });
    }
    paper.y += 18;
    fixedTable(
      paper,
      40,
      {
        columns: [
          { head: 'Part # / Rev', width: 130 },
          { head: 'Alloy/Temper', width: 100 },
          { head: 'Lot #', width: 90 },
          { head: 'Pcs Rec’d', width: 70, align: 'right' },
          { head: 'Pcs Acc.', width: 70, align: 'right' },
          { head: 'Pcs Rej.', width: 72, align: 'right' },
        ],
        rows: [
          ...truth.lines.map((line) => [
            `${line.part_number ?? ''} / ${line.rev ?? ''}`,
            line.material ?? '',
            line.lot ?? '',
            String(received(line)),
            String(line.qty_accepted),
            String(line.qty_rejected),
          ]),
          [
            'Total',
            '',
            '',
            String(truth.lines.reduce((sum, line) => sum + received(line), 0)),
            String(truth.lines.reduce((sum, line) => sum + (line.qty_accepted ?? 0), 0)),
            String(truth.lines.reduce((sum, line) => sum + (line.qty_rejected ?? 0), 0)),
          ],
        ],
      },
      { rules: 'all', headSize: 8 },
    );
    const written = { day: hand.day, clock: hand.time, between: ' @ ' };
    for (const cycle of truth.cycles) {
      row(
        [
          STEP_NAMES.short[cycle.step] ?? '',
          cycle.set_temp === null
            ? 'Room temp.'
            : `${degrees(hand, cycle.set_temp)} for ${SPANS.words(cycle.minutes ?? 0)}`,
        ],
        ...(cycle.set_temp === null ? ([['Total', SPANS.words(cycle.minutes ?? 0)]] as const) : []),
      );
      row(
        ['Soak began', dayAndTime(cycle.soak_start, written)],
        ['Soak ended', dayAndTime(cycle.soak_end, written)],
      );
    }
    if (story.work.quench)
      row(
        ['Quenchant', story.work.quench],
        ...(truth.quench_delay_s === null
          ? []
          : ([['Quench delay', `${truth.quench_delay_s} sec`]] as const)),
      );
    if (truth.plating_end) row(['Plating finished', dayAndTime(truth.plating_end, written)]);
    for (const reading of truth.readings)
      row([
        { hardness: 'Hardness', conductivity: 'Conductivity', thickness: 'Thickness' }[reading.kind] ?? '',
        `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
      ]);
    paper.y += 18;
    at = tickBox(paper, [40, paper.y], { said: 'Accept', ticked: true });
    at = tickBox(paper, [at, paper.y], { said: 'Reject', ticked: false });
    tickBox(paper, [at, paper.y], { said: 'See attached chart', ticked: false });
    paper.y += 20;
    paper.prose(
      truth.conformance_statement
        ? 'The above items have been processed in accordance with, and conform to, the specification listed and all applicable purchase order requirements.'
        : 'Call us with questions about this shipment. Ask for the Quality Department.',
      40,
      520,
    );
    paper.y += 30;
    paper.text('Signature', 40, paper.y);
    if (truth.signature_present) paper.sign(100, paper.y - 3, dice.whole(100, 9000));
    paper.rule([90, paper.y + 1], [270, paper.y + 1]);
    paper.text('Print name', 290, paper.y);
    paper.text(story.signer, 350, paper.y);
    paper.text('Title', 455, paper.y);
    paper.text(story.signerTitle, 480, paper.y);
    paper.text(
      `${formFoot(dice)}     Cage Code ${dice.whole(1, 9)}${dice.pick(['A', 'K', 'U'])}${dice.whole(100, 999)}     Tel. ${telephone(dice)}`,
      306,
      764,
      {
        size: 7,
        align: 'centre',
      },
    );
    return paper.save();
  },
};
