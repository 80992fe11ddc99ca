import { TitleCells } from '@/components/ui/title-cells';
import { dayWords } from '@/lib/day-words';
import type { DossierEvidence } from '@/lib/dossiers/contract';

import { ALWAYS_WITH_YEAR } from './evidence-words';

/** The title block of a dossier: which part, of what, made when. */
export function DossierCells({ evidence: { part, lot, shop } }: { evidence: DossierEvidence }) {
  return (
    <TitleCells
      cells={[
        {
          caption: 'Part',
          value: (
            <span className="[overflow-wrap:anywhere]">
              <span className="num font-semibold">{part.number}</span> rev {part.revision} {part.name}
            </span>
          ),
        },
        { caption: 'Material', value: [part.material, part.thickness].filter(Boolean).join(', ') },
        { caption: 'Heat', value: <span className="num">{lot.heat}</span> },
        { caption: 'Condition', value: `${part.madeCondition} to ${part.endCondition}` },
        {
          caption: 'Made',
          value: `${lot.made} on ${dayWords(new Date(lot.madeOn), { zone: shop.zone, now: ALWAYS_WITH_YEAR })}`,
        },
      ]}
    />
  );
}
