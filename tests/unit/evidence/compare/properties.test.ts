import fc from 'fast-check';
import { expect, test } from 'vitest';

import type { CertificateLine, StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { likeness } from '@/lib/evidence/certificate/match/alike';
import { celsiusFromFahrenheit } from '@/lib/trade/units/temperature';
import { Order } from '@/lib/evidence/order';

import { agreeing, codesOf, compared } from './agreeing-certificate';

/** Part numbers that are not like each other, so that a planted one is like its own line alone. */
const partNumbers = fc
  .uniqueArray(
    fc
      .tuple(fc.integer({ min: 10, max: 99 }), fc.integer({ min: 1000, max: 9999 }))
      .map(([a, b]) => `${a}-${b}`),
    { minLength: 1, maxLength: 5 },
  )
  .filter((numbers) =>
    numbers.every((one, at) => numbers.every((other, to) => at === to || likeness(one, other) === null)),
  );

const TEMPERS = ['T42', 'T62'] as const;

const order = fc
  .record({
    numbers: partNumbers,
    po: fc.integer({ min: 1000, max: 9999 }),
    revs: fc.array(fc.constantFrom('A', 'B', 'C', 'D'), { minLength: 5, maxLength: 5 }),
    lots: fc.array(fc.integer({ min: 1, max: 99 }), { minLength: 5, maxLength: 5 }),
    quantities: fc.array(fc.integer({ min: 1, max: 400 }), { minLength: 5, maxLength: 5 }),
    temper: fc.constantFrom(...TEMPERS),
    set: fc.integer({ min: 900, max: 990 }),
    tolerance: fc.integer({ min: 5, max: 25 }),
    delay: fc.integer({ min: 5, max: 15 }),
    hours: fc.integer({ min: 24, max: 96 }),
    hardness: fc.integer({ min: 50, max: 80 }),
    specRev: fc.constantFrom('M', 'N', 'P', 'R'),
  })
  .map(({ numbers, ...given }) =>
    Order.parse({
      batch: 'B-0001',
      po: `PO-${given.po}`,
      processor: { name: 'Example Thermal' },
      process: 'solution_heat_treat_and_age',
      dispatched: '2026-03-02',
      spec: 'AMS 2770',
      spec_rev: given.specRev,
      class_type: `2024-O to 2024-${given.temper}`,
      requirements: {
        alloy: '2024',
        temper_in: 'O',
        temper_out: given.temper,
        solution: {
          set_f: given.set,
          tolerance_f: given.tolerance,
          soak_min_minutes: 35,
          soak_max_minutes: 50,
        },
        quench: { medium: 'water', max_delay_seconds: given.delay },
        age: { kind: 'natural', min_hours: given.hours },
        hardness: { scale: 'HRB', min: given.hardness, max: null },
        conductivity_pct_iacs: { min: 28.5, max: 32.5 },
      },
      lines: numbers.map((part_number, at) => ({
        line: at + 1,
        part_number,
        rev: given.revs[at],
        qty: given.quantities[at],
        lot: `L${given.lots[at]}`,
        material: '2024-O SHEET',
      })),
    }),
  );

type Plant = (stated: StatedCertificate, order: Order) => Partial<StatedCertificate>;

const onFirst =
  (change: (line: CertificateLine) => Partial<CertificateLine>): Plant =>
  ({ lines: [first, ...rest] }) => ({ lines: first ? [{ ...first, ...change(first) }, ...rest] : [] });
const onStep =
  (step: string, change: object): Plant =>
  ({ cycles }) => ({
    cycles: cycles.map((cycle) => (cycle.step === step ? { ...cycle, ...change } : cycle)),
  });

/** The first two neighbours that differ change places. */
function transpose(number: string): string {
  for (let at = number.length - 2; at > 0; at -= 1) {
    const [a, b] = [number.charAt(at), number.charAt(at + 1)];
    if (a !== b && a !== '-' && b !== '-') return number.slice(0, at) + b + a + number.slice(at + 2);
  }
  return number;
}

const PLANTS: readonly [string, Plant][] = [
  ['wrong_po', ({ purchase_order }) => ({ purchase_order: `${purchase_order}7` })],
  ['part_number_transposed', onFirst(({ part_number }) => ({ part_number: transpose(part_number ?? '') }))],
  ['part_number_missing', ({ lines }) => ({ lines: lines.slice(1) })],
  [
    'part_number_unknown',
    ({ lines }) => ({
      lines: [
        ...lines,
        {
          ...{ part_number: 'ZK-771-X', rev: null, qty_accepted: 401, qty_rejected: 0 },
          ...{ material: null, lot: null },
        },
      ],
    }),
  ],
  ['revision_mismatch', onFirst(() => ({ rev: 'K' }))],
  ['quantity_mismatch', onFirst(({ qty_accepted }) => ({ qty_accepted: (qty_accepted ?? 0) + 2 }))],
  ['quantity_arithmetic', onFirst(() => ({ qty_rejected: 3 }))],
  ['lot_mismatch', onFirst(() => ({ lot: 'M100' }))],
  ['wrong_alloy', onFirst(() => ({ material: '7075-O SHEET' }))],
  ['old_spec_revision', () => ({ specification_revision: 'L' })],
  ['wrong_specification', () => ({ specification: 'AMS 2771' })],
  ['superseded_specification', () => ({ specification: 'MIL-H-6088' })],
  ['impossible_temper', () => ({ condition: 'T3', class_type: null })],
  ['soak_too_short', onStep('solution', { minutes: 34, soak_start: null })],
  ['soak_too_short', onStep('solution', { soak_end: '2026-03-05T09:46' })],
  ['soak_too_long', onStep('solution', { minutes: 51, soak_end: null })],
  ['age_too_short', onStep('natural_age', { minutes: 23 * 60 })],
  ['age_missing', ({ cycles }) => ({ cycles: cycles.slice(0, 1) })],
  ['quench_delay_exceeded', ({ quench_delay_s }) => ({ quench_delay_s: (quench_delay_s ?? 0) + 1 })],
  [
    'temperature_out_of_range',
    ({ cycles }, { requirements: { solution } }) => ({
      cycles: cycles.map((cycle) => {
        if (cycle.step !== 'solution' || !solution) return cycle;
        // Two degrees past the band, so that no rounding excuses it.
        const set_temp = Math.ceil(celsiusFromFahrenheit(solution.set_f + solution.tolerance_f)) + 2;
        return { ...cycle, set_temp, unit: 'C' as const };
      }),
    }),
  ],
  ['hardness_out_of_range', () => ({ readings: [{ kind: 'hardness', unit: 'HRB', values: [84, 49.5] }] })],
  [
    'conductivity_out_of_range',
    () => ({ readings: [{ kind: 'conductivity', unit: 'MS/m', values: [19.1] }] }),
  ],
  ['signature_missing', () => ({ signature_present: false })],
  ['statement_missing', () => ({ conformance_statement: false })],
  ['dated_before_dispatch', () => ({ certificate_date: '2026-03-01' })],
  ['dated_in_future', () => ({ certificate_date: '2026-03-21' })],
];

test('a certificate that agrees with its order has no discrepancy, and meets every requirement', () =>
  fc.assert(
    fc.property(order, (asked) => {
      const { discrepancies, verdicts, matches_batch } = compared(asked);
      expect(discrepancies).toEqual([]);
      expect(verdicts.filter(({ verdict }) => verdict === 'fails')).toEqual([]);
      expect(matches_batch).toBe(asked.batch);
    }),
  ));

test.each(PLANTS)('%s planted in any certificate is found, once and alone', (code, plant) =>
  fc.assert(
    fc.property(order, (asked) => {
      const stated = agreeing(asked);
      const changed = plant(stated, asked);
      fc.pre(JSON.stringify({ ...stated, ...changed }) !== JSON.stringify(stated));
      // A line of an order that has one only: then all of it is missing, which is the same code.
      expect(codesOf(compared(asked, changed))).toEqual([code]);
    }),
    { numRuns: 60 },
  ),
);

test('the order of lines on a certificate changes nothing', () =>
  fc.assert(
    fc.property(order, (asked) => {
      const { lines } = agreeing(asked);
      expect(codesOf(compared(asked, { lines: lines.toReversed() }))).toEqual([]);
    }),
  ));

test('a line split over two certificates is complete when both are there, and short before', () =>
  fc.assert(
    fc.property(order, fc.nat(), (asked, cut) => {
      const stated = agreeing(asked);
      const [first, ...rest] = stated.lines;
      const qty = first?.qty_accepted ?? 0;
      fc.pre(first !== undefined && qty > 1);
      const here = 1 + (cut % (qty - 1));
      const part = { ...stated, lines: [{ ...first, qty_accepted: here }, ...rest] };
      const balance = {
        ...stated,
        certificate_number: 'C-882',
        lines: [{ ...first, qty_accepted: qty - here }],
      };
      const alone = compared(asked, part);
      expect(codesOf(alone)).toEqual(['quantity_mismatch']);
      expect(alone.discrepancies[0]?.message).toContain('balance open');
      expect(codesOf(compared(asked, part, { others: [balance] }))).toEqual([]);
      const seen = [{ ...balance, purchase_order: asked.po.replace('PO-', '') }];
      expect(codesOf(compared(asked, part, { seen }))).toEqual([]);
    }),
  ));
