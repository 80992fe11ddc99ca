import { sql, type SQL, type SQLWrapper } from 'drizzle-orm';

/**
 * Whether a number begins with what was typed, in any of the ways it may be typed. Not by `like`, which row-level
 * security keeps from being answered by an index.
 */
export function beginsWith(column: SQLWrapper, text: string): SQL {
  const ways = beginningsOf(text).map((beginning) => sql`starts_with(${column}, ${beginning})`);
  return sql`(${sql.join(ways, sql` or `)})`;
}

/**
 * What a typed number may begin with: as typed, in capitals, and bare digits with the prefix they are printed with.
 *
 * @example beginningsOf('404') // ['404', 'B-0404', 'L-0404', 'NC-0404']
 */
function beginningsOf(text: string): string[] {
  const typed = text.trim();
  const beginnings = [typed, typed.toUpperCase()];
  if (/^\d+$/.test(typed))
    beginnings.push(...['B-', 'L-', 'NC-'].map((prefix) => prefix + typed.padStart(4, '0')));
  return [...new Set(beginnings)];
}

const escaped = (text: string): string => text.replace(/[\\%_]/g, (sign) => `\\${sign}`);

/** For names and words: anywhere in them. Used with `ilike`. */
export const contains = (text: string): string => `%${escaped(text.trim())}%`;
