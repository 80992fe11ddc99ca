import { contentHash } from '@/lib/travellers/content-hash';
import type { PaperContent } from '@/lib/travellers/content';

import { OrderDocument } from './order-document';
import { renderPdf } from './render-pdf';
import { TravellerDocument } from './traveller-document';

/**
 * A batch's paper from what was stated.
 *
 * @param tokenOf the key of a link by its id; handed in because the content does not hold it.
 */
export function renderPaper(content: PaperContent, tokenOf: (linkId: string) => string): Promise<Buffer> {
  const hash = contentHash(content);
  if (content.kind === 'purchase_order') return renderPdf(<OrderDocument content={content} hash={hash} />);
  const url = content.link && `${content.link.base}${tokenOf(content.link.linkId)}`;
  return renderPdf(<TravellerDocument content={content} url={url} hash={hash} />);
}
