import { isFault, isNumber, numberIn, type Decimal, type Delimiter } from './cells';
import { monthOf } from './month-words';
import type { PlainBytes } from './plain-bytes';
import { SLOT } from './time-shape';

const [TAB, LINE_FEED, RETURN, SPACE, QUOTE, PLUS, COMMA, MINUS, POINT] = [
  9, 10, 13, 32, 34, 43, 44, 45, 46,
] as const;
const [ZERO, NINE, LETTER_A, LETTER_M, LETTER_P, LETTER_Z, LOWER] = [48, 57, 97, 109, 112, 122, 32] as const;
const POWERS = Array.from({ length: 16 }, (_, power) => 10 ** power);
/** Whole numbers of so many digits are exact. */
const EXACT_DIGITS = 15;

/** The recorder says that it could not measure; a cell without anything is NaN. */
export const FAULTY = Number.POSITIVE_INFINITY;

/**
 * Reads cells straight from the bytes, one after the other, without making a string of what is a plain number or time.
 * A million rows would otherwise be ten million strings.
 */
export class RowScanner {
  at = 0;
  /** Digits behind the decimal sign of the number that was read last. */
  scale = 0;
  /** The groups of the times of this row, by their slot. */
  readonly groups = new Float64Array(16);
  /** Hours to add for the afternoon; -1 where the row does not say. */
  afternoon = -1;
  private readonly bytes: Uint8Array;
  private readonly textOf: PlainBytes['textOf'];
  private readonly delimiter: number;
  private readonly spaced: boolean;
  private readonly decimalSign: Decimal;
  private readonly decimal: number;
  private readonly group: number;

  constructor(plain: PlainBytes, delimiter: Delimiter, decimal: Decimal) {
    this.bytes = plain.bytes;
    this.textOf = plain.textOf;
    this.spaced = delimiter === ' ';
    this.delimiter = delimiter.charCodeAt(0);
    this.decimalSign = decimal;
    this.decimal = decimal === '.' ? POINT : COMMA;
    this.group = decimal === '.' ? COMMA : POINT;
    this.groups[SLOT.compactTime] = -1;
  }

  /** Whether the line is over. */
  get atLineEnd(): boolean {
    const byte = this.bytes[this.at] ?? LINE_FEED;
    return byte === LINE_FEED || byte === RETURN;
  }

  /** In a table set with spaces a cell begins behind any number of them. */
  toCell(): void {
    if (!this.spaced) return;
    let byte = this.bytes[this.at];
    while (byte === SPACE || byte === TAB) byte = this.bytes[++this.at];
  }

  /** Over the rest of a cell and its delimiter. */
  skipCell(): void {
    const { bytes, delimiter, spaced } = this;
    let at = this.at;
    let quoted = false;
    for (;;) {
      const byte = bytes[at] ?? LINE_FEED;
      if (byte === LINE_FEED || byte === RETURN) break;
      if (byte === QUOTE) quoted = !quoted;
      else if (!quoted && (byte === delimiter || (spaced && byte === TAB))) {
        at++;
        break;
      }
      at++;
    }
    this.at = at;
  }

  skipLine(): void {
    while (!this.atLineEnd) this.at++;
  }

  /** Over the ends of this line and of the empty ones behind it; false at the end of the file. */
  toNextLine(): boolean {
    const { bytes } = this;
    while (bytes[this.at] === LINE_FEED || bytes[this.at] === RETURN) this.at++;
    return this.at < bytes.length;
  }

  /** The number in this cell: NaN where there is none, `FAULTY` where it says that it could not be measured. */
  number(): number {
    const { bytes, decimal, group } = this;
    const start = this.at;
    let at = start;
    let byte = bytes[at] ?? LINE_FEED;
    while (byte === SPACE || byte === QUOTE) byte = bytes[++at] ?? LINE_FEED;
    const negative = byte === MINUS;
    if (negative || byte === PLUS) byte = bytes[++at] ?? LINE_FEED;
    let [whole, digits, scale] = [0, 0, 0];
    for (;;) {
      if (byte >= ZERO && byte <= NINE) {
        whole = whole * 10 + (byte - ZERO);
        digits++;
      } else if (byte !== group || digits === 0 || byte === this.delimiter || !this.threeDigitsAfter(at))
        break;
      byte = bytes[++at] ?? LINE_FEED;
    }
    if (byte === decimal) {
      byte = bytes[++at] ?? LINE_FEED;
      while (byte >= ZERO && byte <= NINE) {
        whole = whole * 10 + (byte - ZERO);
        scale++;
        byte = bytes[++at] ?? LINE_FEED;
      }
    }
    const read = digits + scale;
    if (read === 0 || read > EXACT_DIGITS || (byte !== this.delimiter && !this.isUnitBehind(at))) {
      this.at = start;
      return this.oddNumber();
    }
    if (byte === this.delimiter) this.at = at + 1;
    else {
      // From the start of the cell, so that its quotes pair.
      this.at = start;
      this.skipCell();
    }
    this.scale = scale;
    const size = scale === 0 ? whole : whole / (POWERS[scale] ?? 1);
    return negative ? -size : size;
  }

  /** Whether nothing but a unit of temperature, a mark or spaces stands between here and the end of the cell. */
  private isUnitBehind(from: number): boolean {
    for (let at = from; at < from + UNIT_BYTES; at++) {
      const byte = this.bytes[at] ?? LINE_FEED;
      if (byte === this.delimiter || byte === LINE_FEED || byte === RETURN) return true;
      if (!(IN_UNIT[byte] ?? 0)) return false;
    }
    return false;
  }

  private threeDigitsAfter(at: number): boolean {
    for (let next = at + 1; next <= at + 3; next++) if (!isDigit(this.bytes[next])) return false;
    return !isDigit(this.bytes[at + 4]);
  }

  /** A cell with a unit, an exponent, spaces or words. */
  private oddNumber(): number {
    const cell = this.text();
    this.scale = 0;
    if (cell === '') return Number.NaN;
    if (isNumber(cell, this.decimalSign)) {
      this.scale = /[eE]/.test(cell)
        ? 0
        : (new RegExp(`\\${this.decimalSign}(\\d+)`).exec(cell)?.[1] ?? '').length;
      return numberIn(cell, this.decimalSign);
    }
    return isFault(cell) ? FAULTY : Number.NaN;
  }

  /** The words of a cell, without quotes and outer spaces. */
  text(): string {
    const from = this.at;
    this.skipCell();
    const ended = this.bytes[this.at - 1] === this.delimiter && this.at > from;
    return this.textOf(from, ended ? this.at - 1 : this.at)
      .replaceAll('"', '')
      .trim();
  }

  /**
   * Takes the groups of digits of a time into their slots.
   *
   * @param slots in the order in which they are written; the last two may be missing where they are below a minute.
   * @returns whether the cell holds such a time.
   */
  time(slots: readonly number[], monthAsWord: boolean): boolean {
    const { bytes, delimiter, spaced, groups } = this;
    let at = this.at;
    let [group, quoted] = [0, false];
    for (;;) {
      const byte = bytes[at] ?? LINE_FEED;
      if (byte === LINE_FEED || byte === RETURN) break;
      if (byte >= ZERO && byte <= NINE) {
        at = this.digits(at, slots[group++] ?? UNUSED);
        continue;
      }
      if (byte === QUOTE) quoted = !quoted;
      else if (!quoted && (byte === delimiter || (spaced && byte === TAB))) {
        at++;
        break;
      } else if (byte > 64) {
        at = this.letters(at, monthAsWord);
        continue;
      }
      at++;
    }
    this.at = at;
    return (
      group >= slots.length ||
      (group > 0 && slots[group] === SLOT.fraction && (groups[SLOT.fraction] = 0) === 0)
    );
  }

  private digits(from: number, slot: number): number {
    const { bytes } = this;
    let [at, whole] = [from, 0];
    for (let byte = bytes[at] ?? 0; byte >= ZERO && byte <= NINE; byte = bytes[++at] ?? 0) {
      whole = whole * 10 + (byte - ZERO);
    }
    this.groups[slot] = slot === SLOT.fraction ? whole / 10 ** (at - from) : whole;
    return at;
  }

  /** AM, PM or the name of a month; other letters say nothing. */
  private letters(from: number, monthAsWord: boolean): number {
    const { bytes } = this;
    let at = from;
    for (let byte = bytes[at] ?? 0; byte > 64;) byte = bytes[++at] ?? 0;
    const first = (bytes[from] ?? 0) | LOWER;
    if (first === LETTER_A || first === LETTER_P) {
      const dotted = bytes[at] === POINT && at === from + 1;
      const second = (bytes[dotted ? at + 1 : from + 1] ?? 0) | LOWER;
      const spacedM = at === from + 1 && bytes[at] === SPACE && ((bytes[at + 1] ?? 0) | LOWER) === LETTER_M;
      if ((second === LETTER_M && (dotted || at === from + 2)) || spacedM) {
        this.afternoon = first === LETTER_P ? 12 : 0;
        return at;
      }
    }
    if (monthAsWord && at - from >= 2 && first <= LETTER_Z) {
      const month = monthOf(this.textOf(from, at));
      if (month > 0) this.groups[SLOT.second] = month;
    }
    return at;
  }
}

const UNIT_BYTES = 10;
/** Quote, space, %, *, !, C, F in both cases, and the bytes of degree signs in both encodings. */
const IN_UNIT = new Uint8Array(256);
for (const byte of [9, 32, 33, 34, 37, 42, 67, 70, 99, 102, 0xb0, 0xba, 0xc2, 0xcb, 0x9a, 0xa0])
  IN_UNIT[byte] = 1;

/** Groups behind the last slot, as those of a zone. */
const UNUSED = 15;

const isDigit = (byte: number | undefined): boolean => byte !== undefined && byte >= ZERO && byte <= NINE;
