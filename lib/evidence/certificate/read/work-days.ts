import { daysIn, dayOf } from './dates';
import type { Paper } from './paper';

/** The day for a time of day that stands without one. */
export interface WorkDays {
  /** Of the same row of a table, else the nearest day of work above, else the only one; null where there is none. */
  at(row: string | null, order: number): string | null;
  /** Whether the row has a day for its start and another for its end. */
  hasTwo(row: string | null): boolean;
}

export function workDaysOf(paper: Paper): WorkDays {
  const stated = paper.answers.flatMap((answer) => {
    const isWork =
      answer.key === 'process_date' ||
      answer.key === 'time_in' ||
      (answer.key === 'date' && (answer.row !== null || answer.step !== null || answer.section !== null)) ||
      (answer.key === 'other_date' && answer.row !== null);
    if (!isWork) return [];
    for (const { passage } of answer.values) {
      const [found] = daysIn(passage.text);
      const day = found ? dayOf(found, paper.dayOrder) : null;
      if (day)
        return [
          {
            key: answer.key,
            row: answer.row,
            order: answer.order,
            day,
            general: answer.key === 'process_date',
          },
        ];
    }
    return [];
  });
  return {
    hasTwo: (row) =>
      row !== null && stated.filter((one) => one.row === row && one.key !== 'time_in').length > 1,
    at(row, order) {
      const inRow = stated.filter((one) => row !== null && one.row === row);
      const before = inRow.filter((one) => one.order <= order);
      const nearest = before[before.length - 1] ?? inRow[0];
      if (nearest) return nearest.day;
      const above = stated.filter((one) => one.order <= order && one.row === null);
      const last = above[above.length - 1];
      if (last) return last.day;
      const days = new Set(stated.filter(({ general }) => general).map(({ day }) => day));
      const [only] = days;
      return days.size === 1 && only !== undefined ? only : null;
    },
  };
}

/** ISO 8601 to the minute; null unless both are known. */
export const localMinute = (day: string | null, time: string | null): string | null =>
  day === null || time === null ? null : `${day}T${time}`;
