import { Order } from '@/lib/evidence/order';
import type { Cycle, StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { compare, type ComparisonInput } from '@/lib/evidence/certificate/compare/compare';
import type { OpenedFile } from '@/lib/evidence/page';

export const TODAY = '2026-03-20';

export const FILE: OpenedFile = {
  sha256: 'a'.repeat(64),
  kind: 'digital',
  recognised: false,
  pages: [],
};

export const heatTreat = (changes: Partial<Order> = {}): Order =>
  Order.parse({
    batch: 'B-0001',
    po: 'PO-5001',
    processor: { name: 'Example Thermal', address: ['1 Kiln Road'] },
    process: 'solution_heat_treat_and_age',
    dispatched: '2026-03-02',
    due: '2026-03-16',
    spec: 'AMS 2770',
    spec_rev: 'R',
    class_type: '2024-O to 2024-T42',
    requirements: {
      alloy: '2024',
      temper_in: 'O',
      temper_out: 'T42',
      solution: { set_f: 920, tolerance_f: 10, soak_min_minutes: 30, soak_max_minutes: 60 },
      quench: { medium: 'water', max_medium_temp_f: 110, max_delay_seconds: 10 },
      age: { kind: 'natural', min_hours: 96 },
      hardness: { scale: 'HRB', min: 63, max: null },
      conductivity_pct_iacs: { min: 28.5, max: 32.5 },
    },
    lines: [
      { line: 1, part_number: '10-200', rev: 'A', qty: 12, material: '2024-O SHEET 0.040', lot: 'L1' },
      { line: 2, part_number: '10-311', rev: 'C', qty: 8, material: '2024-O SHEET 0.063', lot: 'L7' },
    ],
    ...changes,
  });

export const plating = (changes: Partial<Order> = {}): Order =>
  Order.parse({
    batch: 'B-0002',
    po: 'PO-5002',
    processor: { name: 'Example Plating' },
    process: 'cadmium_plate',
    dispatched: '2026-03-02',
    spec: 'AMS-QQ-P-416',
    spec_rev: 'F',
    class_type: 'Type II, Class 2',
    requirements: {
      alloy: '4130',
      thickness: { unit: 'microinch', min: 300, max: 500 },
      bake: { set_f: 375, tolerance_f: 25, min_hours: 23, max_hours_after_plating: 4 },
    },
    lines: [{ line: 1, part_number: '20-777', rev: 'B', qty: 40, material: '4130 STEEL', lot: 'H12' }],
    ...changes,
  });

export const penetrant = (changes: Partial<Order> = {}): Order =>
  Order.parse({
    batch: 'B-0003',
    po: 'PO-5003',
    processor: { name: 'Example Inspection' },
    process: 'fluorescent_penetrant',
    dispatched: '2026-03-02',
    spec: 'ASTM E1417',
    spec_rev: '21',
    class_type: 'Type I, Method A, Level 2',
    requirements: {},
    lines: [{ line: 1, part_number: '30-415', rev: null, qty: 5, lot: 'L9' }],
    ...changes,
  });

const cycle = (step: string, given: Partial<Cycle>): Cycle => ({
  step,
  set_temp: null,
  unit: null,
  soak_start: null,
  soak_end: null,
  minutes: null,
  ...given,
});

/** A certificate that agrees with an order in everything that the order asks. */
export function agreeing(order: Order): StatedCertificate {
  const { requirements: asked } = order;
  return {
    processor: order.processor.name,
    certificate_number: 'C-881',
    certificate_date: '2026-03-12',
    purchase_order: order.po,
    batch: order.batch,
    process: order.process,
    specification: order.spec ?? null,
    specification_revision: order.spec_rev ?? null,
    class_type: order.class_type ?? null,
    alloy: asked.alloy ?? null,
    condition: asked.temper_out ?? null,
    lines: order.lines.map((line) => ({
      part_number: line.part_number,
      rev: line.rev ?? null,
      qty_accepted: line.qty,
      qty_rejected: 0,
      material: line.material ?? null,
      lot: line.lot ?? null,
    })),
    cycles: [
      ...(asked.solution
        ? [
            cycle('solution', {
              set_temp: asked.solution.set_f,
              unit: 'F' as const,
              soak_start: '2026-03-05T09:12',
              soak_end: '2026-03-05T09:50',
              minutes: 38,
            }),
          ]
        : []),
      ...(asked.age ? [cycle(`${asked.age.kind}_age`, { minutes: (asked.age.min_hours ?? 0) * 60 })] : []),
      ...(asked.bake
        ? [cycle('embrittlement_relief', { set_temp: asked.bake.set_f ?? null, unit: 'F' as const })]
        : []),
    ],
    quench_medium: asked.quench?.medium ?? null,
    quench_delay_s: asked.quench?.max_delay_seconds ?? null,
    plating_end: asked.bake ? '2026-03-06T14:10' : null,
    bake_start: asked.bake ? '2026-03-06T16:00' : null,
    bake_end: asked.bake ? '2026-03-07T15:30' : null,
    readings: [
      ...(asked.hardness
        ? [{ kind: 'hardness', unit: asked.hardness.scale, values: [asked.hardness.min ?? 0] }]
        : []),
      ...(asked.conductivity_pct_iacs
        ? [{ kind: 'conductivity', unit: '% IACS', values: [asked.conductivity_pct_iacs.max ?? 0] }]
        : []),
      ...(asked.thickness
        ? [{ kind: 'thickness', unit: asked.thickness.unit, values: [asked.thickness.min ?? 0] }]
        : []),
    ],
    ndt: null,
    sample_size: null,
    furnace: null,
    load: null,
    signature_present: true,
    signed_by: 'R. Marlow',
    signer_title: 'Quality',
    conformance_statement: true,
    facts: [],
  };
}

export const compared = (
  order: Order | null,
  changes: Partial<StatedCertificate> = {},
  input: Partial<ComparisonInput> = {},
) => {
  const of = order ?? heatTreat();
  return compare({ stated: { ...agreeing(of), ...changes }, file: FILE, order, today: TODAY, ...input });
};

export const codesOf = ({ discrepancies }: ReturnType<typeof compare>): string[] =>
  discrepancies.map(({ code }) => code);
