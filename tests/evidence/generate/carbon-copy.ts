import { printedUnit } from './as-printed';
import { broken } from './characters';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, eachCycle, eachLine, specWritten } from './notation';
import { Paper } from './sheet-of-paper';
import type { Truth } from './story';
import { DAYS } from './wording';

/** What was done to the parts, without the hours of the day but for a bake; neither lots nor a batch. */
function states(truth: Truth): Truth {
  return {
    ...eachCycle(
      eachLine(truth, (line) => ({ ...line, lot: null, qty_rejected: null })),
      (cycle) =>
        cycle.step === 'embrittlement_relief' ? cycle : { ...cycle, soak_start: null, soak_end: null },
    ),
    batch: null,
  };
}

const DONE: Readonly<Record<string, string>> = {
  solution: 'SOLUTION TREATED',
  natural_age: 'NATURALLY AGED',
  artificial_age: 'AGED',
  austenitize: 'HARDENED',
  temper: 'TEMPERED',
  stress_relief: 'STRESS RELIEVED',
  embrittlement_relief: 'BAKED',
};

/** A form that a typist fills in: dots up to the value, then lines of capitals that say what was done. */
export const carbonCopy: Layout = {
  name: 'carbon copy',
  hand: 'american',
  states,
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Courier', 10.5, [612, 792]);
    const head = (truth.processor ?? '').toUpperCase();
    paper.text(head, 306, 52, { align: 'centre', bold: true, size: 13 });
    paper.text(story.address.join(' - ').toUpperCase(), 306, 66, { align: 'centre', size: 9 });
    paper.text('MATERIAL PROCESS CERTIFICATION', 306, 100, { align: 'centre' });
    paper.rule([210, 103], [402, 103], 0.8);
    paper.y = 132;
    const dots = (label: string, value: string): void => {
      paper.text(
        `${label} ${'.'.repeat(Math.max(3, 24 - label.length))} ${value.toUpperCase()}`,
        60,
        paper.y,
      );
      paper.y += 14.5;
    };
    dots('CUSTOMER', story.customer);
    dots('CUST. P.O. NO.', truth.purchase_order ?? '');
    dots('OUR JOB NO.', `${dice.whole(2000, 9999)}-B`);
    dots('CERT. NO.', truth.certificate_number ?? '');
    dots('DATE', DAYS.letter(truth.certificate_date ?? ''));
    dots('PROCESS', PROCESS_NAMES.shop[truth.process ?? ''] ?? '');
    dots('PER SPEC.', specWritten(truth, 'upper'));
    if (truth.class_type !== null)
      dots(/ to /.test(truth.class_type) ? 'CONDITION' : 'TYPE AND CLASS', truth.class_type);
    for (const line of truth.lines) {
      paper.y += 5;
      dots('PART NO.', `${line.part_number ?? ''}  REV. ${line.rev ?? ''}`);
      dots('MATERIAL', line.material ?? '');
      dots('QUANTITY', `${line.qty_accepted} PCS.`);
    }
    paper.y += 10;
    for (const line of [...sentences(told), '', ...broken(closing(truth).toUpperCase(), 76)]) {
      paper.text(line, 60, paper.y);
      paper.y += 14.5;
    }
    paper.y += 30;
    if (truth.signature_present) paper.sign(80, paper.y - 3, dice.whole(100, 9000));
    paper.rule([60, paper.y], [270, paper.y]);
    paper.text(story.signer.toUpperCase(), 60, paper.y + 13);
    paper.text(story.signerTitle.toUpperCase(), 60, paper.y + 26);
    paper.text('WHITE - CUSTOMER    YELLOW - QUALITY    PINK - FILE', 306, 762, {
      size: 7.5,
      align: 'centre',
    });
    return paper.save();
  },
};

const closing = ({ conformance_statement: stated }: Truth): string =>
  stated
    ? 'We certify that the above is a true statement of the work done and that the parts meet the requirements of the specification and order.'
    : 'Thank you for your business.';

function sentences(told: Told): string[] {
  const { story, dice } = told;
  const { truth } = story;
  const written = { day: DAYS.us, clock: CLOCKS.military, between: ' AT ' };
  const cycles = truth.cycles.flatMap((cycle) => {
    const minutes = cycle.minutes ?? 0;
    const span = minutes % 60 === 0 || minutes >= 180 ? `${minutes / 60} HRS.` : `${minutes} MIN.`;
    const heat = cycle.set_temp === null ? 'AT ROOM TEMP.' : `AT ${cycle.set_temp} F`;
    return [
      `PARTS ${DONE[cycle.step] ?? ''} ${heat} FOR ${span}`,
      ...(cycle.soak_start
        ? [
            `${DONE[cycle.step] ?? ''} FROM ${dayAndTime(cycle.soak_start, written)}`,
            `         TO ${dayAndTime(cycle.soak_end, written)}`,
          ]
        : []),
    ];
  });
  return [
    ...(truth.plating_end === null ? [] : [`PLATING COMPLETED ${dayAndTime(truth.plating_end, written)}`]),
    ...cycles.slice(0, 1),
    ...(story.work.quench
      ? [
          `QUENCHED IN ${story.work.quench.toUpperCase()}${truth.quench_delay_s === null ? '' : `. QUENCH DELAY ${truth.quench_delay_s} SEC.`}`,
        ]
      : []),
    ...cycles.slice(1),
    ...truth.readings.map(
      (reading) =>
        `${{ hardness: 'HARDNESS', conductivity: 'CONDUCTIVITY', thickness: 'THICKNESS' }[reading.kind] ?? ''} OBTAINED ${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
    ),
  ];
}
