import { faultFlags, gapFlags, lateFlags, overshootFlags } from './flags';
import { furtherFacts } from './further-facts';
import { gapsOf, readingGaps } from './gaps';
import { findingsOf, type Findings } from './findings';
import type { ChartFlag, JudgedChart } from './judged-chart';
import { degreesIn } from './limits';
import { durationWords, momentOf } from './moments';
import { quenchAfter, type Quench } from './quench';
import type { Recording } from './recording';
import type { ChartRequirement } from './requirement';
import type { Run } from './row-runs';
import { bandOverTime, type BandOverTime, type Soak } from './soak';
import { examinedChannels, isCounted, type Examined } from './sound-channels';
import { statedDelay } from './stated-delay';

/** Everything that was seen on a chart, by rows; what is printed and what is drawn both come from it. */
export interface Seen {
  readonly recording: Recording;
  readonly requirement: ChartRequirement;
  readonly examined: readonly Examined[];
  readonly band: BandOverTime;
  readonly soak: Soak | null;
  readonly gaps: readonly Run[];
  /** Where single ones of the counted have no reading while the others have. */
  readonly ownGaps: readonly { readonly channel: string; readonly run: Run }[];
  readonly quench: Quench | null;
  /** As a remark of the recorder says it, before what the temperatures show. */
  readonly quenchDelayS: number | null;
  /** Row of the highest counted reading, -1 where there is none, and the reading in the requirement's unit. */
  readonly hottest: { readonly row: number; readonly degrees: number };
  readonly soakS: number;
  readonly secondsAbove: number;
}

/** Looks at a recording against what was asked. Open-circuit codes in it are marked as such, in place. */
export function seenIn(recording: Recording, requirement: ChartRequirement): Seen {
  const examined = examinedChannels(recording, requirement);
  const counted = examined.filter(isCounted);
  const { seconds } = recording;
  const band = bandOverTime(seconds.length, counted);
  const { soak } = band;
  const gaps = gapsOf(
    seconds,
    counted.map(({ values }) => values),
  );
  const furnace = examined
    .filter(
      ({ channel, isCandidate, excluded }) => channel.role === 'control' && !isCandidate && excluded === null,
    )
    .map(({ values }) => values);
  const quench = soak && quenchAfter(seconds, counted, { windows: [soak, ...band.later], furnace });
  return {
    recording,
    requirement,
    examined,
    band,
    soak,
    gaps,
    ownGaps: counted.flatMap(({ channel }) =>
      readingGaps(seconds, channel.values)
        .filter((run) => !gaps.some(({ from, to }) => from <= run.from && to >= run.to))
        .map((run) => ({ channel: channel.name, run })),
    ),
    quench,
    quenchDelayS:
      statedDelay(recording) ?? (quench?.delayS == null ? null : Math.round(quench.delayS * 10) / 10),
    hottest: hottestOf(counted, requirement),
    soakS: soak ? (seconds[soak.to] ?? 0) - (seconds[soak.from] ?? 0) : 0,
    secondsAbove: secondsWhere(seconds, band.isAbove),
  };
}

function hottestOf(counted: readonly Examined[], { unit }: ChartRequirement): Seen['hottest'] {
  let [row, degrees] = [-1, Number.NEGATIVE_INFINITY];
  for (const { values, channel } of counted) {
    let [at, highest] = [-1, Number.NEGATIVE_INFINITY];
    for (let index = 0; index < values.length; index++) {
      const value = values[index] ?? Number.NaN;
      if (value > highest && value !== Number.POSITIVE_INFINITY) [at, highest] = [index, value];
    }
    const here = at < 0 ? Number.NEGATIVE_INFINITY : degreesIn(highest, channel.unit, unit);
    if (here > degrees) [row, degrees] = [at, here];
  }
  return { row, degrees };
}

/** A reading stands until the next one. */
function secondsWhere(seconds: Float64Array, holds: (row: number) => boolean): number {
  let sum = 0;
  for (let row = 0; row + 1 < seconds.length; row++) {
    if (holds(row)) sum += (seconds[row + 1] ?? 0) - (seconds[row] ?? 0);
  }
  return sum;
}

/** What was seen in the shape of the contract. */
export function judgedChart(seen: Seen): JudgedChart {
  const { recording, requirement, examined, soak, hottest } = seen;
  const findings = findingsOf(seen);
  const upper = requirement.set + requirement.tolerance;
  const highest = hottest.row < 0 ? null : rounded(hottest.degrees, 2);
  const isOver = seen.secondsAbove > 0 || seen.band.isAbove(recording.seconds.length - 1);
  return {
    understood: understoodOf(seen),
    soak_start: soak && momentOf(recording, soak.from),
    soak_end: soak && momentOf(recording, soak.to),
    soak_minutes: examined.some(isCounted) ? rounded(seen.soakS / 60, 3) : null,
    max_temperature: highest,
    max_overshoot_above_upper_limit:
      highest === null ? null : rounded(isOver ? hottest.degrees - upper : 0, 2),
    minutes_above_upper_limit: highest === null ? null : rounded(seen.secondsAbove / 60, 3),
    quench_delay_s: seen.quenchDelayS,
    verdict: verdictOf(findings),
    flags: flagsOf(seen),
    why: [...findings.fails, ...findings.doubts, ...findings.holds, ...findings.remarks].join(' '),
    facts: furtherFacts(recording, requirement, examined, soak),
  };
}

const rounded = (value: number, digits: number): number => Math.round(value * 10 ** digits) / 10 ** digits;

/** What surely fails is not made doubtful by anything else. */
function verdictOf({ fails, doubts }: Findings): JudgedChart['verdict'] {
  if (fails.length > 0) return 'fail';
  return doubts.length > 0 ? 'review' : 'pass';
}

function understoodOf({ recording, examined }: Seen): JudgedChart['understood'] {
  const excludedOf = (column: number) =>
    examined.find(({ channel }) => channel.column === column)?.excluded ?? null;
  return {
    delimiter: recording.delimiter,
    decimal: recording.decimal,
    time: recording.timeWords,
    unit: recording.unit,
    rows: recording.seconds.length,
    channels: recording.channels.map(({ name, role, column }) => ({
      column,
      name,
      role,
      excluded: excludedOf(column),
    })),
    encoding: recording.encoding,
    notes: [...recording.notes, ...recording.doubts],
  };
}

function flagsOf(seen: Seen): ChartFlag[] {
  const { recording, requirement, examined, soak, gaps, ownGaps, soakS } = seen;
  const asked = requirement.soakMinutes;
  const isShort = asked !== undefined && soakS / 60 < asked && examined.some(isCounted);
  const short: ChartFlag[] = isShort
    ? [
        {
          code: 'short_soak',
          channel: null,
          from: soak && momentOf(recording, soak.from),
          to: soak && momentOf(recording, soak.to),
          message: `The soak lasted ${durationWords(soakS)}; ${asked} min were asked.`,
        },
      ]
    : [];
  return [
    ...short,
    ...examined.filter(isCounted).flatMap((one) => overshootFlags(seen, one)),
    ...gapFlags(seen, [...gaps.map((run) => ({ channel: null, run })), ...ownGaps]),
    ...examined.flatMap((one) => faultFlags(seen, one)),
    ...lateFlags(seen, examined),
  ];
}
