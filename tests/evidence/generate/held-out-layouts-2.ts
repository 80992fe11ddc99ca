import { printedUnit } from './as-printed';
import { cards, pairs, table } from './blocks';
import { readingValues, specification, type Told } from './content';
import type { Layout } from './layout';
import { Paper } from './sheet-of-paper';
import { degrees, figure, lasting, moment } from './wording';

const LETTER = [612, 792] as const;
const A4 = [595, 842] as const;

const NAMES: Readonly<Record<string, string>> = {
  solution_heat_treat_and_age: 'Solution Heat Treatment & Ageing',
  harden_and_temper: 'Hardening & Tempering',
  stress_relief: 'Stress Relieving',
  cadmium_plate: 'Cadmium Electroplating',
  zinc_plate: 'Zinc Electroplating',
  anodize: 'Anodic Coating',
  chemical_film: 'Conversion Coating',
  passivation: 'Passivation',
  fluorescent_penetrant: 'Penetrant Inspection (FPI)',
  magnetic_particle: 'Magnetic Particle Inspection',
};
const STEPS: Readonly<Record<string, string>> = {
  solution: 'SOLUTION HEAT TREATMENT',
  natural_age: 'NATURAL AGEING',
  artificial_age: 'ARTIFICIAL AGEING',
  austenitize: 'AUSTENITIZING',
  temper: 'TEMPERING',
  stress_relief: 'STRESS RELIEF',
  embrittlement_relief: 'EMBRITTLEMENT RELIEF BAKE',
};

/** Sections with bars, in each of them fields that do not say which step they are of. */
const sections: Layout = {
  name: 'sections with bars',
  hand: 'american',
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 9.5, LETTER);
    const bar = (text: string): void => {
      paper.shade(36, paper.y - 10, 540, 15);
      paper.text(text, 42, paper.y + 1, { bold: true });
      paper.y += 20;
    };
    paper.text(truth.processor ?? '', 576, 44, { bold: true, size: 14, align: 'right' });
    paper.text(`${story.address.join(' | ')} | Tel (555) 010-0199`, 576, 56, { size: 7.5, align: 'right' });
    paper.text('Certified Test & Process Report', 36, 48, { size: 13 });
    paper.y = 84;
    bar('GENERAL');
    const half = [
      { label: 'Report Number', value: truth.certificate_number ?? '' },
      { label: 'Report Date', value: hand.day(truth.certificate_date ?? '') },
      { label: 'Customer P/O', value: truth.purchase_order ?? '' },
      { label: 'Customer Batch No', value: truth.batch ?? '' },
      { label: 'Work Order', value: `WO-${dice.whole(10000, 99999)}` },
    ];
    pairs(paper, half, 42, { labelWidth: 120, mark: ':' });
    bar('PARTS');
    for (const line of truth.lines) {
      pairs(
        paper,
        [
          { label: 'Part Number', value: `${line.part_number ?? ''} Rev ${line.rev ?? ''}` },
          { label: 'Material', value: line.material ?? '' },
          { label: 'Lot', value: line.lot ?? '' },
          { label: 'Qty Accepted / Rejected', value: `${line.qty_accepted} / ${line.qty_rejected}` },
        ],
        42,
        { labelWidth: 140, mark: ':', pitch: 1.35 },
      );
      paper.y += 4;
    }
    bar('REQUIREMENTS');
    pairs(
      paper,
      [
        { label: 'Process', value: NAMES[truth.process ?? ''] ?? '' },
        {
          label: 'Process Specification',
          value: `${specification(told)}${truth.class_type === null ? '' : ` ${truth.class_type}`}`,
        },
      ],
      42,
      { labelWidth: 140, mark: ':' },
    );
    for (const cycle of truth.cycles) {
      bar(STEPS[cycle.step] ?? '');
      cards(
        paper,
        [
          {
            label: 'Set Temperature',
            value: cycle.set_temp === null ? 'Ambient' : degrees(hand, cycle.set_temp),
          },
          { label: 'Start', value: moment(hand, cycle.soak_start ?? '') },
          { label: 'Stop', value: moment(hand, cycle.soak_end ?? '') },
          { label: 'Total Time', value: lasting(hand, cycle.minutes ?? 0) },
        ],
        [38, 536],
        { columns: 4, framed: true, height: 28 },
      );
    }
    if (story.work.quench || truth.plating_end || truth.readings.length > 0) bar('RESULTS');
    const results: { label: string; value: string }[] = [];
    if (story.work.quench)
      results.push({
        label: 'Quench',
        value: `${story.work.quench}${truth.quench_delay_s === null ? '' : `, delay ${truth.quench_delay_s} s`}`,
      });
    if (truth.plating_end)
      results.push({ label: 'Time Out of Plating', value: moment(hand, truth.plating_end) });
    for (const reading of truth.readings)
      results.push({
        label:
          {
            hardness: 'Hardness Obtained',
            conductivity: 'Eddy Current Conductivity',
            thickness: 'Deposit Thickness',
          }[reading.kind] ?? '',
        value: `${printedUnit(reading.unit, dice)} ${readingValues(told, reading)}`,
      });
    pairs(paper, results, 42, { labelWidth: 150, mark: ':' });
    bar('CERTIFICATION');
    paper.prose(
      truth.conformance_statement
        ? 'I hereby certify that the above results are correct as contained in the records of the company and that the parts meet the requirements of the specification.'
        : 'For questions contact the quality office.',
      42,
      520,
    );
    paper.y += 34;
    if (truth.signature_present) paper.sign(120, paper.y, dice.whole(100, 9000));
    paper.text('Certified by:', 42, paper.y);
    paper.rule([115, paper.y + 2], [300, paper.y + 2]);
    paper.text(`${story.signer}, ${story.signerTitle}`, 120, paper.y + 13, { size: 8 });
    return paper.save();
  },
};

/** A single wide table with everything of a line in its row, and details in a second table below. */
const wideTable: Layout = {
  name: 'wide table',
  hand: 'german',
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Times', 9, [842, 595]);
    paper.text(truth.processor ?? '', 421, 40, { bold: true, size: 16, align: 'centre' });
    paper.text(story.address.join(' · '), 421, 54, { size: 8, align: 'centre' });
    paper.text('Bescheinigung / Certificate', 421, 76, { bold: true, size: 12, align: 'centre' });
    paper.y = 92;
    table(
      paper,
      {
        heads: [
          'Bescheinigungs-Nr.\nCertificate No.',
          'Ausstellungsdatum\nDate of issue',
          'Bestell-Nr.\nOrder No.',
          'Batch',
          'Verfahren\nProcess',
          'Vorschrift\nSpecification',
          ...(truth.class_type === null ? [] : ['Zustand, Klasse\nCondition, class']),
        ],
        rows: [
          [
            truth.certificate_number ?? '',
            hand.day(truth.certificate_date ?? ''),
            truth.purchase_order ?? '',
            truth.batch ?? '',
            NAMES[truth.process ?? ''] ?? '',
            specification(told),
            ...(truth.class_type === null ? [] : [truth.class_type]),
          ],
        ],
      },
      [40, 762],
      { rules: 'all', headSize: 7.5 },
    );
    table(
      paper,
      {
        heads: [
          'Pos.',
          'Teilenummer\nPart number',
          'Index\nRevision',
          'Werkstoff\nMaterial',
          'Los-Nr.\nLot no.',
          'Gut\nAccepted',
          'Ausschuss\nRejected',
        ],
        rows: truth.lines.map((line, index) => [
          String(index + 1),
          line.part_number ?? '',
          line.rev ?? '',
          line.material ?? '',
          line.lot ?? '',
          String(line.qty_accepted),
          String(line.qty_rejected),
        ]),
      },
      [40, 762],
      { rules: 'all', headSize: 7.5, align: 'centre' },
    );
    if (truth.cycles.length > 0)
      table(
        paper,
        {
          heads: ['Arbeitsgang\nStep', 'Temperatur (°C)', 'Beginn\nStart', 'Ende\nEnd', 'Haltezeit (h)'],
          rows: truth.cycles.map((cycle) => [
            STEPS[cycle.step] ?? '',
            cycle.set_temp === null ? 'RT' : String(cycle.set_temp),
            moment(hand, cycle.soak_start ?? ''),
            moment(hand, cycle.soak_end ?? ''),
            figure(hand, Math.round(((cycle.minutes ?? 0) / 60) * 1000) / 1000),
          ]),
        },
        [40, 762],
        { rules: 'all', headSize: 7.5 },
      );
    const rest: string[] = [];
    if (story.work.quench)
      rest.push(`Abschreckmittel / Quench: ${{ Water: 'Wasser', Oil: 'Öl' }[story.work.quench] ?? ''}`);
    if (truth.quench_delay_s !== null) rest.push(`Abschreckverzug / Quench delay: ${truth.quench_delay_s} s`);
    if (truth.plating_end)
      rest.push(`Ende der Beschichtung / End of plating: ${moment(hand, truth.plating_end)}`);
    for (const reading of truth.readings)
      rest.push(
        `${{ hardness: 'Härte / Hardness', conductivity: 'Leitfähigkeit / Conductivity', thickness: 'Schichtdicke / Thickness' }[reading.kind] ?? ''}: ${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
      );
    for (const line of rest) {
      paper.text(line, 40, paper.y);
      paper.y += 14;
    }
    paper.y += 6;
    paper.prose(
      truth.conformance_statement
        ? 'Es wird bestätigt, dass die Teile gemäß der genannten Vorschrift behandelt wurden und den Anforderungen der Bestellung entsprechen.'
        : 'Es gelten unsere allgemeinen Geschäftsbedingungen.',
      40,
      740,
    );
    paper.y += 34;
    if (truth.signature_present) paper.sign(560, paper.y - 4, dice.whole(100, 9000));
    paper.rule([550, paper.y], [760, paper.y]);
    paper.text(`Unterschrift / Signature: ${story.signer}`, 550, paper.y + 12, { size: 8 });
    return paper.save();
  },
};

/** A hand-filled style: long blank lines with the values on them, several to a line. */
const blankLines: Layout = {
  name: 'values on blank lines',
  hand: 'american',
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 10, LETTER);
    paper.text(truth.processor ?? '', 306, 48, { bold: true, size: 17, align: 'centre' });
    paper.text(story.address.join(' - '), 306, 62, { size: 9, align: 'centre' });
    paper.text('CERTIFICATION', 306, 92, { bold: true, size: 14, align: 'centre' });
    paper.y = 124;
    const row = (...fields: (readonly [string, string, number])[]): void => {
      let x = 46;
      for (const [label, value, width] of fields) {
        paper.text(label, x, paper.y);
        const at = x + paper.widthOf(label) + 4;
        paper.rule([at, paper.y + 2], [x + width - 8, paper.y + 2], 0.4);
        paper.text(value, at + 6, paper.y);
        x += width;
      }
      paper.y += 21;
    };
    row(['Customer', story.customer, 260], ['Date', hand.day(truth.certificate_date ?? ''), 260]);
    row(
      ['P.O. No.', truth.purchase_order ?? '', 180],
      ['Cert. No.', truth.certificate_number ?? '', 180],
      ['Batch No.', truth.batch ?? '', 160],
    );
    row(['Process', NAMES[truth.process ?? ''] ?? '', 520]);
    row(
      ['Spec.', specification(told), 260],
      ...(truth.class_type === null
        ? []
        : ([[/ to /.test(truth.class_type) ? 'Temper' : 'Type/Class', truth.class_type, 260]] as const)),
    );
    for (const line of truth.lines) {
      row(
        ['Part No.', line.part_number ?? '', 180],
        ['Rev.', line.rev ?? '', 70],
        ["Mat'l", line.material ?? '', 270],
      );
      row(
        ['Lot', line.lot ?? '', 180],
        ['Qty. Acc.', String(line.qty_accepted), 130],
        ['Qty. Rej.', String(line.qty_rejected), 130],
      );
    }
    for (const cycle of truth.cycles) {
      const step =
        {
          solution: 'Solution',
          natural_age: 'Nat. age',
          artificial_age: 'Age',
          austenitize: 'Harden',
          temper: 'Temper',
          stress_relief: 'Stress relief',
          embrittlement_relief: 'Bake',
        }[cycle.step] ?? '';
      row(
        [`${step} temp.`, cycle.set_temp === null ? 'room' : degrees(hand, cycle.set_temp), 150],
        ['In', moment(hand, cycle.soak_start ?? ''), 190],
        ['Out', moment(hand, cycle.soak_end ?? ''), 190],
      );
    }
    if (story.work.quench)
      row(
        ['Quenchant', story.work.quench, 180],
        ...(truth.quench_delay_s === null ? [] : ([['Delay', `${truth.quench_delay_s} sec.`, 160]] as const)),
      );
    if (truth.plating_end) row(['Plating ended', moment(hand, truth.plating_end), 300]);
    for (const reading of truth.readings)
      row([
        { hardness: 'Hardness', conductivity: 'Cond.', thickness: 'Plate thickness' }[reading.kind] ?? '',
        `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
        520,
      ]);
    paper.y += 8;
    paper.prose(
      truth.conformance_statement
        ? 'THIS CERTIFIES THAT THE ABOVE PARTS HAVE BEEN PROCESSED IN COMPLIANCE WITH THE SPECIFICATION SHOWN.'
        : 'SAMPLES RETAINED 90 DAYS.',
      46,
      510,
    );
    paper.y += 40;
    if (truth.signature_present) paper.sign(56, paper.y - 3, dice.whole(100, 9000));
    paper.rule([46, paper.y], [250, paper.y], 0.4);
    paper.text('Inspector', 46, paper.y + 12);
    paper.rule([330, paper.y], [540, paper.y], 0.4);
    paper.text(story.signerTitle, 336, paper.y - 3);
    paper.text('Title', 330, paper.y + 12);
    return paper.save();
  },
};

/** Two halves side by side: who and what on the left, what was done on the right. */
const twoHalves: Layout = {
  name: 'two halves',
  hand: 'british',
  async draw(told: Told) {
    const { story, hand, dice } = told;
    const { truth } = story;
    const paper = await Paper.open('Helvetica', 9, A4);
    paper.text(truth.processor ?? '', 40, 46, { bold: true, size: 15 });
    paper.text(story.address.join(', '), 40, 58, { size: 8 });
    paper.text('Certificate of Conformity', 555, 46, { size: 12, align: 'right' });
    paper.rule([40, 66], [555, 66], 1);
    paper.rule([297, 72], [297, 400], 0.5);
    paper.y = 88;
    const left = [
      { label: 'C of C number', value: truth.certificate_number ?? '' },
      { label: 'Date of issue', value: hand.day(truth.certificate_date ?? '') },
      { label: 'Your order', value: truth.purchase_order ?? '' },
      { label: 'Your batch', value: truth.batch ?? '' },
      { label: 'Our order', value: `SO${dice.whole(1000, 9999)}` },
      { label: 'Process', value: NAMES[truth.process ?? ''] ?? '' },
      { label: 'Specification', value: specification(told) },
      ...(truth.class_type === null ? [] : [{ label: 'Class / type', value: truth.class_type }]),
    ];
    pairs(paper, left, 44, { labelWidth: 84, mark: '', pitch: 1.9 });
    const bottom = paper.y;
    paper.y = 88;
    for (const cycle of truth.cycles) {
      paper.text(
        `${(STEPS[cycle.step] ?? '').charAt(0)}${(STEPS[cycle.step] ?? '').slice(1).toLowerCase()}`,
        306,
        paper.y,
        { bold: true },
      );
      paper.y += 14;
      pairs(
        paper,
        [
          ...(cycle.set_temp === null
            ? []
            : [{ label: 'Set temperature', value: degrees(hand, cycle.set_temp) }]),
          { label: 'Soak start', value: moment(hand, cycle.soak_start ?? '') },
          { label: 'Soak end', value: moment(hand, cycle.soak_end ?? '') },
          { label: 'Soak time', value: lasting(hand, cycle.minutes ?? 0) },
        ],
        312,
        { labelWidth: 92, mark: '', pitch: 1.5 },
      );
      paper.y += 4;
    }
    const rest: { label: string; value: string }[] = [];
    if (story.work.quench) rest.push({ label: 'Quench', value: story.work.quench });
    if (truth.quench_delay_s !== null)
      rest.push({ label: 'Quench delay', value: `${truth.quench_delay_s} s` });
    if (truth.plating_end) rest.push({ label: 'End of plating', value: moment(hand, truth.plating_end) });
    for (const reading of truth.readings)
      rest.push({
        label:
          { hardness: 'Hardness', conductivity: 'Conductivity', thickness: 'Thickness' }[reading.kind] ?? '',
        value: `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
      });
    pairs(paper, rest, 312, { labelWidth: 92, mark: '', pitch: 1.5 });
    paper.y = Math.max(bottom, paper.y) + 24;
    table(
      paper,
      {
        heads: ['Part no. / issue', 'Material', 'Lot', 'Accepted / rejected'],
        rows: truth.lines.map((line) => [
          `${line.part_number ?? ''} / ${line.rev ?? ''}`,
          line.material ?? '',
          line.lot ?? '',
          `${line.qty_accepted} / ${line.qty_rejected}`,
        ]),
      },
      [40, 515],
      { rules: 'horizontal' },
    );
    paper.prose(
      truth.conformance_statement
        ? 'Certified that the supplies detailed hereon have been processed and inspected and conform in all respects to the specification and order.'
        : 'Registered in England. All trade subject to our conditions.',
      44,
      500,
    );
    paper.y += 40;
    if (truth.signature_present) paper.sign(100, paper.y - 2, dice.whole(100, 9000));
    paper.text('Signed', 44, paper.y);
    paper.text(`${story.signer}`, 300, paper.y);
    paper.text(`${story.signerTitle}`, 300, paper.y + 13);
    return paper.save();
  },
};

export const SECOND_HELD_OUT_LAYOUTS: readonly Layout[] = [sections, wideTable, blankLines, twoHalves];
