import type { Component } from './find-components';

/**
 * Whether more letters hang below their lines than rise above: then the page stands on its head.
 *
 * Capitals and figures tell nothing, so this is a first guess; recognition has the last word.
 */
export function guessUpsideDown(components: readonly Component[], dpi: number): boolean {
  const letters = components
    .filter(
      ({ box }) =>
        box[3] - box[1] > 0.035 * dpi && box[3] - box[1] < 0.3 * dpi && box[2] - box[0] < 0.4 * dpi,
    )
    .sort((a, b) => middleOf(a) - middleOf(b));
  const heights = letters.map(({ box }) => box[3] - box[1]).sort((a, b) => a - b);
  const usual = heights[heights.length >> 1] ?? 0;
  let [rising, hanging] = [0, 0];
  for (let i = 0; i < letters.length;) {
    const line = [letters[i] as Component];
    let end = i + 1;
    for (; end < letters.length; end++) {
      const next = letters[end] as Component;
      if (middleOf(next) - middleOf(letters[end - 1] as Component) > 0.3 * usual) break;
      line.push(next);
    }
    i = end;
    if (line.length < 8) continue;
    const tops = line.map(({ box }) => box[1]).sort((a, b) => a - b);
    const bottoms = line.map(({ box }) => box[3]).sort((a, b) => a - b);
    const [top, bottom] = [tops[tops.length >> 1] as number, bottoms[bottoms.length >> 1] as number];
    const reach = 0.2 * (bottom - top);
    rising += line.filter(({ box }) => box[1] < top - reach).length;
    hanging += line.filter(({ box }) => box[3] > bottom + reach).length;
  }
  return hanging > 2 * rising && hanging > 12;
}

const middleOf = ({ box }: Component) => (box[1] + box[3]) / 2;
