import { STAGE_TONES } from '@/components/ui/stages';
import type { PiecesAt } from '@/lib/parts/contract';
import { alongTheWay, PLACE_STAGES, PLACE_WORDS } from './place-words';

interface PlacesBarProps {
  made: number;
  places: readonly PiecesAt[];
}

/** All pieces of a lot on one short rule, and the same in words. */
export function PlacesBar({ made, places }: PlacesBarProps) {
  const way = alongTheWay(places);
  return (
    <span className="flex min-w-0 flex-wrap items-center gap-x-3 gap-y-0.5 max-lg:flex-col max-lg:items-start">
      <span aria-hidden="true" className="lw-places h-2.5 w-24 flex-none">
        {way.map(({ place, pieces }) => (
          <span
            key={place}
            className={`lw-place ${STAGE_TONES[PLACE_STAGES[place]]}`}
            data-place={place}
            style={{ flexGrow: pieces / Math.max(made, 1) }}
          />
        ))}
      </span>
      <span className="text-row">{wayWords(way)}</span>
    </span>
  );
}

/** `12 waiting, 22 at processor` */
function wayWords(way: readonly PiecesAt[]) {
  return way.map(({ place, pieces }, at) => (
    <span key={place} className={place === 'hold' ? 'text-held-ink' : ''}>
      {at > 0 && ', '}
      <span className="num">{pieces.toLocaleString('en-US')}</span> {PLACE_WORDS[place]}
    </span>
  ));
}
