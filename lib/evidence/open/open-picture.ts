import sharp from 'sharp';
import { UnreadableFile } from '../page';
import type { Limits } from './limits';
import type { Opened } from './open-file';
import type { PagePicture } from './prepare-page';
import type { Recogniser } from './recogniser';
import { withoutNeedlessColour } from './needless-colour';
import { recognisePages } from './recognise-pages';

const SANE_DPI = { least: 90, most: 1300 };
/** In inches: a page is not smaller or larger; else the resolution in the file is a camera's default. */
const SANE_SIDE = { least: 4, most: 24 };
/** More pixels than this on the longer side cost time and tell nothing. */
const LONGEST_SIDE = 4400;

/**
 * Opens a TIFF of one or more pages, a JPEG, PNG or WebP, and recognises what is on it.
 *
 * @throws UnreadableFile `damaged`, `too_large`, `too_many_pages`, `took_too_long`
 */
export async function openPicture(
  bytes: Uint8Array,
  { limits, recogniser }: { limits: Limits; recogniser: Recogniser },
): Promise<Opened> {
  const { pages, density, width, height } = await describe(bytes);
  if (width * height > limits.pixels) {
    throw new UnreadableFile(
      'too_large',
      `This picture is ${width} × ${height} pixels, too large to be opened. Please scan it at 300 dots per inch.`,
    );
  }
  if (pages > limits.pages) {
    throw new UnreadableFile(
      'too_many_pages',
      `This file has ${pages} pages; at most ${limits.pages} are read.`,
    );
  }
  const decoded = Array.from({ length: pages }, (_, page) => () => decode(bytes, { page, density, limits }));
  const read = await recognisePages(decoded, { limits, recogniser });
  return { kind: read.photograph ? 'photo' : 'scan', pages: read.pages };
}

async function describe(bytes: Uint8Array) {
  try {
    const { pages, density, width, height } = await sharp(bytes, { limitInputPixels: false }).metadata();
    return { pages: pages ?? 1, density: density ?? null, width, height };
  } catch {
    throw damaged();
  }
}

const damaged = () =>
  new UnreadableFile('damaged', 'This picture is damaged and cannot be read. Please ask for it again.');

async function decode(
  bytes: Uint8Array,
  { page, density, limits }: { page: number; density: number | null; limits: Limits },
): Promise<PagePicture> {
  try {
    const input = sharp(bytes, {
      page,
      limitInputPixels: limits.pixels,
      failOn: 'error',
      sequentialRead: true,
    });
    const { width, height } = await input.metadata();
    const { data, info } = await input
      .rotate()
      .flatten({ background: '#ffffff' })
      .resize({ width: LONGEST_SIDE, height: LONGEST_SIDE, fit: 'inside', withoutEnlargement: true })
      .toColourspace('srgb')
      .raw({ depth: 'uchar' })
      .toBuffer({ resolveWithObject: true });
    const shrunk = Math.max(info.width, info.height) / Math.max(width, height);
    const picture = {
      width: info.width,
      height: info.height,
      data: new Uint8Array(data.buffer, data.byteOffset, data.length),
    };
    return {
      ...(info.channels === 3 ? withoutNeedlessColour(picture) : { picture, channels: 1 }),
      dpi: saneDpi(density === null ? null : density * shrunk, picture),
      turned: 0,
    };
  } catch (cause) {
    if (cause instanceof UnreadableFile) throw cause;
    throw damaged();
  }
}

function saneDpi(dpi: number | null, { width, height }: { width: number; height: number }): number | null {
  if (dpi === null || dpi < SANE_DPI.least || dpi > SANE_DPI.most) return null;
  const [short, long] = [Math.min(width, height) / dpi, Math.max(width, height) / dpi];
  return short >= SANE_SIDE.least && long <= SANE_SIDE.most ? dpi : null;
}
