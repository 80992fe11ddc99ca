import { printedUnit } from './as-printed';
import { readingValues, type Told } from './content';
import { PROCESS_NAMES, STEP_NAMES } from './house-words';
import type { Layout } from './layout';
import { CLOCKS, dayAndTime, received, SPANS, specWritten } from './notation';
import { fixedTable } from './ruled-cells';
import { Paper } from './sheet-of-paper';
import type { Truth } from './story';
import { DAYS, degrees } from './wording';

/** The readings of each line beside it, in the order in which they were taken. */
function shared(told: Told, kind: string, place: number): string {
  const { lines, readings } = told.story.truth;
  const reading = readings.find((one) => one.kind === kind);
  if (!reading) return '';
  const each = Math.ceil(reading.values.length / lines.length);
  const values = reading.values.slice(place * each, (place + 1) * each);
  return values.length === 0 ? '-' : readingValues(told, { ...reading, values });
}

/** An Australian house: bold labels without a colon, the readings in the table of parts, totals below it. */
export const australianForm: Layout = {
  name: 'Australian form',
  hand: 'british',
  states: (truth: Truth) => ({ ...truth, batch: null }),
  async draw(told: Told) {
    const { story, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Times', 10, [842, 595]);
    paper.text(truth.processor ?? '', 50, 48, { bold: true, size: 16 });
    paper.text(
      `ABN ${dice.whole(10, 99)} ${dice.whole(100, 999)} ${dice.whole(100, 999)} ${dice.whole(100, 999)}`,
      50,
      62,
      { size: 8 },
    );
    paper.text(`${story.address.join(', ')}   Ph (03) 5550 ${dice.whole(1000, 9999)}`, 50, 72, { size: 8 });
    paper.text('PROCESS CERTIFICATE', 792, 48, { bold: true, size: 14, align: 'right' });
    paper.y = 100;
    const row = (...fields: (readonly [string, string])[]): void => {
      let x = 50;
      for (const [label, value] of fields) {
        paper.text(label, x, paper.y, { bold: true });
        paper.text(value, x + paper.widthOf(`${label} `, { bold: true }) + 3, paper.y);
        x += 742 / fields.length;
      }
      paper.y += 17;
    };
    row(
      ['Certificate No', truth.certificate_number ?? ''],
      ['Issued', DAYS.shortNamed(truth.certificate_date ?? '')],
      ['Order No', truth.purchase_order ?? ''],
      ['Job', `${dice.whole(1000, 9999)}/26`],
    );
    row(['Customer', story.customer], ['Material', truth.lines[0]?.material ?? '']);
    row(
      ['Process', PROCESS_NAMES.formal[truth.process ?? ''] ?? ''],
      ['Specification', specWritten(truth, 'rev')],
      ...(truth.class_type === null
        ? []
        : ([[/ to /.test(truth.class_type) ? 'Condition' : 'Class', truth.class_type]] as const)),
    );
    paper.y += 4;
    parts(paper, told);
    furnace(paper, told, row);
    paper.y += 8;
    paper.prose(
      truth.conformance_statement
        ? 'It is certified that the items listed have been processed and inspected in accordance with the order and specification quoted above and comply with their requirements.'
        : 'Items not collected within 30 days attract storage. GST is shown on the invoice.',
      50,
      740,
    );
    paper.y += 22;
    row(
      ['Authorised signatory', truth.signature_present ? `/s/ ${story.signer}` : ''],
      ['Name', story.signer],
      ['Position', story.signerTitle],
    );
    paper.text(
      'NATA accredited laboratory 20123   CASA approval 1-ABCDE   AS/NZS ISO 9001   Doc PC-04 Issue 7',
      421,
      576,
      {
        size: 7,
        align: 'centre',
      },
    );
    return paper.save();
  },
};

function parts(paper: Paper, told: Told): void {
  const { story, dice } = told;
  const { truth } = story;
  const kinds = truth.readings.map(({ kind, unit }) => ({
    kind,
    head: `${{ hardness: 'Hardness', conductivity: 'Conductivity', thickness: 'Thickness' }[kind] ?? ''} ${printedUnit(unit, dice)}`,
  }));
  const sum = (of: (line: Truth['lines'][number]) => number): string =>
    String(truth.lines.reduce((total, line) => total + of(line), 0));
  fixedTable(
    paper,
    50,
    {
      columns: [
        { head: 'Part No', width: 104 },
        { head: 'Rev', width: 30 },
        { head: 'Heat/Lot', width: 74 },
        { head: 'Qty Recd', width: 50, align: 'right' },
        { head: 'Qty Despatched', width: 62, align: 'right' },
        { head: 'Qty Rejected', width: 54, align: 'right' },
        ...kinds.map(({ head }) => ({ head, width: 368 / kinds.length })),
      ],
      rows: [
        ...truth.lines.map((line, place) => [
          line.part_number ?? '',
          line.rev ?? '',
          line.lot ?? '',
          String(received(line)),
          String(line.qty_accepted),
          String(line.qty_rejected),
          ...kinds.map(({ kind }) => shared(told, kind, place)),
        ]),
        [
          'TOTAL',
          '',
          '',
          sum(received),
          sum(({ qty_accepted }) => qty_accepted ?? 0),
          sum(({ qty_rejected }) => qty_rejected ?? 0),
        ],
      ],
    },
    { rules: 'all' },
  );
}

function furnace(
  paper: Paper,
  { story, hand, dice }: Told,
  row: (...fields: (readonly [string, string])[]) => void,
): void {
  const { truth } = story;
  const written = { day: DAYS.shortNamed, clock: CLOCKS.hours, between: ', ' };
  paper.y += 4;
  if (truth.plating_end) row(['Plating completed', dayAndTime(truth.plating_end, written)]);
  for (const cycle of truth.cycles)
    row(
      [
        STEP_NAMES.formal[cycle.step] ?? '',
        cycle.set_temp === null
          ? 'ambient'
          : `${degrees(hand, cycle.set_temp)} (furnace ${dice.whole(1, 6)})`,
      ],
      ['Start', dayAndTime(cycle.soak_start, written)],
      ['Finish', dayAndTime(cycle.soak_end, written)],
      ['Duration', SPANS.parts(cycle.minutes ?? 0)],
    );
  if (story.work.quench)
    row(
      ['Quench', story.work.quench],
      ...(truth.quench_delay_s === null ? [] : ([['Quench delay', `${truth.quench_delay_s} s`]] as const)),
    );
}
