'use client';
import { useRead } from '@/components/api/use-api';
import { PrintButton } from '@/components/stock/print-button';
import { ButtonLink } from '@/components/ui/button';
import { Caution } from '@/components/ui/edge';
import { PageHead } from '@/components/ui/page-head';
import { MainAndSide } from '@/components/ui/section';
import { getDossier } from '@/lib/dossiers/contract';

import { DossierCells } from './dossier-cells';
import { DossierLinks } from './dossier-links';
import { Evidence } from './evidence';
import { MadeDossiers } from './made-dossiers';

/** Why this part may fly: all the evidence of a lot, to read, to keep and to give out. */
export function DossierScreen({ lotId }: { lotId: string }) {
  const { evidence, links } = useRead(getDossier, { lotId }).data;
  return (
    <>
      <PageHead
        title={
          <>
            Dossier of <span className="num">{evidence.lot.number}</span>
          </>
        }
        cells={<DossierCells evidence={evidence} />}
        actions={
          <>
            <ButtonLink href={`/lots/${lotId}`}>To the lot</ButtonLink>
            <PrintButton says="Print this page" look="outlined" />
          </>
        }
      />
      <MainAndSide
        main={<Evidence evidence={evidence} filesAt="/api/files/" filesEnd="/content" />}
        side={
          <div className="no-print flex flex-col gap-6">
            <MadeDossiers
              lotId={lotId}
              originals={evidence.files.length}
              movedAt={evidence.movements.at(-1)?.at ?? null}
            />
            <DossierLinks lotId={lotId} links={links} />
            <Caution>
              The dossier records; it releases nothing by itself. The drawing, the order and the governing
              specification at its invoked revision come first.
            </Caution>
          </div>
        }
      />
    </>
  );
}
