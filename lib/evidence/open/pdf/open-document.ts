import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { getDocument, VerbosityLevel, type PDFDocumentProxy } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { UnreadableFile } from '../../page';
import type { Limits } from '../limits';

const require = createRequire(import.meta.url);
const home = dirname(require.resolve('pdfjs-dist/package.json'));
const folder = (name: string) => `${join(home, name)}/`;

/**
 * Opens a PDF without running anything in it.
 *
 * @throws UnreadableFile `damaged`, `password_needed`, `wrong_password`, `too_many_pages`
 */
export async function openDocument(
  bytes: Uint8Array,
  { password, limits }: { password?: string | undefined; limits: Limits },
): Promise<PDFDocumentProxy> {
  const task = getDocument({
    // pdf.js takes the bytes over, so it is given its own.
    data: new Uint8Array(bytes),
    ...(password === undefined ? {} : { password }),
    verbosity: VerbosityLevel.ERRORS,
    isEvalSupported: false,
    enableXfa: false,
    disableFontFace: true,
    useSystemFonts: false,
    maxImageSize: limits.pixels,
    cMapUrl: folder('cmaps'),
    standardFontDataUrl: folder('standard_fonts'),
    wasmUrl: folder('wasm'),
    iccUrl: folder('iccs'),
  });
  try {
    const document = await task.promise;
    if (document.numPages > limits.pages) {
      await task.destroy();
      throw new UnreadableFile(
        'too_many_pages',
        `This file has ${document.numPages} pages; at most ${limits.pages} are read. Please send the certificate's pages alone.`,
      );
    }
    return document;
  } catch (cause) {
    throw asUnreadable(cause, password);
  }
}

/** Says what pdf.js complained about in words for a person. */
export function asUnreadable(cause: unknown, password?: string): UnreadableFile {
  if (cause instanceof UnreadableFile) return cause;
  const name = cause instanceof Error ? cause.name : '';
  if (name === 'PasswordException') {
    return password === undefined
      ? new UnreadableFile('password_needed', 'This PDF is protected by a password. Please enter it.')
      : new UnreadableFile('wrong_password', 'The password does not open this PDF.');
  }
  return new UnreadableFile('damaged', 'This PDF is damaged and cannot be read. Please ask for it again.');
}
