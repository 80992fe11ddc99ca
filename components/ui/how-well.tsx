import type { ReadQuality } from '@/lib/readings/quality';

const WORDS: Record<ReadQuality, string> = { 1: 'read poorly', 2: 'read fairly', 3: 'read well' };
const BARS = [
  { x: 0, height: 5 },
  { x: 4.5, height: 8 },
  { x: 9, height: 11 },
];

/** Three rising bars: how well a machine could read it. */
export function HowWell({ quality, says = false }: { quality: ReadQuality; says?: boolean }) {
  return (
    <span className="inline-flex items-center gap-1.5 whitespace-nowrap">
      <svg width="0.75rem" height="0.6875rem" viewBox="0 0 12 11" aria-hidden="true">
        {BARS.map(({ x, height }, index) => (
          <rect
            key={x}
            x={x}
            y={11 - height}
            width="3"
            height={height}
            fill={index < quality ? 'var(--ink)' : 'var(--rule)'}
          />
        ))}
      </svg>
      <span className={says ? 'text-second' : 'sr-only'}>{WORDS[quality]}</span>
    </span>
  );
}
