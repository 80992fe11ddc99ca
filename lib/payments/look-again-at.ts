const MINUTE = 60_000;
const PAUSES = [2 * MINUTE, 10 * MINUTE, 60 * MINUTE, 6 * 60 * MINUTE];
const DAY = 24 * 60 * MINUTE;

/** When to look at a payment of which nothing was heard: soon, then ever less often. A bank transfer may take days. */
export const lookAgainAt = (now: Date, looks: number): Date =>
  new Date(now.getTime() + (PAUSES[looks] ?? DAY));
