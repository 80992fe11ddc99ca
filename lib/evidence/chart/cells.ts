/** A column's delimiter; a space stands for any run of spaces and tabs. */
export type Delimiter = ',' | ';' | '\t' | '|' | ' ';
export type Decimal = '.' | ',';

/** The cells of one line, without their quotes and outer spaces. */
export function cellsOf(line: string, delimiter: Delimiter): string[] {
  if (delimiter === ' ') return line.trim().split(/[ \t]+/);
  if (!line.includes('"')) return line.split(delimiter).map((cell) => cell.trim());
  const cells: string[] = [];
  let cell = '';
  let quoted = false;
  for (const letter of line) {
    if (letter === '"') quoted = !quoted;
    else if (letter === delimiter && !quoted) {
      cells.push(cell.trim());
      cell = '';
    } else cell += letter;
  }
  return [...cells, cell.trim()];
}

const UNIT_BEHIND = String.raw`\s*(?:(?:°|º|˚|Â°|\uFFFD|deg\.?)?\s*[CF]|%|[*!#A-Z])?`;
const NUMBER: Record<Decimal, RegExp> = {
  '.': new RegExp(
    String.raw`^[+-]?(?:\d+|\d{1,3}(?:[, '\u00a0\u202f]\d{3})+)?(?:\.\d*)?(?:[eE][+-]?\d+)?${UNIT_BEHIND}$`,
  ),
  ',': new RegExp(
    String.raw`^[+-]?(?:\d+|\d{1,3}(?:[. '\u00a0\u202f]\d{3})+)?(?:,\d*)?(?:[eE][+-]?\d+)?${UNIT_BEHIND}$`,
  ),
};

/** Whether a cell is a number in this writing, with or without its unit or a mark of alarm behind it. */
export const isNumber = (cell: string, decimal: Decimal): boolean =>
  /^[+-]?[.,]?\d/.test(cell) && NUMBER[decimal].test(cell);

/** The number in a cell of which `isNumber` holds. */
export function numberIn(cell: string, decimal: Decimal): number {
  const plain = cell.replace(decimal === '.' ? /[, '\u00a0\u202f]/g : /[. '\u00a0\u202f]/g, '');
  return Number.parseFloat(decimal === ',' ? plain.replace(',', '.') : plain);
}

/** What recorders print for a thermocouple that is not there, broken, or beyond their range. */
const FAULT =
  /^(?:[-*?.#_=]{2,}|[-+]?(?:inf\w*|nan|1\.#\w+)|#[\w/]+[!?]?|n\/?[ad]|null|none|invalid|bad|open|.*\b(?:open|burn ?-?out|broken|fault|fail(?:ed|ure)?|err(?:or)?|bruch|offen|ouvert|abierto|aperto|rotto|no ?tc|disc(?:onn\w*)?)\b.*|s\.? ?(?:br|break)\.?|b\.? ?out|[-+]?(?:over|under)(?: ?range)?|[-+]?o\.?l\.?|u\.?l\.?|[-+]?o\.?v(?:er|fl|r)?\.?|>+|<+|f[üu]hlerbruch|sensorbruch)$/i;

/** An event between the rows, which says of a door what could be said of a circuit. */
const NO_CIRCUIT = /door|lid|valve|gate|t[üu]r|klappe|porte|puerta/i;

export const isFault = (cell: string): boolean => cell !== '' && FAULT.test(cell) && !NO_CIRCUIT.test(cell);
