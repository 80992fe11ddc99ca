'use client';
import type { KeptPage } from '@/lib/readings/kept-reading';

import type { Spot } from './use-reading';

/** Boxes and numbers in the colour of their verdict, as in the list. */
const TONES: Record<Spot['verdict'], string> = {
  meets: 'border-proved bg-proved-wash',
  does_not_meet: 'border-held bg-held-wash',
  not_stated: 'border-dispatched bg-dispatched-wash',
  cannot_tell: 'border-returned bg-returned-wash',
  to_decide: 'border-quiet',
};
const NUMBERS: Record<Spot['verdict'], string> = {
  meets: 'bg-proved text-paper',
  does_not_meet: 'bg-held text-paper',
  not_stated: 'bg-dispatched text-paper',
  cannot_tell: 'bg-returned text-paper',
  to_decide: 'bg-quiet text-paper',
};

/** Where the number stands beside its box. */
const SIDES = {
  right: 'top-[-2px] left-full h-[calc(100%+4px)]',
  left: 'top-[-2px] right-full h-[calc(100%+4px)]',
  above: 'bottom-full left-[-2px]',
  below: 'top-full left-[-2px]',
} as const;
/** About as wide and high as a number is drawn, in points. */
const NUMBER = 16;

/** The first side on which the number lies over no print. */
function freeSide([left, top, right, bottom]: Spot['box'], { words }: KeptPage): keyof typeof SIDES {
  const places: Record<keyof typeof SIDES, Spot['box']> = {
    right: [right + 3, top, right + NUMBER, bottom],
    left: [left - NUMBER, top, left - 3, bottom],
    above: [left, top - NUMBER, left + NUMBER, top - 3],
    below: [left, bottom + 3, left + NUMBER, bottom + NUMBER],
  };
  const isFree = ([l, t, r, b]: Spot['box']) =>
    !words.some(([, wl, wt, wr, wb]) => wl < r && wr > l && wt < b && wb > t);
  const sides = Object.keys(places) as (keyof typeof SIDES)[];
  return sides.find((side) => isFree(places[side])) ?? 'right';
}

export interface PageSpotsProps {
  page: KeptPage;
  spots: readonly Spot[];
  selected: string | null;
  /** The number of its row in the list; null where the rows have none. */
  numberOf: ((row: string) => number) | null;
  onRow: (row: string) => void;
  /** Words of the page, chosen for the row that is open. */
  onWords: ((words: string) => void) | null;
}

/** What lies over the picture of a page: where each row of the list stands, and the words that can be chosen. */
export function PageSpots({ page, spots, selected, numberOf, onRow, onWords }: PageSpotsProps) {
  const place = ([left, top, right, bottom]: Spot['box']) => ({
    left: `${(left / page.width) * 100}%`,
    top: `${(top / page.height) * 100}%`,
    width: `${((right - left) / page.width) * 100}%`,
    height: `${((bottom - top) / page.height) * 100}%`,
  });
  return (
    // The list says all of it in words; here it is only shown where it stands.
    <div className="absolute inset-0" aria-hidden="true">
      {onWords &&
        page.words.map(([text, ...box], at) => (
          <span
            key={at}
            className="absolute cursor-copy hover:outline-2 hover:outline-ink"
            style={place(box)}
            onClick={() => onWords(text)}
          />
        ))}
      {spots
        .filter((spot) => spot.page === page.number)
        .map((spot) => (
          <span
            key={spot.fact}
            id={spot.row === selected ? 'lw-lit-spot' : undefined}
            className={`absolute box-content cursor-pointer border-2 p-0.5 mix-blend-multiply dark:bg-transparent dark:mix-blend-normal ${TONES[spot.verdict]} ${
              spot.row === selected ? 'outline-2 outline-offset-1 outline-ink' : ''
            }`}
            style={{ ...place(spot.box), translate: '-4px -4px' }}
            onClick={() => onRow(spot.row)}
          >
            {numberOf && (
              <span
                className={`num absolute flex min-h-[15px] min-w-[17px] items-center justify-center px-1 text-[0.68rem] font-bold ${SIDES[freeSide(spot.box, page)]} ${NUMBERS[spot.verdict]}`}
              >
                {numberOf(spot.row)}
              </span>
            )}
          </span>
        ))}
    </div>
  );
}
