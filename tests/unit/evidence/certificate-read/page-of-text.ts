import type { Mark, OpenedFile, Page, Word } from '@/lib/evidence/page';

/**
 * A page from lines of text, each letter 6 points wide and each line 14 high, as a typewriter would write it. Two spaces
 * or more stay as they are: they part columns.
 */
export function pageOf(lines: readonly string[], { number = 1, marks = [] as readonly Mark[] } = {}): Page {
  const words = lines.flatMap((line, row) =>
    [...line.matchAll(/\S+/g)].map(({ 0: text, index }): Word => {
      const [left, top] = [40 + index * 6, 40 + row * 14];
      return { text, box: [left, top, left + text.length * 6, top + 10], confidence: 1 };
    }),
  );
  return { number, width: 612, height: 792, turned: 0, origin: 'text_layer', words, marks, hidden: [] };
}

export const fileOf = (...pages: readonly Page[]): OpenedFile => ({
  sha256: 'a'.repeat(64),
  kind: 'digital',
  recognised: false,
  pages,
});
