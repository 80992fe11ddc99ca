/** Signs that print, copiers and typewriters use for one another, each one character as before. */
const ALIKE: Readonly<Record<string, string>> = {
  '1': 'i',
  l: 'i',
  '|': 'i',
  '!': 'i',
  '0': 'o',
  '5': 's',
  '8': 'b',
  ß: 's',
  '’': ' ',
  "'": ' ',
  '`': ' ',
  '–': '-',
  '—': '-',
  '−': '-',
  '：': ':',
};

/**
 * A text in which two spellings that a tired eye or a machine takes for one another are one: small letters, no accents,
 * I, l and 1 the same. As long as the text, so that places in it stay.
 */
export const folded = (text: string): string =>
  [...text].map((sign) => foldedSign(sign).padEnd(sign.length, ' ')).join('');

function foldedSign(sign: string): string {
  const small = sign.toLowerCase().normalize('NFD').charAt(0);
  return ALIKE[sign] ?? ALIKE[small] ?? small;
}
