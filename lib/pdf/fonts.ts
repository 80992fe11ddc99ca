import { Font } from '@react-pdf/renderer';
import { join } from 'node:path';

// Read from the application's own folder: a paper must look the same on every machine.
const FOLDER = join(process.cwd(), 'lib', 'pdf', 'fonts');

const FACES = [
  { family: 'Barlow', file: 'barlow' },
  { family: 'Barlow Semi Condensed', file: 'barlow-semi-condensed' },
  { family: 'Spline Sans Mono', file: 'spline-sans-mono' },
] as const;

/** Families for `fontFamily`, each with its letters beyond western Europe behind it. */
export const SANS = ['Barlow', 'Barlow Ext'];
export const COND = ['Barlow Semi Condensed', 'Barlow Semi Condensed Ext'];
export const MONO = ['Spline Sans Mono', 'Spline Sans Mono Ext'];

let known = false;

export function registerFonts(): void {
  if (known) return;
  known = true;
  for (const { family, file } of FACES) {
    for (const fontWeight of [400, 600] as const) {
      Font.register({ family, fontWeight, src: join(FOLDER, `${file}-latin-${fontWeight}.woff`) });
      Font.register({
        family: `${family} Ext`,
        fontWeight,
        src: join(FOLDER, `${file}-latin-ext-${fontWeight}.woff`),
      });
    }
  }
  // Numbers and names are never broken in the middle.
  Font.registerHyphenationCallback((word) => [word]);
}
