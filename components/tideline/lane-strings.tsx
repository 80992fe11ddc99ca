import { tagTop, type PlacedTag } from '@/lib/tideline/lay-out';
import type { Scale } from '@/lib/tideline/scale';

const MIDDLE_PX = 12;
/** A shorter thread is a speck, not a thread. */
const SHORTEST_THREAD_PX = 12;

/** What is drawn beside the tags: late strips with a tick a day, threads to the assemblies, notches and broken promises. */
export function LaneStrings({
  tags,
  width,
  height,
  scale,
}: {
  tags: readonly PlacedTag[];
  width: number;
  height: number;
  scale: Scale;
}) {
  return (
    <svg aria-hidden="true" width={width} height={height} className="absolute inset-0">
      {tags.map((tag) => (
        <g key={tag.batch.id}>
          {tag.late && (
            <LateStrip fromX={tag.late.fromX} toX={scale.todayX} y={tagTop(tag.row)} dayPx={scale.dayPx} />
          )}
          {tag.string?.knotX && (
            <Thread
              fromX={tag.string.fromX}
              toX={tag.string.labelSide === 'left' ? tag.string.labelX - 4 : tag.string.knotX - 4}
              knotX={tag.string.knotX}
              y={tagTop(tag.row) + MIDDLE_PX}
            />
          )}
        </g>
      ))}
    </svg>
  );
}

function LateStrip({ fromX, toX, y, dayPx }: { fromX: number; toX: number; y: number; dayPx: number }) {
  if (toX <= fromX) return null;
  const ticks = Array.from(
    { length: Math.floor((toX - fromX) / dayPx) },
    (_, at) => `M${fromX + (at + 1) * dayPx} ${y + 19}v${(at + 1) % 5 === 0 ? -8 : -4}`,
  ).join('');
  return (
    <g stroke="var(--held-ink)">
      <rect x={fromX} y={y + 5} width={toX - fromX} height="14" fill="var(--held-wash)" strokeWidth="1" />
      <path d={ticks} strokeWidth="1" />
    </g>
  );
}

/** Sags at most 6 px; the knot lies on the day of need. */
function Thread({ fromX, toX, knotX, y }: { fromX: number; toX: number; knotX: number; y: number }) {
  const sag = Math.min(6, Math.max(0, (toX - fromX) / 24));
  return (
    <g fill="none" stroke="var(--line)">
      {toX - fromX >= SHORTEST_THREAD_PX && (
        <path d={`M${fromX + 4} ${y}Q${(fromX + toX) / 2} ${y + 2 * sag} ${toX} ${y}`} />
      )}
      <circle cx={knotX} cy={y} r="3.5" fill="var(--paper)" stroke="var(--ink)" strokeWidth="1.4" />
    </g>
  );
}
