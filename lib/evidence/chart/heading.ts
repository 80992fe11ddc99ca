import { cellsOf, isNumber, type Decimal, type Delimiter } from './cells';
import type { TemperatureUnit } from './requirement';
import { timeShapeOf } from './time-shape';

/** What stands over a column. */
export interface Heading {
  readonly name: string;
  /** All its words with the unit, for looking for hints. */
  readonly words: string;
}

const DEGREE = String.raw`(?:°|º|˚|Â°|\uFFFD|&deg;|deg(?:rees?)?\.?|\?)`;
const TEMPERATURE_UNIT = new RegExp(
  String.raw`${DEGREE}\s*([CF])(?![a-z])|[([{]\s*([CF])\s*[)\]}]|(?:^|[\s_,:;/=-])([CF])$|\b(c)(?:elsius|entigrade)\b|\b(f)ahrenheit\b`,
  'i',
);

/** The unit of temperature that words name, null where they name none. */
export function temperatureUnitIn(words: string): TemperatureUnit | null {
  const found = TEMPERATURE_UNIT.exec(words.trim());
  const letter = found?.slice(1).find((group) => group !== undefined);
  if (letter === undefined) return null;
  return letter.toUpperCase() === 'F' ? 'F' : 'C';
}

const A_UNIT = new RegExp(
  String.raw`^[([{]?\s*(?:${DEGREE}?\s*[CFK]|${DEGREE}|celsius|fahrenheit|%|s|sec|secs|seconds?|min|mins|minutes?|h|hr|hrs|hours?|ms|m?bar|k?pa|psi|torr|m?v|m?a|kw|[dmyhs]{1,4}(?:[-/.: ][dmyhs]{1,4})+(?: ?[ap]m?)?|-+|n\/?a|units?|einheit(?:en)?|unit[éà]s?)\s*[)\]}]?$`,
  'i',
);

/**
 * The headings over a table: the row above it, with rows of units and of second names.
 *
 * @param above the lines before the first row, the last one next to it.
 */
export function headingsOf(
  above: readonly string[],
  { delimiter, decimal, width }: { delimiter: Delimiter; decimal: Decimal; width: number },
): { headings: readonly Heading[]; lines: number } {
  const stack: (readonly string[])[] = [];
  let lines = 0;
  for (const line of above.toReversed()) {
    lines++;
    if (line.trim() === '' || /^[\s\-=_+|*]+$/.test(line)) continue;
    const cells = alignedCells(line, delimiter, width);
    if (!isHeading(cells, width, decimal) || stack.length === 4) {
      lines--;
      break;
    }
    stack.unshift(cells);
    // Under names there may be units or second names; over a full row of names there is only the head of the page.
    if (!isUnits(cells) && (cells[0] ?? '') !== '') break;
  }
  const headings = Array.from({ length: width }, (_, at) => {
    const texts = stack.map((cells) => cells[at] ?? '').filter((text) => text !== '');
    const names = texts.filter((text) => !A_UNIT.test(text) || /^[A-Z]\d/.test(text));
    return { name: withoutUnit((names.length > 0 ? names : texts).join(' ')), words: texts.join(' ') };
  });
  return { headings: stack.length > 0 ? headings : [], lines };
}

const UNIT_AT_END = new RegExp(
  String.raw`[\s_,/]*(?:(?:\bin\s+)?(?:[([{]\s*${DEGREE}?\s*[CF]\s*[)\]}]|${DEGREE}\s*[CF])|(?<=_)[CF])\s*$`,
  'i',
);

const withoutUnit = (name: string): string => name.replace(UNIT_AT_END, '').replace(/_$/, '') || name;

/** In a table set with spaces names may hold single spaces, and day and time may share one heading. */
function alignedCells(line: string, delimiter: Delimiter, width: number): readonly string[] {
  if (delimiter !== ' ') return cellsOf(line, delimiter);
  const wide = line.trim().split(/\t+| {2,}/);
  const narrow = cellsOf(line, ' ');
  const cells = narrow.length === width ? narrow : wide;
  return cells.length < width ? [...Array<string>(width - cells.length).fill(''), ...cells] : cells;
}

function isHeading(cells: readonly string[], width: number, decimal: Decimal): boolean {
  const filled = cells.filter((cell) => cell !== '');
  const words = filled.filter((cell) => !isNumber(cell, decimal) && timeShapeOf(cell) === null);
  if (isUnits(cells)) return true;
  if (filled.length <= width * 0.5 || filled.length < 2) return false;
  return words.length >= filled.length * 0.5 || (TIME_WORD.test(words[0] ?? '') && words[0] === cells[0]);
}

/** Words over a column of times, in the languages of recorders. */
export const TIME_WORD =
  /time|date|zeit|datum|uhr|temps|heure|hora|tiempo|fecha|\bora\b|tempo|elapsed|tijd|\btid\b|seconds?\b|minutes?\b|\bsec\b|\bmin\b|epoch|stamp/i;

/** Over the clock there may stand how it is written, in letters of any language. */
const isUnits = (cells: readonly string[]): boolean =>
  cells.slice(1).every((cell) => cell === '' || A_UNIT.test(cell)) &&
  cells.slice(1).some((cell) => cell !== '');
