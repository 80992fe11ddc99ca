'use client';
import Link from 'next/link';
import { useState, type KeyboardEvent } from 'react';

import { HoldForm } from '@/components/nonconformances/hold-form';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { NumberInput } from '@/components/ui/field';
import type { Verdict } from '@/components/ui/marks';
import { Pieces } from '@/components/ui/pieces';
import { Cell, Row } from '@/components/ui/table';
import { VerdictWord } from '@/components/ui/verdict';
import type { ProvedLine } from '@/lib/certificates/contract';

import { lineName } from './certificate-words';
import { RowButton } from './requirement-row';
import { RowNumber } from './row-number';
import type { Proving } from './use-proving';

export function LineRows({ proving }: { proving: Proving }) {
  return proving.data.lines.map((line) => <LineRow key={line.id} line={line} proving={proving} />);
}

function LineRow({ line, proving }: { line: ProvedLine; proving: Proving }) {
  const selected = proving.selected === line.id;
  const canEdit = proving.canEdit && line.coverable > 0;
  const entered = proving.pieces[line.id] ?? null;
  const verdict = verdictOf(line, entered);
  const read = proving.reading.piecesOf(line.lineNo)?.pieces;
  const confirm = () => {
    if (entered === null)
      proving.setPieces(line.id, read === undefined ? line.coverable : Math.min(read, line.coverable));
    proving.onward(line.id);
  };
  return (
    <>
      <Row selected={selected}>
        <Cell className="w-7">
          <RowNumber number={proving.rows.indexOf(line.id) + 1} verdict={verdict} />
        </Cell>
        <Cell>
          <RowButton
            rowId={line.id}
            selected={selected}
            says={`${line.lineNo} ${lineName(line)}`}
            onSelect={() => proving.select(line.id)}
            onConfirm={canEdit ? confirm : undefined}
          />
        </Cell>
        <Cell code head="Ordered" className="text-[0.78rem]">
          {line.pieces}
        </Cell>
        <Cell code strong head="This one covers" className="text-[0.78rem]">
          {entered ?? (line.here > 0 ? line.here : <span className="font-normal">{read}</span>)}
        </Cell>
        <Cell className="max-md:hidden" />
        <Cell>
          <VerdictWord verdict={verdict} says={verdictWords(line, entered)} />
        </Cell>
        <Cell right>
          <span className="text-quiet">{yourWords(line, entered)}</span>
        </Cell>
      </Row>
      {selected && <LineOpen line={line} proving={proving} canEdit={canEdit} />}
    </>
  );
}

/** Whether, with what is entered, all pieces of the line that came back are spoken for. */
function verdictOf(line: ProvedLine, entered: number | null): Verdict {
  if (line.covered + (entered ?? 0) >= line.pieces) return 'meets';
  if (entered === null && line.coverable > 0) return 'to_decide';
  return 'not_stated';
}

function verdictWords(line: ProvedLine, entered: number | null): string {
  return `${line.covered + (entered ?? 0)} of ${line.pieces} covered`;
}

function yourWords(line: ProvedLine, entered: number | null): string {
  if (entered !== null) return 'entered';
  return line.here > 0 ? 'signed' : '';
}

function LineOpen({ line, proving, canEdit }: { line: ProvedLine; proving: Proving; canEdit: boolean }) {
  const mayHold = useMay('nonconformance.raise');
  const [holding, setHolding] = useState(false);
  const why = proving.reading.piecesOf(line.lineNo)?.why;
  return (
    <tr role="row">
      <td role="cell" colSpan={7} className="border-b-heavy border-ink bg-bench">
        <div className="flex flex-col gap-2.5 py-2 pl-9 max-md:pl-0">
          <p className="text-second">
            {line.partName}, lot {line.lotNumber}: <Pieces count={line.pieces} /> ordered,{' '}
            <Pieces count={line.inQuarantine} /> in quarantine
            {line.away > 0 && (
              <>
                , <Pieces count={line.away} /> still away
              </>
            )}
            {line.onHold > 0 && (
              <>
                , <Pieces count={line.onHold} /> on hold
              </>
            )}
            . <Elsewhere line={line} />
          </p>
          {why && <p className="text-second">As read: {why}</p>}
          {canEdit && <Entering line={line} proving={proving} />}
          {proving.canEdit && line.coverable === 0 && (
            <p className="text-second text-quiet">
              No piece in quarantine is without proof, so this certificate can cover none now.
            </p>
          )}
          {holding ? (
            <HoldForm
              batchId={proving.data.batch.id}
              onlyLineId={line.id}
              certificateId={proving.data.certificate.id}
              kind="papers"
              what="In no certificate"
              onDone={() => setHolding(false)}
            />
          ) : (
            mayHold &&
            line.inQuarantine > 0 && (
              <span>
                <Button size="small" look="stop" shortcut="H" onClick={() => setHolding(true)}>
                  Hold pieces
                </Button>
              </span>
            )
          )}
        </div>
      </td>
    </tr>
  );
}

function Elsewhere({ line }: { line: ProvedLine }) {
  if (line.elsewhere.length === 0) return 'No other certificate covers it.';
  return line.elsewhere.map((other, at) => (
    <span key={other.certificateId}>
      {at > 0 && ', '}
      <Link href={`/certificates/${other.certificateId}`}>{other.number ?? 'another'}</Link> covers{' '}
      <Pieces count={other.pieces} />
    </span>
  ));
}

function Entering({ line, proving }: { line: ProvedLine; proving: Proving }) {
  const [typed, setTyped] = useState(String(proving.pieces[line.id] ?? ''));
  const count = /^\d+$/.test(typed.trim()) ? Number(typed) : null;
  const error =
    typed.trim() !== '' && (count === null || count > line.coverable)
      ? `${line.coverable} came back good and uncovered. Enter ${line.coverable} or less.`
      : undefined;
  const type = (text: string) => {
    setTyped(text);
    const entered = /^\d+$/.test(text.trim()) ? Number(text) : null;
    proving.setPieces(line.id, entered !== null && entered <= line.coverable ? entered : null);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Escape') proving.toRow(line.id);
    if (event.key !== 'Enter') return;
    event.preventDefault();
    if (!error && typed.trim() !== '') proving.onward(line.id);
  };
  return (
    <div className="flex flex-wrap items-start gap-2">
      <NumberInput
        className="w-52"
        label="Pieces it covers"
        unit="pc"
        inputMode="numeric"
        data-key="e"
        data-key-says="Enter the pieces it covers"
        value={typed}
        error={error}
        onChange={(event) => type(event.currentTarget.value)}
        onKeyDown={onKeyDown}
      />
      <span className="pt-6">
        <Button onClick={() => type(String(line.coverable))}>All {line.coverable}</Button>
      </span>
    </div>
  );
}
