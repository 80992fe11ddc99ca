import { Plot } from '@/components/plots/plot';
import { ticksOf, type Axis } from '@/components/plots/scale';
import type { HardnessScale, HardnessTable } from '@/lib/trade/hardness/hardness-table';

interface HardnessCurveProps {
  table: HardnessTable;
  from: HardnessScale;
  to: HardnessScale;
  value: number;
  found: number;
}

/** Two columns of a conversion table against each other, with what was asked for. */
export function HardnessCurve({ table, from, to, value, found }: HardnessCurveProps) {
  const points = table.rows
    .flatMap((row): (readonly [number, number])[] => {
      const [x, y] = [row[from], row[to]];
      return x === undefined || y === undefined ? [] : [[x, y]];
    })
    .sort(([a], [b]) => a - b);
  if (points.length < 2 || from === to) return null;
  return (
    <Plot
      says={`${to} by ${from}, as the table has it`}
      height={260}
      x={axisOf(
        points.map(([x]) => x),
        from,
      )}
      y={axisOf(
        points.map(([, y]) => y),
        to,
      )}
      series={[{ says: to, points, look: 'main' }]}
      mark={{ x: value, values: [found] }}
    />
  );
}

function axisOf(values: readonly number[], says: string): Axis {
  const [from, to] = [Math.min(...values), Math.max(...values)];
  return { from, to, ticks: ticksOf(from, to, 6), says };
}
