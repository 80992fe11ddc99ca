'use client';
import { useState } from 'react';
import { Document, Page, pdfjs } from 'react-pdf';

import { Failing } from '@/components/ui/failing';

// From our own origin and of the very version installed (a test compares the two).
pdfjs.GlobalWorkerOptions.workerSrc = '/pdfjs/pdf.worker.min.mjs';

/** Nothing of a received file is run: no evaluation, no forms, no links, only its marks on a canvas. */
const OPTIONS = {
  isEvalSupported: false,
  useWasm: false,
  wasmUrl: '/pdfjs/',
  standardFontDataUrl: '/pdfjs/standard_fonts/',
  disableAutoFetch: true,
  disableStream: true,
  enableXfa: false,
  useSystemFonts: false,
};

interface PdfPageProps {
  url: string;
  page: number;
  width: number;
  /** Degrees by which the page stands upright, where a reader found out; its own turn otherwise. */
  upright: number | null;
  /** Degrees that the person turned it by. */
  turned: number;
  onPages: (pages: number) => void;
  onDrawn?: (() => void) | undefined;
}

export function PdfPage({ url, page, width, upright, turned, onPages, onDrawn }: PdfPageProps) {
  const [own, setOwn] = useState(0);
  const waiting = <p className="p-6 text-quiet">Reading the file</p>;
  const failing = (
    <div className="bg-paper px-4 py-2">
      <Failing
        says="The pages cannot be shown."
        stands="The file is kept as it was received."
        actions={<a href={url}>Open the file itself</a>}
      />
    </div>
  );
  return (
    <Document
      file={url}
      options={OPTIONS}
      loading={waiting}
      error={failing}
      noData={failing}
      onLoadSuccess={({ numPages }) => onPages(numPages)}
    >
      <Page
        pageNumber={page}
        width={width}
        rotate={((upright ?? own) + turned) % 360}
        onLoadSuccess={({ rotate }) => setOwn(rotate)}
        loading={waiting}
        error={failing}
        renderAnnotationLayer={false}
        renderTextLayer={false}
        onRenderSuccess={() => onDrawn?.()}
        className="lw-sheet"
      />
    </Document>
  );
}
