import { Numbers } from '@/components/plots/numbers';
import { Plot } from '@/components/plots/plot';
import { ticksOf } from '@/components/plots/scale';

import { inchesFromMm } from '@/lib/trade/units/length';

import { fittingAngles, neededAt, radians, type Sides } from './fit-angles';
import type { Bench } from './use-bench';

const LAST_DEGREE = 45;

interface FitRoomProps {
  blank: Sides;
  inside: Sides;
  bench: Pick<Bench<never>, 'says' | 'units'>;
}

/** The room left along and across, by the angle at which the blank lies. */
export function FitRoom({ blank, inside, bench }: FitRoomProps) {
  const [a, b] = [Math.max(inside.lengthMm, inside.widthMm), Math.min(inside.lengthMm, inside.widthMm)];
  const shown = (mm: number) => (bench.units === 'metric' ? mm : inchesFromMm(mm));
  const room = (degrees: number) => {
    const { along, across } = neededAt(blank, radians(degrees));
    return { along: a - along, across: b - across };
  };
  const degrees = Array.from({ length: LAST_DEGREE + 1 }, (_, at) => at);
  const line = (side: 'along' | 'across') => degrees.map((at) => [at, shown(room(at)[side])] as const);
  const values = degrees.flatMap((at) => [shown(room(at).along), shown(room(at).across)]);
  const [low, high] = [Math.min(0, ...values), Math.max(0, ...values)];
  const angles = fittingAngles(blank, inside);
  const unit = bench.units === 'metric' ? 'mm' : 'in';
  return (
    <>
      <Plot
        says="Room left along and across the tank, by the angle of the blank"
        height={230}
        x={{
          from: 0,
          to: LAST_DEGREE,
          ticks: ticksOf(0, LAST_DEGREE, 9).map(({ at }) => ({ at, says: `${at}°` })),
          says: `angle of the blank; room in ${unit}, below 0 it sticks out`,
        }}
        y={{ from: low, to: high, ticks: ticksOf(low, high, 5), says: unit }}
        series={[
          { says: 'room along', points: line('along'), look: 'main' },
          { says: 'room across', points: line('across'), look: 'second' },
          {
            says: 'none',
            points: [
              [0, 0],
              [LAST_DEGREE, 0],
            ],
            look: 'third',
          },
        ]}
        band={
          angles && angles.to <= LAST_DEGREE
            ? { ...angles, says: `fits ${angles.from.toFixed(1)}° to ${angles.to.toFixed(1)}°` }
            : undefined
        }
      />
      <p className="flex flex-wrap gap-x-6 text-second">
        <span className="border-l-4 border-ink pl-2">room along</span>
        <span className="border-l-4 border-dispatched-ink pl-2">room across</span>
      </p>
      <Numbers
        label="The numbers as a table"
        heads={['Angle', `Room along, ${unit}`, `Room across, ${unit}`]}
        rows={degrees
          .filter((at) => at % 5 === 0)
          .map((at) => [`${at}°`, shown(room(at).along).toFixed(2), shown(room(at).across).toFixed(2)])}
      />
    </>
  );
}
