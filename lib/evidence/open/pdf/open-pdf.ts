import type { PDFDocumentProxy, PDFPageProxy } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { UnreadableFile, type Box, type HiddenText, type Page } from '../../page';
import { boxThroughProjection } from '../box';
import { within, type Limits } from '../limits';
import type { Opened } from '../open-file';
import { quarterTurn } from '../picture/projection';
import { preparePage, type Prepared } from '../prepare-page';
import { recognisePage } from '../recognise-page';
import type { Recogniser } from '../recogniser';
import { coarsen } from '../resize';
import { refuseHarmfulPdf } from './check-pdf';
import { asUnreadable, openDocument } from './open-document';
import { pictureOfPage, shareCovered } from './page-picture';
import { readPage, type DescribedPage, type Layers } from './read-page';
import { reconcileLayer } from './reconcile-layer';

interface Tools {
  readonly limits: Limits;
  readonly recogniser: Recogniser;
}

/** A page whose pictures cover this much of it is a scan, whatever text was laid under or over them. */
const SCAN_COVERS = 0.6;
/** With fewer words than this, a page full of lines may be print drawn as outlines. */
const FEW_WORDS = 4;
const MANY_OUTLINES = 150;
/** A layer in which more of the letters than this say nothing is of no use. */
const LEAST_READABLE = 0.9;

/** Opens a PDF's pages in their order: by their text where it can be trusted, else by their pictures. */
export async function openPdf(
  bytes: Uint8Array,
  { password, limits, recogniser }: Tools & { password?: string | undefined },
): Promise<Opened> {
  refuseHarmfulPdf(bytes, limits);
  const document = await openDocument(bytes, { password, limits });
  try {
    return await openPages(document, { limits, recogniser });
  } catch (cause) {
    throw cause instanceof UnreadableFile ? cause : asUnreadable(cause);
  } finally {
    await document.loadingTask.destroy();
  }
}

async function openPages(document: PDFDocumentProxy, tools: Tools): Promise<Opened> {
  const { limits } = tools;
  const layers = (await document.getOptionalContentConfig()) as Layers;
  const pages: Promise<Page>[] = [];
  let [scanned, photographed] = [0, 0];
  for (let number = 1; number <= document.numPages; number++) {
    const proxy = await document.getPage(number);
    const described = await within(limits.millisecondsPerPage, limits.signal, readPage(proxy, layers));
    if (isTextToTrust(described)) {
      pages.push(Promise.resolve(described.page));
      proxy.cleanup();
      continue;
    }
    const prepared = await prepare(proxy, described, limits);
    scanned++;
    if (prepared.photograph) photographed++;
    // One page is read while the next is prepared, and no more than that are held.
    await pages.at(-1);
    pages.push(read(prepared, described, tools));
    pages.at(-1)?.catch(() => undefined);
    proxy.cleanup();
  }
  const kindOfScan = photographed * 2 > scanned ? 'photo' : 'scan';
  return { kind: scanned === 0 ? 'digital' : kindOfScan, pages: await Promise.all(pages) };
}

function isTextToTrust({ page, drawn, readable }: DescribedPage): boolean {
  if (readable < LEAST_READABLE) return false;
  if (shareCovered(drawn, [0, 0, page.width, page.height]) > SCAN_COVERS) return false;
  if (page.words.length >= FEW_WORDS) return true;
  return drawn.paths.length < MANY_OUTLINES && shareCovered(drawn, [0, 0, page.width, page.height]) < 0.1;
}

async function prepare(proxy: PDFPageProxy, described: DescribedPage, limits: Limits): Promise<Prepared> {
  const { drawn, box } = described.describeUnturned();
  const picture = pictureOfPage(proxy, drawn, box).then(coarsen);
  return preparePage(await within(limits.millisecondsPerPage, limits.signal, picture));
}

async function read(
  prepared: Prepared,
  described: DescribedPage,
  { limits, recogniser }: Tools,
): Promise<Page> {
  const page = await within(limits.millisecondsPerPage, limits.signal, recognisePage(prepared, recogniser));
  const layer = layerOf(described, page);
  return { ...reconcileLayer(page, layer), number: described.page.number };
}

/** The text that came with a scan, seen or not, on the page as it was turned to be read. */
function layerOf({ page }: DescribedPage, recognised: Page): HiddenText[] {
  const turn = (((recognised.turned - page.turned) % 360) + 360) % 360;
  const projection = quarterTurn(turn as Page['turned'], page.width, page.height);
  const seen = page.words.map(({ text, box }): HiddenText => ({ text, box, why: 'covered' }));
  return [...page.hidden, ...seen].map((word) => ({
    ...word,
    box: boxThroughProjection(projection, word.box) as Box,
  }));
}
