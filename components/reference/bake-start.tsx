import { latestStart } from '@/lib/trade/steel/latest-start';
import type { Relief } from '@/lib/trade/steel/relief';

import { momentWords, readMoment } from './bench-moment';

const WIDTH = 720;
const BAR = { y: 26, height: 20 };

/** When the bake has to start, by the clock, and as a line of hours from the last part leaving the bath. */
export function BakeStart({ relief, endedAt }: { relief: Relief; endedAt: string }) {
  const within = relief.startWithinHours;
  const ended = readMoment(endedAt);
  if (within === undefined) return null;
  return (
    <>
      <p className="pb-1.5">
        {ended ? (
          <>
            In the oven by <strong className="num">{momentWords(latestStart(ended, within))}</strong> at the
            latest
            {relief.hours !== undefined && (
              <>
                ; started then, out at{' '}
                <strong className="num">{momentWords(latestStart(ended, within + relief.hours))}</strong> at
                the earliest, counted at temperature
              </>
            )}
            .
          </>
        ) : (
          'Enter when the last part left the bath, and the latest start is worked out.'
        )}
      </p>
      {relief.hours !== undefined && <HourLine within={within} hours={relief.hours} />}
    </>
  );
}

function HourLine({ within, hours }: { within: number; hours: number }) {
  const each = (WIDTH - 4) / (within + hours);
  const start = 2 + within * each;
  return (
    <svg
      viewBox={`0 0 ${WIDTH} 74`}
      role="img"
      aria-label={`${within} h to start the bake, then ${hours} h of bake`}
      className="h-auto w-full max-w-[720px]"
    >
      <rect
        x="2"
        width={within * each}
        {...BAR}
        fill="var(--dispatched-wash)"
        stroke="var(--dispatched-ink)"
      />
      <rect x={start} width={hours * each} {...BAR} fill="var(--proved-wash)" stroke="var(--ink)" />
      <g className="font-cond text-source" fill="var(--ink)">
        <text x="2" y="18">
          out of the bath
        </text>
        <text x={Math.max(start, 130)} y="18">
          start by {within} h
        </text>
        <text x={start + (hours * each) / 2} y="41" textAnchor="middle">
          bake, {hours} h at temperature
        </text>
        <text x={WIDTH - 2} y="64" textAnchor="end" className="font-mono text-axis" fill="var(--quiet)">
          {within + hours} h
        </text>
      </g>
    </svg>
  );
}
