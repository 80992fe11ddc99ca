const MIN_PER_HOUR = 60;

/** Hours to minutes: 1.5 h is 90 min. */
export const minFromHours = (hours: number): number => hours * MIN_PER_HOUR;

/** Minutes to hours: 90 min is 1.5 h. */
export const hoursFromMin = (min: number): number => min / MIN_PER_HOUR;
