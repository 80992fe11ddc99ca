import { printedUnit } from './as-printed';
import { cards } from './blocks';
import { readingValues, type Told } from './content';
import { telephone } from './house-noise';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, demanded, eachLine, SPANS, specWritten } from './notation';
import { fixedTable } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import { addDays } from './story';
import { DAYS, degrees } from './wording';

/** A Canadian house: days as 2026/03/12, labels above values, a certificate that takes the place of an earlier one. */
export const replacedCertificate: Layout = {
  name: 'replaced certificate',
  hand: 'american',
  states: (truth) => eachLine(truth, (line) => ({ ...line, qty_rejected: null })),
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 9.5, [612, 792]);
    paper.text(truth.processor ?? '', 306, 44, { bold: true, size: 14, align: 'centre' });
    paper.text(
      `${story.address.join(', ')}   Tel ${telephone(dice)}   Toll free 1-800-555-01${dice.whole(10, 99)}`,
      306,
      57,
      {
        size: 8,
        align: 'centre',
      },
    );
    paper.text('Certificate of Conformance', 306, 82, { size: 14, align: 'centre' });
    paper.text(
      `Replaces certificate ${truth.certificate_number ?? ''}-0 issued ${DAYS.slashedIso(addDays(truth.certificate_date ?? '', -1))} (customer address corrected)`,
      306,
      96,
      { size: 7.5, align: 'centre' },
    );
    paper.y = 112;
    cards(
      paper,
      [
        { label: 'CERTIFICATE', value: truth.certificate_number ?? '' },
        { label: 'DATE ISSUED', value: DAYS.slashedIso(truth.certificate_date ?? '') },
        { label: 'PURCHASE ORDER', value: truth.purchase_order ?? '' },
        { label: 'CUSTOMER BATCH', value: truth.batch ?? '' },
        { label: 'CUSTOMER', value: story.customer },
        { label: 'WORK ORDER', value: `WO-${dice.whole(30000, 60000)}` },
        {
          label: 'PROCESS',
          value: PROCESS_NAMES.formal[truth.process ?? '']?.replace('Ageing', 'Aging') ?? '',
        },
        { label: 'SPECIFICATION', value: specWritten(truth, 'rev') },
        ...(truth.class_type === null ? [] : [{ label: 'CLASS / CONDITION', value: truth.class_type }]),
      ],
      [46, 520],
      { columns: 3, framed: false, height: 34 },
    );
    fixedTable(
      paper,
      46,
      {
        columns: [
          { head: 'Pieces', width: 50, align: 'right' },
          { head: 'Part number', width: 130 },
          { head: 'Rev', width: 40 },
          { head: 'Description', width: 100 },
          { head: 'Material', width: 120 },
          { head: 'Heat / lot', width: 80 },
        ],
        rows: truth.lines.map((line, index) => [
          String(line.qty_accepted),
          line.part_number ?? '',
          line.rev ?? '',
          story.order.lines[index]?.description ?? '',
          line.material ?? '',
          line.lot ?? '',
        ]),
      },
      { rules: 'none' },
    );
    thermal(paper, told);
    if (truth.readings.length > 0)
      fixedTable(
        paper,
        46,
        {
          columns: [
            { head: 'Test', width: 140 },
            { head: "Req'd", width: 120 },
            { head: 'Actual', width: 180 },
            { head: 'Pass / Fail', width: 80 },
          ],
          rows: truth.readings.map((reading) => [
            `${READING_NAMES.formal[reading.kind] ?? ''} (${printedUnit(reading.unit, dice)})`,
            demanded(told, reading.kind),
            readingValues(told, reading),
            'Pass',
          ]),
        },
        { rules: 'none' },
      );
    paper.y += 10;
    paper.prose(
      truth.conformance_statement
        ? `${truth.processor ?? ''} certifies that the goods described above have been processed, inspected and tested in accordance with the purchase order and the specification shown and that they conform to both.`
        : 'Goods left over 90 days may be scrapped. Charts are kept 10 years.',
      46,
      520,
    );
    paper.y += 40;
    if (truth.signature_present) paper.sign(60, paper.y - 3, dice.whole(100, 9000));
    paper.rule([46, paper.y], [230, paper.y]);
    paper.text(`${story.signer}, ${story.signerTitle}`, 46, paper.y + 12, { size: 8 });
    paper.text(
      'CSA W178.1  •  CAN/CGSB-48.9712  •  AS9100D reg. FM 600123  •  Controlled Goods Program 21987',
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

function thermal(paper: Paper, { story, hand, dice }: Told): void {
  const { truth } = story;
  const written = { day: DAYS.slashedIso, clock: CLOCKS.plain };
  const said = (text: string): void => {
    paper.text(text, 49, paper.y);
    paper.y += 15;
  };
  if (truth.plating_end) said(`Plating complete   ${dayAndTime(truth.plating_end, written)}`);
  if (truth.cycles.length > 0)
    fixedTable(
      paper,
      46,
      {
        columns: [
          { head: 'Operation', width: 140 },
          { head: 'Furnace', width: 60 },
          { head: 'Set temp.', width: 70 },
          { head: 'Time in', width: 100 },
          { head: 'Time out', width: 100 },
          { head: 'Soak', width: 50, align: 'right' },
        ],
        rows: truth.cycles.map((cycle) => [
          STEP_NAMES.formal[cycle.step]?.replace('ageing', 'aging').replace('tenitise', 'tenitize') ?? '',
          cycle.set_temp === null ? '-' : `F-${dice.whole(1, 9)}`,
          cycle.set_temp === null ? 'Room' : degrees(hand, cycle.set_temp),
          dayAndTime(cycle.soak_start, written),
          dayAndTime(cycle.soak_end, written),
          SPANS.parts(cycle.minutes ?? 0),
        ]),
      },
      { rules: 'none' },
    );
  if (story.work.quench)
    said(
      `Quench   ${story.work.quench}${truth.quench_delay_s === null ? '' : `          Quench delay   ${truth.quench_delay_s} s`}`,
    );
}
