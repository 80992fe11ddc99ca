import sharp from 'sharp';
import type { Grey } from './picture/grey';

/** A picture `scale` times as wide and high, with smooth edges. */
export async function resize({ width, height, data }: Grey, scale: number): Promise<Grey> {
  const { data: out, info } = await sharp(data, { raw: { width, height, channels: 1 } })
    .resize(Math.round(width * scale), Math.round(height * scale), { kernel: 'cubic', fit: 'fill' })
    .toColourspace('b-w')
    .raw()
    .toBuffer({ resolveWithObject: true });
  return { width: info.width, height: info.height, data: out };
}
