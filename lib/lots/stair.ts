/** One stretch of a lot's pieces on a scale from nothing to all that were made. */
export interface Stretch<Spot> {
  spot: Spot;
  from: number;
  to: number;
}

/** Puts the places of a lot end to end, so that the last one ends at the number made. */
export function stretchesOf<Spot extends { pieces: number }>(spots: readonly Spot[]): Stretch<Spot>[] {
  let at = 0;
  return spots.map((spot) => {
    const from = at;
    at += spot.pieces;
    return { spot, from, to: at };
  });
}

/** The step between numbers on a scale: 1, 2 or 5 times a power of ten, for at most `most` numbers. */
export function scaleStep(to: number, most = 10): number {
  for (let power = 1; ; power *= 10) {
    for (const step of [1, 2, 5]) if (to / (step * power) <= most) return step * power;
  }
}
