import bwip from 'bwip-js/node';

/** The dark squares of a code as one path, in units of a square. Level M survives a quarter of the dirt of a shop. */
export function qrPath(text: string): { width: number; path: string } {
  const [drawn] = bwip.raw('qrcode', text, 'eclevel=M');
  if (!drawn || !('pixs' in drawn)) throw new Error('no code was drawn');
  const { pixs, pixx } = drawn;
  const runs: string[] = [];
  for (let at = 0; at < pixs.length; at++) {
    if (!pixs[at]) continue;
    const start = at;
    while (pixs[at + 1] && (at + 1) % pixx !== 0) at++;
    const long = at - start + 1;
    runs.push(`M${start % pixx} ${Math.floor(start / pixx)}h${long}v1h-${long}z`);
  }
  return { width: pixx, path: runs.join('') };
}
