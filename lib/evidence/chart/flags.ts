import { usualStep } from './gaps';
import type { ChartFlag } from './judged-chart';
import { degreesIn } from './limits';
import { durationWords, momentOf, timeWordsAt } from './moments';
import type { Recording } from './recording';
import type { ChartRequirement } from './requirement';
import { joined, runsWhere, type Run } from './row-runs';
import { firstInBand, type Soak } from './soak';
import { isCounted, type Examined } from './sound-channels';

/** Of one kind and channel; the rest is summed up in the last. */
const MOST = 12;
/** Excursions with less between them are one. */
const APART_S = 120;
/** A thermocouple later than the others by so long, or by such a share of their way up, is late. */
const [LATE_S, LATE_SHARE] = [300, 0.12];

interface Setting {
  readonly recording: Recording;
  readonly requirement: ChartRequirement;
  readonly soak: Soak | null;
}

/** @param gaps with the thermocouple that has no reading, null where the recorder wrote nothing at all. */
export const gapFlags = (
  { recording }: Setting,
  gaps: readonly { channel: string | null; run: Run }[],
): ChartFlag[] =>
  gaps.slice(0, MOST).map(({ channel, run: { from, to } }) => ({
    code: 'gap',
    channel,
    from: momentOf(recording, from),
    to: momentOf(recording, to),
    message: `${channel === null ? 'Nothing was recorded' : `${channel} has no reading`} for ${durationWords(lengthOf(recording, from, to))}.`,
  }));

/** What is wrong with the thermocouples themselves. */
export function faultFlags(
  { recording }: Setting,
  { channel, open, flat, spikes, excluded }: Examined,
): ChartFlag[] {
  const flagOf = (code: ChartFlag['code'], { from, to }: Run, message: string): ChartFlag => ({
    code,
    channel: channel.name,
    from: momentOf(recording, from),
    to: momentOf(recording, Math.max(from, to - 1)),
    message,
  });
  const left = excluded === null ? '' : ' It is not counted.';
  return [
    ...shortened(open).map((run) =>
      flagOf('open_circuit', run, `${channel.name} is an open circuit here.${left}`),
    ),
    ...shortened(flat).map((run) =>
      flagOf(
        'flat_line',
        run,
        `${channel.name} stands still at ${channel.values[run.from] ?? ''} °${channel.unit}.${left}`,
      ),
    ),
    ...spikes
      .slice(0, MOST)
      .map((row) =>
        flagOf(
          'spike',
          { from: row, to: row + 1 },
          `${channel.name} jumps to ${channel.values[row] ?? ''} °${channel.unit} in one row and back: no temperature.`,
        ),
      ),
  ];
}

function shortened(runs: readonly Run[]): readonly Run[] {
  const [first, last] = [runs[0], runs[runs.length - 1]];
  return runs.length > MOST && first && last ? [{ from: first.from, to: last.to }] : runs;
}

/** Where one counted thermocouple stands above the band. */
export function overshootFlags(
  { recording, requirement }: Setting,
  { channel, values, limits }: Examined,
): ChartFlag[] {
  const apart = Math.max(1, Math.round(APART_S / (usualStep(recording.seconds) ?? APART_S)));
  const runs = joined(
    runsWhere(values.length, (row) => (values[row] ?? 0) > limits.upper && Number.isFinite(values[row])),
    apart,
  );
  const upper = requirement.set + requirement.tolerance;
  return shortened(runs).map(({ from, to }) => {
    let hottest = Number.NEGATIVE_INFINITY;
    for (let row = from; row < to; row++) {
      const value = values[row] ?? 0;
      if (value > hottest && Number.isFinite(value)) hottest = value;
    }
    const degrees = oneDecimal(degreesIn(hottest, channel.unit, requirement.unit));
    const until = Math.min(to, values.length - 1);
    return {
      code: 'overshoot',
      channel: channel.name,
      from: momentOf(recording, from),
      to: momentOf(recording, until),
      message: `${channel.name} stood over ${upper} °${requirement.unit} for ${durationWords(lengthOf(recording, from, until))}, highest ${degrees} °${requirement.unit}.`,
    };
  });
}

/** Thermocouples that came into the band long after the others. */
export function lateFlags({ recording, requirement }: Setting, examined: readonly Examined[]): ChartFlag[] {
  const { seconds, counts } = recording;
  const entries = examined
    .filter(isCounted)
    .map((one) => ({ one, row: firstInBand(one) }))
    .map(({ one, row }) => ({ one, at: row < 0 ? null : (seconds[row] ?? 0) }));
  const lower = requirement.set - requirement.tolerance;
  return entries.flatMap((entry): ChartFlag[] => {
    const others = entries.filter((other) => other !== entry && other.at !== null).map(({ at }) => at ?? 0);
    if (others.length === 0) return [];
    const usual = others.toSorted((one, other) => one - other)[Math.floor((others.length - 1) / 2)] ?? 0;
    const name = entry.one.channel.name;
    const from = momentAtRowOf(recording, usual);
    if (entry.at === null) {
      const message = `${name} never came to ${lower} °${requirement.unit}.`;
      return [{ code: 'late_channel', channel: name, from, to: null, message }];
    }
    const late = entry.at - usual;
    if (late <= Math.max(LATE_S, LATE_SHARE * (usual - (seconds[0] ?? 0)))) return [];
    const message = `${name} came to ${lower} °${requirement.unit} at ${timeWordsAt(entry.at, counts)}, ${durationWords(late)} after the others.`;
    return [{ code: 'late_channel', channel: name, from, to: momentAtRowOf(recording, entry.at), message }];
  });
}

const momentAtRowOf = (recording: Recording, second: number): string =>
  momentOf({ seconds: Float64Array.of(second), counts: recording.counts }, 0);

const lengthOf = ({ seconds }: Recording, from: number, to: number): number =>
  (seconds[to] ?? 0) - (seconds[from] ?? 0);

export const oneDecimal = (value: number): number => Math.round(value * 10) / 10;
