import autocannon from 'autocannon';

const CONNECTIONS = 10;
const WARM_UP_S = 8;
const MEASURED_S = 10;
/** At a steady rate a slow answer is a slow answer, and no failed one. */
const SLOWEST_S = 60;

export interface Measured {
  name: string;
  p50: number;
  p95: number;
  p99: number;
  perSecond: number;
}

/** Loads one address with ten connections: a warm-up that is thrown away, then ten seconds that count. */
export async function measure(
  name: string,
  url: string,
  headers: Record<string, string> = {},
): Promise<Measured> {
  await load(url, headers, WARM_UP_S);
  const times = await load(url, headers, MEASURED_S);
  return { name, ...percentiles(times), perSecond: Math.round(times.length / MEASURED_S) };
}

/** Times of single calls, one after the other, for what cannot be repeated with the same input. */
export async function measureEach(name: string, calls: readonly (() => Promise<void>)[]): Promise<Measured> {
  const times: number[] = [];
  const began = performance.now();
  for (const call of calls) {
    const at = performance.now();
    await call();
    times.push(performance.now() - at);
  }
  return {
    name,
    ...percentiles(times),
    perSecond: Math.round((1000 * times.length) / (performance.now() - began)),
  };
}

/**
 * Times in ms of the calls at a steady rate, as a shop's screens make them, for as long as `goesOn` says so.
 *
 * @param perSecond calls a second, all connections together.
 * @param rounds the most rounds of ten seconds each.
 */
export async function measureWhile(
  name: string,
  {
    url,
    headers,
    perSecond,
    rounds,
  }: { url: string; headers: Record<string, string>; perSecond: number; rounds: number },
  goesOn: () => Promise<boolean>,
): Promise<Measured> {
  const times: number[] = [];
  let seconds = 0;
  do {
    times.push(...(await load(url, headers, MEASURED_S, perSecond)));
    seconds += MEASURED_S;
  } while (seconds < rounds * MEASURED_S && (await goesOn()));
  return { name, ...percentiles(times), perSecond: Math.round(times.length / seconds) };
}

function load(
  url: string,
  headers: Record<string, string>,
  duration: number,
  perSecond?: number,
): Promise<number[]> {
  return new Promise((resolve, reject) => {
    const times: number[] = [];
    const run = autocannon(
      {
        url,
        headers,
        connections: CONNECTIONS,
        duration,
        ...(perSecond && { overallRate: perSecond, timeout: SLOWEST_S }),
      },
      (error, result) => {
        if (error) reject(error instanceof Error ? error : new Error(String(error)));
        else if (result.non2xx > 0 || result.errors > 0)
          reject(new Error(`${url}: ${result.non2xx} refused, ${result.errors} failed`));
        else resolve(times);
      },
    );
    run.on('response', (_client, _status, _bytes, ms) => times.push(ms));
  });
}

function percentiles(times: readonly number[]): { p50: number; p95: number; p99: number } {
  const sorted = [...times].sort((a, b) => a - b);
  const at = (share: number) =>
    Math.round(10 * (sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? 0)) / 10;
  return { p50: at(0.5), p95: at(0.95), p99: at(0.99) };
}
