'use client';
import { useState, type FormEvent } from 'react';

import { useWrite } from '@/components/api/use-api';
import { useMe } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { VerdictMark } from '@/components/ui/marks';
import { showMessage } from '@/components/ui/message';
import type { ApiError } from '@/lib/api/client';
import { getCertificate, listCertificates } from '@/lib/certificates/contract';
import { signCertificate } from '@/lib/certificates/prove-contract';

import { certificateName, hashStart } from './certificate-words';
import type { Proving } from './use-proving';

interface SignStepProps {
  proving: Proving;
  onBack: () => void;
  onSigned: () => void;
}

/** Beyond a week the paper was not looked at, it was left open. */
const MOST_SECONDS = 7 * 24 * 3600;

/** What is signed, line by line, the sentence, and the hand of one's own. */
export function SignStep({ proving, onBack, onSigned }: SignStepProps) {
  const me = useMe();
  const write = useWrite(signCertificate, { refreshes: [getCertificate, listCertificates] });
  const [refusal, setRefusal] = useState<{ password?: string; rest?: string }>({});
  const { data, coverage, readiness } = proving;
  const { pieces } = readiness;

  const sign = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (write.isPending) return;
    const form = event.currentTarget;
    const password = new FormData(form).get('password');
    if (typeof password !== 'string' || password === '')
      return setRefusal({ password: 'Enter your password.' });
    const decisions = data.requirements.flatMap(({ id, decision }) =>
      decision ? [{ requirementId: id, version: decision.version }] : [],
    );
    try {
      await write.mutateAsync({
        certificateId: data.certificate.id,
        version: data.certificate.version,
        coverage,
        decisions,
        password,
        reviewSeconds: Math.min(proving.secondsOpen(), MOST_SECONDS),
      });
      proving.forgetPieces();
      onSigned();
      showMessage({
        says: `Signed for ${pieces}. ${certificateName(data.certificate)} covers them.`,
        action: { says: `Open ${data.batch.number}`, href: `/batches/${data.batch.id}` },
      });
    } catch (error) {
      form.reset();
      setRefusal(refusalOf(error as ApiError));
    }
  };

  return (
    <form
      noValidate
      onSubmit={sign}
      aria-label="Sign"
      className="sticky bottom-0 z-10 border-t-heavy border-ink bg-bench px-6 py-3 max-md:static max-md:px-4"
    >
      <div className="grid grid-cols-1 gap-x-6 gap-y-3 md:grid-cols-[minmax(0,1fr)_268px]">
        <WhatIsSigned proving={proving} />
        <div className="flex flex-col gap-3">
          <TextField
            label={`Password of ${me?.name ?? 'yours'}`}
            name="password"
            type="password"
            autoComplete="current-password"
            autoFocus
            error={refusal.password}
          />
          <div className="flex flex-wrap gap-2">
            <Button
              look="primary"
              size="big"
              type="submit"
              className="flex-1"
              busy={write.isPending}
              busyLabel={`Signing for ${pieces}`}
            >
              Sign for {pieces}
            </Button>
            <Button size="big" onClick={onBack}>
              Back
            </Button>
          </div>
          {refusal.rest && (
            <p role="alert" className="text-row font-medium text-held-ink">
              {refusal.rest}
            </p>
          )}
        </div>
      </div>
      <p className="pt-2 text-source text-quiet">
        “{data.sentence}”{' '}
        {data.file.sha256 &&
          `The page, the values and your name are kept together with hash ${hashStart(data.file.sha256)}.`}
      </p>
    </form>
  );
}

function WhatIsSigned({ proving: { data, coverage, readiness } }: { proving: Proving }) {
  const held = data.held.reduce((sum, one) => sum + one.pieces, 0);
  const name = certificateName(data.certificate);
  const overrides = data.requirements.filter(
    (one) => readiness.bearing.includes(one.id) && one.decision?.overrideReason,
  ).length;
  return (
    <div>
      <h2>
        You sign for <span className="num">{readiness.pieces}</span> pieces
        {held > 0 && ` and ${held} on hold stay out`}
      </h2>
      <table className="mt-1 w-full text-string" aria-label="What is covered and what is held">
        <tbody>
          {coverage.map(({ lineId, pieces }) => {
            const line = data.lines.find((one) => one.id === lineId);
            return (
              line && (
                <SignedLine
                  key={lineId}
                  lineNo={line.lineNo}
                  part={`${line.partNumber} ${line.partRevision}`}
                  pieces={pieces}
                  says={`covered by ${name}`}
                  verdict="meets"
                />
              )
            );
          })}
          {data.held.map((one) => (
            <SignedLine
              key={one.id}
              lineNo={one.lineNo}
              part={data.lines.find((line) => line.lineNo === one.lineNo)?.partNumber ?? ''}
              pieces={one.pieces}
              says={`held, ${one.number}: ${one.what}`}
              verdict="does_not_meet"
            />
          ))}
        </tbody>
      </table>
      {overrides > 0 && (
        <p className="pt-1.5 text-second text-quiet">
          {overrides === 1 ? 'One requirement is' : `${overrides} requirements are`} accepted against the
          verdict; the reasons are sealed too.
        </p>
      )}
    </div>
  );
}

interface SignedLineProps {
  lineNo: number;
  part: string;
  pieces: number;
  says: string;
  verdict: 'meets' | 'does_not_meet';
}

function SignedLine({ lineNo, part, pieces, says, verdict }: SignedLineProps) {
  return (
    <tr className="border-b border-rule">
      <td className="num w-6 py-[3px] text-faint">{lineNo}</td>
      <td className="num py-[3px] pr-2 font-semibold">{part}</td>
      <td className="num py-[3px] pr-2.5 text-right font-semibold">{pieces}</td>
      <td className="py-[3px]">
        <span
          className={`inline-flex items-center gap-2 ${verdict === 'meets' ? 'text-proved-ink' : 'text-held-ink'}`}
        >
          <VerdictMark verdict={verdict} size={13} />
          <span className="text-ink">{says}</span>
        </span>
      </td>
    </tr>
  );
}

function refusalOf({ problem }: ApiError): { password?: string; rest?: string } {
  const atPassword = problem.fields?.find((one) => one.field === 'password')?.message;
  return atPassword === undefined ? { rest: problem.title } : { password: atPassword };
}
