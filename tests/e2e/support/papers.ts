import { renderPdf } from '@/lib/pdf/render-pdf';
import { createElement } from 'react';
import { Document, Page, Text } from '@react-pdf/renderer';

/** A real PDF of one page that says these words; no two are the same file. */
export function somePaper(title: string, words: string): Promise<Buffer> {
  return renderPdf(
    createElement(
      Document,
      { title, creationDate: new Date() },
      createElement(
        Page,
        { size: 'LETTER', style: { padding: 60 } },
        createElement(Text, null, title),
        createElement(Text, null, words),
      ),
    ),
  );
}
