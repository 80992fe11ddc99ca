import type { Box } from '../../page';
import { isReadable, plainLetters } from './letters';
import type { Line, PlacedGlyph } from './lines';

export interface LaidWord {
  readonly text: string;
  readonly box: Box;
}

export interface LaidLine {
  readonly words: readonly LaidWord[];
  /** Underscores and rows of dots that stand for a line to write on. */
  readonly leaders: readonly Box[];
}

interface Token {
  readonly text: string;
  readonly from: number;
  readonly to: number;
  readonly size: number;
  /** Whether the file has a space before it, and not only a distance. */
  readonly afterSpace: boolean;
}

/** A distance of this part of the font's size, beyond what the file asks for between all characters, parts words. */
const WORD_GAP = 0.17;
const CAPITAL_HEIGHT = 0.73;
const DESCENT = 0.21;
const DESCENDERS = /[gjpqyQ,;()[\]{}|@$/\\_]/;
/** Spaced-out headings: at least so many single letters at one distance. */
const FEWEST_SPACED = 4;
const WIDEST_SPACED = 0.9;
const EVEN = 0.08;

/** Splits a line into words with boxes on the upright page. */
export function layWords(line: Line): LaidLine {
  const leaders: Box[] = [];
  const tokens: Token[] = [];
  let open: PlacedGlyph[] = [];
  let afterSpace = false;
  const close = () => {
    const token = tokenOf(open, afterSpace);
    if (token) tokens.push(token);
    if (open.length > 0) afterSpace = false;
    open = [];
  };

  for (let i = 0; i < line.glyphs.length; i++) {
    const glyph = line.glyphs[i] as PlacedGlyph;
    const run = leaderAt(line.glyphs, i);
    if (run > 0) {
      close();
      const last = line.glyphs[i + run - 1] as PlacedGlyph;
      leaders.push(
        boxOn(line, { from: glyph.from, to: last.to, up: 0.06 * glyph.size, down: 0.12 * glyph.size }),
      );
      i += run - 1;
      continue;
    }
    if (/^\s*$/.test(glyph.text)) {
      close();
      afterSpace = true;
      continue;
    }
    const before = open.at(-1);
    if (before && glyph.from - before.to - before.spacing > WORD_GAP * Math.min(before.size, glyph.size))
      close();
    open.push(glyph);
  }
  close();

  return { leaders, words: joinSpacedOut(tokens).map((token) => wordOn(line, token)) };
}

/** How many characters of a row of underscores or dots begin here; 0 when none does. */
function leaderAt(glyphs: readonly PlacedGlyph[], start: number): number {
  const sign = glyphs[start]?.text;
  if (sign !== '_' && sign !== '.' && sign !== '…') return 0;
  let end = start;
  while (glyphs[end]?.text === sign) end++;
  return end - start >= (sign === '.' ? 4 : 2) ? end - start : 0;
}

function tokenOf(glyphs: readonly PlacedGlyph[], afterSpace: boolean): Token | null {
  const first = glyphs[0];
  const last = glyphs.at(-1);
  if (!first || !last) return null;
  const text = plainLetters(glyphs.map((glyph) => (isReadable(glyph.text) ? glyph.text : '')).join(''));
  if (text === '') return null;
  return { text, from: first.from, to: last.to, size: Math.max(first.size, last.size), afterSpace };
}

/** `C E R T I F I C A T E` is one word; `1 2 3 4 5` with plain spaces are five. */
function joinSpacedOut(tokens: readonly Token[]): Token[] {
  const joined: Token[] = [];
  // Once a heading is known to be spaced out, its short words are too.
  let fewest = FEWEST_SPACED;
  for (let i = 0; i < tokens.length;) {
    const end = endOfSpacedOut(tokens, i);
    const members = tokens.slice(i, end);
    if (members.length >= fewest) {
      const first = members[0] as Token;
      const last = members.at(-1) as Token;
      joined.push({ ...first, text: members.map((token) => token.text).join(''), to: last.to });
      fewest = 2;
    } else {
      joined.push(...members);
    }
    i = end;
  }
  return joined;
}

/** Single letters at an even distance, or at an even pitch, from `start` on. */
function endOfSpacedOut(tokens: readonly Token[], start: number): number {
  const first = tokens[start] as Token;
  const second = tokens[start + 1];
  if (!second || first.text.length !== 1 || second.text.length !== 1) return start + 1;
  const gap = second.from - first.to;
  const pitch = middleOf(second) - middleOf(first);
  if (gap > WIDEST_SPACED * first.size) return start + 1;

  let end = start + 1;
  for (; end < tokens.length; end++) {
    const [before, token] = [tokens[end - 1] as Token, tokens[end] as Token];
    const even =
      Math.abs(token.from - before.to - gap) <= EVEN * first.size ||
      Math.abs(middleOf(token) - middleOf(before) - pitch) <= EVEN * first.size;
    if (token.text.length !== 1 || !even) break;
  }
  const members = tokens.slice(start, end);
  const plainNumbers =
    members.every((token) => /\d/.test(token.text)) && members.slice(1).every((t) => t.afterSpace);
  return plainNumbers ? start + 1 : end;
}

const middleOf = (token: Token) => (token.from + token.to) / 2;

function wordOn(line: Line, token: Token): LaidWord {
  const down = DESCENDERS.test(token.text) ? DESCENT * token.size : 0.02 * token.size;
  return {
    text: token.text,
    box: boxOn(line, { from: token.from, to: token.to, up: CAPITAL_HEIGHT * token.size, down }),
  };
}

function boxOn(line: Line, extent: { from: number; to: number; up: number; down: number }): Box {
  const [ux, uy] = line.along;
  const { from, to, up, down } = extent;
  const xs: number[] = [];
  const ys: number[] = [];
  for (const a of [from, to]) {
    for (const c of [line.across - up, line.across + down]) {
      xs.push(a * ux - c * uy);
      ys.push(a * uy + c * ux);
    }
  }
  return [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)];
}
