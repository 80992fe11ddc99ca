import { createHash } from 'node:crypto';

import { DossierDocument } from '@/lib/pdf/dossier-document';
import { renderPdf } from '@/lib/pdf/render-pdf';

import type { DossierContent } from './content';

/** The dossier as one document: same content and time, same bytes. Letter where the shop is in America, else A4. */
export function renderDossier(content: DossierContent, statedAt: Date): Promise<Buffer> {
  const hash = createHash('sha256').update(JSON.stringify(content)).digest('hex');
  return renderPdf(
    <DossierDocument
      content={content}
      statedAt={statedAt}
      hash={hash}
      sheet={content.shop.zone.startsWith('America/') ? 'letter' : 'a4'}
    />,
  );
}
