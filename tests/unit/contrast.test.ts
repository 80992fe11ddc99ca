import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';

const css = readFileSync(new URL('../../app/tokens.css', import.meta.url), 'utf8');
const [dayBlock = '', nightBlock = ''] = css.split('@utility night-tokens');
const tokens = (block: string) =>
  new Map(
    [...block.matchAll(/--([\w-]+):\s*(#[0-9a-f]{6})/g)].map(([, name = '', value = '']) => [name, value]),
  );
const day = tokens(dayBlock);
const night = new Map([...day, ...tokens(nightBlock)]);

const STAGES = ['building', 'dispatched', 'atproc', 'returned', 'proved', 'settled', 'stocked', 'held'];

describe.each([
  ['day', day],
  ['night', night],
])('by %s', (_, colours) => {
  const ratio = (a: string, b: string) => contrast(colours.get(a) ?? '', colours.get(b) ?? '');

  test.each(['ink', 'quiet', 'faint'])('%s can be read on paper, bench and field', (ink) => {
    for (const ground of ['paper', 'bench', 'field']) expect(ratio(ink, ground)).toBeGreaterThanOrEqual(4.5);
  });
  test('faint can be read on a button that waits', () =>
    expect(ratio('faint', 'deep')).toBeGreaterThanOrEqual(4));
  test('a border of a field can be seen', () => expect(ratio('line', 'paper')).toBeGreaterThanOrEqual(3));
  test.each(STAGES)('the ink of %s can be read on paper, bench and its wash', (stage) => {
    for (const ground of ['paper', 'bench', `${stage}-wash`])
      expect(ratio(`${stage}-ink`, ground)).toBeGreaterThanOrEqual(4.5);
  });
  test.each(STAGES)('text can be read on the wash of %s', (stage) =>
    expect(ratio('ink', `${stage}-wash`)).toBeGreaterThanOrEqual(7),
  );
});

function contrast(a: string, b: string): number {
  const [light = 0, dark = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (light + 0.05) / (dark + 0.05);
}

/** WCAG 2.2, relative luminance. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5]
    .map((at) => Number.parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4));
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}
