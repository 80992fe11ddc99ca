import sharp from 'sharp';
import type { Grey } from './picture/grey';
import type { PagePicture } from './prepare-page';

/** At which letters of 8 to 12 points are as high as the recogniser likes them; more costs time and reads no better. */
export const READING_DPI = 225;
const FINER_THAN_NEEDED = 245;

/** A picture `scale` times as wide and high, with smooth edges. */
export const resize = (picture: Grey, scale: number): Promise<Grey> => resizeChannels(picture, 1, scale);

/** The page at reading resolution where it is finer; else as it is. */
export async function coarsen(page: PagePicture): Promise<PagePicture> {
  if (page.dpi === null || page.dpi < FINER_THAN_NEEDED) return page;
  const picture = await resizeChannels(page.picture, page.channels, READING_DPI / page.dpi);
  return { ...page, picture, dpi: (page.dpi * picture.width) / page.picture.width };
}

async function resizeChannels({ width, height, data }: Grey, channels: 1 | 3, scale: number): Promise<Grey> {
  const { data: out, info } = await sharp(data, { raw: { width, height, channels } })
    .resize(Math.round(width * scale), Math.round(height * scale), { kernel: 'cubic', fit: 'fill' })
    .toColourspace(channels === 1 ? 'b-w' : 'srgb')
    .raw()
    .toBuffer({ resolveWithObject: true });
  return { width: info.width, height: info.height, data: out };
}
