import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { formFoot, telephone } from './house-noise';
import { PROCESS_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, demanded, received, specWritten } from './notation';
import { fixedTable } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import { scriptSignature } from './signing';
import { DAYS, degrees } from './wording';

const typed = (said: string, ticked: boolean): string => `[${ticked ? 'X' : ' '}] ${said}`;

/** Readings one by one with their least, greatest and average; narrow columns; boxes typed as brackets. */
export const averages: Layout = {
  name: 'averages',
  hand: 'american',
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Courier', 9, [612, 792]);
    paper.text(truth.processor ?? '', 572, 46, { bold: true, size: 12, align: 'right' });
    paper.text(`${story.address.join(', ')}  ${telephone(dice)}`, 572, 58, { size: 8, align: 'right' });
    paper.text('CERTIFICATE OF CONFORMANCE AND TEST', 40, 84, { bold: true, size: 11 });
    paper.y = 106;
    const say = (...fields: (readonly [string, string])[]): void => {
      fields.forEach(([label, value], column) => {
        paper.text(`${label} ${value}`, 40 + 270 * column, paper.y);
      });
      paper.y += 14;
    };
    say(
      ['Cert number', truth.certificate_number ?? ''],
      ['Cert date', DAYS.militaryLong(truth.certificate_date ?? '')],
    );
    say(['Customer', story.customer], ['Customer PO', truth.purchase_order ?? '']);
    say(['Customer batch', truth.batch ?? ''], ['Shop traveler', `T${dice.whole(10000, 99999)}`]);
    say(['Process', PROCESS_NAMES.shop[truth.process ?? ''] ?? ''], ['Spec', specWritten(truth, 'rev')]);
    if (truth.class_type !== null)
      say([/ to /.test(truth.class_type) ? 'Condition' : 'Class', truth.class_type]);
    paper.y += 6;
    fixedTable(
      paper,
      40,
      {
        columns: [
          { head: 'Part Number', width: 92 },
          { head: 'Rev', width: 32 },
          { head: 'Material', width: 84 },
          { head: 'Heat or Lot Number', width: 74 },
          { head: 'Pieces Received', width: 62, align: 'right' },
          { head: 'Pieces Accepted', width: 62, align: 'right' },
          { head: 'Pieces Rejected', width: 62, align: 'right' },
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
    for (const said of furnace(told)) {
      paper.text(said, 40, paper.y);
      paper.y += 14;
    }
    readings(paper, told);
    paper.text(
      [typed('ACCEPTED', true), typed('REJECTED', false), typed('ACCEPTED WITH DEVIATION', false)].join(
        '   ',
      ),
      40,
      paper.y,
    );
    paper.y += 22;
    paper.prose(
      truth.conformance_statement
        ? 'We certify the parts above to have been processed to the specification and to meet the requirements of the purchase order. Test specimens are kept for one year.'
        : 'Test specimens are kept for one year.',
      40,
      530,
    );
    paper.y += 32;
    paper.text('Certified by', 40, paper.y);
    scriptSignature(paper, story, 118);
    paper.rule([112, paper.y + 1], [300, paper.y + 1]);
    paper.text(`${story.signer}, ${story.signerTitle}`, 112, paper.y + 13, { size: 8 });
    paper.text(formFoot(dice), 40, 764, { size: 7 });
    return paper.save();
  },
};

function furnace({ story, hand }: Told): string[] {
  const { truth } = story;
  const written = { day: DAYS.militaryLong, clock: CLOCKS.military };
  return [
    ...(truth.plating_end === null ? [] : [`Plating complete ${dayAndTime(truth.plating_end, written)}`]),
    ...truth.cycles.flatMap((cycle) => {
      const minutes = cycle.minutes ?? 0;
      const span = minutes >= 180 ? `${(minutes / 60).toFixed(2)} hr` : `${minutes} min`;
      return [
        `${STEP_NAMES.shop[cycle.step] ?? ''} ${cycle.set_temp === null ? 'room temperature' : degrees(hand, cycle.set_temp)}, ${span}`,
        `   in ${dayAndTime(cycle.soak_start, written)}   out ${dayAndTime(cycle.soak_end, written)}`,
      ];
    }),
    ...(story.work.quench
      ? [
          `Quench ${story.work.quench.toLowerCase()}${truth.quench_delay_s === null ? '' : `   Quench delay ${truth.quench_delay_s} sec`}`,
        ]
      : []),
  ];
}

function readings(paper: Paper, told: Told): void {
  const { truth } = told.story;
  paper.y += 4;
  if (truth.readings.length === 0) return;
  fixedTable(
    paper,
    40,
    {
      columns: [
        { head: 'Test', width: 84 },
        { head: 'Unit', width: 68 },
        { head: 'Required', width: 88 },
        { head: 'Readings', width: 132 },
        { head: 'Min', width: 52, align: 'right' },
        { head: 'Max', width: 52, align: 'right' },
        { head: 'Avg', width: 52, align: 'right' },
      ],
      rows: truth.readings.map((reading) => {
        const { values } = reading;
        const average = values.reduce((sum, value) => sum + value, 0) / values.length;
        const alone = (value: number): string => readingValues(told, { ...reading, values: [value] });
        return [
          { hardness: 'Hardness', conductivity: 'Conductivity', thickness: 'Thickness' }[reading.kind] ?? '',
          printedUnit(reading.unit, told.dice),
          demanded(told, reading.kind),
          readingValues(told, reading).replaceAll(',', ''),
          alone(Math.min(...values)),
          alone(Math.max(...values)),
          alone(reading.unit === 'microinch' ? Math.round(average) : average),
        ];
      }),
    },
    { rules: 'all' },
  );
}
