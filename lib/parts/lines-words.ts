/** `lines 1, 3` */
export function linesWords(lines: readonly number[]): string {
  if (lines.length === 0) return '';
  return `${lines.length === 1 ? 'line' : 'lines'} ${lines.join(', ')}`;
}
