import type { AWAY_PLACES } from '@/lib/stock/places';

/** Where the pieces of one line are while they are out of the shop's hands. */
export interface AwayStanding {
  transitOut: number;
  atProcessor: number;
  transitBack: number;
}

type AwayPlace = (typeof AWAY_PLACES)[number];

export interface Taken {
  place: AwayPlace;
  pieces: number;
}

/** Pieces that can still come back. */
export const awayOf = (line: AwayStanding): number => line.transitOut + line.atProcessor + line.transitBack;

/**
 * From where a number of pieces comes back. What the processor said it shipped is taken first; what it never
 * acknowledged last, because parts come back whether or not anybody pressed a button in between.
 */
export function takenFrom(line: AwayStanding, pieces: number): Taken[] {
  const taken: Taken[] = [];
  let left = pieces;
  for (const [place, there] of [
    ['transit_back', line.transitBack],
    ['at_processor', line.atProcessor],
    ['transit_out', line.transitOut],
  ] as const) {
    const some = Math.min(left, there);
    if (some > 0) taken.push({ place, pieces: some });
    left -= some;
  }
  return taken;
}

/** The line after some of it was taken. */
export function without(line: AwayStanding, taken: readonly Taken[]): AwayStanding {
  const sum = (place: AwayPlace) =>
    taken.filter((one) => one.place === place).reduce((all, one) => all + one.pieces, 0);
  return {
    transitBack: line.transitBack - sum('transit_back'),
    atProcessor: line.atProcessor - sum('at_processor'),
    transitOut: line.transitOut - sum('transit_out'),
  };
}
