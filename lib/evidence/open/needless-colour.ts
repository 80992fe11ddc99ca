import type { PagePicture } from './prepare-page';
import type { Coloured } from './picture/colours';

const SAME = 6;
const EVERY = 7;

/** Grey pictures are often saved in three equal colours; one is enough. */
export function withoutNeedlessColour(picture: Coloured): Pick<PagePicture, 'picture' | 'channels'> {
  const { width, height, data } = picture;
  for (let at = 0; at < data.length; at += 3 * EVERY) {
    const [r, g, b] = [data[at] as number, data[at + 1] as number, data[at + 2] as number];
    if (Math.abs(r - g) > SAME || Math.abs(g - b) > SAME) return { picture, channels: 3 };
  }
  const grey = new Uint8Array(width * height);
  for (let i = 0, at = 1; i < grey.length; i++, at += 3) grey[i] = data[at] as number;
  return { picture: { width, height, data: grey }, channels: 1 };
}
