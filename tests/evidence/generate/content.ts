import { printedUnit } from './as-printed';
import type { Grid, Pair } from './blocks';
import type { Dice } from './dice';
import type { Story } from './story';
import { degrees, figure, lasting, moment, type Hand } from './wording';

/** A story, the way its house writes, and the choices it still leaves. */
export interface Told {
  readonly story: Story;
  readonly hand: Hand;
  readonly dice: Dice;
}

type Said = Readonly<Record<Hand['language'], readonly string[]>>;

const LABELS = {
  number: {
    en: ['Certificate No.', 'Cert. No.', 'Certification Number', 'Report No.', 'C of C #', 'Cert #'],
    de: ['Zeugnis-Nr. / Certificate No.', 'Bescheinigung Nr.'],
    fr: ['Certificat N° / Certificate No.', 'N° de certificat'],
  },
  date: {
    en: ['Date', 'Certificate Date', 'Date Issued', 'Issue Date', 'Date of Cert.'],
    de: ['Datum / Date', 'Ausstellungsdatum'],
    fr: ['Date', "Date d'émission"],
  },
  po: {
    en: [
      'P.O. No.',
      'Purchase Order',
      'Customer PO',
      'Your Order No.',
      'PO Number',
      'Customer Order No.',
      'P.O. #',
    ],
    de: ['Ihre Bestellung / Your order', 'Bestell-Nr.', 'Kundenbestellnummer'],
    fr: ['Votre commande / Your PO', 'Commande N°'],
  },
  batch: { en: ['Batch', 'Batch No.', 'Customer Batch', 'Your Batch No.'], de: ['Batch'], fr: ['Batch'] },
  process: {
    en: ['Process', 'Operation', 'Process Performed', 'Type of Process'],
    de: ['Verfahren / Process'],
    fr: ['Traitement / Process'],
  },
  spec: {
    en: ['Specification', 'Spec.', 'Process Spec', 'Processed per', 'Applicable Specification'],
    de: ['Vorschrift / Specification'],
    fr: ['Norme / Specification'],
  },
  specRev: {
    en: ['Spec Rev', 'Specification Revision', 'Revision of Spec.'],
    de: ['Ausgabe / Spec. rev.'],
    fr: ['Spec. rev.'],
  },
  classType: {
    en: ['Class / Type', 'Class', 'Type/Class', 'Type & Class', 'Grade / Class / Type'],
    de: ['Klasse / Class'],
    fr: ['Classe / Type'],
  },
  condition: {
    en: ['Condition', 'Temper', 'Class / Condition', 'Heat Treat Condition'],
    de: ['Zustand / Condition'],
    fr: ['État / Condition'],
  },
  own: {
    en: ['Our Job No.', 'Work Order', 'Shop Order No.', 'Our Ref.'],
    de: ['Unser Zeichen', 'Auftrags-Nr.'],
    fr: ['Notre référence'],
  },
  received: {
    en: ['Date Received', 'Received', "Date Rec'd"],
    de: ['Wareneingang'],
    fr: ['Date de réception'],
  },
  customer: { en: ['Customer', 'Sold To', 'Client'], de: ['Kunde / Customer'], fr: ['Client'] },
} satisfies Record<string, Said>;

export const labelOf = ({ hand, dice }: Told, name: keyof typeof LABELS): string =>
  dice.pick(LABELS[name][hand.language]);

/** Ways of writing a specification with its revision. */
export function specification({ story: { truth }, dice }: Told): string {
  const { specification: number = '', specification_revision: revision } = truth;
  const spec = number ?? '';
  if (!revision) return spec;
  if (/^ASTM/.test(spec)) return `${spec}-${revision}`;
  const glued = /^AMS \d{4}$/.test(spec) ? [`${spec.replace(' ', '')}${revision}`] : [];
  return dice.pick([
    `${spec} Rev. ${revision}`,
    `${spec} Rev ${revision}`,
    `${spec}, Revision ${revision}`,
    ...glued,
  ]);
}

const PROCESS_WORDS: Readonly<Record<string, readonly string[]>> = {
  solution_heat_treat_and_age: ['Solution heat treat and age', 'Solution Treat & Age'],
  harden_and_temper: ['Harden and temper', 'Harden & Temper'],
  stress_relief: ['Stress relief', 'Stress Relieve'],
  cadmium_plate: ['Cadmium plate', 'Cadmium Plating'],
  zinc_plate: ['Zinc plate', 'Zinc electroplate'],
  anodize: ['Anodize', 'Sulfuric acid anodize'],
  chemical_film: ['Chemical film', 'Chemical conversion coating'],
  passivation: ['Passivate', 'Passivation'],
  fluorescent_penetrant: ['Fluorescent penetrant inspection', 'FPI'],
  magnetic_particle: ['Magnetic particle inspection', 'Magnetic Particle Inspection (MPI)'],
};

/** A class as it stands on paper; what a certificate of ageing calls it is a condition. */
export function classPair(told: Told): Pair[] {
  const { class_type: value } = told.story.truth;
  if (value === null) return [];
  const isChange = / to /.test(value);
  const written = isChange
    ? value
    : told.dice.pick([value, value.replace(/ (?=Class|SC|Level|Method)/g, ', '), value.toUpperCase()]);
  return [{ label: labelOf(told, isChange ? 'condition' : 'classType'), value: written }];
}

/** Fields of the head, without the letterhead. */
export function headPairs(told: Told): Pair[] {
  const { story, hand, dice } = told;
  const { truth } = story;
  const apart = truth.specification_revision !== null && dice.chance(0.2);
  const spec = apart
    ? [
        { label: labelOf(told, 'spec'), value: truth.specification ?? '' },
        { label: labelOf(told, 'specRev'), value: truth.specification_revision ?? '' },
      ]
    : [{ label: labelOf(told, 'spec'), value: specification(told) }];
  const all: Pair[] = [
    { label: labelOf(told, 'number'), value: truth.certificate_number ?? '' },
    { label: labelOf(told, 'date'), value: hand.day(truth.certificate_date ?? '') },
    { label: labelOf(told, 'po'), value: truth.purchase_order ?? '' },
    { label: labelOf(told, 'batch'), value: truth.batch ?? '' },
    { label: labelOf(told, 'own'), value: `J${dice.whole(10000, 99999)}` },
    { label: labelOf(told, 'received'), value: hand.day(story.order.dispatched ?? '2026-01-01') },
    { label: labelOf(told, 'process'), value: dice.pick(PROCESS_WORDS[story.work.process] ?? ['Process']) },
    ...spec,
    ...classPair(told),
  ];
  return dice.chance(0.5) ? all : dice.shuffled(all.slice(0, 6)).concat(all.slice(6));
}

const HEADS = {
  part: { en: ['Part Number', 'Part No.', 'P/N', 'Part #'], de: ['Teile-Nr.'], fr: ['N° de pièce'] },
  rev: { en: ['Rev', 'Rev.', 'Revision'], de: ['Index'], fr: ['Indice'] },
  description: { en: ['Description', 'Nomenclature'], de: ['Bezeichnung'], fr: ['Désignation'] },
  accepted: { en: ['Qty Acc', 'Accepted', 'Qty\nAccepted', 'Acc.'], de: ['Angenommen'], fr: ['Acceptées'] },
  rejected: { en: ['Qty Rej', 'Rejected', 'Qty\nRejected', 'Rej.'], de: ['Ausschuss'], fr: ['Rebutées'] },
  material: { en: ['Material', "Mat'l", 'Material / Condition'], de: ['Werkstoff'], fr: ['Matière'] },
  lot: { en: ['Lot No.', 'Lot', 'Heat/Lot'], de: ['Los-Nr.'], fr: ['N° de lot'] },
} satisfies Record<string, Said>;

export const headOf = ({ hand, dice }: Told, name: keyof typeof HEADS): string =>
  dice.pick(HEADS[name][hand.language]);

/** The lines as a table. */
export function partsGrid(told: Told, withDescription = true): Grid {
  const { story, dice } = told;
  const joined = dice.chance(0.2);
  const columns: { head: string; cell: (line: Story['truth']['lines'][number], index: number) => string }[] =
    [
      {
        head: headOf(told, 'part'),
        cell: (line) =>
          joined ? `${line.part_number ?? ''} Rev ${line.rev ?? ''}` : (line.part_number ?? ''),
      },
      ...(joined
        ? []
        : [{ head: headOf(told, 'rev'), cell: (line: Story['truth']['lines'][number]) => line.rev ?? '' }]),
      ...(withDescription
        ? [
            {
              head: headOf(told, 'description'),
              cell: (_: unknown, index: number) => story.order.lines[index]?.description ?? '',
            },
          ]
        : []),
      { head: headOf(told, 'material'), cell: (line) => line.material ?? '' },
      { head: headOf(told, 'lot'), cell: (line) => line.lot ?? '' },
      { head: headOf(told, 'accepted'), cell: (line) => String(line.qty_accepted ?? '') },
      { head: headOf(told, 'rejected'), cell: (line) => String(line.qty_rejected ?? '') },
    ];
  const numbered = dice.chance(0.3)
    ? [{ head: 'Item', cell: (_: unknown, index: number) => String(index + 1) }]
    : [];
  const used = [...numbered, ...columns];
  return {
    heads: used.map(({ head }) => head),
    rows: story.truth.lines.map((line, index) => used.map(({ cell }) => cell(line, index))),
  };
}

const STEP_WORDS: Readonly<Record<string, Said>> = {
  solution: {
    en: ['Solution heat treat', 'Solution Treat', 'Solution'],
    de: ['Lösungsglühen'],
    fr: ['Mise en solution'],
  },
  natural_age: { en: ['Natural age', 'Natural Aging'], de: ['Kaltauslagern'], fr: ['Maturation'] },
  artificial_age: {
    en: ['Artificial age', 'Precipitation harden', 'Aging'],
    de: ['Warmauslagern'],
    fr: ['Vieillissement'],
  },
  austenitize: {
    en: ['Austenitize', 'Harden'],
    de: ['Austenitisieren / Austenitize'],
    fr: ['Austénitisation'],
  },
  temper: { en: ['Temper', 'Tempering'], de: ['Anlassen'], fr: ['Revenu'] },
  stress_relief: {
    en: ['Stress relief', 'Stress Relieve'],
    de: ['Spannungsarmglühen'],
    fr: ['Détensionnement'],
  },
  embrittlement_relief: {
    en: ['Embrittlement relief', 'Bake', 'Hydrogen embrittlement relief bake'],
    de: ['Entsprödung / Bake'],
    fr: ['Dégazage'],
  },
};

export const stepWord = ({ hand, dice }: Told, step: string): string =>
  dice.pick(STEP_WORDS[step]?.[hand.language] ?? [step]);

/** The cycles as a table. */
export function cyclesGrid(told: Told): Grid {
  const { story, hand, dice } = told;
  const perRow = dice.chance(0.3);
  const heads = {
    en: [
      dice.pick(['Operation', 'Process Step', 'Cycle']),
      dice.pick(['Set Temp', 'Temperature', 'Temp.']),
      dice.pick(['Time In', 'Start', 'Soak Start']),
      dice.pick(['Time Out', 'End', 'Soak End']),
      dice.pick(['Soak Time', 'Time at Temp', 'Duration']),
    ],
    de: ['Arbeitsgang', 'Temperatur', 'Beginn', 'Ende', 'Haltezeit'],
    fr: ['Operation', 'Température', 'Début', 'Fin', 'Durée'],
  }[hand.language];
  const rows = story.truth.cycles.map((cycle) => [
    stepWord(told, cycle.step),
    ...(perRow ? [hand.day(cycle.soak_start?.slice(0, 10) ?? '')] : []),
    cycle.set_temp === null ? dice.pick(['RT', 'Room temp.', 'Ambient']) : degrees(hand, cycle.set_temp),
    perRow ? hand.time(cycle.soak_start?.slice(11) ?? '') : moment(hand, cycle.soak_start ?? ''),
    perRow && cycle.soak_end?.slice(0, 10) === cycle.soak_start?.slice(0, 10)
      ? hand.time(cycle.soak_end?.slice(11) ?? '')
      : moment(hand, cycle.soak_end ?? ''),
    lasting(hand, cycle.minutes ?? 0),
  ]);
  const [first = '', ...rest] = heads;
  return { heads: [first, ...(perRow ? [hand.language === 'de' ? 'Datum' : 'Date'] : []), ...rest], rows };
}

/** The cycles as fields of a form, each with its step before it. */
export function cyclePairs(told: Told): Pair[] {
  const { story, hand } = told;
  return story.truth.cycles.flatMap((cycle) => {
    const step = stepWord(told, cycle.step);
    return [
      ...(cycle.set_temp === null
        ? []
        : [{ label: `${step} temperature`, value: degrees(hand, cycle.set_temp) }]),
      { label: `${step} start`, value: moment(hand, cycle.soak_start ?? '') },
      { label: `${step} end`, value: moment(hand, cycle.soak_end ?? '') },
      { label: `${step} time`, value: lasting(hand, cycle.minutes ?? 0) },
    ];
  });
}

export function furnacePairs({ story, hand, dice }: Told): Pair[] {
  const { truth, work } = story;
  const said = {
    en: ['Quench Medium', 'Quench Delay', 'Plating completed'],
    de: ['Abschreckmittel', 'Abschreckverzug', 'Ende Beschichtung'],
    fr: ['Milieu de trempe', 'Délai de trempe', 'Fin de dépôt'],
  }[hand.language];
  return [
    ...(work.quench ? [{ label: said[0] ?? '', value: work.quench }] : []),
    ...(truth.quench_delay_s === null
      ? []
      : [
          {
            label: said[1] ?? '',
            value:
              hand.language === 'en'
                ? dice.pick([
                    `${truth.quench_delay_s} s`,
                    `${truth.quench_delay_s} sec`,
                    `${truth.quench_delay_s} seconds`,
                  ])
                : `${truth.quench_delay_s} s`,
          },
        ]),
    ...(truth.plating_end === null ? [] : [{ label: said[2] ?? '', value: moment(hand, truth.plating_end) }]),
  ];
}

const READING_WORDS: Readonly<Record<string, Said>> = {
  hardness: { en: ['Hardness', 'Rockwell Hardness'], de: ['Härte'], fr: ['Dureté'] },
  conductivity: {
    en: ['Conductivity', 'Electrical Conductivity'],
    de: ['Leitfähigkeit'],
    fr: ['Conductivité'],
  },
  thickness: {
    en: ['Coating Thickness', 'Thickness', 'Plating Thickness'],
    de: ['Schichtdicke'],
    fr: ['Épaisseur'],
  },
};

const digitsOf = (unit: string | null): number | undefined =>
  ({ HRB: 1, HRC: 1, '%IACS': 1, mil: 2, in: 6, µm: 1 })[unit ?? ''];

export function readingValues({ hand }: Told, { values, unit }: Story['truth']['readings'][number]): string {
  return values.map((value) => figure(hand, value, digitsOf(unit))).join(hand.comma ? '; ' : ', ');
}

export function readingPairs(told: Told): Pair[] {
  return told.story.truth.readings.map((reading) => {
    const unit = printedUnit(reading.unit, told.dice);
    const word = told.dice.pick(READING_WORDS[reading.kind]?.[told.hand.language] ?? [reading.kind]);
    const values = readingValues(told, reading);
    return told.dice.chance(0.4)
      ? { label: `${word} (${unit})`, value: values }
      : { label: word, value: `${values} ${unit}` };
  });
}

/** Readings beside what was required of them. */
export function readingsGrid(told: Told): Grid {
  const { story, dice, hand } = told;
  const { hardness, conductivity_pct_iacs: iacs, thickness } = story.order.requirements;
  const required: Record<string, string> = {
    hardness: `${hardness?.min ?? ''} min`,
    conductivity: `${figure(hand, iacs?.min ?? 0)} - ${figure(hand, iacs?.max ?? 0)}`,
    thickness: `${thickness?.min ?? ''} - ${thickness?.max ?? ''} µin`,
  };
  return {
    heads: [
      dice.pick(['Test', 'Characteristic']),
      dice.pick(['Requirement', 'Required', 'Spec Limits']),
      dice.pick(['Result', 'Actual', 'Results']),
    ],
    rows: story.truth.readings.map((reading) => [
      dice.pick(READING_WORDS[reading.kind]?.en ?? [reading.kind]),
      required[reading.kind] ?? '',
      `${readingValues(told, reading)} ${printedUnit(reading.unit, dice)}`,
    ]),
  };
}

/** The sentence that certifies; where it is left out, a sentence that certifies nothing. */
export function statement({ story, hand, dice }: Told): string {
  if (!story.truth.conformance_statement)
    return dice.pick([
      'This document shall not be reproduced except in full.',
      'Please direct questions to our quality department.',
      'Test records are kept on file for ten years.',
    ]);
  if (hand.language === 'de')
    return 'Hiermit wird bescheinigt, dass die aufgeführten Teile den Anforderungen der Bestellung entsprechen. We certify that the parts listed conform to the order.';
  if (hand.language === 'fr')
    return 'Nous certifions que les pièces ci-dessus sont conformes aux exigences de la commande.';
  return dice.pick([
    'We hereby certify that the parts listed above were processed in accordance with the specification and conform to all requirements of the purchase order.',
    'This is to certify that the material described herein has been processed and inspected and meets the requirements of the applicable specifications.',
    'The undersigned certifies that all items conform to the drawing, specification and order requirements.',
  ]);
}
