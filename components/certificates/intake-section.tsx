'use client';
import { useState } from 'react';

import { useLazyRead, useWrite } from '@/components/api/use-api';
import { FileUpload } from '@/components/files/file-upload';
import { useClock, useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { listCertificates } from '@/lib/certificates/contract';
import {
  addToIntake,
  assignIntake,
  listIntake,
  setAsideIntake,
  type IntakeRow,
} from '@/lib/readings/intake-contract';

const LOOK_AGAIN_MS = 2000;

/** Papers that came on their own: the machine says which batch each may be of, a person says which it is of. */
export function IntakeSection() {
  const mayAdd = useMay('certificate.add');
  const [isOpen, setOpen] = useState(false);
  const add = useWrite(addToIntake, { refreshes: [listIntake] });
  const { data } = useLazyRead(
    listIntake,
    {},
    {
      refreshEveryMs: LOOK_AGAIN_MS,
      refreshWhile: ({ rows }) => rows.some(({ state }) => state === 'waiting'),
    },
  );
  const rows = data?.rows ?? [];
  if (rows.length === 0 && !mayAdd) return null;
  return (
    <Section
      title="Came on its own"
      note={
        rows.length > 0
          ? 'say which batch each is of'
          : 'a certificate by post or mail, its batch not known yet'
      }
      action={
        mayAdd && (
          <Button look="word" onClick={() => setOpen(!isOpen)}>
            {isOpen ? 'Close' : 'Take one in'}
          </Button>
        )
      }
      className="mb-6"
    >
      {isOpen && (
        <div className="pb-3">
          <FileUpload
            purpose="certificate"
            label="Certificate whose batch is not known"
            hint="PDF or picture, up to 50 MB"
            onArrived={(file) => void add.mutateAsync({ fileId: file.id }).catch(tellFailure)}
          />
        </div>
      )}
      <ul aria-label="Papers without a batch">
        {rows.map((row) => (
          <IntakePaper key={row.id} row={row} mayAdd={mayAdd} />
        ))}
      </ul>
    </Section>
  );
}

function IntakePaper({ row, mayAdd }: { row: IntakeRow; mayAdd: boolean }) {
  const clock = useClock();
  const assign = useWrite(assignIntake, { refreshes: [listIntake, listCertificates] });
  const [isAsiding, setAsiding] = useState(false);
  const take = async (batchId: string, batchNumber: string) => {
    const done = await assign.mutateAsync({ intakeId: row.id, batchId }).catch(tellFailure);
    if (done)
      showMessage({
        says: `It is a certificate of ${batchNumber} now.`,
        action: { says: 'Prove it', href: `/certificates/${done.certificateId}` },
      });
  };
  return (
    <li className="border-b border-rule py-2">
      <div className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
        <a
          href={`/api/files/${row.fileId}/content?inline=1`}
          className="num font-semibold"
          target="_blank"
          rel="noreferrer"
        >
          {row.number ?? row.fileName}
        </a>
        <span>{[row.processor, row.order && `order ${row.order}`].filter(Boolean).join(', ')}</span>
        <span className="text-second text-quiet">
          taken in by {row.addedBy}, <Moment at={new Date(row.createdAt)} clock={clock} />
        </span>
      </div>
      {row.state === 'waiting' && (
        <p role="status" className="text-second text-quiet">
          Reading it.
        </p>
      )}
      {row.fault && <p className="text-second">{row.fault}</p>}
      {row.state !== 'waiting' && row.candidates.length === 0 && (
        <p className="text-second">No open order fits it. Add it at its batch, or set it aside.</p>
      )}
      {row.candidates.map((candidate) => (
        <div
          key={candidate.batchId}
          className="flex flex-wrap items-baseline gap-x-3 gap-y-1 pt-1 text-second"
        >
          {mayAdd && (
            <Button
              size="small"
              look={candidate.isClear ? 'primary' : 'outlined'}
              busy={assign.isPending}
              onClick={() => take(candidate.batchId, candidate.batchNumber)}
            >
              It is of {candidate.batchNumber}
            </Button>
          )}
          <span>{candidate.processor}.</span>
          <span className="text-quiet">{candidate.reasons.join(' ')}</span>
        </div>
      ))}
      {mayAdd &&
        (isAsiding ? (
          <SetAside intakeId={row.id} onDone={() => setAsiding(false)} />
        ) : (
          <Button look="word" onClick={() => setAsiding(true)}>
            Set it aside
          </Button>
        ))}
    </li>
  );
}

function SetAside({ intakeId, onDone }: { intakeId: string; onDone: () => void }) {
  const write = useWrite(setAsideIntake, { refreshes: [listIntake] });
  const [reason, setReason] = useState('');
  const fault = write.error?.problem;
  return (
    <form
      noValidate
      className="flex flex-wrap items-end gap-2 pt-2"
      onSubmit={(event) => {
        event.preventDefault();
        write.mutateAsync({ intakeId, reason }).then(onDone, () => undefined);
      }}
    >
      <TextField
        className="max-w-md basis-full"
        label="Why is it of no batch?"
        value={reason}
        maxLength={500}
        autoFocus
        error={fault && (fault.fields?.[0]?.message ?? fault.title)}
        onChange={(event) => setReason(event.currentTarget.value)}
      />
      <Button type="submit" busy={write.isPending}>
        Set it aside
      </Button>
      <Button onClick={onDone}>Back</Button>
    </form>
  );
}

function tellFailure(error: unknown): undefined {
  showMessage({ says: error instanceof Error ? error.message : 'Not kept.', failed: true });
}
