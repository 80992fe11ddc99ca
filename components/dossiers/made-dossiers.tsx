'use client';
import { useLazyRead, useRead, useWrite } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Failing } from '@/components/ui/failing';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { type DossierMade, listMadeDossiers, requestDossier } from '@/lib/dossiers/contract';

interface MadeDossiersProps {
  lotId: string;
  originals: number;
  /** The last time that anything of the lot moved. */
  movedAt: string | null;
}

const LOOK_AGAIN_MS = 1500;
const LOOK_AFTER_FAILURE_MS = 10_000;

/** The document and the archive: asked for, being made, made. */
export function MadeDossiers({ lotId, originals, movedAt }: MadeDossiersProps) {
  const { data } = useRead(listMadeDossiers, { lotId });
  const write = useWrite(requestDossier, { refreshes: [listMadeDossiers] });
  // One that was never made is past as soon as a later one is asked for.
  const waiting = data.rows[0]?.finished === false ? data.rows[0] : undefined;
  const made = data.rows.filter((one) => one.finished);
  const isOld = made[0] !== undefined && movedAt !== null && movedAt > made[0].statedAt;
  const ask = () =>
    write
      .mutateAsync({ lotId })
      .catch((error: unknown) =>
        showMessage({ says: error instanceof Error ? error.message : 'It was not asked for.', failed: true }),
      );
  return (
    <Section title="Document and archive">
      {data.rows.length === 0 && (
        <p className="py-2">
          One PDF that says all of this, and one archive with the{' '}
          {originals === 1 ? 'original' : `${originals} originals`}, the data and a list of hashes that
          anybody can check.
        </p>
      )}
      <div role="status">
        {waiting && <BeingMade lotId={lotId} dossier={waiting} originals={originals} />}
      </div>
      {made.map((dossier, at) => (
        <Made key={dossier.id} dossier={dossier} isOld={at === 0 && isOld} />
      ))}
      <div className="pt-3">
        <Button
          look={made.length === 0 ? 'primary' : 'outlined'}
          busy={write.isPending}
          busyLabel="Asking"
          onClick={ask}
          notNow={waiting?.failure === null && 'It is being made now.'}
          reasonAt="below"
        >
          {made.length === 0 ? 'Make document and archive' : 'Make them anew'}
        </Button>
      </div>
    </Section>
  );
}

function BeingMade({
  lotId,
  dossier,
  originals,
}: {
  lotId: string;
  dossier: DossierMade;
  originals: number;
}) {
  // The same read under the same key: what comes is shown above.
  useLazyRead(
    listMadeDossiers,
    { lotId },
    { refreshEveryMs: dossier.failure === null ? LOOK_AGAIN_MS : LOOK_AFTER_FAILURE_MS },
  );
  const clock = useClock();
  if (dossier.failure !== null) {
    return (
      <Failing
        says="It was not made."
        stands={dossier.failure}
        again="It is tried again by itself, a few times; after that an admin finds it under failed work. Nothing of the lot is changed."
      />
    );
  }
  return (
    <p className="border-l-4 border-settled py-1 pl-3">
      <strong>Being made</strong>, with {originals === 1 ? 'the original' : `${originals} originals`}. Asked
      for <Moment at={new Date(dossier.statedAt)} clock={clock} /> by {dossier.requestedBy}. One may leave
      this page meanwhile.
    </p>
  );
}

function Made({ dossier, isOld }: { dossier: DossierMade; isOld: boolean }) {
  const clock = useClock();
  return (
    <div className="border-b border-rule py-2">
      <p className="flex flex-wrap gap-x-4">
        <a
          className="lw-word-button"
          href={`/api/files/${dossier.documentFileId ?? ''}/content?inline=1`}
          target="_blank"
          rel="noreferrer"
        >
          Document, PDF
        </a>
        <a className="lw-word-button" href={`/api/files/${dossier.archiveFileId ?? ''}/content`}>
          Archive, ZIP
        </a>
      </p>
      <p className="text-second text-quiet">
        as it stood <Moment at={new Date(dossier.statedAt)} clock={clock} />, {dossier.requestedBy}
      </p>
      {isOld && (
        <p className="text-second text-dispatched-ink">
          Pieces have moved since. Make them anew to have it in.
        </p>
      )}
    </div>
  );
}
