import type { Seen } from './judge';
import { durationWords, timeWordsAt } from './moments';
import { isCounted, type Examined } from './sound-channels';
import type { Soak } from './soak';

/** Sentences on a chart, by what they do to the verdict. */
export interface Findings {
  /** What surely does not meet. */
  readonly fails: readonly string[];
  /** What a person must look at. */
  readonly doubts: readonly string[];
  readonly holds: readonly string[];
  readonly remarks: readonly string[];
}

type Finding = readonly [kind: keyof Findings, says: string];

export function findingsOf(seen: Seen): Findings {
  const all = [
    ...soakFindings(seen),
    ...overshootFindings(seen),
    ...quenchFindings(seen),
    ...faultFindings(seen),
    ...seen.recording.doubts.map((doubt): Finding => ['doubts', doubt]),
    ...setPointRemarks(seen),
  ];
  const of = (kind: keyof Findings) => all.filter(([one]) => one === kind).map(([, says]) => says);
  return { fails: of('fails'), doubts: of('doubts'), holds: of('holds'), remarks: of('remarks') };
}

function soakFindings({
  recording,
  requirement,
  examined,
  band,
  soak,
  soakS,
  gaps,
  ownGaps,
}: Seen): Finding[] {
  const { set, tolerance, unit, soakMinutes, soakMinutesMax } = requirement;
  const lower = `${set - tolerance} °${unit}`;
  if (!examined.some(isCounted)) return [['doubts', 'No thermocouple is left to judge by.']];
  if (!soak) return [['fails', `The coldest counted thermocouple never came to ${lower}.`]];
  const at = (row: number) => timeWordsAt(recording.seconds[row] ?? 0, recording.counts);
  const lasted = `The soak lasted ${durationWords(soakS)}, from ${at(soak.from)} to ${at(soak.to)}`;
  const findings: Finding[] = [];
  const isShort = soakMinutes !== undefined && soakS / 60 < soakMinutes;
  const longer = isShort ? chatteredBefore(recording.seconds, soak, band.later, soakMinutes) : null;
  if (longer) {
    findings.push([
      'doubts',
      `${lasted}, since the coldest fell below ${lower} again at once; from ${at(longer.from)} to ${at(longer.to)} all stayed above it.`,
    ]);
  } else if (isShort) findings.push(['fails', `${lasted}; ${soakMinutes} min were asked.`]);
  else if (soakMinutesMax !== undefined && soakS / 60 > soakMinutesMax) {
    findings.push(['fails', `${lasted}; at most ${soakMinutesMax} min were allowed.`]);
  } else
    findings.push([
      'holds',
      `${lasted}${soakMinutes === undefined ? '' : `; ${soakMinutes} min were asked`}.`,
    ]);
  if (!soak.ended) {
    const open = soakMinutesMax !== undefined && soakS / 60 <= soakMinutesMax;
    findings.push([open ? 'doubts' : 'remarks', 'The chart ends before the soak does.']);
  }
  const all = [...gaps.map((run) => ({ channel: null, run })), ...ownGaps];
  for (const { channel, run } of all.filter((one) => one.run.to > soak.from && one.run.from < soak.to)) {
    const long = durationWords((recording.seconds[run.to] ?? 0) - (recording.seconds[run.from] ?? 0));
    const what = channel === null ? 'Nothing was recorded' : `${channel} has no reading`;
    findings.push(['doubts', `${what} for ${long} from ${at(run.from)}, inside the soak.`]);
  }
  const again = band.later.find(({ from, to }) => isLong(recording.seconds, from, to));
  if (again && !longer)
    findings.push(['remarks', `All were above ${lower} again from ${at(again.from)} to ${at(again.to)}.`]);
  return findings;
}

/** A window of this length is more than a reading that wavers at the limit. */
const WAVERING_S = 120;

const isLong = (seconds: Float64Array, from: number, to: number): boolean =>
  (seconds[to] ?? 0) - (seconds[from] ?? 0) > WAVERING_S;

/** The window that would have held, where the first ones only wavered on the way into the band. */
function chatteredBefore(
  seconds: Float64Array,
  first: Soak,
  later: readonly Soak[],
  soakMinutes: number,
): Soak | null {
  if (isLong(seconds, first.from, first.to)) return null;
  const next = later.find(({ from, to }) => isLong(seconds, from, to));
  const holds = next && (seconds[next.to] ?? 0) - (seconds[next.from] ?? 0) >= soakMinutes * 60;
  const soon = next && (seconds[next.from] ?? 0) - (seconds[first.to] ?? 0) <= 5 * WAVERING_S;
  return holds && soon ? next : null;
}

function overshootFindings({
  recording,
  requirement,
  examined,
  hottest,
  secondsAbove,
  band,
}: Seen): Finding[] {
  const { set, tolerance, unit, maxOvershoot = 0 } = requirement;
  if (!examined.some(isCounted)) return [];
  const upper = set + tolerance;
  const highest = `${Math.round(hottest.degrees * 10) / 10} °${unit}`;
  const isOver = secondsAbove > 0 || band.isAbove(recording.seconds.length - 1);
  if (!isOver) return [['holds', `The hottest was ${highest}, not above ${upper} °${unit}.`]];
  const at = timeWordsAt(recording.seconds[hottest.row] ?? 0, recording.counts);
  const says = `For ${durationWords(secondsAbove)} a counted thermocouple was above ${upper} °${unit}, at most ${highest} at ${at}.`;
  return [[hottest.degrees - upper > maxOvershoot ? 'fails' : 'remarks', says]];
}

function quenchFindings({ requirement, quench, quenchDelayS }: Seen): Finding[] {
  const allowed = requirement.maxQuenchDelayS;
  if (allowed === undefined) return [];
  if (quenchDelayS === null) {
    const shown = quench ? 'the plunge into the quench but not the transfer to it' : 'no quench';
    return [['doubts', `The chart shows ${shown}, so its delay cannot be told.`]];
  }
  const says = `From the first fall to the plunge it took ${durationWords(quenchDelayS)}; ${allowed} s were allowed.`;
  const step = quench?.delayS === quenchDelayS ? quench.stepS : 0;
  // Rows further apart than what is allowed cannot show that it was kept.
  if (step > allowed && quenchDelayS - step <= allowed) {
    return [['doubts', `${says} The rows are ${durationWords(step)} apart, too far to tell.`]];
  }
  return [[quenchDelayS > allowed ? 'fails' : 'holds', says]];
}

/** What is wrong with thermocouples, as far as it touches the soak. */
function faultFindings({ recording, examined, soak }: Seen): Finding[] {
  if (!soak) return [];
  const touches = (from: number, to: number) => to > soak.from && from < soak.to;
  return examined
    .filter(({ isCandidate }) => isCandidate)
    .flatMap((one): Finding[] => {
      const { name } = one.channel;
      if (one.excluded === 'by_hand') return [['remarks', `${name} was left out by hand.`]];
      if (one.excluded !== null) return brokenFindings(one, soak);
      const spike = one.spikes.find((row) => touches(row, row + 1));
      const missed = one.open.find(({ from, to }) => touches(from, to));
      const at = (row: number) => timeWordsAt(recording.seconds[row] ?? 0, recording.counts);
      return [
        ...(spike === undefined
          ? []
          : [['doubts', `${name} jumps for one row at ${at(spike)}, inside the soak.`] as const]),
        ...(missed === undefined
          ? []
          : [['doubts', `${name} has no reading at ${at(missed.from)}, inside the soak.`] as const]),
      ];
    });
}

const BROKEN_WORDS = {
  open_circuit: 'is an open circuit',
  flat_line: 'stands still',
  no_readings: 'has no readings',
} as const;

/** A broken thermocouple is not counted; but what it showed while it was sound may speak against the soak. */
function brokenFindings({ channel, values, limits, open, flat, excluded }: Examined, soak: Soak): Finding[] {
  if (excluded === null || excluded === 'by_hand') return [];
  const broke = Math.min(...[...open, ...flat].map(({ from }) => from), values.length);
  const says = `${channel.name} ${BROKEN_WORDS[excluded]} and is not counted`;
  if (values.subarray(0, broke).some((value) => value > limits.upper && Number.isFinite(value))) {
    return [['doubts', `${says}, but before that it was above the band.`]];
  }
  if (values.subarray(soak.from, Math.max(soak.from, broke)).some((value) => value < limits.lower)) {
    return [['doubts', `${says}, but before that it was below the band while the others soaked.`]];
  }
  // That a reading stands still is our own reading of the chart, where the recorder says itself that a circuit is open.
  const stopped = excluded === 'flat_line' && broke > soak.from;
  return [[stopped ? 'doubts' : 'remarks', `${says}.`]];
}

function setPointRemarks({ recording, requirement, soak }: Seen): Finding[] {
  if (!soak) return [];
  const middle = Math.floor((soak.from + soak.to) / 2);
  const { set, tolerance, unit } = requirement;
  return recording.channels
    .filter(({ role, unit: own }) => role === 'set_point' && own === unit)
    .filter(({ values }) => Math.abs((values[middle] ?? set) - set) > tolerance)
    .map(({ name, values }): Finding => [
      'remarks',
      `${name} stood at ${values[middle] ?? ''} °${unit}, not at ${set}.`,
    ]);
}
