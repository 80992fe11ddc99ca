import { PDFDocument } from 'pdf-lib';
import { photographPage } from '../degrade/photograph-page';
import { renderPages } from '../degrade/render-page';
import { scanPage } from '../degrade/scan-page';
import { asJpeg, asScannedPdf } from '../degrade/write-files';
import { asPrinted } from './as-printed';
import type { Told } from './content';
import { diceOf, type Dice } from './dice';
import type { Layout } from './layout';
import { plantIn } from './plant';
import { tellStory, type Story, type Truth } from './story';
import { americanHand, europeanHand, type Hand } from './wording';

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
  const language = ({ american: 'en', british: 'en', german: 'de', french: 'fr' } as const)[layout.hand];
  const hand: Hand = layout.hand === 'american' ? americanHand(dice) : europeanHand(dice, language);
  const { story, planted } = plantIn(tellStory(dice), dice, count);
  return { told: { story: asPrinted(story, hand, dice), hand, dice }, planted };
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
  const [front] = rendered;
  if (kind === 'photo' && rendered.length === 1 && front) {
    const photograph = await photographPage(front, {
      seed,
      longerSide: dice.pick([2800, 3200, 3600]),
      perspective: dice.pick([0.2, 0.5, 0.8]),
      unevenLight: dice.pick([0.3, 0.6]),
      blur: dice.pick([0.3, 0.6]),
      turned: 0,
      desk: dice.pick(['dark', 'wood', 'light'] as const),
    });
    return { bytes: await asJpeg(photograph), name: `${seed}.jpg`, pages: 1 };
  }
  const dpi: 150 | 200 | 300 = kind === 'scan150' || kind === 'photo' ? 150 : dice.pick([200, 300] as const);
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
