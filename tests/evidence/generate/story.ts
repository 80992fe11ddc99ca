import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { Order } from '@/lib/evidence/order';
import type { Dice } from './dice';
import { WORKS, type Work } from './works';

/** What is stated on a certificate, as far as it is measured. */
export type Truth = Pick<
  StatedCertificate,
  | 'processor'
  | 'certificate_number'
  | 'certificate_date'
  | 'purchase_order'
  | 'batch'
  | 'process'
  | 'specification'
  | 'specification_revision'
  | 'class_type'
  | 'lines'
  | 'cycles'
  | 'quench_delay_s'
  | 'plating_end'
  | 'bake_start'
  | 'bake_end'
  | 'readings'
  | 'signature_present'
  | 'conformance_statement'
>;

/** A certificate before it is put on paper. */
export interface Story {
  readonly order: Order;
  readonly truth: Truth;
  readonly work: Work;
  readonly customer: string;
  readonly address: readonly string[];
  readonly signer: string;
  readonly signerTitle: string;
  readonly received: string;
  readonly processed: string;
  /** The day that the comparison takes for today. */
  readonly today: string;
}

const FIRMS = [
  'Corran',
  'Belmore',
  'Tarn Valley',
  'Halvard',
  'Pinecrest',
  'Oxbow',
  'Sundial',
  'Northgate',
  'Kestrel Hill',
  'Marlin Bay',
];
const KINDS = {
  thermal: [
    'Heat Treating, Inc.',
    'Thermal Processing LLC',
    'Heat Treat Co.',
    'Thermal',
    'Metallurgical Corp.',
    'Härterei GmbH',
  ],
  finishing: [
    'Plating Works',
    'Metal Finishing, Inc.',
    'Plating & Coatings LLC',
    'Anodizing Co.',
    'Surface Technologies Ltd',
    'Galvanik GmbH',
  ],
  inspection: ['NDT Services, Inc.', 'Inspection Labs LLC', 'Testing Laboratory', 'NDT Ltd'],
} as const;
const CUSTOMERS = [
  'Wren Aircraft Parts',
  'Dunmore Aero LLC',
  'Lowell Rotor Works',
  'Bright River Aviation',
  'Fieldstone Air Inc.',
];
const STREETS = [
  '118 Kiln Road',
  '2240 Foundry Ave',
  '9 Harbour Lane',
  '77 Industrial Park Dr',
  '4501 Mill Street',
];
const TOWNS = [
  'Dayton, OH 45402',
  'Wichita, KS 67202',
  'Leeds LS9 8AB',
  '70565 Stuttgart',
  'Tulsa, OK 74103',
];
const PEOPLE = [
  'R. Marlow',
  'Ines Calder',
  'T. J. Whitfield',
  'Maren Voss',
  'Paul Okafor',
  'Lena Brandt',
  'D. Quinlan',
];
const TITLES = ['Quality Manager', 'QA Inspector', 'Lab Supervisor', 'Quality Engineer', 'Chief Inspector'];

export const addDays = (day: string, days: number): string =>
  new Date(Date.parse(`${day}T00:00:00Z`) + days * 86_400_000).toISOString().slice(0, 10);

/** A certificate that agrees with its order in everything. */
export function tellStory(dice: Dice): Story {
  const work = dice.pick(WORKS)(dice);
  const dispatched = addDays('2026-01-12', dice.whole(0, 160));
  const processed = addDays(dispatched, dice.whole(2, 5));
  const issued = addDays(processed, dice.whole(6, 9));
  const name = `${dice.pick(FIRMS)} ${dice.pick(KINDS[work.trade])}`;
  const lines = linesFor(dice, work);
  const po = dice.pick([
    `PO-${dice.whole(4000, 9900)}`,
    `P${dice.whole(20000, 99000)}`,
    `45${dice.whole(10000, 99999)}`,
    `PO-26-${dice.whole(100, 999)}`,
  ]);
  const batch = `B-${String(dice.whole(1, 899)).padStart(4, '0')}`;
  const order = Order.parse({
    batch,
    po,
    processor: { name, address: [] },
    process: work.process,
    dispatched,
    due: addDays(dispatched, 14),
    spec: work.spec,
    spec_rev: work.revision,
    class_type: work.classType,
    requirements: work.requirements,
    lines: lines.map((line, index) => ({ line: index + 1, ...line })),
  });
  const run = work.run(dice, processed);
  const truth: Truth = {
    processor: name,
    certificate_number: dice.pick([
      `C-${dice.whole(1000, 9999)}`,
      `HT${dice.whole(10000, 99999)}`,
      `26-${dice.whole(1000, 9999)}`,
      `CC${dice.whole(100, 999)}-${dice.whole(10, 99)}`,
      String(dice.whole(100000, 999999)),
    ]),
    certificate_date: issued,
    purchase_order: po,
    batch,
    process: work.process,
    specification: work.spec,
    specification_revision: work.revision,
    class_type: work.classType,
    lines: lines.map(({ part_number, rev, qty, material, lot }) => ({
      part_number,
      rev,
      qty_accepted: qty,
      qty_rejected: 0,
      material,
      lot,
    })),
    signature_present: true,
    conformance_statement: true,
    ...run,
  };
  return {
    order,
    truth,
    work,
    customer: dice.pick(CUSTOMERS),
    address: [dice.pick(STREETS), dice.pick(TOWNS)],
    signer: dice.pick(PEOPLE),
    signerTitle: dice.pick(TITLES),
    received: addDays(issued, 3),
    processed,
    today: addDays(issued, 6),
  };
}

function linesFor(
  dice: Dice,
  work: Work,
): { part_number: string; rev: string; description: string; qty: number; material: string; lot: string }[] {
  const shape = dice.pick([
    () => `${dice.whole(10, 99)}-${dice.whole(100, 999)}`,
    () => `${dice.pick(['WA', 'DX', 'LR', 'KF'])}${dice.whole(1000, 9999)}-${dice.whole(1, 9)}`,
    () => `${dice.whole(100000, 999999)}-${dice.whole(10, 99)}`,
  ]);
  return Array.from({ length: dice.pick([1, 1, 2, 3]) }, () => ({
    part_number: shape(),
    rev: dice.pick(['A', 'B', 'C', 'D', 'E']),
    description: dice.pick(['CLIP', 'BRACKET', 'FITTING', 'DOUBLER', 'PIN', 'ARM']),
    qty: dice.whole(2, 120),
    material: work.material,
    lot: dice.pick([
      `L${dice.whole(10, 999)}`,
      `${dice.whole(10000, 99999)}`,
      `H${dice.whole(100, 999)}-${dice.whole(1, 9)}`,
    ]),
  }));
}
