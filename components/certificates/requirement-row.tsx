'use client';
import type { KeyboardEvent } from 'react';

import { Cell, Row } from '@/components/ui/table';
import { HowWell } from '@/components/ui/how-well';
import { VerdictWord } from '@/components/ui/verdict';
import type { ProvedRequirement } from '@/lib/certificates/contract';
import { limitWords } from '@/lib/parts/limit-words';

import { RequirementOpen } from './requirement-open';
import { RowNumber } from './row-number';
import { qualityOfProposal } from './use-reading';
import type { Proving } from './use-proving';

/** What Enter writes where the page says just what was ordered. */
const AS_ORDERED = 'as ordered';

export function RequirementRows({
  requirements,
  proving,
}: {
  requirements: readonly ProvedRequirement[];
  proving: Proving;
}) {
  return requirements.map((requirement) => (
    <RequirementRow key={requirement.id} requirement={requirement} proving={proving} />
  ));
}

function RequirementRow({ requirement, proving }: { requirement: ProvedRequirement; proving: Proving }) {
  const { id, characteristic, decision } = requirement;
  const selected = proving.selected === id;
  const canEdit = proving.canEdit && !decision?.sealed;
  const proposal = decision ? undefined : proving.reading.proposalOf(id);
  const quality = proposal ? qualityOfProposal(proposal) : null;
  const confirm = async () => {
    proving.onward(id);
    await proving.decide(requirement, {
      verdict: proposal?.verdict ?? 'meets',
      stated: (proposal?.stated ?? decision?.stated) || (proposal ? '' : AS_ORDERED),
    });
  };
  return (
    <>
      <Row selected={selected}>
        <Cell className="w-7">
          <RowNumber
            number={proving.rows.indexOf(id) + 1}
            verdict={decision?.verdict ?? proposal?.verdict ?? 'to_decide'}
          />
        </Cell>
        <Cell>
          <RowButton
            rowId={id}
            selected={selected}
            says={characteristic}
            onSelect={() => proving.select(id)}
            onConfirm={canEdit ? confirm : undefined}
          />
        </Cell>
        <Cell code head="Ordered" className="text-[0.78rem]">
          {limitWords(requirement)}
        </Cell>
        <Cell code strong head="As stated" className="text-[0.78rem] [overflow-wrap:anywhere]">
          {decision?.stated ?? <span className="font-normal">{proposal?.stated}</span>}
        </Cell>
        <Cell className="max-md:hidden">{quality && <HowWell quality={quality} />}</Cell>
        <Cell>
          <VerdictWord
            verdict={decision?.verdict ?? proposal?.verdict ?? 'to_decide'}
            {...(decision?.overrideReason
              ? { overruled: { to: 'meets' as const, reason: decision.overrideReason } }
              : {})}
          />
        </Cell>
        <Cell right>
          <YourPart requirement={requirement} isProposed={proposal !== undefined} />
        </Cell>
      </Row>
      {selected && <RequirementOpen key={id} requirement={requirement} proving={proving} canEdit={canEdit} />}
    </>
  );
}

function YourPart({
  requirement: { decision },
  isProposed,
}: {
  requirement: ProvedRequirement;
  isProposed: boolean;
}) {
  if (!decision) return isProposed && <strong className="whitespace-nowrap">to confirm</strong>;
  if (decision.sealed) return <span className="text-quiet">signed</span>;
  return <span className="text-quiet">{decision.overrideReason ? 'overridden' : 'decided'}</span>;
}

interface RowButtonProps {
  rowId: string;
  selected: boolean;
  says: string;
  onSelect: () => void;
  /** Enter; a press of the mouse or of Space only opens the row, so that nobody confirms by looking. */
  onConfirm: (() => void | Promise<void>) | undefined;
}

export function RowButton({ rowId, selected, says, onSelect, onConfirm }: RowButtonProps) {
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key !== 'Enter' || !onConfirm) return;
    event.preventDefault();
    void onConfirm();
  };
  return (
    <button
      id={`row-${rowId}`}
      type="button"
      aria-expanded={selected}
      {...(onConfirm ? { 'aria-keyshortcuts': 'Enter' } : {})}
      className="text-left font-cond text-word"
      onFocus={onSelect}
      onClick={onSelect}
      onKeyDown={onKeyDown}
    >
      {says}
    </button>
  );
}
