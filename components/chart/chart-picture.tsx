import type { LineLook } from '@/lib/evidence/chart/line-look';
import type { ChartPaths, PanelPaths } from '@/lib/evidence/chart/paths';

/** A chart without a canvas: what stands on paper, and on the screen until the canvas is there. */
export function ChartPicture({ paths, className }: { paths: ChartPaths; className: string }) {
  const { width, height, left, right, panels, soak, events, timeTicks } = paths;
  const [detail, whole] = panels;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={paths.says}
      className={`h-auto w-full ${className}`}
    >
      {soak && (
        <rect
          x={soak.from}
          y={detail.top}
          width={Math.max(1, soak.to - soak.from)}
          height={whole.bottom - detail.top}
          fill="var(--dispatched-wash)"
        />
      )}
      {panels.map((panel) => (
        <Panel key={panel.top} panel={panel} left={left} right={right} />
      ))}
      <text x={left + 8} y={detail.band.upper - 6} fill="var(--proved-ink)" className="font-cond text-word">
        {paths.bandSays}
      </text>
      <g className="font-mono text-axis" fill="var(--quiet)" textAnchor="middle">
        {timeTicks.map(({ at, says }) => (
          <g key={at}>
            <path d={`M${at} ${whole.bottom}v5`} stroke="var(--ink)" />
            <text x={at} y={whole.bottom + 18}>
              {says}
            </text>
          </g>
        ))}
      </g>
      {soak && (
        <g stroke="var(--ink)">
          <path
            d={`M${soak.from} ${detail.top - 12}V${whole.bottom}M${soak.to} ${detail.top - 12}V${whole.bottom}`}
          />
          <path d={`M${soak.from} ${detail.top - 8}H${soak.to}`} />
          <text
            x={(soak.from + soak.to) / 2}
            y={detail.top - 14}
            stroke="none"
            fill="var(--ink)"
            textAnchor="middle"
            className="font-cond text-word"
          >
            {soak.says}
          </text>
        </g>
      )}
      {events.map(({ number, x, y }) => (
        <g key={number}>
          <circle cx={x} cy={y} r="9" fill="var(--ink)" />
          <text
            x={x}
            y={y + 4}
            fill="var(--paper)"
            textAnchor="middle"
            className="font-mono text-source font-semibold"
          >
            {number}
          </text>
        </g>
      ))}
    </svg>
  );
}

function Panel({
  panel: { top, bottom, ticks, band, lines },
  left,
  right,
}: {
  panel: PanelPaths;
  left: number;
  right: number;
}) {
  return (
    <g>
      <g className="font-mono text-axis" fill="var(--quiet)">
        {ticks.map(({ at, says }) => (
          <g key={says}>
            <path d={`M${left} ${at}H${right}`} stroke="var(--rule)" />
            <text x={left - 7} y={at + 4} textAnchor="end">
              {says}
            </text>
          </g>
        ))}
      </g>
      <rect
        x={left}
        y={band.upper}
        width={right - left}
        height={Math.max(0.5, band.lower - band.upper)}
        fill="var(--proved-wash)"
        fillOpacity="0.75"
      />
      <path d={`M${left} ${band.upper}H${right}M${left} ${band.lower}H${right}`} stroke="var(--proved-ink)" />
      {lines.map(({ name, d, look }, at) => (
        <path key={`${at} ${name}`} d={d} fill="none" {...strokeOf(look)} />
      ))}
      <path d={`M${left} ${top}V${bottom}H${right}`} fill="none" stroke="var(--ink)" />
    </g>
  );
}

export const strokeOf = ({ ink, width, dash }: LineLook) => ({
  stroke: `var(--${ink})`,
  strokeWidth: width,
  strokeDasharray: dash.length > 0 ? dash.join(' ') : undefined,
});
