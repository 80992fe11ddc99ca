import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES, READING_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, SPANS, specWritten } from './notation';
import { fixedTable } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import { pastedSignature } from './signing';
import { DAYS } from './wording';

/** A German house writing English: the block of references at the right, narrow columns, a company's particulars at the foot. */
export const germanReport: Layout = {
  name: 'German report in English',
  hand: 'nordic',
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 9, [595, 842]);
    paper.text(truth.processor ?? '', 55, 50, { bold: true, size: 16 });
    paper.text(`${truth.processor ?? ''} · ${story.address.join(' · ')}`, 55, 100, { size: 6.5 });
    [story.customer, 'Quality Assurance', 'Hangar Road 12'].forEach((line, turn) =>
      paper.text(line, 55, 116 + 12 * turn),
    );
    paper.y = 96;
    for (const [label, value] of [
      ['Certificate no.', truth.certificate_number ?? ''],
      ['Date', DAYS.dotted(truth.certificate_date ?? '')],
      ['Your order', truth.purchase_order ?? ''],
      ['Your batch', truth.batch ?? ''],
      ['Our order', `A-26-${dice.whole(1000, 9999)}`],
      ['Customer no.', `${dice.whole(10000, 19999)}`],
      ['Page', '1 / 1'],
    ] as const) {
      paper.text(label, 380, paper.y, { grey: 0.35 });
      paper.text(value, 460, paper.y);
      paper.y += 12;
    }
    paper.y = 206;
    paper.text('Inspection certificate 3.1 according to EN 10204', 55, paper.y, { bold: true, size: 12 });
    paper.y += 24;
    for (const [label, value] of [
      ['Treatment', PROCESS_NAMES.formal[truth.process ?? ''] ?? ''],
      ['Specification', specWritten(truth, 'issue')],
      ...(truth.class_type === null
        ? []
        : [[/ to /.test(truth.class_type) ? 'Condition' : 'Class / type', truth.class_type]]),
    ]) {
      paper.text(label ?? '', 55, paper.y);
      paper.text(value ?? '', 150, paper.y, { bold: true });
      paper.y += 14;
    }
    paper.y += 6;
    fixedTable(
      paper,
      55,
      {
        columns: [
          { head: 'Pos.', width: 28 },
          { head: 'Part number (drawing)', width: 92 },
          { head: 'Revision index', width: 50 },
          { head: 'Material', width: 86 },
          { head: 'Charge / lot', width: 76 },
          { head: 'Quantity delivered [pcs]', width: 58, align: 'right' },
          { head: 'of which accepted', width: 52, align: 'right' },
          { head: 'of which rejected', width: 50, align: 'right' },
        ],
        rows: truth.lines.map((line, index) => [
          String(10 * (index + 1)),
          line.part_number ?? '',
          line.rev ?? '',
          line.material ?? '',
          line.lot ?? '',
          String((line.qty_accepted ?? 0) + (line.qty_rejected ?? 0)),
          String(line.qty_accepted),
          String(line.qty_rejected),
        ]),
      },
      { rules: 'all', headSize: 7 },
    );
    treatment(paper, told);
    paper.y += 8;
    paper.prose(
      truth.conformance_statement
        ? 'We confirm that the parts named above were treated and tested according to the specification and that the results comply with the requirements of the order.'
        : 'The results relate only to the parts tested. This document was made by machine.',
      55,
      480,
    );
    paper.y += 44;
    await pastedSignature(paper, story, dice, 60);
    paper.rule([55, paper.y + 2], [230, paper.y + 2]);
    paper.text(`${story.signer}, ${story.signerTitle}`, 55, paper.y + 14, { size: 8 });
    paper.text('Works inspector', 55, paper.y + 24, { size: 7 });
    foot(paper, told);
    return paper.save();
  },
};

function treatment(paper: Paper, told: Told): void {
  const { story, dice } = told;
  const { truth } = story;
  const written = { day: DAYS.dotted, clock: CLOCKS.plain };
  if (truth.cycles.length > 0)
    fixedTable(
      paper,
      55,
      {
        columns: [
          { head: 'Step', width: 128 },
          { head: 'Set value [°C]', width: 64, align: 'right' },
          { head: 'Start of holding', width: 106, align: 'centre' },
          { head: 'End of holding', width: 106, align: 'centre' },
          { head: 'Holding time [h:min]', width: 88, align: 'right' },
        ],
        rows: truth.cycles.map((cycle) => [
          STEP_NAMES.formal[cycle.step] ?? '',
          cycle.set_temp === null ? 'RT' : String(cycle.set_temp),
          dayAndTime(cycle.soak_start, written),
          dayAndTime(cycle.soak_end, written),
          SPANS.clock(cycle.minutes ?? 0),
        ]),
      },
      { rules: 'all', headSize: 7 },
    );
  const rest: (readonly [string, string])[] = [
    ...(truth.plating_end === null
      ? []
      : [['End of plating', dayAndTime(truth.plating_end, written)] as const]),
    ...(story.work.quench ? [['Quenching medium', story.work.quench.toLowerCase()] as const] : []),
    ...(truth.quench_delay_s === null
      ? []
      : [['Transfer time to quench', `${truth.quench_delay_s} s`] as const]),
    ...truth.readings.map(
      (reading) =>
        [
          `${READING_NAMES.formal[reading.kind] ?? ''} [${printedUnit(reading.unit, dice)}]`,
          readingValues(told, reading).replaceAll('; ', ' / '),
        ] as const,
    ),
  ];
  for (const [label, value] of rest) {
    paper.text(label, 55, paper.y);
    paper.text(value, 200, paper.y);
    paper.y += 13;
  }
}

function foot(paper: Paper, { story, dice }: Told): void {
  paper.rule([55, 784], [547, 784], 0.4);
  const columns = [
    [story.truth.processor ?? '', ...story.address],
    [
      `HRB ${dice.whole(10000, 70000)}, local court`,
      'Managing director: K. Adler',
      `VAT ID DE${dice.whole(100000000, 999999999)}`,
    ],
    ['Example Bank', `IBAN DE00 0000 0000 ${dice.whole(1000, 9999)} 0000 00`, 'BIC EXMPDE00XXX'],
    [
      'Certified to EN 9100:2018',
      `Certificate-Register No. ${dice.whole(10000, 99999)} QM15`,
      'Nadcap Heat Treating',
    ],
  ];
  columns.forEach((lines, column) =>
    lines.forEach((line, turn) => paper.text(line, 55 + 126 * column, 794 + 8 * turn, { size: 6 })),
  );
}
