import { build } from 'esbuild';

const FOLDER = '.data/test/faults';
const PARTS = ['door', 'worker'] as const;

/** Where the one file of a part lies. */
export const bundleOf = (part: (typeof PARTS)[number]): string => `${FOLDER}/${part}.mjs`;

/** Some packages inside ask for what only their own kind of module has. */
const COMMONJS_NAMES = [
  `import { createRequire as requireFrom } from 'node:module';`,
  `const require = requireFrom(import.meta.url);`,
  `const __filename = import.meta.filename;`,
  `const __dirname = import.meta.dirname;`,
].join('\n');

/** Puts each part and its packages into one file, once for all fault tests, so that a killed process is soon up again. */
export async function setup(): Promise<void> {
  for (const part of PARTS) {
    await build({
      entryPoints: [`tests/faults/${part}.ts`],
      outfile: bundleOf(part),
      bundle: true,
      platform: 'node',
      format: 'esm',
      target: 'node20',
      // Machine code; a package that looks for its fonts beside itself, and the React it shares with us.
      external: ['pg-native', '@node-rs/argon2', '@react-pdf/renderer', 'react'],
      banner: { js: COMMONJS_NAMES },
      jsx: 'automatic',
      // Less to read at each start.
      minifyWhitespace: true,
      minifySyntax: true,
      legalComments: 'none',
      logLevel: 'error',
    });
  }
}
