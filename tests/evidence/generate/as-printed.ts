import type { Reading } from '@/lib/evidence/certificate/certificate';
import type { Dice } from './dice';
import type { Story } from './story';
import type { Hand } from './wording';

/** The story in the units that the house prints: what is on the paper is the truth. */
export function asPrinted(story: Story, hand: Hand, dice: Dice): Story {
  const { truth } = story;
  const thickness = hand.unit === 'C' ? 'µm' : dice.pick(['microinch', 'microinch', 'in', 'mil'] as const);
  return {
    ...story,
    truth: {
      ...truth,
      cycles: truth.cycles.map((cycle) => ({
        ...cycle,
        set_temp:
          cycle.set_temp === null || hand.unit === 'F'
            ? cycle.set_temp
            : Math.round(((cycle.set_temp - 32) * 5) / 9),
        unit: cycle.set_temp === null ? null : hand.unit,
      })),
      readings: truth.readings.map((reading) =>
        reading.kind === 'thickness' ? inUnit(reading, thickness) : reading,
      ),
    },
  };
}

const PER_MICROINCH = { microinch: 1, in: 1e-6, mil: 1e-3, µm: 0.0254 } as const;

function inUnit(reading: Reading, unit: keyof typeof PER_MICROINCH): Reading {
  const digits = { microinch: 0, in: 6, mil: 2, µm: 1 }[unit];
  return {
    ...reading,
    unit,
    values: reading.values.map((value) => Number((value * PER_MICROINCH[unit]).toFixed(digits))),
  };
}

/** A unit as houses print it. */
export const printedUnit = (unit: string | null, dice: Dice): string =>
  ({
    microinch: dice.pick(['µin', 'microinches', 'µ-in']),
    in: 'in',
    mil: 'mil',
    µm: 'µm',
    '%IACS': dice.pick(['%IACS', '% IACS']),
  })[unit ?? ''] ??
  unit ??
  '';
