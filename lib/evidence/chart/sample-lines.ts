import type { PlainBytes } from './plain-bytes';

/** Some lines of a file: its beginning without a break, and a few from further on. */
export interface SampleLines {
  readonly head: readonly string[];
  readonly further: readonly string[];
}

const HEAD = 64_000;
const WINDOW = 6_000;
const WINDOWS = 8;

/** The lines from which the dialect is told, whatever the size of the file. */
export function sampleLines({ bytes, textOf }: PlainBytes): SampleLines {
  const cut = (from: number, to: number) => textOf(from, Math.min(to, bytes.length)).split(/\r\n|\n|\r/);
  // A window must not fall into the head or into the one before it: the rows must stay in their order.
  if (bytes.length <= 2 * HEAD) return { head: cut(0, bytes.length), further: [] };
  const head = cut(0, HEAD);
  head.pop();
  const further: string[] = [];
  for (let at = 1; at <= WINDOWS; at++) {
    const from = Math.floor(HEAD + ((bytes.length - HEAD - WINDOW) * at) / WINDOWS);
    // The first and the last line of a window are cut.
    if (from > 0) further.push(...cut(from, from + WINDOW).slice(1, -1));
  }
  return { head, further };
}
