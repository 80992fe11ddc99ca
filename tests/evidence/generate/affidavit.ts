import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { formFoot, telephone } from './house-noise';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, eachLine, inWords, SPANS, specWritten } from './notation';
import { Paper } from './sheet-of-paper';
import { DAYS, degrees } from './wording';

/** Everything in sentences, as a lawyer would have it; a count in words and figures. */
export const affidavit: Layout = {
  name: 'affidavit',
  hand: 'american',
  states: (truth) => eachLine(truth, (line) => ({ ...line, qty_rejected: null })),
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Times', 11, [612, 792]);
    paper.text(truth.processor ?? '', 306, 54, { bold: true, size: 18, align: 'centre' });
    paper.text(`${story.address.join(', ')}    Tel. ${telephone(dice)}`, 306, 69, {
      size: 9,
      align: 'centre',
    });
    paper.rule([72, 78], [540, 78], 1.2);
    paper.spaced('CERTIFICATION', 306, 112, { size: 15, bold: true, gap: 5, align: 'centre' });
    paper.text(DAYS.ordinal(truth.certificate_date ?? ''), 540, 142, { align: 'right' });
    paper.text(`Certificate No. ${truth.certificate_number ?? ''}`, 72, 142);
    paper.y = 172;
    for (const paragraph of sentences(told)) {
      paper.prose(paragraph, 72, 468);
      paper.y += 8;
    }
    paper.y += 40;
    if (truth.signature_present) paper.sign(84, paper.y - 4, dice.whole(100, 9000));
    paper.rule([72, paper.y], [300, paper.y]);
    paper.text(story.signer, 72, paper.y + 13);
    paper.text(`${story.signerTitle}, ${truth.processor ?? ''}`, 72, paper.y + 26);
    paper.text(formFoot(dice), 540, 760, { size: 7, align: 'right' });
    return paper.save();
  },
};

function sentences(told: Told): string[] {
  const { story, hand, dice } = told;
  const { truth } = story;
  const written = { day: DAYS.letter, clock: CLOCKS.points, between: ' at ' };
  const pieces = truth.lines.map(
    (line) =>
      `${inWords(line.qty_accepted ?? 0)} pieces of part number ${line.part_number ?? ''}, revision ${line.rev ?? ''}, made of ${line.material ?? ''}, lot ${line.lot ?? ''}`,
  );
  const cycles = truth.cycles.map(
    (cycle) =>
      `The parts were ${STEP_NAMES.done[cycle.step] ?? ''} at ${cycle.set_temp === null ? 'room temperature' : degrees(hand, cycle.set_temp)} for ${SPANS.words(cycle.minutes ?? 0)}, the soak having begun ${dayAndTime(cycle.soak_start, written)} and ended ${dayAndTime(cycle.soak_end, written)}.`,
  );
  const quench = story.work.quench
    ? [
        `The quenchant was ${story.work.quench.toLowerCase()}${truth.quench_delay_s === null ? '' : `, with a quench delay of ${truth.quench_delay_s} seconds`}.`,
      ]
    : [];
  const plated =
    truth.plating_end === null ? [] : [`Plating was completed ${dayAndTime(truth.plating_end, written)}.`];
  const readings = truth.readings.map(
    (reading) =>
      `${READING_NAMES.formal[reading.kind] ?? ''} was found to be ${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}.`,
  );
  const work = [...plated, ...cycles, ...quench, ...readings];
  return [
    `This document concerns material furnished to us by ${story.customer} under its Purchase Order No. ${truth.purchase_order ?? ''} and identified as its batch ${truth.batch ?? ''}, being ${pieces.join('; and ')}.`,
    `Said material was ${PROCESS_NAMES.done[truth.process ?? ''] ?? ''} per ${specWritten(truth, 'revision')}${truth.class_type === null ? '' : `, ${/ to /.test(truth.class_type) ? 'from ' : ''}${truth.class_type}`}. ${work.join(' ')}`
      .replaceAll('..', '.')
      .trim(),
    truth.conformance_statement
      ? 'The undersigned, being duly authorized, hereby certifies that all of the above is true and correct and that the material conforms to the requirements of the said Purchase Order and specification.'
      : 'Nothing in this document extends the warranty stated in our terms of sale, which were last revised January 2, 2019.',
  ];
}
