import { cellsOf, isNumber } from './cells';
import type { ChartCorrections } from './corrections';
import { dialectOf, type Dialect } from './dialect';
import { temperatureUnitIn } from './heading';
import type { PlainBytes } from './plain-bytes';
import type { SampleLines } from './sample-lines';
import { timeShapeOf } from './time-shape';

const CHANNEL =
  /^(?:channel|tag|sensor|name|point|signal|source|input|probe|kanal|messstelle|voie|canal)\b.*$/i;
const VALUE = /^(?:value|reading|temp\w*|wert|messwert|valeur|valor|valore|pv|measure\w*)\b.*$/i;
/** Of an export with a row for each reading. */
const MOST_CHANNELS = 40;

/**
 * An export that writes one reading a row, with the name of its channel, as one with a column for each channel.
 *
 * @returns null where it is not of that kind.
 */
export function widened(
  plain: PlainBytes,
  sample: SampleLines,
  corrections: ChartCorrections,
): PlainBytes | null {
  const heading = sample.head.findIndex((line) => headingOf(line) !== null);
  const dialect = heading < 0 ? null : dialectOf(sample, corrections);
  if (!dialect) return null;
  const cells = cellsOf(sample.head[heading] ?? '', dialect.delimiter);
  const [channelAt, valueAt] = [
    cells.findIndex((cell) => CHANNEL.test(cell)),
    cells.findIndex((cell) => VALUE.test(cell)),
  ];
  if (channelAt < 0 || valueAt < 0) return null;
  const lines = plain.textOf(0, plain.bytes.length).split(/\r\n|\n|\r/);
  const table = gathered(lines.slice(heading + 1), dialect, { channelAt, valueAt });
  if (table.names.length < 2 || table.names.length > MOST_CHANNELS) return null;
  // Written in the same dialect, so that what was told of it and what a person corrected still holds.
  const { delimiter } = dialect;
  const quoted = (cell: string) => (cell.includes(delimiter) ? `"${cell}"` : cell);
  const unit = table.unit ?? temperatureUnitIn(cells[valueAt] ?? '');
  const names = table.names.map((name) => quoted(unit ? `${name} (°${unit})` : name));
  const text = [
    ...lines.slice(0, heading),
    ['Time', ...names].join(delimiter),
    ...[...table.rows].map(([time, row]) =>
      [quoted(time), ...table.names.map((name) => quoted(row.get(name) ?? ''))].join(delimiter),
    ),
  ].join('\n');
  const bytes = new TextEncoder().encode(text);
  const decoder = new TextDecoder();
  return { bytes, encoding: plain.encoding, textOf: (from, to) => decoder.decode(bytes.subarray(from, to)) };
}

/** A heading of such an export has few words, of which one is the channel and one the value. */
function headingOf(line: string): string | null {
  const cells = line.split(/[,;\t|]/).map((cell) => cell.replaceAll('"', '').trim());
  return cells.length <= 8 &&
    cells.some((cell) => CHANNEL.test(cell)) &&
    cells.some((cell) => VALUE.test(cell))
    ? line
    : null;
}

function gathered(
  lines: readonly string[],
  { delimiter, decimal }: Dialect,
  { channelAt, valueAt }: { channelAt: number; valueAt: number },
) {
  const rows = new Map<string, Map<string, string>>();
  const names = new Set<string>();
  let unit: ReturnType<typeof temperatureUnitIn> = null;
  for (const line of lines) {
    const cells = cellsOf(line, delimiter);
    const name = cells[channelAt] ?? '';
    const time = cells.filter((cell, at) => at !== valueAt && timeShapeOf(cell) !== null).join(' ');
    if (name === '' || isNumber(name, decimal) || time === '') continue;
    unit ??= unitOf(cells, channelAt);
    names.add(name);
    const row = rows.get(time) ?? new Map<string, string>();
    row.set(name, cells[valueAt] ?? '');
    rows.set(time, row);
    if (names.size > MOST_CHANNELS) break;
  }
  return { rows, names: [...names], unit };
}

/** A cell of its own with the unit. */
const unitOf = (cells: readonly string[], channelAt: number) =>
  cells
    .filter((cell, at) => at !== channelAt && /^\W*(?:deg\w*\W*)?[CF]$/i.test(cell))
    .map(temperatureUnitIn)
    .find((unit) => unit !== null) ?? null;
