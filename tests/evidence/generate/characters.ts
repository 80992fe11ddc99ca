/** Text in columns of so many letters, as a line printer or a mail sets it; what does not fit pushes on. */
export const columnsOf = (widths: readonly number[], cells: readonly string[]): string =>
  cells
    .map((cell, index) => cell.padEnd((widths[index] ?? 0) - 1))
    .join(' ')
    .trimEnd();

/** As wide as the widest of each column, and two more. */
export const widthsOf = (rows: readonly (readonly string[])[]): number[] =>
  (rows[0] ?? []).map((_, column) => 2 + Math.max(...rows.map((row) => (row[column] ?? '').length)));

/** Text broken at so many letters. */
export function broken(text: string, width: number): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    if (line !== '' && line.length + 1 + word.length > width) {
      lines.push(line);
      line = word;
    } else line = line === '' ? word : `${line} ${word}`;
  }
  return [...lines, line];
}
