import type { Told } from './content';
import type { Truth } from './story';

/** A specification with its revision as houses write it; an ASTM standard always by its year. */
export function specWritten(
  { specification, specification_revision: revision }: Truth,
  style: 'glued' | 'rev' | 'revision' | 'upper' | 'issue',
): string {
  const spec = specification ?? '';
  if (revision === null) return spec;
  if (/^ASTM/.test(spec)) return `${spec}-${revision}`;
  return {
    // No gap before the number of an AMS, as purchasing systems write it.
    glued: `${spec.replace(/^AMS (?=\d)/, 'AMS')}${revision}`,
    rev: `${spec} Rev ${revision}`,
    revision: `${spec}, Revision ${revision}`,
    upper: `${spec} REV. ${revision}`,
    issue: `${spec} Issue ${revision}`,
  }[style];
}

const half = (clock: string): [number, string, string] => {
  const [h = '0', m = '00'] = clock.split(':');
  const hour = Number(h);
  return [hour % 12 === 0 ? 12 : hour % 12, m, hour < 12 ? 'am' : 'pm'];
};

/** A time of the day, from `HH:MM`. */
export const CLOCKS = {
  plain: (clock: string) => clock,
  military: (clock: string) => clock.replace(':', ''),
  dotted: (clock: string) => clock.replace(':', '.'),
  hours: (clock: string) => `${clock.replace(':', '')}h`,
  lower: (clock: string) => (([h, m, part]) => `${h}:${m} ${part}`)(half(clock)),
  glued: (clock: string) => (([h, m, part]) => `${h}:${m}${part.toUpperCase()}`)(half(clock)),
  points: (clock: string) => (([h, m, part]) => `${h}:${m} ${part.charAt(0)}.m.`)(half(clock)),
} as const;

/** How long, from minutes. */
export const SPANS = {
  /** 95 is `1 h 35 min`. */
  parts: (minutes: number) =>
    [[Math.floor(minutes / 60), 'h'] as const, [minutes % 60, 'min'] as const]
      .filter(([count]) => count > 0)
      .map(([count, unit]) => `${count} ${unit}`)
      .join(' '),
  /** 95 is `1:35`. */
  clock: (minutes: number) => `${Math.floor(minutes / 60)}:${String(minutes % 60).padStart(2, '0')}`,
  /** 95 is `95 MIN`, 480 is `8.0 HRS`. */
  upper: (minutes: number) => (minutes >= 180 ? `${(minutes / 60).toFixed(1)} HRS` : `${minutes} MIN`),
  /** 95 is `95 minutes`, 480 is `8 hours`. */
  words: (minutes: number) => (minutes >= 180 ? `${minutes / 60} hours` : `${minutes} minutes`),
  minutes: (minutes: number) => String(minutes),
} as const;

interface Writing {
  readonly day: (iso: string) => string;
  readonly clock: (clock: string) => string;
  readonly between?: string;
}

/** A day with its time, from `2026-03-05T09:12`. */
export const dayAndTime = (iso: string | null, { day, clock, between = ' ' }: Writing): string =>
  iso === null ? '' : `${day(iso.slice(0, 10))}${between}${clock(iso.slice(11))}`;

/** Pieces received: what came out, good or not. */
export const received = ({ qty_accepted, qty_rejected }: Truth['lines'][number]): number =>
  (qty_accepted ?? 0) + (qty_rejected ?? 0);

/** One piece of the first line was found bad, where there were enough of them, and was said so. */
export function oneRejected(truth: Truth): Truth {
  const [first, ...rest] = truth.lines;
  if (!first?.qty_accepted || first.qty_accepted < 30) return truth;
  return {
    ...truth,
    lines: [{ ...first, qty_accepted: first.qty_accepted - 1, qty_rejected: 1 }, ...rest],
  };
}

/** Changes every line alike. */
export const eachLine = (
  truth: Truth,
  change: (line: Truth['lines'][number]) => Truth['lines'][number],
): Truth => ({ ...truth, lines: truth.lines.map(change) });

/** Changes every cycle alike. */
export const eachCycle = (
  truth: Truth,
  change: (cycle: Truth['cycles'][number]) => Truth['cycles'][number],
): Truth => ({ ...truth, cycles: truth.cycles.map(change) });

/** The tempers that a change begins and ends with. */
export function tempers({ class_type: value }: Truth): { from: string; to: string } | null {
  const [from, to] = (value ?? '').split(' to ');
  return from && to ? { from, to } : null;
}

/** Pieces that were tested of all: a sample size beside what it was taken from. */
export function sampled(truth: Truth, count: number): string {
  const all = truth.lines.reduce((sum, line) => sum + received(line), 0);
  return `${Math.min(count, all)} of ${all}`;
}

/** What the order asks of a reading, with the order's own numbers in the units of the house. */
export function demanded({ story: { order }, hand }: Told, kind: string): string {
  const { hardness, conductivity_pct_iacs: iacs, thickness } = order.requirements;
  if (kind === 'hardness' && hardness)
    return typeof hardness.max === 'number' ? `${hardness.min} - ${hardness.max}` : `${hardness.min} MIN`;
  if (kind === 'conductivity' && iacs) return `${iacs.min} - ${iacs.max}`;
  if (kind !== 'thickness' || !thickness) return '';
  return hand.unit === 'F'
    ? `.000${thickness.min} - .000${thickness.max} IN`
    : `${((thickness.min ?? 0) * 0.0254).toFixed(1)} - ${((thickness.max ?? 0) * 0.0254).toFixed(1)} µm`;
}

const ONES =
  'zero one two three four five six seven eight nine ten eleven twelve thirteen fourteen fifteen sixteen seventeen eighteen nineteen'.split(
    ' ',
  );
const TENS = 'twenty thirty forty fifty sixty seventy eighty ninety'.split(' ');

/** A number below 200 as a lawyer writes it: `forty-one (41)`. */
export function inWords(count: number): string {
  const small = (value: number): string =>
    value < 20
      ? (ONES[value] ?? '')
      : `${TENS[Math.floor(value / 10) - 2] ?? ''}${value % 10 === 0 ? '' : `-${ONES[value % 10] ?? ''}`}`;
  const said = count < 100 ? small(count) : `one hundred${count === 100 ? '' : ` ${small(count - 100)}`}`;
  return `${said} (${count})`;
}
