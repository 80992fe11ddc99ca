/** How a clock that was started stands at a moment. `near_end`: what has to be done is done now. */
export interface TimeLeft {
  readonly state: 'not_begun' | 'running' | 'near_end' | 'over';
  /** Until the end; 0 once it is over. */
  readonly leftMs: number;
  /** Since the end; 0 until it is over. */
  readonly overMs: number;
}

/** How far before the end it warns: a fifth of the time, and never more than a day. No document says so. */
const NEAR_SHARE = 0.2;
const NEAR_MS = 86_400_000;

/**
 * What is left of a time that began, or begins, at one moment and ends at another. No clock is asked.
 *
 * @param begins not after `ends`; @param now the moment it is looked at.
 * @example of 9:00 to 9:15 at 9:13: 2 min, near its end; at 9:20: over since 5 min
 */
export function timeLeft({ begins, ends }: { begins: Date; ends: Date }, now: Date): TimeLeft {
  const leftMs = ends.getTime() - now.getTime();
  if (leftMs <= 0) return { state: 'over', leftMs: 0, overMs: -leftMs };
  if (now < begins) return { state: 'not_begun', leftMs, overMs: 0 };
  const isNear = leftMs <= Math.min(NEAR_SHARE * (ends.getTime() - begins.getTime()), NEAR_MS);
  return { state: isNear ? 'near_end' : 'running', leftMs, overMs: 0 };
}
