import type { Stage } from '@/lib/batches/stage';
import type { Holder, Spot } from '@/lib/lots/contract';
import { PROCESS_WORDS, type Process } from '@/lib/trade/process';
import { PLACES, type Place } from '@/lib/stock/places';

/** Where pieces are, as one says it of them: "14 waiting". */
export const PLACE_WORDS: Record<Place, string> = {
  making: 'waiting',
  packed: 'packed',
  transit_out: 'on the way out',
  at_processor: 'at processor',
  transit_back: 'on the way back',
  quarantine: 'in quarantine',
  hold: 'on hold',
  stock: 'in stock',
  fitted: 'fitted',
  scrapped: 'scrapped',
  lost: 'lost',
};

/** The tones of a place are those of the stage that a batch has while its pieces are there. */
export const PLACE_STAGES: Record<Place, Stage> = {
  making: 'building',
  packed: 'building',
  transit_out: 'dispatched',
  at_processor: 'at_processor',
  transit_back: 'returned',
  quarantine: 'returned',
  hold: 'held',
  stock: 'stocked',
  fitted: 'settled',
  scrapped: 'cancelled',
  lost: 'cancelled',
};

/** Along the way that pieces go, whatever order they came in. */
export const alongTheWay = <Spotted extends { place: Place }>(spots: readonly Spotted[]): Spotted[] =>
  [...spots].sort((a, b) => PLACES.indexOf(a.place) - PLACES.indexOf(b.place));

const PAGES: Record<Holder['kind'], string | null> = {
  step: null,
  batch: '/batches',
  nonconformance: '/nonconformances',
  location: null,
  assembly: '/assemblies',
};

export function holderHref(holder: Holder): string | null {
  const page = PAGES[holder.kind];
  return page === null ? null : `${page}/${holder.id}`;
}

/** `step 1, solution and quench`; a batch, nonconformance, shelf or assembly by its own name. */
export function holderWords({ kind, says, seq }: Holder): string {
  return kind === 'step' ? `for step ${seq ?? '?'}, ${processWords(says)}` : says;
}

const processWords = (name: string): string => PROCESS_WORDS[name as Process] ?? name;

/** In a ledger: `waiting for step 1, anodize`, `at processor, B-0404`, `in stock, A-3`. */
export function spotWords({ place, holder }: Spot): string {
  if (!holder) return PLACE_WORDS[place];
  return holder.kind === 'step'
    ? `${PLACE_WORDS[place]} ${holderWords(holder)}`
    : `${PLACE_WORDS[place]}, ${holderWords(holder)}`;
}
