import type { Source } from '../source';

/** What a furnace chart says at one moment: every couple in the metal, in °C. */
export interface SoakReading {
  readonly at: Date;
  readonly metalC: readonly number[];
}

export type SoakRun =
  | {
      readonly ok: true;
      readonly startedAt: Date;
      readonly soakedMin: number;
      readonly hottestC: number;
      readonly source: Source;
    }
  | { readonly ok: false; readonly reason: 'never_reached' | 'interrupted' | 'no_readings' };

/** When the soak begins to count, and that it may not be interrupted. */
const SOAK_CLOCK: Source = {
  document: 'FAA-H-8083-30, heat treatment of nonferrous metals; AMS2770R for interruption',
  confidence: 'read',
  certainty: 'high',
  address: 'http://www.flight-mechanic.com/heat-treatment-of-nonferrous-metals-part-two/',
};

/**
 * How long a load has soaked. The clock starts when the coldest metal reaches the lowest temperature of the range, not
 * when the furnace or the first couple does; metal that falls below it afterwards has interrupted the soak.
 *
 * @param readings in the order of time, the last one when the load leaves the furnace.
 * @param lowC lowest temperature of the solution range, °C.
 * @example soakRun([{at: 9:00, metalC: [490, 470]}, {at: 9:20, metalC: [493, 489]}, {at: 9:50, …}], 488) is 30 min
 */
export function soakRun(readings: readonly SoakReading[], lowC: number): SoakRun {
  const coldest = readings.map(({ metalC }) => Math.min(...metalC));
  const last = readings.at(-1);
  if (!last || readings.some(({ metalC }) => metalC.length === 0))
    return { ok: false, reason: 'no_readings' };
  const begin = coldest.findIndex((temperatureC) => temperatureC >= lowC);
  const started = readings[begin];
  if (!started) return { ok: false, reason: 'never_reached' };
  if (coldest.slice(begin).some((temperatureC) => temperatureC < lowC))
    return { ok: false, reason: 'interrupted' };
  return {
    ok: true,
    startedAt: started.at,
    soakedMin: (last.at.getTime() - started.at.getTime()) / MS_PER_MIN,
    hottestC: Math.max(...readings.flatMap(({ metalC }) => metalC)),
    source: SOAK_CLOCK,
  };
}

const MS_PER_MIN = 60_000;
