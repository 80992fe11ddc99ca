import { UnreadableFile } from '../page';

/** What one file may cost. */
export interface Limits {
  readonly bytes: number;
  readonly pages: number;
  /** Of one picture, before it is decoded. */
  readonly pixels: number;
  readonly millisecondsPerPage: number;
  readonly millisecondsPerFile: number;
  /** Stops the reading from outside. */
  readonly signal?: AbortSignal;
}

export const USUAL_LIMITS: Limits = {
  bytes: 50 * 1024 * 1024,
  pages: 60,
  pixels: 60_000_000,
  millisecondsPerPage: 60_000,
  millisecondsPerFile: 600_000,
};

const tookTooLong = () =>
  new UnreadableFile(
    'took_too_long',
    'Reading this file took too long and was stopped. Please look at it yourself.',
  );

/** Waits for `work`, at most `milliseconds` and no longer than the signal allows. */
export async function within<T>(
  milliseconds: number,
  signal: AbortSignal | undefined,
  work: Promise<T>,
): Promise<T> {
  const timeout = AbortSignal.timeout(milliseconds);
  const stop = signal ? AbortSignal.any([timeout, signal]) : timeout;
  // What goes on after nobody waits any more may fail unheard.
  work.catch(() => undefined);
  if (stop.aborted) throw tookTooLong();
  return new Promise<T>((resolve, reject) => {
    const onAbort = () => reject(tookTooLong());
    stop.addEventListener('abort', onAbort, { once: true });
    work.then(resolve, reject).finally(() => stop.removeEventListener('abort', onAbort));
  });
}
