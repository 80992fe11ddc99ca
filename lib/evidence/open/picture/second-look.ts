import type { Component } from './find-components';
import type { Ink, PixelBox } from './grey';

/** Signs that a recogniser mixes up between letters and figures, and that differ in form. */
const LOOKS_LIKE_ONE = /[1Il|L]/;
const LOOKS_LIKE_NOUGHT = /[0O]/;
/** How much wider than a figure the letter O is, and how little wider a nought may be. */
const WIDE_AS_A_LETTER = 1.36;
const WIDE_AS_A_FIGURE = 1.2;
/** Pixels across below which a foot, a serif and a flag cannot be told apart. */
const FINE_ENOUGH = 9;

/**
 * Looks again at the form of signs in a word with figures: `14382` is `L4382` when its first sign has a foot to the right
 * and nothing above it; `2024-0` is `2024-O` when its last sign is wider than its figures.
 *
 * `components` are the pieces of ink within the word. Where they cannot be matched with the word's signs one to one, as
 * in broken or touching print, the word is given back as it is.
 */
export function lookAgain(text: string, box: PixelBox, components: readonly Component[], ink: Ink): string {
  const within = components.filter((component) => liesIn(component, box));
  const tall = Math.max(0, ...within.map(({ box: b }) => b[3] - b[1]));
  const letters = within
    .filter(({ box: b }) => b[3] - b[1] > 0.62 * tall)
    .sort((a, b) => a.box[0] - b.box[0]);
  if (letters.length === 1 && /^([A-Za-z])\1$/i.test(text)) return text.charAt(0).toUpperCase();
  if (!/\d/.test(text) || !/[1Il|L0O]/.test(text)) return text;

  const signs = [...text];
  const places = signs.flatMap((sign, i) => (/[\p{L}\p{N}|]/u.test(sign) ? [i] : []));
  if (places.length !== letters.length) return text;
  const figureWidth = widthOfFigures(signs, places, letters);
  places.forEach((place, i) => {
    const sign = signs[place] as string;
    const letter = letters[i] as Component;
    if (LOOKS_LIKE_ONE.test(sign)) signs[place] = formOfOne(letter, ink) ?? sign;
    else if (LOOKS_LIKE_NOUGHT.test(sign) && figureWidth !== null) {
      const wide = (letter.box[2] - letter.box[0]) / figureWidth;
      if (wide > WIDE_AS_A_LETTER) signs[place] = 'O';
      else if (wide < WIDE_AS_A_FIGURE) signs[place] = '0';
    }
  });
  return signs.join('');
}

const liesIn = ({ box }: Component, word: PixelBox) => {
  const [x, y] = [(box[0] + box[2]) / 2, (box[1] + box[3]) / 2];
  return x >= word[0] && x <= word[2] && y >= word[1] && y <= word[3];
};

/** The middle width of the word's figures, without 1 and 0; null with fewer than two of them. */
function widthOfFigures(
  signs: readonly string[],
  places: readonly number[],
  letters: readonly Component[],
): number | null {
  const widths = places
    .flatMap((place, i) => (/[2-9]/.test(signs[place] ?? '') ? [letters[i] as Component] : []))
    .map(({ box }) => box[2] - box[0])
    .sort((a, b) => a - b);
  return widths.length < 2 ? null : (widths[widths.length >> 1] as number);
}

/** What an upright stroke is: L has a foot to the right alone, I is the same on both sides, 1 has a flag to the left. */
function formOfOne({ box }: Component, { width: stride, data }: Ink): 'L' | 'I' | '1' | null {
  const [left, top, right, bottom] = box;
  const [width, height] = [right - left, bottom - top];
  if (width < FINE_ENOUGH || width < 0.22 * height || width > 0.95 * height) return null;
  const spread = (from: number, to: number): { left: number; right: number } => {
    let [least, most] = [width, 0];
    for (let y = Math.floor(top + from * height); y < top + to * height; y++) {
      for (let x = 0; x < width; x++) {
        if (data[y * stride + left + x] === 0) continue;
        least = Math.min(least, x);
        most = Math.max(most, x + 1);
      }
    }
    return { left: least / width, right: most / width };
  };
  const [head, stem, foot] = [spread(0, 0.3), spread(0.4, 0.7), spread(0.85, 1)];
  if (stem.right - stem.left > 0.6 || stem.right <= stem.left) return null;
  const stemAt = (stem.left + stem.right) / 2;
  if (stemAt < 0.42 && stem.left < 0.3 && head.right < 0.72 && foot.right > 0.9 && foot.left < 0.25)
    return 'L';
  const [flag, spar] = [stem.left - head.left, head.right - stem.right];
  if (flag > 0.15 && spar < 0.07) return '1';
  if (flag > 0.15 && spar > 0.15 && Math.abs(flag - spar) < 0.12) return 'I';
  return null;
}
