import type { Grey, Ink, PixelBox } from './grey';
import { findComponents, type Component } from './find-components';
import { findInk, inkThreshold } from './find-ink';
import { findRules } from './find-rules';
import { findSpecks } from './find-specks';
import { invertBox, wipeBox, wipeInk } from './wipe';

export interface CleanPage {
  /** Text alone, dark on white: no rules, no dark areas, no dust. */
  readonly picture: Grey;
  readonly rules: readonly PixelBox[];
  /** The ink that is left when the rules are off, and its pieces. */
  readonly ink: Ink;
  readonly components: readonly Component[];
}

/** Makes a straightened page fit for recognition. */
export function cleanPage(page: Grey, dpi: number): CleanPage {
  const picture: Grey = { ...page, data: page.data.slice() };
  const threshold = inkThreshold(picture);
  let ink = findInk(picture, threshold);
  let rules = findRules(ink, dpi);
  if (rules.areas.length > 0) {
    for (const area of rules.areas) invertBox(picture, area);
    ink = findInk(picture, threshold);
    rules = findRules(ink, dpi);
  }
  wipeInk(picture, rules.ink, ink);
  const left = inkWithout(ink, rules.ink);
  const components = findComponents(left);
  const specks = findSpecks(components, dpi);
  for (const { box } of specks) wipeBox(picture, [box[0] - 1, box[1] - 1, box[2] + 1, box[3] + 1]);
  return { picture, rules: rules.lines, ink: left, components };
}

function inkWithout({ width, height, data }: Ink, taken: Ink): Ink {
  const left = new Uint8Array(data.length);
  for (let at = 0; at < data.length; at++) left[at] = (data[at] as number) & ~(taken.data[at] as number);
  return { width, height, data: left };
}
