import { judgedChart, type Seen } from './judge';
import type { ChannelRole, Exclusion, JudgedChart } from './judged-chart';
import { degreesIn } from './limits';
import { durationWords, momentAt, timeWordsAt } from './moments';
import type { Recording } from './recording';
import type { TemperatureUnit } from './requirement';
import { firstInBand } from './soak';

/** One line of a chart. `matters` is the one that decided: it came last into the band, or stood above it. */
export interface DrawnChannel {
  readonly name: string;
  readonly role: ChannelRole;
  readonly excluded: Exclusion | null;
  readonly matters: boolean;
  /** In the chart's unit; what is not finite is no reading. */
  readonly values: Float64Array;
  /** What its legend says: when it came into the band. */
  readonly says: string;
}

/** Something that happened, with the number under which it stands in the picture. */
export interface DrawnEvent {
  readonly number: number;
  readonly code: JudgedChart['flags'][number]['code'] | 'quench';
  readonly channel: string | null;
  readonly from: number;
  readonly to: number;
  readonly says: string;
}

/** A judged chart as it is drawn: plain data, temperatures in the requirement's unit, times as the recording's. */
export interface ChartDrawing {
  readonly seconds: Float64Array;
  readonly counts: Recording['counts'];
  readonly unit: TemperatureUnit;
  readonly channels: readonly DrawnChannel[];
  readonly band: { readonly lower: number; readonly upper: number; readonly set: number };
  readonly soak: { readonly from: number; readonly to: number; readonly says: string } | null;
  readonly events: readonly DrawnEvent[];
  readonly verdict: JudgedChart['verdict'];
  /** One sentence or more for who cannot see it. */
  readonly says: string;
}

/** Everything that a picture of a chart shows. */
export function drawingOf(seen: Seen): ChartDrawing {
  const { recording, requirement, examined, soak } = seen;
  const { seconds, counts } = recording;
  const { set, tolerance, unit, soakMinutes } = requirement;
  const judged = judgedChart(seen);
  const asked = soakMinutes === undefined ? '' : `; asked ${soakMinutes}`;
  const decisive = decisiveChannel(seen);
  return {
    seconds,
    counts,
    unit,
    channels: recording.channels
      .filter(({ role }) => role !== 'other')
      .map((channel) => {
        const one = examined.find((each) => each.channel === channel);
        return {
          name: channel.name,
          role: channel.role,
          excluded: one?.excluded ?? null,
          matters: channel.name === decisive,
          values:
            channel.unit === unit
              ? channel.values
              : channel.values.map((value) => degreesIn(value, channel.unit, unit)),
          says: one && one.excluded === null ? entryWords(recording, firstInBand(one)) : '',
        };
      }),
    band: { lower: set - tolerance, upper: set + tolerance, set },
    soak: soak && {
      from: seconds[soak.from] ?? 0,
      to: seconds[soak.to] ?? 0,
      says: `soak ${durationWords(seen.soakS)}, from the coldest couple${asked}`,
    },
    events: eventsOf(seen, judged),
    verdict: judged.verdict,
    says: `Furnace chart of ${examined.length} thermocouples from ${momentAt(seconds[0] ?? 0, counts)} to ${momentAt(seconds[seconds.length - 1] ?? 0, counts)}. ${judged.why}`,
  };
}

const entryWords = ({ seconds, counts }: Recording, row: number): string =>
  row < 0 ? 'never in the band' : `in the band ${timeWordsAt(seconds[row] ?? 0, counts)}`;

/** The one above the band, else the one that came last into it. */
function decisiveChannel({ examined }: Seen): string | null {
  const counted = examined.filter(({ isCandidate, excluded }) => isCandidate && excluded === null);
  if (counted.length < 2) return null;
  const above = counted.find(({ values, limits }) =>
    values.some((value) => value > limits.upper && Number.isFinite(value)),
  );
  const entries = counted.map((one) => ({ one, row: firstInBand(one) }));
  const never = entries.find(({ row }) => row < 0);
  const [last] = entries.toSorted((one, other) => other.row - one.row);
  return (above ?? (never ?? last)?.one)?.channel.name ?? null;
}

function eventsOf({ recording, quench, quenchDelayS, soak }: Seen, judged: JudgedChart): DrawnEvent[] {
  const { seconds } = recording;
  const at = (moment: string | null, otherwise: number) =>
    moment === null ? otherwise : secondOf(moment, recording);
  const end = seconds[seconds.length - 1] ?? 0;
  const flags = judged.flags.map(({ code, channel, from, to, message }) => {
    const start = at(from, soak ? (seconds[soak.from] ?? 0) : (seconds[0] ?? 0));
    return { code, channel, from: start, to: at(to, end), says: message };
  });
  const quenched =
    quench && quenchDelayS !== null
      ? [
          {
            code: 'quench' as const,
            channel: null,
            from: seconds[quench.fallsFrom] ?? 0,
            to: seconds[quench.plungesFrom] ?? 0,
            says: `Quench in ${durationWords(quenchDelayS)}.`,
          },
        ]
      : [];
  return [...flags, ...quenched]
    .toSorted((one, other) => one.from - other.from)
    .map((event, index) => ({ number: index + 1, ...event }));
}

/** The second of a printed moment, the nearest one on this chart. */
function secondOf(moment: string, { counts, seconds }: Recording): number {
  if (counts === 'date_and_time') return Date.parse(`${moment}Z`) / 1000;
  const [hours = 0, minutes = 0, rest = 0] = moment.split(':').map(Number);
  const ofDay = hours * 3600 + minutes * 60 + rest;
  return counts === 'time_of_day' && ofDay < (seconds[0] ?? 0) ? ofDay + 86_400 : ofDay;
}
