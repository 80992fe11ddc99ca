import { createCanvas } from '@napi-rs/canvas';
import type { PDFPageProxy } from 'pdfjs-dist/legacy/build/pdf.mjs';
import type { Box } from '../../page';
import { areaOf, intersection } from '../box';
import { withoutNeedlessColour } from '../needless-colour';
import type { PagePicture } from '../prepare-page';
import type { Drawn, DrawnPicture } from './drawn';

/** What pdf.js decodes a picture into; `kind` is 1 for one bit a pixel, 2 for three bytes, 3 for four. */
interface DecodedPicture {
  readonly width: number;
  readonly height: number;
  readonly kind?: number;
  readonly data?: Uint8Array | Uint8ClampedArray | null;
}

const RENDER_DPI = 220;
const FINEST_DPI = 300;
const WHOLE_PAGE = 0.97;
const LONGEST_SIDE = 4400;

/** Share of the page that its pictures cover, from 0 to 1; overlaps are not taken off, the sum stops at 1. */
export function shareCovered(drawn: Drawn, page: Box): number {
  const sum = visiblePictures(drawn).reduce((area, { box }) => area + areaOf(intersection(box, page)), 0);
  return Math.min(1, sum / areaOf(page));
}

const visiblePictures = (drawn: Drawn) => drawn.pictures.filter(({ visible }) => visible);

/** Pixels to the inch of the finest large picture; null when there is none. */
export function dpiOfPictures(drawn: Drawn, page: Box): number | null {
  const large = visiblePictures(drawn).filter(({ box }) => areaOf(box) > 0.02 * areaOf(page));
  const finest = Math.max(0, ...large.map(dpiOf));
  return finest > 0 ? finest : null;
}

const dpiOf = ({ matrix, pixelsWide }: DrawnPicture) =>
  (pixelsWide * 72) / (Math.hypot(matrix[0], matrix[1]) || Infinity);

/**
 * The picture a person sees of a page: the scan itself where one covers the page and nothing lies over it, else painted.
 *
 * `drawn` is the page as filed, without the turn its file asks for.
 */
export async function pictureOfPage(proxy: PDFPageProxy, drawn: Drawn, page: Box): Promise<PagePicture> {
  const [only, ...others] = visiblePictures(drawn);
  const bare =
    only && others.length === 0 && !drawn.runs.some(({ why }) => why === null) && drawn.paths.length === 0;
  const scan = bare ? scanItself(proxy, only, page) : null;
  return scan ?? paint(proxy, Math.min(FINEST_DPI, dpiOfPictures(drawn, page) ?? RENDER_DPI));
}

function scanItself(proxy: PDFPageProxy, picture: DrawnPicture, page: Box): PagePicture | null {
  const [a, b, c, d, e, f] = picture.matrix;
  // The unit square's y runs upwards, the page's downwards: a picture standing upright has d < 0 here.
  const upright = a > 0 && d < 0 && Math.abs(b) + Math.abs(c) < 0.01;
  const whole = e < 2 && f > page[3] - 2 && areaOf(picture.box) > WHOLE_PAGE * areaOf(page);
  if (!upright || !whole || picture.mask || picture.name === null) return null;
  const store = picture.name.startsWith('g_') ? proxy.commonObjs : proxy.objs;
  if (!store.has(picture.name)) return null;
  const decoded = store.get(picture.name) as DecodedPicture;
  const { width, height } = decoded;
  if (Math.max(width, height) > LONGEST_SIDE) return null;
  const pixels = pixelsOf(decoded);
  // A scan may reach over the page's rim; what is cut off there is no more than its border.
  const dpi = (width * 72) / a;
  const square = Math.abs((height * 72) / -d / dpi - 1) < 0.02;
  return pixels && square ? { ...pixels, dpi, turned: 0 } : null;
}

function pixelsOf({
  width,
  height,
  kind,
  data,
}: DecodedPicture): Pick<PagePicture, 'picture' | 'channels'> | null {
  if (!data) return null;
  if (kind === 2) {
    return withoutNeedlessColour({
      width,
      height,
      data: new Uint8Array(data.buffer, data.byteOffset, data.length),
    });
  }
  if (kind !== 1) return null;
  const out = new Uint8Array(width * height);
  const stride = (width + 7) >> 3;
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      out[y * width + x] = ((data[y * stride + (x >> 3)] ?? 0) >> (7 - (x & 7))) & 1 ? 255 : 0;
    }
  }
  return { picture: { width, height, data: out }, channels: 1 };
}

async function paint(proxy: PDFPageProxy, wanted: number): Promise<PagePicture> {
  const natural = proxy.getViewport({ scale: 1, rotation: 0 });
  const dpi = Math.min(wanted, (LONGEST_SIDE * 72) / Math.max(natural.width, natural.height));
  const viewport = proxy.getViewport({ scale: dpi / 72, rotation: 0 });
  const canvas = createCanvas(
    Math.max(1, Math.round(viewport.width)),
    Math.max(1, Math.round(viewport.height)),
  );
  const context = canvas.getContext('2d');
  // pdf.js names the browser's canvas; this one draws the same.
  await proxy.render({
    canvas: null,
    canvasContext: context as unknown as CanvasRenderingContext2D,
    viewport,
  }).promise;
  const { data, width, height } = context.getImageData(0, 0, canvas.width, canvas.height);
  const rgb = new Uint8Array(width * height * 3);
  for (let from = 0, to = 0; from < data.length; from += 4, to += 3) {
    rgb[to] = data[from] as number;
    rgb[to + 1] = data[from + 1] as number;
    rgb[to + 2] = data[from + 2] as number;
  }
  return { ...withoutNeedlessColour({ width, height, data: rgb }), dpi, turned: 0 };
}
