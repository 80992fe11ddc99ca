import { dayWords, momentWords } from '@/lib/day-words';
import { PROCESS_WORDS } from '@/lib/trade/process';
import type { PaperContent } from '@/lib/travellers/content';

// Paper outlives its year, so it always names it: seen from here no day is of this year.
const ALWAYS_WITH_YEAR = new Date(0);

/** `Thu 30 Apr 2026` */
export const paperDay = (day: string | Date, zone: string): string =>
  dayWords(day, { zone, now: ALWAYS_WITH_YEAR });

/** `Fri 17 Apr 2026 07:12` */
export const paperMoment = (iso: string, zone: string): string =>
  momentWords(new Date(iso), { zone, now: ALWAYS_WITH_YEAR });

/** `solution, quench and age to T42`; without a condition where the lines end in several. */
export function workAsked({
  process,
  lines,
}: Pick<PaperContent, 'process'> & { lines: readonly { targetCondition: string | null }[] }): string {
  const [only, ...others] = [...new Set(lines.map((line) => line.targetCondition))];
  return only && others.length === 0 ? `${PROCESS_WORDS[process]} to ${only}` : PROCESS_WORDS[process];
}

/** `O to T42` */
export function conditionWords({
  conditionBefore,
  targetCondition,
}: {
  conditionBefore: string | null;
  targetCondition: string | null;
}): string {
  if (conditionBefore && targetCondition) return `${conditionBefore} to ${targetCondition}`;
  return targetCondition ?? conditionBefore ?? '';
}

/** `41 pieces`, `1 line` */
export const counted = (count: number, one: string, many = `${one}s`): string =>
  `${count.toLocaleString('en-US')} ${count === 1 ? one : many}`;
