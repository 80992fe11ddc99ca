/**
 * What is in a batch, in words: `41 chine angles`, `16 strut bolts, 1/2 inch`, `60 pieces of 5 parts`.
 *
 * Names of parts are English and singular, as drawings have them; what stands after a comma is a measure or a place.
 */
export function contentsWords(pieces: number, parts: readonly string[]): string {
  const [name] = parts;
  if (name === undefined) return 'nothing yet';
  const count = pieces.toLocaleString('en-US');
  if (parts.length > 1) return `${count} pieces of ${parts.length} parts`;
  const [noun = '', ...rest] = name.split(',');
  return [`${count} ${pieces === 1 ? noun : pluralOf(noun)}`, ...rest].join(',').toLowerCase();
}

function pluralOf(noun: string): string {
  if (/(?:s|x|z|ch|sh)$/i.test(noun)) return `${noun}es`;
  return /[^aeiou]y$/i.test(noun) ? `${noun.slice(0, -1)}ies` : `${noun}s`;
}
