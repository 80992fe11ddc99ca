import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { telephone } from './house-noise';
import { PROCESS_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, demanded, received, SPANS, specWritten } from './notation';
import { fixedTable } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import { scriptSignature } from './signing';
import { DAYS, degrees } from './wording';

const APPROVED = [
  'CAPABILITIES',
  'AMS 2750 Pyrometry',
  'AMS 2759, /1, /3, /11',
  'AMS 2770, AMS 2771',
  'AMS 2700 Passivate',
  'AMS-QQ-P-416 Cad',
  'AMS-QQ-Z-325 Zinc',
  'ASTM B633 Zinc',
  'MIL-PRF-8625 Anodize',
  'MIL-DTL-5541 Film',
  'ASTM E1417, E1444',
  '',
  'REGISTRATIONS',
  'AS9100 Rev D',
  'ISO 9001:2015',
  'Nadcap 7102, 7108, 7114',
  'FAA RS# 4XYR512B',
];

/** A house that lists down the side what it may do, and cites the standards of its tests beside the one worked to. */
export const approvalsColumn: Layout = {
  name: 'approvals column',
  hand: 'american',
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 9, [612, 792]);
    paper.text(truth.processor ?? '', 150, 44, { bold: true, size: 16 });
    paper.text(`${story.address.join(', ')}  |  ${telephone(dice)}`, 150, 58, { size: 8 });
    paper.shade(24, 24, 112, 744);
    APPROVED.forEach((line, turn) =>
      paper.text(line, 30, 44 + 13 * turn, { size: 7.5, bold: /^[A-Z]+$/.test(line) }),
    );
    paper.text('CERTIFICATE OF COMPLIANCE', 370, 88, { bold: true, size: 13, align: 'centre' });
    paper.y = 112;
    const two = (...fields: (readonly [string, string])[]): void => {
      fields.forEach(([label, value], column) => {
        paper.text(label, 150 + 222 * column, paper.y, { size: 8, grey: 0.25 });
        paper.text(value, 232 + 214 * column, paper.y, { bold: true });
      });
      paper.y += 15;
    };
    two(['Cert No.', truth.certificate_number ?? ''], ['Date', DAYS.letter(truth.certificate_date ?? '')]);
    two(['Customer', story.customer], ['Cust. P.O.', truth.purchase_order ?? '']);
    two(['Our Job No.', `${dice.whole(60000, 99999)}`], ['Cust. Batch', truth.batch ?? '']);
    two(['Process', PROCESS_NAMES.shop[truth.process ?? ''] ?? '']);
    two(['Work done to', specWritten(truth, 'upper')]);
    if (truth.class_type !== null)
      two([/ to /.test(truth.class_type) ? 'Temper' : 'Type/Class', truth.class_type]);
    paper.y += 4;
    fixedTable(
      paper,
      150,
      {
        columns: [
          { head: 'P/N', width: 88 },
          { head: 'REV', width: 30, align: 'centre' },
          { head: 'ALLOY / FORM', width: 124 },
          { head: 'LOT', width: 64 },
          { head: 'REC', width: 38, align: 'right' },
          { head: 'ACC', width: 38, align: 'right' },
          { head: 'REJ', width: 38, align: 'right' },
        ],
        rows: truth.lines.map((line) => [
          line.part_number ?? '',
          line.rev ?? '',
          line.material ?? '',
          line.lot ?? '',
          String(received(line)),
          String(line.qty_accepted),
          String(line.qty_rejected),
        ]),
      },
      { rules: 'all' },
    );
    const written = { day: DAYS.us, clock: CLOCKS.glued };
    if (truth.plating_end) two(['Plating ended', dayAndTime(truth.plating_end, written)]);
    for (const cycle of truth.cycles) {
      paper.text(
        `${STEP_NAMES.shop[cycle.step] ?? ''} ${cycle.set_temp === null ? 'at room temperature' : `at ${degrees(hand, cycle.set_temp)} +/- ${cycle.step === 'solution' ? 10 : 25}`} for ${SPANS.words(cycle.minutes ?? 0)}`,
        150,
        paper.y,
      );
      paper.y += 13;
      two(['In', dayAndTime(cycle.soak_start, written)], ['Out', dayAndTime(cycle.soak_end, written)]);
    }
    if (story.work.quench)
      two(
        ['Quench', story.work.quench],
        ...(truth.quench_delay_s === null
          ? []
          : ([['Quench delay', `${truth.quench_delay_s} sec`]] as const)),
      );
    results(paper, told);
    paper.y += 6;
    paper.prose(
      truth.conformance_statement
        ? 'We certify that the parts listed on this certificate were processed, using the equipment and the controls of our approved quality system, in conformance with the purchase order and the specification to which the work was done.'
        : 'Furnaces are surveyed to AMS 2750. Instruments are calibrated to ISO/IEC 17025 and ANSI/NCSL Z540.3. Retain this paper.',
      150,
      420,
    );
    paper.y += 34;
    scriptSignature(paper, story, 160);
    paper.rule([150, paper.y], [330, paper.y]);
    paper.text(`${story.signer}, ${story.signerTitle}`, 150, paper.y + 12, { size: 8 });
    return paper.save();
  },
};

const TESTED_TO: Readonly<Record<string, readonly [string, string]>> = {
  hardness: ['Hardness', 'ASTM E18'],
  conductivity: ['Conductivity', 'ASTM E1004'],
  thickness: ['Thickness', 'ASTM B568'],
};

function results(paper: Paper, told: Told): void {
  const { truth } = told.story;
  if (truth.readings.length === 0) return;
  fixedTable(
    paper,
    150,
    {
      columns: [
        { head: 'TEST', width: 76 },
        { head: 'METHOD', width: 68 },
        { head: 'LIMITS', width: 100 },
        { head: 'READINGS', width: 176 },
      ],
      rows: truth.readings.map((reading) => [
        ...(TESTED_TO[reading.kind] ?? ['', '']),
        demanded(told, reading.kind),
        `${readingValues(told, reading)} ${printedUnit(reading.unit, told.dice)}`,
      ]),
    },
    { rules: 'all' },
  );
}
