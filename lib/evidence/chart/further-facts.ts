import { usualStep } from './gaps';
import type { ChartFacts } from './judged-chart';
import { degreesIn, differenceIn } from './limits';
import type { Recording } from './recording';
import type { ChartRequirement } from './requirement';
import { runsWhere } from './row-runs';
import type { Soak } from './soak';
import { isCounted, type Examined } from './sound-channels';

/** What a chart says beside its verdict. */
export function furtherFacts(
  recording: Recording,
  requirement: ChartRequirement,
  examined: readonly Examined[],
  soak: Soak | null,
): ChartFacts {
  const counted = examined.filter(isCounted);
  const ramps = counted
    .map((one) => rampOf(recording.seconds, one, requirement))
    .filter((ramp) => ramp !== null);
  const spans = soak ? counted.map((one) => spanOf(one, soak, requirement)) : [];
  return {
    sample_interval_s: usualStep(recording.seconds),
    soak_lowest: spans.length > 0 ? tenth(Math.min(...spans.map(([lowest]) => lowest))) : null,
    soak_highest: spans.length > 0 ? tenth(Math.max(...spans.map(([, highest]) => highest))) : null,
    ramp_per_minute: ramps.length > 0 ? tenth(Math.min(...ramps)) : null,
    recovery_minutes: soak ? recoveryOf(recording.seconds, examined, soak) : null,
  };
}

const tenth = (value: number): number => Math.round(value * 10) / 10;

function spanOf(
  { values, channel }: Examined,
  { from, to, ended }: Soak,
  { unit }: ChartRequirement,
): readonly [lowest: number, highest: number] {
  let [lowest, highest] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  for (let row = from; row < (ended ? to : to + 1); row++) {
    const value = values[row] ?? Number.NaN;
    if (!Number.isFinite(value)) continue;
    if (value < lowest) lowest = value;
    if (value > highest) highest = value;
  }
  return [degreesIn(lowest, channel.unit, unit), degreesIn(highest, channel.unit, unit)];
}

/** A run that begins warm shows no ramp. */
const SHORTEST_WAY = 100;

function rampOf(
  seconds: Float64Array,
  { values, channel, limits }: Examined,
  { unit }: ChartRequirement,
): number | null {
  const cold = values.find(Number.isFinite) ?? limits.lower;
  const way = limits.lower - cold;
  if (way < SHORTEST_WAY) return null;
  const start = values.findIndex((value) => value >= cold + way * 0.1 && Number.isFinite(value));
  const end = values.findIndex((value) => value >= cold + way * 0.9 && Number.isFinite(value));
  const time = (seconds[end] ?? 0) - (seconds[start] ?? 0);
  return start < 0 || end <= start || time <= 0
    ? null
    : (differenceIn(way * 0.8, channel.unit, unit) / time) * 60;
}

/** The furnace was hot, fell when the load came in, and came back. */
function recoveryOf(seconds: Float64Array, examined: readonly Examined[], soak: Soak): number | null {
  const control = examined.find(({ channel, excluded }) => channel.role === 'control' && excluded === null);
  if (!control) return null;
  const { values, limits } = control;
  const hot = values.findIndex((value) => value >= limits.lower && Number.isFinite(value));
  if (hot < 0 || hot >= soak.from) return null;
  const falls = runsWhere(soak.from + 1, (row) => row > hot && (values[row] ?? limits.lower) < limits.lower);
  const lengths = falls.map(({ from, to }) => (seconds[to] ?? 0) - (seconds[from] ?? 0));
  return lengths.length > 0 ? tenth(Math.max(...lengths) / 60) : null;
}
