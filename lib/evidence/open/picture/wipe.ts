import type { Grey, Ink, PixelBox } from './grey';

const PAPER = 255;
const GRAIN = 0.2;

/** Paints paper over the marked ink and the grey fringe around it, in place. Ink beside it that is not marked stays. */
export function wipeInk(picture: Grey, marked: Ink, ink: Ink): void {
  const { width, height, data } = picture;
  for (let y = 0; y < height; y++) {
    for (let x = 0, at = y * width; x < width; x++, at++) {
      if (marked.data[at] === 0) continue;
      data[at] = PAPER;
      if (x > 0 && ink.data[at - 1] === 0) data[at - 1] = PAPER;
      if (x < width - 1 && ink.data[at + 1] === 0) data[at + 1] = PAPER;
      if (y > 0 && ink.data[at - width] === 0) data[at - width] = PAPER;
      if (y < height - 1 && ink.data[at + width] === 0) data[at + width] = PAPER;
    }
  }
}

/** Paints paper over a box, in place. */
export function wipeBox({ width, height, data }: Grey, [left, top, right, bottom]: PixelBox): void {
  const [from, to] = [Math.max(0, left), Math.min(width, right)];
  for (let y = Math.max(0, top); y < Math.min(height, bottom); y++)
    data.fill(PAPER, y * width + from, y * width + to);
}

/**
 * Turns white letters on a dark area into dark ones on paper, in place.
 *
 * The area's rim, where its edge is soft, becomes paper.
 */
export function invertBox(picture: Grey, [left, top, right, bottom]: PixelBox): void {
  const { width, height, data } = picture;
  const rim = 2;
  const counts = new Uint32Array(256);
  for (let y = top; y < bottom; y++) {
    for (let x = left; x < right; x++) {
      const value = data[y * width + x] as number;
      counts[value] = (counts[value] as number) + 1;
    }
  }
  // The print on the ground is lighter by far; its own grain is not print.
  const usual = counts.indexOf(Math.max(...counts));
  const ground = usual + (PAPER - usual) * GRAIN;
  for (let y = Math.max(0, top - rim); y < Math.min(height, bottom + rim); y++) {
    for (let x = Math.max(0, left - rim); x < Math.min(width, right + rim); x++) {
      const inside = x >= left + rim && x < right - rim && y >= top + rim && y < bottom - rim;
      const at = y * width + x;
      const lighter = Math.max(0, (data[at] as number) - ground);
      data[at] = inside ? PAPER - (lighter * PAPER) / Math.max(1, PAPER - ground) : PAPER;
    }
  }
}
