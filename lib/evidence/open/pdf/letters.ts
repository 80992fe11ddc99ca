const LIGATURES: Readonly<Record<string, string>> = {
  '\uFB00': 'ff',
  '\uFB01': 'fi',
  '\uFB02': 'fl',
  '\uFB03': 'ffi',
  '\uFB04': 'ffl',
  '\uFB05': 'st',
  '\uFB06': 'st',
};
const NOT_SEEN = /[\u200B-\u200F\u202A-\u202E\u2060-\u2064\u2066-\u2069\uFEFF]/g;
/** Control characters, the private area and the sign for an unknown character tell nothing. */
const UNREADABLE = /[\u0000-\u0008\u000E-\u001F\u007F-\u009F\uE000-\uF8FF\uFFFD]/;

/** The letters a person sees: ligatures taken apart, marks without width dropped, full-width signs made plain. */
export function plainLetters(text: string): string {
  if (/^[\x20-\x7E]*$/.test(text)) return text;
  return text
    .replace(NOT_SEEN, '')
    .replace(/[\uFB00-\uFB06]/g, (sign) => LIGATURES[sign] ?? sign)
    .replace(/[\uFF01-\uFF5E]/g, (sign) => String.fromCharCode(sign.charCodeAt(0) - 0xfee0))
    .replace(/\u00AD/g, '-');
}

/** Whether a font says of a character which letter it is. */
export const isReadable = (text: string) => text !== '' && !UNREADABLE.test(text);
