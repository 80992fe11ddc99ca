import type { Page, Word } from '../page';

/** A monospace grid: columns typed with spaces stay columns. Points. */
const CHARACTER_WIDTH = 6;
const LINE_HEIGHT = 12;
const MARGIN = 36;
const LETTER_HEIGHT = 8;
const LINES_ON_A_PAGE = 60;
const TAB = 8;
const WIDTH = 612;

/**
 * Lays plain text out on pages as a typewriter would: one character is 6 points wide, a line 12 points high.
 *
 * A form feed begins a new page. Pages are numbered from `firstNumber`.
 */
export function layOutText(text: string, firstNumber = 1): Page[] {
  const pages: string[][] = [];
  for (const section of text.replace(/\r\n?/g, '\n').split('\f')) {
    const lines = section.replace(/\s+$/, '').split('\n').map(expandTabs);
    for (let i = 0; i < lines.length; i += LINES_ON_A_PAGE) pages.push(lines.slice(i, i + LINES_ON_A_PAGE));
  }
  return pages
    .filter((lines) => lines.some((line) => line.trim() !== ''))
    .map((lines, i) => layOutPage(lines, firstNumber + i));
}

function layOutPage(lines: readonly string[], number: number): Page {
  const words: Word[] = [];
  let widest = 0;
  lines.forEach((line, row) => {
    const bottom = MARGIN + (row + 1) * LINE_HEIGHT - 2;
    for (const match of line.matchAll(/\S+/g)) {
      const left = MARGIN + match.index * CHARACTER_WIDTH;
      const right = left + match[0].length * CHARACTER_WIDTH;
      widest = Math.max(widest, right);
      words.push({ text: match[0], box: [left, bottom - LETTER_HEIGHT, right, bottom], confidence: 1 });
    }
  });
  return {
    number,
    width: Math.max(WIDTH, widest + MARGIN),
    height: 2 * MARGIN + LINES_ON_A_PAGE * LINE_HEIGHT,
    turned: 0,
    origin: 'plain_text',
    words,
    marks: [],
    hidden: [],
  };
}

function expandTabs(line: string): string {
  let out = '';
  for (const character of line) out += character === '\t' ? ' '.repeat(TAB - (out.length % TAB)) : character;
  return out;
}
