import { PDFDocument } from 'pdf-lib';
import sharp from 'sharp';
import type { Raster } from './raster';

const picture = ({ data, width, height, dpi }: Raster) =>
  sharp(data, { raw: { width, height, channels: 4 } })
    .removeAlpha()
    .withMetadata({ density: dpi });

export const asJpeg = (page: Raster, quality = 80): Promise<Uint8Array> =>
  picture(page).jpeg({ quality }).toBuffer();

/** One TIFF with all pages, as a scanner's feeder writes it. */
export async function asTiff(pages: readonly Raster[]): Promise<Uint8Array> {
  const single = await Promise.all(pages.map((page) => picture(page).png().toBuffer()));
  const dpi = pages[0]?.dpi ?? 300;
  const joined = single.length === 1 ? sharp(single[0]) : sharp(single, { join: { animated: true } });
  return joined.tiff({ compression: 'lzw', xres: dpi / 25.4, yres: dpi / 25.4 }).toBuffer();
}

/** A PDF whose pages are pictures, as a copier writes it. No text layer. */
export async function asScannedPdf(pages: readonly Raster[], quality = 80): Promise<Uint8Array> {
  const document = await PDFDocument.create();
  const written = new Date('2026-01-01T00:00:00Z');
  document.setCreationDate(written);
  document.setModificationDate(written);
  for (const page of pages) {
    const image = await document.embedJpg(await asJpeg(page, quality));
    const [width, height] = [(page.width * 72) / page.dpi, (page.height * 72) / page.dpi];
    document.addPage([width, height]).drawImage(image, { x: 0, y: 0, width, height });
  }
  return document.save();
}
