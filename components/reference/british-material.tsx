import { britishMaterial } from '@/lib/trade/lineage/british-material';
import { BRITISH_MATERIALS } from '@/lib/trade/tables/british-materials';

import { Answer, NoAnswer } from './answer';
import { SourceLine } from './source-line';

/** What a British number of the past stands for. Nothing of today is its equal. */
export function BritishMaterial({ number }: { number: string }) {
  const found = britishMaterial(BRITISH_MATERIALS, number);
  if (!found.ok)
    return (
      <>
        <NoAnswer says={`${number} is known to exist; what it stands for could not be found out.`} />
        {found.source && <SourceLine source={found.source} />}
      </>
    );
  const { material, clad, condition, supersededBy, nearest } = found;
  const metal = [material, clad !== null && (clad ? 'clad' : 'bare'), condition].filter(
    (one) => one !== null && one !== false,
  );
  return (
    <>
      <Answer
        good={null}
        says={`${number}: ${metal.join(', ')}`}
        rest={supersededBy.length > 0 ? `superseded by ${supersededBy.join(' and ')}` : undefined}
      />
      <p className="text-dispatched-ink">
        {nearest === null ? 'Nothing of today is named for it.' : `Nearest of today: ${nearest}.`} It is no
        equal: a substitute needs an engineering approval.
      </p>
      <SourceLine source={found.source} readFrom={found.readFrom} />
    </>
  );
}
