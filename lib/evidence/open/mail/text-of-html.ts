const ENTITIES: Readonly<Record<string, string>> = {
  amp: '&',
  lt: '<',
  gt: '>',
  quot: '"',
  apos: "'",
  nbsp: ' ',
  deg: '°',
  micro: 'µ',
  plusmn: '±',
  ndash: '–',
  mdash: '—',
  le: '≤',
  ge: '≥',
  times: '×',
  frac12: '½',
};
/** Column of a table's cells in characters, so that rows of a table stay in step. */
const CELL = 4;

/**
 * The words a reader of an HTML mail sees, as plain text: rows of tables on one line, cells apart.
 *
 * Nothing is fetched or run. What is styled away is left out.
 */
export function textOfHtml(html: string): string {
  const visible = html
    .replace(/<!--[\s\S]*?-->/g, '')
    .replace(/<(script|style|head|title|template|noscript)\b[\s\S]*?<\/\1\s*>/gi, '')
    .replace(
      /<(\w+)\b[^>]*style\s*=\s*["'][^"']*(display\s*:\s*none|visibility\s*:\s*hidden|font-size\s*:\s*0)[^"']*["'][^>]*>[\s\S]*?<\/\1\s*>/gi,
      '',
    );
  const text = visible
    .replace(/\s+/g, ' ')
    .replace(/<\/t[dh]\s*>/gi, ' '.repeat(CELL))
    .replace(/<(br|\/p|\/div|\/tr|\/h[1-6]|\/li|\/table|hr)\b[^>]*>/gi, '\n')
    .replace(/<[^>]*>/g, '');
  return text
    .replace(/&(#x[0-9a-f]+|#\d+|\w+);/gi, (whole, name: string) => entity(name) ?? whole)
    .split('\n')
    .map((line) => line.trim())
    .join('\n')
    .replace(/\n{3,}/g, '\n\n');
}

function entity(name: string): string | undefined {
  if (!name.startsWith('#')) return ENTITIES[name.toLowerCase()];
  const code = /^#x/i.test(name) ? parseInt(name.slice(2), 16) : parseInt(name.slice(1), 10);
  return code > 0 && code <= 0x10ffff ? String.fromCodePoint(code) : undefined;
}
