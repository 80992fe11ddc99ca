import { PDFDocument } from 'pdf-lib';
import { photographPage } from '../degrade/photograph-page';
import { renderPages } from '../degrade/render-page';
import { scanPage } from '../degrade/scan-page';
import type { Raster } from '../degrade/raster';
import { asJpeg, asScannedPdf, asTiff } from '../degrade/write-files';
import { asPrinted } from './as-printed';
import type { Told } from './content';
import { diceOf, type Dice } from './dice';
import type { Layout } from './layout';
import { plantIn } from './plant';
import { tellStory, type Story, type Truth } from './story';
import { handOf } from './wording';

export const KINDS = ['text', 'scan', 'scan150', 'photo'] as const;
export type Kind = (typeof KINDS)[number];

export interface MadeCertificate {
  readonly seed: number;
  readonly layout: string;
  readonly kind: Kind;
  readonly name: string;
  readonly bytes: Uint8Array;
  readonly pages: number;
  /** Of each certificate in the file, in the order of its pages. */
  readonly truths: readonly Truth[];
  /** Of the first. */
  readonly story: Story;
  readonly planted: readonly string[];
}

/**
 * One file with known truth. The same seed gives the same file. Every second certificate has one to three planted
 * discrepancies; every tenth file holds two certificates.
 */
export async function makeCertificate(
  seed: number,
  layouts: readonly Layout[],
  wanted: Kind,
): Promise<MadeCertificate> {
  const dice = diceOf(seed);
  const layout = layouts[seed % layouts.length];
  if (!layout) throw new Error('There is no layout to choose from.');
  const first = tell(layout, dice, seed % 2 === 1 ? dice.whole(1, 3) : 0);
  const told = [first.told, ...(seed % 10 === 4 && !layout.textOnly ? [tell(layout, dice, 0).told] : [])];
  const drawn = await Promise.all(told.map((one) => layout.draw(one)));
  const whole = layout.textOnly ? (drawn[0] ?? new Uint8Array()) : await together(drawn);
  const kind = layout.textOnly ? 'text' : wanted;
  const { bytes, name, pages } = await onFilm(whole, kind, {
    seed,
    dice,
    isText: layout.textOnly === true,
    stamp: first.told.story.received,
  });
  return {
    seed,
    layout: layout.name,
    kind,
    name,
    bytes,
    pages,
    truths: told.map(({ story }) => story.truth),
    story: first.told.story,
    planted: first.planted,
  };
}

function tell(layout: Layout, dice: Dice, count: number): { told: Told; planted: string[] } {
  const hand = handOf(layout.hand, dice);
  const states = layout.states?.bind(layout);
  const { story, planted } = plantIn(tellStory(dice), dice, { count, states });
  const printed = asPrinted(story, hand, dice);
  return {
    told: { story: { ...printed, truth: states?.(printed.truth) ?? printed.truth }, hand, dice },
    planted,
  };
}

async function together(files: readonly Uint8Array[]): Promise<Uint8Array> {
  const [only] = files;
  if (files.length === 1 && only) return only;
  const whole = await PDFDocument.create();
  for (const file of files) {
    const part = await PDFDocument.load(file);
    for (const page of await whole.copyPages(part, part.getPageIndices())) whole.addPage(page);
  }
  return whole.save();
}

interface Film {
  readonly seed: number;
  readonly dice: Dice;
  readonly isText: boolean;
  readonly stamp: string;
}

async function onFilm(
  pdf: Uint8Array,
  kind: Kind,
  { seed, dice, isText, stamp }: Film,
): Promise<{ bytes: Uint8Array; name: string; pages: number }> {
  if (isText) return { bytes: pdf, name: `${seed}.txt`, pages: 1 };
  if (kind === 'text')
    return { bytes: pdf, name: `${seed}.pdf`, pages: (await PDFDocument.load(pdf)).getPageCount() };
  const rendered = await renderPages(pdf);
  if (kind === 'photo') return photographed(rendered, seed, dice);
  const dpi: 150 | 200 | 300 = kind === 'scan150' ? 150 : dice.pick([200, 300] as const);
  const settings = {
    seed,
    dpi,
    colour: dice.pick(['grey', 'colour'] as const),
    skew: dice.whole(-20, 20) / 10,
    turned: dice.pick([0, 0, 0, 90, 180] as const),
    noise: dice.pick([0.1, 0.3, 0.5]),
    stamp: dice.chance(0.2) ? `RECEIVED ${stamp}` : null,
  };
  const scans = await Promise.all(rendered.map((page) => scanPage(page, settings)));
  return { bytes: await asScannedPdf(scans), name: `${seed}.pdf`, pages: rendered.length };
}

/** One page as a JPEG; several, page after page by the same hand and light, as a PDF or a TIFF of photographs. */
async function photographed(
  rendered: readonly Raster[],
  seed: number,
  dice: Dice,
): Promise<{ bytes: Uint8Array; name: string; pages: number }> {
  const settings = {
    longerSide: dice.pick([2800, 3200, 3600]),
    perspective: dice.pick([0.2, 0.5, 0.8]),
    unevenLight: dice.pick([0.3, 0.6]),
    blur: dice.pick([0.3, 0.6]),
    turned: 0,
    desk: dice.pick(['dark', 'wood', 'light'] as const),
  } as const;
  const photographs: Raster[] = [];
  for (const [index, page] of rendered.entries())
    photographs.push(await photographPage(page, { ...settings, seed: seed + 1000 * index }));
  const [first] = photographs;
  const pages = photographs.length;
  if (pages === 1 && first) return { bytes: await asJpeg(first), name: `${seed}.jpg`, pages };
  return dice.chance(0.5)
    ? { bytes: await asScannedPdf(photographs), name: `${seed}.pdf`, pages }
    : { bytes: await asTiff(photographs), name: `${seed}.tif`, pages };
}
