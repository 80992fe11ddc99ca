import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import type { Truth } from '../generate/story';

/** What a certificate states once. */
export const SCALARS = [
  'processor',
  'certificate_number',
  'certificate_date',
  'purchase_order',
  'batch',
  'process',
  'specification',
  'specification_revision',
  'class_type',
  'quench_delay_s',
  'plating_end',
  'bake_start',
  'bake_end',
  'signature_present',
  'conformance_statement',
] as const;

export interface Judged {
  /** Without the index: `lines.rev`. */
  readonly field: string;
  /** As a fact names it. */
  readonly path: string;
  readonly truth: string | null;
  readonly read: string | null;
  readonly outcome: 'right' | 'wrong' | 'missed' | 'invented' | 'rightly_null';
}

const plain = (value: unknown): string | null =>
  value === null || value === undefined
    ? null
    : String(value)
        .toLowerCase()
        .replace(/[^\p{L}\p{N}.]/gu, '');

/** Each field of a certificate beside what was written on it. */
export function judge(truth: Truth, read: StatedCertificate): Judged[] {
  const one: One = (field, expected, found, path = field) => {
    const [a, b] = [plain(expected), plain(found)];
    const outcome = outcomeOf(a, b);
    return {
      field,
      path,
      truth: expected === null ? null : String(expected),
      read: b === null ? null : String(found),
      outcome,
    };
  };
  return [
    ...SCALARS.map((field) => one(field, truth[field], read[field])),
    ...linesOf(truth, read, one),
    ...cyclesOf(truth, read, one),
    ...readingsOf(truth, read, one),
  ];
}

function outcomeOf(truth: string | null, read: string | null): Judged['outcome'] {
  if (truth === null) return read === null ? 'rightly_null' : 'invented';
  if (read === null) return 'missed';
  return truth === read ? 'right' : 'wrong';
}

type One = (field: string, expected: unknown, found: unknown, path?: string) => Judged;

function linesOf(truth: Truth, read: StatedCertificate, one: One): Judged[] {
  const left = read.lines.map((line, index) => ({ line, index }));
  const pairs = truth.lines.map((line, place) => {
    const at = left.findIndex((other) => plain(other.line.part_number) === plain(line.part_number));
    const found = at >= 0 ? left.splice(at, 1)[0] : undefined;
    return { line, place, found };
  });
  const FIELDS = ['part_number', 'rev', 'qty_accepted', 'qty_rejected', 'material', 'lot'] as const;
  return [
    ...pairs.flatMap(({ line, found: exact }) => {
      const found = exact ?? left.shift();
      return FIELDS.map((field) =>
        one(
          `lines.${field}`,
          line[field],
          found?.line[field] ?? null,
          `lines[${found?.index ?? -1}].${field}`,
        ),
      );
    }),
    ...left.flatMap(({ line, index }) =>
      FIELDS.map((field) => one(`lines.${field}`, null, line[field], `lines[${index}].${field}`)),
    ),
  ];
}

function cyclesOf(truth: Truth, read: StatedCertificate, one: One): Judged[] {
  const FIELDS = ['set_temp', 'unit', 'soak_start', 'soak_end', 'minutes'] as const;
  const steps = [...new Set([...truth.cycles, ...read.cycles].map(({ step }) => step))];
  return steps.flatMap((step) => {
    const index = read.cycles.findIndex((cycle) => cycle.step === step);
    const [expected, found] = [truth.cycles.find((cycle) => cycle.step === step), read.cycles[index]];
    return FIELDS.map((field) =>
      one(`cycles.${field}`, expected?.[field] ?? null, found?.[field] ?? null, `cycles[${index}].${field}`),
    );
  });
}

function readingsOf(truth: Truth, read: StatedCertificate, one: One): Judged[] {
  const kinds = [...new Set([...truth.readings, ...read.readings].map(({ kind }) => kind))];
  return kinds.flatMap((kind) => {
    const index = read.readings.findIndex((reading) => reading.kind === kind);
    const [expected, found] = [truth.readings.find((reading) => reading.kind === kind), read.readings[index]];
    return [
      one('readings.unit', expected?.unit ?? null, found?.unit ?? null, `readings[${index}].unit`),
      one(
        'readings.values',
        expected?.values.join('; ') ?? null,
        found?.values.join('; ') ?? null,
        `readings[${index}].values`,
      ),
    ];
  });
}
