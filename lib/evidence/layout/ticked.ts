import type { Word } from '../page';
import { heightOf } from './box';

interface Tick {
  readonly ticked: boolean;
  /** Words from here up to `until` make the box. */
  readonly from: number;
  readonly until: number;
}

const TICKED = /^(?:\[[xX✓✔√*]\]|\{[xX]\}|[☑☒✓✔✗✘■◼⊠]|_+[xX✓]_+|<[xX]>)$/u;
const EMPTY = /^(?:\[_*\]|\{\}|[☐□▢◻▯])$/u;
const ROUND = /^\((?:[xX✓✔]?|_+)\)$/u;

/**
 * The rows of a page without the choices that nobody ticked: of "[X] Type I [ ] Type II" the first stays, and the boxes go.
 * A page without a ticked box stays as it is.
 */
export function tickedOnly(rows: readonly Word[][]): Word[][] {
  const found = rows.map(ticksOf);
  const all = found.flat();
  if (!all.some(({ ticked }) => ticked) || !all.some(({ ticked }) => !ticked)) return [...rows];
  return rows.map((row, index) => withoutChoices(row, found[index] ?? []));
}

function ticksOf(row: readonly Word[]): Tick[] {
  const ticks: Tick[] = [];
  const isBlank = row.some(({ text }) => /^_+[xX✓]_+$/u.test(text));
  for (let at = 0; at < row.length; at += 1) {
    // A box may be cut into its brackets and what stands in them.
    for (const length of [1, 2, 3]) {
      const text = row
        .slice(at, at + length)
        .map((word) => word.text)
        .join('');
      const ticked = TICKED.test(text) || (ROUND.test(text) && /[xX✓✔]/u.test(text));
      if (!ticked && !EMPTY.test(text) && !ROUND.test(text) && !(isBlank && /^_{2,}$/.test(text))) continue;
      ticks.push({ ticked, from: at, until: at + length });
      at += length - 1;
      break;
    }
  }
  return ticks;
}

function withoutChoices(row: readonly Word[], ticks: readonly Tick[]): Word[] {
  if (ticks.length === 0) return [...row];
  const dropped = new Set<number>();
  const behind = stand(row, ticks);
  ticks.forEach((tick, turn) => {
    for (let at = tick.from; at < tick.until; at += 1) dropped.add(at);
    if (tick.ticked) return;
    const end = behind ? (ticks[turn - 1]?.until ?? 0) : (ticks[turn + 1]?.from ?? row.length);
    const step = behind ? -1 : 1;
    let last: Word | undefined;
    for (let at = behind ? tick.from - 1 : tick.until; behind ? at >= end : at < end; at += step) {
      const word = row[at];
      if (!word || word.text.endsWith(':') || (last && gap(last, word) > heightOf(word.box))) break;
      dropped.add(at);
      last = word;
    }
  });
  return row.filter((_, index) => !dropped.has(index));
}

const gap = (a: Word, b: Word): number => Math.max(a.box[0], b.box[0]) - Math.min(a.box[2], b.box[2]);

/** Whether each box stands behind its choice: the last of the row does, or they are nearer to the word before them. */
function stand(row: readonly Word[], ticks: readonly Tick[]): boolean {
  const last = ticks[ticks.length - 1];
  if (last?.until === row.length) return true;
  const mean = (gaps: readonly number[]): number =>
    gaps.reduce((sum, one) => sum + one, 0) / Math.max(1, gaps.length);
  const before = ticks.flatMap(({ from }) => {
    const [word, box] = [row[from - 1], row[from]];
    return word && box ? [gap(word, box)] : [];
  });
  const after = ticks.flatMap(({ until }) => {
    const [box, word] = [row[until - 1], row[until]];
    return word && box ? [gap(box, word)] : [];
  });
  return before.length === ticks.length && mean(before) < 0.6 * mean(after);
}
