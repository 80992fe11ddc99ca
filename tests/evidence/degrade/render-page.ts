import { createCanvas } from '@napi-rs/canvas';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { getDocument, VerbosityLevel } from 'pdfjs-dist/legacy/build/pdf.mjs';
import type { Raster } from './raster';

const home = dirname(createRequire(import.meta.url).resolve('pdfjs-dist/package.json'));

/** Renders every page of a PDF, by default at 300 dpi. */
export async function renderPages(pdf: Uint8Array, dpi = 300): Promise<Raster[]> {
  const task = getDocument({
    data: pdf.slice(),
    verbosity: VerbosityLevel.ERRORS,
    standardFontDataUrl: `${join(home, 'standard_fonts')}/`,
    cMapUrl: `${join(home, 'cmaps')}/`,
  });
  const document = await task.promise;
  const pages: Raster[] = [];
  for (let number = 1; number <= document.numPages; number++) {
    const page = await document.getPage(number);
    const viewport = page.getViewport({ scale: dpi / 72 });
    const canvas = createCanvas(Math.round(viewport.width), Math.round(viewport.height));
    const context = canvas.getContext('2d');
    await page.render({ canvas: canvas as never, canvasContext: context as never, viewport }).promise;
    const { data } = context.getImageData(0, 0, canvas.width, canvas.height);
    pages.push({ width: canvas.width, height: canvas.height, data: new Uint8ClampedArray(data), dpi });
  }
  await task.destroy();
  return pages;
}
