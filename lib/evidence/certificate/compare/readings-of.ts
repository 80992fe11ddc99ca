import type { Reading } from '../certificate';
import type { Compared } from './compared';

/** How many times its neighbours a whole number must be, so that it is one of them without its decimal point. */
const WITHOUT_POINT = 5;

/**
 * Readings of a kind that have values. Where they were recognised, a whole number among numbers with decimals that are
 * about a tenth of it lost its point: it is left out, because it says nothing.
 *
 * @example 33.9, 325 recognised on a scan is 33.9
 */
export const readingsOf = ({ stated, isRecognised }: Compared, kind: RegExp): Reading[] =>
  stated.readings
    .filter((reading) => kind.test(reading.kind) && reading.values.length > 0)
    .map((reading) => (isRecognised ? { ...reading, values: withPoints(reading.values) } : reading));

function withPoints(values: readonly number[]): number[] {
  const pointed = values.filter((value) => !Number.isInteger(value));
  const least = Math.min(...pointed);
  return values.filter((value) => !Number.isInteger(value) || value < WITHOUT_POINT * least);
}
