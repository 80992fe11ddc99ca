/**
 * Small letters without their accents, which recognition mostly loses. As long as the text, so that places in it stay.
 *
 * @example `FÄLLIG` and `Fallig` are both `fallig`
 */
export const unaccented = (text: string): string =>
  [...text].map((sign) => sign.toLowerCase().normalize('NFD').charAt(0).padEnd(sign.length, ' ')).join('');
