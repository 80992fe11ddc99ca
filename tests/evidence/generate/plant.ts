import type { CertificateLine, Cycle } from '@/lib/evidence/certificate/certificate';
import type { Dice } from './dice';
import { addDays, type Story, type Truth } from './story';
import { minutesAfter } from './works';

type Plant = (story: Story, dice: Dice) => Truth | null;

const withLine = (truth: Truth, change: (line: CertificateLine) => CertificateLine): Truth => {
  const [first, ...rest] = truth.lines;
  return first ? { ...truth, lines: [change(first), ...rest] } : truth;
};

function withCycle(truth: Truth, step: RegExp, change: (cycle: Cycle) => Cycle): Truth | null {
  if (!truth.cycles.some((cycle) => step.test(cycle.step))) return null;
  return { ...truth, cycles: truth.cycles.map((cycle) => (step.test(cycle.step) ? change(cycle) : cycle)) };
}

const lasting = (cycle: Cycle, minutes: number): Cycle => ({
  ...cycle,
  minutes,
  soak_end: cycle.soak_start === null ? null : minutesAfter(cycle.soak_start, minutes),
});

function withReading(truth: Truth, kind: string, change: (value: number) => number): Truth | null {
  if (!truth.readings.some((reading) => reading.kind === kind)) return null;
  return {
    ...truth,
    readings: truth.readings.map((reading) =>
      reading.kind === kind
        ? { ...reading, values: reading.values.map((value, index) => (index === 0 ? change(value) : value)) }
        : reading,
    ),
  };
}

function transposed(part: string): string {
  for (let at = part.length - 2; at > 0; at -= 1) {
    const [a = '', b = ''] = [part.charAt(at), part.charAt(at + 1)];
    if (/\d\d/.test(a + b) && a !== b) return part.slice(0, at) + b + a + part.slice(at + 2);
  }
  return part;
}

/** One planted discrepancy each; null where the process has nothing for it. */
const PLANTS: Readonly<Record<string, Plant>> = {
  wrong_po: ({ truth }) => ({
    ...truth,
    purchase_order: (truth.purchase_order ?? '')
      .replace(/\d(?=\D*$)/, (digit) => String((Number(digit) + 5) % 10))
      .replace(/\d/, '7'),
  }),
  part_number_transposed: ({ truth }) => {
    const changed = withLine(truth, (line) => ({ ...line, part_number: transposed(line.part_number ?? '') }));
    return changed.lines[0]?.part_number === truth.lines[0]?.part_number ? null : changed;
  },
  part_number_missing: ({ truth }) =>
    truth.lines.length > 1 ? { ...truth, lines: truth.lines.slice(1) } : null,
  revision_mismatch: ({ truth }) =>
    withLine(truth, (line) => ({ ...line, rev: line.rev === 'B' ? 'D' : 'B' })),
  quantity_mismatch: ({ truth }) =>
    withLine(truth, (line) => ({ ...line, qty_accepted: (line.qty_accepted ?? 0) + 1 })),
  old_spec_revision: ({ truth }) =>
    /^[B-Z]$/.test(truth.specification_revision ?? '')
      ? {
          ...truth,
          specification_revision: String.fromCharCode(
            (truth.specification_revision ?? 'B').charCodeAt(0) - 1,
          ),
        }
      : null,
  lot_mismatch: ({ truth }) => withLine(truth, (line) => ({ ...line, lot: `X${line.lot ?? ''}7` })),
  wrong_class_type: ({ truth }) =>
    /Class [12]$/.test(truth.class_type ?? '')
      ? {
          ...truth,
          class_type: (truth.class_type ?? '').replace(
            /Class ([12])$/,
            (_, cls: string) => `Class ${cls === '1' ? '2' : '1'}`,
          ),
        }
      : null,
  soak_too_short: ({ truth }) => withCycle(truth, /^solution$/, (cycle) => lasting(cycle, 24)),
  temperature_out_of_range: ({ truth }) =>
    withCycle(truth, /^solution$/, (cycle) => ({ ...cycle, set_temp: (cycle.set_temp ?? 0) - 20 })),
  quench_delay_exceeded: ({ truth }) =>
    truth.quench_delay_s === null ? null : { ...truth, quench_delay_s: 14 },
  age_too_short: ({ truth }) =>
    withCycle(truth, /_age$/, (cycle) => lasting(cycle, (cycle.minutes ?? 0) / 2)),
  hardness_out_of_range: ({ truth, order }) =>
    order.requirements.hardness
      ? withReading(truth, 'hardness', () => (order.requirements.hardness?.min ?? 20) - 6)
      : null,
  conductivity_out_of_range: ({ truth, order }) =>
    order.requirements.conductivity_pct_iacs
      ? withReading(truth, 'conductivity', () => (order.requirements.conductivity_pct_iacs?.min ?? 20) - 3)
      : null,
  thickness_out_of_range: ({ truth, order }) =>
    order.requirements.thickness ? withReading(truth, 'thickness', () => 210) : null,
  bake_started_late: ({ truth }) => {
    if (!truth.plating_end) return null;
    const late = minutesAfter(truth.plating_end, 6 * 60 + 12);
    const changed = withCycle(truth, /embrittlement/, (cycle) =>
      lasting({ ...cycle, soak_start: late }, cycle.minutes ?? 0),
    );
    return changed && { ...changed, bake_start: late, bake_end: changed.cycles[0]?.soak_end ?? null };
  },
  bake_too_short: ({ truth }) => {
    const changed = withCycle(truth, /embrittlement/, (cycle) => lasting(cycle, 8 * 60));
    return changed && { ...changed, bake_end: changed.cycles[0]?.soak_end ?? null };
  },
  signature_missing: ({ truth }) => ({ ...truth, signature_present: false }),
  statement_missing: ({ truth }) => ({ ...truth, conformance_statement: false }),
  dated_before_dispatch: ({ truth, order }) =>
    truth.cycles.length === 0
      ? { ...truth, certificate_date: addDays(order.dispatched ?? '2026-01-01', -6) }
      : null,
  dated_in_future: ({ truth, today }) => ({ ...truth, certificate_date: addDays(today, 40) }),
};

/**
 * Plants up to so many discrepancies, no two on the same field, and none that the house would not print.
 *
 * @returns the story as its certificate then states it, with the codes in `planted`.
 */
export function plantIn(
  story: Story,
  dice: Dice,
  {
    count,
    states = (truth) => truth,
  }: { readonly count: number; readonly states?: ((truth: Truth) => Truth) | undefined },
): { story: Story; planted: string[] } {
  const shown = (truth: Truth): string => JSON.stringify(states(truth));
  let current = story;
  const planted: string[] = [];
  const alone = new Set([
    'part_number_transposed',
    'part_number_missing',
    'revision_mismatch',
    'quantity_mismatch',
    'lot_mismatch',
    'wrong_po',
  ]);
  for (const code of dice.shuffled(Object.keys(PLANTS))) {
    if (planted.length >= count) break;
    // One discrepancy of lines and orders a certificate: two may well be one cause.
    if (alone.has(code) && planted.some((one) => alone.has(one))) continue;
    if (planted.includes('bake_started_late') && code === 'bake_too_short') continue;
    if (planted.includes('bake_too_short') && code === 'bake_started_late') continue;
    if (/^dated/.test(code) && planted.some((one) => /^dated/.test(one))) continue;
    const truth = PLANTS[code]?.(current, dice) ?? null;
    if (truth === null || shown(truth) === shown(current.truth)) continue;
    current = { ...current, truth };
    planted.push(code);
  }
  return { story: current, planted };
}
