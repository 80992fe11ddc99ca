import { daysBetween, weekdayOf } from '@/lib/day-words';

import type { Tideline, TidelineBatch } from './contract';
import { daysLate } from './lateness';

export interface PhoneGroup {
  name: string;
  batches: TidelineBatch[];
}

/** Time runs down on a phone: what is held or late above the line, then by when it comes back. */
export function phoneGroups(tideline: Tideline): {
  above: { batch: TidelineBatch; late: number }[];
  below: PhoneGroup[];
} {
  const { today } = tideline;
  const late = (batch: TidelineBatch) => daysLate(batch, today, tideline.latenessBasis);
  const above = tideline.batches
    .filter((batch) => batch.stage === 'held' || late(batch) > 0)
    .map((batch) => ({ batch, late: late(batch) }))
    .sort((a, b) => Number(b.batch.stage === 'held') - Number(a.batch.stage === 'held') || b.late - a.late);
  const names = [
    'today',
    'tomorrow',
    'this week',
    'next week',
    'later',
    'no date yet',
    'to leave',
    'back, not in stock',
  ] as const;
  const groups = new Map<string, TidelineBatch[]>(names.map((name) => [name, []]));
  for (const batch of tideline.batches) {
    if (!above.some((one) => one.batch.id === batch.id)) groups.get(groupOf(batch, today))?.push(batch);
  }
  return {
    above,
    below: [...groups]
      .filter(([, batches]) => batches.length > 0)
      .map(([name, batches]) => ({ name, batches: batches.sort(byDay) })),
  };
}

function groupOf(batch: TidelineBatch, today: string): string {
  if (batch.stage === 'building') return 'to leave';
  if (!['dispatched', 'at_processor'].includes(batch.stage)) return 'back, not in stock';
  if (batch.promisedOn === null) return 'no date yet';
  const days = daysBetween(today, batch.promisedOn);
  if (days <= 1) return days <= 0 ? 'today' : 'tomorrow';
  const daysLeftInWeek = 6 - ((weekdayOf(today) + 6) % 7);
  if (days <= daysLeftInWeek) return 'this week';
  return days <= daysLeftInWeek + 7 ? 'next week' : 'later';
}

const byDay = (a: TidelineBatch, b: TidelineBatch): number =>
  (a.promisedOn ?? a.leavesOn ?? '').localeCompare(b.promisedOn ?? b.leavesOn ?? '') ||
  a.number.localeCompare(b.number);
