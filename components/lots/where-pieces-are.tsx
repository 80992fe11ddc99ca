import Link from 'next/link';
import { Section } from '@/components/ui/section';
import { STAGE_TONES } from '@/components/ui/stages';
import { BatchTag } from '@/components/ui/tag';
import type { Holder, Lot } from '@/lib/lots/contract';
import { scaleStep, stretchesOf, type Stretch } from '@/lib/lots/stair';
import { alongTheWay, holderHref, holderWords, PLACE_STAGES, PLACE_WORDS } from './place-words';

type Spot = Lot['whereabouts'][number];

const GRID =
  'grid grid-cols-[minmax(9rem,17rem)_minmax(0,1fr)_3.5rem] gap-x-4 max-sm:grid-cols-[minmax(0,1fr)_auto]';

/** All pieces of a lot on one scale, place after place: a stair whose last step ends at what was made. */
export function WherePiecesAre({ lot }: { lot: Lot }) {
  const stretches = stretchesOf(alongTheWay(lot.whereabouts));
  return (
    <Section
      title="Where every piece is"
      note={`${lot.made.toLocaleString('en-US')} made, ${lot.made.toLocaleString('en-US')} here`}
    >
      <Scale to={lot.made} />
      <ol aria-label="Places, along the way">
        {stretches.map((stretch, at) => (
          <Step
            key={`${stretch.spot.place} ${stretch.spot.holder?.id ?? at}`}
            stretch={stretch}
            made={lot.made}
            isLast={at === stretches.length - 1}
          />
        ))}
      </ol>
      <div className={`${GRID} border-t-heavy border-ink py-1.5 font-semibold`}>
        <span>Made</span>
        <span className="num col-start-3 text-right max-sm:col-start-2">
          {lot.made.toLocaleString('en-US')}
        </span>
      </div>
    </Section>
  );
}

function Step({
  stretch: { spot, from, to },
  made,
  isLast,
}: {
  stretch: Stretch<Spot>;
  made: number;
  isLast: boolean;
}) {
  const percent = (pieces: number) => `${(pieces / made) * 100}%`;
  return (
    <li className={`${GRID} items-center`}>
      <span className="min-w-0 py-2 [overflow-wrap:anywhere]">
        <span className={`font-cond text-word ${spot.place === 'hold' ? 'text-held-ink' : ''}`}>
          {PLACE_WORDS[spot.place]}
        </span>
        {spot.holder && <HolderName holder={spot.holder} />}
      </span>
      <span
        aria-hidden="true"
        className="relative self-stretch max-sm:col-span-2 max-sm:row-start-2 max-sm:h-7"
      >
        {from > 0 && (
          <span className="absolute top-0 bottom-1/2 border-l border-line" style={{ left: percent(from) }} />
        )}
        {!isLast && (
          <span className="absolute top-1/2 bottom-0 border-l border-line" style={{ left: percent(to) }} />
        )}
        <span
          className={`lw-place absolute top-1/2 h-4.5 -translate-y-1/2 ${STAGE_TONES[PLACE_STAGES[spot.place]]}`}
          data-place={spot.place}
          style={{ left: percent(from), width: percent(spot.pieces) }}
        />
      </span>
      <span className="num text-right max-sm:self-start max-sm:pt-2">
        {spot.pieces.toLocaleString('en-US')}
      </span>
    </li>
  );
}

function HolderName({ holder }: { holder: Holder }) {
  const href = holderHref(holder);
  if (holder.kind === 'batch' && holder.stage !== null && href !== null) {
    return (
      <span className="ml-2 inline-block align-middle">
        <BatchTag stage={holder.stage} number={holder.says} href={href} size="row" show="number" />
      </span>
    );
  }
  return (
    <span className="text-second text-quiet">
      {' '}
      {href === null ? holderWords(holder) : <Link href={href}>{holderWords(holder)}</Link>}
    </span>
  );
}

function Scale({ to }: { to: number }) {
  const step = scaleStep(to, 8);
  const numbers = Array.from({ length: Math.floor(to / step) + 1 }, (_, at) => at * step);
  return (
    <div aria-hidden="true" className={`${GRID} max-sm:grid-cols-1`}>
      <span className="max-sm:hidden" />
      <span className="relative block h-7 border-b border-line">
        {numbers.map((at) => (
          <span
            key={at}
            className="absolute bottom-0 h-1.5 border-l border-line"
            style={{ left: `${(at / to) * 100}%` }}
          >
            <span className="num absolute bottom-1.5 -translate-x-1/2 text-axis text-faint">
              {at.toLocaleString('en-US')}
            </span>
          </span>
        ))}
      </span>
    </div>
  );
}
