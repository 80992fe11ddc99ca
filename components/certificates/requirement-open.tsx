'use client';
import { useState, type KeyboardEvent } from 'react';

import { HoldForm } from '@/components/nonconformances/hold-form';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import type { ProvedRequirement } from '@/lib/certificates/contract';
import type { Verdict } from '@/lib/certificates/verdict';
import { limitWords } from '@/lib/parts/limit-words';

import { linesOf, undecidedAlike } from './alike';
import { AskForm } from './ask-form';
import { OverrideDialog } from './override-dialog';
import { SpotPicture } from './spot-picture';
import type { Proving } from './use-proving';

interface RequirementOpenProps {
  requirement: ProvedRequirement;
  proving: Proving;
  canEdit: boolean;
}

const SOURCES = { drawing: 'drawing', specification: 'specification', shop: 'shop' } as const;

/** A row opened in place: what it states, the verdict, and the ways out where it does not hold. */
export function RequirementOpen({ requirement, proving, canEdit }: RequirementOpenProps) {
  const mayHold = useMay('nonconformance.raise');
  const mayAsk = useMay('batch.message');
  const [doing, setDoing] = useState<'hold' | 'ask' | null>(null);
  const done = () => setDoing(null);
  const { decision } = requirement;
  const { certificate, batch } = proving.data;
  const processor = batch.processor.split(' ')[0] ?? batch.processor;
  return (
    <tr role="row">
      <td role="cell" colSpan={7} className="border-b-heavy border-ink bg-bench">
        <div className="flex flex-col gap-2.5 py-2 pl-9 max-md:pl-0">
          <p className="text-second">
            <SourceWords requirement={requirement} />
            {decision && (
              <span className="text-quiet">
                {' '}
                Decided by {decision.decidedBy}.{decision.note && ` ${decision.note}`}
              </span>
            )}
          </p>
          <WhatWasRead requirement={requirement} proving={proving} />
          {canEdit && <Judge key={proving.reading.chosen} requirement={requirement} proving={proving} />}
          {doing === null && (
            <div className="flex flex-wrap gap-2">
              {canEdit && decision && decision.verdict !== 'meets' && (
                <OverrideDialog requirement={requirement} proving={proving} />
              )}
              {mayHold && (
                <Button size="small" look="stop" shortcut="H" onClick={() => setDoing('hold')}>
                  Hold pieces
                </Button>
              )}
              {mayAsk && decision && decision.verdict !== 'meets' && (
                <Button size="small" shortcut="A" onClick={() => setDoing('ask')}>
                  Ask {processor} to correct
                </Button>
              )}
            </div>
          )}
          {doing === 'ask' && (
            <AskForm
              batchId={batch.id}
              processor={processor}
              lineId={requirement.lineId}
              body={questionOf(requirement, certificate.number)}
              onDone={done}
            />
          )}
          {doing === 'hold' && (
            <HoldForm
              batchId={batch.id}
              onlyLineId={requirement.lineId}
              requirementId={requirement.id}
              certificateId={certificate.id}
              kind={decision?.verdict === 'does_not_meet' ? 'requirement' : 'papers'}
              what={whatIsWrong(requirement)}
              onDone={done}
            />
          )}
        </div>
      </td>
    </tr>
  );
}

function SourceWords({ requirement }: { requirement: ProvedRequirement }) {
  const { characteristic, source, sourceText } = requirement;
  return (
    <>
      {characteristic}: {limitWords(requirement) || 'must be stated'}.{' '}
      <span className="text-source text-faint">
        {sourceText ? `${sourceText}.` : `From the ${SOURCES[source]}.`}
      </span>
    </>
  );
}

/** Why it is proposed, with the spot itself as large as it can be read; what a person entered instead stands beside it. */
function WhatWasRead({ requirement: { id, decision }, proving }: Omit<RequirementOpenProps, 'canEdit'>) {
  const { data, proposalOf, drawn } = proving.reading;
  const proposal = proposalOf(id);
  if (!data || !proposal) return null;
  const fact = data.facts[proposal.facts[0] ?? -1];
  const page = data.pages.find(({ number }) => number === fact?.page);
  return (
    <div className="flex flex-wrap items-center gap-4">
      {fact && page && <SpotPicture fact={fact} page={page} drawn={drawn} />}
      <p className="min-w-48 flex-1 text-second">
        {decision && decision.stated !== proposal.stated ? (
          <>
            The machine read <s>{proposal.stated || 'nothing'}</s>; {decision.decidedBy} entered{' '}
            <strong>{decision.stated || 'nothing'}</strong>.
          </>
        ) : (
          <>
            <strong>{proposal.stated || 'Nothing is stated.'}</strong> {proposal.why}
          </>
        )}
      </p>
    </div>
  );
}

function Judge({ requirement, proving }: Omit<RequirementOpenProps, 'canEdit'>) {
  const { decision } = requirement;
  const { chosen, proposalOf } = proving.reading;
  const [stated, setStated] = useState(
    chosen || (decision?.stated ?? proposalOf(requirement.id)?.stated ?? ''),
  );
  const alike = undecidedAlike(requirement, proving.data.requirements);
  const meetsOnAll = async () => {
    const all = [requirement, ...alike];
    proving.onward(
      requirement.id,
      all.map((one) => one.id),
    );
    await proving.decideAll(all, { verdict: 'meets', stated: stated.trim() || 'as ordered' });
  };
  const judge = async (verdict: Verdict) => {
    if (verdict === 'meets') proving.onward(requirement.id);
    await proving.decide(requirement, {
      verdict,
      stated: stated.trim() || (verdict === 'meets' ? 'as ordered' : ''),
    });
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Enter') {
      event.preventDefault();
      void judge('meets');
    } else if (event.key === 'Escape') proving.toRow(requirement.id);
  };
  return (
    <div className="flex flex-wrap items-end gap-2">
      <TextField
        className="max-w-md basis-full"
        label="The certificate states"
        mono
        data-key="e"
        data-key-says="Edit what it states"
        value={stated}
        maxLength={300}
        onChange={(event) => setStated(event.currentTarget.value)}
        onKeyDown={onKeyDown}
      />
      <Button look="outlined" onClick={() => judge('meets')}>
        Meets
      </Button>
      {alike.length > 0 && (
        <Button onClick={meetsOnAll} shortcut="L">
          Meets on {linesOf([requirement, ...alike])}
        </Button>
      )}
      <Button onClick={() => judge('does_not_meet')} shortcut="X">
        Does not meet
      </Button>
      <Button onClick={() => judge('not_stated')} shortcut="N">
        Not stated
      </Button>
      <Button onClick={() => judge('cannot_tell')} shortcut="C">
        Cannot tell
      </Button>
    </div>
  );
}

function whatIsWrong(requirement: ProvedRequirement): string {
  const { characteristic, decision } = requirement;
  const ordered = limitWords(requirement);
  if (!decision) return `${characteristic}: ordered ${ordered}`;
  const says = {
    meets: `states ${decision.stated}`,
    does_not_meet: `states ${decision.stated}`,
    not_stated: 'does not state it',
    cannot_tell: 'cannot be read there',
  }[decision.verdict];
  return `${characteristic}: ordered ${ordered || 'to be stated'}, the certificate ${says}`;
}

const questionOf = (requirement: ProvedRequirement, number: string | null): string =>
  `${number === null ? '' : `Certificate ${number}. `}${whatIsWrong(requirement)}. Send a corrected certificate.`;
