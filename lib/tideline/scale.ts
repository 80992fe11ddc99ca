import { addDays, daysBetween, weekdayOf } from '@/lib/day-words';

/** Pixels of a day, from a season at a glance to a week under the glass. */
export const DAY_WIDTHS = [9, 18, 36] as const;
export type DayWidth = (typeof DAY_WIDTHS)[number];

/** Where the today line stands, as a share of the width. */
const TODAY_AT = 0.58;

export interface Scale {
  dayPx: number;
  widthPx: number;
  firstDay: string;
  lastDay: string;
  today: string;
  /** The today line: the day and the time of it. */
  todayX: number;
}

/**
 * Lays the days over a width.
 *
 * @param dayShare how much of today has passed, 0 to 1.
 */
export function scaleFor({
  widthPx,
  dayPx,
  today,
  dayShare,
}: {
  widthPx: number;
  dayPx: DayWidth;
  today: string;
  dayShare: number;
}): Scale {
  const daysBefore = Math.round((widthPx * TODAY_AT) / dayPx);
  const firstDay = addDays(today, -daysBefore);
  return {
    dayPx,
    widthPx,
    firstDay,
    lastDay: addDays(firstDay, Math.ceil(widthPx / dayPx)),
    today,
    todayX: (daysBefore + dayShare) * dayPx,
  };
}

/** The left edge of a day. */
export const xOf = (scale: Scale, day: string): number => daysBetween(scale.firstDay, day) * scale.dayPx;

/** Each day of the scale, with what its tick and its ground need. */
export function daysOf(scale: Scale): { day: string; x: number; isMonday: boolean; isWeekend: boolean }[] {
  return Array.from({ length: daysBetween(scale.firstDay, scale.lastDay) }, (_, at) => {
    const day = addDays(scale.firstDay, at);
    const weekday = weekdayOf(day);
    return { day, x: at * scale.dayPx, isMonday: weekday === 1, isWeekend: weekday === 0 || weekday === 6 };
  });
}
