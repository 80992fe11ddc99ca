import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';

/** The text of each page of a PDF, as a reader's program finds it. */
export async function readPdf(content: Buffer): Promise<string[]> {
  const document = await getDocument({ data: new Uint8Array(content), useSystemFonts: false, verbosity: 0 })
    .promise;
  const pages: string[] = [];
  for (let no = 1; no <= document.numPages; no++) {
    const { items } = await (await document.getPage(no)).getTextContent();
    pages.push(
      items
        .map((item) => ('str' in item ? item.str : ''))
        .join(' ')
        .replace(/\s+/g, ' '),
    );
  }
  await document.destroy();
  return pages;
}
