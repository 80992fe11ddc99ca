import { UnreadableFile } from '../page';

import { channelRole } from './channel-role';
import { clockOf, type Clock } from './clock';
import type { ChartCorrections } from './corrections';
import { temperatureUnitIn } from './heading';
import { bringInOrder } from './in-order';
import type { ChannelRole } from './judged-chart';
import { likelyUnit } from './likely-unit';
import { degreesIn } from './limits';
import { layoutOf, type Layout } from './layout';
import { plainBytes } from './plain-bytes';
import type { ChartRequirement, TemperatureUnit } from './requirement';
import { sampleLines } from './sample-lines';
import { scanRows, type ScannedRows } from './scan-rows';
import { widened } from './widened';

export interface Channel {
  /** In the file, from 0. */
  readonly column: number;
  readonly name: string;
  readonly role: ChannelRole;
  readonly unit: TemperatureUnit;
  /** The smallest step in which it was written, in its unit. */
  readonly step: number;
  /** In its unit; NaN is no reading, infinity one that the recorder could not make. */
  readonly values: Float64Array;
  /** What a person said: true leaves it out, false counts it. */
  readonly excludedByHand: boolean | null;
}

/** An export as it was understood, before it is judged. */
export interface Recording {
  readonly seconds: Float64Array;
  readonly counts: Clock['counts'];
  readonly channels: readonly Channel[];
  readonly unit: TemperatureUnit;
  readonly delimiter: string;
  readonly decimal: '.' | ',';
  readonly timeWords: string;
  readonly encoding: string;
  readonly notes: readonly string[];
  /** Guesses on which the verdict itself rests: with any, a person must look. */
  readonly doubts: readonly string[];
  /** Lines before, among and behind the rows. */
  readonly remarks: readonly string[];
}

/**
 * Reads a recorder's export in any dialect.
 *
 * @param file the bytes as they came.
 * @param requirement only for telling °F from °C where the file does not say.
 * @throws UnreadableFile where it is empty, too large, no text, or holds no table of times and temperatures.
 */
export function recordingOf(
  file: Uint8Array,
  requirement: ChartRequirement,
  corrections: ChartCorrections = {},
): Recording {
  const written = plainBytes(file);
  const plain = widened(written, sampleLines(written), corrections) ?? written;
  const layout = layoutOf(sampleLines(plain), corrections);
  const scanned = layout && scanRows(plain, layout);
  if (!layout || !scanned || scanned.rows < 2) {
    throw new UnreadableFile(
      'kind_not_supported',
      'No table of times and temperatures was found in this file.',
    );
  }
  const clock = clockOf(scanned, layout, corrections);
  const ordered = bringInOrder(clock.seconds, scanned.values);
  const { channels, unit, notes, doubts } = channelsOf(layout, scanned, requirement, corrections);
  return {
    seconds: clock.seconds,
    counts: clock.counts,
    channels,
    unit,
    delimiter: layout.delimiter,
    decimal: layout.decimal,
    timeWords: clock.words,
    encoding: plain.encoding,
    notes: [...clock.notes, ...ordered.notes, ...notes],
    doubts: [...clock.doubts, ...ordered.doubts, ...doubts],
    remarks: [...layout.preamble, ...scanned.oddLines],
  };
}

function channelsOf(
  layout: Layout,
  scanned: ScannedRows,
  requirement: ChartRequirement,
  corrections: ChartCorrections,
) {
  const named = layout.values.map(({ column, name, words }, index) => {
    const said = corrections.channels?.find((one) => one.column === column);
    const values = scanned.values[index] ?? new Float64Array();
    return {
      column,
      name: said?.name ?? name,
      role: said?.role ?? roleOf(name, words, values, requirement),
      said: temperatureUnitIn(words),
      step: 10 ** -(scanned.scales[index] ?? 0),
      values,
      excludedByHand: said?.excluded ?? null,
    };
  });
  const thermocouples = named.filter(({ role }) => role === 'load' || role === 'control');
  const stated =
    thermocouples.find(({ said }) => said !== null)?.said ??
    named.find(({ role, said }) => role !== 'other' && said !== null)?.said ??
    statedUnit(layout.preamble);
  const likely = likelyUnit(
    thermocouples.map(({ values }) => values),
    requirement,
  );
  const unit = corrections.unit ?? stated ?? likely.unit;
  const notes =
    corrections.unit || stated
      ? []
      : [`The file does not name its unit; °${unit} was taken from the set temperature.`];
  const doubts =
    !corrections.unit && stated !== null && likely.sure && likely.unit !== stated
      ? [`The file says °${stated}, but its temperatures fit the set temperature in °${likely.unit}.`]
      : [];
  const channels = named.map(({ said, ...channel }) => ({
    ...channel,
    unit: corrections.unit ?? (channel.role === 'other' ? unit : (said ?? unit)),
  }));
  return { channels, unit, notes, doubts };
}

const THERMOCOUPLE = /\bt[ce]\b|\bt[ce]?[\s_#-]*\d|\bch\w*[\s_#-]*\d|thermo|couple|temp/i;

/** By its heading; but a column that stands still from the first row to the last is the number of a load, or a set point. */
function roleOf(
  name: string,
  words: string,
  values: Float64Array,
  { set, tolerance, unit }: ChartRequirement,
): ChannelRole {
  const [first = 0] = values;
  const role = channelRole(words || name);
  const still = values.length > 10 && values.every((value) => value === first);
  if (!still || role === 'set_point' || (words !== '' && THERMOCOUPLE.test(name))) return role;
  const near = (['F', 'C'] as const).some(
    (own) => Math.abs(degreesIn(first, own, unit) - set) <= tolerance / 2,
  );
  if (near) return 'set_point';
  return Number.isInteger(first) ? 'other' : role;
}

/** The unit in the lines before the table, where they name only one. */
function statedUnit(preamble: readonly string[]): TemperatureUnit | null {
  const units = new Set(
    preamble
      .flatMap((line) =>
        line.split(/[,;\t|]|:\s/).map((piece) => ({ line, piece: piece.replaceAll('"', '').trim() })),
      )
      // A load named C or a furnace named F is no unit.
      .filter(({ line, piece }) => piece.length > 2 || /unit|einheit|scale|temp/i.test(line))
      .map(({ piece }) => temperatureUnitIn(piece))
      .filter((unit) => unit !== null),
  );
  const [unit] = units;
  return units.size === 1 && unit ? unit : null;
}
