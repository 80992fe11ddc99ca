import { flatLines } from './flat-lines';
import type { Exclusion } from './judged-chart';
import { limitsIn, type Limits } from './limits';
import { markOpenCircuits, openRuns } from './open-circuits';
import type { Channel, Recording } from './recording';
import type { ChartRequirement } from './requirement';
import { joined, type Run } from './row-runs';
import { bandOverTime, type Soak } from './soak';
import { spikesOf } from './spikes';

/** A thermocouple with what is wrong with it. */
export interface Examined {
  readonly channel: Channel;
  readonly limits: Limits;
  /** Without the readings that stand alone. */
  readonly values: Float64Array;
  readonly open: readonly Run[];
  readonly flat: readonly Run[];
  readonly spikes: readonly number[];
  /** Whether its role is one that is counted. */
  readonly isCandidate: boolean;
  readonly excluded: Exclusion | null;
}

/** A thermocouple that misses a row or two is not broken. */
const BROKEN_ROWS = 3;

/**
 * Looks at every thermocouple and decides which are counted: those in the load, or where the chart has none those of the
 * control; without the broken ones. One that broke only behind the soak, as in the quench, still proves the soak.
 */
export function examinedChannels(recording: Recording, requirement: ChartRequirement): readonly Examined[] {
  const thermocouples = recording.channels.filter(({ role }) => role === 'load' || role === 'control');
  const hasLoad = thermocouples.some(({ role }) => role === 'load');
  const limited = thermocouples.map((channel) => ({
    channel,
    limits: limitsIn(requirement, channel.unit, channel.step),
  }));
  for (const { channel, limits } of limited) markOpenCircuits(channel.values, limits);
  const examined = limited.map((one) => {
    const { channel, limits } = one;
    const spikes = spikesOf(recording.seconds, channel.values, limits);
    const isCandidate = !hasLoad || channel.role === 'load';
    return { ...one, spikes, values: without(channel.values, spikes), isCandidate };
  });
  const withFaults = examined.map((one) => {
    const { channel, isCandidate } = one;
    const others = examined
      .filter((other) => other !== one && other.isCandidate === isCandidate && hasReadings(other.values))
      .map(({ values }) => values);
    return {
      ...one,
      open: joined(openRuns(channel.values), BROKEN_ROWS),
      flat: flatLines(recording.seconds, channel.values, channel.step, others),
    };
  });
  return excludedOnes(withFaults, recording.seconds.length);
}

function excludedOnes(all: readonly Omit<Examined, 'excluded'>[], rows: number): readonly Examined[] {
  const first = all.map((one) => ({ ...one, excluded: exclusionOf(one, null) }));
  const { soak } = bandOverTime(rows, first.filter(isCounted));
  return all.map((one) => {
    // Behind the soak everything may stand still.
    const flat = soak ? one.flat.filter(({ from }) => from < soak.to) : one.flat;
    return { ...one, flat, excluded: exclusionOf({ ...one, flat }, soak) };
  });
}

function exclusionOf(one: Omit<Examined, 'excluded'>, soak: Soak | null): Exclusion | null {
  const { channel, open, flat, values } = one;
  if (channel.excludedByHand !== null) return channel.excludedByHand ? 'by_hand' : null;
  const matters = ({ from }: Run) => soak === null || from < soak.to;
  if (open.some((run) => run.to - run.from >= BROKEN_ROWS && matters(run))) return 'open_circuit';
  if (flat.some(matters)) return 'flat_line';
  return hasReadings(values) ? null : 'no_readings';
}

export const isCounted = ({ isCandidate, excluded }: Pick<Examined, 'isCandidate' | 'excluded'>): boolean =>
  isCandidate && excluded === null;

const hasReadings = (values: Float64Array): boolean => values.some(Number.isFinite);

function without(values: Float64Array, spikes: readonly number[]): Float64Array {
  if (spikes.length === 0) return values;
  const cleaned = values.slice();
  for (const row of spikes) cleaned[row] = Number.NaN;
  return cleaned;
}
