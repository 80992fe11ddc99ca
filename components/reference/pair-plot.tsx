import { placeOf, ticksOf, type Axis } from '@/components/plots/scale';
import type { HardnessScale } from '@/lib/trade/hardness/hardness-table';
import { ACCEPTANCE } from '@/lib/trade/tables/acceptance';

interface PairPlotProps {
  alloy: string;
  condition: string;
  scale: HardnessScale;
  reading: { hardness: number; iacs: number } | null;
}

interface Box {
  says: string;
  iacs: readonly [number, number];
  hardness: readonly [number, number];
  isAsked: boolean;
}

const WIDTH = 720;
const HEIGHT = 320;
const ROOM = { left: 44, right: 14, top: 12, bottom: 40 };
/** An open end is drawn so far beyond the printed one. */
const OPEN_END = 10;

/** The bands of an alloy's conditions as boxes of conductivity by hardness, with the reading in or beside them. */
export function PairPlot({ alloy, condition, scale, reading }: PairPlotProps) {
  const boxes = boxesOf({ alloy, condition, scale });
  if (boxes.length === 0) return null;
  const x = axisOf([...boxes.flatMap(({ iacs }) => iacs), ...(reading ? [reading.iacs] : [])]);
  const y = axisOf([...boxes.flatMap(({ hardness }) => hardness), ...(reading ? [reading.hardness] : [])]);
  const across = placeOf(x, [ROOM.left, WIDTH - ROOM.right]);
  const up = placeOf(y, [HEIGHT - ROOM.bottom, ROOM.top]);
  return (
    <div className="overflow-x-auto">
      <svg
        viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
        role="img"
        aria-label={`Bands of ${alloy}: conductivity across, ${scale} up; the table has the numbers`}
        className="h-auto w-full max-w-[720px] max-sm:min-w-[520px]"
      >
        <Ground x={x} y={y} across={across} up={up} scale={scale} />
        {boxes.map((box) => (
          <Band key={`${box.says} ${box.iacs.join()}`} box={box} across={across} up={up} />
        ))}
        {reading && (
          <circle
            cx={across(reading.iacs)}
            cy={up(reading.hardness)}
            r="5.5"
            fill="var(--ink)"
            stroke="var(--paper)"
            strokeWidth="2"
          />
        )}
      </svg>
    </div>
  );
}

const boxesOf = ({ alloy, condition, scale }: Omit<PairPlotProps, 'reading'>): Box[] =>
  ACCEPTANCE.rows.flatMap((row) => {
    const band = row.hardness?.find((one) => one.scale === scale);
    if (row.alloy !== alloy || !row.iacs || !band) return [];
    const { min = (band.max ?? 0) - OPEN_END, max = (band.min ?? 0) + OPEN_END } = band;
    const isAsked = row.conditions.includes(condition);
    return [{ says: row.conditions.join(', '), iacs: row.iacs, hardness: [min, max] as const, isAsked }];
  });

function axisOf(values: readonly number[]): Axis {
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const room = Math.max(1, (high - low) * 0.08);
  return { from: low - room, to: high + room, ticks: ticksOf(low - room, high + room, 6), says: '' };
}

type Place = (value: number) => number;

function Band({ box, across, up }: { box: Box; across: Place; up: Place }) {
  const [left, right] = [across(box.iacs[0]), across(box.iacs[1])];
  const [foot, top] = [up(box.hardness[0]), up(box.hardness[1])];
  return (
    <>
      <rect
        x={left}
        y={top}
        width={right - left}
        height={foot - top}
        fill={box.isAsked ? 'var(--proved-wash)' : 'none'}
        stroke={box.isAsked ? 'var(--ink)' : 'var(--quiet)'}
        strokeWidth={box.isAsked ? 2 : 1}
        strokeDasharray={box.isAsked ? undefined : '4 3'}
      />
      <text
        x={left + 4}
        y={top + 14}
        fill={box.isAsked ? 'var(--ink)' : 'var(--quiet)'}
        className="font-cond text-source font-semibold"
      >
        {box.says}
      </text>
    </>
  );
}

function Ground({ x, y, across, up, scale }: { x: Axis; y: Axis; across: Place; up: Place; scale: string }) {
  const foot = HEIGHT - ROOM.bottom;
  return (
    <g className="font-mono text-axis" fill="var(--quiet)">
      {y.ticks.map(({ at, says }) => (
        <text key={at} x={ROOM.left - 7} y={up(at) + 4} textAnchor="end">
          {says}
        </text>
      ))}
      {x.ticks.map(({ at, says }) => (
        <text key={at} x={across(at)} y={foot + 18} textAnchor="middle">
          {says}
        </text>
      ))}
      <path d={`M${ROOM.left} ${ROOM.top}V${foot}H${WIDTH - ROOM.right}`} fill="none" stroke="var(--ink)" />
      <text x={WIDTH - ROOM.right} y={foot + 34} textAnchor="end" className="font-cond">
        conductivity, % IACS; {scale} upward
      </text>
    </g>
  );
}
