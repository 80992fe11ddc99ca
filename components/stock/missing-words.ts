import type { GateLine } from '@/lib/stock/contract';

interface MissingWords {
  reason: GateLine['missing'][number]['reason'];
  level: 'stop' | 'warn' | 'note';
  sentence: string;
  rest: string;
  /** Where something can be done about it. */
  waysOut: { says: string; href: string }[];
}

/** Why pieces of a line may not pass, each reason once, worst first. */
export function missingWords(
  line: Pick<GateLine, 'missing' | 'unpaid' | 'holds'>,
  { batchId, processor }: { batchId: string; processor: string },
): MissingWords[] {
  // That nothing is back says all that "still away" would.
  const reasons = line.missing.some((one) => one.reason === 'nothing_back')
    ? line.missing.filter((one) => one.reason !== 'still_away')
    : line.missing;
  const batch = `/batches/${batchId}`;
  const words: Record<MissingWords['reason'], (pieces: number) => Omit<MissingWords, 'reason'>> = {
    on_hold: (pieces) => ({
      level: 'stop',
      sentence: `${pieces} ${are(pieces)} on hold.`,
      rest: `A person decides about ${them(pieces)} first.`,
      waysOut: line.holds.map(({ id, number }) => ({
        says: `Decide on ${number}`,
        href: `/nonconformances/${id}`,
      })),
    }),
    not_paid: (pieces) => ({
      level: 'stop',
      sentence: `${pieces} ${are(pieces)} not paid for.`,
      rest: `${listWords(line.unpaid.map((one) => one.number))} must be paid first, or its payment waived with a reason.`,
      waysOut: line.unpaid.map(({ id, number }) => ({
        says: `Open ${number}`,
        href: `/batches/${id}#invoices`,
      })),
    }),
    not_proved: (pieces) => ({
      level: 'warn',
      sentence: `${pieces} ${are(pieces)} not proved.`,
      rest: `No signed certificate speaks for ${them(pieces)}.`,
      waysOut: [{ says: 'To the certificates', href: `${batch}#certificates` }],
    }),
    still_away: (pieces) => ({
      level: 'note',
      sentence: `${pieces} ${are(pieces)} still away.`,
      rest: `${pieces === 1 ? 'It is' : 'They are'} with ${processor} or on the way.`,
      waysOut: [{ says: 'Count in', href: `${batch}/receive` }],
    }),
    nothing_back: () => ({
      level: 'note',
      sentence: 'Nothing of it is back.',
      rest: `It is with ${processor} or on the way.`,
      waysOut: [{ says: 'Count in', href: `${batch}/receive` }],
    }),
  };
  return reasons
    .map(({ reason, pieces }) => ({ reason, ...words[reason](pieces) }))
    .sort((a, b) => LEVELS.indexOf(a.level) - LEVELS.indexOf(b.level));
}

const LEVELS = ['stop', 'warn', 'note'] as const;
const are = (pieces: number) => (pieces === 1 ? 'is' : 'are');
const them = (pieces: number) => (pieces === 1 ? 'it' : 'them');

/** `B-0404`, `B-0404 and B-0401`, `B-0404, B-0401 and B-0399` */
export function listWords(words: readonly string[]): string {
  return words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;
}
