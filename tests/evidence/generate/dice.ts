import { seeded } from '../degrade/random';

/** Choices that come out the same for the same seed. */
export interface Dice {
  pick<Value>(from: readonly Value[]): Value;
  whole(low: number, high: number): number;
  chance(share: number): boolean;
  shuffled<Value>(from: readonly Value[]): Value[];
}

export function diceOf(seed: number): Dice {
  const random = seeded(seed * 7919 + 17);
  const whole = (low: number, high: number): number => low + Math.floor(random() * (high - low + 1));
  return {
    whole,
    chance: (share) => random() < share,
    pick: (from) => {
      const value = from[whole(0, from.length - 1)];
      if (value === undefined) throw new Error('Nothing to choose from.');
      return value;
    },
    shuffled: (from) => {
      const left = [...from];
      return from.map(() => left.splice(whole(0, left.length - 1), 1)).flat();
    },
  };
}
