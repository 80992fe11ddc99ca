import type { Page } from '../page';
import { within, type Limits } from './limits';
import { preparePage, type PagePicture } from './prepare-page';
import { recognisePage } from './recognise-page';
import { coarsen } from './resize';
import type { Recogniser } from './recogniser';

/**
 * Recognises pages one after the other. While the recogniser's thread reads one, the next is decoded and prepared.
 *
 * `photograph` is whether any page was taken by a camera.
 */
export async function recognisePages(
  pictures: readonly (() => Promise<PagePicture>)[],
  { limits, recogniser }: { limits: Limits; recogniser: Recogniser },
): Promise<{ pages: Page[]; photograph: boolean }> {
  const pages: Page[] = [];
  let photograph = false;
  let reading: Promise<Page> | null = null;
  for (const picture of pictures) {
    const prepared = preparePage(
      await within(limits.millisecondsPerPage, limits.signal, picture().then(coarsen)),
    );
    photograph ||= prepared.photograph;
    if (reading) pages.push(await reading);
    reading = within(limits.millisecondsPerPage, limits.signal, recognisePage(prepared, recogniser));
    // Its failure is met where it is awaited; until then it must not count as unheard.
    reading.catch(() => undefined);
  }
  if (reading) pages.push(await reading);
  return { pages, photograph };
}
