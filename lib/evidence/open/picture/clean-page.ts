import type { Grey, PixelBox } from './grey';
import { findComponents, type Component } from './find-components';
import { findInk, inkThreshold } from './find-ink';
import { findRules } from './find-rules';
import { findSpecks } from './find-specks';
import { invertBox, wipeBox, wipeInk } from './wipe';

export interface CleanPage {
  /** Text alone, dark on white: no rules, no dark areas, no dust. */
  readonly picture: Grey;
  readonly rules: readonly PixelBox[];
  /** Pieces of ink that are left. */
  readonly components: readonly Component[];
}

/** Greys from which on levelled paper is plain white, and up to which ink is plain black. */
const WHITE = 222;
const BLACK = 40;

/** Makes a straightened page fit for recognition. */
export function cleanPage(page: Grey, dpi: number): CleanPage {
  const picture = stretch(page);
  const threshold = inkThreshold(picture);
  const first = findRules(findInk(picture, threshold), dpi);
  for (const area of first.areas) invertBox(picture, area);

  const ink = findInk(picture, threshold);
  const rules = first.areas.length > 0 ? findRules(ink, dpi) : first;
  wipeInk(picture, rules.ink, ink);

  const left = findInk(picture, threshold);
  const components = findComponents(left);
  const specks = findSpecks(components, dpi);
  for (const { box } of specks) wipeBox(picture, [box[0] - 1, box[1] - 1, box[2] + 1, box[3] + 1]);
  return { picture, rules: rules.lines, components };
}

function stretch({ width, height, data }: Grey): Grey {
  const table = new Uint8Array(256);
  for (let value = 0; value < 256; value++) {
    table[value] = Math.min(255, Math.max(0, ((value - BLACK) * 255) / (WHITE - BLACK)));
  }
  const out = new Uint8Array(data.length);
  for (let i = 0; i < data.length; i++) out[i] = table[data[i] as number] as number;
  return { width, height, data: out };
}
