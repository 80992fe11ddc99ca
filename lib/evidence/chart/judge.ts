import { faultFlags, gapFlags, lateFlags, overshootFlags } from './flags';
import { furtherFacts } from './further-facts';
import { gapsOf } from './gaps';
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
  const quench = soak && quenchAfter(seconds, counted, [soak, ...band.later]);
  return {
    recording,
    requirement,
    examined,
    band,
    soak,
    gaps: gapsOf(
      seconds,
      counted.map(({ values }) => values),
    ),
    quench,
    quenchDelayS: statedDelay(recording) ?? visibleDelay(quench),
    hottest: hottestOf(counted, requirement),
    soakS: soak ? (seconds[soak.to] ?? 0) - (seconds[soak.from] ?? 0) : 0,
    secondsAbove: secondsWhere(seconds, band.isAbove),
  };
}

/** A fall and a plunge within one long step of the recorder show no delay. */
const COARSEST_S = 60;

const visibleDelay = (quench: Quench | null): number | null =>
  quench && (quench.delayS > 0 || quench.stepS <= COARSEST_S) ? Math.round(quench.delayS * 10) / 10 : null;

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
      name,
      role,
      excluded: excludedOf(column),
    })),
    encoding: recording.encoding,
    notes: [...recording.notes, ...recording.doubts],
  };
}

function flagsOf(seen: Seen): ChartFlag[] {
  const { recording, requirement, examined, soak, gaps, soakS } = seen;
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
    ...gapFlags(seen, gaps),
    ...examined.flatMap((one) => faultFlags(seen, one)),
    ...lateFlags(seen, examined),
  ];
}
