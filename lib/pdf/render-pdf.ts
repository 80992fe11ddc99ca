import { renderToBuffer, type DocumentProps } from '@react-pdf/renderer';
import type { ReactElement } from 'react';

import { registerFonts } from './fonts';

/**
 * Makes a PDF. The same element makes the same bytes, provided its `<Document>` names a `creationDate` (the moment the
 * paper is stated) and the element depends on nothing but its props. Takes a tenth of a second for a page and blocks
 * the thread meanwhile: for the worker, not for a request.
 */
export async function renderPdf(element: ReactElement<DocumentProps>): Promise<Buffer> {
  registerFonts();
  return renderToBuffer(element);
}
