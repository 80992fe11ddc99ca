import type { PlannedLoad } from '@/lib/batches/load-contract';

/** Minutes along the top, the same for every load of a plan. */
export interface SoakScale {
  to: number;
  step: number;
}

/** Long enough for the longest soak and for what bare metal may soak beyond it. */
export function soakScale(loads: readonly PlannedLoad[]): SoakScale {
  const ends = loads.flatMap((load) =>
    [...load.lines.map(({ soak }) => soak), load.solution].flatMap((one) =>
      one ? [one.longestMin ?? one.soakMin, one.soakMin] : [],
    ),
  );
  const longest = Math.max(10, ...ends);
  const step = STEPS.find((one) => longest / one <= 8) ?? 120;
  return { to: Math.ceil((longest * 1.1) / step) * step, step };
}
const STEPS = [5, 10, 20, 30, 60];

const ROW = 24;

/**
 * The soak of each line on one scale of minutes: from the least to the most; bare metal has no most. The blue band is
 * what all lines of the load may have.
 */
export function SoakBars({ load, scale }: { load: PlannedLoad; scale: SoakScale }) {
  const { solution, lines } = load;
  if (!solution) return null;
  const height = lines.length * ROW;
  const x = (minutes: number) => (100 * Math.min(minutes, scale.to)) / scale.to;
  const end = (longestMin: number | null) => x(longestMin ?? scale.to);
  return (
    <div aria-hidden="true" className="min-w-0">
      <SoakTicks scale={scale} />
      <svg
        viewBox={`0 0 100 ${height}`}
        preserveAspectRatio="none"
        className="block w-full overflow-visible"
        style={{ height }}
      >
        <rect
          x={x(solution.soakMin)}
          width={end(solution.longestMin) - x(solution.soakMin)}
          height={height}
          fill="var(--proved-wash)"
        />
        {[solution.soakMin, solution.longestMin].map(
          (at) =>
            at !== null && (
              <path
                key={at}
                d={`M${x(at)} 0V${height}`}
                stroke="var(--proved-ink)"
                strokeWidth="1.5"
                vectorEffect="non-scaling-stroke"
              />
            ),
        )}
        {lines.map(
          ({ lineId, soak }, at) =>
            soak && (
              <path
                key={lineId}
                d={barOf(x(soak.soakMin), end(soak.longestMin), at * ROW, soak.longestMin !== null)}
                fill="var(--paper)"
                stroke="var(--ink)"
                strokeWidth="1.25"
                vectorEffect="non-scaling-stroke"
              />
            ),
        )}
      </svg>
    </div>
  );
}

/** Open at the right where metal may soak on. */
function barOf(from: number, to: number, top: number, closed: boolean): string {
  const [high, low] = [top + 8, top + 16];
  return `M${to} ${high}H${from}V${low}H${to}${closed ? 'Z' : ''}`;
}

/** The last one bears the unit: on a phone there is no room for both. */
function SoakTicks({ scale: { to, step } }: { scale: SoakScale }) {
  const ticks = Array.from({ length: Math.floor(to / step) + 1 }, (_, at) => at * step);
  return (
    <div className="relative h-5 border-b border-line">
      {ticks.map((at) => (
        <span
          key={at}
          className={`absolute bottom-0 font-mono text-[11px] text-faint ${edgeOf(at, to)}`}
          style={{ left: `${(100 * at) / to}%` }}
        >
          {at === to ? 'min' : at}
        </span>
      ))}
    </div>
  );
}

function edgeOf(at: number, to: number): string {
  if (at === 0) return '';
  return at === to ? '-translate-x-full' : '-translate-x-1/2';
}
