const escaped = (text: string): string => text.replace(/[\\%_]/g, (sign) => `\\${sign}`);

/**
 * What a typed number may begin with: as typed, in capitals, and bare digits with the prefix they are printed with.
 *
 * @example patternsOf('404') // ['404%', 'B-0404%', 'L-0404%', 'NC-0404%']
 */
export function patternsOf(text: string): string[] {
  const typed = text.trim();
  const patterns = [typed, typed.toUpperCase()];
  if (/^\d+$/.test(typed))
    patterns.push(...['B-', 'L-', 'NC-'].map((prefix) => prefix + typed.padStart(4, '0')));
  return [...new Set(patterns)].map((pattern) => `${escaped(pattern)}%`);
}

/** For names and words: anywhere in them. Used with `ilike`. */
export const contains = (text: string): string => `%${escaped(text.trim())}%`;
