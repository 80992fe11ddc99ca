import { placeOf, type Axis } from './scale';

type Place = (value: number) => number;

export interface Series {
  says: string;
  points: readonly (readonly [x: number, y: number])[];
  look: 'main' | 'limit' | 'second' | 'third';
  /** Where its name stands; without it the name is only in the table. */
  nameAt?: { x: number; y: number; anchor?: 'start' | 'end' };
}

interface PlotProps {
  /** One sentence for those who cannot see it. */
  says: string;
  x: Axis;
  y: Axis;
  series: readonly Series[];
  /** Where it is good, between two values of x. */
  band?: { from: number; to: number; says: string } | undefined;
  /** The area between two of the lines, by their place in the list. */
  between?: readonly [number, number];
  /** What was asked for: a line at x with a ring on each value. */
  mark?: { x: number; values: readonly number[]; says?: readonly string[] } | undefined;
  height?: number;
}

const LEFT = 44;
const RIGHT = 14;
const TOP = 12;
const BOTTOM = 40;

/** Colours and dashes of lines, in the order in which they matter; each can be told from the other without colour. */
const LOOKS: Record<Series['look'], { stroke: string; width: number; dash?: string }> = {
  main: { stroke: 'var(--ink)', width: 1.8 },
  limit: { stroke: 'var(--held-ink)', width: 2.2, dash: '6 3' },
  second: { stroke: 'var(--dispatched-ink)', width: 1.8, dash: '7 3' },
  third: { stroke: 'var(--quiet)', width: 1.5, dash: '2 3' },
};

const DESK_WIDTH = 720;
/** On a phone the same plot is drawn narrower, not shrunk: its words keep their size. */
const PHONE_WIDTH = 358;

/** Lines over a labelled ground. Every line is named in words; the numbers stand beneath as a table. */
export function Plot(props: PlotProps) {
  return (
    <>
      <Drawn {...props} width={DESK_WIDTH} className="max-sm:hidden" />
      <Drawn {...props} width={PHONE_WIDTH} className="sm:hidden" />
    </>
  );
}

function Drawn(props: PlotProps & { width: number; className: string }) {
  const { says, x, y, series, band, between, mark, width, className, height = 300 } = props;
  const across = rounded(placeOf(x, [LEFT, width - RIGHT]));
  const up = rounded(placeOf(y, [height - BOTTOM, TOP]));
  const foot = height - BOTTOM;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={says}
      className={`h-auto w-full max-w-[720px] ${className}`}
    >
      {band && <Band band={band} across={across} foot={foot} />}
      {between && <Between pair={[series[between[0]], series[between[1]]]} across={across} up={up} />}
      <Axes x={x} y={y} across={across} up={up} width={width} foot={foot} />
      {series.map((one) => (
        <Line key={one.says} series={one} across={across} up={up} />
      ))}
      {mark && <Mark mark={mark} across={across} up={up} foot={foot} />}
    </svg>
  );
}

interface Ground {
  across: Place;
  up: Place;
}

function Axes({ x, y, across, up, width, foot }: Ground & { x: Axis; y: Axis; width: number; foot: number }) {
  return (
    <g className="font-mono text-axis" fill="var(--quiet)">
      {y.ticks.map(({ at, says }) => (
        <g key={at}>
          <path d={`M${LEFT} ${up(at)}H${width - RIGHT}`} stroke="var(--rule)" />
          <text x={LEFT - 7} y={up(at) + 4} textAnchor="end">
            {says}
          </text>
        </g>
      ))}
      {x.ticks.map(({ at, says }) => (
        <g key={at}>
          <path d={`M${across(at)} ${foot}v5`} stroke="var(--ink)" />
          <text x={across(at)} y={foot + 18} textAnchor="middle">
            {says}
          </text>
        </g>
      ))}
      <path d={`M${LEFT} ${TOP}V${foot}H${width - RIGHT}`} fill="none" stroke="var(--ink)" />
      <text x={width - RIGHT} y={foot + 34} textAnchor="end" className="font-cond">
        {x.says}
      </text>
    </g>
  );
}

function Line({ series: { points, look, says, nameAt }, across, up }: Ground & { series: Series }) {
  const { stroke, width, dash } = LOOKS[look];
  return (
    <>
      <path
        d={pathOf(points, across, up)}
        fill="none"
        stroke={stroke}
        strokeWidth={width}
        strokeDasharray={dash}
      />
      {nameAt && (
        <text
          x={across(nameAt.x)}
          y={up(nameAt.y)}
          textAnchor={nameAt.anchor ?? 'start'}
          fill={stroke}
          className="font-cond text-source font-semibold"
        >
          {says}
        </text>
      )}
    </>
  );
}

function Band({ band, across, foot }: { band: NonNullable<PlotProps['band']>; across: Place; foot: number }) {
  const [from, to] = [across(band.from), across(band.to)];
  return (
    <>
      <rect x={from} y={TOP} width={Math.max(1, to - from)} height={foot - TOP} fill="var(--proved-wash)" />
      <path d={`M${from} ${TOP}V${foot}M${to} ${TOP}V${foot}`} stroke="var(--proved-ink)" />
      <text x={to + 6} y={TOP + 12} fill="var(--proved-ink)" className="font-cond text-source font-semibold">
        {band.says}
      </text>
    </>
  );
}

function Between({
  pair: [low, high],
  across,
  up,
}: Ground & { pair: readonly [Series | undefined, Series | undefined] }) {
  if (!low || !high) return null;
  const back = [...high.points].reverse();
  return (
    <path
      d={`${pathOf(low.points, across, up)}L${pathOf(back, across, up).slice(1)}Z`}
      fill="var(--proved-wash)"
    />
  );
}

function Mark({ mark, across, up, foot }: Ground & { mark: NonNullable<PlotProps['mark']>; foot: number }) {
  const at = across(mark.x);
  return (
    <>
      <path d={`M${at} ${TOP}V${foot}`} stroke="var(--ink)" strokeWidth="1" />
      {mark.values.map((value, index) => (
        <g key={`${value} ${index}`}>
          <circle cx={at} cy={up(value)} r="4.5" fill="var(--paper)" stroke="var(--ink)" strokeWidth="1.6" />
          {mark.says?.[index] !== undefined && (
            <text
              x={at - 8}
              y={up(value) - 8}
              textAnchor="end"
              fill="var(--ink)"
              className="font-cond text-source font-semibold"
            >
              {mark.says[index]}
            </text>
          )}
        </g>
      ))}
    </>
  );
}

const pathOf = (points: Series['points'], across: Place, up: Place): string =>
  points.map(([x, y], at) => `${at === 0 ? 'M' : 'L'}${across(x)} ${up(y)}`).join('');
/** Server and browser differ in the last digit of a logarithm, and must draw the same. */
const rounded =
  (place: Place): Place =>
  (value) =>
    Math.round(place(value) * 10) / 10;

/** A table that jumps is drawn as steps: each row holds from where the last one ended. */
export const stepsOf = (
  rows: readonly { from: number; to: number; value: number }[],
): readonly (readonly [number, number])[] =>
  rows.flatMap(({ from, to, value }) => [[from, value] as const, [to, value] as const]);
