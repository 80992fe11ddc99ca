'use client';
import { useState, type FormEvent } from 'react';

import { useLazyRead, useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/choice';
import { Failing } from '@/components/ui/failing';
import { NumberInput, SelectField, TextArea } from '@/components/ui/field';
import { Loading } from '@/components/ui/loading';
import { showMessage } from '@/components/ui/message';
import { getBatch, getBatchLines } from '@/lib/batches/contract';
import { getCertificate, listCertificates } from '@/lib/certificates/contract';
import {
  getRaisable,
  listNonconformances,
  raiseNonconformance,
  type RaisableLine,
} from '@/lib/nonconformances/contract';
import { RAISED_KINDS, type RaisedKind } from '@/lib/nonconformances/kind';

const KINDS: Record<RaisedKind, string> = {
  requirement: 'A requirement is not met',
  papers: 'The papers do not prove it',
  damaged: 'Damaged',
};

interface HoldFormProps {
  batchId: string;
  /** The line it is about; null where it is about the whole batch. */
  onlyLineId?: string | null;
  requirementId?: string;
  certificateId?: string;
  kind: RaisedKind;
  what: string;
  onDone: () => void;
}

/** Puts pieces in quarantine on hold: how many of which line, and why. Each line gets a nonconformance of its own. */
export function HoldForm({ batchId, onlyLineId = null, ...rest }: HoldFormProps) {
  const { data, error } = useLazyRead(getRaisable, { batchId });
  if (error) return <Failing says="What is in quarantine could not be read." again={error.message} />;
  if (!data) return <Loading rows={1} label="Looking what is in quarantine" />;
  const lines = data.lines.filter((line) => onlyLineId === null || line.lineId === onlyLineId);
  if (lines.length === 0) {
    return (
      <p className="text-second">
        Nothing of it is in quarantine, so nothing can be held.{' '}
        <Button look="word" onClick={rest.onDone}>
          Back
        </Button>
      </p>
    );
  }
  return <Holding batchId={batchId} lines={lines} {...rest} />;
}

function Holding({
  batchId,
  lines,
  kind: given,
  what: begun,
  requirementId = null,
  certificateId = null,
  onDone,
}: Omit<HoldFormProps, 'onlyLineId' | 'requirementId' | 'certificateId'> & {
  lines: readonly RaisableLine[];
  requirementId?: string | null;
  certificateId?: string | null;
}) {
  const [kind, setKind] = useState<RaisedKind>(given);
  const [what, setWhat] = useState(begun);
  const [counts, setCounts] = useState<Record<string, string>>(() =>
    Object.fromEntries(lines.map((line) => [line.lineId, line.serialised ? '0' : String(line.inQuarantine)])),
  );
  const [ticked, setTicked] = useState<readonly string[]>([]);
  const [refused, setRefused] = useState('');
  const write = useWrite(raiseNonconformance, {
    refreshes: [getCertificate, listCertificates, getRaisable, listNonconformances, getBatch, getBatchLines],
  });

  const countOf = (line: RaisableLine) =>
    line.serialised
      ? line.pieces.filter((piece) => ticked.includes(piece.id)).length
      : readCount(counts[line.lineId] ?? '');
  const total = lines.reduce((sum, line) => sum + (countOf(line) ?? 0), 0);
  const faults = Object.fromEntries(
    lines.map((line) => [line.lineId, faultOf(countOf(line), line.inQuarantine)]),
  );

  const hold = async (event: FormEvent) => {
    event.preventDefault();
    if (write.isPending || Object.values(faults).some(Boolean)) return;
    if (total === 0) return setRefused('Say how many pieces are held.');
    if (what.trim() === '') return setRefused('Say what is wrong.');
    const numbers: string[] = [];
    try {
      for (const line of lines.filter((one) => (countOf(one) ?? 0) > 0)) {
        const pieceIds = line.serialised
          ? line.pieces.filter((piece) => ticked.includes(piece.id)).map((piece) => piece.id)
          : [];
        const { number } = await write.mutateAsync({
          batchId,
          lineId: line.lineId,
          kind,
          pieces: countOf(line) ?? 0,
          what: what.trim(),
          requirementId,
          certificateId,
          pieceIds,
        });
        numbers.push(number);
      }
      showMessage({
        says: `${total} on hold, ${numbers.join(', ')}.`,
        action: { says: 'Open the list', href: '/nonconformances' },
      });
      onDone();
    } catch (error) {
      const done =
        numbers.length > 0
          ? `${numbers.join(', ')} ${numbers.length === 1 ? 'is' : 'are'} raised; the rest is not. `
          : '';
      setRefused(done + (error instanceof Error ? error.message : 'Not held.'));
    }
  };

  return (
    <form noValidate onSubmit={hold} aria-label="Hold pieces" className="flex max-w-prose flex-col gap-3">
      <SelectField
        label="Why"
        value={kind}
        options={RAISED_KINDS.map((value) => ({ value, says: KINDS[value] }))}
        onChange={(event) => setKind(event.currentTarget.value as RaisedKind)}
      />
      {lines.map((line) =>
        line.serialised ? (
          <SerialTicks key={line.lineId} line={line} ticked={ticked} onTick={setTicked} />
        ) : (
          <NumberInput
            key={line.lineId}
            className="w-60"
            label={`Line ${line.lineNo}, ${line.partNumber}`}
            unit={`of ${line.inQuarantine}`}
            inputMode="numeric"
            value={counts[line.lineId] ?? ''}
            error={faults[line.lineId] ?? undefined}
            onChange={(event) => setCounts({ ...counts, [line.lineId]: event.currentTarget.value })}
          />
        ),
      )}
      <TextArea
        label="What is wrong"
        rows={2}
        value={what}
        maxLength={500}
        onChange={(event) => setWhat(event.currentTarget.value)}
      />
      {refused && (
        <p role="alert" className="font-medium text-held-ink">
          {refused}
        </p>
      )}
      <div className="flex flex-wrap gap-2">
        <Button look="stop" type="submit" busy={write.isPending} busyLabel={`Holding ${total}`}>
          Hold {total}
        </Button>
        <Button onClick={onDone}>Hold none</Button>
      </div>
    </form>
  );
}

function SerialTicks({
  line,
  ticked,
  onTick,
}: {
  line: RaisableLine;
  ticked: readonly string[];
  onTick: (ids: string[]) => void;
}) {
  return (
    <fieldset>
      <legend className="font-cond text-word">
        Line {line.lineNo}, {line.partNumber}: which pieces
      </legend>
      <div className="flex flex-wrap gap-x-5">
        {line.pieces.map((piece) => (
          <Checkbox
            key={piece.id}
            says={<span className="num">{piece.serial}</span>}
            checked={ticked.includes(piece.id)}
            onChange={(event) =>
              onTick(
                event.currentTarget.checked ? [...ticked, piece.id] : ticked.filter((id) => id !== piece.id),
              )
            }
          />
        ))}
      </div>
    </fieldset>
  );
}

const readCount = (typed: string): number | null => (/^\d+$/.test(typed.trim()) ? Number(typed) : null);

function faultOf(count: number | null, most: number): string | null {
  if (count === null) return `Enter a whole number, 0 to ${most}.`;
  return count > most ? `${most} in quarantine. Enter ${most} or less.` : null;
}
