import { PrintFoot } from '@/components/shell/print-foot';
import { PrintButton } from '@/components/stock/print-button';
import { Caution } from '@/components/ui/edge';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import type { OutputOf } from '@/lib/api/endpoint';
import { dayWords } from '@/lib/day-words';
import type { openDossierLink } from '@/lib/dossiers/contract';

import { DossierCells } from './dossier-cells';
import { Evidence } from './evidence';
import { ALWAYS_WITH_YEAR } from './evidence-words';
import { When } from './when';

interface SharedDossierProps {
  token: string;
  opened: OutputOf<typeof openDossierLink>;
}

/** The dossier for somebody outside: the same evidence, to read and to keep. */
export function SharedDossier({ token, opened: { evidence, forWhom, expiresAt, made } }: SharedDossierProps) {
  const files = `/api/shared-dossiers/${encodeURIComponent(token)}/files/`;
  const { shop } = evidence;
  return (
    <>
      <p className="pt-4 text-second text-quiet">
        {shop.name} shows this to <strong className="text-ink">{forWhom}</strong>, until{' '}
        {dayWords(new Date(expiresAt), { zone: shop.zone, now: ALWAYS_WITH_YEAR })}. Times are those of{' '}
        {shop.name}.
      </p>
      <PageHead
        title={
          <>
            Dossier of <span className="num">{evidence.lot.number}</span>
          </>
        }
        cells={<DossierCells evidence={evidence} />}
        actions={<PrintButton says="Print this page" look="outlined" />}
      />
      <div className="flex flex-col gap-6">
        <div className="no-print">
          <Section title="Document and archive">
            {made?.documentFileId && made.archiveFileId ? (
              <p className="flex flex-wrap items-baseline gap-x-5 gap-y-1 py-1">
                <a
                  className="lw-word-button"
                  href={`${files}${made.documentFileId}?inline=1`}
                  target="_blank"
                  rel="noreferrer"
                >
                  Document, PDF
                </a>
                <a className="lw-word-button" href={`${files}${made.archiveFileId}`}>
                  Archive, ZIP
                </a>
                <span className="text-second text-quiet">
                  as it stood <When at={made.statedAt} zone={shop.zone} />. The archive holds every original
                  and SHA256SUMS, which <code>sha256sum -c</code> reads.
                </span>
              </p>
            ) : (
              <p className="py-2 text-quiet">
                {shop.name} has not made them yet. Each original stands below, to read and to keep.
              </p>
            )}
          </Section>
        </div>
        <Evidence evidence={evidence} filesAt={files} filesEnd="" />
        <Caution>
          The dossier records; it releases nothing by itself. The drawing, the order and the governing
          specification at its invoked revision come first.
        </Caution>
      </div>
      <PrintFoot organisation={shop.name} person={`For ${forWhom}`} />
    </>
  );
}
