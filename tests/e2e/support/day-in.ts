/** The calendar day in so many days, as a date field takes it. */
export const dayIn = (days: number): string =>
  new Date(Date.now() + days * 24 * 3600 * 1000).toISOString().slice(0, 10);
