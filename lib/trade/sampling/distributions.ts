import type { Source } from '../source';

/** Nothing is looked up: the figure follows from counting the possible samples. */
export const COUNTED: Source = {
  document: 'Hypergeometric distribution, computed',
  confidence: 'computed',
  certainty: 'high',
};

/** For a stream of pieces rather than one lot: every piece has the same chance. */
export const INDEPENDENT: Source = {
  document: 'Binomial distribution, computed',
  confidence: 'computed',
  certainty: 'high',
};

/**
 * The chance of at most `found` nonconforming pieces in a sample drawn from one lot without putting back.
 *
 * @param lotSize pieces in the lot; `nonconforming` and `sampleSize` are whole numbers from 0 to `lotSize`.
 * @returns a probability from 0 to 1; not a number where the counts contradict each other.
 * @example 15 pieces, 2 of them bad, 10 drawn: no bad one with a chance of 0.0952.
 */
export function hypergeometricAtMost(
  { lotSize, nonconforming, sampleSize }: { lotSize: number; nonconforming: number; sampleSize: number },
  found: number,
): number {
  const whole = [lotSize, nonconforming, sampleSize].every(
    (count) => Number.isSafeInteger(count) && count >= 0,
  );
  if (!whole || nonconforming > lotSize || sampleSize > lotSize) return NaN;
  const good = lotSize - nonconforming;
  const most = Math.min(Math.floor(found), nonconforming, sampleSize);
  const all = logChoose(lotSize, sampleSize);
  let probability = 0;
  for (let bad = Math.max(0, sampleSize - good); bad <= most; bad++)
    probability += Math.exp(logChoose(nonconforming, bad) + logChoose(good, sampleSize - bad) - all);
  return Math.min(1, probability);
}

/**
 * The chance of at most `found` nonconforming pieces in a sample from a steady stream.
 *
 * @param fraction nonconforming fraction of the stream, 0 to 1.
 * @returns a probability from 0 to 1; not a number outside those ranges.
 * @example 20 pieces from a stream with 0.65 % bad: none with a chance of 0.8777.
 */
export function binomialAtMost(sampleSize: number, fraction: number, found: number): number {
  if (!Number.isSafeInteger(sampleSize) || sampleSize < 0 || !(fraction >= 0 && fraction <= 1)) return NaN;
  if (found >= sampleSize) return 1;
  if (fraction === 0) return found >= 0 ? 1 : 0;
  if (fraction === 1) return 0;
  let probability = 0;
  for (let bad = 0; bad <= Math.floor(found); bad++)
    probability += Math.exp(
      logChoose(sampleSize, bad) + bad * Math.log(fraction) + (sampleSize - bad) * Math.log1p(-fraction),
    );
  return Math.min(1, probability);
}

/** Sums of logarithms, because the numbers of possible samples are larger than any machine number. */
function logChoose(from: number, taken: number): number {
  const few = Math.min(taken, from - taken);
  let sum = 0;
  for (let one = 1; one <= few; one++) sum += Math.log((from - few + one) / one);
  return sum;
}
