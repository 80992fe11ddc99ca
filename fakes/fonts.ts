import { readFileSync } from 'node:fs';
import { join } from 'node:path';

const FOLDER = join(import.meta.dirname, '..', 'public', 'fonts');

const FACES = [
  ['Barlow', 400, 'barlow-latin-400-normal.woff2'],
  ['Barlow', 600, 'barlow-latin-600-normal.woff2'],
  ['Barlow Semi Condensed', 600, 'barlow-semi-condensed-latin-600-normal.woff2'],
  ['Spline Sans Mono', 400, 'spline-sans-mono-latin-400-normal.woff2'],
] as const;

/** The house faces, inside the style sheet: a page of a stand-in asks for nothing but itself. */
export const FONT_FACES = FACES.map(([family, weight, file]) => {
  const font = readFileSync(join(FOLDER, file)).toString('base64');
  return `@font-face{font-family:"${family}";font-weight:${weight};src:url(data:font/woff2;base64,${font}) format("woff2")}`;
}).join('\n');
