'use client';
import { useWrite } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { CheckList, CheckRow } from '@/components/ui/check-row';
import { getCertificate, listCertificates } from '@/lib/certificates/contract';
import { recordCertificate } from '@/lib/certificates/prove-contract';
import { getCertificateReading, readCertificateAgain } from '@/lib/readings/contract';
import { qualityOf } from '@/lib/readings/quality';

import { InFile } from './in-file';
import { ReadFacts } from './read-facts';
import type { Proving } from './use-proving';

/** What the machine made of the page: what stands against it first, then all it is sure of in one press. */
export function ReadingSummary({ proving }: { proving: Proving }) {
  const { data } = proving.reading;
  if (!data) return null;
  if (data.state === 'waiting')
    return (
      <p role="status" className="pb-2 text-second text-quiet">
        Reading the certificate. You can begin by eye.
      </p>
    );
  if (data.state !== 'read') return <NotRead proving={proving} fault={data.fault} />;
  const notes = data.observations;
  return (
    <div className="border-t-heavy border-ink pt-2 pb-2">
      <InFile proving={proving} />
      <CheckList label="What stands against it">
        {data.discrepancies.map((one) => (
          <CheckRow
            key={`${one.code} ${one.line} ${one.message}`}
            level={one.severity === 'blocks' ? 'stop' : 'warn'}
            sentence={one.line === null ? one.message : `Line ${one.line}: ${one.message}`}
          />
        ))}
        {notes.map((note) => (
          <CheckRow key={note} level="note" sentence={note} />
        ))}
      </CheckList>
      <div className="flex flex-wrap items-baseline gap-x-3 gap-y-1 pt-2">
        {proving.canEdit && <ConfirmAll proving={proving} />}
        <span className="text-second text-quiet">
          {data.discrepancies.length === 0 ? 'Nothing stands against it. ' : ''}
          Read by the machine in {(data.seconds ?? 0).toFixed(1)} s. It proposes; you decide.
        </span>
      </div>
      <ReadFacts proving={proving} />
    </div>
  );
}

function NotRead({ proving, fault }: { proving: Proving; fault: string | null }) {
  const { certificate } = proving.data;
  const mayAsk = useMay('certificate.add');
  const again = useWrite(readCertificateAgain, { refreshes: [getCertificateReading] });
  return (
    <CheckList label="Reading">
      <CheckRow
        level={fault === null ? 'note' : 'warn'}
        sentence={fault ?? 'The machine has not read this file.'}
        rest="The file is kept as it came; prove it by eye."
        waysOut={
          mayAsk && (
            <Button
              look="word"
              busy={again.isPending}
              onClick={() => again.mutateAsync({ certificateId: certificate.id }).catch(() => undefined)}
            >
              {fault === null ? 'Have it read' : 'Have it read again'}
            </Button>
          )
        }
      />
    </CheckList>
  );
}

/** Number and date, every requirement that is met and was read well, and the pieces: one press for a clean page. */
function ConfirmAll({ proving }: { proving: Proving }) {
  const record = useWrite(recordCertificate, { refreshes: [getCertificate, listCertificates] });
  const { data, reading } = proving;
  const isSure = (confidence: number | null) => confidence !== null && qualityOf(confidence) === 3;
  const open = data.requirements.filter((one) => {
    const proposal = one.decision ? undefined : reading.proposalOf(one.id);
    return proposal?.verdict === 'meets' && isSure(proposal.confidence);
  });
  const lines = data.lines.flatMap((line) => {
    const pieces = reading.piecesOf(line.lineNo)?.pieces ?? 0;
    const isOpen = proving.pieces[line.id] == null && pieces > 0 && pieces <= line.coverable;
    return isOpen ? [[line.id, pieces] as const] : [];
  });
  const { certificate } = data;
  const [number, datedOn] = [reading.data?.certificateNumber, reading.data?.certificateDate];
  const isNumberOpen = certificate.number === null && number != null && datedOn != null;
  const count = open.length + lines.length + (isNumberOpen ? 1 : 0);
  if (count === 0) return null;
  const confirm = async () => {
    if (isNumberOpen)
      await record
        .mutateAsync({ certificateId: certificate.id, version: certificate.version, number, datedOn })
        .catch(() => undefined);
    if (open.length > 0)
      await proving.decideAll(
        open,
        { verdict: 'meets', stated: 'as ordered' },
        (one) => reading.proposalOf(one.id)?.stated || 'as ordered',
      );
    proving.setAllPieces(Object.fromEntries(lines));
  };
  return (
    <Button shortcut="W" onClick={confirm}>
      Confirm {count} read well
    </Button>
  );
}
