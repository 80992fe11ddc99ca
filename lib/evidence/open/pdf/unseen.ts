import type { Box, HiddenText } from '../../page';
import { areaOf, holds, intersection, shareWithin } from '../box';
import { areaEnclosed } from './draw-path';
import type { Colour, Drawn, DrawnRun } from './drawn';

/** Something painted over an area: what follows stands on it, what went before lies under it. */
interface Sheet {
  readonly box: Box;
  /** null: a picture or a pattern, whose colour at one spot is not known. */
  readonly colour: Colour;
  /** Whether nothing beneath it shows, up to its corners. */
  readonly covers: boolean;
  readonly order: number;
}

const PAPER: Colour = [255, 255, 255];
/** Below this ratio of brightness, and this difference in each of red, green and blue, an eye takes two colours for one. */
const LEAST_CONTRAST = 1.15;
const LEAST_DIFFERENCE = 30;
const COVERED = 0.9;
const SMALLEST_SHEET = 12;

/**
 * Parts the text of a page into what a person can see and what not.
 *
 * Runs are cut at spaces first, so that a patch over one word hides one word.
 */
export function partUnseen(drawn: Drawn, page: Box): { seen: DrawnRun[]; unseen: DrawnRun[] } {
  const sheets = sheetsOf(drawn);
  const seen: DrawnRun[] = [];
  const unseen: DrawnRun[] = [];
  for (const run of drawn.runs) {
    if (run.why) {
      unseen.push(run);
      continue;
    }
    const parts = sheets.length > 0 || !insideWholly(run, page) ? cutAtSpaces(run) : [run];
    for (const part of parts) {
      const why = whyUnseen(part, sheets, page);
      if (why) unseen.push({ ...part, why });
      else seen.push(part);
    }
  }
  return { seen, unseen };
}

function sheetsOf(drawn: Drawn): Sheet[] {
  const sheets: Sheet[] = [];
  for (const path of drawn.paths) {
    if (!path.filled || !path.opaque || areaOf(path.box) < SMALLEST_SHEET) continue;
    // Rounded corners still make a ground to write on, but a patch must reach its corners.
    const share = areaEnclosed(path.lines) / areaOf(path.box);
    if (share > 0.7) {
      sheets.push({ box: path.box, colour: path.fillColour, covers: share > 0.95, order: path.order });
    }
  }
  for (const picture of drawn.pictures) {
    if (!picture.visible || areaOf(picture.box) < SMALLEST_SHEET) continue;
    sheets.push({ box: picture.box, colour: null, covers: !picture.mask, order: picture.order });
  }
  return sheets.sort((a, b) => a.order - b.order);
}

function insideWholly(run: DrawnRun, page: Box): boolean {
  const box = boxOfRun(run);
  return shareWithin(box, page) === 1 && shareWithin(box, run.clip) === 1;
}

/** The box of a run's letters between base line and the height of a small letter: the part that must be seen. */
export function boxOfRun(run: DrawnRun): Box {
  const [ux, uy] = run.along;
  const from = run.glyphs[0]?.from ?? 0;
  const to = run.glyphs.findLast((glyph) => glyph.text.trim() !== '')?.to ?? from;
  const up = run.size * 0.55;
  const xs = [run.x + from * ux, run.x + to * ux, run.x + from * ux + up * uy, run.x + to * ux + up * uy];
  const ys = [run.y + from * uy, run.y + to * uy, run.y + from * uy - up * ux, run.y + to * uy - up * ux];
  return [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)];
}

function whyUnseen(run: DrawnRun, sheets: readonly Sheet[], page: Box): HiddenText['why'] | null {
  const box = boxOfRun(run);
  const x = (box[0] + box[2]) / 2;
  const y = (box[1] + box[3]) / 2;
  if (!holds(page, x, y) || !holds(intersection(run.clip, page), x, y)) return 'outside';

  let under: Sheet | null = null;
  for (const sheet of sheets) {
    if (sheet.order < run.order) {
      if (holds(sheet.box, x, y)) under = sheet;
    } else if (sheet.covers && shareWithin(box, sheet.box) >= COVERED) {
      return 'covered';
    }
  }
  const ground = under ? under.colour : PAPER;
  return ground && run.colour && looksAlike(ground, run.colour) ? 'colour' : null;
}

function cutAtSpaces(run: DrawnRun): DrawnRun[] {
  const parts: DrawnRun['glyphs'][number][][] = [[]];
  for (const glyph of run.glyphs) {
    // The space stays with the word before it, so that words are still parted when they are put together.
    parts.at(-1)?.push(glyph);
    if (/^\s+$/.test(glyph.text)) parts.push([]);
  }
  return parts.filter((glyphs) => glyphs.length > 0).map((glyphs) => ({ ...run, glyphs }));
}

function looksAlike(a: readonly [number, number, number], b: readonly [number, number, number]): boolean {
  const difference = Math.max(...a.map((channel, i) => Math.abs(channel - (b[i] ?? 0))));
  return difference < LEAST_DIFFERENCE && contrast(a, b) < LEAST_CONTRAST;
}

function contrast(a: readonly [number, number, number], b: readonly [number, number, number]): number {
  const [light, dark] = [luminance(a), luminance(b)].sort((p, q) => q - p) as [number, number];
  return (light + 0.05) / (dark + 0.05);
}

const linear = (channel: number) => {
  const c = channel / 255;
  return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
};
const luminance = ([r, g, b]: readonly [number, number, number]) =>
  0.2126 * linear(r) + 0.7152 * linear(g) + 0.0722 * linear(b);
