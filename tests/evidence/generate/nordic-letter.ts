import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, oneRejected, received, SPANS } from './notation';
import { Paper } from './sheet-of-paper';
import { DAYS, degrees } from './wording';

/** A Scandinavian house: labels set against their values from the right, no table at all, no revision of the standard. */
export const nordicLetter: Layout = {
  name: 'Nordic letter',
  hand: 'nordic',
  states: (truth) => ({ ...oneRejected(truth), batch: null, specification_revision: null }),
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 10, [595, 842]);
    paper.spaced((truth.processor ?? '').toUpperCase(), 60, 56, { size: 13, bold: true, gap: 1.6 });
    paper.rule([60, 64], [535, 64], 2);
    paper.text('Certificate of conformity', 60, 96, { size: 18 });
    paper.y = 128;
    const section = (said: string): void => {
      paper.y += 8;
      paper.text(said, 60, paper.y, { bold: true });
      paper.y += 16;
    };
    const say = (label: string, value: string): void => {
      paper.text(label, 205, paper.y, { align: 'right', grey: 0.4 });
      paper.text(value, 217, paper.y);
      paper.y += 15;
    };
    say('Certificate', truth.certificate_number ?? '');
    say('Date of issue', truth.certificate_date ?? '');
    say('Customer', story.customer);
    say('Customer reference (PO)', truth.purchase_order ?? '');
    say('Our reference', `${dice.whole(100000, 199999)} / ${dice.pick(['ML', 'KJ', 'AS'])}`);
    say('Treatment', PROCESS_NAMES.formal[truth.process ?? ''] ?? '');
    say('Standard', truth.specification ?? '');
    if (truth.class_type !== null)
      say(/ to /.test(truth.class_type) ? 'Condition' : 'Class', truth.class_type);
    truth.lines.forEach((line, index) => {
      section(`Article ${index + 1}`);
      say('Part number', `${line.part_number ?? ''} rev. ${line.rev ?? ''}`);
      say('Material', line.material ?? '');
      say('Lot', line.lot ?? '');
      say('Received', `${received(line)} pcs`);
      say('Accepted', `${line.qty_accepted} pcs`);
      say('Rejected', `${line.qty_rejected} pcs`);
    });
    treatment(told, section, say);
    paper.y += 10;
    paper.prose(
      truth.conformance_statement
        ? 'We hereby declare that the goods above have been treated and inspected in accordance with the order and the standard and that they conform to them.'
        : 'Delivery in accordance with NL 17. Payment 30 days net.',
      60,
      470,
    );
    paper.y += 14;
    paper.text(
      truth.signature_present
        ? `Approved electronically by ${story.signer}, ${story.signerTitle}, ${truth.certificate_date ?? ''} 15.04`
        : `Contact: ${story.signer}, ${story.signerTitle}`,
      60,
      paper.y,
    );
    paper.text(
      `${story.address.join(', ')}   Tel +46 8 465 00${dice.whole(10, 99)}   Org.nr 5560${dice.whole(10, 99)}-${dice.whole(1000, 9999)}   ISO 9001 / EN 9100`,
      60,
      822,
      { size: 7 },
    );
    return paper.save();
  },
};

function treatment(
  told: Told,
  section: (said: string) => void,
  say: (label: string, value: string) => void,
): void {
  const { story, hand, dice } = told;
  const { truth } = story;
  const written = { day: DAYS.iso, clock: CLOCKS.dotted, between: ' kl. ' };
  if (truth.cycles.length + truth.readings.length > 0) section('Process and results');
  if (truth.plating_end) say('Plating completed', dayAndTime(truth.plating_end, written));
  for (const cycle of truth.cycles) {
    say(
      STEP_NAMES.formal[cycle.step] ?? '',
      `${cycle.set_temp === null ? 'Room temperature' : degrees(hand, cycle.set_temp)}, ${SPANS.parts(cycle.minutes ?? 0)}`,
    );
    say('from', dayAndTime(cycle.soak_start, written));
    say('to', dayAndTime(cycle.soak_end, written));
  }
  if (story.work.quench) say('Quenched in', story.work.quench.toLowerCase());
  if (truth.quench_delay_s !== null) say('Quench delay', `${truth.quench_delay_s} s`);
  for (const reading of truth.readings)
    say(
      READING_NAMES.formal[reading.kind] ?? '',
      `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
    );
}
