import { printedUnit } from './as-printed';
import { pairs, table } from './blocks';
import { readingValues, specification, type Told } from './content';
import type { Layout } from './layout';
import { Paper } from './sheet-of-paper';
import { degrees, figure, moment } from './wording';

const LETTER = [612, 792] as const;
const A4 = [595, 842] as const;

const STEP: Readonly<Record<string, string>> = {
  solution: 'Solution',
  natural_age: 'Nat. Age',
  artificial_age: 'Artificial Age',
  austenitize: 'Austenitize',
  temper: 'Temper',
  stress_relief: 'Stress Relief',
  embrittlement_relief: 'Bake',
};
const KIND: Readonly<Record<string, string>> = {
  hardness: 'Hardness',
  conductivity: 'Conductivity',
  thickness: 'Plating thickness',
};
const DONE: Readonly<Record<string, string>> = {
  solution_heat_treat_and_age: 'SOLUTION TREAT AND AGE',
  harden_and_temper: 'HARDEN AND TEMPER',
  stress_relief: 'STRESS RELIEVE',
  cadmium_plate: 'CADMIUM PLATE',
  zinc_plate: 'ZINC PLATE',
  anodize: 'ANODIZE',
  chemical_film: 'CHEM FILM',
  passivation: 'PASSIVATE',
  fluorescent_penetrant: 'LIQUID PENETRANT INSPECTION',
  magnetic_particle: 'MAGNETIC PARTICLE INSPECTION',
};
const STATEMENT =
  'The seller certifies that the articles identified above comply with the requirements of the contract and the specifications cited.';
const NO_STATEMENT = 'Terms and conditions of sale apply. Records are retained for seven years.';

/** Numbered boxes on a grid, label and value in turn. */
const numberedGrid: Layout = {
  name: 'numbered grid',
  hand: 'american',
  async draw({ story, hand, dice }: Told) {
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 9, LETTER);
    paper.text('CERTIFICATE OF PROCESSING', 306, 40, { bold: true, size: 13, align: 'centre' });
    paper.y = 56;
    const line = truth.lines[0];
    const cells: (readonly [string, string])[] = [
      ['1. Processor', truth.processor ?? ''],
      ['2. Customer', story.customer],
      ['3. Certificate number', truth.certificate_number ?? ''],
      ['4. Purchase order', truth.purchase_order ?? ''],
      ['5. Date of issue', hand.day(truth.certificate_date ?? '')],
      ['6. Batch', truth.batch ?? ''],
      ['7. Process', DONE[truth.process ?? ''] ?? ''],
      ['8. Process specification', specification({ story, hand, dice })],
      ...(truth.class_type === null ? [] : ([['9. Class/Type', truth.class_type]] as const)),
      ['10. Material', line?.material ?? ''],
    ];
    const width = 266;
    cells.forEach(([label, value], index) => {
      const x = 40 + (index % 2) * width;
      const y = paper.y + Math.floor(index / 2) * 20;
      paper.frame(x, y, 106, 20);
      paper.frame(x + 106, y, width - 106, 20);
      paper.text(label, x + 3, y + 13, { size: 8 });
      paper.text(value, x + 110, y + 13);
    });
    paper.y += Math.ceil(cells.length / 2) * 20 + 12;
    table(
      paper,
      {
        heads: ['11. Part No.', '12. Rev.', '13. Lot', '14. Qty accepted', '15. Qty rejected'],
        rows: truth.lines.map((one) => [
          one.part_number ?? '',
          one.rev ?? '',
          one.lot ?? '',
          String(one.qty_accepted),
          String(one.qty_rejected),
        ]),
      },
      [40, 532],
      { rules: 'all', align: 'centre' },
    );
    if (truth.cycles.length > 0)
      table(
        paper,
        {
          heads: ['Cycle', 'Set point (°F)', 'Date in', 'Time in', 'Date out', 'Time out', 'Soak (min)'],
          rows: truth.cycles.map((cycle) => [
            STEP[cycle.step] ?? '',
            cycle.set_temp === null ? 'R.T.' : String(cycle.set_temp),
            hand.day(cycle.soak_start?.slice(0, 10) ?? ''),
            cycle.soak_start?.slice(11) ?? '',
            hand.day(cycle.soak_end?.slice(0, 10) ?? ''),
            cycle.soak_end?.slice(11) ?? '',
            String(cycle.minutes),
          ]),
        },
        [40, 532],
        { rules: 'all', align: 'centre' },
      );
    for (const reading of truth.readings) {
      const unit = printedUnit(reading.unit, dice);
      table(
        paper,
        {
          heads: [
            `${KIND[reading.kind] ?? ''} ${unit}`,
            ...reading.values.map((_, index) => `No. ${index + 1}`),
          ],
          rows: [['Reading', ...reading.values.map(String)]],
        },
        [40, 400],
        { rules: 'all' },
      );
    }
    const rest: { label: string; value: string }[] = [];
    if (story.work.quench) rest.push({ label: '20. Quenchant', value: story.work.quench.toUpperCase() });
    if (truth.quench_delay_s !== null)
      rest.push({ label: '21. Quench delay (s)', value: String(truth.quench_delay_s) });
    if (truth.plating_end !== null)
      rest.push({ label: '22. End of plating', value: moment(hand, truth.plating_end) });
    pairs(paper, rest, 44, { labelWidth: 130, mark: '' });
    paper.y += 12;
    paper.prose(truth.conformance_statement ? STATEMENT : NO_STATEMENT, 44, 510);
    paper.y += 36;
    if (truth.signature_present) paper.sign(150, paper.y, dice.whole(100, 9000));
    paper.text('30. Authorized signature', 44, paper.y);
    paper.rule([150, paper.y + 2], [320, paper.y + 2]);
    paper.text(`31. Name  ${story.signer}`, 340, paper.y);
    return paper.save();
  },
};

/** What was asked and what was done, parameter by parameter, a column for each step. */
const processRecord: Layout = {
  name: 'process record',
  hand: 'british',
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Times', 10, A4);
    paper.text('PROCESS RECORD AND RELEASE', 50, 50, { bold: true, size: 14 });
    paper.text(truth.processor ?? '', 545, 50, { bold: true, size: 12, align: 'right' });
    paper.text(story.address.join(', '), 545, 64, { size: 8, align: 'right' });
    paper.rule([50, 74], [545, 74], 1.2);
    paper.y = 96;
    const left = [
      { label: 'Certificate ref', value: truth.certificate_number ?? '' },
      { label: 'Issued', value: hand.day(truth.certificate_date ?? '') },
      { label: 'Client order', value: truth.purchase_order ?? '' },
      { label: 'Client batch', value: truth.batch ?? '' },
      { label: 'Works order', value: `W${dice.whole(1000, 9999)}` },
      { label: 'Treatment', value: DONE[truth.process ?? ''] ?? '' },
      { label: 'Standard', value: specification(told) },
      ...(truth.class_type === null
        ? []
        : [{ label: / to /.test(truth.class_type) ? 'Condition' : 'Type/Class', value: truth.class_type }]),
    ];
    pairs(paper, left, 50, { labelWidth: 110, mark: ':', boldValue: true });
    paper.y += 8;
    table(
      paper,
      {
        heads: ['Drawing no.', 'Issue', 'Alloy / form', 'Cast/lot', 'Good', 'Scrap'],
        rows: truth.lines.map((one) => [
          one.part_number ?? '',
          one.rev ?? '',
          one.material ?? '',
          one.lot ?? '',
          String(one.qty_accepted),
          String(one.qty_rejected),
        ]),
      },
      [50, 495],
      { rules: 'horizontal' },
    );
    if (truth.cycles.length > 1)
      table(
        paper,
        {
          heads: ['Parameter', ...truth.cycles.map(({ step }) => STEP[step] ?? '')],
          rows: [
            [
              'Temperature',
              ...truth.cycles.map(({ set_temp }) =>
                set_temp === null ? 'ambient' : degrees(hand, set_temp),
              ),
            ],
            ['Start', ...truth.cycles.map(({ soak_start }) => moment(hand, soak_start ?? ''))],
            ['End', ...truth.cycles.map(({ soak_end }) => moment(hand, soak_end ?? ''))],
            [
              'Time at temperature',
              ...truth.cycles.map(({ minutes }) => `${figure(hand, minutes ?? 0)} min`),
            ],
          ],
        },
        [50, 495],
        { rules: 'horizontal' },
      );
    else
      for (const cycle of truth.cycles)
        pairs(
          paper,
          [
            ...(cycle.set_temp === null
              ? []
              : [{ label: `${STEP[cycle.step] ?? ''} temp.`, value: degrees(hand, cycle.set_temp) }]),
            {
              label: `${STEP[cycle.step] ?? ''} from/to`,
              value: `${moment(hand, cycle.soak_start ?? '')} - ${moment(hand, cycle.soak_end ?? '')}`,
            },
            {
              label: `${STEP[cycle.step] ?? ''} duration`,
              value: `${figure(hand, (cycle.minutes ?? 0) / 60)} hrs`,
            },
          ],
          50,
          { labelWidth: 150, mark: ':' },
        );
    const rest: { label: string; value: string }[] = [];
    if (story.work.quench) rest.push({ label: 'Quenched in', value: story.work.quench.toLowerCase() });
    if (truth.quench_delay_s !== null)
      rest.push({ label: 'Transfer time', value: `${truth.quench_delay_s} s (max 15 s)` });
    if (truth.plating_end !== null)
      rest.push({ label: 'Out of plating', value: moment(hand, truth.plating_end) });
    for (const reading of truth.readings)
      rest.push({
        label: `${KIND[reading.kind] ?? ''} readings`,
        value: `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
      });
    pairs(paper, rest, 50, { labelWidth: 150, mark: ':' });
    paper.y += 14;
    paper.prose(
      truth.conformance_statement
        ? 'I certify that the work recorded here was carried out to the standard named and that the parts conform to the order.'
        : 'Retain this record with the parts.',
      50,
      490,
    );
    paper.y += 40;
    if (truth.signature_present) paper.sign(60, paper.y - 6, dice.whole(100, 9000));
    paper.rule([50, paper.y], [220, paper.y]);
    paper.text(`for and on behalf of ${truth.processor ?? ''}`, 50, paper.y + 12, { size: 8 });
    paper.text(`${story.signer} (${story.signerTitle})`, 50, paper.y + 26);
    return paper.save();
  },
};

/** A letter that says all in sentences, in other words than the first letter. */
const plainLetter: Layout = {
  name: 'letter without a table',
  hand: 'american',
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Courier', 10, LETTER);
    paper.text(truth.processor ?? '', 60, 60, { bold: true });
    story.address.forEach((one, index) => paper.text(one, 60, 74 + 13 * index));
    paper.text(hand.day(truth.certificate_date ?? ''), 540, 60, { align: 'right' });
    paper.text(`Cert. ${truth.certificate_number ?? ''}`, 540, 74, { align: 'right' });
    paper.y = 130;
    paper.text(`ATTN: ${story.customer}, Receiving Inspection`, 60, paper.y);
    paper.y += 26;
    const say = (text: string): void => {
      paper.prose(text, 60, 490);
      paper.y += 10;
    };
    say(`Ref: your order ${truth.purchase_order ?? ''}, batch ${truth.batch ?? ''}.`);
    for (const line of truth.lines)
      say(
        `${line.qty_accepted} pieces, part number ${line.part_number ?? ''} rev ${line.rev ?? ''}, lot ${line.lot ?? ''}, material ${line.material ?? ''}; ${line.qty_rejected} rejected.`,
      );
    say(
      `Process: ${(DONE[truth.process ?? ''] ?? '').toLowerCase()} in accordance with ${specification(told)}${truth.class_type === null ? '' : `, ${truth.class_type}`}.`,
    );
    if (truth.plating_end !== null)
      say(`Parts were removed from the plating bath at ${moment(hand, truth.plating_end)}.`);
    for (const cycle of truth.cycles)
      say(
        `${STEP[cycle.step] ?? ''}: ${cycle.set_temp === null ? 'room temperature' : degrees(hand, cycle.set_temp)}, in ${moment(hand, cycle.soak_start ?? '')}, out ${moment(hand, cycle.soak_end ?? '')}, total ${(cycle.minutes ?? 0) >= 600 ? `${(cycle.minutes ?? 0) / 60} hrs` : `${cycle.minutes} minutes`}.`,
      );
    if (story.work.quench && truth.quench_delay_s !== null)
      say(`Quench: ${story.work.quench.toLowerCase()}, transferred within ${truth.quench_delay_s} seconds.`);
    for (const reading of truth.readings)
      say(
        `${KIND[reading.kind] ?? ''} was ${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}.`,
      );
    say(
      truth.conformance_statement
        ? 'We certify the above to be true and correct and that the parts meet the specification.'
        : 'Thank you for your business.',
    );
    paper.y += 40;
    if (truth.signature_present) paper.sign(60, paper.y - 4, dice.whole(100, 9000));
    paper.text('_'.repeat(30), 60, paper.y);
    paper.text(story.signer, 60, paper.y + 13);
    paper.text(story.signerTitle, 60, paper.y + 26);
    return paper.save();
  },
};

/** Boxes at the upper right, blocks of addresses, a table with cells of two lines and a sum. */
const shippingStyle: Layout = {
  name: 'shipping style',
  hand: 'american',
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 9, LETTER);
    paper.text(truth.processor ?? '', 40, 50, { bold: true, size: 15 });
    story.address.forEach((one, index) => paper.text(one, 40, 64 + 11 * index, { size: 8 }));
    paper.y = 36;
    table(
      paper,
      {
        heads: ['CERT NO', 'DATE', 'PAGE'],
        rows: [[truth.certificate_number ?? '', hand.day(truth.certificate_date ?? ''), '1 OF 1']],
      },
      [370, 200],
      { rules: 'all', headSize: 7 },
    );
    paper.y = 104;
    for (const [x, head] of [
      [40, 'SOLD TO'],
      [310, 'SHIP TO'],
    ] as const) {
      paper.frame(x, 96, 260, 56);
      paper.text(head, x + 4, 105, { size: 7 });
      [story.customer, '88 Runway Drive', 'Mesa, AZ 85201'].forEach((one, index) =>
        paper.text(one, x + 8, 117 + 12 * index),
      );
    }
    paper.y = 162;
    table(
      paper,
      {
        heads: ['CUSTOMER P.O.', 'BATCH', 'OUR ORDER', 'DATE RECEIVED', 'SHIP VIA'],
        rows: [
          [
            truth.purchase_order ?? '',
            truth.batch ?? '',
            `S${dice.whole(1000, 9999)}`,
            hand.day(story.order.dispatched ?? ''),
            'OUR TRUCK',
          ],
        ],
      },
      [40, 532],
      { rules: 'all', headSize: 7, align: 'centre' },
    );
    paper.text(`PROCESS: ${DONE[truth.process ?? ''] ?? ''}`, 40, paper.y);
    paper.text(
      `SPEC: ${specification(told)}${truth.class_type === null ? '' : `  ${truth.class_type}`}`,
      300,
      paper.y,
    );
    paper.y += 14;
    const top = paper.y;
    const edges = [40, 150, 190, 350, 440, 500];
    ['PART NUMBER', 'REV', 'MATERIAL', 'LOT', 'QTY ACC', 'QTY REJ'].forEach((head, index) =>
      paper.text(head, (edges[index] ?? 0) + 3, top + 9, { size: 7, bold: true }),
    );
    paper.rule([40, top + 13], [572, top + 13]);
    paper.y = top + 26;
    for (const line of truth.lines) {
      const [first = '', ...others] = (line.material ?? '').split(' ');
      [
        line.part_number ?? '',
        line.rev ?? '',
        first,
        line.lot ?? '',
        String(line.qty_accepted),
        String(line.qty_rejected),
      ].forEach((cell, index) => paper.text(cell, (edges[index] ?? 0) + 3, paper.y));
      paper.text(others.join(' '), (edges[2] ?? 0) + 3, paper.y + 11);
      paper.y += 28;
    }
    paper.rule([40, paper.y - 10], [572, paper.y - 10]);
    paper.text('TOTAL', (edges[3] ?? 0) + 3, paper.y + 2, { bold: true });
    paper.text(
      String(truth.lines.reduce((sum, line) => sum + (line.qty_accepted ?? 0), 0)),
      (edges[4] ?? 0) + 3,
      paper.y + 2,
      { bold: true },
    );
    paper.text('0', (edges[5] ?? 0) + 3, paper.y + 2, { bold: true });
    paper.y += 26;
    for (const cycle of truth.cycles) {
      paper.text((STEP[cycle.step] ?? '').toUpperCase(), 40, paper.y, { bold: true });
      paper.y += 13;
      const temp = cycle.set_temp === null ? '' : `TEMP ${cycle.set_temp} ${hand.unit}    `;
      paper.text(
        `${temp}START ${moment(hand, cycle.soak_start ?? '')}    FINISH ${moment(hand, cycle.soak_end ?? '')}    TIME ${(cycle.minutes ?? 0) >= 180 ? `${(cycle.minutes ?? 0) / 60} HRS` : `${cycle.minutes} MIN`}`,
        52,
        paper.y,
      );
      paper.y += 16;
    }
    const notes = [
      ...(story.work.quench ? [`QUENCH MEDIA: ${story.work.quench.toUpperCase()}`] : []),
      ...(truth.quench_delay_s === null ? [] : [`QUENCH DELAY: ${truth.quench_delay_s} SEC`]),
      ...(truth.plating_end === null ? [] : [`PLATING COMPLETE: ${moment(hand, truth.plating_end)}`]),
      ...truth.readings.map(
        (reading) =>
          `${(KIND[reading.kind] ?? '').toUpperCase()}: ${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
      ),
    ];
    for (const note of notes) {
      paper.text(note, 40, paper.y);
      paper.y += 13;
    }
    paper.y += 8;
    paper.prose(truth.conformance_statement ? STATEMENT.toUpperCase() : NO_STATEMENT.toUpperCase(), 40, 530, {
      size: 7,
    });
    paper.y += 24;
    paper.text(truth.signature_present ? `/s/ ${story.signer}` : '', 50, paper.y);
    paper.rule([40, paper.y + 4], [240, paper.y + 4]);
    paper.text('AUTHORIZED BY', 40, paper.y + 13, { size: 7 });
    paper.text(`TITLE: ${story.signerTitle.toUpperCase()}`, 300, paper.y + 4);
    return paper.save();
  },
};

export const HELD_OUT_LAYOUTS: readonly Layout[] = [numberedGrid, processRecord, plainLetter, shippingStyle];
