import type { Page } from '../../page';
import { within, type Limits } from '../limits';
import type { Opened } from '../open-file';
import { asUnreadable, openDocument } from './open-document';
import { readPage, type Layers } from './read-page';

/** Opens a PDF's pages in their order. */
export async function openPdf(
  bytes: Uint8Array,
  { password, limits }: { password?: string | undefined; limits: Limits },
): Promise<Opened> {
  const document = await openDocument(bytes, { password, limits });
  try {
    const layers = (await document.getOptionalContentConfig()) as Layers;
    const pages: Page[] = [];
    for (let number = 1; number <= document.numPages; number++) {
      const proxy = await document.getPage(number);
      const { page } = await within(limits.millisecondsPerPage, limits.signal, readPage(proxy, layers));
      pages.push(page);
      proxy.cleanup();
    }
    return { kind: 'digital', pages };
  } catch (cause) {
    throw asUnreadable(cause);
  } finally {
    await document.loadingTask.destroy();
  }
}
