import { createHash } from 'node:crypto';

import type { ChartPicture } from '@/lib/pdf/chart-picture';
import { DossierDocument } from '@/lib/pdf/dossier-document';
import { renderPdf } from '@/lib/pdf/render-pdf';

import type { DossierContent } from './content';

interface Rendered {
  statedAt: Date;
  /** By the chart's id. */
  pictures: ReadonlyMap<string, ChartPicture>;
}

/** The dossier as one document: same content, pictures and time, same bytes. Letter where the shop is in America, else A4. */
export function renderDossier(content: DossierContent, { statedAt, pictures }: Rendered): Promise<Buffer> {
  const hash = createHash('sha256').update(JSON.stringify(content)).digest('hex');
  return renderPdf(
    <DossierDocument
      content={content}
      pictures={pictures}
      statedAt={statedAt}
      hash={hash}
      sheet={content.shop.zone.startsWith('America/') ? 'letter' : 'a4'}
    />,
  );
}
