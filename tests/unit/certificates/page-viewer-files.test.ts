import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';

const root = join(import.meta.dirname, '../../..');
const served = join(root, 'public/pdfjs');
const installed = join(root, 'node_modules/pdfjs-dist');

const FONTS = readdirSync(join(served, 'standard_fonts')).map((name) => ({
  ours: `standard_fonts/${name}`,
  theirs: `standard_fonts/${name}`,
}));

// A worker of another version refuses to work; the pages of a certificate would stay blank.
test.each([
  { ours: 'pdf.worker.min.mjs', theirs: 'build/pdf.worker.min.mjs' },
  { ours: 'openjpeg_nowasm_fallback.js', theirs: 'wasm/openjpeg_nowasm_fallback.js' },
  ...FONTS,
])('$ours is served as it is installed', ({ ours, theirs }) => {
  expect(readFileSync(join(served, ours)).equals(readFileSync(join(installed, theirs)))).toBe(true);
});
