'use client';
import { Button } from '@/components/ui/button';
import { Kbd } from '@/components/ui/kbd';

import type { Proving } from './use-proving';

/** How far it is, and on to the signature. */
export function ProveFoot({ proving, onSign }: { proving: Proving; onSign: () => void }) {
  const { data, decided, rows, readiness } = proving;
  const left = rows.length - decided;
  const pieces = readiness.pieces;
  return (
    <div className="sticky bottom-0 z-10 border-t-heavy border-ink bg-paper px-6 py-3 max-md:static max-md:px-4">
      <div className="flex flex-wrap items-start justify-between gap-x-6 gap-y-2">
        <div className="min-w-[min(18rem,100%)] flex-1">
          <strong className="font-cond text-section">
            <span className="num">{decided}</span> of <span className="num">{rows.length}</span> decided.{' '}
            {left > 0 && proving.canEdit && (
              <>
                <span className="num">{left}</span> {left === 1 ? 'is' : 'are'} yours to decide.
              </>
            )}
          </strong>
          <p className="text-second">
            <span className="text-quiet">Covered so far: </span>
            {data.lines.map((line, at) => {
              const covered = line.covered + (proving.pieces[line.id] ?? 0);
              return (
                <span key={line.id} className="whitespace-nowrap">
                  {at > 0 && ', '}line {line.lineNo}{' '}
                  <strong className={`num ${covered < line.pieces ? 'text-dispatched-ink' : ''}`}>
                    {covered} of {line.pieces}
                  </strong>
                </span>
              );
            })}
          </p>
        </div>
        <SignButton proving={proving} onSign={onSign} pieces={pieces} />
      </div>
      <div className="flex flex-wrap gap-x-3 gap-y-1 pt-2">
        <Kbd keys="J K" says="row" />
        <Kbd keys="Enter" says={proving.reading.data?.state === 'read' ? 'confirm as read' : 'as ordered'} />
        <Kbd keys="E" says="enter" />
        <Kbd keys="O" says="override" />
        <Kbd keys="H" says="hold" />
        <Kbd keys="[ ]" says="page" />
        <Kbd keys="+ -" says="zoom" />
        <Kbd keys="?" says="all keys" />
      </div>
    </div>
  );
}

function SignButton({ proving, onSign, pieces }: { proving: Proving; onSign: () => void; pieces: number }) {
  const notNow = whyNotNow(proving);
  if (!proving.mayProve)
    return <p className="text-second text-quiet">Inspectors prove and sign. You see what they see.</p>;
  return (
    <div className="w-[16.75rem] flex-none text-right max-md:w-full">
      <Button
        look="primary"
        size="big"
        notNow={notNow ?? undefined}
        reasonAt="below"
        onClick={onSign}
        className="min-w-44 max-md:w-full"
      >
        {pieces > 0 ? `Sign for ${pieces} pieces` : 'Sign'}
      </Button>
    </div>
  );
}

function whyNotNow({ data, readiness }: Proving): string | null {
  if (data.certificate.setAsideAt !== null) return 'It is set aside.';
  if (!data.file.verified) return 'The file did not arrive whole.';
  if (data.dispatchedByYou === 'refuse')
    return `You dispatched ${data.batch.number}. Here another person accepts its certificates.`;
  if (data.lines.every((line) => line.coverable === 0))
    return data.lines.some((line) => line.covered > 0)
      ? 'All that came back is covered.'
      : 'Nothing is in quarantine yet. Count in first.';
  if (data.certificate.number === null || data.certificate.datedOn === null)
    return 'Enter its number and date first.';
  return readiness.why;
}
